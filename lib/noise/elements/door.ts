import { z } from "zod";
import { elementKind } from "./kind";
import { passingWithOpening } from "./passing";

export const doorKind = elementKind({
  name: "door",
  label: "Door",
  path: "door",
  constructed: true,
  params: z.object({
    /** Open area round the leaf that its construction does not already hold. R = 0 over it (solver method 3). */
    gapArea: z.number().min(0).max(1).default(0).meta({ label: "Gap at the seals", unit: "m²" }),
  }),
  passing: ({ area, loss, params }) => passingWithOpening(area, loss, params.gapArea),
});
