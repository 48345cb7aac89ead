import { coefficientOf, lossOf } from "./coefficient";

/** A part of a surface: area m², transmission loss in dB per band (`Infinity` lets nothing through, `NaN` is unknown). */
export type Part = { readonly area: number; readonly tl: readonly number[] };

/**
 * Transmission loss of parts side by side, dB per band: -10 lg(sum S tau / sum S), ISO 12354-3. What is unknown in
 * any part makes the band unknown. Throws on parts that differ in their number of bands, or on none.
 */
export function composite(parts: readonly Part[]): number[] {
  const [first] = parts;
  if (!first) throw new RangeError("a composite needs at least one part");
  if (parts.some(({ tl }) => tl.length !== first.tl.length))
    throw new RangeError("the parts differ in their bands");
  const area = parts.reduce((sum, part) => sum + part.area, 0);
  return first.tl.map((_, band) => {
    const open = parts.reduce((sum, part) => sum + part.area * coefficientOf(part.tl[band]), 0);
    return lossOf(open / area);
  });
}

/**
 * Transmission loss with the limit of a real building, dB: the limit's tau is added, so the result lies below both.
 * `limit` in dB; `Infinity` is no limit.
 */
export function combineLimit(tl: readonly number[], limit: number): number[] {
  const around = coefficientOf(limit);
  return tl.map((value) => lossOf(coefficientOf(value) + around));
}

/** Transmission loss of a leaf of `area` m² with open gaps of `gapArea` m² (R = 0 there), dB over the area of the leaf. */
export function gapCombined(tl: readonly number[], area: number, gapArea: number): number[] {
  return tl.map((value) => lossOf(coefficientOf(value) + gapArea / area));
}
