import "server-only";
import { z } from "zod";
import { planSchema, type Plan } from "@/lib/noise/plan";
import { bareLot } from "@/models/parts";

const metres = (low: number, high: number) => z.number().min(low).max(high);
const name = z.string().trim().min(1).max(120);

/** What may be said of a yard before anything is drawn: sizes, in m; each of the three may be left out. */
export const startSchema = z.strictObject({
  street: z.string().trim().max(120).default(""),
  lot: z.strictObject({ width: metres(1, 500), depth: metres(1, 500) }).optional(),
  building: z.strictObject({ name: name.default("Studio"), width: metres(0.5, 200), depth: metres(0.5, 200), eaves: metres(0.5, 60).nullable().default(null) }).optional(),
  room: z.strictObject({ name: name.default("Live room"), width: metres(0.5, 100), depth: metres(0.5, 100), height: metres(0.5, 30) }).optional(),
});
export type Start = z.infer<typeof startSchema>;
type Size = { width: number; depth: number };
type Corner = readonly [number, number];

/** What does not fit into what it stands in, per field. */
export function misfitsOf({ lot, building, room }: Start): Record<string, string> {
  const inside = (inner: Size | undefined, outer: Size | undefined, field: string, words: string) =>
    (["width", "depth"] as const)
      .filter((side) => inner && outer && inner[side] > outer[side])
      .map((side) => [`${field}.${side}`, words]);
  return Object.fromEntries([
    ...inside(building, lot, "building", "More than the yard. Which of the two is right?"),
    ...inside(room, building, "room", "More than the building it is in."),
  ]);
}

/**
 * The plan of a yard that has only sizes: the lot with its south-west corner at the origin, the building in its middle,
 * the room in the middle of that. What is not said is not there. Ids are names, to be relabelled.
 */
export function startingPlan(start: Start): Plan {
  const { street, lot, building, room } = start;
  const place = building && centred(building, middleOf([0, 0], lot));
  return planSchema.parse({
    lot: { ...bareLot("lot"), street, outline: lot ? rectangle([0, 0], lot) : null },
    buildings: building || room ? [buildingOf(start, place)] : [],
    spaces: room ? [roomOf(room, centred(room, place ? middleOf(place, building) : middleOf([0, 0], lot)))] : [],
    surfaces: [], sources: [], outlets: [], incidences: [], paths: [], constructions: [], elements: [], fences: [], receivers: [],
    criteria: [], situations: [],
  });
}

const middleOf = ([x, y]: Corner, size: Size | undefined): Corner => (size ? [x + size.width / 2, y + size.depth / 2] : [x, y]);

/** The south-west corner of what stands in the middle of a place, to the centimetre. */
const centred = ({ width, depth }: Size, [x, y]: Corner): Corner => [round(x - width / 2), round(y - depth / 2)];
const round = (metres: number) => Math.round(metres * 100) / 100;

function rectangle([x, y]: Corner, { width, depth }: Size): Corner[] {
  const [east, north] = [round(x + width), round(y + depth)];
  return [[x, y], [east, y], [east, north], [x, north]];
}

function buildingOf({ building }: Start, at: Corner | undefined): Plan["buildings"][number] {
  const footprint = building && at ? rectangle(at, building).map(([x, y]): [number, number] => [x, y]) : null;
  return { id: "studio", name: building?.name ?? "Studio", role: "studio", footprint, floors: [0], eaves: building?.eaves ?? null, ridge: null, ridgeAxis: null };
}

/** A room with nothing said of its surfaces yet: how it swallows sound is unknown. */
function roomOf({ name: called, width, depth, height }: NonNullable<Start["room"]>, [x, y]: Corner): Plan["spaces"][number] {
  return {
    id: "room",
    buildingId: "studio",
    name: called,
    volume: Math.round(width * depth * height * 1000) / 1000,
    box: { at: [x, y, 0], size: [width, depth, height] },
    absorption: { kind: "surfaces", model: "sabine", air: true, objects: [] },
  };
}
