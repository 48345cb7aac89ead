import { beforeAll, describe, expect, it } from "vitest";
import { GET, PATCH } from "../../app/api/projects/[projectId]/route";
import { PATCH as CHANGE } from "../../app/api/projects/[projectId]/[part]/[partId]/route";
import { GET as LISTENER } from "../../app/api/projects/[projectId]/verdict/[receiverId]/route";
import { listProjects } from "../../app/_server/projectList";
import type { Reader } from "../../app/_server/identity";
import type { Answer } from "../../app/_server/weigh";
import type { ReceiverVerdict } from "../../lib/noise/verdict";
import { Revision, type User } from "../../models/index";
import { partTables } from "../../models/partTables";
import { ask, buildProject, type BuiltProject } from "../build";
import { buildStage, type Stage } from "./actors";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

async function rename(body: object) {
  const { revision } = await stage.project.reload();
  return ask(PATCH, { method: "PATCH", cookie: stage.cookies.owner, params: { projectId: stage.project.id }, revision, body });
}

describe("a yard", () => {
  it("gets another name, and the change is kept with the ones of its plan", async () => {
    const answer = (await (await rename({ name: "  Behind the plums " })).json()) as Answer;
    const project = await stage.project.reload();
    expect([project.name, project.revision]).toEqual(["Behind the plums", answer.revision]);
    const row = await Revision.findOne({ where: { projectId: project.id, revision: answer.revision } });
    expect(row!.acts).toMatchObject([{ kind: "project", before: { name: "The yard" }, after: { name: "Behind the plums" } }]);
  });

  it.each([[{ name: "" }], [{ name: "x".repeat(121) }], [{ teamId: "00000000-0000-4000-8000-000000000000" }], [{ revision: 9 }], [{ archived: "yes" }]])("refuses %j", async (body) => {
    const before = await stage.project.reload();
    expect((await rename(body)).status).toBe(422);
    expect((await stage.project.reload()).get({ plain: true })).toEqual(before.get({ plain: true }));
  });

  it("that is archived is read but not changed, until it is restored", async () => {
    expect((await rename({ archived: true })).status).toBe(200);
    const { revision } = await stage.project.reload();
    const params = { projectId: stage.project.id, part: "elements", partId: stage.idOf("yard-door") };
    const asked = { method: "PATCH", cookie: stage.cookies.owner, params, body: { area: 3 } };
    const refused = await ask(CHANGE, { ...asked, revision });
    expect([refused.status, Object.keys((await refused.json()) as object)]).toEqual([409, ["error"]]);
    expect((await ask(GET, { cookie: stage.cookies.owner, params })).status).toBe(200);
    for (const body of [{ name: "Elsewhere" }, { says: "Flutes" }, { name: "Elsewhere", archived: true }]) expect((await rename(body)).status).toBe(409);
    expect((await rename({ archived: false })).status).toBe(200);
    expect((await ask(CHANGE, { ...asked, revision: revision + 1 })).status).toBe(200);
  });
});

describe("the list of yards", () => {
  const readerOf = ({ id, name, email }: User): Reader => ({ id, name, email, theme: "system", figures: { units: "metric", mark: "point" }, session: { idHash: "", handle: "none", keep: false, toRenew: false, proved: false } });
  const namesFor = async (user: User) => (await listProjects(readerOf(user))).listed.map(({ project }) => project.id).sort();

  it("holds all of the team for its members, the invited ones for others, and none of a stranger's", async () => {
    const { users, project, sibling, foreign } = stage;
    expect(await namesFor(users.owner)).toEqual([project.id, sibling.project.id].sort());
    expect(await namesFor(users.client)).toEqual([project.id]);
    expect(await namesFor(users["other client"])).toEqual([sibling.project.id]);
    expect(await namesFor(users["other owner"])).toEqual([foreign.project.id]);
  });

  it("names people and roles, says which one reads, and no address", async () => {
    const { listed: [listed] } = await listProjects(readerOf(stage.users.client));
    expect(listed!.people.map(({ name, role, you }) => [name, role, you])).toEqual([["Olga", "owner", false], ["Aron", "acoustician", false], ["Clara", "client", true], ["Bert", "builder", false]]);
    expect(JSON.stringify(listed)).not.toContain("@");
  });
});

describe("one listener's verdict", () => {
  it("is the same as in the answer, with every contribution", async () => {
    const params = { projectId: stage.project.id, receiverId: stage.idOf("no9-bedroom") };
    const whole = (await (await ask(LISTENER, { cookie: stage.cookies.builder, params })).json()) as ReceiverVerdict;
    const { verdict } = (await (await ask(GET, { cookie: stage.cookies.builder, params })).json()) as Answer;
    const sent = verdict.receivers.find(({ receiverId }) => receiverId === params.receiverId)!;
    expect(whole.margin).toBe(sent.margin);
    expect(sent.contributions).toEqual(whole.contributions.slice(0, 12));
    expect(whole.contributions.length).toBeGreaterThanOrEqual(sent.contributions.length);
  });
});

describe("a row of a broken shape", () => {
  let broken: BuiltProject;
  let spaceId: string;
  beforeAll(async () => {
    broken = await buildProject((await stage.project.reload()) && ({ id: stage.project.teamId } as never), "Broken");
    spaceId = broken.plan.receivers.find(({ id }) => id === broken.idOf("no9-bedroom"))!.spaceId!;
    await partTables.space.model.update({ params: { volume: "large" } }, { where: { projectId: broken.project.id, id: spaceId }, fields: ["params"] });
  });
  const open = async (projectId: string) => (await (await ask(GET, { cookie: stage.cookies.owner, params: { projectId } })).json()) as Answer;

  it("leaves the project open, names the row, and nothing passes for weighed", async () => {
    const { plan, verdict } = await open(broken.project.id);
    expect(verdict.notes.map(({ partId }) => partId)).toContain(spaceId);
    expect(verdict.receivers.length).toBe(plan.receivers.length);
    expect(verdict.receivers.every(({ state }) => state === "not weighed")).toBe(true);
    expect((await open(stage.project.id)).verdict.receivers.some(({ state }) => state !== "not weighed")).toBe(true);
  });

  it("is mended by giving it whole, and the yard is weighed again", async () => {
    const { id: _, ...space } = broken.plan.spaces.find(({ id }) => id === spaceId)!;
    const params = { projectId: broken.project.id, part: "spaces", partId: spaceId };
    const answer = await ask(CHANGE, { method: "PATCH", cookie: stage.cookies.owner, params, revision: 0, body: space });
    expect(answer.status).toBe(200);
    const { plan, verdict } = (await answer.json()) as Answer;
    expect(plan).toEqual(broken.plan);
    expect(verdict.notes.map(({ partId }) => partId)).not.toContain(spaceId);
    expect(verdict.receivers.some(({ state }) => state !== "not weighed")).toBe(true);
  });
});
