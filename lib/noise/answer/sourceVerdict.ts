import { BAND_COUNT } from "../bands";
import { dailyMinutes } from "../exposure";
import { addEnergy, levelOf } from "../levels";
import { hasBand } from "../model/masks";
import type { SourceModel } from "../model/sourceModels";
import { directFactor } from "../rooms";
import type { Field } from "../sound/field";
import { toOut, toOutSpectrum, type SourceVerdict } from "../verdict";
import { weightedLevel } from "../weighting";

/** Where the player's ears are taken to be, m from the source. */
const AT_THE_EAR = 1;

function energyNear(field: Field, { index, q, injections: [injection] }: SourceModel): Float64Array {
  const start = (index * field.rooms.length + injection.room) * BAND_COUNT;
  const energy = field.inside.slice(start, start + BAND_COUNT);
  addEnergy(energy, injection.energy, directFactor(q, AT_THE_EAR));
  return energy;
}

/** The source alone, at work all the time, 1 m away in its own room: what bare ears get (solver method 4). */
function nearOf(field: Field, model: SourceModel): SourceVerdict["near"] {
  const [injection] = model.injections;
  if (!injection || injection.outlet) return null;
  const unknown = injection.unknown | field.rooms[injection.room].unknown;
  const known = energyNear(field, model).map((each, band) => levelOf(hasBand(unknown, band) ? 0 : each));
  const dba = weightedLevel(known, "A");
  const minutes = dailyMinutes(dba);
  return {
    distance: AT_THE_EAR,
    levels: toOutSpectrum(known.map((level, band) => (hasBand(unknown, band) ? NaN : level))),
    dba: toOut(dba),
    minutes: Number.isFinite(minutes) ? minutes : null,
  };
}

/** What the verdict says of a source by itself. */
export function sourceVerdict(field: Field, model: SourceModel): SourceVerdict {
  return { doubts: Array.from(model.deviations), near: nearOf(field, model) };
}
