import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { partColumns, text } from "./columns";
import { connection } from "./connection";

/** A fence or a wall in the yard. */
export class Fence extends Model<InferAttributes<Fence>, InferCreationAttributes<Fence>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare params: object;
}

Fence.init(
  { ...partColumns(), name: text() },
  { sequelize: connection, modelName: "Fence", tableName: "fences" },
);
