import { z } from "zod";
import { sourceKind } from "./kind";

/** A ventilation fan; its mouths are the plan's outlets. */
export const fanKind = sourceKind({
  name: "fan",
  label: "Ventilation fan",
  placement: "fan",
  params: z.object({}),
  voice: () => "the fan",
});
