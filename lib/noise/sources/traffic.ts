import { z } from "zod";
import { sourceKind } from "./kind";

/** Traffic or another distant source, given as levels at elements (the plan's incidences). */
export const trafficKind = sourceKind({
  name: "traffic",
  label: "Traffic",
  placement: "incident",
  params: z.object({}),
  voice: () => "the traffic",
});
