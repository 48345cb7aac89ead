import type { Plan } from "../../lib/noise/plan";
import { countWords, formatQuantity, withUnit } from "../format";
import { rectangleOf } from "./geometry";

/** Parts that stand in the yard, by the segment of their address; a tree is one of the lot's and named by its number. */
export type ThingPart = "lots" | "buildings" | "fences" | "receivers" | "sources" | "outlets" | "elements" | "trees";

/** One thing of the yard that can be lit. */
export interface Thing {
  part: ThingPart;
  id: string;
}

export interface ListedThing extends Thing {
  name: string;
  says: string;
}

export interface ThingGroup {
  part: Exclude<ThingPart, "elements" | "outlets">;
  heading: string;
  /** The word on the button that adds one. */
  add: string | null;
  things: ListedThing[];
}

export const keyOf = ({ part, id }: Thing): string => `${part}:${id}`;
export const isSame = (one: Thing | null, other: Thing): boolean => one !== null && keyOf(one) === keyOf(other);

const metres = (value: number) => withUnit(formatQuantity(value, 1), "m");

/** Sources that work outdoors: they stand in no room and are no level at an element. */
export const outdoorSources = ({ sources }: Plan) => sources.filter(({ kind, spaceId }) => kind === "condenser" && spaceId === null);

/** Mouths of fans that blow into the yard. */
export const outdoorOutlets = ({ outlets }: Plan) => outlets.filter(({ spaceId }) => spaceId === null);

/** Everything that stands in the yard, group by group. */
export function groupsOf(plan: Plan): ThingGroup[] {
  const { lot, buildings, fences, receivers } = plan;
  return [
    { part: "lots", heading: "Lot and air", add: null, things: [{ part: "lots", id: lot.id, name: lot.street || "The lot", says: lotSays(lot) }] },
    { part: "buildings", heading: "Buildings", add: "Add a building", things: buildings.map((one) => ({ part: "buildings", id: one.id, name: one.name, says: buildingSays(plan, one) })) },
    { part: "fences", heading: "Fences", add: "Add a fence", things: fences.map((one) => ({ part: "fences", id: one.id, name: one.name, says: `${metres(fenceLength(one))} long, ${metres(one.height)} high` })) },
    { part: "receivers", heading: "Listeners", add: "Add a listener", things: receivers.map((one) => ({ part: "receivers", id: one.id, name: one.name, says: listenerSays(plan, one) })) },
    { part: "sources", heading: "Sources outdoors", add: "Add a condenser", things: outdoorThings(plan) },
    { part: "trees", heading: "Trees", add: "Add a tree", things: lot.trees.map((tree, at) => ({ part: "trees", id: `${at}`, name: `Tree ${at + 1}`, says: `${metres(tree.height)} high` })) },
  ];
}

export const fenceLength = ({ p1, p2 }: Plan["fences"][number]) => Math.hypot(p2[0] - p1[0], p2[1] - p1[1]);

function lotSays({ outline }: Plan["lot"]): string {
  if (!outline) return "not drawn yet";
  const rectangle = rectangleOf(outline);
  return rectangle ? `${formatQuantity(rectangle.width, 1)} × ${metres(rectangle.depth)}` : countWords(outline.length, "corner");
}

function buildingSays({ spaces }: Plan, { id, role, footprint }: Plan["buildings"][number]): string {
  const rooms = spaces.filter(({ buildingId }) => buildingId === id).length;
  return [role, countWords(rooms, "room"), ...(footprint ? [] : ["not drawn yet"])].join(", ");
}

function listenerSays({ spaces }: Plan, { kind, spaceId, position }: Plan["receivers"][number]): string {
  const where = kind === "outdoor" ? "outdoors" : (spaces.find(({ id }) => id === spaceId)?.name ?? "no room chosen yet");
  return position ? `${where}, ${metres(position[2])} up` : `${where}, no place yet`;
}

function outdoorThings(plan: Plan): ListedThing[] {
  const placed = (position: readonly number[] | null) => (position ? `${metres(position[2]!)} up` : "no place yet");
  return [
    ...outdoorSources(plan).map((one): ListedThing => ({ part: "sources", id: one.id, name: one.name, says: placed(one.position) })),
    ...outdoorOutlets(plan).map((one): ListedThing => ({ part: "outlets", id: one.id, name: one.name, says: `mouth of a fan, ${placed(one.position)}` })),
  ];
}

/** The name of a thing; undefined where it is no longer in the plan. */
export function nameOf(plan: Plan, thing: Thing): string | undefined {
  if (thing.part === "elements") return plan.elements.find(({ id }) => id === thing.id)?.name;
  return groupsOf(plan).flatMap(({ things }) => things).find((one) => isSame(one, thing))?.name;
}
