import { describe, expect, it } from "vitest";
import { withChanges, moveOf } from "@/components/yard/moves";
import { cornersOf, rectangleOf } from "@/components/yard/geometry";
import { additionOf, duplicateOf } from "@/components/yard/newThings";
import { planScale } from "@/components/yard/planScale";
import { removalOf } from "@/components/yard/removals";
import { edgeOf, mouthOf, ribbonsOf, waysInto } from "@/components/yard/sheaf";
import { groupsOf } from "@/components/yard/things";
import { placeLabels, takenBoxes } from "@/components/yard/planLabels";
import { overlaps } from "@/components/verdict/placeLabels";
import { partSchemas, planSchema } from "@/lib/noise/plan";
import { solve } from "@/lib/noise/solve";
import { buildAnswer, demoPlan } from "./fixtures/wallsAnswer";

const answer = buildAnswer();
const lead = answer.verdict.receivers.find(({ receiverId }) => receiverId === answer.verdict.leadingReceiverId)!;

describe("an outline", () => {
  it("is a rectangle only where four corners span their own extent", () => {
    const rectangle = { x: -8.5, y: -17.5, width: 15.5, depth: 24.5 };
    expect(rectangleOf(cornersOf(rectangle))).toEqual(rectangle);
    expect(rectangleOf([[0, 0], [4, 0], [4, 3], [1, 3]])).toBeNull();
    expect(rectangleOf([[0, 0], [4, 0], [4, 3]])).toBeNull();
  });
});

describe("moving", () => {
  it("takes along everything that is in a building, so that nothing inside is heard differently", () => {
    const moved = planSchema.parse(withChanges(demoPlan, moveOf(demoPlan, { part: "buildings", id: "studio" }, 1.3, -0.4)));
    const inside = (plan: typeof demoPlan) => solve(plan).receivers.find(({ receiverId }) => receiverId === "control-listener")!.bands.map(({ level }) => Number(level));
    expect(moved.spaces.find(({ id }) => id === "live-room")!.box!.at).toEqual([-3, -2.65, 0]);
    expect(moved.elements.find(({ id }) => id === "yard-door")!.position).toEqual([1.3, -1.9, 1.05]);
    expect(moved.sources.find(({ id }) => id === "kit")!.position).toEqual([-1.3, 0.2, 0.8]);
    expect(moved.elements.find(({ id }) => id === "no9-window")).toEqual(demoPlan.elements.find(({ id }) => id === "no9-window"));
    // Only what hums in the yard comes from a little elsewhere.
    for (const [band, level] of inside(demoPlan).entries()) expect(inside(moved)[band]).toBeCloseTo(level, 3);
  });

  it("slides an opening along its face and never out of it", () => {
    const [change] = moveOf(demoPlan, { part: "elements", id: "yard-door" }, 1, 0.1);
    expect(change).toMatchObject({ patch: { position: [0, -1.4, 1.05] } });
    expect(moveOf(demoPlan, { part: "elements", id: "yard-door" }, 1, 0)).toEqual([]);
  });

  it("sends the whole list of trees for one tree", () => {
    const moved = withChanges(demoPlan, moveOf(demoPlan, { part: "trees", id: "1" }, 0.1, 0));
    expect(moved.lot.trees.map(({ at }) => at)).toEqual([[-5, 4.8], [10.5, 1.4], [-6, -5.2], [11.2, -8.4]]);
  });
});

describe("adding", () => {
  const kinds = { buildings: "building", fences: "fence", receivers: "receiver", sources: "source" } as const;
  it.each(Object.entries(kinds))("%s gives a part that the plan's own schema reads", (part, kind) => {
    const [change] = additionOf(demoPlan, part as keyof typeof kinds);
    if (change?.act !== "add") throw new Error("Nothing was added.");
    expect(partSchemas[kind].safeParse({ ...change.values, id: "x" }).error).toBeUndefined();
  });

  it("gives a copy a name of its own and a place aside", () => {
    const [change] = duplicateOf(demoPlan, { part: "fences", id: "fence" });
    expect(change).toMatchObject({ act: "add", part: "fences", values: { name: "Fence, east line, copy", p1: [8, -17.5], p2: [8, 7] } });
  });

  it("draws a lot round what stands there already", () => {
    const bare = { ...demoPlan, lot: { ...demoPlan.lot, outline: null } };
    expect(additionOf(bare, "lots")).toMatchObject([{ act: "change", part: "lots", patch: { outline: expect.any(Array) } }]);
  });
});

describe("removing", () => {
  it("brings back a listener with its limits", () => {
    const { undo } = removalOf(demoPlan, { part: "receivers", id: "no9-bedroom" });
    const limits = demoPlan.criteria.filter(({ receiverId }) => receiverId === "no9-bedroom");
    expect(undo[0]).toMatchObject({ act: "add", part: "receivers", as: "new:again", values: { name: "No. 9, bedroom" } });
    expect(undo.slice(1)).toHaveLength(limits.length);
    expect(undo[1]).toMatchObject({ part: "criteria", values: { receiverId: "new:again", levels: limits[0]!.levels } });
  });

  it("brings back a source into the situations it was taken out of", () => {
    const { undo } = removalOf(demoPlan, { part: "sources", id: "condenser" });
    const played = undo.find((change) => change.part === "situations");
    expect(played).toMatchObject({ act: "change", id: "still-night", patch: { playing: expect.arrayContaining([{ sourceId: "new:again", share: 1 }, { sourceId: "kit", share: 1 }]) } });
  });
});

describe("the sheaf", () => {
  const ways = waysInto(demoPlan, lead, 1);
  const mouth = mouthOf(demoPlan, lead)!;
  const ribbons = ribbonsOf({ ways, mouth: { at: [500, 300], out: mouth.out }, full: 50, toPixels: ([x, y]) => [100 + x * 20, 300 - y * 20] });

  it("ends at the window that lets the sound in", () => {
    expect(mouth.elementId).toBe("no9-window");
  });

  it("is as wide as its window, and each ribbon as wide as its share", () => {
    const thick = ribbons.filter(({ thin }) => !thin);
    expect(thick.length).toBeGreaterThan(1);
    for (const { way, width } of thick) expect(width).toBeCloseTo(50 * way.share, 9);
    const ends = thick.map(({ middle }) => middle[middle.length - 1]!);
    const spread = Math.max(...ends.map(([, y], at) => y + thick[at]!.width / 2)) - Math.min(...ends.map(([, y], at) => y - thick[at]!.width / 2));
    expect(spread).toBeCloseTo(thick.reduce((sum, { width }) => sum + width, 0), 6);
  });

  it("lays ribbons side by side, none over another, where they arrive", () => {
    const spans = ribbons
      .filter(({ thin }) => !thin)
      .map(({ middle, width }) => [middle[middle.length - 1]![1] - width / 2, middle[middle.length - 1]![1] + width / 2] as const)
      .toSorted(([one], [two]) => one - two);
    for (let at = 1; at < spans.length; at += 1) expect(spans[at]![0]).toBeGreaterThanOrEqual(spans[at - 1]![1] - 1e-9);
  });

  it("draws the edge of a straight band at half its width on both sides", () => {
    expect(edgeOf([[0, 0], [10, 0]], 4)).toEqual([[0, 2], [10, 2], [10, -2], [0, -2]]);
  });
});

describe("the plan", () => {
  it("is drawn with one scale in both directions and with north up", () => {
    const scale = planScale(demoPlan, 800);
    const [x0, y0] = scale.at([0, 0]);
    const [x1, y1] = scale.at([2, 3]);
    expect(x1 - x0).toBeCloseTo(2 * scale.scale, 9);
    expect(y0 - y1).toBeCloseTo(3 * scale.scale, 9);
    expect(scale.width).toBeLessThanOrEqual(800);
  });

  it("names things without covering another name or a mark", () => {
    const scale = planScale(demoPlan, 860);
    const ribbons = ribbonsOf({ ways: waysInto(demoPlan, lead, 1), mouth: { at: scale.at([14, 0]), out: [-1, 0] }, full: 40, toPixels: scale.at });
    const taken = takenBoxes({ plan: demoPlan, scale, ribbons });
    const labels = placeLabels({ plan: demoPlan, verdict: answer.verdict, scale, ribbons, few: false, listenerId: null, taken });
    expect(labels.map(({ words }) => words)).toContain("No. 9, bedroom");
    const boxes = labels.map(({ x, y, words }) => ({ left: x, right: x + words.length * 6, top: y - 12, bottom: y }));
    for (const [at, box] of boxes.entries()) {
      expect(taken.some((other) => overlaps(box, other))).toBe(false);
      expect(boxes.slice(at + 1).some((other) => overlaps(box, other))).toBe(false);
    }
  });

  it("lists the lot, houses, fences, listeners, what hums outdoors and trees", () => {
    expect(groupsOf(demoPlan).map(({ heading, things }) => [heading, things.length])).toEqual([
      ["Lot and air", 1], ["Buildings", 3], ["Fences", 1], ["Listeners", 4], ["Sources outdoors", 2], ["Trees", 4],
    ]);
  });
});
