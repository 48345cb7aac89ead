import { beforeAll, describe, expect, it } from "vitest";
import { DELETE, PATCH } from "../../app/api/projects/[projectId]/[part]/[partId]/route";
import type { Answer } from "../../app/_server/weigh";
import { catalogue, findConstruction } from "../../lib/noise/catalogue";
import { Revision } from "../../models/index";
import { ask } from "../build";
import { buildStage, type Stage } from "./actors";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

async function choose(catalogueKey: unknown, more: object = {}) {
  const { revision } = await stage.project.reload();
  const params = { projectId: stage.project.id, part: "elements", partId: stage.idOf("yard-door") };
  return ask(PATCH, { method: "PATCH", cookie: stage.cookies.owner, params, revision, body: { construction: { catalogueKey }, ...more } });
}

/** A door of the catalogue that the demo's plan does not hold. */
const freshDoor = () => {
  const held = new Set(stage.plan.constructions.map(({ catalogueKey }) => catalogueKey));
  return catalogue.find(({ key, fits }) => fits.includes("door") && !held.has(key))!;
};

describe("choosing from the catalogue", () => {
  it("copies the record with its key and where it was read, and its advice, in one revision", async () => {
    const record = freshDoor();
    const { revision } = await stage.project.reload();
    const answer = (await (await choose(record.key)).json()) as Answer;
    expect(answer.revision).toBe(revision + 1);
    const door = answer.plan.elements.find(({ id }) => id === stage.idOf("yard-door"))!;
    const { id, ...copy } = answer.plan.constructions.find((one) => one.id === door.constructionId)!;
    const { key, says: _, suggested, ...values } = record;
    expect(copy).toEqual({ ...values, catalogueKey: key });
    expect(door.params).toMatchObject(suggested ?? {});
    const row = await Revision.findOne({ where: { projectId: stage.project.id, revision: revision + 1 } });
    expect(row!.acts.map((act) => [act.kind, act.act, act.id])).toEqual([["construction", "add", id], ["element", "change", door.id]]);
  });

  it("a second choice of the same record makes no second copy", async () => {
    const { key } = freshDoor();
    await choose("door-hardwood-43");
    const answer = (await (await choose(key)).json()) as Answer;
    expect(answer.plan.constructions.filter(({ catalogueKey }) => catalogueKey === key)).toHaveLength(1);
  });

  it("the heavy door brings its gap of 3 square centimetres, and less noise arrives in bed at 63 Hz", async () => {
    expect(findConstruction("door-mdf-3x18-damped")?.suggested).toEqual({ gapArea: 0.0003 });
    const bed = ({ verdict }: Answer) => verdict.receivers.find(({ receiverId }) => receiverId === stage.idOf("no9-bedroom"))!.bands[1]!.level as number;
    const drawn = (await (await choose("door-hardwood-43")).json()) as Answer;
    const heavy = (await (await choose("door-mdf-3x18-damped")).json()) as Answer;
    expect(heavy.plan.elements.find(({ id }) => id === stage.idOf("yard-door"))!.params).toEqual({ gapArea: 0.0003 });
    expect(bed(drawn) - bed(heavy)).toBeGreaterThan(1.5);
  });

  it("one's own gap stands over the record's advice", async () => {
    const answer = (await (await choose("door-mdf-3x18-damped", { params: { gapArea: 0.002 } })).json()) as Answer;
    expect(answer.plan.elements.find(({ id }) => id === stage.idOf("yard-door"))!.params).toEqual({ gapArea: 0.002 });
  });

  it.each([["nothing-like-it", 422], ["roof-own-joists-350", 422], [["door-hardwood-43"], 422], [null, 422]])("%j is refused at its field, and nothing is copied", async (key, status) => {
    const before = await stage.project.reload();
    const answer = await choose(key);
    expect(answer.status).toBe(status);
    expect((await stage.project.reload()).revision).toBe(before.revision);
  });

  it("a construction in use is not removed: 409 in words, without another plan beside it", async () => {
    const { revision } = await stage.project.reload();
    const used = stage.plan.elements.find(({ id }) => id === stage.idOf("studio-roof"))!.constructionId!;
    const params = { projectId: stage.project.id, part: "constructions", partId: used };
    const answer = await ask(DELETE, { method: "DELETE", cookie: stage.cookies.owner, params, revision });
    const body = (await answer.json()) as { error: { message: string }; current?: unknown };
    expect([answer.status, body.current]).toEqual([409, undefined]);
    expect(body.error.message).toMatch(/^Still in use: /);
  });
});
