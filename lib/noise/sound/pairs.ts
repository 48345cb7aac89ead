import { groupRooms } from "../balance";
import { elementModels } from "../model/elementModels";
import { roomModels } from "../model/roomModels";
import { sourceModels, type SourceModel } from "../model/sourceModels";
import { cutTowards } from "../outdoors/face";
import { endAt } from "../outdoors/ray";
import type { Plan } from "../plan";
import { emittersOf, mayArrive, type Point } from "./emitters";

/** Most pairs of a radiating and an entering place that one plan may hold: the bound of the work of a verdict. */
export const MOST_PAIRS = 20_000;

const isOutdoors = ({ emissions, incidents }: SourceModel) => emissions.length + incidents.length > 0;

/**
 * Pairs of a place that may radiate into the yard and a place where sound may enter or be heard, each counted as often as
 * the near field cuts it (solver method 5). From where things stand only: what they let pass is not asked, so a plan has
 * at most this many. Whole number from 0; total.
 */
export function countPairs(plan: Plan): number {
  const rooms = roomModels(plan, []);
  const { elements } = elementModels(plan, new Map(), rooms, []);
  const sources = sourceModels(plan, rooms, elements, []);
  const groups = groupRooms(rooms.length, elements);
  const places = new Map(rooms.map(({ space, index }) => [space.id, index]));
  const groupsOf = (list: readonly number[]) => {
    const inside = new Set(list.map((room) => groups[room]));
    return (room: number) => inside.has(groups[room]);
  };
  // Whatever sounds outdoors enters every house, and each then sounds in turn.
  const made = sources.flatMap(({ injections }) => injections.map(({ room }) => room));
  const sounding = sources.some(isOutdoors) ? () => true : groupsOf(made);
  const listening = groupsOf(plan.receivers.flatMap(({ spaceId }) => places.get(spaceId ?? "") ?? []));
  const points = elements.flatMap((element): Point[] =>
    element.face && listening(element.from) ? [{ end: endAt(element.face.at), element, face: element.face }] : [],
  );
  for (const { kind, position } of plan.receivers)
    if (kind === "outdoor" && position) points.push({ end: endAt(position), element: null, face: null });
  let pairs = 0;
  for (const emitter of emittersOf(elements, sources, sounding)) {
    for (const point of points) {
      if (!mayArrive(emitter, point)) continue;
      const [across, up] = cutTowards(emitter.face, point.end.at);
      pairs += across * up;
    }
  }
  return pairs;
}
