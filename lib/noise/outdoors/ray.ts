import { BAND_COUNT } from "../bands";
import { groundAttenuation, groundShape, type Ground, type GroundShape } from "./ground";
import { largestDetour, screening, type Place, type Screen } from "./barrier";

/** What lies between places outdoors: air, ground and screens. */
export interface Yard {
  /** dB/m over the nine bands. */
  readonly air: Float64Array;
  readonly ground: Ground;
  readonly screens: readonly Screen[];
}

/** One end of a ray with what the ground formula needs of it. */
export interface End {
  readonly at: Place;
  readonly shape: GroundShape;
  /** Stands beyond a screen on whose line it stands. */
  readonly beyond?: boolean;
}

/** The end of a ray at a place, m; `beyond` for a listener on the far side of a fence on whose line it stands. */
export function endAt(at: Place, beyond = false): End {
  return { at, shape: groundShape(at[2]), beyond };
}

/** 10^(-11/10): the sphere of ISO 9613-2, equation (7). */
const SPHERE = 10 ** -1.1;
/** Distances below are taken as this, m. */
const NEAREST = 1;
const PER_DECIBEL = Math.LN10 / 10;
const ground = new Float64Array(BAND_COUNT);
const screened = new Float64Array(BAND_COUNT);

/**
 * Adds to `out` what arrives at `to` of a power of 1 at `from`, as energy over the nine bands times `factor`:
 * ISO 9613-2, equation (3), A = A_div + A_atm + A_gr + A_bar, with A_bar = max(0, D_z - max(A_gr, 0)) (solver method 5).
 */
export function addRay(yard: Yard, from: End, to: End, factor: number, out: Float64Array, offset = 0): void {
  const [x, y, z] = [to.at[0] - from.at[0], to.at[1] - from.at[1], to.at[2] - from.at[2]];
  const across = Math.sqrt(x * x + y * y);
  const distance = Math.max(NEAREST, Math.sqrt(across * across + z * z));
  groundAttenuation(from.shape, to.shape, across, yard.ground, ground);
  const detour = yard.screens.length === 0 ? null : largestDetour(from.at, to.at, yard.screens, to.beyond);
  if (detour) screening(detour, screened);
  const spread = (factor * SPHERE) / (distance * distance);
  for (let band = 0; band < BAND_COUNT; band += 1) {
    // Behind a screen the ground's gain stays and its loss is inside D_z: the larger of the two losses holds.
    const lost = ground[band];
    const open = spread * Math.exp(-PER_DECIBEL * (yard.air[band] * distance + lost));
    const bar = detour
      ? Math.max(1, lost > 0 ? screened[band] * Math.exp(-PER_DECIBEL * lost) : screened[band])
      : 1;
    out[offset + band] += open / bar;
  }
}
