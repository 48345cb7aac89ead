import { BAND_COUNT } from "../bands";
import { addEnergy, levelOf, noEnergy } from "../levels";
import { ALL_BANDS, hasBand, type BandMask } from "../model/masks";
import type { SourceModel } from "../model/sourceModels";
import type { Place } from "../outdoors/barrier";
import { endAt } from "../outdoors/ray";
import { alongOf, type Section } from "../outdoors/section";
import { directFactor } from "../rooms";
import { addTravel } from "../sound/emitters";
import type { Field } from "../sound/field";
import type { Part } from "../sound/parts";
import { unknownAt, type SpreadFrom } from "../sound/unknowns";
import { toOut, toOutSpectrum, type Station } from "../verdict";
import { aWeighted, cWeighted } from "../weighting";
import type { Way } from "./paths";
import type { Weighing } from "./weighing";

/** What stations are reckoned from. */
export interface Walk {
  readonly field: Field;
  readonly weighing: Weighing;
  readonly section: Section;
  readonly spread: SpreadFrom | null;
  readonly listener: Place;
}

/** A metre in front of a thing. */
const IN_FRONT = 1;

function station(
  { section }: Walk,
  kind: Station["kind"],
  partId: string | null,
  at: Place,
  energy: Float64Array,
  unknown: BandMask,
): Station {
  const levels = energy.map((each, band) => (hasBand(unknown, band) ? NaN : levelOf(each)));
  return {
    kind,
    partId,
    along: alongOf(section, at),
    height: at[2],
    levels: toOutSpectrum(levels),
    dba: toOut(aWeighted(levels)),
    dbc: toOut(cWeighted(levels)),
  };
}

/** Energy of everything that sounds outdoors at a free place in the yard. */
function energyOutdoors({ field: { emitters, yard }, weighing: { playing } }: Walk, at: Place): Float64Array {
  const energy = noEnergy();
  const travel = noEnergy();
  const end = endAt(at);
  emitters.forEach((emitter, m) => {
    const power = playing.emitted.subarray(m * BAND_COUNT, (m + 1) * BAND_COUNT);
    if (power.every((each) => each === 0)) return;
    travel.fill(0);
    addTravel(yard, emitter, { end, element: null, face: null }, travel, 0);
    travel.forEach((each, band) => (energy[band] += each * power[band]));
  });
  return energy;
}

/** Bands in which an unknown part may reach a room, or the yard (-1). */
function unknownIn({ field, weighing: { playing }, spread }: Walk, room: number): BandMask {
  if (!spread) return 0;
  return field.sources.reduce(
    (mask, source) =>
      playing.weights[source.index] > 0 ? mask | unknownAt(field, source, room, spread) : mask,
    0,
  );
}
const YARD = -1;

/** A metre from a place towards another on plan. */
function towards(from: Place, to: Place): Place {
  const [x, y] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(x, y);
  return length === 0
    ? from
    : [from[0] + (IN_FRONT * x) / length, from[1] + (IN_FRONT * y) / length, from[2]];
}

/** 1 m from the loudest source: direct sound of it, and what stands in its room; outdoors the yard. */
export function sourceStation(walk: Walk, { source, index, injections, q }: SourceModel, at: Place): Station {
  const { playing } = walk.weighing;
  const [injection] = injections;
  if (!injection)
    return station(
      walk,
      "source",
      source.id,
      at,
      energyOutdoors(walk, towards(at, walk.listener)),
      unknownIn(walk, YARD),
    );
  const energy = playing.inside.slice(injection.room * BAND_COUNT, (injection.room + 1) * BAND_COUNT);
  if (!injection.outlet)
    addEnergy(energy, injection.energy, playing.weights[index] * directFactor(q, IN_FRONT));
  return station(walk, "source", source.id, at, energy, unknownIn(walk, injection.room));
}

function frontOf({ element, source }: Part, listener: Place): Place | null {
  if (element?.face) {
    const { at, normal, likeRoof } = element.face;
    const out: Place | null = normal ?? (likeRoof ? [0, 0, 1] : null);
    if (!out) return towards(at, listener);
    const length = Math.hypot(...out) || 1;
    return [at[0] + out[0] / length, at[1] + out[1] / length, at[2] + out[2] / length];
  }
  const at = source?.emissions.find((emission) => emission.at)?.at;
  return at ? towards(at, listener) : null;
}

/** 1 m outside the element by which most leaves; null where nothing leaves. */
export function leavingStation(walk: Walk, way: Way | undefined): Station | null {
  const loudest = way?.parts
    .filter(({ what }) => what === "leaving")
    .reduce<Part | null>((best, part) => (best && sum(best) >= sum(part) ? best : part), null);
  const at = loudest && frontOf(loudest, walk.listener);
  return loudest && at
    ? station(walk, "leaving", loudest.id, at, energyOutdoors(walk, at), unknownIn(walk, YARD))
    : null;
}

function sum({ energy }: Part): number {
  return energy.reduce((total, each) => total + each, 0);
}

/** On the line of a fence, at that place, free field. */
export function yardStation(walk: Walk, fenceId: string, at: Place): Station {
  return station(walk, "fence", fenceId, at, energyOutdoors(walk, at), unknownIn(walk, YARD));
}

/** Free-field level at the centre of the element by which most enters the listener's rooms. */
export function windowStation(walk: Walk): Station | null {
  const {
    field,
    weighing: { parts, playing, hearing },
  } = walk;
  const entering = parts.entering.filter(
    ({ element }) => element && field.pointOfElement.has(element.index) && hearing.room >= 0,
  );
  const loudest = entering.reduce<Part | null>(
    (best, part) => (best && sum(best) >= sum(part) ? best : part),
    null,
  );
  const point = loudest?.element ? field.pointOfElement.get(loudest.element.index) : undefined;
  if (!loudest || point === undefined || sum(loudest) === 0) return null;
  const energy = playing.arriving.subarray(point * BAND_COUNT, (point + 1) * BAND_COUNT);
  return station(walk, "window", loudest.id, field.points[point].end.at, energy, unknownIn(walk, YARD));
}

/** At the listener: the very levels of the verdict; all unknown for one without a place. */
export function listenerStation(walk: Walk): Station {
  const { energy, unknown, hearing } = walk.weighing;
  return station(
    walk,
    "listener",
    hearing.receiver.id,
    walk.listener,
    energy,
    hearing.placed ? unknown : ALL_BANDS,
  );
}
