import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { partColumns, text, uuid } from "./columns";
import { connection } from "./connection";

/** A room. */
export class Space extends Model<InferAttributes<Space>, InferCreationAttributes<Space>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare buildingId: string;
  declare params: object;
}

Space.init(
  { ...partColumns(), name: text(), buildingId: uuid() },
  { sequelize: connection, modelName: "Space", tableName: "spaces" },
);
