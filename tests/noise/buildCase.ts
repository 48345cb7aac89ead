import { answerCase } from "../../lib/noise/caseDocument";

/** The parts of an answer that tests read. */
export interface Answered {
  levels: (number | "silent" | "unknown")[];
  contributions: Record<string, (number | "silent" | "unknown")[]>;
  dba: number | string;
  dbc: number | string;
  nc: [number | string, number | null];
  criterion?: (number | null)[];
  margin?: (number | string)[];
  min_margin?: number | string;
  deciding_band?: number | null;
  margin_dba?: number | string;
  known_levels: (number | string)[];
  states: string[];
  state: string;
}

export const flat = (value: number): number[] => new Array(8).fill(value);

export function answerOf(document: unknown): Record<string, Answered> {
  return answerCase(document) as Record<string, Answered>; // the form of the case document, section 1
}

/** A kit in a studio room and a neighbour's bedroom 12 m away: the smallest whole budget. */
export function buildCase(change: Record<string, unknown> = {}) {
  return {
    rooms: [
      { id: "live", building: "studio", volume: 45, absorption: { area: flat(10) } },
      { id: "bed", building: "neighbour", volume: 32, absorption: { area: flat(9) } },
    ],
    sources: [{ id: "kit", kind: "room", room: "live", lw: flat(105) }],
    elements: [
      {
        id: "wall",
        kind: "wall",
        from: "live",
        to: "outdoors",
        area: 11,
        tl: flat(40),
        position: [0, 0, 1.3],
        normal: [1, 0, 0],
      },
      {
        id: "window",
        kind: "window",
        from: "bed",
        to: "outdoors",
        area: 1.5,
        tl: flat(25),
        position: [12, 0, 4.2],
        normal: [-1, 0, 0],
      },
    ],
    receivers: [{ id: "bed", kind: "room", room: "bed", criterion: { kind: "curve", levels: flat(30) } }],
    ...change,
  };
}
