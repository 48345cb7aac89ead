import { z } from "zod";
import { constructionSchema } from "./construction";
import { elementSchema } from "./elements";
import { sourceSchema } from "./sources";
import { areaSpectrum, basesSchema, coefficientSpectrum, decaySpectrum, levelSpectrum, objectAreaSpectrum, provenanceSchema } from "./spectrum";
import { runSchema } from "./ducts/run";

/**
 * A plan: everything `solve` needs and nothing else, as plain data. SI units, dB, metres; x and y on the lot, z above
 * local ground. Parts point at each other by id. The database keeps the same parts as rows.
 */
const id = z.string().min(1).max(64);
const name = z.string().trim().min(1).max(120);
const metres = (low: number, high: number) => z.number().min(low).max(high);
const coordinate = metres(-1000, 1000);
const point = z.tuple([coordinate, coordinate]);
const place = z.tuple([coordinate, coordinate, metres(-20, 100)]);
const outline = z.array(point).min(3).max(40);

export const lotSchema = z.object({
  id,
  street: z.string().max(120).default(""),
  outline: outline.nullable(),
  /** Ground factors G of the source, middle and receiver regions, ISO 9613-2 7.3.1: 0 hard, 1 porous. */
  ground: z.tuple([z.number().min(0).max(1), z.number().min(0).max(1), z.number().min(0).max(1)]),
  temperature: z.number().min(-30).max(50),
  humidity: z.number().min(1).max(100),
  indoorTemperature: z.number().min(-10).max(50),
  indoorHumidity: z.number().min(1).max(100),
  /** Trees are drawn; a garden tree earns no attenuation (ISO 9613-2 A.1 gives none below 10 m of dense foliage). */
  trees: z.array(z.object({ at: point, height: metres(0.5, 60), crown: metres(0.2, 30) })).max(40).default([]),
});

export const buildingSchema = z.object({
  id,
  name,
  role: z.enum(["studio", "neighbour", "own house", "other"]),
  footprint: outline.nullable(),
  /** Heights of the floors over ground, m. */
  floors: z.array(metres(-10, 60)).max(10),
  eaves: metres(0, 60).nullable(),
  ridge: metres(0, 60).nullable(),
  /** Direction of the ridge on the lot; null is a flat roof. */
  ridgeAxis: z.enum(["x", "y"]).nullable(),
});

export const absorptionSchema = z.discriminatedUnion("kind", [
  z.object({ kind: z.literal("area"), area: areaSpectrum }),
  z.object({ kind: z.literal("decay"), seconds: decaySpectrum }),
  z.object({
    kind: z.literal("surfaces"),
    model: z.enum(["sabine", "eyring"]),
    air: z.boolean(),
    objects: z.array(z.object({ name: z.string().max(120), area: objectAreaSpectrum })).max(40),
  }),
]);

export const spaceSchema = z.object({
  id,
  buildingId: id,
  name,
  volume: z.number().min(0.5).max(100_000),
  /** Extent for the drawings, m: [x, y, z of the floor], [width, depth, height]. */
  box: z.object({ at: place, size: z.tuple([metres(0.1, 1000), metres(0.1, 1000), metres(0.1, 100)]) }).nullable(),
  absorption: absorptionSchema,
});

export const surfaceSchema = z.object({
  id,
  spaceId: id,
  name,
  area: z.number().min(0.01).max(10_000),
  finishKey: z.string().max(120).nullable(),
  alpha: coefficientSpectrum,
  bases: basesSchema,
  provenance: provenanceSchema,
});

/** One boundary between two spaces; `toSpaceId` null is outdoors. */
export const pathSchema = z.object({ id, fromSpaceId: id, toSpaceId: id.nullable(), name });

/** One mouth of a fan's duct run, in a room or outdoors. */
export const outletSchema = z.object({
  id,
  sourceId: id,
  name,
  spaceId: id.nullable(),
  position: place.nullable(),
  directivity: z.number().min(-30).max(20).default(0),
  run: runSchema,
});

/** Free-field level of a distant source at one element, without the reflection of the facade. */
export const incidenceSchema = z.object({ id, sourceId: id, elementId: id, levels: levelSpectrum });

export const fenceSchema = z.object({
  id,
  name,
  p1: point,
  p2: point,
  height: metres(0.1, 30),
  thickness: metres(0, 20).default(0),
});

export const receiverSchema = z.object({
  id,
  name,
  /** The words for the place in a sentence: "what next door's bedroom may hear". */
  says: z.string().max(120).default(""),
  kind: z.enum(["room", "outdoor"]),
  spaceId: id.nullable(),
  position: place.nullable(),
  facade: z.boolean().default(false),
  /** Which side a listener on a fence's line stands on. */
  side: z.enum(["studio", "far"]).default("studio"),
  /** Distances to sources in the same room, m, where they are given rather than drawn. */
  distances: z.record(z.string(), metres(0.05, 1000)).default({}),
});

export const METRICS = ["NC", "NR", "dBA", "dBC", "curve"] as const;
export const WINDOW_STATES = ["shut", "ajar", "open"] as const;

/** A limit, copied into the project when chosen: later editions of the library change no old verdict. */
export const criterionSchema = z.object({
  id,
  receiverId: id,
  name,
  metric: z.enum(METRICS),
  value: z.number().min(-20).max(160).nullable(),
  /** Levels per band, frozen: of a curve as typed, of NC and NR as read from the edition. Null for dBA and dBC. */
  levels: levelSpectrum.nullable(),
  edition: z.string().max(120).default(""),
  averaging: z.enum(["loudest", "whole"]).default("loudest"),
  /** Local hours it holds for, "22:00" to "07:00". */
  hours: z.object({ from: z.string().max(5), to: z.string().max(5) }).nullable(),
  /** How and where it is taken: "in bed, window ajar". */
  place: z.string().max(200).default(""),
  /** The clause in its own words. This and what follows describes the limit; the verdict rests on none of it. */
  clauseText: z.string().max(2000).default(""),
  inForce: z.iso.date().nullable().default(null),
  readOn: z.iso.date().nullable().default(null),
  indoors: z.boolean().nullable().default(null),
  /** How the listener's window stands while it is taken. */
  window: z.enum(WINDOW_STATES).nullable().default(null),
  /** The night itself, dB over the nine bands, and how it was come by. */
  background: levelSpectrum.nullable().default(null),
  backgroundSays: z.string().max(200).default(""),
  /** Where the levels are the night's plus a figure: that figure, dB. */
  above: z.number().min(-20).max(60).nullable().default(null),
  provenance: provenanceSchema,
});

export const situationSchema = z.object({
  id,
  name,
  /** Words for the head of the sentence: "On a still night at 23:00". */
  says: z.string().max(120).default(""),
  /** Sources at work and the share of the time they run. A source that is not named is off. */
  playing: z.array(z.object({ sourceId: id, share: z.number().gt(0).max(1) })).max(30),
});

/** Bounds of one project; what one plan may hold (the server keeps answering everybody else). */
export const PLAN_BOUNDS = {
  spaces: 40, sources: 30, elements: 400, receivers: 20, buildings: 40, surfaces: 400, paths: 400, outlets: 60,
  incidences: 400, fences: 60, criteria: 40, situations: 24, constructions: 200,
} as const;

export const partSchemas = {
  building: buildingSchema,
  space: spaceSchema,
  surface: surfaceSchema,
  source: sourceSchema,
  outlet: outletSchema,
  incidence: incidenceSchema,
  path: pathSchema,
  construction: constructionSchema,
  element: elementSchema,
  fence: fenceSchema,
  receiver: receiverSchema,
  criterion: criterionSchema,
  situation: situationSchema,
  lot: lotSchema,
} as const;
export type PartKind = keyof typeof partSchemas;

export const planSchema = z.object({
  lot: lotSchema,
  buildings: z.array(buildingSchema).max(PLAN_BOUNDS.buildings),
  spaces: z.array(spaceSchema).max(PLAN_BOUNDS.spaces),
  surfaces: z.array(surfaceSchema).max(PLAN_BOUNDS.surfaces),
  sources: z.array(sourceSchema).max(PLAN_BOUNDS.sources),
  outlets: z.array(outletSchema).max(PLAN_BOUNDS.outlets),
  incidences: z.array(incidenceSchema).max(PLAN_BOUNDS.incidences),
  paths: z.array(pathSchema).max(PLAN_BOUNDS.paths),
  constructions: z.array(constructionSchema).max(PLAN_BOUNDS.constructions),
  elements: z.array(elementSchema).max(PLAN_BOUNDS.elements),
  fences: z.array(fenceSchema).max(PLAN_BOUNDS.fences),
  receivers: z.array(receiverSchema).max(PLAN_BOUNDS.receivers),
  criteria: z.array(criterionSchema).max(PLAN_BOUNDS.criteria),
  situations: z.array(situationSchema).max(PLAN_BOUNDS.situations),
});

export type Lot = z.infer<typeof lotSchema>;
export type Building = z.infer<typeof buildingSchema>;
export type Space = z.infer<typeof spaceSchema>;
export type Surface = z.infer<typeof surfaceSchema>;
export type Path = z.infer<typeof pathSchema>;
export type Outlet = z.infer<typeof outletSchema>;
export type Incidence = z.infer<typeof incidenceSchema>;
export type Fence = z.infer<typeof fenceSchema>;
export type Receiver = z.infer<typeof receiverSchema>;
export type Criterion = z.infer<typeof criterionSchema>;
export type Situation = z.infer<typeof situationSchema>;
export type Plan = z.infer<typeof planSchema>;
/** A plan before its schema has filled in what was left out. */
export type UnreadPlan = z.input<typeof planSchema>;
