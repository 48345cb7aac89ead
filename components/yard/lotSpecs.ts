import type { Plan } from "../../lib/noise/plan";
import { changeOf, type FieldSpec } from "../plan/fieldSpec";
import { changeTree } from "./moves";
import { cornersOf, movedBy, rectangleOf, type Corner, type Rectangle } from "./geometry";
import { moveOf } from "./moves";

const REACH = 1000;

/** Ground in words, as the factors that the method names: hard 0, porous 1 (ISO 9613-2, 7.3.1). */
const GROUNDS = [
  { value: "0", label: "hard: paving, water, ice" },
  { value: "0.5", label: "mixed" },
  { value: "1", label: "porous: grass, beds, trees" },
];

function groundSpec({ ground }: Plan["lot"], at: 0 | 1 | 2, label: string): FieldSpec {
  const value = `${ground[at]}`;
  const known = GROUNDS.some((choice) => choice.value === value);
  return {
    kind: "choice",
    label,
    value,
    choices: known ? GROUNDS : [...GROUNDS, { value, label: `own figure, ${value}` }],
    changes: (chosen, { lot }) => changeOf("lots", lot.id, { ground: lot.ground.map((factor, index) => (index === at ? Number(chosen) : factor)) }),
  };
}

/** Street, ground and air of a lot. */
export function lotSpecs({ lot }: Plan): FieldSpec[] {
  const patch = (field: string) => (value: unknown, plan: Plan) => changeOf("lots", plan.lot.id, { [field]: value });
  const air = (field: "temperature" | "indoorTemperature", label: string, min: number): FieldSpec => ({ kind: "quantity", quantity: "temperature", label, value: lot[field], min, max: 50, changes: patch(field) });
  const damp = (field: "humidity" | "indoorHumidity", label: string): FieldSpec => ({ kind: "number", unit: "%", label, value: lot[field], min: 1, max: 100, changes: patch(field) });
  return [
    { kind: "words", label: "Street", value: lot.street, most: 120, optional: true, wide: true, changes: patch("street") },
    groundSpec(lot, 0, "Ground by the studio"),
    groundSpec(lot, 1, "Ground between"),
    groundSpec(lot, 2, "Ground by the listener"),
    air("temperature", "Air outdoors", -30),
    damp("humidity", "Humidity outdoors"),
    air("indoorTemperature", "Air indoors", -10),
    damp("indoorHumidity", "Humidity indoors"),
  ];
}

/** Where an outline is kept, and how it is sent. */
export interface OutlineOf {
  part: "lots" | "buildings";
  id: string;
}

const outlineIn = (plan: Plan, { part, id }: OutlineOf): Corner[] | null | undefined =>
  part === "lots" ? plan.lot.outline : plan.buildings.find((one) => one.id === id)?.footprint;

export const changeOutline = (of: OutlineOf, outline: readonly Corner[]) => changeOf(of.part, of.id, { [of.part === "lots" ? "outline" : "footprint"]: outline });

/** The four figures of a rectangle. A building that is moved takes its rooms along; one that grows does not. */
export function rectangleSpecs(of: OutlineOf, rectangle: Rectangle): FieldSpec[] {
  const side = (field: keyof Rectangle, label: string, min: number): FieldSpec => ({
    kind: "quantity",
    quantity: "length",
    label,
    value: rectangle[field],
    min,
    max: REACH,
    changes: (value, plan) => {
      const standing = rectangleOf(outlineIn(plan, of) ?? []);
      if (!standing || value === null) return [];
      if (of.part === "buildings" && field === "x") return moveOf(plan, of, value - standing.x, 0);
      if (of.part === "buildings" && field === "y") return moveOf(plan, of, 0, value - standing.y);
      return changeOutline(of, cornersOf({ ...standing, [field]: value }));
    },
  });
  return [side("x", "West side at", -REACH), side("y", "South side at", -REACH), side("width", "Width, west to east", 0.1), side("depth", "Depth, south to north", 0.1)];
}

/** Both figures of every corner, in order round the outline. */
export function cornerSpecs(of: OutlineOf, outline: readonly Corner[]): FieldSpec[][] {
  const figure = (at: number, axis: 0 | 1): FieldSpec => ({
    kind: "quantity",
    quantity: "length",
    label: `Corner ${at + 1}, ${axis === 0 ? "east" : "north"}`,
    value: outline[at]![axis],
    min: -REACH,
    max: REACH,
    changes: (value, plan) => {
      const standing = outlineIn(plan, of);
      if (!standing?.[at] || value === null) return [];
      return changeOutline(of, standing.map((corner, index): Corner => (index === at ? (axis === 0 ? [value, corner[1]] : [corner[0], value]) : corner)));
    },
  });
  return outline.map((_, at) => [figure(at, 0), figure(at, 1)]);
}

export function treeSpecs({ lot }: Plan, at: number): FieldSpec[] {
  const tree = lot.trees[at];
  if (!tree) return [];
  type Tree = typeof tree;
  const figure = (label: string, value: number, [min, max]: [number, number], changed: (tree: Tree, figure: number) => Tree): FieldSpec => ({
    kind: "quantity",
    quantity: "length",
    label,
    value,
    min,
    max,
    changes: (typed, plan) => (typed === null ? [] : changeTree(plan, at, (standing) => changed(standing, typed))),
  });
  return [
    figure("East", tree.at[0], [-REACH, REACH], (one, x) => ({ ...one, at: movedBy(one.at, x - one.at[0], 0) })),
    figure("North", tree.at[1], [-REACH, REACH], (one, y) => ({ ...one, at: movedBy(one.at, 0, y - one.at[1]) })),
    figure("Height", tree.height, [0.5, 60], (one, height) => ({ ...one, height })),
    figure("Crown, across", tree.crown, [0.2, 30], (one, crown) => ({ ...one, crown })),
  ];
}
