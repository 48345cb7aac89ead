import { z } from "zod";
import records from "../../data/constructions.json";
import { constructionSchema } from "./construction";

const catalogueSchema = constructionSchema.omit({ id: true }).extend({
  key: z.string().min(1).max(120),
  /** One line for the builder. */
  says: z.string().default(""),
  /** Fields of the element it is chosen for: the gap its seals leave, m². */
  suggested: z.object({ gapArea: z.number().min(0).max(1) }).partial().optional(),
});

/** A construction of the catalogue: lengths in m, spectra in dB over the nine bands, with the document it was read in. */
export type CatalogueConstruction = z.infer<typeof catalogueSchema>;

/** The catalogue of constructions, checked when it is first loaded. A record that does not fit throws. */
export const catalogue: readonly CatalogueConstruction[] = z.array(catalogueSchema).parse(records.records);

/** The construction of that key, or undefined where the catalogue has none. */
export function findConstruction(key: string): CatalogueConstruction | undefined {
  return catalogue.find((record) => record.key === key);
}
