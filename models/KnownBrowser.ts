import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { filled, key, moment, text, uuid } from "./columns";
import { connection } from "./connection";

/** A browser that somebody signed in with before; known by the SHA-256 of its id only. */
export class KnownBrowser extends Model<InferAttributes<KnownBrowser>, InferCreationAttributes<KnownBrowser>> {
  declare idHash: string;
  declare userId: string;
  declare seenAt: CreationOptional<Date>;
}

KnownBrowser.init(
  {
    idHash: key(text()),
    userId: key(uuid()),
    seenAt: filled(moment()),
  },
  { sequelize: connection, modelName: "KnownBrowser", tableName: "known_browsers" },
);
