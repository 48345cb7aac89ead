import { catalogue, type CatalogueConstruction } from "./catalogue";
import { effectiveLoss } from "./effective";
import type { PathElement } from "./elements";
import { levelOf } from "./levels";
import { passingOfKind } from "./model/passing";
import { sheetOf, type ConstructionSheet } from "./sheet";
import { toOutSpectrum } from "./verdict";

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
  const { loss } = effectiveLoss({ ...record, id: record.key });
  return toOutSpectrum(
    passingOfKind(withGapOf(record, element), loss).map((each) => -levelOf(each / element.area)),
  );
}

/** The element with the gap that a record brings along, where it brings one. */
function withGapOf({ suggested }: CatalogueConstruction, element: PathElement): PathElement {
  const gapArea = suggested?.gapArea;
  return element.kind === "door" && gapArea !== undefined ? { ...element, params: { gapArea } } : element;
}
