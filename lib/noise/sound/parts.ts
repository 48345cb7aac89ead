import { BAND_COUNT } from "../bands";
import type { PathKind } from "../elements/kind";
import type { ElementModel } from "../model/elementModels";
import type { SourceModel } from "../model/sourceModels";
import type { Field } from "./field";
import type { Hearing } from "./hearing";
import type { Playing } from "./playing";

/** Read once: a loop would ask the other module at every turn. */
const BANDS = BAND_COUNT;

/** A share of a listener's energy that belongs to one thing: where it leaves, where it enters, or what makes it. */
export interface Part {
  readonly what: "source" | "leaving" | "entering";
  readonly id: string;
  readonly name: string;
  readonly kind: PathKind;
  /** Energy over the nine bands. */
  readonly energy: Float64Array;
  readonly element: ElementModel | null;
  readonly source: SourceModel | null;
}

/** All energy at a listener, cut three ways; each cut but `entering` adds up to the whole. */
export interface Parts {
  readonly sources: readonly Part[];
  /** By the place it leaves by, or where it never leaves by the last element, or its source in the room. */
  readonly ways: readonly Part[];
  readonly entering: readonly Part[];
  /** What travelled outdoors. */
  readonly outdoors: Float64Array;
}

/** One row of a table, each band times a factor of its own or times one for all. */
function slice(table: Float64Array, index: number, factors: Float64Array | number): Float64Array {
  const row = table.slice(index * BANDS, (index + 1) * BANDS);
  for (let band = 0; band < BANDS; band += 1)
    row[band] *= typeof factors === "number" ? factors : factors[band];
  return row;
}

/** One row of a table, not copied: nine numbers by themselves are too large to lie where small arrays are cheap. */
const rowOf = (table: Float64Array, index: number) => table.subarray(index * BANDS, (index + 1) * BANDS);

function elementPart(what: Part["what"], model: ElementModel, energy: Float64Array): Part {
  return {
    what,
    id: model.element.id,
    name: model.element.name,
    kind: model.kind,
    energy,
    element: model,
    source: null,
  };
}

function sourceParts({ sources }: Field, { bySource }: Hearing, { weights }: Playing): Part[] {
  return sources.flatMap((model) => {
    if (weights[model.index] === 0) return [];
    const energy = slice(bySource, model.index, weights[model.index]);
    return [
      {
        what: "source" as const,
        id: model.source.id,
        name: model.source.name,
        kind: "outdoor unit" as const,
        energy,
        element: null,
        source: model,
      },
    ];
  });
}

/** Sound made in the listener's own room, per source or mouth. */
function ownParts({ sources }: Field, { room, own }: Hearing, { weights }: Playing): Part[] {
  return sources.flatMap((model) => {
    const { index, source, injections } = model;
    if (weights[index] === 0) return [];
    return injections
      .filter((each) => each.room === room)
      .map(({ energy, outlet }) => ({
        what: "leaving" as const,
        id: outlet ? outlet.id : `in-room:${source.id}`,
        name: outlet ? outlet.name : source.name,
        kind: outlet ? ("duct" as const) : ("in the room" as const),
        energy: slice(own, index, energy).map((each) => weights[index] * each),
        element: null,
        source: model,
      }));
  });
}

/** Levels given at elements of the listener's rooms: a way of its own per source. */
function incidentParts({ sources }: Field, { entries }: Hearing, { weights }: Playing): Part[] {
  return sources.flatMap((model) => {
    const { source, incidents, index } = model;
    if (weights[index] === 0 || incidents.length === 0) return [];
    const energy = new Float64Array(BANDS);
    for (const incident of incidents) {
      const entry = entries.find(({ element }) => element.index === incident.element);
      if (entry)
        entry.gain.forEach((gain, band) => (energy[band] += weights[index] * gain * incident.energy[band]));
    }
    return [
      {
        what: "leaving" as const,
        id: source.id,
        name: source.name,
        kind: "outdoor unit" as const,
        energy,
        element: null,
        source: model,
      },
    ];
  });
}

function passageParts({ passages }: Hearing, { inside }: Playing): Part[] {
  return passages.map(({ element, from, gain }) =>
    elementPart("entering", element, slice(inside, from, gain)),
  );
}

function outdoorParts(
  { emitters, sources }: Field,
  { outdoors }: Hearing,
  { emitted, weights }: Playing,
): Part[] {
  const all = new Float64Array(outdoors.length);
  for (let i = 0; i < all.length; i += 1) all[i] = outdoors[i] * emitted[i];
  return emitters.flatMap(({ id, name, kind, element, source }, m): Part[] => {
    if (source >= 0 && weights[source] === 0) return [];
    const energy = rowOf(all, m);
    return [
      { what: "leaving", id, name, kind, energy, element, source: source < 0 ? null : sources[source] },
    ];
  });
}

function entryParts({ entries }: Hearing, field: Field, { arriving, weights }: Playing): Part[] {
  const all = new Float64Array(entries.length * BANDS);
  return entries.map(({ element, point, gain }, index) => {
    const energy = rowOf(all, index);
    if (point < 0) addGiven(field, element.index, weights, energy);
    else energy.set(rowOf(arriving, point));
    gain.forEach((each, band) => (energy[band] *= each));
    return elementPart("entering", element, energy);
  });
}

function addGiven({ sources }: Field, element: number, weights: Float64Array, out: Float64Array): void {
  for (const { index, incidents } of sources) {
    for (const incident of incidents) {
      if (incident.element === element)
        incident.energy.forEach((each, band) => (out[band] += weights[index] * each));
    }
  }
}

/** The energy at a listener cut by source, by way and by entry, over the nine bands. Sources that are off have no part. */
export function partsOf(field: Field, hearing: Hearing, playing: Playing): Parts {
  const leaving = outdoorParts(field, hearing, playing);
  const passing = passageParts(hearing, playing);
  const outdoors = new Float64Array(BANDS);
  for (const { energy } of leaving) energy.forEach((each, band) => (outdoors[band] += each));
  return {
    sources: sourceParts(field, hearing, playing),
    ways: [
      ...leaving,
      ...passing,
      ...ownParts(field, hearing, playing),
      ...incidentParts(field, hearing, playing),
    ],
    entering: [...passing, ...entryParts(hearing, field, playing)],
    outdoors,
  };
}
