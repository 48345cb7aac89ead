import "server-only";
import { Membership } from "./Membership";
import { Participation } from "./Participation";
import { Project } from "./Project";
import { Revision } from "./Revision";
import { Session } from "./Session";
import { Team } from "./Team";
import { User } from "./User";

/**
 *   Team --< Membership >-- User --< Session
 *     |                      |
 *     `--< Project --< Participation
 *              |
 *              |--< Revision
 *              `--< parts of its plan (partTables.ts)
 */
if (!User.associations.memberships) {
  Team.hasMany(Membership, { as: "memberships", foreignKey: "teamId" });
  Team.hasMany(Project, { as: "projects", foreignKey: "teamId" });
  Membership.belongsTo(User, { as: "user", foreignKey: "userId" });
  User.hasMany(Membership, { as: "memberships", foreignKey: "userId" });
  User.hasMany(Session, { as: "sessions", foreignKey: "userId" });
  Session.belongsTo(User, { as: "user", foreignKey: "userId" });
  Project.hasMany(Participation, { as: "participations", foreignKey: "projectId" });
  Project.hasMany(Revision, { as: "revisions", foreignKey: "projectId" });
  Participation.belongsTo(User, { as: "user", foreignKey: "userId" });
  Revision.belongsTo(User, { as: "user", foreignKey: "userId" });
}

export { connection } from "./connection";
export { Membership, Participation, Project, Revision, Session, Team, User };
export type { Act } from "./Revision";
