import { type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { double, integer, key, uuid } from "./columns";
import { connection } from "./connection";

/** A source at work in a situation, and the share of the time it runs. */
export class SituationSource extends Model<InferAttributes<SituationSource>, InferCreationAttributes<SituationSource>> {
  declare projectId: string;
  declare situationId: string;
  declare sourceId: string;
  declare rank: number;
  declare share: number;
}

SituationSource.init(
  { projectId: uuid(), situationId: key(uuid()), sourceId: key(uuid()), rank: integer(), share: double() },
  { sequelize: connection, modelName: "SituationSource", tableName: "situation_sources" },
);
