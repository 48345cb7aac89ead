type Place = readonly [number, number, number];

/**
 * Three figures of a place after a save came back: only those that moved are taken over, for another may be typed already
 * and be on its way.
 */
export const keepTyped = (typed: readonly (number | null)[], came: Place, stood: Place | null): (number | null)[] =>
  came.map((at, axis) => (at === stood?.[axis] ? (typed[axis] ?? at) : at));
