import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { optionalUuid, partColumns, text, uuid } from "./columns";
import { connection } from "./connection";

/** One boundary between two spaces; to no space is outdoors. */
export class Path extends Model<InferAttributes<Path>, InferCreationAttributes<Path>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare fromSpaceId: string;
  declare toSpaceId: string | null;
  declare params: object;
}

Path.init(
  { ...partColumns(), name: text(), fromSpaceId: uuid(), toSpaceId: optionalUuid() },
  { sequelize: connection, modelName: "Path", tableName: "paths" },
);
