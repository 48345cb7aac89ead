import { BAND_COUNT } from "./bands";

/**
 * Decibel arithmetic. Silence is -Infinity and vanishes in a sum by itself; unknown is NaN and spreads by itself.
 * Inside the solver sound travels as energy: 10^(L/10), zero for silence.
 */
export function energyOf(level: number): number {
  return 10 ** (level / 10);
}

export function levelOf(energy: number): number {
  return 10 * Math.log10(energy);
}

/** Sum of incoherent levels, dB. The sum of none is silence, -Infinity; one unknown makes the sum unknown. */
export function sumLevels(levels: Iterable<number>): number {
  let energy = 0;
  for (const level of levels) energy += energyOf(level);
  return levelOf(energy);
}

/** A spectrum of energies: all bands zero. */
export function noEnergy(): Float64Array {
  return new Float64Array(BAND_COUNT);
}

/** Adds `share` times `part` to `sum`, in place. */
export function addEnergy(sum: Float64Array, part: Float64Array, share = 1): void {
  for (let band = 0; band < BAND_COUNT; band += 1) sum[band] += share * part[band];
}

/** Drop in dB when a part with that share of the energy falls silent; a whole is shown as 99. */
export function dropWithout(share: number): number {
  return share > 0 ? Math.min(99, -10 * Math.log10(Math.max(0, 1 - share))) : 0;
}
