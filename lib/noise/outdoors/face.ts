import type { Place } from "./barrier";

/** A radiating or entering face: its centre, outward normal and extent, m. */
export interface Face {
  readonly at: Place;
  readonly normal: Place | null;
  readonly size: readonly [across: number, up: number] | null;
  /** Radiates and takes in without a front or a back: a roof, or any face that lies flat. */
  readonly likeRoof: boolean;
}

const MOST_PARTS = 12;
const NEAREST = 1;
const LEVEL = 1e-6;

/**
 * Whether a face lies flat: its normal stands nearer to the vertical than to the ground. The 3 dB in front of a face and
 * the 7 dB behind it speak of vertical faces only (solver method 5), so what lies flat has neither.
 */
export function liesFlat([x, y, z]: Place): boolean {
  return Math.abs(z) > Math.hypot(x, y);
}

/** Whether a place lies behind the plane of a face; on the plane is in front, and nothing is behind a roof. */
export function isBehind({ at, normal, likeRoof }: Face, place: Place): boolean {
  if (!normal || likeRoof) return false;
  return (place[0] - at[0]) * normal[0] + (place[1] - at[1]) * normal[1] + (place[2] - at[2]) * normal[2] < 0;
}

/** Unit vectors across and up a face: across is horizontal; on a horizontal face across is x and up is y. */
function axesOf([nx, ny, nz]: Place): [Place, Place] {
  const flat = Math.hypot(nx, ny);
  if (flat < LEVEL)
    return [
      [1, 0, 0],
      [0, 1, 0],
    ];
  const length = Math.hypot(flat, nz);
  const across: Place = [-ny / flat, nx / flat, 0];
  const [ux, uy, uz] = [nx / length, ny / length, nz / length];
  return [across, [-uz * across[1], uz * across[0], ux * across[1] - uy * across[0]]];
}

function cuts(length: number, distance: number): number {
  return Math.min(MOST_PARTS, Math.ceil((2 * length) / distance));
}

/** How many parts [across, up] a face is cut into towards a place: [1, 1] from twice its longest side on. */
export function cutTowards({ at, normal, size, likeRoof }: Face, place: Place): [number, number] {
  if (!size || (!normal && !likeRoof)) return [1, 1];
  const [x, y, z] = [place[0] - at[0], place[1] - at[1], place[2] - at[2]];
  const distance = Math.max(NEAREST, Math.sqrt(x * x + y * y + z * z));
  if (distance >= 2 * Math.max(size[0], size[1])) return [1, 1];
  return [cuts(size[0], distance), cuts(size[1], distance)];
}

/** Centres of the equal parts of a face cut that often across and up, m (solver method 5, near field). */
export function centresOf({ at, normal, size }: Face, [across, up]: [number, number]): Place[] {
  if (!size || across * up <= 1) return [at];
  const [u, v] = axesOf(normal ?? [0, 0, 1]);
  const places: Place[] = [];
  for (let i = 0; i < across; i += 1) {
    for (let j = 0; j < up; j += 1) {
      const a = ((i + 0.5) / across - 0.5) * size[0];
      const b = ((j + 0.5) / up - 0.5) * size[1];
      places.push([at[0] + a * u[0] + b * v[0], at[1] + a * u[1] + b * v[1], at[2] + a * u[2] + b * v[2]]);
    }
  }
  return places;
}
