import type { Balance } from "../balance";
import { BAND_COUNT } from "../bands";
import { ENTERING } from "../facade";
import type { ElementModel } from "../model/elementModels";
import type { SourceModel } from "../model/sourceModels";
import { endAt, type Yard } from "../outdoors/ray";
import { addTravel, sourceEmitters } from "./emitters";

/** Adds the free-field energy of a source's outdoor parts, or of its given levels, at an element. */
function addFree(yard: Yard, source: SourceModel, model: ElementModel, out: Float64Array): void {
  const { face } = model;
  for (const emitter of sourceEmitters(source)) {
    if (!face) break;
    const travel = new Float64Array(BAND_COUNT);
    addTravel(yard, emitter, { end: endAt(face.at), element: model, face }, travel, 0);
    travel.forEach((each, band) => (out[band] += each * emitter.power[band]));
  }
  for (const { element, energy } of source.incidents) {
    if (element === model.index) energy.forEach((each, band) => (out[band] += each));
  }
}

/**
 * Energy in rooms of what enters them from outdoors, [(source * rooms + room) * bands + band]: outdoor sources, mouths
 * and given levels enter every house, whose elements then sound in turn (solver method 8, steps 3 and 4). One pass only.
 */
export function arrivedOf(
  yard: Yard,
  elements: readonly ElementModel[],
  sources: readonly SourceModel[],
  { count, inverse }: Balance,
): Float64Array {
  const arrived = new Float64Array(sources.length * count * BAND_COUNT);
  for (const source of sources) {
    if (source.emissions.length + source.incidents.length === 0) continue;
    for (const model of elements) {
      if (model.to >= 0 || model.open === 0) continue;
      const free = new Float64Array(BAND_COUNT);
      addFree(yard, source, model, free);
      for (let i = 0; i < count; i += 1) {
        for (let band = 0; band < BAND_COUNT; band += 1) {
          const gain = 4 * ENTERING * model.passing[band] * inverse[(band * count + i) * count + model.from];
          arrived[(source.index * count + i) * BAND_COUNT + band] += free[band] * gain;
        }
      }
    }
  }
  return arrived;
}
