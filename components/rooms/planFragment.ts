import type { Building, Plan, Space } from "@/lib/noise/plan";
import type { Thing } from "./inside";

type Spot = readonly [number, number];
type PlanElement = Plan["elements"][number];

export interface Extent {
  west: number;
  east: number;
  south: number;
  north: number;
}

type Boxed = Space & { box: NonNullable<Space["box"]> };
const isBoxed = (space: Space): space is Boxed => space.box !== null;

/** Floors this near to each other, m, are one storey. */
const STOREY = 1.5;

/** The drawn rooms of the same building on the same storey, the lit one among them. */
export function storeyOf(plan: Plan, lit: Space): Boxed[] {
  if (!isBoxed(lit)) return [];
  const floor = lit.box.at[2];
  return plan.spaces
    .filter(isBoxed)
    .filter(({ buildingId, box }) => buildingId === lit.buildingId && Math.abs(box.at[2] - floor) < STOREY);
}

export function extentOf(points: readonly Spot[]): Extent {
  const eastings = points.map(([x]) => x);
  const northings = points.map(([, y]) => y);
  return { west: Math.min(...eastings), east: Math.max(...eastings), south: Math.min(...northings), north: Math.max(...northings) };
}

const cornersOf = ({ box: { at, size } }: Boxed): Spot[] => [
  [at[0], at[1]],
  [at[0] + size[0], at[1] + size[1]],
];

/** Pixels around the drawing: dimension chains above and to the left, the scale bar below. */
export const MARGIN = { left: 62, right: 24, top: 54, bottom: 52 } as const;
const MOST_SCALE = 78;

export interface Fragment {
  width: number;
  height: number;
  /** Pixels to a metre. */
  scale: number;
  x: (metres: number) => number;
  y: (metres: number) => number;
}

/** One scale in both directions, as large as the width and the height allow; north is up. */
export function fitFragment(rooms: readonly Boxed[], building: Building | null, { width, most }: { width: number; most: number }): Fragment {
  const outline = (building?.footprint ?? []) as Spot[];
  const { west, east, south, north } = extentOf([...outline, ...rooms.flatMap(cornersOf)]);
  const across = (width - MARGIN.left - MARGIN.right) / Math.max(east - west, 0.1);
  const up = (most - MARGIN.top - MARGIN.bottom) / Math.max(north - south, 0.1);
  const scale = Math.min(across, up, MOST_SCALE);
  const left = MARGIN.left + (width - MARGIN.left - MARGIN.right - scale * (east - west)) / 2;
  return {
    width,
    height: Math.ceil(MARGIN.top + scale * (north - south) + MARGIN.bottom),
    scale,
    x: (metres) => Math.round((left + (metres - west) * scale) * 10) / 10,
    y: (metres) => Math.round((MARGIN.top + (north - metres) * scale) * 10) / 10,
  };
}

export interface Opening {
  id: string;
  kind: "door" | "window" | "duct" | "leak";
  x: number;
  y: number;
  width: number;
  height: number;
}

const isOpening = (kind: string): kind is Opening["kind"] => ["door", "window", "duct", "leak"].includes(kind);
const WALL = 10;
/** Metres of wall that an opening without a size is drawn on. */
const UNSIZED = 0.25;

/** Doors, windows, runs and leaks in the outer walls of these rooms, where their place is known. */
export function openingsIn(plan: Plan, rooms: readonly Boxed[], { x, y, scale }: Fragment): Opening[] {
  const own = new Set(rooms.map(({ id }) => id));
  const paths = new Set(plan.paths.filter((path) => own.has(path.fromSpaceId) || own.has(path.toSpaceId ?? "")).map(({ id }) => id));
  return plan.elements.flatMap((element: PlanElement): Opening[] => {
    const { kind, position, normal, size } = element;
    if (!isOpening(kind) || !paths.has(element.pathId) || !position || !normal || Math.abs(normal[2]) > 0.7) return [];
    const long = Math.max(8, (size?.[0] ?? UNSIZED) * scale);
    const upright = Math.abs(normal[0]) > Math.abs(normal[1]);
    const [width, height] = upright ? [WALL, long] : [long, WALL];
    return [{ id: element.id, kind, x: x(position[0]) - width / 2, y: y(position[1]) - height / 2, width, height }];
  });
}

export const BALLOON = 11;
const INWARD = 24;

export interface Balloon {
  id: string;
  number: number;
  x: number;
  y: number;
}

/** Where the balloons stand: on their thing, those of openings inside the room, none on top of another. */
export function placeBalloons(things: readonly Thing[], { x, y, width, height }: Fragment): Balloon[] {
  const placed: Balloon[] = [];
  const within = (value: number, most: number) => Math.min(most - BALLOON - 1, Math.max(BALLOON + 1, value));
  for (const { id, number, at, outward } of things) {
    if (number === null || !at) continue;
    const balloon = {
      id,
      number,
      x: within(x(at[0]) - (outward?.[0] ?? 0) * INWARD, width),
      y: within(y(at[1]) + (outward?.[1] ?? 0) * INWARD, height),
    };
    while (placed.some((one) => Math.hypot(one.x - balloon.x, one.y - balloon.y) < 2 * BALLOON + 2)) balloon.y += 6;
    placed.push(balloon);
  }
  return placed;
}
