import { BAND_COUNT } from "../bands";
import { ENTERING, ON_FACADE } from "../facade";
import type { ElementModel } from "../model/elementModels";
import { ALL_BANDS, type BandMask } from "../model/masks";
import type { SourceModel } from "../model/sourceModels";
import type { Receiver } from "../plan";
import { directFactor } from "../rooms";
import { roomIndexOf, type Field } from "./field";
import { unknownAt, type SpreadFrom } from "./unknowns";

/** Read once: a loop would ask the other module at every turn. */
const BANDS = BAND_COUNT;

/** An element by which sound from outdoors enters the listener's rooms. */
export interface Entry {
  readonly element: ElementModel;
  /** Index of its point; -1 without a place, where only given levels arrive. */
  readonly point: number;
  /** Energy at the listener per incident free-field energy at the element. */
  readonly gain: Float64Array;
}
/** An element between the listener's room and the next one. */
export interface Passage {
  readonly element: ElementModel;
  readonly from: number;
  /** Energy at the listener per energy in that room. */
  readonly gain: Float64Array;
}

/** How one listener hears: everything is linear in the energies of rooms, emitters and given levels. */
export interface Hearing {
  readonly receiver: Receiver;
  /** Index of the listener's room; -1 outdoors or nowhere. */
  readonly room: number;
  /** Whether the plan says where the listener is. */
  readonly placed: boolean;
  readonly entries: readonly Entry[];
  readonly passages: readonly Passage[];
  /** Energy per power in the listener's own room, [source * bands + band]: direct and diffuse. */
  readonly own: Float64Array;
  /** Energy at the listener per power of an emitter, [emitter * bands + band]. */
  readonly outdoors: Float64Array;
  /** Energy of each source at full power, [source * bands + band]. */
  readonly bySource: Float64Array;
  /** Bands in which a part of each source is not known. */
  readonly unknown: readonly BandMask[];
}

function entriesOf({ elements, balance, pointOfElement }: Field, room: number): Entry[] {
  const { count, groups, inverse } = balance;
  return elements.flatMap((element) => {
    if (element.to >= 0 || groups[element.from] !== groups[room] || element.open === 0) return [];
    const gain = element.passing.map(
      (area, band) => ENTERING * area * 4 * inverse[(band * count + room) * count + element.from],
    );
    return [{ element, point: pointOfElement.get(element.index) ?? -1, gain }];
  });
}

function passagesOf({ elements, balance: { count, diagonal } }: Field, room: number): Passage[] {
  return elements.flatMap((element) => {
    if (element.to < 0 || (element.from !== room && element.to !== room)) return [];
    const from = element.from === room ? element.to : element.from;
    const gain = element.passing.map((area, band) =>
      diagonal[band * count + room] > 0 ? area / diagonal[band * count + room] : 0,
    );
    return [{ element, from, gain }];
  });
}

const NEAREST = 1;

/** Distance of a listener to a source in the same room, m: as given, or as drawn and then never below 1 m; null unknown. */
function distanceTo({ distances, position }: Receiver, { source }: SourceModel): number | null {
  const given = distances[source.id];
  if (given !== undefined) return given;
  if (!position || !source.position) return null;
  return Math.max(NEAREST, Math.hypot(...position.map((at, axis) => at - (source.position?.[axis] ?? at))));
}

/** L_p = L_W + 10 lg(Q/(4 pi r^2) + 4/A) in the source's own room, with the balance's A + sum g (solver method 4). */
function ownOf(
  { sources, balance: { count, diagonal } }: Field,
  receiver: Receiver,
  room: number,
): Float64Array {
  const own = new Float64Array(sources.length * BANDS);
  for (const model of sources) {
    if (!model.injections.some((injection) => injection.room === room)) continue;
    const distance = model.source.spaceId === receiver.spaceId ? distanceTo(receiver, model) : null;
    const direct = distance === null ? 0 : directFactor(model.q, distance);
    for (let band = 0; band < BANDS; band += 1) {
      const area = diagonal[band * count + room];
      own[model.index * BANDS + band] = area > 0 ? direct + 4 / area : 0;
    }
  }
  return own;
}

/** Energy at the listener per power of each emitter: over all entries, or straight to an outdoor listener. */
function outdoorsOf(
  { emitters, points, travel, pointOfReceiver }: Field,
  receiver: Receiver,
  entries: readonly Entry[],
): Float64Array {
  const count = emitters.length * BANDS;
  const outdoors = new Float64Array(count);
  const point = pointOfReceiver.get(receiver.id);
  if (point !== undefined) {
    const reflected = receiver.facade ? ON_FACADE : 1;
    return outdoors.map((_, i) => reflected * travel[point * count + i]);
  }
  for (const { point: at, gain } of entries) {
    if (at < 0 || at >= points.length) continue;
    for (let m = 0; m < count; m += BANDS) {
      for (let band = 0; band < BANDS; band += 1)
        outdoors[m + band] += travel[at * count + m + band] * gain[band];
    }
  }
  return outdoors;
}

/** Energy of one source at full power at the listener, over all ways. */
function energyOfSource(
  field: Field,
  parts: Omit<Hearing, "bySource" | "unknown">,
  source: SourceModel,
  out: Float64Array,
): void {
  const { rooms, sources, emitters, inside, emitted } = field;
  const at = source.index * BANDS;
  for (const { room, energy } of source.injections) {
    if (room === parts.room)
      for (let b = 0; b < BANDS; b += 1) out[at + b] += energy[b] * parts.own[at + b];
  }
  for (const { from, gain } of parts.passages) {
    const start = (source.index * rooms.length + from) * BANDS;
    for (let b = 0; b < BANDS; b += 1) out[at + b] += inside[start + b] * gain[b];
  }
  for (let m = 0; m < emitters.length; m += 1) {
    const start = (m * sources.length + source.index) * BANDS;
    for (let b = 0; b < BANDS; b += 1)
      out[at + b] += emitted[start + b] * parts.outdoors[m * BANDS + b];
  }
  for (const { element, energy } of source.incidents) {
    const entry = parts.entries.find((each) => each.element.index === element);
    if (entry) for (let b = 0; b < BANDS; b += 1) out[at + b] += energy[b] * entry.gain[b];
  }
}

function isPlaced({ pointOfReceiver }: Field, receiver: Receiver, room: number): boolean {
  return receiver.kind === "room" ? room >= 0 : pointOfReceiver.has(receiver.id);
}

/** How a listener of the plan hears every source: solver method 8, steps 5 and 6. `spread` is null where all is known. */
export function hear(field: Field, receiver: Receiver, spread: SpreadFrom | null): Hearing {
  const room = roomIndexOf(field.rooms, receiver);
  const entries = room < 0 ? [] : entriesOf(field, room);
  const parts = {
    receiver,
    room,
    placed: isPlaced(field, receiver, room),
    entries,
    passages: room < 0 ? [] : passagesOf(field, room),
    own: ownOf(field, receiver, room),
    outdoors: outdoorsOf(field, receiver, entries),
  };
  const bySource = new Float64Array(field.sources.length * BANDS);
  field.sources.forEach((source) => energyOfSource(field, parts, source, bySource));
  const unknown = field.sources.map((source) =>
    !parts.placed ? ALL_BANDS : spread ? unknownAt(field, source, room, spread) : 0,
  );
  return { ...parts, bySource, unknown };
}
