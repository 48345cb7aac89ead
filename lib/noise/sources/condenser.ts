import { outdoorParams, sourceKind } from "./kind";

export const condenserKind = sourceKind({
  name: "condenser",
  label: "Outdoor unit",
  placement: "outdoor",
  params: outdoorParams,
  voice: () => "the outdoor unit",
});
