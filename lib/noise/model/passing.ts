import { BAND_COUNT } from "../bands";
import type { EffectiveLoss } from "../effective";
import { elementKinds, type PathElement } from "../elements";
import type { Passing } from "../elements/kind";
import { energyOf } from "../levels";
import type { Basis } from "../spectrum";
import { elementDeviation, OPENING_DEVIATION } from "./deviations";
import { maskWhere, unknownBands, type BandMask } from "./masks";

/** What an element lets pass and how sure that is. */
export interface ElementPassing {
  /** S tau per band, m2: the known parts alone, an unknown loss counts as closed. */
  readonly passing: Float64Array;
  readonly unknown: BandMask;
  /** Where anything passes or might pass. */
  readonly open: BandMask;
  readonly bases: readonly Basis[];
  readonly deviations: Float64Array;
  readonly estimated: BandMask;
}

/** Share of the energy from which on a part matters for the basis of the whole. */
export const MATTERS = 0.1;

/** S tau that a kind reckons of an element and the loss of its construction in dB, m2; NaN where that is not known. */
export function passingOfKind(element: PathElement, loss: Float64Array): Float64Array {
  const passing = elementKinds[element.kind].passing as (of: Passing<PathElement["params"]>) => Float64Array;
  return passing({ area: element.area, loss, params: element.params }); // the kind and its params belong together
}

/** S tau of the field limit of a building, m2; zero where none is set (solver method 2.8). */
function limitPassing({ limit, area }: PathElement): number {
  return limit === null ? 0 : area * energyOf(-limit);
}

/** An opening: its area is geometry that the user gave. */
function openPassing(element: PathElement): ElementPassing {
  const given = passingOfKind(element, new Float64Array(BAND_COUNT));
  const unknown = unknownBands(given);
  return {
    passing: given.map((area) => (Number.isNaN(area) ? 0 : area)),
    unknown,
    open: maskWhere((band) => given[band] > 0) | unknown,
    bases: Array.from(given, (): Basis => "measured"),
    deviations: given.map(() => OPENING_DEVIATION),
    estimated: 0,
  };
}

/** S tau of an element whole: construction and field limit, with its gap or open part. `of` null is an unknown construction. */
export function passingOfElement(element: PathElement, of: EffectiveLoss | null): ElementPassing {
  if (!elementKinds[element.kind].constructed) return openPassing(element);
  const loss = of?.loss ?? new Float64Array(BAND_COUNT).fill(NaN);
  const unknown = unknownBands(loss);
  const closed = loss.map((decibels) => (Number.isNaN(decibels) ? Infinity : decibels));
  const limit = limitPassing(element);
  const shut = closed.map(
    (decibels) => (decibels === Infinity ? 0 : element.area * energyOf(-decibels)) + limit,
  );
  const passing = passingOfKind(element, closed).map((area) => area + limit);
  const opening = (band: number) => (passing[band] > 0 ? (passing[band] - shut[band]) / passing[band] : 0);
  const basisOf = (band: number): Basis => of?.bases[band] ?? "estimated";
  const bases = Array.from(passing, (_, band): Basis =>
    opening(band) > 1 - MATTERS ? "measured" : basisOf(band),
  );
  return {
    passing,
    unknown,
    open: maskWhere((band) => passing[band] > 0) | unknown,
    bases,
    deviations: passing.map(
      (_, band) =>
        (1 - opening(band)) * elementDeviation(basisOf(band), band) + opening(band) * OPENING_DEVIATION,
    ),
    estimated: maskWhere((band) => bases[band] === "estimated"),
  };
}
