// Longer than most: the table of rights stands whole beside the questions asked of it.
import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { acts } from "../../app/_server/access";
import { ask, buildSession } from "../build";
import { ACTORS, BEARERS, buildStage, cookieFor, tokenOf, type Actor, type Stage } from "./actors";
import { findRoutes, type ServedRoute } from "./routes";

/**
 * Statuses of owner, acoustician, client, builder, other owner, other client, nobody. The bearers of a link's token, which
 * nobody can issue yet, are told what nobody is told.
 */
type Statuses = readonly [number, number, number, number, number, number, number];

interface Row {
  /** The act of the table of rights; null where no project is asked for. */
  act: keyof typeof acts | null;
  statuses: Statuses;
  params?: (stage: Stage) => Record<string, string>;
  body?: (stage: Stage) => unknown;
  /** Ids nested below the project: each is asked again as a part of another project, which does not exist here. */
  foreign?: (stage: Stage) => Record<string, string>;
  /** Bodies that name a part of another project, each refused with the status beside it. */
  foreignBodies?: (stage: Stage) => { says: string; body: unknown; status: number }[];
}

/** The place of an actor's status in a row. */
function placeOf(actor: Actor): number {
  const told = BEARERS.some((bearer) => bearer === actor) ? "nobody" : actor;
  return ACTORS.filter((one) => !BEARERS.some((bearer) => bearer === one)).indexOf(told);
}

const changing: Statuses = [200, 200, 403, 403, 404, 404, 401];
const reading: Statuses = [200, 200, 200, 200, 404, 404, 401];
const project = (stage: Stage) => ({ projectId: stage.project.id });
const fence = ({ plan }: Stage) => {
  const { id: _, ...values } = plan.fences[0]!;
  return values;
};

/** A change that is in order, so that one beside it that is not takes it along. */
const ownChange = ({ idOf }: Stage) => ({ act: "change", part: "elements", id: idOf("yard-door"), patch: { area: 1.5 } });

/** Every way in which one of several changes may name what belongs to another project. */
function foreignChanges({ plan, idOf, sibling }: Stage): { says: string; change: object; status: number }[] {
  const { id: _, ...element } = plan.elements[0]!;
  const { id: __, ...receiver } = plan.receivers.find(({ spaceId }) => spaceId)!;
  const theirs = { pathId: sibling.plan.paths[0]!.id, constructionId: sibling.plan.constructions[0]!.id, spaceId: sibling.plan.receivers.find(({ spaceId }) => spaceId)!.spaceId };
  return [
    { says: "changed", status: 404, change: { act: "change", part: "elements", id: sibling.idOf("yard-door"), patch: { area: 2 } } },
    { says: "removed", status: 404, change: { act: "remove", part: "elements", id: sibling.idOf("yard-door") } },
    { says: "added to a path", status: 422, change: { act: "add", part: "elements", values: { ...element, pathId: theirs.pathId } } },
    { says: "added with a construction", status: 422, change: { act: "add", part: "elements", values: { ...element, constructionId: theirs.constructionId } } },
    { says: "added in a room", status: 422, change: { act: "add", part: "receivers", values: { ...receiver, spaceId: theirs.spaceId } } },
    { says: "moved to a path", status: 422, change: { act: "change", part: "elements", id: idOf("yard-door"), patch: { pathId: theirs.pathId } } },
    { says: "given a construction", status: 422, change: { act: "change", part: "elements", id: idOf("yard-door"), patch: { constructionId: theirs.constructionId } } },
  ];
}

const table: Record<string, Row> = {
  "GET /api/health": { act: null, statuses: [200, 200, 200, 200, 200, 200, 200] },
  "POST /api/csp": { act: null, statuses: [204, 204, 204, 204, 204, 204, 204], body: () => ({ "csp-report": {} }) },
  "POST /api/session": {
    act: null,
    statuses: [401, 401, 401, 401, 401, 401, 401],
    // Another account each time: a sixth wrong guess at one would have to wait.
    body: () => ({ email: `${randomUUID()}@stillyard.example`, password: "a password that nobody has" }),
  },
  "DELETE /api/session": { act: null, statuses: [204, 204, 204, 204, 204, 204, 204] },
  "POST /api/sign-up": {
    act: null,
    statuses: [422, 422, 422, 422, 422, 422, 422],
    body: () => ({ name: "Nora", email: "nora@yard.example", password: "too short", hat: "play" }),
  },
  "POST /api/email-check": { act: null, statuses: [404, 404, 404, 404, 404, 404, 404], body: () => ({ token: "made up" }) },
  "POST /api/forgotten-password": {
    act: null,
    statuses: [202, 202, 202, 202, 202, 202, 202],
    body: () => ({ email: `${Math.random()}@yard.example` }),
  },
  "POST /api/new-password": {
    act: null,
    statuses: [404, 404, 404, 404, 404, 404, 404],
    body: () => ({ token: "made up", password: "made up as well as the token is" }),
  },
  // What one may do with a password is told by tests of their own: here only who is asked for it.
  "POST /api/password": { act: null, statuses: [422, 422, 422, 422, 422, 422, 401], body: () => ({ current: "", password: "" }) },
  "POST /api/proof": { act: null, statuses: [422, 422, 422, 422, 422, 422, 401], body: () => ({ password: "" }) },
  "POST /api/email": { act: null, statuses: [422, 422, 422, 422, 422, 422, 401], body: () => ({ email: "no address" }) },
  "POST /api/email-move": { act: null, statuses: [404, 404, 404, 404, 404, 404, 404], body: () => ({ token: "made up" }) },
  "POST /api/email-undo": { act: null, statuses: [404, 404, 404, 404, 404, 404, 404], body: () => ({ token: "made up" }) },
  "DELETE /api/sessions": { act: null, statuses: [204, 204, 204, 204, 204, 204, 401] },
  "DELETE /api/sessions/[key]": {
    act: null,
    statuses: [404, 404, 404, 404, 404, 404, 401],
    params: () => ({ key: "00000000-0000-4000-8000-000000000000" }),
  },
  "PATCH /api/me": { act: null, statuses: [204, 204, 204, 204, 204, 204, 401], body: () => ({ theme: "dark" }) },
  "POST /api/projects": {
    act: "make project",
    statuses: [201, 201, 403, 403, 201, 403, 401],
    body: () => ({ name: "Behind the shed", timeZone: "UTC", currency: "EUR" }),
  },
  "POST /api/projects/[projectId]/copy": {
    act: "copy project",
    statuses: [201, 201, 403, 403, 404, 404, 401],
    params: project,
    body: () => ({}),
  },
  "GET /api/projects/[projectId]": { act: "open project", statuses: reading, params: project },
  "PATCH /api/projects/[projectId]": {
    act: "rename project",
    statuses: changing,
    params: project,
    body: () => ({ says: "Drums" }),
  },
  "GET /api/projects/[projectId]/verdict/[receiverId]": {
    act: "open project",
    statuses: reading,
    params: (stage) => ({ ...project(stage), receiverId: stage.idOf("no9-bedroom") }),
    foreign: ({ sibling }) => ({ receiverId: sibling.idOf("no9-bedroom") }),
  },
  "POST /api/projects/[projectId]/[part]": {
    act: "edit plan",
    statuses: changing,
    params: (stage) => ({ ...project(stage), part: "fences" }),
    body: fence,
  },
  "POST /api/projects/[projectId]/changes": {
    act: "edit plan",
    statuses: changing,
    params: project,
    body: (stage) => ({ changes: [{ act: "add", part: "fences", values: fence(stage) }] }),
    foreignBodies: (stage) => foreignChanges(stage).map(({ says, change, status }) => ({ says, status, body: { changes: [ownChange(stage), change] } })),
  },
  "PATCH /api/projects/[projectId]/[part]/[partId]": {
    act: "edit plan",
    statuses: changing,
    params: (stage) => ({ ...project(stage), part: "elements", partId: stage.idOf("yard-door") }),
    body: () => ({ area: 1 + Math.random() }),
    foreign: ({ sibling }) => ({ partId: sibling.idOf("yard-door") }),
  },
  "DELETE /api/projects/[projectId]/[part]/[partId]": {
    act: "edit plan",
    statuses: changing,
    params: (stage) => ({ ...project(stage), part: "surfaces", partId: stage.plan.surfaces[0]!.id }),
    foreign: ({ sibling }) => ({ partId: sibling.plan.surfaces[0]!.id }),
  },
};

/** An address that is none is none for everybody. */
const nowhere: Row = { act: null, statuses: [404, 404, 404, 404, 404, 404, 404], body: () => ({}) };
for (const method of ["GET", "POST", "PUT", "PATCH", "DELETE"]) table[`${method} /api/[...missing]`] = nowhere;

let stage: Stage;
let routes: ServedRoute[];
beforeAll(async () => {
  stage = await buildStage();
  routes = await findRoutes();
});

async function revision(): Promise<number> {
  return (await stage.project.reload()).revision;
}

/** Asks as an actor. Whoever signs out does so in a session of their own. */
async function askAs(actor: Actor, name: string, changes: { params?: Record<string, string>; headers?: Record<string, string>; body?: unknown } = {}) {
  const { method, handler } = routes.find((one) => one.name === name)!;
  const { params, body } = table[name]!;
  const token = tokenOf(actor);
  const user = Object.entries(stage.users).find(([known]) => known === actor)?.[1];
  const cookie = user && name === "DELETE /api/session" ? (await buildSession(user)).cookie : cookieFor(stage, actor);
  return ask(handler, {
    method,
    cookie,
    params: { ...params?.(stage), ...changes.params },
    body: method === "GET" || method === "DELETE" ? undefined : (changes.body ?? body?.(stage)),
    revision: method === "GET" ? undefined : await revision(),
    headers: { ...token.headers, ...changes.headers },
    query: token.query,
  });
}

describe("rights", () => {
  it("every route has a row and every row a route", () => {
    expect(Object.keys(table).sort()).toEqual(routes.map(({ name }) => name).sort());
  });

  it("every act of the table of rights is asked by a route, or by a part of it", () => {
    const asked = new Set(Object.values(table).map(({ act }) => act));
    // "set limit" is the same route with the part `criteria`, asked below.
    expect(Object.keys(acts).filter((act) => !asked.has(act as keyof typeof acts))).toEqual(["set limit"]);
  });

  const cells = Object.entries(table).flatMap(([name, { statuses }]) =>
    ACTORS.map((actor) => ({ name, actor, status: statuses[placeOf(actor)]! })),
  );
  // The owner comes last, so that what others must not remove is still there to be asked for.
  const ordered = cells.toSorted((one, two) => ACTORS.indexOf(two.actor) - ACTORS.indexOf(one.actor));
  it.each(ordered.filter(({ name, actor }) => !(name.startsWith("DELETE /api/projects") && actor === "acoustician")))(
    "$name by $actor is $status",
    async ({ name, actor, status }) => {
      expect((await askAs(actor, name)).status).toBe(status);
    },
  );

  it("an acoustician may remove a part", async () => {
    const name = "DELETE /api/projects/[projectId]/[part]/[partId]";
    expect((await askAs("acoustician", name, { params: { partId: stage.plan.surfaces[1]!.id } })).status).toBe(200);
  });

  it.each([["owner", 200], ["acoustician", 200], ["client", 403], ["builder", 403], ["other owner", 404], ["other client", 404], ["link in the address", 401], ["link in a header", 401], ["nobody", 401]] as const)(
    "a limit changed by %s is %i",
    async (actor, status) => {
      const params = { part: "criteria", partId: stage.plan.criteria[0]!.id };
      const { handler } = routes.find((one) => one.name === "PATCH /api/projects/[projectId]/[part]/[partId]")!;
      const asked = { method: "PATCH", cookie: cookieFor(stage, actor), params: { projectId: stage.project.id, ...params }, body: { place: `in bed, asked by ${actor}` }, revision: await revision(), ...tokenOf(actor) };
      expect((await ask(handler, asked)).status).toBe(status);
    },
  );

  const nested = Object.entries(table).flatMap(([name, { foreign }]) => (foreign ? [{ name, foreign }] : []));
  it.each(nested)("$name: the right child under a foreign parent does not exist", async ({ name, foreign }) => {
    expect((await askAs("owner", name, { params: foreign(stage) })).status).toBe(404);
  });

  const withBodies = Object.entries(table).flatMap(([name, { foreignBodies }]) => (foreignBodies ? [{ name, foreignBodies }] : []));
  it.each(withBodies)("$name: a body that names a part of another project is refused, and nothing is kept", async ({ name, foreignBodies }) => {
    const before = await revision();
    for (const { says, body, status } of foreignBodies(stage)) expect((await askAs("owner", name, { body })).status, says).toBe(status);
    expect(await revision()).toBe(before);
  });

  const onProjects = Object.keys(table).filter((name) => table[name]!.params && name.includes("[projectId]"));
  it.each(onProjects)("%s: what one may not read answers like what was never there", async (name) => {
    const strange = await askAs("other owner", name);
    const absent = await askAs("owner", name, { params: { projectId: "00000000-0000-4000-8000-000000000000" } });
    const [one, other] = await Promise.all([strange.json(), absent.json()]) as { error: { requestId?: string } }[];
    delete one!.error.requestId;
    delete other!.error.requestId;
    expect(absent.status).toBe(404);
    expect(one).toEqual(other);
    expect([...strange.headers]).toEqual([...absent.headers]);
  });

  it.each(onProjects)("%s: an id that cannot be read is not looked for", async (name) => {
    const rows = Object.keys(table[name]!.params!(stage)).filter((key) => key !== "part");
    for (const key of rows) {
      for (const id of ["1", "' or 1=1 --", "../..", "%00", "a".repeat(500), `${stage.project.id}x`]) {
        expect((await askAs("owner", name, { params: { [key]: id } })).status, `${key} ${id}`).toBe(404);
      }
    }
  });

  it("a kind of part that is none is not there", async () => {
    for (const part of ["element", "users", "constructor", "__proto__"]) {
      const answer = await askAs("owner", "PATCH /api/projects/[projectId]/[part]/[partId]", { params: { part } });
      expect(answer.status, part).toBe(404);
    }
  });

  it("a right that is taken away is refused at the very next request", async () => {
    const name = "GET /api/projects/[projectId]";
    const { Participation } = await import("../../models/index");
    expect((await askAs("client", name)).status).toBe(200);
    await Participation.destroy({ where: { userId: stage.users.client.id, projectId: stage.project.id } });
    expect((await askAs("client", name)).status).toBe(404);
  });
});

describe("fields of the answers", () => {
  it("a plan's answer has its three fields and no address of a person", async () => {
    for (const actor of ["owner", "acoustician", "builder"] as const) {
      const answer = await askAs(actor, "GET /api/projects/[projectId]");
      const text = await answer.text();
      expect(Object.keys(JSON.parse(text) as object).sort()).toEqual(["plan", "revision", "verdict"]);
      expect(text).not.toContain("@stillyard.example");
    }
  });

  it("a refusal names who may, without their addresses", async () => {
    const text = await (await askAs("builder", "PATCH /api/projects/[projectId]")).text();
    expect(text).toContain("Olga and Aron");
    expect(text).not.toContain("@");
  });
});
