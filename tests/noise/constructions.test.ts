import { describe, expect, test } from "vitest";
import { constructionSchema, type Construction } from "../../lib/noise/construction";
import { effectiveLoss } from "../../lib/noise/effective";
import { elementSchema } from "../../lib/noise/elements";
import { countLeaves, describeLayers, massOf, thicknessOf } from "../../lib/noise/layers";
import { passingOfElement } from "../../lib/noise/model/passing";
import { transmissionCached } from "../../lib/noise/transmission";
import { expectClose } from "./close";

const provenance = { document: "a test", clause: "", memory: false };
const board = (material: string, thickness: number, bond = "screwed") => ({
  kind: "board",
  name: material,
  material,
  thickness,
  bond,
});
const cavity = (thickness: number, connection = "double_stud", fill = 0) => ({
  kind: "cavity",
  name: "cavity",
  thickness,
  fill,
  connection,
});
const gap = { kind: "ventilated gap", name: "battens", thickness: 0.025 };

function build(layers: object[], change: object = {}): Construction {
  return constructionSchema.parse({
    id: "c",
    name: "c",
    fits: ["wall"],
    catalogueKey: null,
    layers,
    tl: null,
    bases: null,
    provenance,
    ...change,
  });
}
const wall = [
  board("fibre_cement", 0.009),
  board("osb", 0.012),
  cavity(0.205, "double_stud", 0.18),
  board("gypsum_dense", 0.015),
  board("gypsum_dense", 0.015),
];

describe("layers", () => {
  test("read from the yard to the room are two leaves and a cavity", () => {
    expect(describeLayers(build(wall))).toMatchObject({
      kind: "double",
      cavity: 0.205,
      fill: 0.18,
      connection: { kind: "double_stud", spacing: 0.406 },
      leaf1: {
        plies: [
          ["fibre_cement", 0.009],
          ["osb", 0.012],
        ],
        bond: "screwed",
      },
    });
  });
  test("outside a ventilated gap count for mass and thickness, not for loss", () => {
    const clad = build([board("fibre_cement", 0.009), gap, ...wall.slice(1)]);
    expect(describeLayers(clad)).toMatchObject({ leaf1: { plies: [["osb", 0.012]] } });
    expect(massOf(clad)).toBeCloseTo(massOf(build(wall)) ?? NaN, 9);
    expect(thicknessOf(clad)).toBeCloseTo(0.281, 9);
  });
  test("glued or damped all through are so as one leaf; mixed they count as loose", () => {
    const damped = [board("mdf", 0.018), board("mdf", 0.018, "damped"), board("mdf", 0.018, "damped")];
    expect(describeLayers(build(damped))).toMatchObject({ kind: "single", leaf: { bond: "damped" } });
    expect(describeLayers(build([...damped, board("mdf", 0.018)]))).toMatchObject({
      leaf: { bond: "screwed" },
    });
    expect(massOf(build(damped))).toBeCloseTo(40.5, 9);
  });
  test("that do not say enough give no description", () => {
    expect(describeLayers(build([]))).toBeNull();
    expect(describeLayers(build([board("moon rock", 0.02)]))).toBeNull();
    expect(
      describeLayers(
        build([board("osb", 0.012), cavity(0.1), board("osb", 0.012), cavity(0.1), board("osb", 0.012)]),
      ),
    ).toBeNull();
    expect(
      describeLayers(build([board("osb", 0.012), cavity(0.1), cavity(0.1), board("osb", 0.012)])),
    ).toBeNull();
  });
  test("a cavity that no leaf closes is left out", () => {
    expect(describeLayers(build([cavity(0.1), board("osb", 0.012), cavity(0.1)]))).toMatchObject({
      kind: "single",
    });
    expect(countLeaves(build(wall))).toBe(2);
  });
});

describe("what a construction lets pass", () => {
  const laboratory = (tl: (number | null)[], layers: object[]) => effectiveLoss(build(layers, { tl }));
  test("is calculated from its layers, estimated below 50 Hz", () => {
    const { loss, bases } = effectiveLoss(build(wall));
    expectClose(loss.slice(0, 5), [14.2, 28.5, 47.5, 60.8, 68.9], 0.15);
    expect(bases.slice(0, 3)).toEqual(["estimated", "calculated", "calculated"]);
  });
  test("is what the laboratory found where it measured", () => {
    const tl = [7, 13, 17, 21, 26, 29, 31, 34, 32];
    const { loss, bases, laboratory: leads } = laboratory(tl, wall);
    expect(Array.from(loss)).toEqual(tl);
    expect(new Set(bases)).toEqual(new Set(["laboratory"]));
    expect(leads).toBe(true);
  });
  test("is extended by the model's difference where the layers are known, and marked estimated", () => {
    const description = describeLayers(build(wall));
    const model = description ? transmissionCached(description).octave : [];
    const { loss, bases } = laboratory([null, null, 45, 58, 66, 70, 64, 66, null], wall);
    expectClose(
      [loss[1], loss[0], loss[8]],
      [45 + model[1] - model[2], 45 + model[0] - model[2], 66 + model[8] - model[7]],
      1e-9,
    );
    expect(bases).toEqual(["estimated", "estimated", ...new Array(6).fill("laboratory"), "estimated"]);
  });
  test("of one leaf without a model falls 6 dB an octave downwards and stays flat upwards", () => {
    const { loss } = laboratory([null, null, 20, 24, 28, 30, 32, 34, null], [board("moon rock", 0.04)]);
    expect([loss[0], loss[1], loss[8]]).toEqual([8, 14, 34]);
  });
  test("of two leaves without a model, or of nobody knows what, stays unknown", () => {
    const two = [board("moon rock", 0.01), cavity(0.1), board("osb", 0.012)];
    expect(laboratory([null, 18, 20, 24, 28, 30, 32, 34, 36], two).loss[0]).toBeNaN();
    expect(laboratory([null, 18, 20, 24, 28, 30, 32, 34, 36], []).loss[0]).toBeNaN();
    expect(effectiveLoss(build([])).loss.every(Number.isNaN)).toBe(true);
  });
});

describe("an element whole", () => {
  const element = (change: object) =>
    elementSchema.parse({
      kind: "window",
      id: "e",
      pathId: "p",
      name: "pane",
      area: 1.2,
      constructionId: "c",
      position: null,
      normal: null,
      size: null,
      params: { openArea: 0.25 },
      ...change,
    });
  test("refuses an opening larger than the whole, beside the field that says so", () => {
    expect(() => element({ params: { openArea: 1.3 } })).toThrow(/larger than the whole/);
    expect(() => element({ kind: "door", area: 1.9, params: { gapArea: 0.99 } })).not.toThrow();
    expect(() => element({ kind: "door", area: 0.5, params: { gapArea: 0.99 } })).toThrow(/gapArea/);
  });
  const loss = effectiveLoss(build(wall));
  const even = effectiveLoss(build([], { tl: new Array(9).fill(40) }));
  test("lets its open part pass beside its glass", () => {
    // 1.2 m² of 40 dB are as an opening of 1.2 cm².
    const { passing } = passingOfElement(element({}), even);
    expect(passing[4]).toBeCloseTo(0.25012, 12);
  });
  test("rests on its open part where nearly all passes there", () => {
    const { bases, deviations } = passingOfElement(element({}), loss);
    expect(bases[4]).toBe("measured");
    expect(deviations[4]).toBeCloseTo(2, 2);
    expect(passingOfElement(element({ params: { openArea: 0 } }), loss).deviations[4]).toBe(4);
  });
  test("with an unknown construction is unknown, and its open part is known", () => {
    const { passing, unknown } = passingOfElement(element({}), null);
    expect(Array.from(passing)).toEqual(new Array(9).fill(0.25));
    expect(unknown).toBe(511);
  });
  test("has the field limit of its building beside it", () => {
    // 1.2 cm² for the 40 dB and a tenth of that for the 50 dB.
    const limited = passingOfElement(element({ limit: 50, params: { openArea: 0 } }), even).passing[4];
    expect(limited).toBeCloseTo(1.32e-4, 12);
  });
});
