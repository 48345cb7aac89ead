import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { partColumns, text } from "./columns";
import { connection } from "./connection";

/** A house or shed on or beside the lot. */
export class Building extends Model<InferAttributes<Building>, InferCreationAttributes<Building>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare params: object;
}

Building.init(
  { ...partColumns(), name: text() },
  { sequelize: connection, modelName: "Building", tableName: "buildings" },
);
