import type { Figure, State } from "../format";

/** Metres on the lot: x to the east, y to the north. */
export type Point = readonly [number, number];

export interface DrawnBuilding {
  outline: readonly Point[];
  kind: "studio" | "house" | "other";
}

/** One yard as the list tells it; plain data, made by the page. */
export interface ProjectLine {
  id: string;
  href: string;
  /** Of the stage where it is drawn. */
  yardHref: string;
  revision: number;
  name: string;
  says: string;
  /** ISO 8601. */
  changedAt: string;
  archived: boolean;
  may: { rename: boolean; copy: boolean };
  lot: readonly Point[];
  buildings: readonly DrawnBuilding[];
  /** The worst listener. */
  listener?: Point;
  listenerName?: string;
  state: State;
  /** The state before, where it is not weighed because something has changed since. */
  was?: State;
  /** Of the worst listener, unrounded. */
  margin?: Figure;
  doubt?: number | null;
  band?: number | null;
  /** "As drawn, and five options" */
  stage: string;
  weighedAt?: string;
  /** What changed since: "door seal, 2 limits". */
  stale?: string;
  people: readonly { name: string; says?: string }[];
}
