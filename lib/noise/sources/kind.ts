import { z } from "zod";
import type { Band } from "../bands";
import { deviationSpectrum, levelSpectrum, provenanceSchema } from "../spectrum";

const metres = z.number().min(-1000).max(1000);
const id = z.string().min(1).max(64);
const clock = z.string().refine((hour) => /^([01]\d|2[0-3]):[0-5]\d$/.test(hour), "An hour is needed, such as 18:30.");

/** Where a kind of source works: in a room, outdoors, through a fan's duct, or as a given level at an element. */
export type SourcePlacement = "room" | "outdoor" | "fan" | "incident";

/** What a source's figures rest on. "typed" is a figure of the user without a measurement behind it. */
export const SOURCE_BASES = ["measured", "typed", "estimated"] as const;

export const placedSource = {
  id,
  name: z.string().trim().min(1).max(120),
  /** How the sentence calls it: "your kit". */
  says: z.string().max(120).default(""),
  spaceId: id.nullable(),
  position: z.tuple([metres, metres, metres]).nullable(),
  /** Sound power, dB re 1 pW; unknown bands stay unknown. Null for sources given as levels at elements. */
  power: levelSpectrum.nullable(),
  /** Standard deviation per band, dB; null follows the basis. */
  deviation: deviationSpectrum.nullable(),
  basis: z.enum(SOURCE_BASES),
  provenance: provenanceSchema,
  /** Local hours of a day it is at work; they are shown beside the hours of a limit. What is weighed stands in the situations. */
  hours: z.object({ from: clock, to: clock }).nullable().optional(),
};

export interface SourceKind<N extends string, S extends z.ZodRawShape> {
  name: N;
  label: string;
  placement: SourcePlacement;
  params: z.ZodObject<S>;
  schema: z.ZodObject<typeof placedSource & { kind: z.ZodLiteral<N>; params: z.ZodObject<S> }>;
  /** What of it does the work in a band, in words: "the kick drum". */
  voice: (band: Band) => string;
}

/** A kind of source from what it says of itself; its schema holds what every source has, and its own `params`. */
export function sourceKind<N extends string, S extends z.ZodRawShape>(kind: {
  name: N;
  label: string;
  placement: SourcePlacement;
  params: z.ZodObject<S>;
  voice: (band: Band) => string;
}): SourceKind<N, S> {
  const schema = z.object({ ...placedSource, kind: z.literal(kind.name), params: kind.params });
  return { ...kind, schema } as SourceKind<N, S>; // zod widens the literal of a generic name
}

/** Directivity factor Q of a source in a room: 1 in free space, 2 on a floor (solver method 4). */
export const roomParams = z.object({
  q: z.number().min(0.1).max(20).default(1).meta({ label: "Directivity factor Q", unit: "" }),
});

export const outdoorParams = z.object({
  directivity: z.number().min(-30).max(20).default(0).meta({ label: "Directivity", unit: "dB" }),
});
