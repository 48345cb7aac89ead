import type { LayerLook } from "../../lib/noise/sheet";

/** One tile of strokes in pixels: path data of the tile at its own corner, repeated over the box. */
interface Tile {
  width: number;
  height: number;
  strokeWidth: number;
  /** Each command with its points relative to the tile; drawn by moving the points. */
  strokes: readonly Stroke[];
}

/** "L": straight through the points. "C": one cubic curve of four points. */
type Stroke = readonly ["L" | "C", ...number[]];

const dot = (x: number, y: number): Stroke => ["L", x, y, x, y];

/** One hatch per material of a wall; solid looks have none and are filled with ink. */
const tiles = {
  board: { width: 6, height: 6, strokeWidth: 1.5, strokes: [dot(1.5, 1.5), dot(4.5, 4.5)] },
  sheathing: {
    width: 14,
    height: 14,
    strokeWidth: 1.2,
    strokes: [
      ["L", 1, 3, 5.5, 4.8],
      ["L", 8, 1, 11.6, 4.6],
      ["L", 2.5, 9.6, 6.5, 7.8],
      ["L", 9, 9.4, 13, 10.6],
      ["L", 4.6, 13, 8.4, 12.2],
    ],
  },
  cladding: { width: 7, height: 7, strokeWidth: 1.5, strokes: [["L", 0, 7, 7, 0]] },
  timber: {
    width: 60,
    height: 9,
    strokeWidth: 0.9,
    strokes: [
      ["C", 0, 2.5, 18, 0.6, 34, 5.2, 60, 2.5],
      ["C", 0, 6.8, 22, 8.8, 40, 4.9, 60, 6.8],
    ],
  },
  wool: {
    width: 22,
    height: 15,
    strokeWidth: 1.1,
    strokes: [
      ["C", 0, 12, 5, 12, 6, 3, 11, 3],
      ["C", 11, 3, 16, 3, 17, 12, 22, 12],
    ],
  },
  glass: {
    width: 16,
    height: 22,
    strokeWidth: 1.1,
    strokes: [
      ["L", 3, 12, 9, 4],
      ["L", 7, 14, 13, 6],
    ],
  },
  masonry: {
    width: 10,
    height: 10,
    strokeWidth: 1.2,
    strokes: [
      ["L", 0, 10, 10, 0],
      ["L", 2.5, 10, 10, 2.5],
    ],
  },
} as const satisfies Record<string, Tile>;

export type MaterialHatch = keyof typeof tiles;

const hatchOfLook: Partial<Record<LayerLook, MaterialHatch>> = {
  board: "board",
  sheathing: "sheathing",
  cladding: "cladding",
  timber: "timber",
  glass: "glass",
  masonry: "masonry",
};

/** Undefined for solid looks (metal, compound) and for what is drawn empty. */
export const hatchFor = (look: LayerLook): MaterialHatch | undefined => hatchOfLook[look];

export const isSolidLook = (look: LayerLook): boolean => look === "metal" || look === "compound";

export const strokeOf = (hatch: MaterialHatch): number => tiles[hatch].strokeWidth;

const round = (value: number) => Math.round(value * 100) / 100;

function drawStroke([kind, ...points]: Stroke, dx: number, dy: number): string {
  const moved = points.map((value, index) => round(value + (index % 2 === 0 ? dx : dy)));
  const [x, y, ...rest] = moved;
  return `M${x} ${y}${kind}${rest.join(" ")}`;
}

/** Strokes that cover a box of this size from its own corner, as path data. */
export function drawMaterial(hatch: MaterialHatch, width: number, height: number): string {
  const tile: Tile = tiles[hatch];
  let path = "";
  for (let y = 0; y < height; y += tile.height) {
    for (let x = 0; x < width; x += tile.width) {
      for (const stroke of tile.strokes) path += drawStroke(stroke, x, y);
    }
  }
  return path;
}
