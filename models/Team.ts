import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { filled, key, moment, text, uuid } from "./columns";
import { connection } from "./connection";

/** A practice or a musician on their own: whose projects they are. */
export class Team extends Model<InferAttributes<Team>, InferCreationAttributes<Team>> {
  declare id: string;
  declare name: string;
  declare createdAt: CreationOptional<Date>;
}

Team.init(
  {
    id: key(uuid()),
    name: text(),
    createdAt: filled(moment()),
  },
  { sequelize: connection, modelName: "Team", tableName: "teams" },
);
