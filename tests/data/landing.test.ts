import { describe, expect, test } from "vitest";
import { landingAnswers } from "../../app/_server/landingAnswers";
import { landingBuildOf, nightOf } from "../../components/landing/landingBuildOf";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import { planSchema, type Plan } from "../../lib/noise/plan";
import { solve } from "../../lib/noise/solve";
import { library, read } from "./records";

const drawn = planSchema.parse(read("examples/plumtree-row.json"));

function withRecord(plan: Plan, id: string, key: string): Plan {
  const { key: catalogueKey, ...record } = library.constructions.find((each) => each.key === key)!;
  expect(catalogueKey).toBe(key);
  return { ...plan, constructions: plan.constructions.map((own) => (own.id === id ? { ...own, ...record, id } : own)) };
}

function withHeavyDoor(plan: Plan): Plan {
  const door = withRecord(plan, "yard-leaf", "door-mdf-3x18-damped");
  const elements = door.elements.map((each) =>
    each.kind === "door" && each.id === "yard-door" ? { ...each, params: { gapArea: 0.0003 } } : each,
  );
  return { ...door, elements };
}

const heavy = withHeavyDoor(drawn);
const expected = { a: drawn, b: heavy, c: withRecord(heavy, "shell-roof", "roof-own-joists-350") };
const shown = landingAnswers().map(({ key, plan, verdict }) => landingBuildOf(key, plan, verdict));

describe("the figures of the landing page", () => {
  test.each(["a", "b", "c"] as const)("of build %s are those that the solver gives for the demo", (key) => {
    const build = shown.find((each) => each.key === key)!;
    const bed = solve(planSchema.parse(expected[key])).receivers.find(({ receiverId }) => receiverId === "no9-bedroom")!;
    expect(build).toMatchObject({ state: bed.state, margin: bed.margin, doubt: bed.doubt });
    const band = bed.bands[OCTAVE_BANDS.findIndex((each) => each === bed.band)]!;
    expect([build.level, build.limit]).toEqual([band.level, band.limit]);
    expect(build.stations.at(-1)).toMatchObject({ words: "in bed", level: band.level });
    expect(build.stations[0]!.words).toBe("at the kit");
  });

  test("tell the demo's story: over as drawn and with the door, under with the ceiling too", () => {
    expect(shown.map(({ state }) => state)).toEqual(["over", "over", "under"]);
    expect(shown.map(({ where }) => where)).toEqual(Array(3).fill("at 63\u00a0Hz"));
    [-3.7, -1.3, 5.9].forEach((margin, index) => expect(Math.abs(shown[index]!.margin - margin)).toBeLessThan(0.1));
  });

  test("name the ways the noise takes, the largest first, and leave out only what is less than 2 %", () => {
    const { shares } = shown[0]!;
    expect(shares.map(({ kind }) => kind)).toEqual(["roof", "door", "wall"]);
    const sum = shares.reduce((total, { share }) => total + share, 0);
    expect(sum).toBeGreaterThan(0.95);
    expect(sum).toBeLessThanOrEqual(1);
  });

  test("give the leaves as their layers make them", () => {
    expect(shown[0]!.door).toMatchObject({ thickness: 0.043 });
    expect(shown[1]!.door.thickness).toBeGreaterThan(0.054 - 1e-9);
    expect(shown[1]!.door.surfaceMass).toBeGreaterThan(shown[0]!.door.surfaceMass!);
    expect(shown[2]!.roof.name).not.toBe(shown[1]!.roof.name);
  });

  test("hold from ten in the evening to seven in the morning", () => {
    const [{ plan, verdict }] = landingAnswers() as [ReturnType<typeof landingAnswers>[number]];
    expect(nightOf(plan, verdict)).toEqual({ from: 22 * 60, to: 7 * 60 });
  });

  test("are weighed once", () => expect(landingAnswers()).toBe(landingAnswers()));
});
