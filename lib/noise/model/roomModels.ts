import type { Plan, Space } from "../plan";
import { absorptionOf } from "../rooms";
import type { Note } from "../verdict";
import { unknownBands, ALL_BANDS, type BandMask } from "./masks";

/** A space ready to reckon with. */
export interface RoomModel {
  readonly index: number;
  readonly space: Space;
  /** Absorption area over the nine bands, m2; NaN where it is not known. */
  readonly absorption: Float64Array;
  readonly unknown: BandMask;
}

/** Spaces of a plan in its order, with their absorption. What is not known becomes a note. */
export function roomModels({ spaces, surfaces, lot }: Plan, notes: Note[]): RoomModel[] {
  return spaces.map((space, index) => {
    const absorption = absorptionOf(space, surfaces, lot);
    const unknown = unknownBands(absorption);
    const extent = unknown === ALL_BANDS ? "in any band" : "in every band";
    if (unknown)
      notes.push({ partId: space.id, text: `How much ${space.name} absorbs is not known ${extent}.` });
    return { index, space, absorption, unknown };
  });
}
