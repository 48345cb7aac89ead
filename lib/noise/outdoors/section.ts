import type { Building, Space } from "../plan";
import type { Place } from "./barrier";

/** A vertical plane: a point on plan and a direction of length 1. Positions on it are metres along and over ground. */
export interface Section {
  readonly origin: readonly [number, number];
  readonly direction: readonly [number, number];
}
export interface Stretch {
  readonly from: number;
  readonly to: number;
}
type Corner = readonly number[];

const TOO_NEAR = 0.01;

/** The plane through two places, from the first towards the second; along x where they stand over each other. */
export function sectionThrough(from: Place, to: Place): Section {
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(dx, dy);
  return { origin: [from[0], from[1]], direction: length < TOO_NEAR ? [1, 0] : [dx / length, dy / length] };
}

/** Metres along the plane of what is nearest to a place on plan, signed. */
export function alongOf({ origin, direction }: Section, [x, y]: Corner): number {
  return (x - origin[0]) * direction[0] + (y - origin[1]) * direction[1];
}

/** Distance beside the plane, m, signed. */
export function besideOf({ origin, direction }: Section, [x, y]: Corner): number {
  return (y - origin[1]) * direction[0] - (x - origin[0]) * direction[1];
}

/** The place on the plane that far along and that high, m. */
export function placeAt({ origin, direction }: Section, along: number, height: number): Place {
  return [origin[0] + along * direction[0], origin[1] + along * direction[1], height];
}

/** Centre of the box around an outline on plan, m. */
export function centreOf(corners: readonly Corner[]): [number, number] {
  const xs = corners.map(([x]) => x);
  const ys = corners.map(([, y]) => y);
  return [(Math.min(...xs) + Math.max(...xs)) / 2, (Math.min(...ys) + Math.max(...ys)) / 2];
}

/** The stretch of an outline that a plane cuts; null where it passes by. */
export function cutOutline(section: Section, corners: readonly Corner[]): Stretch | null {
  const found: number[] = [];
  corners.forEach((corner, i) => {
    const next = corners[(i + 1) % corners.length];
    const [a, b] = [besideOf(section, corner), besideOf(section, next)];
    if (a === 0) found.push(alongOf(section, corner));
    if (a * b < 0)
      found.push(
        alongOf(section, corner) + (a / (a - b)) * (alongOf(section, next) - alongOf(section, corner)),
      );
  });
  return found.length < 2 ? null : { from: Math.min(...found), to: Math.max(...found) };
}

/** The same plane moved sideways through the middle of an outline: how what lies off the plane is projected onto it. */
export function movedThrough(section: Section, corners: readonly Corner[]): Section {
  const beside = besideOf(section, centreOf(corners));
  const [dx, dy] = section.direction;
  return { ...section, origin: [section.origin[0] - beside * dy, section.origin[1] + beside * dx] };
}

/** The four corners of a room's box on plan, m. */
export function cornersOf({
  at: [x, y],
  size: [width, depth],
}: NonNullable<Space["box"]>): [number, number][] {
  return [
    [x, y],
    [x + width, y],
    [x + width, y + depth],
    [x, y + depth],
  ];
}

/** Top of a building's shell over a place on plan, m: a ridge in the middle along its axis, or flat. */
function roofHeight({ footprint, eaves, ridge, ridgeAxis }: Building, top: number, [x, y]: Corner): number {
  if (!footprint || eaves === null || ridge === null || ridgeAxis === null || ridge <= eaves) return top;
  const across = ridgeAxis === "x" ? 1 : 0;
  const values = footprint.map((corner) => corner[across]);
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const offset = Math.abs([x, y][across] - (low + high) / 2) / Math.max(TOO_NEAR, (high - low) / 2);
  return ridge - (ridge - eaves) * Math.min(1, offset);
}

/** Where the plane crosses the ridge, m along; null where it runs beside it. */
function ridgeAlong(section: Section, { footprint, ridgeAxis }: Building): number | null {
  if (!footprint || ridgeAxis === null) return null;
  const across = ridgeAxis === "x" ? 1 : 0;
  const slope = section.direction[across];
  return Math.abs(slope) < TOO_NEAR ? null : (centreOf(footprint)[across] - section.origin[across]) / slope;
}

/** Outline of a cut shell, [along, height], from the ground on the near side over the roof to the ground. */
export function shellOutline(
  section: Section,
  building: Building,
  { from, to }: Stretch,
  top: number,
): [number, number][] {
  const ridge = ridgeAlong(section, building);
  const over = [from, ...(ridge !== null && ridge > from && ridge < to ? [ridge] : []), to];
  const roof = over.map((along): [number, number] => [
    along,
    roofHeight(building, top, placeAt(section, along, 0)),
  ]);
  return [[from, 0], ...roof, [to, 0]];
}
