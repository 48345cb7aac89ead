import { beforeEach, describe, expect, it } from "vitest";
import { Revision } from "../../models/index";
import { ask } from "../build";
import { buildStage, type Stage } from "./actors";
import { findRoute } from "./routes";

let stage: Stage;
beforeEach(async () => {
  stage = await buildStage();
});

interface Answered {
  revision: number;
  plan: Stage["plan"];
  error?: { message: string; fields?: Record<string, string> };
}

async function send(changes: unknown) {
  const POST = await findRoute("POST /api/projects/[projectId]/changes");
  const { revision } = await stage.project.reload();
  const response = await ask(POST, { method: "POST", cookie: stage.cookies.owner, params: { projectId: stage.project.id }, revision, body: { changes } });
  return { status: response.status, answer: (await response.json()) as Answered, before: revision };
}

const room = (name: string, buildingId: string) => ({
  act: "add",
  part: "spaces",
  as: "new:room",
  values: { buildingId, name, volume: 20, box: null, absorption: { kind: "surfaces", model: "sabine", air: true, objects: [] } },
});

describe("several changes as one", () => {
  it("a room with its surface and its wall are one revision; later changes point at what earlier ones added", async () => {
    const { status, answer, before } = await send([
      room("Store", stage.idOf("studio")),
      { act: "add", part: "surfaces", values: { spaceId: "new:room", name: "Walls", area: 30, libraryKey: "plasterboard-13-studs" } },
      { act: "add", part: "paths", as: "new:face", values: { fromSpaceId: "new:room", toSpaceId: null, name: "Store, east face" } },
      {
        act: "add",
        part: "elements",
        values: { pathId: "new:face", kind: "door", name: "Store door", area: 1.9, position: null, normal: null, size: null, params: {}, construction: { catalogueKey: "door-mdf-3x18-damped" } },
      },
    ]);
    expect(status, JSON.stringify(answer.error)).toBe(200);
    expect(answer.revision).toBe(before + 1);
    const store = answer.plan.spaces.find(({ name }) => name === "Store")!;
    expect(answer.plan.surfaces.find(({ spaceId }) => spaceId === store.id)).toMatchObject({ finishKey: "plasterboard-13-studs", area: 30 });
    const face = answer.plan.paths.find(({ fromSpaceId }) => fromSpaceId === store.id)!;
    const door = answer.plan.elements.find(({ pathId }) => pathId === face.id)!;
    expect(answer.plan.constructions.find(({ id }) => id === door.constructionId)?.catalogueKey).toBe("door-mdf-3x18-damped");
    const { acts } = await Revision.findOne({ where: { projectId: stage.project.id, revision: answer.revision }, rejectOnEmpty: true });
    expect(acts.map(({ kind, act }) => `${act} ${kind}`)).toEqual(["add space", "add surface", "add path", "add element", "add construction", "change element"]);
  });

  it("one that does not fit undoes all, and its field is named with its place", async () => {
    const rooms = stage.plan.spaces.length;
    const { status, answer, before } = await send([room("Store", stage.idOf("studio")), { act: "change", part: "elements", id: stage.idOf("yard-door"), patch: { area: -1 } }]);
    expect(status).toBe(422);
    expect(Object.keys(answer.error?.fields ?? {})).toEqual(["changes.1.patch.area"]);
    expect((await stage.project.reload()).revision).toBe(before);
    const { answer: after } = await send([{ act: "change", part: "elements", id: stage.idOf("yard-door"), patch: { area: 1.7 } }]);
    expect(after.plan.spaces).toHaveLength(rooms);
  });

  it("what another project holds is not there, whether changed or pointed at", async () => {
    const foreign = stage.sibling.idOf("yard-door");
    expect((await send([{ act: "remove", part: "elements", id: foreign }])).status).toBe(404);
    expect((await send([room("Store", stage.sibling.idOf("studio"))])).status).toBe(422);
  });

  it("an empty list, an unknown act and a name that was never given are refused in words", async () => {
    for (const changes of [[], [{ act: "swap", part: "fences", id: "x" }], [{ act: "add", part: "surfaces", values: { spaceId: "new:nothing", name: "Walls", area: 3, libraryKey: "plasterboard-13-studs" } }]]) {
      const { status, answer } = await send(changes);
      expect(status).toBe(422);
      expect(answer.error?.message).toBeTruthy();
    }
  });
});

describe("records of the library", () => {
  const kit = () => ({ act: "change", part: "sources", id: stage.idOf("kit") });

  it("a source of the library brings its figures and where they were read", async () => {
    const { answer } = await send([{ ...kit(), patch: { libraryKey: "drum-kit-brushes" } }]);
    const source = answer.plan.sources.find(({ id }) => id === stage.idOf("kit"))!;
    expect(source).toMatchObject({ basis: "estimated", name: "Drum kit, brushes" });
    expect(source.provenance.document.length).toBeGreaterThan(4);
  });

  it("figures typed over a record no longer bear its name", async () => {
    await send([{ ...kit(), patch: { libraryKey: "drum-kit-brushes" } }]);
    const { answer } = await send([{ ...kit(), patch: { power: new Array(9).fill(80) } }]);
    expect(answer.plan.sources.find(({ id }) => id === stage.idOf("kit"))).toMatchObject({ basis: "typed", deviation: null, provenance: { document: "Own figures" } });
  });

  it("a record’s figures cannot be changed in the same breath, nor its key made up", async () => {
    const both = await send([{ ...kit(), patch: { libraryKey: "drum-kit-brushes", power: new Array(9).fill(10) } }]);
    expect([both.status, Object.keys(both.answer.error?.fields ?? {})]).toEqual([422, ["changes.0.patch.power"]]);
    expect((await send([{ ...kit(), patch: { libraryKey: "no-such-kit" } }])).status).toBe(422);
  });

  it("a limit of the library is copied whole with its clause and the levels its edition gives", async () => {
    const { answer, status } = await send([{ act: "change", part: "criteria", id: stage.plan.criteria[0]!.id, patch: { libraryKey: "nc-20" } }]);
    expect(status, JSON.stringify(answer.error)).toBe(200);
    expect(answer.plan.criteria[0]).toMatchObject({ metric: "NC", value: 20, edition: "ANSI/ASA S12.2-2019" });
    expect(answer.plan.criteria[0]!.levels).toEqual([63, 50, 40, 33, 26, 22, 20, 17, 16]);
  });
});
