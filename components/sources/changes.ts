import type { SourceRecord } from "@/lib/noise/library";
import type { Plan, Situation } from "@/lib/noise/plan";
import type { Source } from "@/lib/noise/sources";
import type { PlanChange } from "../plan/save";
import { totalOf } from "./spectrum";

/** What is done to a plan on this page, as changes that are saved together. */
export type Changes = readonly PlanChange[];
type Playing = Situation["playing"];
type Level = number | "silent" | null;
type Place = { spaceId: string | null; position: [number, number, number] | null };

/** Height over the floor at which a new source is put in its room, m. */
const STANDING = 0.8;

/** The room a new source is put in: the largest of the studio, else the largest drawn. */
export function firstRoomOf({ spaces, buildings }: Plan): string | null {
  const studios = new Set(buildings.filter(({ role }) => role === "studio").map(({ id }) => id));
  const rooms = spaces.filter(({ buildingId }) => studios.has(buildingId));
  return (rooms.length > 0 ? rooms : spaces).toSorted((one, two) => two.volume - one.volume)[0]?.id ?? null;
}

/** In the middle of a room where its extent is drawn; else without a position, which only the drawings miss. */
export function placeIn({ spaces }: Plan, spaceId: string | null): Place {
  const box = spaces.find(({ id }) => id === spaceId)?.box;
  if (!box) return { spaceId, position: null };
  const [x, y, z] = box.at.map((at, axis) => Math.round((axis < 2 ? at + box.size[axis]! / 2 : at + STANDING) * 100) / 100);
  return { spaceId, position: [x!, y!, z!] };
}

const playingIn = (situations: readonly Situation[], playing: (situation: Situation) => Playing): PlanChange[] =>
  situations.map((situation) => ({ act: "change", part: "situations", id: situation.id, patch: { playing: playing(situation) } }));

/** A new source, at work in every situation: what a situation does not name is off. */
function addPlaying(plan: Plan, values: Record<string, unknown>): Changes {
  const added: PlanChange = { act: "add", part: "sources", as: "new:source", values };
  return [added, ...playingIn(plan.situations, ({ playing }) => [...playing, { sourceId: "new:source", share: 1 }])];
}

/** A record of the library becomes a source of this yard; a number tells it from those of the same name. */
export function addFromLibrary(plan: Plan, record: Pick<SourceRecord, "key" | "name">, place: Place): Changes {
  return addPlaying(plan, { libraryKey: record.key, name: freeName(plan, record.name), ...place, params: {} });
}

/** A source of a kind whose figures nobody has given yet. */
export function addWithoutFigures(plan: Plan, kind: { name: string; label: string }, place: Place): Changes {
  const provenance = { document: "No figures yet", clause: "", memory: false };
  const unknown = { power: null, deviation: null, basis: "typed", provenance };
  return addPlaying(plan, { kind: kind.name, name: freeName(plan, kind.label), says: "", ...place, ...unknown, params: {} });
}

export function freeName({ sources }: Pick<Plan, "sources">, name: string): string {
  const taken = new Set(sources.map((source) => source.name));
  for (let number = 2; taken.has(name) && number < 99; number += 1) if (!taken.has(`${name} ${number}`)) return `${name} ${number}`;
  return name;
}

export const removeSource = (id: string): Changes => [{ act: "remove", part: "sources", id }];

/** What goes with a source, counted. */
export function goingWith(plan: Plan, id: string) {
  return {
    mouths: plan.outlets.filter(({ sourceId }) => sourceId === id).length,
    incidences: plan.incidences.filter(({ sourceId }) => sourceId === id).length,
    situations: plan.situations.filter(({ playing }) => playing.some(({ sourceId }) => sourceId === id)).length,
  };
}

const bare = ({ id: _, ...values }: { id: string }): Record<string, unknown> => values;

/** Puts a removed source back as it stood in `before`, with its mouths, levels, distances and shares. */
export function restoreSource(before: Plan, now: Plan, id: string): Changes {
  const source = before.sources.find((one) => one.id === id);
  if (!source) return [];
  const owned = (part: "outlets" | "incidences"): PlanChange[] =>
    before[part].filter(({ sourceId }) => sourceId === id).map((one) => ({ act: "add", part, values: { ...bare(one), sourceId: "new:back" } }));
  const shareIn = ({ id: situationId }: Situation) =>
    before.situations.find((one) => one.id === situationId)?.playing.find(({ sourceId }) => sourceId === id)?.share;
  const distances = before.receivers.flatMap((receiver): PlanChange[] => {
    const standing = now.receivers.find((one) => one.id === receiver.id);
    const metres = receiver.distances[id];
    if (metres === undefined || !standing) return [];
    return [{ act: "change", part: "receivers", id: receiver.id, patch: { distances: { ...standing.distances, "new:back": metres } } }];
  });
  return [
    { act: "add", part: "sources", as: "new:back", values: bare(source) },
    ...owned("outlets"),
    ...owned("incidences"),
    ...distances,
    ...playingIn(
      now.situations.filter((situation) => shareIn(situation) !== undefined),
      (situation) => [...situation.playing, { sourceId: "new:back", share: shareIn(situation)! }],
    ),
  ];
}

/** What a library record or a measurement replaces, to take it back. */
function figuresOf({ name, says, power, deviation, basis, provenance }: Source): Record<string, unknown> {
  return { name, says, power, deviation, basis, provenance };
}

/** Other figures for a source, and the way back to those that stand when its turn comes. */
export function replaceFigures({ id }: Source, figures: (standing: Source) => Record<string, unknown>, words: string) {
  let former: Record<string, unknown> = {};
  const change = (patch: Record<string, unknown>): Changes => [{ act: "change", part: "sources", id, patch }];
  return {
    changes: ({ sources }: Plan): Changes => {
      const standing = sources.find((source) => source.id === id);
      if (!standing) return [];
      former = figuresOf(standing);
      return change(figures(standing));
    },
    undo: { words, changes: () => change(former) },
  };
}

/** The record's figures under the name the source has here. */
export const takeRecord = (source: Source, record: Pick<SourceRecord, "key" | "name">) =>
  replaceFigures(source, ({ name, says }) => ({ libraryKey: record.key, name, says }), `${source.name} has the library’s figures: ${record.name}.`);

/** Every source at work all the time: a new situation is not silent. */
export function addSituation({ situations, sources }: Plan): Changes {
  const taken = new Set(situations.map(({ name }) => name));
  const name = ["Everything at once", "Another evening"].find((free) => !taken.has(free)) ?? `Situation ${situations.length + 1}`;
  return [{ act: "add", part: "situations", values: { name, says: "", playing: sources.map(({ id }) => ({ sourceId: id, share: 1 })) } }];
}

export const restoreSituation = (situation: Situation): Changes => [{ act: "add", part: "situations", values: bare(situation) }];

/** Switches a source on (with a share of the time) or off (null) in a situation. */
export function setShare({ id, playing }: Situation, sourceId: string, share: number | null): Changes {
  const others = playing.filter((one) => one.sourceId !== sourceId);
  const at = playing.findIndex((one) => one.sourceId === sourceId);
  const next = share === null ? others : at < 0 ? [...playing, { sourceId, share }] : playing.map((one, i) => (i === at ? { sourceId, share } : one));
  return [{ act: "change", part: "situations", id, patch: { playing: next } }];
}

/** A level in dB(A) spread over the bands by a shape: the A-weighted sum of the nine is that level. */
export function spreadShape(shape: readonly Level[], level: number, aWeights: readonly number[]): Level[] {
  const inSum = totalOf(shape, aWeights) ?? 0;
  return shape.map((relative) => (typeof relative === "number" ? Math.round((level + relative - inSum) * 10) / 10 : relative));
}
