import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { partColumns } from "./columns";
import { connection } from "./connection";

/** The ground of a project: one each. */
export class Lot extends Model<InferAttributes<Lot>, InferCreationAttributes<Lot>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare params: object;
}

Lot.init(
  { ...partColumns() },
  { sequelize: connection, modelName: "Lot", tableName: "lots" },
);
