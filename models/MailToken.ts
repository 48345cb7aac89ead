import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { filled, key, moment, optionalMoment, optionalText, text, uuid } from "./columns";
import { connection } from "./connection";

/** What a link of ours in a mail may be used for, once; known by the SHA-256 of its token only. */
export class MailToken extends Model<InferAttributes<MailToken>, InferCreationAttributes<MailToken>> {
  declare tokenHash: string;
  declare userId: string;
  /** check: the address is theirs. password: a new password. move: to a new address. undo: back to the old one. */
  declare purpose: "check" | "password" | "move" | "undo";
  /** The address that `move` and `undo` lead to. */
  declare email: CreationOptional<string | null>;
  declare madeAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
}

MailToken.init(
  {
    tokenHash: key(text()),
    userId: uuid(),
    purpose: text(),
    email: optionalText(),
    madeAt: filled(moment()),
    expiresAt: moment(),
    usedAt: optionalMoment(),
  },
  { sequelize: connection, modelName: "MailToken", tableName: "mail_tokens" },
);
