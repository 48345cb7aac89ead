import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { optionalUuid, partColumns, text } from "./columns";
import { connection } from "./connection";

/** A listener. */
export class Receiver extends Model<InferAttributes<Receiver>, InferCreationAttributes<Receiver>> {
  declare projectId: string;
  declare id: string;
  declare rank: CreationOptional<number>;
  declare name: string;
  declare kind: string;
  declare spaceId: string | null;
  declare params: object;
}

Receiver.init(
  { ...partColumns(), name: text(), kind: text(), spaceId: optionalUuid() },
  { sequelize: connection, modelName: "Receiver", tableName: "receivers" },
);
