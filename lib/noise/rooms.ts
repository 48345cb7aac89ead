import { SPEED_OF_SOUND } from "./air";
import { BAND_COUNT } from "./bands";
import { airAttenuations } from "./outdoors/air";
import type { Lot, Space, Surface } from "./plan";

/** T = 55.26 V/(c A): Sabine's formula, 24 ln 10 (solver method 4). */
const SABINE = 55.26;
/** 10 lg e: from dB/m to the power attenuation m in 1/m. */
const NEPER = 10 * Math.LOG10E;
/** Mean absorption coefficient up to which Eyring's formula is taken. */
const MOST_ALPHA = 0.99;
/** A room whose surfaces absorb less than this, m2, has no field to speak of: no air, no people, bare rigid walls. */
const LEAST_AREA = 1e-4;
const LOWEST_MEASURED = 2;
const HIGHEST_MEASURED = 7;

type Given = readonly (number | null)[];

/** Decay time of a room, s; volume m3, absorption area m2. */
export function decayOf(volume: number, area: number): number {
  return (SABINE * volume) / (SPEED_OF_SOUND * area);
}

/** Absorption area behind a decay time, m2: Sabine solved for A (solver method 4). Volume m3, time s. */
export function areaFromDecay(volume: number, seconds: number): number {
  return (SABINE * volume) / (SPEED_OF_SOUND * seconds);
}

/** Missing absorption below 125 Hz is that of 125 Hz, above 4 kHz that of 4 kHz (solver method 0); else NaN. */
export function filled(given: Given): Float64Array {
  return Float64Array.from(given, (value, band) => {
    const nearest = Math.min(HIGHEST_MEASURED, Math.max(LOWEST_MEASURED, band));
    return value ?? given[nearest] ?? NaN;
  });
}

/** Absorption area of the air in a room, m2 over the nine bands: 4 m V (ISO 9613-1, indoor climate). */
export function airArea(volume: number, temperature: number, humidity: number): Float64Array {
  return airAttenuations(temperature, humidity).map((attenuation) => (4 * attenuation * volume) / NEPER);
}

/** A surface of a room: area m2, absorption coefficient over the nine bands. */
export interface Lining {
  readonly area: number;
  readonly alpha: Float64Array;
}

/** Absorption area of surfaces, m2: Sabine sum S alpha, or Eyring -S ln(1 - mean alpha) (solver method 4). */
export function surfaceArea(linings: readonly Lining[], model: "sabine" | "eyring"): Float64Array {
  const whole = linings.reduce((sum, { area }) => sum + area, 0);
  return new Float64Array(BAND_COUNT).map((_, band) => {
    const sabine = linings.reduce((sum, { area, alpha }) => sum + area * alpha[band], 0);
    if (model === "sabine" || whole === 0) return sabine;
    return -whole * Math.log(1 - Math.min(MOST_ALPHA, sabine / whole));
  });
}

type BySurfaces = Extract<Space["absorption"], { kind: "surfaces" }>;

function fromSurfaces(absorption: BySurfaces, volume: number, own: readonly Surface[], lot: Lot) {
  const total = surfaceArea(
    own.map(({ area, alpha }) => ({ area, alpha: filled(alpha) })),
    absorption.model,
  );
  for (const { area } of absorption.objects) filled(area).forEach((each, band) => (total[band] += each));
  if (absorption.air) {
    airArea(volume, lot.indoorTemperature, lot.indoorHumidity).forEach((each, band) => (total[band] += each));
  }
  return total;
}

/** Absorption area of a space, m2 over the nine bands; NaN where it is not known or nothing absorbs. */
export function absorptionOf(space: Space, surfaces: readonly Surface[], lot: Lot): Float64Array {
  const { absorption, volume } = space;
  if (absorption.kind === "area") return filled(absorption.area);
  if (absorption.kind === "decay") {
    return Float64Array.from(absorption.seconds, (seconds) =>
      seconds === null ? NaN : areaFromDecay(volume, seconds),
    );
  }
  const own = surfaces.filter(({ spaceId }) => spaceId === space.id);
  return fromSurfaces(absorption, volume, own, lot).map((area) => (area >= LEAST_AREA ? area : NaN));
}

/** Schroeder's frequency 2000 sqrt(T/V), Hz, at the mean decay of 500 Hz and 1 kHz; null where it is not known. */
export function statisticalFrom(volume: number, decay: ArrayLike<number>): number | null {
  const seconds = (decay[4] + decay[5]) / 2;
  return Number.isFinite(seconds) ? 2000 * Math.sqrt(seconds / volume) : null;
}

/** Direct sound at a distance in m per unit of power, 1/m2: Q/(4 pi r^2) (solver method 4). */
export function directFactor(q: number, distance: number): number {
  return q / (4 * Math.PI * distance * distance);
}
