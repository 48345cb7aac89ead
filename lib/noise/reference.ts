import { z } from "zod";
import criterionRecords from "../../data/criteria.json";
import finishRecords from "../../data/finishes.json";
import sourceRecords from "../../data/sources.json";
import { criterionSchema } from "./plan";
import { sourceKinds, type SourceKindName } from "./sources";
import {
  basesSchema,
  coefficientSpectrum,
  deviationSpectrum,
  levelSpectrum,
  provenanceSchema,
} from "./spectrum";

export { catalogue, findConstruction, type CatalogueConstruction } from "./catalogue";

const key = z.string().min(1).max(120);
const name = z.string().min(1).max(120);

const sourceRecordSchema = z.object({
  key,
  name,
  kind: z.enum(Object.keys(sourceKinds) as [SourceKindName, ...SourceKindName[]]),
  says: z.string().max(120),
  /** Sound power, dB re 1 pW; null for sources given as a shape. */
  power: levelSpectrum.nullable(),
  deviation: deviationSpectrum.nullable(),
  /** dB re the A-weighted level, of sources given as levels at elements. */
  shape: levelSpectrum.optional(),
  basis: z.literal("estimated"),
  provenance: provenanceSchema,
});
const finishRecordSchema = z.object({
  key,
  name,
  alpha: coefficientSpectrum,
  bases: basesSchema,
  provenance: provenanceSchema,
});
const criterionRecordSchema = criterionSchema
  .omit({ id: true, receiverId: true })
  .extend({ key, says: z.string() });

/** Sources whose figures were read or estimated somewhere. A record that does not fit throws when first loaded. */
export const sourceLibrary = z.array(sourceRecordSchema).parse(sourceRecords.records);
/** Finishes with their absorption coefficients. */
export const finishLibrary = z.array(finishRecordSchema).parse(finishRecords.records);
/** Limits to choose from; choosing one copies it into the project. */
export const criterionLibrary = z.array(criterionRecordSchema).parse(criterionRecords.records);
