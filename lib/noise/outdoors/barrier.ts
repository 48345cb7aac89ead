import { BAND_COUNT, EXACT_BANDS } from "../bands";

export type Place = readonly [x: number, y: number, z: number];

/** A screen on plan: a line with a height over local ground and a thickness, m. */
export interface Screen {
  readonly p1: readonly [number, number];
  readonly p2: readonly [number, number];
  readonly height: number;
  readonly thickness: number;
}

/** A ray over a screen's top edge (or two edges a distance `between` apart), m. */
export interface Detour {
  /** Path difference; negative where the sight line clears the top. */
  readonly z: number;
  readonly first: number;
  readonly last: number;
  readonly between: number;
  readonly direct: number;
}

/** Speed of sound behind the wavelength of ISO 9613-2, m/s. */
const SPEED = 340;
const WAVELENGTHS = EXACT_BANDS.map((frequency) => SPEED / frequency);
/** C_2: ground reflections are inside. */
const C2 = 20;
const MOST_SINGLE = 100;
const MOST_DOUBLE = 10 ** 2.5;
/** A source or listener this near to a screen's line, m, stands on the studio's side of it (solver method 6). */
const ON_THE_LINE = 0.1;

/** Distance on plan from a place to a screen's line, ends included, m. */
function distanceToLine([x, y]: readonly number[], { p1, p2 }: Pick<Screen, "p1" | "p2">): number {
  const [dx, dy] = [p2[0] - p1[0], p2[1] - p1[1]];
  const square = dx * dx + dy * dy;
  const along = square === 0 ? 0 : Math.min(1, Math.max(0, ((x - p1[0]) * dx + (y - p1[1]) * dy) / square));
  const [besideX, besideY] = [x - p1[0] - along * dx, y - p1[1] - along * dy];
  return Math.sqrt(besideX * besideX + besideY * besideY);
}

function standsOn(place: Place, screen: Screen): boolean {
  return distanceToLine(place, screen) <= ON_THE_LINE;
}

/** Where a plan ray crosses a line: share of the ray, 0 to 1, or NaN. */
export function crossing(
  from: readonly number[],
  to: readonly number[],
  { p1, p2 }: Pick<Screen, "p1" | "p2">,
): number {
  const [rx, ry] = [to[0] - from[0], to[1] - from[1]];
  const [sx, sy] = [p2[0] - p1[0], p2[1] - p1[1]];
  const across = rx * sy - ry * sx;
  if (across === 0) return NaN;
  const [qx, qy] = [p1[0] - from[0], p1[1] - from[1]];
  const along = (qx * sy - qy * sx) / across;
  const onLine = (qx * ry - qy * rx) / across;
  return along >= 0 && along <= 1 && onLine >= 0 && onLine <= 1 ? along : NaN;
}

function pointOn(from: Place, to: Place, share: number, height: number): Place {
  return [from[0] + share * (to[0] - from[0]), from[1] + share * (to[1] - from[1]), height];
}

function lengthOf(a: Place, b: Place): number {
  const [x, y, z] = [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
  return Math.sqrt(x * x + y * y + z * z);
}

/** Half of the plan length of a ray inside a thick screen, as a share of the ray. */
function halfInside(from: Place, to: Place, { p1, p2, thickness }: Screen): number {
  const [rx, ry] = [to[0] - from[0], to[1] - from[1]];
  const [sx, sy] = [p2[0] - p1[0], p2[1] - p1[1]];
  const across = Math.abs(rx * sy - ry * sx) / Math.hypot(sx, sy);
  return across > 0 ? thickness / 2 / across : 0;
}

/** The detour over a screen crossed at that share of the ray. */
export function detourOver(from: Place, to: Place, screen: Screen, share: number): Detour {
  const half = screen.thickness > 0 ? halfInside(from, to, screen) : 0;
  const [near, far] = [Math.max(0, share - half), Math.min(1, share + half)];
  const edges = [pointOn(from, to, near, screen.height), pointOn(from, to, far, screen.height)];
  const direct = lengthOf(from, to);
  const [first, last, between] = [
    lengthOf(from, edges[0]),
    lengthOf(edges[1], to),
    lengthOf(edges[0], edges[1]),
  ];
  const covers = [near, far].some((at) => screen.height > from[2] + at * (to[2] - from[2]));
  const longer = first + between + last - direct;
  return { z: covers ? longer : -longer, first, last, between, direct };
}

/**
 * The detour that counts on a ray: of the screens it crosses the one with the largest path difference, top edge only;
 * null where none is crossed. `beyond` lifts the rule of the near side for a listener on a screen's line.
 */
export function largestDetour(
  from: Place,
  to: Place,
  screens: readonly Screen[],
  beyond = false,
): Detour | null {
  let largest: Detour | null = null;
  for (const screen of screens) {
    if (standsOn(from, screen)) continue;
    const onLine = standsOn(to, screen);
    if (onLine && !beyond) continue;
    const crossed = crossing(from, to, screen);
    const share = Number.isNaN(crossed) && onLine ? 1 : crossed;
    if (Number.isNaN(share)) continue;
    const detour = detourOver(from, to, screen, share);
    if (!largest || detour.z > largest.z) largest = detour;
  }
  return largest;
}

/** K_met of ISO 9613-2, equation (18); 1 where the sight line is free. From memory: ISO 9613-2:1996. */
function weatherFactor({ z, first, last, direct }: Detour): number {
  return z > 0 ? Math.exp(-Math.sqrt((first * last * direct) / (2 * z)) / 2000) : 1;
}

/** C_3 of two edges `between` apart, ISO 9613-2 equation (15); 1 for one edge. */
function doubleFactor(between: number, wavelength: number): number {
  if (between === 0) return 1;
  const ratio = ((5 * wavelength) / between) ** 2;
  return (1 + ratio) / (1 / 3 + ratio);
}

/**
 * Screening as factors 10^(D_z/10) over the nine bands, written to `out`; never below 1, at most 20 dB (25 dB over two
 * edges). ISO 9613-2, equation (14).
 */
export function screening(detour: Detour, out: Float64Array): void {
  const weather = weatherFactor(detour);
  const most = detour.between > 0 ? MOST_DOUBLE : MOST_SINGLE;
  for (let band = 0; band < BAND_COUNT; band += 1) {
    const wavelength = WAVELENGTHS[band];
    const factor = 3 + (C2 / wavelength) * doubleFactor(detour.between, wavelength) * detour.z * weather;
    out[band] = Math.min(most, Math.max(1, factor));
  }
}
