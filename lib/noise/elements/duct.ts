import { z } from "zod";
import { ductPassing } from "../ducts/attenuation";
import { runSchema } from "../ducts/run";
import { elementKind } from "./kind";

/** A duct between two spaces, entered by sound at its mouth (solver method 7). `area` is the mouth's cross-section. */
export const ductKind = elementKind({
  name: "duct",
  label: "Duct",
  path: "duct",
  constructed: false,
  params: z.object({
    opening: z.number().min(0.0001).max(10).meta({ label: "Mouth in the room", unit: "m²" }),
    run: runSchema,
  }),
  passing: ({ params }) => ductPassing(params.opening, params.run),
});
