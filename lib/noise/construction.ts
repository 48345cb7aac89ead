import { z } from "zod";
import { basesSchema, lossSpectrum, provenanceSchema } from "./spectrum";
import { descriptionSchema } from "./transmission";

/**
 * A construction as the builder reads it: layers from the yard to the room. What is calculated follows from the layers
 * (`describeLayers`); a laboratory spectrum of the very thing, where there is one, leads (solver method 2).
 */
const thickness = z.number().min(0.0001).max(2);

export const layerSchema = z.discriminatedUnion("kind", [
  /** A board, pane or slab. Consecutive boards are one leaf; `bond` says how this one is fixed to the board before it. */
  z.object({
    kind: z.literal("board"),
    name: z.string().min(1).max(120),
    material: z.string().min(1).max(60),
    thickness,
    bond: z.enum(["screwed", "glued", "damped"]).default("screwed"),
  }),
  /** Battens open to the air: what lies outside it counts for mass and cost, not for transmission loss. */
  z.object({ kind: z.literal("ventilated gap"), name: z.string().max(120), thickness }),
  /** The space between two leaves: frame, wool and what is left clear. */
  z.object({
    kind: z.literal("cavity"),
    name: z.string().min(1).max(120),
    thickness,
    fill: z.number().min(0).max(2),
    flowResistivity: z.number().min(500).max(200_000).nullable().default(null),
    connection: z.enum(["wood_stud", "steel_stud", "resilient_channel", "staggered", "double_stud", "clips", "none"]),
    spacing: z.number().min(0.1).max(3).nullable().default(null),
    /** Rows of studs or joists as drawn, from the yard: depth across the wall and width along it, m. */
    studs: z.array(z.object({ depth: thickness, width: thickness })).max(2).default([]),
  }),
]);
export type Layer = z.infer<typeof layerSchema>;

export const constructionSchema = z.object({
  id: z.string().min(1).max(64),
  name: z.string().trim().min(1).max(120),
  /** The kinds of element it can be chosen for. */
  fits: z.array(z.enum(["wall", "roof", "floor", "ceiling", "door", "window"])).max(6),
  catalogueKey: z.string().max(120).nullable(),
  layers: z.array(layerSchema).max(12),
  /** Panel size the model takes, m; null is the default panel of the method. */
  size: z.tuple([z.number().min(0.1).max(100), z.number().min(0.1).max(100)]).nullable().default(null),
  use: z.enum(["window"]).nullable().default(null),
  /** A spectrum of the very thing; leads over the layers. */
  tl: lossSpectrum.nullable(),
  bases: basesSchema.nullable(),
  /** A model description given whole (headless documents); null where it follows from the layers. */
  description: descriptionSchema.nullable().default(null),
  provenance: provenanceSchema,
});
export type Construction = z.infer<typeof constructionSchema>;
