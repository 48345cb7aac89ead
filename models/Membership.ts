import { type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { key, text, uuid } from "./columns";
import { connection } from "./connection";

/** Who belongs to a team: every project of it is theirs to open. */
export class Membership extends Model<InferAttributes<Membership>, InferCreationAttributes<Membership>> {
  declare teamId: string;
  declare userId: string;
  declare role: "owner" | "acoustician";
}

Membership.init(
  {
    teamId: key(uuid()),
    userId: key(uuid()),
    role: text(),
  },
  { sequelize: connection, modelName: "Membership", tableName: "memberships" },
);
