import "server-only";
import { IdempotencyKey } from "./IdempotencyKey";
import { Job } from "./Job";
import { KnownBrowser } from "./KnownBrowser";
import { MailToken } from "./MailToken";
import { Membership } from "./Membership";
import { Participation } from "./Participation";
import { Project } from "./Project";
import { Revision } from "./Revision";
import { Session } from "./Session";
import { Team } from "./Team";
import { Throttle } from "./Throttle";
import { User } from "./User";

/**
 *   Team --< Membership >-- User --< Session
 *     |                      |---< MailToken
 *     |                      |---< KnownBrowser
 *     |                      |
 *     `--< Project --< Participation
 *              |
 *              |--< Revision
 *              `--< parts of its plan (partTables.ts)
 *
 *   Job, Throttle: beside the rest, bound to nothing
 */
if (!User.associations.memberships) {
  // A reload may have replaced one class alone: the others let go of what they knew of it.
  for (const { associations } of [Team, Membership, User, Session, Project, Participation, Revision])
    for (const alias of Object.keys(associations)) delete associations[alias];
  Team.hasMany(Membership, { as: "memberships", foreignKey: "teamId" });
  Team.hasMany(Project, { as: "projects", foreignKey: "teamId" });
  Membership.belongsTo(User, { as: "user", foreignKey: "userId" });
  User.hasMany(Membership, { as: "memberships", foreignKey: "userId" });
  User.hasMany(Session, { as: "sessions", foreignKey: "userId" });
  User.hasMany(MailToken, { as: "mailTokens", foreignKey: "userId" });
  User.hasMany(KnownBrowser, { as: "knownBrowsers", foreignKey: "userId" });
  Session.belongsTo(User, { as: "user", foreignKey: "userId" });
  Project.hasMany(Participation, { as: "participations", foreignKey: "projectId" });
  Project.hasMany(Revision, { as: "revisions", foreignKey: "projectId" });
  Participation.belongsTo(User, { as: "user", foreignKey: "userId" });
  Revision.belongsTo(User, { as: "user", foreignKey: "userId" });
}

export { connection } from "./connection";
export { IdempotencyKey, Job, KnownBrowser, MailToken, Membership, Participation, Project, Revision, Session, Team, Throttle, User };
export type { Act } from "./Revision";
