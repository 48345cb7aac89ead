import { roomParams, sourceKind } from "./kind";

export const instrumentKind = sourceKind({
  name: "instrument",
  label: "Instrument or voice",
  placement: "room",
  params: roomParams,
  voice: () => "the playing",
});
