import { catalogue, type CatalogueConstruction } from "./catalogue";
import { effectiveLoss } from "./effective";
import type { PathElement } from "./elements";
import { sheetOf, toOutLoss, type ConstructionSheet } from "./sheet";
import { gapCombined } from "./transmission";

let sheets: Map<CatalogueConstruction, ConstructionSheet> | undefined;

/** The sheet of every record, each judged once. */
function allSheets(): Map<CatalogueConstruction, ConstructionSheet> {
  sheets ??= new Map(
    catalogue.map((record) => [record, sheetOf({ ...record, id: record.key }, { says: record.says })]),
  );
  return sheets;
}

/**
 * The constructions of the catalogue that fit an element, as sheets; `hung` is their loss in its place, dB over the nine
 * bands, with the gap that they bring or that stands there, or with the open part of a window (solver method 3).
 */
export function catalogueSheets(element: PathElement): ConstructionSheet[] {
  const fitting = [...allSheets()].filter(([{ fits }]) => fits.some((kind) => kind === element.kind));
  return fitting.map(([record, sheet]) => ({ ...sheet, hung: hungIn(element, record) }));
}

function hungIn(element: PathElement, record: CatalogueConstruction) {
  const alone = effectiveLoss({ ...record, id: record.key }).loss;
  return toOutLoss(gapCombined([...alone], element.area, openAreaOf(element, record)));
}

/** Area with R = 0 once that record is chosen for the element, m². */
function openAreaOf(element: PathElement, { suggested }: CatalogueConstruction): number {
  if (element.kind === "door") return suggested?.gapArea ?? element.params.gapArea;
  return element.kind === "window" ? element.params.openArea : 0;
}
