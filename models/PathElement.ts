import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { optionalUuid, partColumns, text, uuid } from "./columns";
import { connection } from "./connection";

/** What stands in a path. */
export class PathElement extends Model<InferAttributes<PathElement>, InferCreationAttributes<PathElement>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare kind: string;
  declare pathId: string;
  declare constructionId: string | null;
  declare params: object;
}

PathElement.init(
  { ...partColumns(), name: text(), kind: text(), pathId: uuid(), constructionId: optionalUuid() },
  { sequelize: connection, modelName: "PathElement", tableName: "elements" },
);
