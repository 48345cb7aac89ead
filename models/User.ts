import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { filled, key, moment, optionalMoment, text, uuid } from "./columns";
import { connection } from "./connection";

/** A person with an account. The e-mail address is kept in small letters. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: string;
  declare email: string;
  declare name: string;
  declare passwordHash: string;
  declare theme: CreationOptional<"light" | "dark" | "system">;
  declare units: CreationOptional<"metric" | "us">;
  declare decimalMark: CreationOptional<"point" | "comma">;
  /** What brought them here: to play, to advise or to build. */
  declare hat: CreationOptional<"play" | "advise" | "build">;
  /** When they showed that the address is theirs; nobody signs in before. */
  declare emailCheckedAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
}

User.init(
  {
    id: key(uuid()),
    email: text(),
    name: text(),
    passwordHash: text(),
    theme: filled(text()),
    units: filled(text()),
    decimalMark: filled(text()),
    hat: filled(text()),
    emailCheckedAt: optionalMoment(),
    createdAt: filled(moment()),
  },
  { sequelize: connection, modelName: "User", tableName: "users" },
);
