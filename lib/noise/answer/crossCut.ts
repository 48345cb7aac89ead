import type { Way } from "./paths";
import {
  leavingStation,
  listenerStation,
  sourceStation,
  windowStation,
  yardStation,
  type Walk,
} from "./stations";
import type { Weighing } from "./weighing";
import { leadingSource } from "./facts";
import type { SourceModel } from "../model/sourceModels";
import { crossing, type Place } from "../outdoors/barrier";
import {
  alongOf,
  besideOf,
  cornersOf,
  cutOutline,
  movedThrough,
  placeAt,
  sectionThrough,
  shellOutline,
  type Section,
  type Stretch,
} from "../outdoors/section";
import type { Building, Plan, Receiver, Space } from "../plan";
import type { Field } from "../sound/field";
import type { SpreadFrom } from "../sound/unknowns";
import type { CrossCut } from "../verdict";

/** Ground shown beyond what is cut, m. */
const BEYOND = 2;
/** Height of the station on a fence's line, m. */
const EAR = 1.5;
/** Height of a shell whose eaves nobody gave, over its highest ceiling, m. */
const OVER_CEILING = 0.3;
/** Ground before the source and behind the listener on which other buildings are shown, m. */
const AROUND: Stretch = { from: -3, to: 8 };
/** How squarely a face must look along the plane for its openings to be drawn: cosine of 60 degrees. */
const FACING = 0.5;
/** How near to the plane a tree stands to be drawn, beyond its crown, m. */
const NEAR_PLANE = 2;

type Shell = CrossCut["buildings"][number];
/** Rooms and buildings that are shown wherever the plane runs, and the listener's room. */
type Ends = { shown: ReadonlySet<string>; lit: string | null; reach: Stretch };

function middleOf(box: Space["box"]): Place | null {
  return box && [box.at[0] + box.size[0] / 2, box.at[1] + box.size[1] / 2, box.at[2] + box.size[2] / 2];
}

function sourcePlace({ rooms }: Field, { source, injections, emissions }: SourceModel): Place | null {
  const [injection] = injections;
  const middle = injection ? middleOf(rooms[injection.room].space.box) : null;
  return middle ?? source.position ?? emissions.find(({ at }) => at)?.at ?? null;
}

function listenerPlace(
  { rooms }: Field,
  { room, receiver }: { room: number; receiver: Receiver },
): Place | null {
  return receiver.position ?? (room >= 0 ? middleOf(rooms[room].space.box) : null);
}

/** The stretch of an outline in the plane, or of the outline projected onto it. */
function stretchOf(section: Section, corners: readonly (readonly number[])[]): Stretch {
  const cut = cutOutline(section, corners) ?? cutOutline(movedThrough(section, corners), corners);
  const along = corners.map((corner) => alongOf(section, corner));
  return cut ?? { from: Math.min(...along), to: Math.max(...along) };
}

function outlineOf(building: Building, spaces: readonly Space[]): readonly (readonly number[])[] {
  if (building.footprint) return building.footprint;
  return spaces.flatMap(({ box }) => (box ? cornersOf(box) : []));
}

function topOf({ eaves, ridge, ridgeAxis }: Building, spaces: readonly Space[]): number {
  const ceilings = spaces.flatMap(({ box }) => (box ? [box.at[2] + box.size[2]] : []));
  return (
    Math.max(eaves ?? 0, ridgeAxis === null ? (ridge ?? 0) : 0) || Math.max(0, ...ceilings) + OVER_CEILING
  );
}

function openingsOf({ elements }: Field, buildingId: string, section: Section): Shell["openings"] {
  return elements.flatMap(({ element, kind, building, face }) => {
    if (building !== buildingId || !face || !["door", "window", "duct", "leak"].includes(kind)) return [];
    if (
      face.normal &&
      Math.abs(face.normal[0] * section.direction[0] + face.normal[1] * section.direction[1]) < FACING
    )
      return [];
    const half = (face.size?.[1] ?? Math.sqrt(element.area)) / 2;
    return [
      {
        elementId: element.id,
        kind,
        along: alongOf(section, face.at),
        foot: face.at[2] - half,
        head: face.at[2] + half,
      },
    ];
  });
}

/** Rooms in the plane, and those of the source and the listener projected onto it. */
function roomsOf(section: Section, spaces: readonly Space[], { shown, lit }: Ends): Shell["rooms"] {
  return spaces.flatMap(({ id, box }) => {
    if (!box || !(shown.has(id) || cutOutline(section, cornersOf(box)))) return [];
    return [
      {
        id,
        ...stretchOf(section, cornersOf(box)),
        floor: box.at[2],
        ceiling: box.at[2] + box.size[2],
        lit: id === lit,
      },
    ];
  });
}

function shellOf(field: Field, section: Section, building: Building, ends: Ends): Shell | null {
  const spaces = field.plan.spaces.filter(({ buildingId }) => buildingId === building.id);
  const corners = outlineOf(building, spaces);
  if (corners.length < 3) return null;
  const cut = cutOutline(section, corners);
  const stretch = stretchOf(section, corners);
  const near = cut !== null && cut.to > ends.reach.from && cut.from < ends.reach.to;
  if (!ends.shown.has(building.id) && !near) return null;
  const plane = cut ? section : movedThrough(section, corners);
  return {
    id: building.id,
    name: building.name,
    role: building.role,
    outline: shellOutline(plane, building, stretch, topOf(building, spaces)),
    floors: building.floors.map((height) => ({ ...stretch, height })),
    rooms: roomsOf(plane, spaces, ends),
    openings: openingsOf(field, building.id, section),
  };
}

/** Where the plane meets the fences: on their line, prolonged only as far as they reach. */
function fencesOf({ fences }: Plan, section: Section, from: number, to: number): CrossCut["fences"] {
  const [start, end] = [placeAt(section, from, 0), placeAt(section, to, 0)];
  return fences.flatMap(({ id, height, p1, p2 }) => {
    const share = crossing(start, end, { p1, p2 });
    return Number.isNaN(share) ? [] : [{ id, along: from + share * (to - from), height }];
  });
}

function treesOf({ lot }: Plan, section: Section): CrossCut["trees"] {
  return lot.trees
    .filter(({ at, crown }) => Math.abs(besideOf(section, at)) <= crown / 2 + NEAR_PLANE)
    .map(({ at, height, crown }) => ({ along: alongOf(section, at), height, crown }));
}

/** The nearest fence between the source and the listener, the listener's own line included. */
function fenceStation(walk: Walk, fences: CrossCut["fences"]): CrossCut["stations"] {
  const reach = alongOf(walk.section, walk.listener);
  const between = fences
    .filter(({ along }) => along > 0 && along <= reach + BEYOND / 2)
    .sort((a, b) => b.height - a.height);
  return between.slice(0, 1).map(({ id, along }) => yardStation(walk, id, placeAt(walk.section, along, EAR)));
}

function present<T>(values: readonly (T | null)[]): T[] {
  return values.filter((value) => value !== null);
}

/**
 * The two yards cut open: the vertical plane through the centre of the loudest source's room and the listener, with what
 * lies off the plane projected onto it, and the levels on the way (solver method 6). Null where a place is not known.
 */
export function crossCutOf(
  field: Field,
  weighing: Weighing,
  ways: readonly Way[],
  spread: SpreadFrom | null,
): CrossCut | null {
  const source = leadingSource(weighing)?.source;
  const from = source && sourcePlace(field, source);
  const listener = listenerPlace(field, weighing.hearing);
  if (!source || !from || !listener) return null;
  const section = sectionThrough(from, listener);
  const { room } = weighing.hearing;
  const spot = { along: alongOf(section, listener), height: listener[2] };
  const home = source.injections.length > 0 ? field.rooms[source.injections[0].room].space : null;
  const lit = room >= 0 ? field.rooms[room].space : null;
  const shown = new Set([home, lit].flatMap((space) => (space ? [space.id, space.buildingId] : [])));
  const reach = { from: Math.min(0, spot.along) + AROUND.from, to: Math.max(0, spot.along) + AROUND.to };
  const ends: Ends = { shown, lit: lit?.id ?? null, reach };
  const buildings = field.plan.buildings.flatMap((building) => shellOf(field, section, building, ends) ?? []);
  const alongs = [0, spot.along, ...buildings.flatMap(({ outline }) => outline.map(([along]) => along))];
  const [start, end] = [Math.min(...alongs) - BEYOND, Math.max(...alongs) + BEYOND];
  const fences = fencesOf(field.plan, section, start, end);
  const walk: Walk = { field, weighing, section, spread, listener };
  return {
    from: start,
    to: end,
    buildings,
    fences,
    trees: treesOf(field.plan, section).filter(({ along }) => along > start && along < end),
    source: { id: source.source.id, along: 0, height: from[2] },
    listener: spot,
    stations: [
      sourceStation(walk, source, from),
      ...present([leavingStation(walk, ways[0])]),
      ...fenceStation(walk, fences),
      ...present([home && home.buildingId === lit?.buildingId ? null : windowStation(walk)]),
      listenerStation(walk),
    ],
  };
}
