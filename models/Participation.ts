import { type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { key, text, uuid } from "./columns";
import { connection } from "./connection";

/** Who was invited to one project. */
export class Participation extends Model<InferAttributes<Participation>, InferCreationAttributes<Participation>> {
  declare projectId: string;
  declare userId: string;
  declare role: "client" | "builder";
}

Participation.init(
  {
    projectId: key(uuid()),
    userId: key(uuid()),
    role: key(text()),
  },
  { sequelize: connection, modelName: "Participation", tableName: "participations" },
);
