import { z } from "zod";
import table from "../../data/weightings.json";
import { BAND_COUNT } from "./bands";
import { energyOf, levelOf } from "./levels";
import { bandsSchema, provenanceSchema } from "./spectrum";

const weightingSchema = z.strictObject({
  key: z.enum(["A", "C"]),
  label: z.string(),
  unit: z.literal("dB"),
  bands: bandsSchema,
  values: z.array(z.number()).length(BAND_COUNT),
  provenance: provenanceSchema,
});
const records = z.array(weightingSchema).parse(table.records);

export type Weighting = "A" | "C";

function valuesOf(key: Weighting): Float64Array {
  const record = records.find((each) => each.key === key);
  if (!record) throw new Error(`no weighting is called ${key}`);
  return Float64Array.from(record.values);
}

/** Frequency weightings at the octave midbands, dB (IEC 61672-1 Table 3). */
export const WEIGHTS: Readonly<Record<Weighting, Float64Array>> = { A: valuesOf("A"), C: valuesOf("C") };

/** The same as factors on energy. */
export const WEIGHT_FACTORS: Readonly<Record<Weighting, Float64Array>> = {
  A: WEIGHTS.A.map(energyOf),
  C: WEIGHTS.C.map(energyOf),
};

/** Weighted total of nine octave levels, dB. Silence adds nothing; an unknown band makes the total unknown. */
export function weightedLevel(levels: ArrayLike<number>, weighting: Weighting): number {
  const factors = WEIGHT_FACTORS[weighting];
  let energy = 0;
  for (let band = 0; band < BAND_COUNT; band += 1) energy += factors[band] * energyOf(levels[band]);
  return levelOf(energy);
}

/** A-weighted total of nine octave levels, dB (IEC 61672-1). */
export const aWeighted = (levels: ArrayLike<number>): number => weightedLevel(levels, "A");
/** C-weighted total of nine octave levels, dB (IEC 61672-1). */
export const cWeighted = (levels: ArrayLike<number>): number => weightedLevel(levels, "C");
