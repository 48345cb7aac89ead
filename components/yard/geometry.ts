import type { Plan } from "../../lib/noise/plan";

export type Corner = [number, number];
export type Spot = [number, number, number];

/** A rectangle along the axes of the lot, m: x runs east, y north. */
export interface Rectangle {
  x: number;
  y: number;
  width: number;
  depth: number;
}

export interface Extent {
  west: number;
  east: number;
  south: number;
  north: number;
}

/** A millimetre is fine enough for a yard; sums of tenths must not grow decimals of their own. */
export const toMillimetre = (metres: number): number => Number(metres.toFixed(3));

export function extentOf(corners: readonly Corner[]): Extent {
  const [xs, ys] = [corners.map(([x]) => x), corners.map(([, y]) => y)];
  return { west: Math.min(...xs), east: Math.max(...xs), south: Math.min(...ys), north: Math.max(...ys) };
}

/** Four corners that span their own extent; anything else is no rectangle. */
export function rectangleOf(outline: readonly Corner[]): Rectangle | null {
  if (outline.length !== 4) return null;
  const { west, east, south, north } = extentOf(outline);
  const all = cornersOf({ x: west, y: south, width: east - west, depth: north - south });
  const spans = all.every(([x, y]) => outline.some(([px, py]) => px === x && py === y));
  return spans ? { x: west, y: south, width: toMillimetre(east - west), depth: toMillimetre(north - south) } : null;
}

export function cornersOf({ x, y, width, depth }: Rectangle): Corner[] {
  const [east, north] = [toMillimetre(x + width), toMillimetre(y + depth)];
  return [[x, y], [east, y], [east, north], [x, north]];
}

export const middleOf = (corners: readonly Corner[]): Corner => {
  const { west, east, south, north } = extentOf(corners);
  return [(west + east) / 2, (south + north) / 2];
};

export const movedBy = <P extends readonly number[]>([x, y, ...rest]: P, dx: number, dy: number): P =>
  [toMillimetre(x! + dx), toMillimetre(y! + dy), ...rest] as unknown as P; // the same tuple with two figures changed

/** Everything of a plan that has a place on the ground. */
export function cornersIn(plan: Plan): Corner[] {
  const flat = (spot: readonly number[] | null): Corner[] => (spot ? [[spot[0]!, spot[1]!]] : []);
  return [
    ...(plan.lot.outline ?? []),
    ...plan.buildings.flatMap(({ footprint }) => footprint ?? []),
    ...plan.spaces.flatMap(({ box }) => (box ? cornersOf({ x: box.at[0], y: box.at[1], width: box.size[0], depth: box.size[1] }) : [])),
    ...plan.fences.flatMap(({ p1, p2 }) => [p1, p2]),
    ...plan.lot.trees.flatMap(({ at: [x, y], crown }): Corner[] => [[x - crown / 2, y - crown / 2], [x + crown / 2, y + crown / 2]]),
    ...[...plan.receivers, ...plan.sources, ...plan.outlets].flatMap(({ position }) => flat(position)),
  ];
}
