import "server-only";
import { catalogueSheets } from "@/lib/noise/catalogueSheets";
import type { Plan } from "@/lib/noise/plan";
import { sheetOf, type ConstructionSheet } from "@/lib/noise/sheet";

/** Sheets of every construction that stands in a plan. */
export function sheetsOf({ constructions }: Plan): ConstructionSheet[] {
  return constructions.map((construction) => sheetOf(construction));
}

/** What the page of one element may have to name or draw: what stands there, and what would fit. */
export function libraryFor({ constructions }: Plan, element: Plan["elements"][number]) {
  const own = constructions.filter(({ id, fits }) => id === element.constructionId || fits.some((fitting) => fitting === element.kind));
  return { own: own.map((construction) => sheetOf(construction)), catalogue: catalogueSheets(element) };
}
