import { BAND_COUNT } from "../bands";
import { runAttenuation } from "../ducts/attenuation";
import { energyOf } from "../levels";
import type { Place } from "../outdoors/barrier";
import type { Outlet, Plan } from "../plan";
import { sourceKinds, type Source } from "../sources";
import { toArithmetic } from "../spectrum";
import type { Note } from "../verdict";
import { bandNames } from "./bandNames";
import { sourceDeviations } from "./deviations";
import type { ElementModel } from "./elementModels";
import { ALL_BANDS, knownEnergies, maskWhere, unknownBands, type BandMask } from "./masks";
import type { RoomModel } from "./roomModels";

/** Power per band in pW: the known part, where it is unknown, and where anything sounds or might sound. */
export interface Power {
  readonly energy: Float64Array;
  readonly unknown: BandMask;
  readonly heard: BandMask;
}
export interface Injection extends Power {
  readonly room: number;
  /** The mouth of a fan's run; null for a source in the room. */
  readonly outlet: Outlet | null;
}
export interface Emission extends Power {
  readonly at: Place | null;
  readonly directivity: number;
  readonly outlet: Outlet | null;
}
/** Free-field level at an element. */
export interface Incident extends Power {
  readonly element: number;
}

export interface SourceModel {
  readonly index: number;
  readonly source: Source;
  readonly injections: readonly Injection[];
  readonly emissions: readonly Emission[];
  readonly incidents: readonly Incident[];
  /** Bands in which it sounds somewhere that nobody said. */
  readonly lost: BandMask;
  readonly deviations: Float64Array;
  readonly estimated: boolean;
  readonly q: number;
}

function powerOf(levels: Float64Array): Power {
  const unknown = unknownBands(levels);
  return {
    energy: knownEnergies(levels),
    unknown,
    heard: maskWhere((band) => levels[band] > -Infinity) | unknown,
  };
}

type Placed = Pick<SourceModel, "injections" | "emissions" | "incidents" | "lost">;
type Around = {
  rooms: ReadonlyMap<string, RoomModel>;
  elements: ReadonlyMap<string, ElementModel>;
  plan: Plan;
};
const NOWHERE: Placed = { injections: [], emissions: [], incidents: [], lost: 0 };

function placeInRoom(source: Source, power: Power, { rooms }: Around): Placed {
  const room = source.spaceId === null ? undefined : rooms.get(source.spaceId);
  if (!room) return { ...NOWHERE, lost: power.heard };
  return { ...NOWHERE, injections: [{ ...power, room: room.index, outlet: null }] };
}

function placeOutdoors(source: Source, power: Power): Placed {
  const directivity = "directivity" in source.params ? source.params.directivity : 0;
  return {
    ...NOWHERE,
    emissions: [{ ...power, at: source.position, directivity: energyOf(directivity), outlet: null }],
  };
}

function throughRun(levels: Float64Array, { run }: Outlet): Power {
  const lost = runAttenuation(run);
  return powerOf(levels.map((level, band) => (level === -Infinity ? level : level - lost[band])));
}

function placeFan(source: Source, levels: Float64Array, { plan, rooms }: Around): Placed {
  const placed = { injections: [] as Injection[], emissions: [] as Emission[] };
  const outlets = plan.outlets.filter(({ sourceId }) => sourceId === source.id);
  for (const outlet of outlets) {
    const power = throughRun(levels, outlet);
    const room = outlet.spaceId === null ? undefined : rooms.get(outlet.spaceId);
    if (room) placed.injections.push({ ...power, room: room.index, outlet });
    else
      placed.emissions.push({
        ...power,
        at: outlet.spaceId === null ? outlet.position : null,
        directivity: energyOf(outlet.directivity),
        outlet,
      });
  }
  return { ...NOWHERE, ...placed, lost: outlets.length === 0 ? powerOf(levels).heard : 0 };
}

function placeIncident(source: Source, { plan, elements }: Around): Placed {
  const given = plan.incidences.filter(({ sourceId }) => sourceId === source.id);
  const incidents = given.flatMap(({ elementId, levels }) => {
    const element = elements.get(elementId);
    return element && element.to < 0 ? [{ ...powerOf(toArithmetic(levels)), element: element.index }] : [];
  });
  return { ...NOWHERE, incidents, lost: incidents.length === 0 ? ALL_BANDS : 0 };
}

function placeSource(source: Source, around: Around): Placed {
  const levels = source.power ? toArithmetic(source.power) : new Float64Array(BAND_COUNT).fill(NaN);
  const { placement } = sourceKinds[source.kind];
  if (placement === "room") return placeInRoom(source, powerOf(levels), around);
  if (placement === "outdoor") return placeOutdoors(source, powerOf(levels));
  if (placement === "fan") return placeFan(source, levels, around);
  return placeIncident(source, around);
}

function noteSource({ source, injections, emissions, incidents, lost }: SourceModel, notes: Note[]): void {
  const tell = (text: string) => notes.push({ partId: source.id, text });
  if (lost) tell(`${source.name} has no place yet, so what it adds is not known.`);
  if (emissions.some(({ at }) => at === null))
    tell(`${source.name} has no place outdoors, so what it adds is not known.`);
  const unknown = [...injections, ...emissions, ...incidents].reduce(
    (mask, power) => mask | power.unknown,
    0,
  );
  if (unknown) tell(`${source.name} has no sound level ${bandNames(unknown)}.`);
}

/** Sources of a plan: where they put how much sound. What is missing becomes a note. */
export function sourceModels(
  plan: Plan,
  rooms: readonly RoomModel[],
  elements: readonly ElementModel[],
  notes: Note[],
): SourceModel[] {
  const around: Around = {
    plan,
    rooms: new Map(rooms.map((room) => [room.space.id, room])),
    elements: new Map(elements.map((model) => [model.element.id, model])),
  };
  return plan.sources.map((source, index) => {
    const model: SourceModel = {
      index,
      source,
      ...placeSource(source, around),
      deviations: sourceDeviations(source),
      estimated: source.basis === "estimated",
      q: "q" in source.params ? source.params.q : 1,
    };
    noteSource(model, notes);
    return model;
  });
}
