import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { partColumns, text, uuid } from "./columns";
import { connection } from "./connection";

/** A surface inside a room, and what it soaks up. */
export class Surface extends Model<InferAttributes<Surface>, InferCreationAttributes<Surface>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare spaceId: string;
  declare params: object;
}

Surface.init(
  { ...partColumns(), name: text(), spaceId: uuid() },
  { sequelize: connection, modelName: "Surface", tableName: "surfaces" },
);
