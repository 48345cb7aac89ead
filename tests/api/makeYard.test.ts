import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { POST as MAKE } from "../../app/api/projects/route";
import { POST as COPY } from "../../app/api/projects/[projectId]/copy/route";
import { GET, PATCH } from "../../app/api/projects/[projectId]/route";
import type { Reader } from "../../app/_server/identity";
import { listProjects, PAGE_SIZE } from "../../app/_server/projectList";
import { teamsOfPage } from "../../app/_server/teams";
import type { Answer } from "../../app/_server/weigh";
import { Membership, Participation, Project, type User } from "../../models/index";
import { partTables } from "../../models/partTables";
import { ask, buildMember, buildProject, buildTeam, buildUser, cookieOf } from "../build";
import { buildStage, type Stage } from "./actors";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

const least = { name: "Behind the shed", timeZone: "UTC", currency: "EUR" };
type Owner = keyof Stage["cookies"];
const make = (body: object, actor: Owner = "owner") => ask(MAKE, { method: "POST", cookie: stage.cookies[actor], body });
const made = async (answer: Response) => (await answer.json()) as { id: string; next: string };
const open = async (projectId: string, actor: Owner = "owner") => (await (await ask(GET, { cookie: stage.cookies[actor], params: { projectId } })).json()) as Answer;
const readerOf = ({ id, name, email }: User): Reader => ({ id, name, email, theme: "system", figures: { units: "metric", mark: "point" }, session: { idHash: "", handle: "none", keep: false, toRenew: false, proved: false } });
const countYards = () => Project.count();

describe("a new yard", () => {
  it("needs a name, a clock and a currency; every stage opens on what is empty", async () => {
    const answer = await make(least);
    const { id, next } = await made(answer);
    expect([answer.status, next]).toEqual([201, `/projects/${id}/yard`]);
    const { plan, revision, verdict } = await open(id);
    expect([revision, plan.lot.outline, verdict.receivers]).toEqual([0, null, []]);
    for (const list of Object.values(plan)) if (Array.isArray(list)) expect(list).toEqual([]);
  });

  it("stands on its lot by the sizes that are known: building in the middle, room in the middle of it", async () => {
    const { id } = await made(await make({
      ...least,
      street: "Plumtree Row",
      lot: { width: 20, depth: 30 },
      building: { name: "Drum shed", width: 6, depth: 4, eaves: 2.4 },
      room: { width: 5, depth: 3, height: 2.5 },
    }));
    const { plan } = await open(id);
    expect([plan.lot.street, plan.lot.outline]).toEqual(["Plumtree Row", [[0, 0], [20, 0], [20, 30], [0, 30]]]);
    expect(plan.buildings).toMatchObject([{ name: "Drum shed", role: "studio", footprint: [[7, 13], [13, 13], [13, 17], [7, 17]], eaves: 2.4 }]);
    expect(plan.spaces).toMatchObject([{ name: "Live room", buildingId: plan.buildings[0]!.id, volume: 37.5, box: { at: [7.5, 13.5, 0], size: [5, 3, 2.5] } }]);
    expect(plan.surfaces).toEqual([]);
  });

  it("with a room alone has a building of no known outline around it", async () => {
    const { id } = await made(await make({ ...least, room: { name: "Attic", width: 5, depth: 3, height: 2.5 } }));
    const { plan } = await open(id);
    expect(plan.buildings).toMatchObject([{ footprint: null, role: "studio" }]);
    expect(plan.spaces[0]!.box!.at).toEqual([-2.5, -1.5, 0]);
  });

  it("is of the maker's own team, and of another one only where the maker may make yards", async () => {
    const { id } = await made(await make(least, "acoustician"));
    expect((await Project.findByPk(id))!.teamId).toBe(stage.project.teamId);
    const strange = await make({ ...least, teamId: stage.foreign.project.teamId });
    const absent = await make({ ...least, teamId: randomUUID() });
    expect([strange.status, absent.status]).toEqual([422, 422]);
    expect(Object.keys(((await strange.json()) as { error: { fields: object } }).error.fields)).toEqual(["teamId"]);
  });

  it("goes into the owned team first where somebody belongs to several, or into the one asked for", async () => {
    const user = await buildUser();
    const [guest, own] = [await buildTeam(), await buildTeam()];
    await Membership.create({ teamId: guest.id, userId: user.id, role: "acoustician" });
    await Membership.create({ teamId: own.id, userId: user.id, role: "owner" });
    const cookie = await cookieOf(user);
    const teamOf = async (body: object) => (await Project.findByPk((await made(await ask(MAKE, { method: "POST", cookie, body }))).id))!.teamId;
    expect(await teamOf(least)).toBe(own.id);
    expect(await teamOf({ ...least, teamId: guest.id })).toBe(guest.id);
    expect((await teamsOfPage(readerOf(user))).map(({ id }) => id)).toEqual([own.id, guest.id]);
  });

  it("is refused in words to whoever is in no team, whatever they typed", async () => {
    for (const body of [least, { name: "" }]) {
      const answer = await make(body, "client");
      expect(answer.status).toBe(403);
      expect(((await answer.json()) as { error: { message: string } }).error.message).toContain("by invitation");
    }
  });

  it.each([
    ["no name", { ...least, name: " " }, "name"],
    ["a name too long", { ...least, name: "x".repeat(121) }, "name"],
    ["a line too long", { ...least, says: "x".repeat(401) }, "says"],
    ["a clock that is none", { ...least, timeZone: "Mars/Olympus" }, "timeZone"],
    ["a clock that is an offset", { ...least, timeZone: "+02:00" }, "timeZone"],
    ["a currency that is none", { ...least, currency: "QQQ" }, "currency"],
    ["a team that is no id", { ...least, teamId: "' or 1=1" }, "teamId"],
    ["a lot of no width", { ...least, lot: { width: 0, depth: 3 } }, "lot.width"],
    ["a lot without depth", { ...least, lot: { width: 3 } }, "lot.depth"],
    ["a building beyond its lot", { ...least, lot: { width: 5, depth: 9 }, building: { width: 6, depth: 4 } }, "building.width"],
    ["a room beyond its building", { ...least, building: { width: 6, depth: 4 }, room: { width: 5, depth: 5, height: 2 } }, "room.depth"],
  ])("refuses %s beside its field", async (_, body, field) => {
    const before = await countYards();
    const answer = await make(body);
    expect(answer.status).toBe(422);
    expect(Object.keys(((await answer.json()) as { error: { fields: object } }).error.fields)).toEqual([field]);
    expect(await countYards()).toBe(before);
  });

  it("refuses fields of a yard's row that are nobody's to choose", async () => {
    for (const field of ["id", "revision", "stage", "archivedAt", "createdAt"]) expect((await make({ ...least, [field]: "1" })).status).toBe(422);
  });

  it("from the worked example is weighed as the example is", async () => {
    const { id } = await made(await make({ ...least, start: "example" }));
    const copy = await open(id);
    const example = await open(stage.project.id);
    expect(copy.verdict.receivers.map(({ state, margin }) => [state, margin])).toEqual(example.verdict.receivers.map(({ state, margin }) => [state, margin]));
    expect(copy.plan.elements.length).toBe(example.plan.elements.length);
  });
});

describe("a copy of a yard", () => {
  const copyAs = (actor: Owner, projectId = stage.project.id, body: object = {}) => ask(COPY, { method: "POST", cookie: stage.cookies[actor], params: { projectId }, body });

  it("has the whole plan under ids of its own, and the same verdict", async () => {
    const { id, next } = await made(await copyAs("acoustician"));
    expect(next).toBe(`/projects/${id}`);
    const [source, copy] = [await open(stage.project.id), await open(id)];
    const text = JSON.stringify(copy.plan);
    // In the order of the lists each id of the source has its fellow in the copy; put back, the plans are one.
    const pairs = idsOf(source.plan).map((old, at): [string, string] => [idsOf(copy.plan)[at]!, old]);
    expect(pairs.every(([fresh, old]) => fresh !== old && !text.includes(old))).toBe(true);
    const restored: unknown = JSON.parse(pairs.reduce((whole, [fresh, old]) => whole.replaceAll(fresh, old), text));
    expect(restored).toEqual(source.plan);
    expect(copy.verdict.receivers.map(({ margin }) => margin)).toEqual(source.verdict.receivers.map(({ margin }) => margin));
  });

  it("is called after its source within the length of a name, is of its team and takes no guests along", async () => {
    const long = await buildProject({ id: stage.project.teamId } as never, "y".repeat(120));
    const { id } = await made(await copyAs("owner", long.project.id));
    const copy = (await Project.findByPk(id))!;
    expect([copy.name, copy.teamId, copy.timeZone, copy.currency]).toEqual([`Copy of ${"y".repeat(112)}`, stage.project.teamId, "CET", "EUR"]);
    expect(await Participation.count({ where: { projectId: id } })).toBe(0);
    expect((await ask(GET, { cookie: stage.cookies.client, params: { projectId: id } })).status).toBe(404);
  });

  it("leaves its source alone, and is changed alone", async () => {
    const before = await open(stage.project.id);
    const { id } = await made(await copyAs("owner", stage.project.id, { name: "With a heavier door" }));
    expect((await ask(PATCH, { method: "PATCH", cookie: stage.cookies.owner, params: { projectId: id }, revision: 0, body: { says: "Flutes" } })).status).toBe(200);
    expect(await open(stage.project.id)).toEqual(before);
    expect((await Project.findByPk(id))!.name).toBe("With a heavier door");
  });

  it("of a yard that cannot be read whole is refused", async () => {
    const broken = await buildProject({ id: stage.project.teamId } as never, "Broken");
    await partTables.space.model.update({ params: { volume: "large" } }, { where: { projectId: broken.project.id, id: broken.plan.spaces[0]!.id }, fields: ["params"] });
    const before = await countYards();
    expect((await copyAs("owner", broken.project.id)).status).toBe(409);
    expect(await countYards()).toBe(before);
  });

  it("of another team's yard does not exist, and guests may not make one", async () => {
    const before = await countYards();
    expect((await copyAs("owner", stage.foreign.project.id)).status).toBe(404);
    expect((await copyAs("other owner")).status).toBe(404);
    expect((await copyAs("client")).status).toBe(403);
    expect(await countYards()).toBe(before);
  });
});

const idsOf = (plan: Answer["plan"]) =>
  Object.values(plan).flatMap((list) => (Array.isArray(list) ? list.map(({ id }: { id: string }) => id) : [(list as { id: string }).id]));

describe("the list of yards", () => {
  const wanted = { archived: false, page: 1, order: "changed", words: "" } as const;

  it("leaves out what is archived, and shows that alone when asked", async () => {
    const team = await buildTeam();
    const owner = await buildMember(team, "owner");
    const [kept, gone] = [await buildProject(team, "Kept"), await buildProject(team, "Gone")];
    const archive = async (archived: boolean) => {
      const { revision } = await gone.project.reload();
      return ask(PATCH, { method: "PATCH", cookie: await cookieOf(owner), params: { projectId: gone.project.id }, revision, body: { archived } });
    };
    const namesIn = async (archived: boolean) => (await listProjects(readerOf(owner), { ...wanted, archived })).listed.map(({ project }) => project.name);
    expect((await archive(true)).status).toBe(200);
    expect([await namesIn(false), await namesIn(true)]).toEqual([[kept.project.name], ["Gone"]]);
    expect(await listProjects(readerOf(owner))).toMatchObject({ inUse: 1, archived: 1, paged: false });
    expect((await archive(false)).status).toBe(200);
    expect([(await namesIn(false)).sort(), await namesIn(true)]).toEqual([["Gone", "Kept"], []]);
  });

  it("says who may rename and copy", async () => {
    const rights = async (user: User) => (await listProjects(readerOf(user))).listed.find(({ project }) => project.id === stage.project.id)!.may;
    expect(await rights(stage.users.acoustician)).toEqual({ rename: true, copy: true });
    expect(await rights(stage.users.builder)).toEqual({ rename: false, copy: false });
  });

  it("is paged at a hundred; words are then looked for in all pages, with their signs as letters", async () => {
    const team = await buildTeam();
    const owner = await buildMember(team, "owner");
    const names = Array.from({ length: PAGE_SIZE + 2 }, (_, place) => `Yard ${String(place).padStart(3, "0")}${place === 7 ? " 100% \\_" : ""}`);
    await Project.bulkCreate(names.map((name) => ({ id: randomUUID(), teamId: team.id, name, timeZone: "UTC", currency: "EUR" })), { fields: ["id", "teamId", "name", "timeZone", "currency"] });
    const list = async (asked: object) => {
      const page = await listProjects(readerOf(owner), { ...wanted, order: "name", ...asked });
      return { ...page, listed: page.listed.map(({ project }) => project.name) };
    };
    expect(await list({})).toMatchObject({ pages: 2, page: 1, found: 102, inUse: 102, paged: true, listed: names.slice(0, 100) });
    expect((await list({ page: 2 })).listed).toEqual(names.slice(100));
    expect((await list({ page: 99 })).page).toBe(2);
    expect((await list({ words: "yard 10" })).listed).toEqual(["Yard 100", "Yard 101"]);
    for (const words of ["0% \\_", "\\", "%", "_"]) expect((await list({ words })).listed, words).toEqual([names[7]]);
    expect((await list({ words: "' or 1=1 --" })).listed).toEqual([]);
  });
});
