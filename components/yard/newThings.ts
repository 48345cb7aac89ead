import type { Plan } from "../../lib/noise/plan";
import { partsOf } from "../plan/partsOf";
import type { PlanChange } from "../plan/save";
import { changeOf } from "../plan/fieldSpec";
import { cornersIn, cornersOf, extentOf, middleOf, movedBy, toMillimetre, type Corner, type Extent } from "./geometry";
import type { Thing, ThingGroup } from "./things";

type Addable = ThingGroup["part"];

const whole = (metres: number) => Math.round(metres * 2) / 2;

const groundOf = (plan: Plan): Extent => {
  const corners = plan.lot.outline ?? cornersIn(plan);
  return corners.length > 0 ? extentOf(corners) : { west: 0, east: 16, south: 0, north: 24 };
};

/** A figure, or the same with a number behind it where that name is taken. */
export function freeName(wanted: string, taken: readonly string[]): string {
  if (!taken.includes(wanted)) return wanted;
  for (let number = 2; ; number += 1) if (!taken.includes(`${wanted} ${number}`)) return `${wanted} ${number}`;
}

const namesOf = (parts: readonly { name: string }[]) => parts.map(({ name }) => name);

/** What "Add" puts into the yard: ordinary figures to be changed, at a place one can see. */
export function additionOf(plan: Plan, part: Addable, libraryKey?: string): PlanChange[] {
  const { west, east, south, north } = groundOf(plan);
  const middle: Corner = [whole((west + east) / 2), whole((south + north) / 2)];
  switch (part) {
    case "lots":
      return changeOf("lots", plan.lot.id, { outline: cornersOf({ x: whole(west), y: whole(south), width: whole(east - west), depth: whole(north - south) }) });
    case "buildings":
      return [{ act: "add", part, values: newBuilding(plan, middle) }];
    case "fences":
      return [{ act: "add", part, values: { name: freeName("Fence", namesOf(plan.fences)), p1: [east, south], p2: [east, north], height: 1.8, thickness: 0 } }];
    case "receivers":
      return [{ act: "add", part, values: { name: freeName("Listener", namesOf(plan.receivers)), says: "", kind: "outdoor", spaceId: null, position: [east, middle[1], 1.5], facade: false, side: "far", distances: {} } }];
    case "sources":
      return [{ act: "add", part, values: { ...newCondenser(libraryKey), name: freeName("Condenser", namesOf(plan.sources)), position: [middle[0], middle[1], 0.6] } }];
    case "trees":
      return changeOf("lots", plan.lot.id, { trees: [...plan.lot.trees, { at: middle, height: 4, crown: 2 }] });
  }
}

function newBuilding(plan: Plan, [x, y]: Corner) {
  const studio = plan.buildings.every(({ role }) => role !== "studio");
  return {
    name: freeName(studio ? "Studio" : "House", namesOf(plan.buildings)),
    role: studio ? "studio" : "neighbour",
    footprint: cornersOf({ x: x - 3, y: y - 2, width: 6, depth: 4 }),
    floors: [0],
    eaves: 2.5,
    ridge: null,
    ridgeAxis: null,
  };
}

/** From the library's record where there is one; otherwise without a level in any band, which is said and not weighed. */
function newCondenser(libraryKey?: string) {
  const placed = { says: "the condenser", spaceId: null, params: { directivity: 0 } };
  if (libraryKey) return { ...placed, libraryKey };
  return {
    ...placed,
    kind: "condenser",
    power: new Array(9).fill(null),
    deviation: null,
    basis: "typed",
    provenance: { document: "Own figures", clause: "", memory: false },
  };
}

const ASIDE = 1;

/** The same thing once more, a metre to the east. Limits and rooms are not copied with it. */
export function duplicateOf(plan: Plan, { part, id }: Thing): PlanChange[] {
  if (part === "trees") {
    const tree = plan.lot.trees[Number(id)];
    return tree ? changeOf("lots", plan.lot.id, { trees: [...plan.lot.trees, { ...tree, at: movedBy(tree.at, ASIDE, 0) }] }) : [];
  }
  const standing = partsOf(plan, part).find((one) => one.id === id);
  if (!standing || part === "lots") return [];
  const { id: _, ...values } = standing;
  const name = freeName(`${String(values.name)}, copy`.slice(0, 116), namesOf(partsOf(plan, part) as unknown as { name: string }[]));
  return [{ act: "add", part, values: { ...values, name, ...shifted(values) } }];
}

/** Every field of a part that is a place on the ground, a metre to the east. */
function shifted(values: Record<string, unknown>): Record<string, unknown> {
  const moved = (field: string) => Array.isArray(values[field]) && { [field]: movedBy(values[field] as number[], ASIDE, 0) };
  const footprint = values.footprint as Corner[] | null | undefined;
  return { ...moved("position"), ...moved("p1"), ...moved("p2"), ...(footprint && { footprint: footprint.map((corner) => movedBy(corner, ASIDE, 0)) }) };
}

/** A corner more: halfway along the last side. */
export function withCorner(outline: readonly Corner[]): Corner[] {
  const middle = middleOf([outline[outline.length - 1]!, outline[0]!]);
  return [...outline, middle.map(toMillimetre) as Corner];
}
