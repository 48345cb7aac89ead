import { describe, expect, it } from "vitest";
import { faceDoubts, faceOf, normalOf, placeInFace, sizeOfFace } from "@/components/walls/faces";
import { additionOf, areaOfDraft, placeOfDraft, type Draft } from "@/components/walls/newElement";
import { partSchemas } from "@/lib/noise/plan";
import { demoPlan } from "./fixtures/wallsAnswer";

const box = demoPlan.spaces.find(({ id }) => id === "live-room")!.box!;
const draft: Draft = {
  pathId: null, fromSpaceId: "live-room", toSpaceId: null, pathName: "", kind: "wall", name: "East wall", face: "east",
  width: null, height: null, along: null, up: null, area: null, catalogueKey: null,
};
const bare = { ...demoPlan, elements: [], paths: [] };

describe("faces of a room", () => {
  it("has its doors where the demo has them", () => {
    const door = demoPlan.elements.find(({ id }) => id === "yard-door")!;
    expect(placeInFace(box, "east", 0.75, 1.05)).toEqual(door.position);
    expect(normalOf("east")).toEqual(door.normal);
    expect(sizeOfFace(box, "east")).toEqual([4.5, 2.35]);
  });

  it("knows a face by its normal and says nothing of others", () => {
    expect(faceOf([0, -1, 0])).toBe("south");
    expect(faceOf([0.6, 0.8, 0])).toBeNull();
    expect(faceOf(null)).toBeNull();
  });
});

describe("what is added", () => {
  it("fills its face, at the middle, looking out", () => {
    expect(areaOfDraft(bare, draft)).toBe(10.575);
    expect(placeOfDraft(bare, draft)).toEqual([0, 0, 1.175]);
  });

  it("leaves out of a wall what stands in it already", () => {
    const door = { ...demoPlan, elements: demoPlan.elements.filter(({ id }) => id === "yard-door") };
    expect(areaOfDraft(door, { ...draft, pathId: "live-east" })).toBe(8.685);
  });

  it("makes the boundary with the first thing in it, and points at it", () => {
    const [path, element] = additionOf(bare, { ...draft, catalogueKey: "some-wall" });
    expect(path).toMatchObject({ part: "paths", as: "new:boundary", values: { fromSpaceId: "live-room", toSpaceId: null, name: "Live room, east face" } });
    expect(element).toMatchObject({ part: "elements", values: { pathId: "new:boundary", construction: { catalogueKey: "some-wall" } } });
  });

  it.each(["wall", "roof", "floor", "ceiling", "door", "window", "leak", "duct", "flanking"] as const)("a %s is one that the plan's own schema reads", (kind) => {
    const changes = additionOf(demoPlan, { ...draft, pathId: "live-east", kind, name: "New", ...(kind === "roof" && { face: "roof" }) });
    const [change] = changes;
    if (change?.act !== "add") throw new Error("Nothing was added.");
    expect(partSchemas.element.safeParse({ ...change.values, id: "x" }).error).toBeUndefined();
  });

  it("waits for the area where nothing tells it", () => {
    const between: Draft = { ...draft, toSpaceId: "control-room", face: null };
    expect(additionOf(bare, between)).toEqual([]);
    expect(additionOf(bare, { ...between, area: 5.62 })[1]).toMatchObject({ values: { area: 5.62, position: null, normal: null, size: null } });
  });
});

describe("doubts about a face", () => {
  it("has none about the demo's yard", () => {
    expect(demoPlan.paths.flatMap(({ id }) => faceDoubts(demoPlan, id))).toEqual([]);
  });

  it("says where openings and walls are more than the face, and where one reaches out of it", () => {
    const changed = (patch: object) => ({ ...demoPlan, elements: demoPlan.elements.map((one) => (one.id === "yard-door" ? { ...one, ...patch } : one)) });
    expect(faceDoubts(changed({ area: 4 }), "live-east")).toEqual(["What stands in the east face adds up to 12.7\u00a0m², and that face of the room has 10.6\u00a0m²."]);
    expect(faceDoubts(changed({ position: [0, -2, 1.05] }), "live-east")).toEqual(["Yard door reaches out of the east face of the room."]);
  });
});
