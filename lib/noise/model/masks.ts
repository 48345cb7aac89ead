import { BAND_COUNT } from "../bands";
import { energyOf } from "../levels";

/** A set of octave bands as bits, lowest band first. */
export type BandMask = number;

export const NO_BANDS: BandMask = 0;
export const ALL_BANDS: BandMask = (1 << BAND_COUNT) - 1;

/** The bands, by index from 0, that a claim holds for. */
export function maskWhere(holds: (band: number) => boolean): BandMask {
  let mask = 0;
  for (let band = 0; band < BAND_COUNT; band += 1) if (holds(band)) mask |= 1 << band;
  return mask;
}

/** Whether a set holds the band of that index. */
export const hasBand = (mask: BandMask, band: number): boolean => (mask & (1 << band)) !== 0;

/** The bands in which nine values are not known (NaN). */
export const unknownBands = (values: ArrayLike<number>): BandMask =>
  maskWhere((band) => Number.isNaN(values[band]));

/** Energies of levels: zero for silence and for unknown bands, which `unknownBands` names. */
export function knownEnergies(levels: Float64Array): Float64Array {
  return levels.map((level) => (Number.isNaN(level) ? 0 : energyOf(level)));
}
