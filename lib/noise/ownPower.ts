import { z } from "zod";
import { levelOf } from "./levels";
import { directFactor } from "./rooms";
import { levelSpectrum } from "./spectrum";

/** A measurement of one's own: nine levels at a distance from the source, in a room of the plan or (null) in the open. */
export const ownLevelsSchema = z.strictObject({
  levels: levelSpectrum,
  distance: z.number().min(0.3).max(50),
  spaceId: z.string().min(1).max(64).nullable(),
  /** When and how, in the reader's words: "9 October, four minutes of playing". */
  note: z.string().trim().max(120).default(""),
});
export type OwnLevels = z.infer<typeof ownLevelsSchema>;

/** 10 lg(2 pi) = 8.0: free over hard ground, half a sphere (solver method 6). */
const HALF_SPHERE = 8;

interface InRoom {
  /** dB over the nine bands; NaN where not known, -Infinity for silence. */
  levels: Float64Array;
  /** m. */
  distance: number;
  /** Directivity factor of the source. */
  q: number;
  /** Absorption area of the room over the nine bands, m2; NaN where not known. */
  absorption: Float64Array;
}

/**
 * Sound power behind levels measured in a room, dB re 1 pW: L_W = L_p - 10 lg(Q/(4 pi r^2) + 4/A) (solver method 6). Not
 * known where level or absorption is not. Holds where the room has a diffuse field: above Schroeder's frequency.
 */
export function powerInRoom({ levels, distance, q, absorption }: InRoom): Float64Array {
  return levels.map((level, band) => level - levelOf(directFactor(q, distance) + 4 / absorption[band]));
}

/** Sound power behind levels measured in the open over hard ground, dB re 1 pW: L_W = L_p + 20 lg r + 8 (solver method 6). */
export function powerOutdoors(levels: Float64Array, distance: number): Float64Array {
  return levels.map((level) => level + 20 * Math.log10(distance) + HALF_SPHERE);
}
