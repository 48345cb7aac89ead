import type { Plan } from "../../lib/noise/plan";
import { formatQuantity, withUnit } from "../format";
import { toSquareCentimetres } from "./units";

type PathElement = Plan["elements"][number];

/** What this page changes of an element, one thing at a time. */
export type ElementPatch =
  | { construction: { catalogueKey: string } }
  | { constructionId: string }
  | { area: number }
  | { params: { gapArea: number } }
  | { params: { openArea: number } };

/** Names the page knows constructions by: of the plan by id, of the catalogue by key. */
export type NameOfConstruction = (key: string | null) => string;

/** A patch in words, beside what stands in the plan for the same thing: for the panel that sets both side by side. */
export function comparePatch(patch: ElementPatch, standing: PathElement, nameOf: NameOfConstruction) {
  if ("construction" in patch) {
    return {
      label: "Construction",
      mine: nameOf(patch.construction.catalogueKey),
      theirs: nameOf(standing.constructionId),
    };
  }
  if ("constructionId" in patch) {
    return {
      label: "Construction",
      mine: nameOf(patch.constructionId),
      theirs: nameOf(standing.constructionId),
    };
  }
  if ("area" in patch)
    return { label: "Area", mine: inSquareMetres(patch.area), theirs: inSquareMetres(standing.area) };
  if ("gapArea" in patch.params) {
    const theirs = standing.kind === "door" ? standing.params.gapArea : 0;
    return {
      label: "Gap at the seals",
      mine: inSquareCentimetres(patch.params.gapArea),
      theirs: inSquareCentimetres(theirs),
    };
  }
  const theirs = standing.kind === "window" ? standing.params.openArea : 0;
  return { label: "Open part", mine: inSquareMetres(patch.params.openArea), theirs: inSquareMetres(theirs) };
}

export const inSquareMetres = (area: number) => withUnit(formatQuantity(area), "m²");
export const inSquareCentimetres = (area: number) =>
  withUnit(formatQuantity(toSquareCentimetres(area)), "cm²");

/** Which field a patch belongs to, so that a refusal stands beside it. */
export type FieldName = "construction" | "area" | "opening";

export function fieldOf(patch: ElementPatch): FieldName {
  if ("area" in patch) return "area";
  return "params" in patch ? "opening" : "construction";
}
