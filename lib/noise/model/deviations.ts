import type { Source } from "../sources";
import type { Basis } from "../spectrum";

const AS_MEASURED = [2, 2, 2, 2, 2, 2, 2, 2, 2];

/** One standard deviation of an element's loss by what it rests on, dB, 31.5 Hz to 8 kHz (solver method 2.9). */
const ELEMENT_DEVIATIONS: Readonly<Record<Basis, readonly number[]>> = {
  measured: AS_MEASURED,
  laboratory: [5, 3.5, 2.5, 2, 2, 2, 2, 2, 3],
  calculated: [7, 5, 5, 4, 4, 4, 4, 4, 6],
  estimated: [8, 7, 7, 6, 6, 6, 6, 6, 8],
};
/** Geometry that the user gave: leaks, open parts, mouths of ducts. */
export const OPENING_DEVIATION = ELEMENT_DEVIATIONS.measured[0];

/** Of the part of a level that travelled outdoors, dB (ISO 9613-2 Table 5, from memory). */
export const OUTDOOR_DEVIATION = 3;

const SOURCE_DEVIATIONS: Readonly<Record<Source["basis"], number>> = { measured: 2, typed: 3, estimated: 6 };

/** The deviation of a loss with that basis at a band's index, dB. */
export function elementDeviation(basis: Basis, band: number): number {
  return ELEMENT_DEVIATIONS[basis][band];
}

/** One standard deviation of a source's figures per band, dB: its own where given, else by its basis. */
export function sourceDeviations({ basis, deviation }: Source): Float64Array {
  return Float64Array.from(AS_MEASURED, (_, band) => deviation?.[band] ?? SOURCE_DEVIATIONS[basis]);
}
