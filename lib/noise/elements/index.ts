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

export const elementSchema = z.discriminatedUnion("kind", [
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
export type PathElement = z.infer<typeof elementSchema>;
export type ElementKindName = keyof typeof elementKinds;
