import { formatQuantity, withUnit } from "../format";
import { toSquareCentimetres } from "./units";

/** What this page changes of an element, one thing at a time. */
export type ElementPatch =
  | { construction: { catalogueKey: string } }
  | { constructionId: string }
  | { area: number }
  | { params: { gapArea: number } }
  | { params: { openArea: number } };

export const inSquareMetres = (area: number) => withUnit(formatQuantity(area), "m²");
export const inSquareCentimetres = (area: number) =>
  withUnit(formatQuantity(toSquareCentimetres(area)), "cm²");

/** Which field a patch belongs to, so that a refusal stands beside it. */
export type FieldName = "construction" | "area" | "opening";

export function fieldOf(patch: ElementPatch): FieldName {
  if ("area" in patch) return "area";
  return "params" in patch ? "opening" : "construction";
}
