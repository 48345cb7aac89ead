import type { Plan, Space, Surface } from "@/lib/noise/plan";
import type { SpaceVerdict } from "@/lib/noise/verdict";
import type { PlanChange } from "../plan/save";
import { finishSet, wordOf, type Piece } from "./finishSets";
import { boxVolume, volumeFollows, type BySurfaces, type Room, type Size } from "./room";

export const changeRoom = ({ id }: Space, patch: Partial<Space>): PlanChange => ({ act: "change", part: "spaces", id, patch });

const addSurface = (spaceId: string, values: object): PlanChange => ({ act: "add", part: "surfaces", values: { spaceId, ...values } });
const removeSurface = ({ id }: Surface): PlanChange => ({ act: "remove", part: "surfaces", id });

/** By surfaces, as a room starts. */
export const bySurfaces = (objects: BySurfaces["objects"] = []): BySurfaces => ({ kind: "surfaces", model: "sabine", air: true, objects });

/** Surfaces become these pieces. One that stands already under the same name and finish keeps its place. */
export function lineWith({ space, surfaces }: Room, pieces: readonly Piece[]): PlanChange[] {
  const left = [...surfaces];
  const wanted = pieces.flatMap(({ name, libraryKey, area }): PlanChange[] => {
    const at = left.findIndex((one) => one.finishKey === libraryKey && one.name === name);
    const [standing] = at < 0 ? [] : left.splice(at, 1);
    if (!standing) return [addSurface(space.id, { name, libraryKey, area })];
    return standing.area === area ? [] : [{ act: "change", part: "surfaces", id: standing.id, patch: { area } }];
  });
  return [...left.map(removeSurface), ...wanted];
}

/** A finish in words: its surfaces, and absorption reckoned from them. */
export function finishWith(room: Room, pieces: readonly Piece[], objects: BySurfaces["objects"]): PlanChange[] {
  const { absorption } = room.space;
  const lined = lineWith(room, pieces);
  return absorption.kind === "surfaces" ? lined : [...lined, changeRoom(room.space, { absorption: bySurfaces(objects) })];
}

/** A new size. The volume goes along unless another was typed, and so do the surfaces of a finish in words. */
export function resize(room: Room, size: Size, at = room.space.box?.at ?? ([0, 0, 0] as Size)): PlanChange[] {
  const { space, surfaces } = room;
  const volume = volumeFollows(space) ? { volume: Math.max(0.5, boxVolume(size)) } : {};
  const worded = wordOf(surfaces, space.box?.size);
  const lined = worded ? lineWith(room, finishSet(worded.word, worded.shell, size)) : [];
  return [changeRoom(space, { box: { at, size }, ...volume }), ...lined];
}

const FIGURES = 4;

/** What own figures may be: seconds, and m². */
export const FIGURE_BOUNDS = { decay: [0.02, 30], area: [0.01, 10_000] } as const;

/**
 * Nine figures to start from: those the room has now, so that nothing moves by the change itself. An empty room rings
 * for longer than anybody could mean; such a figure is left open.
 */
export function ownFigures(kind: "decay" | "area", judged: SpaceVerdict | undefined): Space["absorption"] {
  const [least, most] = FIGURE_BOUNDS[kind];
  const figures = (values: readonly unknown[] = new Array(9).fill(null)) =>
    values.map((value) => (typeof value === "number" && value >= least && value <= most ? Number(value.toPrecision(FIGURES)) : null));
  return kind === "decay" ? { kind, seconds: figures(judged?.decay) } : { kind, area: figures(judged?.absorption) };
}

/** A room as it comes: bare, with light walls on a slab, until somebody says otherwise. */
export function addRoom(values: { name: string; buildingId: string; at: Size; size: Size }): PlanChange[] {
  const { name, buildingId, at, size } = values;
  const space = { name, buildingId, volume: Math.max(0.5, boxVolume(size)), box: { at, size }, absorption: bySurfaces() };
  const bare = finishSet("bare", { walls: "light", floor: "concrete" }, size);
  return [{ act: "add", part: "spaces", values: space, as: "new:room" }, ...bare.map((piece) => addSurface("new:room", piece))];
}

const withoutId = <T extends { id: string }>({ id: _, ...values }: T) => values;
const LONGEST = 120;

/** The same room once more, beside the first, with its surfaces; what stands in it stays where it is. */
export function duplicateRoom({ space, surfaces }: Room): PlanChange[] {
  const beside = space.box && { ...space.box, at: [space.box.at[0] + space.box.size[0] + 0.2, space.box.at[1], space.box.at[2]] };
  const name = `${space.name.slice(0, LONGEST - 6)}, copy`;
  const copy = { ...withoutId(space), name, box: beside };
  return [
    { act: "add", part: "spaces", values: copy, as: "new:room" },
    ...surfaces.map((surface) => addSurface("new:room", { ...withoutId(surface), spaceId: "new:room" })),
  ];
}

/** The room's boundaries go first: they would hold it. What else holds it is refused by the server and said before. */
export function removeRoom(plan: Plan, { id }: Space): PlanChange[] {
  const paths = plan.paths.filter(({ fromSpaceId, toSpaceId }) => fromSpaceId === id || toSpaceId === id);
  return [...paths.map((path): PlanChange => ({ act: "remove", part: "paths", id: path.id })), { act: "remove", part: "spaces", id }];
}

const same = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other);

/** Puts a room and its surfaces back to what they were in an older plan. */
export function restoreRoom(before: Plan, now: Plan, spaceId: string): PlanChange[] {
  const of = (plan: Plan) => plan.surfaces.filter((surface) => surface.spaceId === spaceId);
  const [old, standing] = [of(before), of(now)];
  const space = before.spaces.find(({ id }) => id === spaceId);
  const spaceNow = now.spaces.find(({ id }) => id === spaceId);
  const gone = standing.filter(({ id }) => !old.some((one) => one.id === id)).map(removeSurface);
  const back = old.flatMap((surface): PlanChange[] => {
    const current = standing.find(({ id }) => id === surface.id);
    if (!current) return [addSurface(spaceId, withoutId(surface))];
    return same(current, surface) ? [] : [{ act: "change", part: "surfaces", id: surface.id, patch: withoutId(surface) }];
  });
  const whole = space && spaceNow && !same(space, spaceNow) ? [changeRoom(space, withoutId(space))] : [];
  return [...gone, ...back, ...whole];
}
