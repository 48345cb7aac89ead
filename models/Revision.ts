import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { filled, integer, json, key, moment, optionalUuid, text, uuid } from "./columns";
import { connection } from "./connection";

/** What happened to one part. Before a part is added and after it is removed there is null. */
export interface Act {
  kind: string;
  id: string;
  act: "add" | "change" | "remove";
  before: object | null;
  after: object | null;
}

/** One change of a plan: who, when, and the touched parts before and after. */
export class Revision extends Model<InferAttributes<Revision>, InferCreationAttributes<Revision>> {
  declare projectId: string;
  declare revision: number;
  declare userId: string | null;
  declare role: string;
  declare at: CreationOptional<Date>;
  declare acts: Act[];
}

Revision.init(
  {
    projectId: key(uuid()),
    revision: key(integer()),
    userId: optionalUuid(),
    role: text(),
    at: filled(moment()),
    acts: json(),
  },
  { sequelize: connection, modelName: "Revision", tableName: "revisions" },
);
