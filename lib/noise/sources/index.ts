import { z } from "zod";
import { amplifierKind } from "./amplifier";
import { condenserKind } from "./condenser";
import { drumKitKind } from "./drumKit";
import { fanKind } from "./fan";
import { instrumentKind } from "./instrument";
import { trafficKind } from "./traffic";

/** Every kind of source, listed once. */
export const sourceKinds = {
  "drum kit": drumKitKind,
  amplifier: amplifierKind,
  instrument: instrumentKind,
  condenser: condenserKind,
  fan: fanKind,
  traffic: trafficKind,
} as const;

export const sourceSchema = z.discriminatedUnion("kind", [
  drumKitKind.schema,
  amplifierKind.schema,
  instrumentKind.schema,
  condenserKind.schema,
  fanKind.schema,
  trafficKind.schema,
]);
export type Source = z.infer<typeof sourceSchema>;
export type SourceKindName = keyof typeof sourceKinds;
