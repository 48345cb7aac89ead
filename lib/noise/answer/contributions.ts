import { BAND_COUNT } from "../bands";
import { addEnergy, energyOf, levelOf, noEnergy, weightedSum } from "../levels";
import type { ElementModel } from "../model/elementModels";
import { hasBand, type BandMask } from "../model/masks";
import type { SourceModel } from "../model/sourceModels";
import { mayArrive } from "../sound/emitters";
import type { Field } from "../sound/field";
import type { Entry } from "../sound/hearing";
import type { SpreadFrom } from "../sound/unknowns";
import { toOut, toOutSpectrum, type Contribution, type OutSpectrum } from "../verdict";
import type { Weighing } from "./weighing";

/** One way of one source to a listener, as energy. */
interface Share {
  readonly source: SourceModel;
  readonly path: string;
  readonly leavingId: string | null;
  readonly enteringId: string | null;
  readonly energy: Float64Array;
  readonly unknown: BandMask;
}
/** All ways of one source that leave by one emitter. */
interface Bundle {
  readonly source: SourceModel;
  readonly emitter: number;
  readonly energy: Float64Array;
  readonly unknown: BandMask;
}
type Reckoning = { field: Field; weighing: Weighing; spread: SpreadFrom | null };

function tainted(spread: SpreadFrom | null, from: number, to: number): BandMask {
  return spread && from >= 0 && to >= 0 ? spread(from).tainted[to] : 0;
}

/** Bands in which the sound of a source inside a room is not known. */
function unknownInside({ spread }: Reckoning, source: SourceModel, room: number): BandMask {
  return source.injections.reduce(
    (mask, { unknown, room: from }) => mask | unknown | tainted(spread, from, room),
    0,
  );
}

function ownShares({ weighing: { hearing, playing } }: Reckoning, source: SourceModel): Share[] {
  const weight = playing.weights[source.index];
  const own = hearing.own.subarray(source.index * BAND_COUNT, (source.index + 1) * BAND_COUNT);
  return source.injections
    .filter(({ room }) => room === hearing.room)
    .map(({ energy, unknown, outlet }) => ({
      source,
      path: outlet ? outlet.id : "in-room",
      leavingId: outlet ? outlet.id : null,
      enteringId: null,
      energy: energy.map((power, band) => weight * power * own[band]),
      unknown,
    }));
}

function passageShares(reckoning: Reckoning, source: SourceModel): Share[] {
  const {
    field,
    weighing: { hearing, playing },
  } = reckoning;
  const weight = playing.weights[source.index];
  return hearing.passages.map(({ element, from, gain }) => {
    const start = (source.index * field.rooms.length + from) * BAND_COUNT;
    return {
      source,
      path: element.element.id,
      leavingId: element.element.id,
      enteringId: element.element.id,
      energy: gain.map((each, band) => weight * each * field.inside[start + band]),
      unknown: source.injections.length > 0 ? unknownInside(reckoning, source, from) | element.unknown : 0,
    };
  });
}

function incidentShares({ weighing: { hearing, playing }, spread }: Reckoning, source: SourceModel): Share[] {
  return source.incidents.flatMap(({ element: at, energy, unknown }) => {
    const entry = hearing.entries.find(({ element }) => element.index === at);
    if (!entry) return [];
    const { element, gain } = entry;
    return [
      {
        source,
        path: element.element.id,
        leavingId: null,
        enteringId: element.element.id,
        energy: energy.map((each, band) => playing.weights[source.index] * each * gain[band]),
        unknown: unknown | element.unknown | tainted(spread, element.from, hearing.room),
      },
    ];
  });
}

/** Whether a source stands in the rooms that an element belongs to. */
function standsBehind({ balance: { groups } }: Field, source: SourceModel, element: ElementModel): boolean {
  return source.injections.some(({ room }) => groups[room] === groups[element.from]);
}

/** Whether a source sounds from an emitter at all: from inside, or because it entered there from outdoors. */
function sounds(field: Field, source: SourceModel, emitter: number): boolean {
  const { element, source: only } = field.emitters[emitter];
  if (!element) return only === source.index;
  return source.emissions.length + source.incidents.length > 0 || standsBehind(field, source, element);
}

const unknownPower = (powers: readonly { unknown: BandMask }[]): BandMask =>
  powers.reduce((mask, { unknown }) => mask | unknown, 0);

/** Bands in which what a source sends out by an element is not known; what comes in from outdoors counts with its known parts. */
function unknownLeaving(reckoning: Reckoning, source: SourceModel, element: ElementModel): BandMask {
  const inside = standsBehind(reckoning.field, source, element)
    ? element.unknown | unknownInside(reckoning, source, element.from)
    : 0;
  return inside | unknownPower(source.emissions) | unknownPower(source.incidents);
}

function bundlesOf(reckoning: Reckoning, source: SourceModel): Bundle[] {
  const {
    field,
    weighing: { hearing, playing },
  } = reckoning;
  const weight = playing.weights[source.index];
  return field.emitters.flatMap(({ element }, m) => {
    if (!sounds(field, source, m)) return [];
    const start = (m * field.sources.length + source.index) * BAND_COUNT;
    const energy = field.emitted.slice(start, start + BAND_COUNT);
    for (let band = 0; band < BAND_COUNT; band += 1)
      energy[band] *= weight * hearing.outdoors[m * BAND_COUNT + band];
    const unknown = element ? unknownLeaving(reckoning, source, element) : unknownPower(source.emissions);
    return [{ source, emitter: m, energy, unknown }];
  });
}

/** A bundle at an outdoor listener is one way; indoors it is one for each element of entry. */
function opened({ field, weighing: { hearing, playing }, spread }: Reckoning, bundle: Bundle): Share[] {
  const { emitters, points, travel, sources } = field;
  const { label } = emitters[bundle.emitter];
  const leavingId = emitters[bundle.emitter].id;
  if (hearing.room < 0) {
    return [{ ...bundle, path: label ?? "direct", leavingId, enteringId: null }];
  }
  const weight = playing.weights[bundle.source.index];
  const power = field.emitted.subarray((bundle.emitter * sources.length + bundle.source.index) * BAND_COUNT);
  const reaches = ({ point }: Entry) => point >= 0 && mayArrive(emitters[bundle.emitter], points[point]);
  return hearing.entries.filter(reaches).map(({ element, point, gain }) => {
    const start = (point * emitters.length + bundle.emitter) * BAND_COUNT;
    const enteringId = element.element.id;
    return {
      source: bundle.source,
      path: label ? `${label} > ${enteringId}` : enteringId,
      leavingId,
      enteringId,
      energy: gain.map((each, band) => weight * power[band] * travel[start + band] * each),
      unknown: bundle.unknown | element.unknown | tainted(spread, element.from, hearing.room),
    };
  });
}

/** Energy counted where the listener is weighed: bands against their limits, else weighted. */
function allowances({ bands, total }: Weighing): Float64Array {
  if (total) return total.factors;
  return Float64Array.from(bands, ({ limit }) => (Number.isNaN(limit) ? 1e-12 : energyOf(-limit)));
}

/** Where a source might sound at all; elsewhere an unknown element has nothing to pass. */
function heardOf({ injections, emissions, incidents }: SourceModel): BandMask {
  return [...injections, ...emissions, ...incidents].reduce((mask, { heard }) => mask | heard, 0);
}

function toContribution({ source, path, leavingId, enteringId, energy, unknown }: Share): Contribution {
  const levels: OutSpectrum = [];
  for (let band = 0; band < BAND_COUNT; band += 1)
    levels.push(toOut(hasBand(unknown, band) ? NaN : levelOf(energy[band])));
  return { sourceId: source.source.id, path, leavingId, enteringId, levels };
}

const matters = ({ energy, unknown }: Share | Bundle): boolean =>
  unknown !== 0 || energy.some((each) => each > 0);

export interface Contributions {
  readonly contributions: Contribution[];
  readonly rest: OutSpectrum | null;
}

/**
 * Every way of every source to a listener, loudest first; their energies add up to the level exactly. At most about
 * `most` are listed: bundles are opened from the loudest on and the remaining ones stand together as the rest.
 */
export function contributionsOf(reckoning: Reckoning, most: number): Contributions {
  const { field, weighing } = reckoning;
  const factors = allowances(weighing);
  const playing = field.sources.filter(({ index }) => weighing.playing.weights[index] > 0);
  const masks = new Map(playing.map((source) => [source, heardOf(source) & weighing.unknown]));
  const masked = <T extends Share | Bundle>(share: T): T => ({
    ...share,
    unknown: share.unknown & (masks.get(share.source) ?? 0),
  });
  const shares = playing
    .flatMap((source) => [
      ...ownShares(reckoning, source),
      ...passageShares(reckoning, source),
      ...incidentShares(reckoning, source),
    ])
    .map(masked);
  const bundles = playing
    .flatMap((source) => bundlesOf(reckoning, source))
    .map(masked)
    .filter(matters);
  bundles.sort((a, b) => weightedSum(b.energy, factors) - weightedSum(a.energy, factors));
  const rest = noEnergy();
  let closed = 0;
  for (const bundle of bundles) {
    if (shares.length < most) shares.push(...opened(reckoning, bundle).map(masked));
    else {
      addEnergy(rest, bundle.energy);
      closed += 1;
    }
  }
  const ranked = shares.filter(matters).map((share) => ({ share, rank: weightedSum(share.energy, factors) }));
  ranked.sort((a, b) => b.rank - a.rank);
  return {
    contributions: ranked.map(({ share }) => toContribution(share)),
    rest: closed === 0 ? null : toOutSpectrum(rest.map(levelOf)),
  };
}
