import type { Project, User } from "../../models/index";
import { buildMember, buildParticipant, buildProject, buildTeam, buildUser, cookieOf, type BuiltProject } from "../build";

/**
 * Who asks each route. Of the nine actors of the table of rights the two with a share link are left out: no link can be
 * made yet, so none can be live or revoked.
 */
export const ACTORS = ["owner", "acoustician", "client", "builder", "other owner", "other client", "nobody"] as const;
export type Actor = (typeof ACTORS)[number];

export interface Stage extends BuiltProject {
  users: Record<Exclude<Actor, "nobody">, User>;
  cookies: Record<Exclude<Actor, "nobody">, string>;
  /** Another project of the same team, and one of another team. */
  sibling: BuiltProject;
  foreign: BuiltProject;
}

export async function buildStage(): Promise<Stage> {
  const team = await buildTeam();
  const otherTeam = await buildTeam();
  const built = await buildProject(team, "The yard");
  const sibling = await buildProject(team, "The yard beside");
  const foreign = await buildProject(otherTeam, "A stranger's yard");
  const users = {
    owner: await buildMember(team, "owner", "Olga"),
    acoustician: await buildMember(team, "acoustician", "Aron"),
    client: await participant(built.project, "client", "Clara"),
    builder: await participant(built.project, "builder", "Bert"),
    "other owner": await buildMember(otherTeam, "owner", "Otto"),
    "other client": await participant(sibling.project, "client", "Cleo"),
  };
  await buildUser();
  const cookies = {} as Stage["cookies"];
  for (const actor of Object.keys(users) as (keyof typeof users)[]) cookies[actor] = await cookieOf(users[actor]);
  return { ...built, users, cookies, sibling, foreign };
}

const participant = (project: Project, role: "client" | "builder", name: string) => buildParticipant(project, role, name);

export const cookieFor = ({ cookies }: Stage, actor: Actor) => (actor === "nobody" ? undefined : cookies[actor]);
