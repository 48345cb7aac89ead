import type { Plan } from "../../lib/noise/plan";
import type { ConstructionSheet } from "../../lib/noise/sheet";
import type { Out } from "../../lib/noise/verdict";

/** Sheets the page was given: of the plan's own constructions by id, of the catalogue by key. */
export interface Library {
  own: readonly ConstructionSheet[];
  catalogue: readonly ConstructionSheet[];
}

/** The sheet of a construction of the plan; a copy made after the page was opened is known by its catalogue key. */
export function findSheet(
  plan: Plan,
  { own, catalogue }: Library,
  constructionId: string | null,
): ConstructionSheet | undefined {
  const known = own.find(({ key }) => key === constructionId);
  if (known) return known;
  const copied = plan.constructions.find(({ id }) => id === constructionId)?.catalogueKey;
  return copied == null ? undefined : catalogue.find(({ key }) => key === copied);
}

/** What a choice would stop: a door is listed as it hangs with its gap, all else as it is shut. */
export const listedLoss = ({ loss, hung }: ConstructionSheet, kind: string): ConstructionSheet["loss"] =>
  kind === "door" && hung ? hung : loss;

/** The name of a construction by its id in the plan or its key in the catalogue. */
export function nameOfConstruction(plan: Plan, { catalogue }: Library, key: string | null): string {
  const named =
    plan.constructions.find(({ id }) => id === key) ?? catalogue.find((sheet) => sheet.key === key);
  return named?.name ?? "none";
}

/** What may stand in an element's place, weakest at 63 Hz first and the unknown last, and which of them stands there now. */
export function choicesFor(
  plan: Plan,
  library: Library,
  elementId: string,
): { list: ConstructionSheet[]; current: string | null } {
  const element = plan.elements.find(({ id }) => id === elementId);
  const standing = plan.constructions.find(({ id }) => id === element?.constructionId);
  const inCatalogue = new Set(library.catalogue.map(({ key }) => key));
  const fitting = plan.constructions.filter(
    ({ id, catalogueKey, fits }) =>
      !(catalogueKey !== null && inCatalogue.has(catalogueKey)) &&
      (id === standing?.id || fits.some((kind) => kind === element?.kind)),
  );
  const own = library.own.filter(({ key }) => fitting.some(({ id }) => id === key));
  const atLow = (sheet: ConstructionSheet) => orderOf(listedLoss(sheet, element?.kind ?? "wall")[1]);
  const list = [...own, ...library.catalogue].toSorted((one, two) => atLow(one) - atLow(two));
  const current =
    standing?.catalogueKey != null && inCatalogue.has(standing.catalogueKey)
      ? standing.catalogueKey
      : (standing?.id ?? null);
  return { list, current };
}

/** What is not known stands last. */
function orderOf(loss: Out | undefined): number {
  return typeof loss === "number" ? loss : Number.MAX_VALUE;
}
