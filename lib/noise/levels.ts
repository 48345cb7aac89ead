import { BAND_COUNT } from "./bands";

/**
 * Decibel arithmetic. Silence is -Infinity and vanishes in a sum by itself; unknown is NaN and spreads by itself.
 * Inside the solver sound travels as energy: 10^(L/10), zero for silence. Of a loss R, `energyOf(-R)` is what passes.
 */
export function energyOf(level: number): number {
  return 10 ** (level / 10);
}

/** Level of an energy, dB: 10 lg of it. No energy is silence, -Infinity; unknown stays NaN. */
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

/** Sum over the nine bands of energy times a factor of its own: a weighted total. Unknown where one band is. */
export function weightedSum(energy: Float64Array, factors: Float64Array): number {
  let sum = 0;
  for (let band = 0; band < BAND_COUNT; band += 1) sum += energy[band] * factors[band];
  return sum;
}

/** Drop in dB when a part with that share of the energy falls silent; a whole is shown as 99. */
export function dropWithout(share: number): number {
  return share > 0 ? Math.min(99, -levelOf(Math.max(0, 1 - share))) : 0;
}
