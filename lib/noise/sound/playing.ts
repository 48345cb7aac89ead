import { BAND_COUNT } from "../bands";
import type { Criterion, Situation } from "../plan";
import type { Field } from "./field";

/** Read once: a loop would ask the other module at every turn. */
const BANDS = BAND_COUNT;

/** Which sources sound, and how much of their energy counts. */
export interface Playing {
  readonly situation: Situation | null;
  /** Factor on the energy of each source: 0 is off. */
  readonly weights: Float64Array;
  /** Energy in rooms, [room * bands + band]. */
  readonly inside: Float64Array;
  /** Power of emitters, pW, [emitter * bands + band]. */
  readonly emitted: Float64Array;
  /** Free-field energy at points, [point * bands + band]. */
  readonly arriving: Float64Array;
}

/**
 * Weights of the sources in a situation. Over the whole period a source counts with the share of the time it runs, in
 * the loudest part in full (solver method 6). Without a situation everything runs; what is not named is off.
 */
function weightsOf(
  { sources }: Field,
  situation: Situation | null,
  averaging: Criterion["averaging"],
): Float64Array {
  if (!situation) return new Float64Array(sources.length).fill(1);
  const shares = new Map(
    situation.playing.map(({ sourceId, share }) => [sourceId, averaging === "whole" ? share : 1]),
  );
  return Float64Array.from(sources, ({ source }) => shares.get(source.id) ?? 0);
}

/** Weighted sum over sources of a table [(thing * sources + source) * bands + band]. */
function mixBySource(table: Float64Array, things: number, weights: Float64Array): Float64Array {
  const mixed = new Float64Array(things * BANDS);
  for (let i = 0; i < things; i += 1) {
    for (let s = 0; s < weights.length; s += 1) {
      if (weights[s] === 0) continue;
      const at = (i * weights.length + s) * BANDS;
      for (let b = 0; b < BANDS; b += 1) mixed[i * BANDS + b] += weights[s] * table[at + b];
    }
  }
  return mixed;
}

function mixInside({ inside, rooms }: Field, weights: Float64Array): Float64Array {
  const length = rooms.length * BANDS;
  const mixed = new Float64Array(length);
  for (let s = 0; s < weights.length; s += 1)
    for (let i = 0; i < length; i += 1) mixed[i] += weights[s] * inside[s * length + i];
  return mixed;
}

function arrivingOf(
  { points, emitters, travel, sources, pointOfElement }: Field,
  emitted: Float64Array,
  weights: Float64Array,
): Float64Array {
  const arriving = new Float64Array(points.length * BANDS);
  for (let p = 0; p < points.length; p += 1) {
    const start = p * emitters.length * BANDS;
    for (let m = 0; m < emitted.length; m += BANDS) {
      for (let b = 0; b < BANDS; b += 1)
        arriving[p * BANDS + b] += emitted[m + b] * travel[start + m + b];
    }
  }
  for (const { index, incidents } of sources) {
    for (const { element, energy } of incidents) {
      const point = pointOfElement.get(element);
      if (point !== undefined)
        energy.forEach((each, b) => (arriving[point * BANDS + b] += weights[index] * each));
    }
  }
  return arriving;
}

/** The field in one situation (null: everything runs), averaged as a limit asks: energies mixed over the sources. */
export function play(field: Field, situation: Situation | null, averaging: Criterion["averaging"]): Playing {
  const weights = weightsOf(field, situation, averaging);
  const emitted = mixBySource(field.emitted, field.emitters.length, weights);
  return {
    situation,
    weights,
    inside: mixInside(field, weights),
    emitted,
    arriving: arrivingOf(field, emitted, weights),
  };
}
