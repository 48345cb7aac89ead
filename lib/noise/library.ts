import { z } from "zod";
import criteriaTable from "../../data/criteria.json";
import finishTable from "../../data/finishes.json";
import sourceTable from "../../data/sources.json";
import { criterionSchema } from "./plan";
import { SOURCE_BASES } from "./sources/kind";
import { basesSchema, coefficientSpectrum, deviationSpectrum, levelSpectrum, provenanceSchema } from "./spectrum";

/**
 * Records that are copied into a project when they are chosen: later editions of the library change no old verdict. The
 * files are checked when they are first loaded; a record that does not fit throws.
 */
const key = z.string().min(1).max(120);

const sourceRecordSchema = z.object({
  key,
  kind: z.string(),
  name: z.string(),
  /** How a sentence calls it: "your kit". */
  says: z.string(),
  /** Sound power over the nine bands, dB re 1 pW; null where only a shape is known. */
  power: levelSpectrum.nullable(),
  /** Standard deviation per band, dB. */
  deviation: deviationSpectrum.nullable(),
  /** Relative levels over the nine bands, dB, of a source whose level is found on the spot. */
  shape: levelSpectrum.optional(),
  basis: z.enum(SOURCE_BASES),
  provenance: provenanceSchema,
});
export type SourceRecord = z.infer<typeof sourceRecordSchema>;

const finishRecordSchema = z.object({
  key,
  name: z.string(),
  /** Random-incidence absorption coefficients over the nine bands. */
  alpha: coefficientSpectrum,
  bases: basesSchema,
  provenance: provenanceSchema,
});
export type FinishRecord = z.infer<typeof finishRecordSchema>;

const criterionRecordSchema = criterionSchema.omit({ id: true, receiverId: true }).extend({ key, says: z.string() });
export type CriterionRecord = z.infer<typeof criterionRecordSchema>;

/** Sound powers by source, with what they rest on. */
export const sourceRecords: readonly SourceRecord[] = z.array(sourceRecordSchema).parse(sourceTable.records);
/** Absorption of finishes. */
export const finishRecords: readonly FinishRecord[] = z.array(finishRecordSchema).parse(finishTable.records);
/** Limits; local law decides what applies. */
export const criterionRecords: readonly CriterionRecord[] = z.array(criterionRecordSchema).parse(criteriaTable.records);
