import { z } from "zod";
import { ceilingKind } from "./ceiling";
import { doorKind } from "./door";
import { ductKind } from "./duct";
import { flankingKind } from "./flanking";
import { floorKind } from "./floor";
import { leakKind } from "./leak";
import { roofKind } from "./roof";
import { wallKind } from "./wall";
import { windowKind } from "./window";

/** Every kind of element, listed once: the type, the schema, the form and the solver follow from it. */
export const elementKinds = {
  wall: wallKind,
  roof: roofKind,
  floor: floorKind,
  ceiling: ceilingKind,
  door: doorKind,
  window: windowKind,
  leak: leakKind,
  duct: ductKind,
  flanking: flankingKind,
} as const;

const anyElement = z.discriminatedUnion("kind", [
  wallKind.schema,
  roofKind.schema,
  floorKind.schema,
  ceilingKind.schema,
  doorKind.schema,
  windowKind.schema,
  leakKind.schema,
  ductKind.schema,
  flankingKind.schema,
]);

/** Open part of an element where its kind has one, m2, and the name of that field. */
function openingOf({ kind, params }: z.infer<typeof anyElement>): { field: string; area: number } | null {
  if (kind === "door") return { field: "gapArea", area: params.gapArea };
  return kind === "window" ? { field: "openArea", area: params.openArea } : null;
}

/** Any element of a plan. An opening is never larger than what it is in. */
export const elementSchema = anyElement.superRefine((element, context) => {
  const opening = openingOf(element);
  // An area that is none is refused by its own schema.
  if (!opening || opening.area <= element.area || element.area <= 0) return;
  context.addIssue({ code: "custom", path: ["params", opening.field], message: "It cannot be larger than the whole." });
});
export type PathElement = z.infer<typeof elementSchema>;
export type ElementKindName = keyof typeof elementKinds;
