import type { Plan } from "../../lib/noise/plan";
import { cornersIn, extentOf, type Corner, type Extent } from "./geometry";

/** How metres of a lot become pixels of one drawing. North is up. */
export interface PlanScale {
  width: number;
  height: number;
  /** Of the sheet the plan is drawn on, inside its rules. */
  left: number;
  top: number;
  right: number;
  bottom: number;
  /** Pixels to a metre. */
  scale: number;
  extent: Extent;
  at: (corner: readonly number[]) => [number, number];
}

/** What an empty yard is drawn with. */
const EMPTY: Extent = { west: 0, east: 16, south: 0, north: 24 };
const MARGIN = 1.5;
const RULES = { left: 40, top: 30, right: 8, bottom: 8 };
const TALLEST = 740;

function shownExtent(plan: Plan): Extent {
  const corners = cornersIn(plan);
  const { west, east, south, north } = corners.length > 0 ? extentOf(corners) : EMPTY;
  return { west: west - MARGIN, east: east + MARGIN, south: south - MARGIN, north: north + MARGIN };
}

/** The whole plan in the given width, not taller than a screen. */
export function planScale(plan: Plan, width: number): PlanScale {
  const extent = shownExtent(plan);
  const [across, up] = [extent.east - extent.west, extent.north - extent.south];
  const scale = Math.min((width - RULES.left - RULES.right) / across, TALLEST / up);
  const [left, top] = [RULES.left, RULES.top];
  const [right, bottom] = [left + across * scale, top + up * scale];
  const at = ([x, y]: readonly number[]): [number, number] => [left + (x! - extent.west) * scale, top + (extent.north - y!) * scale];
  return { width: right + RULES.right, height: bottom + RULES.bottom, left, top, right, bottom, scale, extent, at };
}

const px = (value: number) => Math.round(value * 10) / 10;

export const drawLine = (points: readonly (readonly [number, number])[]): string => `M${points.map(([x, y]) => `${px(x)} ${px(y)}`).join("L")}`;

export const drawOutline = (corners: readonly Corner[], { at }: PlanScale): string => `${drawLine(corners.map(at))}Z`;

/** About so many pixels wide is a text of this size. */
export const textWidth = (text: string, size: number): number => text.length * size * 0.54;

/** The text, or its beginning where there is no room for all of it. */
export function fitted(text: string, size: number, room: number): string {
  const most = Math.floor(room / (size * 0.54));
  if (text.length <= most) return text;
  return most < 3 ? "" : `${text.slice(0, most - 1).trimEnd()}…`;
}
