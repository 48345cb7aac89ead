import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { boolean, filled, key, moment, optionalMoment, text, uuid } from "./columns";
import { connection } from "./connection";

/** Where somebody is signed in; known by the SHA-256 of its id only. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare idHash: string;
  declare userId: string;
  declare keep: boolean;
  declare device: CreationOptional<string>;
  /** Its name on the list of devices; it stays through a change of id and opens nothing. */
  declare handle: CreationOptional<string>;
  declare beganAt: CreationOptional<Date>;
  declare issuedAt: CreationOptional<Date>;
  declare seenAt: CreationOptional<Date>;
  declare replacedAt: CreationOptional<Date | null>;
  /** When the password was last given in it. */
  declare provedAt: CreationOptional<Date>;
}

Session.init(
  {
    idHash: key(text()),
    userId: uuid(),
    keep: boolean(),
    device: filled(text()),
    handle: filled(uuid()),
    beganAt: filled(moment()),
    issuedAt: filled(moment()),
    seenAt: filled(moment()),
    replacedAt: optionalMoment(),
    provedAt: filled(moment()),
  },
  { sequelize: connection, modelName: "Session", tableName: "sessions" },
);
