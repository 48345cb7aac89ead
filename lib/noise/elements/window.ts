import { z } from "zod";
import { elementKind } from "./kind";
import { passingWithOpening } from "./passing";

export const windowKind = elementKind({
  name: "window",
  label: "Window",
  path: "window",
  constructed: true,
  params: z.object({
    /** Open part of the window. R = 0 over it (solver method 3). */
    openArea: z.number().min(0).max(20).default(0).meta({ label: "Open part", unit: "m²" }),
  }),
  passing: ({ area, loss, params }) => passingWithOpening(area, loss, params.openArea),
});
