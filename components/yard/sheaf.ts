import type { Plan } from "../../lib/noise/plan";
import type { PathVerdict, ReceiverVerdict } from "../../lib/noise/verdict";
import type { PathKind } from "../format";
import { toMillimetre, type Spot } from "./geometry";

/** One way into the ear of the lit listener. */
export interface Way {
  id: string;
  /** What it can light: an element, a source or a mouth outdoors. */
  partId: string | null;
  name: string;
  kind: PathKind;
  /** Of the energy at the lit band, 0 to 1. */
  share: number;
  from: Spot | null;
  /** Direction it leaves in, on the plan; null over a roof or where there is none. */
  out: readonly [number, number] | null;
  /** Straight distance, m. */
  distance: number | null;
}

export interface Mouth {
  at: Spot;
  out: readonly [number, number] | null;
  elementId: string | null;
}

const flatOf = (normal: Spot | null): readonly [number, number] | null => (normal && Math.hypot(normal[0], normal[1]) > 0.1 ? [normal[0], normal[1]] : null);

/** Where the sound gets in: the opening that lets most of it through, or the listener himself. */
export function mouthOf(plan: Plan, weighed: ReceiverVerdict): Mouth | null {
  const receiver = plan.receivers.find(({ id }) => id === weighed.receiverId);
  const entered = weighed.contributions.find(({ enteringId }) => enteringId !== null)?.enteringId;
  const element = plan.elements.find(({ id }) => id === entered);
  if (element?.position) return { at: element.position, out: flatOf(element.normal), elementId: element.id };
  return receiver?.position ? { at: receiver.position, out: null, elementId: null } : null;
}

function startOf(plan: Plan, { id, partId }: PathVerdict): { from: Spot | null; out: Way["out"] } {
  const element = plan.elements.find((one) => one.id === partId);
  if (element) return { from: element.position, out: element.kind === "roof" ? null : flatOf(element.normal) };
  const placed = [...plan.sources, ...plan.outlets].find((one) => one.id === partId);
  if (placed) return { from: placed.position, out: null };
  const leak = id.startsWith("leaks:") ? leakOf(plan, id.slice("leaks:".length)) : undefined;
  return { from: leak?.position ?? null, out: leak ? flatOf(leak.normal) : null };
}

function leakOf({ spaces, paths, elements }: Plan, buildingId: string) {
  const rooms = new Set(spaces.filter((space) => space.buildingId === buildingId).map(({ id }) => id));
  const faces = new Set(paths.filter(({ fromSpaceId }) => rooms.has(fromSpaceId)).map(({ id }) => id));
  return elements.find(({ kind, pathId, position }) => kind === "leak" && position !== null && faces.has(pathId));
}

/** Everything that reaches the lit listener at a band, most of it first. */
export function waysInto(plan: Plan, weighed: ReceiverVerdict, bandIndex: number): Way[] {
  const mouth = mouthOf(plan, weighed);
  return weighed.paths
    .map((path): Way => {
      const start = startOf(plan, path);
      return {
        id: path.id,
        partId: path.partId,
        name: path.name,
        kind: path.kind,
        share: weighed.weighted ? (path.weighted?.share ?? 0) : (path.shares[bandIndex] ?? 0),
        ...start,
        distance: start.from && mouth ? toMillimetre(Math.hypot(...start.from.map((metre, axis) => metre - mouth.at[axis]!))) : null,
      };
    })
    .filter(({ share }) => share > 0)
    .toSorted((one, two) => two.share - one.share);
}

type Dot = readonly [number, number];

export interface Ribbon {
  way: Way;
  /** Points along its middle, px. */
  middle: Dot[];
  /** px; a way too thin to be drawn to scale is a line of 1.5. */
  width: number;
  thin: boolean;
}

const THINNEST = 1.5;
const STEPS = 28;

interface Bundle {
  ways: readonly Way[];
  mouth: { at: Dot; out: readonly [number, number] | null };
  /** Width of everything together, px. */
  full: number;
  toPixels: (spot: Spot) => Dot;
}

/** Ribbons as wide as their share, gathered side by side at the mouth in the order in which they come. */
export function ribbonsOf({ ways, mouth, full, toPixels }: Bundle): Ribbon[] {
  const placed = ways.flatMap((way) => (way.from ? [{ way, start: toPixels(way.from) }] : []));
  const [first] = placed;
  if (!first) return [];
  const into = mouth.out ? unit([mouth.out[0], -mouth.out[1]]) : unit(less(first.start, mouth.at));
  const across: Dot = [-into[1], into[0]];
  const order = placed.toSorted((one, two) => dot(less(one.start, mouth.at), across) - dot(less(two.start, mouth.at), across));
  const thick = (share: number) => full * share >= THINNEST;
  const whole = order.reduce((sum, { way }) => sum + (thick(way.share) ? full * way.share : 0), 0);
  let along = -whole / 2;
  return order.map(({ way, start }) => {
    const thin = !thick(way.share);
    const width = thin ? THINNEST : full * way.share;
    const offset = along + (thin ? 0 : width / 2);
    if (!thin) along += width;
    const end: Dot = [mouth.at[0] + across[0] * offset, mouth.at[1] + across[1] * offset];
    return { way, width, thin, middle: curve(start, way.out && unit([way.out[0], -way.out[1]]), end, into) };
  });
}

const less = (one: Dot, two: Dot): Dot => [one[0] - two[0], one[1] - two[1]];
const dot = (one: Dot, two: Dot): number => one[0] * two[0] + one[1] * two[1];
function unit([x, y]: Dot): Dot {
  const length = Math.hypot(x, y) || 1;
  return [x / length, y / length];
}

/** A cubic that leaves along the face's outward direction and arrives at right angles to the mouth. */
function curve(start: Dot, out: Dot | null, end: Dot, into: Dot): Dot[] {
  const reach = Math.hypot(...less(end, start)) * 0.42;
  const leaving = out ?? unit([end[0] - start[0], (end[1] - start[1]) * 0.3]);
  const one: Dot = [start[0] + leaving[0] * reach, start[1] + leaving[1] * reach];
  const two: Dot = [end[0] + into[0] * reach, end[1] + into[1] * reach];
  return Array.from({ length: STEPS + 1 }, (_, step): Dot => {
    const t = step / STEPS;
    const [a, b, c, d] = [(1 - t) ** 3, 3 * t * (1 - t) ** 2, 3 * t * t * (1 - t), t ** 3];
    return [a * start[0] + b * one[0] + c * two[0] + d * end[0], a * start[1] + b * one[1] + c * two[1] + d * end[1]];
  });
}

/** The edge of a band of one width round its middle line. */
export function edgeOf(middle: readonly Dot[], width: number): Dot[] {
  const sides = middle.map((point, at) => {
    const [x, y] = unit(less(middle[Math.min(at + 1, middle.length - 1)]!, middle[Math.max(at - 1, 0)]!));
    return { point, side: [-y * (width / 2), x * (width / 2)] as const };
  });
  const left = sides.map(({ point, side }): Dot => [point[0] + side[0], point[1] + side[1]]);
  const right = sides.map(({ point, side }): Dot => [point[0] - side[0], point[1] - side[1]]);
  return [...left, ...right.reverse()];
}
