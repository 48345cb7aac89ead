import { z } from "zod";
import { BAND_COUNT } from "../bands";
import { pieceSchema } from "../ducts/run";
import { NC_EDITIONS } from "../criteria";
import {
  areaSpectrum,
  coefficientSpectrum,
  decaySpectrum,
  levelSpectrum,
  lossSpectrum,
  objectAreaSpectrum,
} from "../spectrum";
import { descriptionSchema } from "../transmission";
import { spectrumLength } from "./bandLength";

/** Hands the faults of an inner reading on, with the place moved as `move` says. */
function handOn(
  context: z.RefinementCtx,
  issues: readonly z.core.$ZodIssue[],
  move = (path: PropertyKey[]) => path,
): never {
  for (const { message, path } of issues)
    context.addIssue({ code: "custom", message, path: move([...path]) });
  return z.NEVER;
}

/** In a document of eight bands nothing sounds at 31.5 Hz, and what else is given there is not known. */
function padded<T extends z.ZodType>(schema: T, first: "silent" | null) {
  return z.unknown().transform((value, context): z.output<T> => {
    const short = Array.isArray(value) && value.length === BAND_COUNT - 1;
    if (Array.isArray(value) && !short && value.length !== BAND_COUNT) {
      return handOn(context, [
        { code: "custom", message: spectrumLength(value.length), path: [], input: value },
      ]);
    }
    const reading = schema.safeParse(short ? [first, ...value] : value);
    if (reading.success) return reading.data;
    const move = ([band, ...rest]: PropertyKey[]) =>
      typeof band === "number" && short ? [band - 1, ...rest] : band === undefined ? [] : [band, ...rest];
    return handOn(context, reading.error.issues, move);
  });
}
const levels = padded(levelSpectrum, "silent");
const limits = padded(levelSpectrum, null);
const loss = padded(lossSpectrum, null);
const area = padded(areaSpectrum, null);
const objectArea = padded(objectAreaSpectrum, null);

const id = z.string().min(1).max(64);
const place = z.tuple([
  z.number().min(-1000).max(1000),
  z.number().min(-1000).max(1000),
  z.number().min(-20).max(100),
]);
const point = z.tuple([z.number().min(-1000).max(1000), z.number().min(-1000).max(1000)]);
const share01 = z.number().min(0).max(1);

/** Runs the schema chosen by the shape of a value, so that a fault keeps its path. */
function choose<T extends z.ZodType>(pick: (has: (key: string) => boolean, value: unknown) => T) {
  return z.unknown().transform((value, context): z.output<T> => {
    const reading = pick(
      (key) => typeof value === "object" && value !== null && key in value,
      value,
    ).safeParse(value);
    return reading.success ? reading.data : handOn(context, reading.error.issues);
  });
}

const options = z.strictObject({
  ground: z.tuple([share01, share01, share01]).default([0.5, 0.5, 0.5]),
  temperature: z.number().min(-30).max(50).default(10),
  humidity: z.number().min(1).max(100).default(70),
  indoor_temperature: z.number().min(-10).max(50).default(20),
  indoor_humidity: z.number().min(1).max(100).default(50),
});

const byArea = z.strictObject({ area, air: z.boolean().default(false) });
const byDecay = z.strictObject({ rt: padded(decaySpectrum, null), air: z.boolean().default(false) });
const bySurfaces = z.strictObject({
  surfaces: z
    .array(
      z.strictObject({
        name: z.string().max(120).optional(),
        area: z.number().min(0.01).max(10_000),
        alpha: padded(coefficientSpectrum, null),
      }),
    )
    .default([]),
  objects: z
    .array(z.strictObject({ name: z.string().max(120).default("object"), area: objectArea }))
    .max(40)
    .default([]),
  model: z.enum(["sabine", "eyring"]).default("sabine"),
  air: z.boolean().default(false),
});
const absorption = choose<typeof byArea | typeof byDecay | typeof bySurfaces>((has) =>
  has("area") ? byArea : has("rt") ? byDecay : bySurfaces,
);

const room = z.strictObject({
  id,
  building: z.string().min(1).max(64),
  volume: z.number().min(0.5).max(100_000),
  absorption,
  air: z.boolean().default(false),
});

const lossGiven = z.strictObject({ tl: loss });
const construction = choose<typeof lossGiven | typeof descriptionSchema>((has) =>
  has("tl") ? lossGiven : descriptionSchema,
);
const constructionName = z.string().max(120);
const constructionOrName = choose<typeof constructionName | typeof construction>((_, value) =>
  typeof value === "string" ? constructionName : construction,
);
export type CaseConstruction = z.output<typeof construction>;

const run = z
  .array(
    z.preprocess((piece) => {
      const il = typeof piece === "object" && piece !== null && "il" in piece ? piece.il : null;
      return Array.isArray(il) && il.length === BAND_COUNT - 1
        ? { ...(piece as object), il: [null, ...il] }
        : piece;
    }, pieceSchema),
  )
  .max(24);

const element = z
  .strictObject({
    id,
    kind: z.enum(["wall", "roof", "floor", "ceiling", "door", "window", "leak", "duct", "flanking"]),
    from: id,
    to: z.string().min(1).max(64),
    area: z.number().min(0.0001).max(10_000).optional(),
    tl: loss.optional(),
    construction: constructionOrName.optional(),
    limit: z.number().min(0).max(120).optional(),
    position: place.optional(),
    normal: z
      .tuple([z.number().min(-1).max(1), z.number().min(-1).max(1), z.number().min(-1).max(1)])
      .optional(),
    size: z.tuple([z.number().min(0.001).max(1000), z.number().min(0.001).max(1000)]).optional(),
    directivity: z.number().min(-30).max(20).optional(),
    diffuseness: z.number().min(-20).max(0).optional(),
    opening: z.number().min(0.0001).max(10).optional(),
    run: run.optional(),
  })
  .superRefine((given, context) => {
    const refuse = (key: string, message: string) =>
      context.addIssue({ code: "custom", path: [key], message });
    if (given.kind === "duct") {
      if (given.opening === undefined) refuse("opening", "a duct needs its opening, m²");
      if (!given.run) refuse("run", "a duct needs its run");
      return;
    }
    if (given.area === undefined) refuse("area", "an element needs its area, m²");
    if (given.kind !== "leak" && (given.tl === undefined) === (given.construction === undefined)) {
      refuse("tl", "an element needs either a transmission loss or a construction");
    }
    if (given.kind === "leak" && given.tl?.some((each) => each !== null && each !== 0))
      refuse("tl", "a leak is open: its transmission loss is 0");
  });

const shared = { id, share: share01.optional() };
const outlet = z.strictObject({
  id,
  room: id.optional(),
  position: place.optional(),
  directivity: z.number().min(-30).max(20).default(0),
  run: run.default([]),
});
const source = z.discriminatedUnion("kind", [
  z.strictObject({
    ...shared,
    kind: z.literal("room"),
    room: id,
    lw: levels,
    q: z.number().min(0.1).max(20).default(1),
  }),
  z.strictObject({
    ...shared,
    kind: z.literal("outdoor"),
    position: place,
    lw: levels,
    directivity: z.number().min(-30).max(20).default(0),
  }),
  z.strictObject({
    ...shared,
    kind: z.literal("fan"),
    lw: levels,
    outlets: z.array(outlet).min(1).max(60),
    run: run.default([]),
  }),
  z.strictObject({ ...shared, kind: z.literal("incident"), at: z.record(z.string(), levels) }),
]);

const averaging = z.enum(["loudest", "whole"]).default("loudest");
const value = z.number().min(-20).max(160);
const criterion = z.discriminatedUnion("kind", [
  z.strictObject({
    kind: z.literal("NC"),
    value,
    averaging,
    edition: z.enum(NC_EDITIONS as [string, ...string[]]).optional(),
  }),
  z.strictObject({ kind: z.enum(["NR", "dBA", "dBC"]), value, averaging }),
  z.strictObject({ kind: z.literal("curve"), levels: limits, averaging }),
]);

const receiver = z.strictObject({
  id,
  kind: z.enum(["room", "outdoor"]),
  room: id.optional(),
  position: place.optional(),
  distances: z.record(z.string(), z.number().min(0.05).max(1000)).default({}),
  facade: z.boolean().default(false),
  side: z.enum(["studio", "far"]).default("studio"),
  criterion: criterion.optional(),
});

const fence = z.strictObject({
  id: id.optional(),
  p1: point,
  p2: point,
  height: z.number().min(0.1).max(30),
  thickness: z.number().min(0).max(20).default(0),
});

/** A budget: a document with receivers, of eight or nine bands. */
export const budgetSchema = z.strictObject({
  title: z.string().max(400).default(""),
  options: options.default(options.parse({})),
  rooms: z.array(room).default([]),
  constructions: z.record(z.string(), construction).default({}),
  elements: z.array(element).default([]),
  sources: z.array(source).default([]),
  fences: z.array(fence).default([]),
  receivers: z.array(receiver).min(1),
});
export type Budget = z.output<typeof budgetSchema>;

export const constructionsSchema = z.object({
  constructions: z.record(z.string(), z.strictObject({ construction: descriptionSchema })),
});

export const spectraSchema = z.object({ spectra: z.record(z.string(), z.strictObject({ levels })) });
