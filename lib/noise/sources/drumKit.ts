import { roomParams, sourceKind } from "./kind";

export const drumKitKind = sourceKind({
  name: "drum kit",
  label: "Drum kit",
  placement: "room",
  params: roomParams,
  // Strongest third-octave of the kick lies at 40-160 Hz in seven of eight open sample sets; toms, snare and cymbals above.
  voice: (band) => (band <= 125 ? "the kick drum" : band <= 1000 ? "the snare and toms" : "the cymbals"),
});
