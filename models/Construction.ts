import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { optionalText, partColumns, text } from "./columns";
import { connection } from "./connection";

/** What elements are made of; a copy of the catalogue's record where it came from there. */
export class Construction extends Model<InferAttributes<Construction>, InferCreationAttributes<Construction>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare catalogueKey: string | null;
  declare params: object;
}

Construction.init(
  { ...partColumns(), name: text(), catalogueKey: optionalText() },
  { sequelize: connection, modelName: "Construction", tableName: "constructions" },
);
