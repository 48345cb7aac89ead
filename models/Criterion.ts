import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { partColumns, text, uuid } from "./columns";
import { connection } from "./connection";

/** A limit, copied into the project when it was chosen. */
export class Criterion extends Model<InferAttributes<Criterion>, InferCreationAttributes<Criterion>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare receiverId: string;
  declare params: object;
}

Criterion.init(
  { ...partColumns(), name: text(), receiverId: uuid() },
  { sequelize: connection, modelName: "Criterion", tableName: "criteria" },
);
