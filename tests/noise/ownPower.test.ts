import { describe, expect, it } from "vitest";
import plumtree from "../../data/examples/plumtree-row.json";
import { dailyMinutes } from "../../lib/noise/exposure";
import { powerInRoom, powerOutdoors } from "../../lib/noise/ownPower";
import { planSchema, type Plan } from "../../lib/noise/plan";
import { solve } from "../../lib/noise/solve";
import { toArithmetic } from "../../lib/noise/spectrum";
import { expectClose, upper } from "./close";
import rooms from "./truth/rooms.json";

const nine = (values: readonly number[]) => Float64Array.from([NaN, ...values]);
const everywhere = (value: number) => new Float64Array(9).fill(value);
const plan = planSchema.parse(plumtree);

describe("the power behind a level", () => {
  it("is the printed level at 1.5 m with the printed difference put back (VDI 2081, room 102)", () => {
    const { level } = rooms;
    const found = level.q.map((q, i) => powerInRoom({ levels: nine(level.difference.map((difference) => 70 - difference)), distance: level.distance, q, absorption: everywhere(level.area) })[i + 1]!);
    expectClose(found, level.q.map(() => 70), level.tolerance);
  });

  it("is 8 dB more than the level a metre away in the open over hard ground, and 20 dB more at ten metres", () => {
    expectClose(powerOutdoors(everywhere(60), 1), new Array(9).fill(68), 1e-9);
    expectClose(powerOutdoors(everywhere(60), 10), new Array(9).fill(88), 1e-9);
  });

  it("is not known where the level or the room is not, and silent where nothing was heard", () => {
    const absorption = everywhere(10);
    absorption[3] = NaN;
    const levels = everywhere(80);
    levels[1] = NaN;
    levels[2] = -Infinity;
    const found = powerInRoom({ levels, distance: 1, q: 1, absorption });
    expect([...found].map((level) => Number.isFinite(level))).toEqual([true, false, false, false, true, true, true, true, true]);
    expect(found[2]).toBe(-Infinity);
  });

  it("gives back what a listener in the room is said to hear", () => {
    const room = plan.spaces[0]!;
    const alone: Plan = {
      ...plan,
      sources: plan.sources.slice(0, 1),
      outlets: [],
      situations: [],
      elements: [],
      paths: [],
      criteria: [],
      receivers: [{ ...plan.receivers[0]!, id: "ear", kind: "room", spaceId: room.id, position: null, distances: { [plan.sources[0]!.id]: 2 } }],
    };
    const heard = solve(alone).receivers[0]!.bands.map(({ level }) => Number(level));
    if (room.absorption.kind !== "area") throw new Error("The room of this example is given by its absorption.");
    const found = powerInRoom({ levels: Float64Array.from(heard), distance: 2, q: 1, absorption: toArithmetic(room.absorption.area) });
    expectClose(upper(found), upper(alone.sources[0]!.power!) as number[], 0.01);
  });
});

describe("the daily measure of bare ears", () => {
  it("is the printed table of NIOSH 98-126", () => {
    const table = [[85, 8], [88, 4], [91, 2], [94, 1], [97, 0.5], [100, 0.25]] as const;
    for (const [level, hours] of table) expect(dailyMinutes(level)).toBeCloseTo(60 * hours, 9);
  });
});

describe("what a verdict says of a source", () => {
  const { sources } = solve(plan);

  it("has its doubt in every band, and its level a metre away where it stands in a room", () => {
    for (const { id, deviation } of plan.sources) expect(sources![id]!.doubts).toEqual(deviation);
    expect(sources!.condenser!.near).toBeNull();
    expect(sources!.fan!.near).toBeNull();
    expect(sources!.kit!.near!.levels.every((level) => typeof level === "number")).toBe(true);
  });

  it("halves the minutes for every 3 dB, and counts a source without its unknown bands", () => {
    const louder = (by: number, band = -1) => {
      const kit = plan.sources[0]!;
      const power = kit.power!.map((level, i) => (i === band ? null : Number(level) + by));
      return solve({ ...plan, sources: [{ ...kit, power }, ...plan.sources.slice(1)] }).sources!.kit!.near!;
    };
    expect(louder(3).minutes! / louder(0).minutes!).toBeCloseTo(0.5, 9);
    expect(louder(0, 4).levels[4]).toBe("unknown");
    expect(Number(louder(0, 4).dba)).toBeLessThan(Number(louder(0).dba));
  });
});
