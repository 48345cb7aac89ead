import { readFileSync } from "node:fs";
import { z } from "zod";
import { constructionSchema } from "../../lib/noise/construction";
import { criterionSchema } from "../../lib/noise/plan";
import { SOURCE_BASES } from "../../lib/noise/sources/kind";
import {
  basesSchema,
  coefficientSpectrum,
  deviationSpectrum,
  levelSpectrum,
  provenanceSchema,
} from "../../lib/noise/spectrum";

const key = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/);
const words = z.string().trim().min(1).max(120);

export function read(path: string): unknown {
  return JSON.parse(readFileSync(new URL(`../../data/${path}`, import.meta.url), "utf8"));
}

function list<T extends z.ZodType>(record: T) {
  return z.strictObject({ what: z.string().min(1), records: z.array(record).min(1) });
}

export const constructionRecords = list(
  constructionSchema
    .omit({ id: true })
    .extend({
      key,
      says: words,
      suggested: z.strictObject({ gapArea: z.number().min(0).max(1) }).optional(),
    })
    .strict(),
);

export const sourceRecords = list(
  z.strictObject({
    key,
    kind: z.string(),
    name: words,
    says: words,
    power: levelSpectrum.nullable(),
    deviation: deviationSpectrum.nullable(),
    shape: levelSpectrum.optional(),
    basis: z.enum(SOURCE_BASES),
    provenance: provenanceSchema.strict(),
  }),
);

export const finishRecords = list(
  z.strictObject({
    key,
    name: words,
    alpha: coefficientSpectrum,
    bases: basesSchema,
    provenance: provenanceSchema.strict(),
  }),
);

export const criterionRecords = list(
  criterionSchema.omit({ id: true, receiverId: true }).extend({ key, says: words }).strict(),
);

export const library = {
  constructions: constructionRecords.parse(read("constructions.json")).records,
  sources: sourceRecords.parse(read("sources.json")).records,
  finishes: finishRecords.parse(read("finishes.json")).records,
  criteria: criterionRecords.parse(read("criteria.json")).records,
};
