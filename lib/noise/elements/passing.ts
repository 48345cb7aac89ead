import { energyOf } from "../levels";

/** S tau of a plain element: area in m2, loss in dB per band (EN 12354-3, composite of one). */
export function passingOf(area: number, loss: Float64Array): Float64Array {
  return loss.map((decibels) => area * energyOf(-decibels));
}

/** S tau of an element with an open area of its own, m2: the open part has R = 0 in every band. */
export function passingWithOpening(area: number, loss: Float64Array, open: number): Float64Array {
  return passingOf(area, loss).map((shut) => shut + open);
}
