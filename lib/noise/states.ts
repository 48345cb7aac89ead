import { STATES, type State } from "./verdict";

/** State of a margin, dB: over below 0, tight below one standard deviation, else under. NaN is not weighed. */
export function stateOf(margin: number, doubt: number): State {
  if (Number.isNaN(margin)) return "not weighed";
  if (margin < 0) return "over";
  return margin < doubt ? "tight" : "under";
}

export interface Weighed {
  readonly state: State;
  /** NaN where there is none. */
  readonly margin: number;
}

/**
 * Order of what leads: over before not weighed before tight before under; among equals the smallest margin, and what
 * has none last. Negative when `a` leads; 0 leaves the order as it is, so the lower band stays first.
 */
export function compareWeighed(a: Weighed, b: Weighed): number {
  const rank = STATES.indexOf(a.state) - STATES.indexOf(b.state);
  if (rank !== 0) return rank;
  if (Number.isNaN(a.margin) || Number.isNaN(b.margin))
    return Number(Number.isNaN(a.margin)) - Number(Number.isNaN(b.margin));
  return a.margin === b.margin ? 0 : a.margin - b.margin;
}

/** The one that leads; undefined of none. */
export function leadingOf<T extends Weighed>(all: readonly T[]): T | undefined {
  return all.reduce<T | undefined>(
    (lead, each) => (lead === undefined || compareWeighed(each, lead) < 0 ? each : lead),
    undefined,
  );
}
