import type { PathKind } from "../format";

/** A hatch is one tile of strokes, in pixels; a stroke of no length with round caps is a dot. */
export interface Hatch {
  width: number;
  height: number;
  strokeWidth: number;
  /** Each stroke as x1, y1, x2, y2, x3, ... */
  strokes: readonly (readonly number[])[];
}

/** Stacking order of the shares, from the foot. */
export const STACK_ORDER = [
  "in the room", "flanking", "wall", "roof", "floor", "window", "outdoor unit", "duct", "leak", "door",
] as const satisfies readonly PathKind[];

/** A wall is solid ink, so only its lit form has strokes: a fine grid that lets the lamp through. */
export const hatches: Record<PathKind, Hatch> = {
  wall: { width: 4, height: 4, strokeWidth: 1.9, strokes: [[0, 2, 4, 2], [2, 0, 2, 4]] },
  roof: { width: 6, height: 6, strokeWidth: 1.3, strokes: [[0, 3, 6, 3]] },
  floor: { width: 10, height: 10, strokeWidth: 1.3, strokes: [[0, 4, 5, 1, 10, 4], [0, 9, 5, 6, 10, 9]] },
  window: { width: 9, height: 9, strokeWidth: 1.2, strokes: [[2.5, 0, 2.5, 9], [5.5, 0, 5.5, 9]] },
  "outdoor unit": { width: 8, height: 8, strokeWidth: 1.1, strokes: [[0, 4, 8, 4], [4, 0, 4, 8]] },
  duct: { width: 7, height: 7, strokeWidth: 2.1, strokes: [[1.75, 1.75, 1.75, 1.75], [5.25, 5.25, 5.25, 5.25]] },
  leak: { width: 8, height: 8, strokeWidth: 1.3, strokes: [[1, 1.5, 2.6, 3.4], [5.2, 0.9, 5.8, 2.9], [3.6, 5.4, 2.8, 7.2], [6.2, 5.2, 7.4, 6.8]] },
  door: { width: 7, height: 7, strokeWidth: 1.5, strokes: [[-1, 1, 1, -1], [0, 7, 7, 0], [6, 8, 8, 6]] },
  flanking: { width: 12, height: 12, strokeWidth: 1.2, strokes: [[-1, -1, 13, 13], [-1, 2, 10, 13], [2, -1, 13, 10], [-1, 11, 1, 13], [11, -1, 13, 1]] },
  "in the room": { width: 12, height: 12, strokeWidth: 1.2, strokes: [[3, 1, 3, 5], [1, 3, 5, 3], [9, 7, 9, 11], [7, 9, 11, 9]] },
};

const rounded: readonly PathKind[] = ["duct", "leak"];

export const capOf = (kind: PathKind): "round" | "butt" => (rounded.includes(kind) ? "round" : "butt");

export const isSolid = (kind: PathKind, lit: boolean): boolean => kind === "wall" && !lit;

const round = (value: number) => Math.round(value * 100) / 100;

function drawStroke(stroke: readonly number[], dx: number, dy: number): string {
  let path = "";
  for (let at = 0; at < stroke.length; at += 2) {
    path += `${at === 0 ? "M" : "L"}${round(stroke[at]! + dx)} ${round(stroke[at + 1]! + dy)}`;
  }
  return path;
}

/** The strokes of one tile as path data. */
export const drawTile = (kind: PathKind): string => hatches[kind].strokes.map((stroke) => drawStroke(stroke, 0, 0)).join("");

/** The strokes that cover a box of this size from its own corner, as path data. */
export function drawHatch(kind: PathKind, width: number, height: number): string {
  const hatch = hatches[kind];
  let path = "";
  for (let y = 0; y < height; y += hatch.height) {
    for (let x = 0; x < width; x += hatch.width) {
      path += hatch.strokes.map((stroke) => drawStroke(stroke, x, y)).join("");
    }
  }
  return path;
}
