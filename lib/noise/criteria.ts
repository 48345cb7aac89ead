import { z } from "zod";
import table from "../../data/curves.json";
import { BAND_COUNT, OCTAVE_BANDS, type Band } from "./bands";
import type { Criterion } from "./plan";
import { bandsSchema, provenanceSchema, toArithmetic } from "./spectrum";

const shared = {
  key: z.string(),
  label: z.string(),
  unit: z.string(),
  bands: bandsSchema,
  provenance: provenanceSchema,
};
const level = z.number().nullable();
const familySchema = z.strictObject({
  ...shared,
  metric: z.literal("NC"),
  curves: z.array(z.strictObject({ rating: z.number(), levels: z.array(level).length(BAND_COUNT) })).min(2),
});
const coefficients = z.array(z.number()).length(BAND_COUNT);
const lineSchema = z.strictObject({ ...shared, metric: z.literal("NR"), a: coefficients, b: coefficients });

const families = z.array(familySchema).min(1).parse(table.nc);
const nr = lineSchema.parse(table.nr);

/** Editions of the NC curves that are held, the default first. */
export const NC_EDITIONS: readonly string[] = families.map(({ key }) => key);

/** Every family of curves that a limit may be read in, with the document it was read from. */
export const CURVE_EDITIONS = [...families, nr].map(({ metric, key, label, provenance }) => ({ metric, key, label, provenance }));
export type CurveEdition = (typeof CURVE_EDITIONS)[number];

/** A single-number rating and the band that decides it; of two bands with the same rating the lower one is named. */
export interface Rating {
  /** NaN where a band is unknown, -Infinity for silence, +Infinity above the family. */
  value: number;
  band: Band | null;
}

type Family = { ratings: number[]; levels: Float64Array[] };
const SAME = 1e-9;

function familyOf(edition: string): Family {
  const { curves } = families.find(({ key }) => key === edition) ?? families[0];
  return {
    ratings: curves.map(({ rating }) => rating),
    levels: curves.map(({ levels }) => toArithmetic(levels)),
  };
}
const kept = new Map<string, Family>();
function keptFamily(edition: string): Family {
  const family = kept.get(edition) ?? familyOf(edition);
  if (NC_EDITIONS.includes(edition)) kept.set(edition, family);
  return family;
}

/** NC of one band: linear between tabulated curves, parallel shift below the lowest and, to rank the bands, above the highest. */
function ncOfBand({ ratings, levels }: Family, sound: number, band: number): number {
  const last = levels.length - 1;
  if (Number.isNaN(levels[0][band])) return -Infinity;
  if (sound < levels[0][band]) return ratings[0] - (levels[0][band] - sound);
  if (sound > levels[last][band]) return ratings[last] + sound - levels[last][band];
  const upper = Math.max(
    1,
    levels.findIndex((curve) => sound <= curve[band]),
  );
  const [low, high] = [levels[upper - 1][band], levels[upper][band]];
  return ratings[upper - 1] + ((ratings[upper] - ratings[upper - 1]) * (sound - low)) / (high - low);
}

/**
 * Noise criterion by tangency (ANSI/ASA S12.2 5.2.3) of nine octave levels, dB. Bands that the edition does not hold
 * (31.5 Hz of the classic family) do not count. Below the lowest curve the value is the parallel shift; above the
 * highest no number is defined, and the band is the one that exceeds the highest curve most.
 */
export function ncOf(levels: ArrayLike<number>, edition = NC_EDITIONS[0]): Rating {
  const family = keptFamily(edition);
  const { value, band } = highest(levels, (sound, i) => ncOfBand(family, sound, i));
  return { value: value > family.ratings[family.ratings.length - 1] + SAME ? Infinity : value, band };
}

/** Noise rating (ISO/R 1996:1971) of nine octave levels, dB: the highest of (L - a)/b. */
export function nrOf(levels: ArrayLike<number>): Rating {
  return highest(levels, (sound, band) => (sound - nr.a[band]) / nr.b[band]);
}

function highest(levels: ArrayLike<number>, rate: (sound: number, band: number) => number): Rating {
  const best: Rating = { value: -Infinity, band: null };
  for (let i = 0; i < BAND_COUNT; i += 1) {
    if (Number.isNaN(levels[i])) return { value: NaN, band: null };
    const value = rate(levels[i], i);
    if (value > best.value + SAME || (best.band === null && value > -Infinity))
      Object.assign(best, { value, band: OCTAVE_BANDS[i] });
  }
  return best;
}

/** Levels of the NC curve of any rating: between two curves linear, outside them shifted in parallel. dB. */
export function ncLevels(rating: number, edition = NC_EDITIONS[0]): Float64Array {
  const { ratings, levels } = keptFamily(edition);
  const last = ratings.length - 1;
  if (rating <= ratings[0]) return levels[0].map((of) => of - (ratings[0] - rating));
  if (rating >= ratings[last]) return levels[last].map((of) => of + (rating - ratings[last]));
  const upper = ratings.findIndex((each) => rating <= each);
  const share = (rating - ratings[upper - 1]) / (ratings[upper] - ratings[upper - 1]);
  return levels[upper].map(
    (high, band) => levels[upper - 1][band] + share * (high - levels[upper - 1][band]),
  );
}

/** Levels of the NR curve of that number, dB. */
export function nrLevels(rating: number): Float64Array {
  return Float64Array.from(nr.a, (a, band) => a + nr.b[band] * rating);
}

/** The lowest level a limit can mean: a limit of "silent" stands for the least level of the schema. */
const QUIETEST = -100;

/** Limit per band, dB; NaN where the criterion says nothing. All NaN for limits on a weighted total. */
export function limitLevels(criterion: Pick<Criterion, "metric" | "value" | "levels" | "edition">): Float64Array {
  const { metric, value, levels, edition } = criterion;
  if (metric === "dBA" || metric === "dBC") return new Float64Array(BAND_COUNT).fill(NaN);
  if (levels) return toArithmetic(levels).map((limit) => Math.max(QUIETEST, limit));
  if (value === null || metric === "curve") return new Float64Array(BAND_COUNT).fill(NaN);
  return metric === "NC" ? ncLevels(value, edition) : nrLevels(value);
}
