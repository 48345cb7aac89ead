import { type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { key, text, uuid } from "./columns";
import { connection } from "./connection";

/** The key of a part of a plan: whatever points at a part points here. */
export class Part extends Model<InferAttributes<Part>, InferCreationAttributes<Part>> {
  declare projectId: string;
  declare id: string;
  declare kind: string;
}

Part.init(
  { projectId: key(uuid()), id: key(uuid()), kind: text() },
  { sequelize: connection, modelName: "Part", tableName: "parts" },
);
