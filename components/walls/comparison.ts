import type { Plan } from "../../lib/noise/plan";
import type { FieldWords } from "../plan/SaveNotices";
import { planWords } from "../yard/planWords";
import { nameOfConstruction, type Library } from "./choices";
import { inSquareCentimetres, inSquareMetres } from "./patches";

type Openings = { gapArea?: number; openArea?: number };

/** Fields of an element in words, for the panel that sets two people's values side by side. */
export function elementComparison(current: Plan, library: Library, elementId: string): FieldWords {
  const standing = current.elements.find(({ id }) => id === elementId);
  const named = (key: string | null) => ({ label: "Construction", value: nameOfConstruction(current, library, key) });
  return (part, field, value) => {
    if (field === "constructionId") return named(value as string | null);
    // What stands in the plan has no such field: it points at a copy.
    if (field === "construction") return named((value as { catalogueKey: string } | undefined)?.catalogueKey ?? standing?.constructionId ?? null);
    if (field === "area") return { label: "Area", value: inSquareMetres(value as number) };
    const { gapArea, openArea } = field === "params" ? (value as Openings) : {};
    if (gapArea !== undefined) return { label: "Gap at the seals", value: inSquareCentimetres(gapArea) };
    if (openArea !== undefined) return { label: "Open part", value: inSquareMetres(openArea) };
    return planWords(part, field, value);
  };
}
