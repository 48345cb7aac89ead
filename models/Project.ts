import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { filled, integer, key, moment, optionalMoment, text, uuid } from "./columns";
import { connection } from "./connection";

/** A yard that is being weighed. Its revision counts the changes of its plan. */
export class Project extends Model<InferAttributes<Project>, InferCreationAttributes<Project>> {
  declare id: string;
  declare teamId: string;
  declare name: string;
  declare says: CreationOptional<string>;
  declare stage: CreationOptional<string>;
  declare timeZone: string;
  declare currency: string;
  declare revision: CreationOptional<number>;
  declare changedAt: CreationOptional<Date>;
  declare archivedAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
}

Project.init(
  {
    id: key(uuid()),
    teamId: uuid(),
    name: text(),
    says: filled(text()),
    stage: filled(text()),
    timeZone: text(),
    currency: text(),
    revision: filled(integer()),
    changedAt: filled(moment()),
    archivedAt: optionalMoment(),
    createdAt: filled(moment()),
  },
  { sequelize: connection, modelName: "Project", tableName: "projects" },
);
