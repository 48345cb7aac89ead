import { BAND_COUNT } from "@/lib/noise/bands";
import type { CurveEdition } from "@/lib/noise/criteria";
import type { CriterionRecord } from "@/lib/noise/library";
import type { Criterion } from "@/lib/noise/plan";
import { formatQuantity } from "../format";
import { plainName } from "./limitWords";

export interface LimitLibrary {
  records: readonly CriterionRecord[];
  editions: readonly CurveEdition[];
  /** What one figure makes of the bass, dB at 63 Hz. */
  at63: { dBA: number; dBC: number };
}

export type LimitPatch = Partial<Omit<Criterion, "id" | "receiverId">>;
export type Levels = NonNullable<Criterion["levels"]>;

const OWN = "Own figures";
const noLevels = (): Levels => new Array<null>(BAND_COUNT).fill(null);

/** Whether a document was written down by a choice made here, and not typed by a reader. */
function isChosen(document: string, { records, editions }: LimitLibrary): boolean {
  return document === OWN || [...records, ...editions].some(({ provenance }) => provenance.document === document);
}

/** New figures never bear the words of old ones: a name and a document that came with a choice go with it. */
function described(standing: Criterion, figures: LimitPatch, library: LimitLibrary, read: Partial<Criterion["provenance"]>): LimitPatch {
  const after = { ...standing, ...figures };
  const named = standing.name !== plainName(standing) && !library.records.some(({ name }) => name === standing.name);
  const provenance = { document: OWN, clause: "", memory: false, ...read };
  const typed = !isChosen(standing.provenance.document, library);
  const same = standing.provenance.document === provenance.document && !provenance.clause;
  return { ...figures, ...(!named && { name: plainName(after) }), provenance: typed || same ? standing.provenance : provenance };
}

export function typeLevels(standing: Criterion, levels: Levels, library: LimitLibrary): LimitPatch {
  return described(standing, { metric: "curve", value: null, edition: "", levels, above: null }, library, {});
}

/** The number of a curve; the server writes down the levels that the edition gives it. */
export function typeNumber(standing: Criterion, value: number, edition: CurveEdition, library: LimitLibrary): LimitPatch {
  const figures = { metric: edition.metric, value, edition: edition.key, levels: null, above: null };
  const { document } = edition.provenance;
  return described(standing, figures, library, { document, clause: `curve ${plainName({ ...figures })}; the number is yours` });
}

export function typeFigure(standing: Criterion, metric: "dBA" | "dBC", value: number, library: LimitLibrary): LimitPatch {
  return described(standing, { metric, value, edition: "", levels: null, above: null }, library, {});
}

/** The night's level in each band plus a figure; an unknown band stays unknown. */
export const levelsAbove = (night: Levels, above: number): Levels =>
  night.map((level) => (typeof level === "number" ? Number((level + above).toFixed(6)) : null));

export function typeAbove(standing: Criterion, night: Levels, above: number, library: LimitLibrary): LimitPatch {
  const figures: LimitPatch = { metric: "curve", value: null, edition: "", background: night, above, levels: levelsAbove(night, above) };
  return described(standing, figures, library, { clause: `the night itself plus ${formatQuantity(above)} dB in every band` });
}

/** The night alone. A limit that rests on it moves with it. */
export function typeNight(standing: Criterion, night: Levels, library: LimitLibrary): LimitPatch {
  if (standing.above !== null) return typeAbove(standing, night, standing.above, library);
  return { background: night.every((level) => level === null) ? null : night };
}

/** Another record in the place of a limit: what was settled about hours, window and night stays; words of the old clause go. */
export function replaceBy(libraryKey: string, { hours, window, indoors, background, backgroundSays }: Criterion) {
  return { libraryKey, hours, window, indoors, background, backgroundSays, clauseText: "", inForce: null, readOn: null, above: null };
}

/** A limit of its own for a listener, to be filled with figures. */
export const levelsOf = ({ levels }: Pick<Criterion, "levels">): Levels => levels ?? noLevels();
export const nightOf = ({ background }: Pick<Criterion, "background">): Levels => background ?? noLevels();

/** The same limit again, as after an undo. */
export function valuesOf(limit: Criterion): Record<string, unknown> {
  const { id: _, ...values } = limit;
  return values;
}
