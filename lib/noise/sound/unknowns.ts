import type { ElementModel } from "../model/elementModels";
import { ALL_BANDS, type BandMask } from "../model/masks";
import type { RoomModel } from "../model/roomModels";
import type { SourceModel } from "../model/sourceModels";
import type { Field } from "./field";

/**
 * Where a part that nobody knows could bring sound. `open`: bands in which anything may pass from a room to another;
 * `tainted`: bands in which an unknown part stands on such a way. A way never comes back to the room it starts in.
 */
export interface Spread {
  readonly open: Int32Array;
  readonly tainted: Int32Array;
}

/** Whether anything at all is unknown in a plan; where nothing is, no way needs to be looked at. */
export function hasUnknown({ rooms, elements, sources }: Field): boolean {
  return (
    rooms.some(({ unknown }) => unknown !== 0) ||
    elements.some(({ unknown, face, to }) => unknown !== 0 || (to < 0 && !face)) ||
    sources.some(
      ({ lost, injections, emissions, incidents }) =>
        lost !== 0 ||
        [...injections, ...emissions, ...incidents].some(({ unknown }) => unknown !== 0) ||
        emissions.some(({ at }) => !at),
    )
  );
}

type Way = { from: number; to: number; element: ElementModel };

/** Ways between rooms, both directions. */
function waysBetween(elements: readonly ElementModel[]): Way[] {
  return elements.flatMap((element) =>
    element.to < 0
      ? []
      : [
          { from: element.from, to: element.to, element },
          { from: element.to, to: element.from, element },
        ],
  );
}

/** Spread from one room through all bands at once, until nothing changes. */
function spreadFrom(start: number, rooms: readonly RoomModel[], ways: readonly Way[]): Spread {
  const open = new Int32Array(rooms.length);
  const tainted = new Int32Array(rooms.length);
  open[start] = ALL_BANDS;
  tainted[start] = rooms[start].unknown;
  for (let changed = true; changed;) {
    changed = false;
    for (const { from, to, element } of ways) {
      if (to === start) continue;
      const arriving = open[from] & element.open;
      const dubious = (tainted[from] & element.open) | (arriving & (element.unknown | rooms[to].unknown));
      if ((arriving | open[to]) === open[to] && (dubious | tainted[to]) === tainted[to]) continue;
      open[to] |= arriving;
      tainted[to] |= dubious;
      changed = true;
    }
  }
  return { open, tainted };
}

export type SpreadFrom = (room: number) => Spread;

/** Spread from any room, reckoned once per room that is asked for. */
export function spreadsOf({ rooms, elements }: Field): SpreadFrom {
  const ways = waysBetween(elements);
  const kept = new Map<number, Spread>();
  return (room) => {
    const spread = kept.get(room) ?? spreadFrom(room, rooms, ways);
    kept.set(room, spread);
    return spread;
  };
}

/** Where a source may sound outdoors: per building whose elements it leaves by, "" for what stands outdoors. */
type Outdoors = Map<string, { open: BandMask; tainted: BandMask }>;

function add(outdoors: Outdoors, building: string, open: BandMask, tainted: BandMask): void {
  const known = outdoors.get(building) ?? { open: 0, tainted: 0 };
  outdoors.set(building, { open: known.open | open, tainted: known.tainted | (tainted & open) });
}

/** Bands in which a source may leave each building, and where that is not known. */
function leavingOf(
  { elements }: Field,
  { injections, emissions }: SourceModel,
  spread: SpreadFrom,
): Outdoors {
  const outdoors: Outdoors = new Map();
  for (const { at, heard, unknown } of emissions) add(outdoors, "", heard, at ? unknown : heard);
  for (const { room, heard, unknown } of injections) {
    const inside = spread(room);
    for (const { from, to, open, unknown: dubious, face, building } of elements) {
      if (to >= 0) continue;
      const passing = heard & inside.open[from] & open;
      add(outdoors, building, passing, unknown | inside.tainted[from] | dubious | (face ? 0 : passing));
    }
  }
  return outdoors;
}

function arrivesOutdoors(outdoors: Outdoors): BandMask {
  return [...outdoors.values()].reduce((mask, { tainted }) => mask | tainted, 0);
}

/** Through each element of the listener's rooms, from every other building and from outdoors. */
function arrivesIndoors({ elements }: Field, outdoors: Outdoors, heard: Spread): BandMask {
  let mask = 0;
  for (const { from, to, open, unknown, face, building } of elements) {
    const way = open & heard.open[from];
    if (to >= 0 || way === 0) continue;
    const dubious = unknown | heard.tainted[from];
    for (const [other, leaving] of outdoors) {
      if (other === building) continue;
      mask |= way & (leaving.tainted | (leaving.open & (face ? dubious : ALL_BANDS)));
    }
  }
  return mask;
}

/** Bands in which an unknown part of that source's sound may reach a listener in `room` (-1: outdoors). */
export function unknownAt(field: Field, source: SourceModel, room: number, spread: SpreadFrom): BandMask {
  const outdoors = leavingOf(field, source, spread);
  if (room < 0) return source.lost | arrivesOutdoors(outdoors);
  const heard = spread(room);
  let mask = source.lost | arrivesIndoors(field, outdoors, heard);
  for (const injection of source.injections) {
    const inside = spread(injection.room);
    mask |= injection.heard & inside.open[room] & (injection.unknown | inside.tainted[room]);
  }
  for (const { element, heard: sound, unknown } of source.incidents) {
    const { from, open, unknown: dubious } = field.elements[element];
    mask |= sound & open & heard.open[from] & (unknown | dubious | heard.tainted[from]);
  }
  return mask;
}
