import type { Project, User } from "../../models/index";
import { buildMember, buildParticipant, buildProject, buildTeam, buildUser, cookieOf, type BuiltProject } from "../build";

const SIGNED_IN = ["owner", "acoustician", "client", "builder", "other owner", "other client"] as const;
type SignedIn = (typeof SIGNED_IN)[number];

/** No link can be made yet, so its bearers hold a token that nobody issued, and get what nobody gets. */
export const BEARERS = ["link in the address", "link in a header"] as const;

/** The nine who ask each route. */
export const ACTORS = [...SIGNED_IN, ...BEARERS, "nobody"] as const;
export type Actor = (typeof ACTORS)[number];

const isSignedIn = (actor: Actor): actor is SignedIn => SIGNED_IN.some((one) => one === actor);

export interface Stage extends BuiltProject {
  users: Record<SignedIn, User>;
  cookies: Record<SignedIn, string>;
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

export const cookieFor = ({ cookies }: Stage, actor: Actor) => (isSignedIn(actor) ? cookies[actor] : undefined);

/** What a bearer sends along, wherever a link's token might stand. */
export function tokenOf(actor: Actor): { query?: string; headers?: Record<string, string> } {
  const token = "x7Jt0c9wq3mXl2bV8dYk5uHn1eRzSaGf4oPiT6yLWcE";
  if (actor === "link in the address") return { query: `?link=${token}&token=${token}` };
  return actor === "link in a header" ? { headers: { authorization: `Bearer ${token}`, "x-stillyard-link": token, cookie: `stillyard-link=${token}` } } : {};
}
