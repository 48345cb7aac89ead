import { roomParams, sourceKind } from "./kind";

export const amplifierKind = sourceKind({
  name: "amplifier",
  label: "Amplifier",
  placement: "room",
  params: roomParams,
  voice: () => "the amplifier",
});
