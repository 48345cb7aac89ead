import { z } from "zod";
import { BAND_COUNT } from "../bands";

/**
 * Pieces of a duct run, in order from the room or the fan to the far mouth. Silencer and end are built; any other piece
 * is refused by name (solver method 7).
 */
const silencerSchema = z.object({
  kind: z.literal("silencer"),
  /** Insertion loss per band, dB; null is not known. */
  il: z.array(z.union([z.number().min(0).max(100), z.null()])).length(BAND_COUNT),
});
const endSchema = z.object({
  kind: z.literal("end"),
  /** Free cross-section of the mouth, m2. */
  s: z.number().min(0.0001).max(10),
  /** Flush with a wall or ceiling, or free-standing. */
  flush: z.boolean().default(true),
});
const BUILT = ["silencer", "end"];

export const pieceSchema = z.preprocess((piece, context) => {
  const kind = typeof piece === "object" && piece !== null && "kind" in piece ? String(piece.kind) : "";
  if (kind && !BUILT.includes(kind)) {
    context.addIssue({ code: "custom", message: `A duct piece "${kind.slice(0, 40)}" is not built yet; use a silencer or an end.` });
  }
  return piece;
}, z.discriminatedUnion("kind", [silencerSchema, endSchema]));

export const runSchema = z.array(pieceSchema).max(24);
export type DuctPiece = z.infer<typeof silencerSchema> | z.infer<typeof endSchema>;
