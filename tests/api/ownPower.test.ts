import { beforeAll, describe, expect, it } from "vitest";
import { PATCH } from "../../app/api/projects/[projectId]/[part]/[partId]/route";
import type { Answer } from "../../app/_server/weigh";
import { ask } from "../build";
import { buildStage, type Stage } from "./actors";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

const levels = [null, 104, 101, 99, 98, 97, 96, 94, 90];

async function send(sourceId: string, body: Record<string, unknown>) {
  const { revision } = await stage.project.reload();
  const params = { projectId: stage.project.id, part: "sources", partId: stage.idOf(sourceId) };
  return ask(PATCH, { method: "PATCH", cookie: stage.cookies.owner, params, revision, body });
}
const measure = (sourceId: string, more: object = {}) => send(sourceId, { measured: { levels, distance: 1, spaceId: null, ...more } });
const sourceIn = async (response: Response, sourceId: string) => ((await response.json()) as Answer).plan.sources.find(({ id }) => id === stage.idOf(sourceId))!;
const fieldsOf = async (response: Response) => ((await response.json()) as { error: { fields: Record<string, string> } }).error.fields;

describe("levels measured beside a source", () => {
  it("in a room become the power behind them, with the room, the distance and the note beside it", async () => {
    const answer = await measure("kit", { spaceId: stage.idOf("live-room"), note: "9 October" });
    expect(answer.status).toBe(200);
    const { power, basis, deviation, provenance } = await sourceIn(answer, "kit");
    // 12.8 m2 at 250 Hz: 10 lg(1/(4 pi) + 4/12.8) is -4.1 dB.
    expect(power![3]).toBeCloseTo(99 + 4.1, 1);
    expect(power![0]).toBeNull();
    expect([basis, deviation]).toEqual(["measured", null]);
    expect(provenance).toEqual({ document: "Own measurement", clause: "1 m away in Live room, with the absorption it had then; 9 October", memory: false });
  });

  it("in the open are 8 dB below the power at a metre", async () => {
    const { power } = await sourceIn(await measure("condenser"), "condenser");
    expect(power!.slice(1)).toEqual(levels.slice(1).map((level) => level! + 8));
  });

  it("of a fan are refused: its duct's mouths are where it is heard", async () => {
    const answer = await measure("fan");
    expect(answer.status).toBe(422);
    expect(await fieldsOf(answer)).toHaveProperty("kind");
  });

  it("are refused by field where a distance, a room or a level makes no sense", async () => {
    expect(await fieldsOf(await measure("kit", { distance: 0 }))).toHaveProperty("distance");
    expect(await fieldsOf(await measure("kit", { spaceId: stage.idOf("kit") }))).toHaveProperty("spaceId");
    expect(await fieldsOf(await measure("kit", { levels: levels.with(2, 900) }))).toHaveProperty(["levels.2"]);
    expect(await fieldsOf(await measure("kit", { levels: new Array(9).fill(null) }))).toHaveProperty("levels");
  });
});

describe("hours of a source", () => {
  it("are kept, taken away again, and change no figure", async () => {
    const before = (await stage.project.reload(), (await (await send("kit", { says: "the kit" })).json()) as Answer);
    const after = (await (await send("kit", { hours: { from: "18:00", to: "23:00" } })).json()) as Answer;
    expect(after.plan.sources.find(({ id }) => id === stage.idOf("kit"))!.hours).toEqual({ from: "18:00", to: "23:00" });
    expect(after.verdict).toEqual(before.verdict);
    expect((await sourceIn(await send("kit", { hours: null }), "kit")).hours).toBeNull();
  });

  it("are refused where they are no hours of a day", async () => {
    const answer = await send("kit", { hours: { from: "25:00", to: "23:00" } });
    expect(await fieldsOf(answer)).toEqual({ "hours.from": "An hour is needed, such as 18:30." });
  });
});
