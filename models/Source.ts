import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { optionalUuid, partColumns, text } from "./columns";
import { connection } from "./connection";

/** Whatever sounds. */
export class Source extends Model<InferAttributes<Source>, InferCreationAttributes<Source>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare kind: string;
  declare spaceId: string | null;
  declare params: object;
}

Source.init(
  { ...partColumns(), name: text(), kind: text(), spaceId: optionalUuid() },
  { sequelize: connection, modelName: "Source", tableName: "sources" },
);
