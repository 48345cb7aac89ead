import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { partColumns, text } from "./columns";
import { connection } from "./connection";

/** What plays at the same time, and when. */
export class Situation extends Model<InferAttributes<Situation>, InferCreationAttributes<Situation>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare params: object;
}

Situation.init(
  { ...partColumns(), name: text() },
  { sequelize: connection, modelName: "Situation", tableName: "situations" },
);
