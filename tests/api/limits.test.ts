import { beforeEach, describe, expect, it } from "vitest";
import { ask } from "../build";
import { buildStage, type Stage } from "./actors";
import { findRoute } from "./routes";

let stage: Stage;
beforeEach(async () => {
  stage = await buildStage();
});

interface Answered {
  plan: Stage["plan"];
  error?: { message: string; fields?: Record<string, string> };
}

async function send(changes: unknown) {
  const POST = await findRoute("POST /api/projects/[projectId]/changes");
  const { revision } = await stage.project.reload();
  const response = await ask(POST, { method: "POST", cookie: stage.cookies.owner, params: { projectId: stage.project.id }, revision, body: { changes } });
  return { status: response.status, answer: (await response.json()) as Answered };
}

const change = (id: string, patch: object) => send([{ act: "change", part: "criteria", id, patch }]);

describe("limits of a yard", () => {
  it("a listener and its limit are one change; a curve by its number is frozen as nine levels", async () => {
    const listener = { name: "No. 11, attic", says: "", kind: "outdoor", spaceId: null, position: [9, 2, 1.5], facade: false, side: "far", distances: {} };
    const { status, answer } = await send([
      { act: "add", part: "receivers", as: "new:listener", values: listener },
      { act: "add", part: "criteria", values: { libraryKey: "nc-25", receiverId: "new:listener" } },
    ]);
    expect(status, JSON.stringify(answer.error)).toBe(200);
    const { id } = answer.plan.receivers.find(({ name }) => name === listener.name)!;
    const limit = answer.plan.criteria.find(({ receiverId }) => receiverId === id)!;
    expect(limit).toMatchObject({ metric: "NC", value: 25, clauseText: "", window: null, background: null });
    expect(limit.levels).toEqual([65, 54, 44, 37, 31, 27, 24, 22, 22]);
  });

  it("a band that an edition does not hold stays without a limit", async () => {
    const id = stage.idOf("no9-limit");
    const { answer } = await change(id, { metric: "NC", value: 25, edition: "classic", levels: null, above: null });
    expect(answer.plan.criteria.find((limit) => limit.id === id)!.levels).toEqual([null, 54, 44, 37, 31, 27, 24, 22, 21]);
  });

  it("keeps the words, the days, the window and the night, and no verdict rests on them", async () => {
    const id = stage.idOf("no9-limit");
    const night = [44, 37, 33, 28, 22, 18, 15, 13, 11];
    const words = { clauseText: "Between 22:00 and 07:00 …", inForce: "2024-03-01", readOn: "2026-09-27", indoors: true, window: "ajar", background: night, backgroundSays: "three nights" };
    const { status, answer } = await change(id, words);
    expect(status, JSON.stringify(answer.error)).toBe(200);
    expect(answer.plan.criteria.find((limit) => limit.id === id)).toMatchObject({ ...words, levels: [49, 42, 38, 33, 27, 23, 20, 18, 16] });
  });

  it("refuses a day that is none, beside its field", async () => {
    const { status, answer } = await change(stage.idOf("no9-limit"), { inForce: "2024-02-31" });
    expect(status).toBe(422);
    expect(Object.keys(answer.error?.fields ?? {})).toEqual(["changes.0.patch.inForce"]);
  });
});
