import { createHash, randomBytes, randomUUID } from "node:crypto";
import plumtreeRow from "../data/examples/plumtree-row.json";
import { sealId, setCookie } from "../app/_server/cookies";
import { planSchema, type Plan } from "../lib/noise/plan";
import { connection, Membership, Participation, Project, Session, Team, User } from "../models/index";
import { relabelPlan } from "../models/relabelPlan";
import { storePlan } from "../models/storePlan";

/** Builders: a test says only what it is about. */

export async function buildTeam(): Promise<Team> {
  return Team.create({ id: randomUUID(), name: "A team" }, { fields: ["id", "name"] });
}

export async function buildUser(values: Partial<{ name: string; email: string; passwordHash: string; emailCheckedAt: Date | null }> = {}): Promise<User> {
  const id = randomUUID();
  const user = { id, name: "Somebody", email: `${id}@stillyard.example`, passwordHash: "none", emailCheckedAt: new Date(), ...values };
  return User.create(user, { fields: ["id", "name", "email", "passwordHash", "emailCheckedAt"] });
}

export async function buildMember(team: Team, role: "owner" | "acoustician", name = "Somebody"): Promise<User> {
  const user = await buildUser({ name });
  await Membership.create({ teamId: team.id, userId: user.id, role }, { fields: ["teamId", "userId", "role"] });
  return user;
}

export async function buildParticipant(project: Project, role: "client" | "builder", name = "Somebody"): Promise<User> {
  const user = await buildUser({ name });
  await Participation.create({ projectId: project.id, userId: user.id, role }, { fields: ["projectId", "userId", "role"] });
  return user;
}

/** The demo's plan under ids of its own; `idOf` gives the id that a slug of the example became. */
export function buildPlan(): { plan: Plan; idOf: (slug: string) => string } {
  const ids = new Map<string, string>();
  const idOf = (slug: string) => ids.get(slug) ?? ids.set(slug, randomUUID()).get(slug)!;
  return { plan: relabelPlan(planSchema.parse(plumtreeRow), idOf), idOf };
}

export interface BuiltProject {
  project: Project;
  plan: Plan;
  idOf: (slug: string) => string;
}

/** A project of a team with the demo's plan. */
export async function buildProject(team: Team, name = "A yard"): Promise<BuiltProject> {
  const { plan, idOf } = buildPlan();
  const project = { id: randomUUID(), teamId: team.id, name, timeZone: "CET", currency: "EUR" };
  const fields: (keyof typeof project)[] = ["id", "teamId", "name", "timeZone", "currency"];
  const row = await connection.transaction(async (transaction) => {
    const created = await Project.create(project, { fields, transaction });
    await storePlan({ projectId: project.id, transaction }, plan);
    return created;
  });
  return { project: row, plan, idOf };
}

export const hashOf = (id: string) => createHash("sha256").update(id).digest("hex");

/** A session without the work of a sign-in: the cookie a browser would send, and the row's key. */
export async function buildSession(user: User, keep = false): Promise<{ cookie: string; idHash: string; id: string }> {
  const id = randomBytes(32).toString("base64url");
  const idHash = hashOf(id);
  await Session.create({ idHash, userId: user.id, keep }, { fields: ["idHash", "userId", "keep"] });
  return { id, idHash, cookie: setCookie(await sealId(id), keep).split(";")[0]! };
}

export const cookieOf = async (user: User) => (await buildSession(user)).cookie;

type Handler<P> = (request: Request, context: { params: Promise<P> }) => Promise<Response> | Response;

interface Asked<P> {
  method?: string;
  params?: P;
  cookie?: string;
  revision?: number;
  body?: unknown;
  headers?: Record<string, string>;
  /** What stands behind the path of the address. */
  query?: string;
}

/** Asks a route as a page of ours would; headers given override, and an empty one is left out. */
export async function ask<P = object>(handler: Handler<P>, { method = "GET", params, cookie, revision, body, headers = {}, query = "" }: Asked<P> = {}): Promise<Response> {
  const all: Record<string, string> = {
    ...(method !== "GET" && { "sec-fetch-site": "same-origin" }),
    ...(body !== undefined && { "content-type": "application/json" }),
    ...(cookie && { cookie }),
    ...(revision !== undefined && { "if-match": `"${revision}"` }),
    ...headers,
  };
  const sent = Object.fromEntries(Object.entries(all).filter(([, value]) => value !== ""));
  const text = typeof body === "string" ? body : body === undefined ? undefined : JSON.stringify(body);
  const request = new Request(`http://localhost:3000/api${query}`, { method, headers: sent, body: text });
  return handler(request, { params: Promise.resolve((params ?? {}) as P) });
}
