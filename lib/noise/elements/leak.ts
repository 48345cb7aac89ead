import { z } from "zod";
import { elementKind } from "./kind";

/** A slit or hole: its open area with R = 0 in all bands (solver method 3). */
export const leakKind = elementKind({
  name: "leak",
  label: "Leak",
  path: "leak",
  constructed: false,
  params: z.object({}),
  passing: ({ area, loss }) => loss.map(() => area),
});
