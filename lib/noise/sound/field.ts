import { balanceRooms, type Balance } from "../balance";
import { BAND_COUNT } from "../bands";
import type { EffectiveLoss } from "../effective";
import { elementModels, type ElementModel, type ElementModels } from "../model/elementModels";
import { roomModels, type RoomModel } from "../model/roomModels";
import { sourceModels, type SourceModel } from "../model/sourceModels";
import { airAttenuations } from "../outdoors/air";
import { endAt, type Yard } from "../outdoors/ray";
import type { Plan, Receiver } from "../plan";
import type { Note } from "../verdict";
import { arrivedOf } from "./arrived";
import { addTravel, emittersOf, mayArrive, type Emitter, type Point } from "./emitters";

/** The plan as arrays: rooms balanced, emitters and the places their sound arrives at, all per source at full power. */
export interface Field {
  readonly plan: Plan;
  readonly yard: Yard;
  readonly rooms: readonly RoomModel[];
  readonly elements: readonly ElementModel[];
  readonly passings: ElementModels["passings"];
  readonly sources: readonly SourceModel[];
  readonly balance: Balance;
  readonly emitters: readonly Emitter[];
  readonly points: readonly Point[];
  /** Point of an element by its index, and of an outdoor listener by its id. */
  readonly pointOfElement: ReadonlyMap<number, number>;
  readonly pointOfReceiver: ReadonlyMap<string, number>;
  /** Energy in a room of what sounds in its own group of rooms, [(source * rooms + room) * bands + band]. */
  readonly inside: Float64Array;
  /** Energy in a room of what entered from outdoors, in the same order. */
  readonly arrived: Float64Array;
  /** Power of an emitter, pW, [(emitter * sources + source) * bands + band]. */
  readonly emitted: Float64Array;
  /** Energy at a point of an emitter of power 1, [(point * emitters + emitter) * bands + band]. */
  readonly travel: Float64Array;
}

/** Air in dB/m, ground and fences of a plan. */
function yardOf({ lot, fences }: Plan): Yard {
  return { air: airAttenuations(lot.temperature, lot.humidity), ground: lot.ground, screens: fences };
}

function insideOf(
  rooms: readonly RoomModel[],
  sources: readonly SourceModel[],
  { inverse }: Balance,
): Float64Array {
  const count = rooms.length;
  const inside = new Float64Array(sources.length * count * BAND_COUNT);
  for (const { index, injections } of sources) {
    for (const { room, energy } of injections) {
      for (let i = 0; i < count; i += 1) {
        for (let band = 0; band < BAND_COUNT; band += 1) {
          inside[(index * count + i) * BAND_COUNT + band] +=
            4 * energy[band] * inverse[(band * count + i) * count + room];
        }
      }
    }
  }
  return inside;
}

/** Radiated power L_W = L_p + C_d - R + 10 lg S of elements (EN 12354-4), own power of the rest. */
function emittedOf(
  emitters: readonly Emitter[],
  rooms: number,
  sources: number,
  [inside, arrived]: [Float64Array, Float64Array],
): Float64Array {
  const emitted = new Float64Array(emitters.length * sources * BAND_COUNT);
  emitters.forEach(({ element, source, power }, m) => {
    for (let s = 0; s < sources; s += 1) {
      const at = (m * sources + s) * BAND_COUNT;
      if (element) {
        const from = (s * rooms + element.from) * BAND_COUNT;
        for (let band = 0; band < BAND_COUNT; band += 1) {
          emitted[at + band] =
            (inside[from + band] + arrived[from + band]) * element.passing[band] * element.diffuse;
        }
      } else if (s === source) emitted.set(power, at);
    }
  });
  return emitted;
}

function travelOf(yard: Yard, emitters: readonly Emitter[], points: readonly Point[]): Float64Array {
  const travel = new Float64Array(points.length * emitters.length * BAND_COUNT);
  points.forEach((point, p) => {
    emitters.forEach((emitter, m) => {
      if (mayArrive(emitter, point))
        addTravel(yard, emitter, point, travel, (p * emitters.length + m) * BAND_COUNT);
    });
  });
  return travel;
}

/** Where sound from outdoors has to be known: at elements of a listener's group of rooms, and at outdoor listeners. */
function pointsOf(
  elements: readonly ElementModel[],
  receivers: readonly Receiver[],
  listening: (room: number) => boolean,
) {
  const points: Point[] = [];
  const pointOfElement = new Map<number, number>();
  const pointOfReceiver = new Map<string, number>();
  for (const model of elements) {
    if (!model.face || !listening(model.from)) continue;
    pointOfElement.set(model.index, points.length);
    points.push({ end: endAt(model.face.at), element: model, face: model.face });
  }
  for (const { id, kind, position, side } of receivers) {
    if (kind !== "outdoor" || !position) continue;
    pointOfReceiver.set(id, points.length);
    points.push({ end: endAt(position, side === "far"), element: null, face: null });
  }
  return { points, pointOfElement, pointOfReceiver };
}

/** Groups of rooms that any of the given rooms belongs to, as a question. */
function groupsOf({ groups }: Balance, rooms: readonly number[]): (room: number) => boolean {
  const inside = new Set(rooms.map((room) => groups[room]));
  return (room) => inside.has(groups[room]);
}

/** Index of the room that a listener is in; -1 outdoors or in no room of the plan. */
export function roomIndexOf(rooms: readonly RoomModel[], receiver: Receiver): number {
  return receiver.kind === "room" ? rooms.findIndex(({ space }) => space.id === receiver.spaceId) : -1;
}

/** Rooms that any sound is in: made there, or come in from outdoors. */
function soundingRooms(sources: readonly SourceModel[], rooms: number, arrived: Float64Array): number[] {
  const reached = (room: number) =>
    sources.some(({ index }) => {
      const start = (index * rooms + room) * BAND_COUNT;
      return arrived.subarray(start, start + BAND_COUNT).some((each) => each > 0);
    });
  const made = sources.flatMap(({ injections }) => injections.map(({ room }) => room));
  return [...made, ...Array.from({ length: rooms }, (_, room) => room).filter(reached)];
}

/** Reckons everything that does not depend on who listens when: solver method 8, steps 2 to 4. */
export function fieldOf(plan: Plan, losses: ReadonlyMap<string, EffectiveLoss>, notes: Note[]): Field {
  const rooms = roomModels(plan, notes);
  const { elements, passings } = elementModels(plan, losses, rooms, notes);
  const sources = sourceModels(plan, rooms, elements, notes);
  const balance = balanceRooms(
    rooms.map(({ absorption }) => absorption),
    elements,
  );
  const yard = yardOf(plan);
  const arrived = arrivedOf(yard, elements, sources, balance);
  const sounding = groupsOf(balance, soundingRooms(sources, rooms.length, arrived));
  const heard = plan.receivers.map((receiver) => roomIndexOf(rooms, receiver)).filter((room) => room >= 0);
  const emitters = emittersOf(elements, sources, sounding);
  const arrivals = pointsOf(elements, plan.receivers, groupsOf(balance, heard));
  const inside = insideOf(rooms, sources, balance);
  return {
    plan,
    yard,
    rooms,
    elements,
    passings,
    sources,
    balance,
    emitters,
    ...arrivals,
    inside,
    arrived,
    emitted: emittedOf(emitters, rooms.length, sources.length, [inside, arrived]),
    travel: travelOf(yard, emitters, arrivals.points),
  };
}
