import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { filled, integer, json, key, moment, optionalMoment, optionalText, optionalUuid, text, uuid } from "./columns";
import { connection } from "./connection";

/** Work that follows an act, written in the act's transaction and done after it. */
export class Job extends Model<InferAttributes<Job>, InferCreationAttributes<Job>> {
  declare id: string;
  declare kind: string;
  declare payload: Record<string, unknown>;
  declare state: CreationOptional<"waiting" | "done" | "dead">;
  declare tries: CreationOptional<number>;
  declare dueAt: CreationOptional<Date>;
  /** Who works on it, and until when that holds without a renewal. */
  declare lease: CreationOptional<string | null>;
  declare leasedUntil: CreationOptional<Date | null>;
  /** Why the last try failed. */
  declare fault: CreationOptional<string | null>;
  declare madeAt: CreationOptional<Date>;
  declare endedAt: CreationOptional<Date | null>;
}

Job.init(
  {
    id: key(uuid()),
    kind: text(),
    payload: json(),
    state: filled(text()),
    tries: filled(integer()),
    dueAt: filled(moment()),
    lease: optionalUuid(),
    leasedUntil: optionalMoment(),
    fault: optionalText(),
    madeAt: filled(moment()),
    endedAt: optionalMoment(),
  },
  { sequelize: connection, modelName: "Job", tableName: "jobs" },
);
