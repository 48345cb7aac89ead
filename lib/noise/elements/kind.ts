import { z } from "zod";

/** How a kind of path is drawn: one hatch in every drawing. */
export const PATH_KINDS = [
  "wall",
  "roof",
  "floor",
  "window",
  "outdoor unit",
  "duct",
  "leak",
  "door",
  "flanking",
  "in the room",
] as const;
export type PathKind = (typeof PATH_KINDS)[number];

const metres = z.number().min(-1000).max(1000);
const id = z.string().min(1).max(64);

/** What every element has, whatever its kind: where it stands and what it is made of. */
export const placedElement = {
  id,
  pathId: id,
  name: z.string().trim().min(1).max(120),
  area: z.number().min(0.0001).max(10_000).meta({ label: "Area", unit: "m²" }),
  constructionId: id.nullable(),
  /** Field limit of the building as transmission loss, dB, summed as tau; null where none is set. */
  limit: z.number().min(0).max(120).nullable().default(null),
  /** Centre, outward normal and extent [across, up] of elements to outdoors, m. */
  position: z.tuple([metres, metres, metres]).nullable(),
  normal: z
    .tuple([z.number().min(-1).max(1), z.number().min(-1).max(1), z.number().min(-1).max(1)])
    .nullable(),
  size: z.tuple([z.number().min(0.001).max(1000), z.number().min(0.001).max(1000)]).nullable(),
  /** Directivity towards the listener, dB; null follows the geometry. */
  directivity: z.number().min(-30).max(20).nullable().default(null),
  /** Diffuseness term C_d, dB; null is -6 (EN 12354-4). */
  diffuseness: z.number().min(-20).max(0).nullable().default(null),
};

/** Energy that an element lets pass, per band: S tau in m2. `loss` is its construction's transmission loss in dB. */
export interface Passing<P> {
  area: number;
  loss: Float64Array;
  params: P;
}

export interface ElementKind<N extends string, S extends z.ZodRawShape> {
  name: N;
  label: string;
  path: PathKind;
  /** Whether it can be made of a construction of the catalogue. */
  constructed: boolean;
  params: z.ZodObject<S>;
  schema: z.ZodObject<typeof placedElement & { kind: z.ZodLiteral<N>; params: z.ZodObject<S> }>;
  /** S tau per band, m2. NaN where the loss is not known. */
  passing: (element: Passing<z.infer<z.ZodObject<S>>>) => Float64Array;
}

/** A kind of element from what it says of itself; its schema holds what every element has, and its own `params`. */
export function elementKind<N extends string, S extends z.ZodRawShape>(kind: {
  name: N;
  label: string;
  path: PathKind;
  constructed: boolean;
  params: z.ZodObject<S>;
  passing: (element: Passing<z.infer<z.ZodObject<S>>>) => Float64Array;
}): ElementKind<N, S> {
  const schema = z.object({ ...placedElement, kind: z.literal(kind.name), params: kind.params });
  return { ...kind, schema } as ElementKind<N, S>; // zod widens the literal of a generic name
}
