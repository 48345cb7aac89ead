import { BAND_COUNT } from "../../lib/noise/bands";
import type { Surface } from "@/lib/noise/plan";
import type { SpaceVerdict } from "@/lib/noise/verdict";
import type { Room } from "./room";

/** What takes sound out of a room: a surface, a thing in it, or its air. */
export interface Soaker {
  id: string;
  name: string;
  finishKey: string | null;
  kind: "surface" | "object" | "air";
  /** m2 of a surface; null of what has none. */
  size: number | null;
  /** Absorption area per band, m2; null where it is not known. */
  areas: (number | null)[];
}

const LOWEST = 2;
const HIGHEST = 7;

/** What is missing below 125 Hz is as at 125 Hz, above 4 kHz as at 4 kHz: the way rooms are weighed. */
const filled = (given: readonly (number | null)[]): (number | null)[] =>
  given.map((value, band) => value ?? given[Math.min(HIGHEST, Math.max(LOWEST, band))] ?? null);

/**
 * Who takes which part, per band. By the second formula of room absorption the surfaces together take more than the sum
 * of their own: each then takes its part of that whole. The air takes what is left of the room's figure.
 */
export function soakersOf({ space, surfaces }: Room, judged: SpaceVerdict | undefined): Soaker[] | null {
  const { absorption } = space;
  if (absorption.kind !== "surfaces") return null;
  const lift = absorption.model === "eyring" ? liftOf(surfaces) : new Array<number>(BAND_COUNT).fill(1);
  const linings = surfaces.map((surface): Soaker => {
    const areas = filled(surface.alpha).map((alpha, band) => (alpha === null ? null : alpha * surface.area * lift[band]!));
    return { id: surface.id, name: surface.name, finishKey: surface.finishKey, kind: "surface", size: surface.area, areas };
  });
  const things = absorption.objects.map(({ name, area }, index): Soaker => {
    return { id: `object ${index}`, name, finishKey: null, kind: "object", size: null, areas: filled(area) };
  });
  const known = [...linings, ...things];
  return absorption.air ? [...known, airOf(known, judged)] : known;
}

/** -S ln(1 - mean alpha) beside the plain sum S alpha, per band. */
function liftOf(surfaces: readonly Surface[]): number[] {
  const whole = surfaces.reduce((sum, { area }) => sum + area, 0);
  return Array.from({ length: BAND_COUNT }, (_, band) => {
    const plain = surfaces.reduce((sum, { area, alpha }) => sum + area * (filled(alpha)[band] ?? 0), 0);
    return plain > 0 ? (-whole * Math.log(1 - Math.min(0.99, plain / whole))) / plain : 1;
  });
}

function airOf(known: readonly Soaker[], judged: SpaceVerdict | undefined): Soaker {
  const areas = Array.from({ length: BAND_COUNT }, (_, band) => {
    const total = judged?.absorption[band];
    const others = sumAt(known, band);
    return typeof total === "number" && others !== null ? Math.max(0, total - others) : null;
  });
  return { id: "air", name: "The air itself", finishKey: null, kind: "air", size: null, areas };
}

/** Sum of all absorption areas in a band, m2; null where one is not known. */
export function sumAt(soakers: readonly Soaker[], band: number): number | null {
  return soakers.reduce<number | null>((sum, { areas }) => {
    const area = areas[band] ?? null;
    return sum === null || area === null ? null : sum + area;
  }, 0);
}

/** Parts of the whole in a band, 0 to 1; null where it cannot be told. */
export function sharesAt(soakers: readonly Soaker[], band: number): number[] | null {
  const whole = sumAt(soakers, band);
  return whole === null || whole <= 0 ? null : soakers.map(({ areas }) => areas[band]! / whole);
}
