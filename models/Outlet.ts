import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { optionalUuid, partColumns, text, uuid } from "./columns";
import { connection } from "./connection";

/** A mouth of a fan's duct run. */
export class Outlet extends Model<InferAttributes<Outlet>, InferCreationAttributes<Outlet>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare sourceId: string;
  declare spaceId: string | null;
  declare params: object;
}

Outlet.init(
  { ...partColumns(), name: text(), sourceId: uuid(), spaceId: optionalUuid() },
  { sequelize: connection, modelName: "Outlet", tableName: "outlets" },
);
