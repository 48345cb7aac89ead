/** Share of the energy that a loss of `loss` dB lets through. A loss of `Infinity` lets nothing through. */
export function coefficientOf(loss: number): number {
  return 10 ** (-loss / 10);
}

/** Loss in dB of what lets `tau` of the energy through. Nothing is `Infinity` dB; unknown stays `NaN`. */
export function lossOf(tau: number): number {
  return -10 * Math.log10(tau);
}
