import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { partColumns, uuid } from "./columns";
import { connection } from "./connection";

/** The level of a distant source at one element. */
export class Incidence extends Model<InferAttributes<Incidence>, InferCreationAttributes<Incidence>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare sourceId: string;
  declare elementId: string;
  declare params: object;
}

Incidence.init(
  { ...partColumns(), sourceId: uuid(), elementId: uuid() },
  { sequelize: connection, modelName: "Incidence", tableName: "incidences" },
);
