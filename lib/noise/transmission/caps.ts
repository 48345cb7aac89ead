import type { Leaf } from "./leaf";

/** The most a laboratory finds, dB: framed elements, boards and panes; heavy single walls; glazing narrow and wide. */
const FRAMED = 72;
const MASONRY = 62;
const INSULATING_GLASS = 50;
const WIDE_GLAZING = 58;
const NARROW_CAVITY = 0.025;

/** Cap of an element of one leaf, dB. Solver method, section 2.8. */
export function capOfSingle({ isMasonry }: Leaf): number {
  return isMasonry ? MASONRY : FRAMED;
}

/** Cap of an element of two leaves, dB; `cavity` in m. Solver method, section 2.8. */
export function capOfDouble(cavity: number, use?: "window"): number {
  if (use !== "window") return FRAMED;
  return cavity <= NARROW_CAVITY ? INSULATING_GLASS : WIDE_GLAZING;
}
