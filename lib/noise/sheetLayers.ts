import type { Construction, Layer } from "./construction";
import { findMaterial } from "./materials";

/** How a layer is drawn in a section. */
export type LayerLook =
  | "board"
  | "sheathing"
  | "cladding"
  | "timber"
  | "glass"
  | "masonry"
  | "metal"
  | "compound"
  | "frame"
  | "gap"
  | "vented";

/** A stud, joist or rafter cut across: depth through the wall and width along it, m; the leaf it stands against. */
export interface CutStud {
  depth: number;
  width: number;
  against: "yard" | "room" | "both";
}

/** One numbered line of a layer table and one strip of a section, from the yard to the room. */
export interface SheetLayer {
  name: string;
  look: LayerLook;
  /** m; null for a compound spread between boards, which the record gives no thickness of. */
  thickness: number | null;
  /** kg/m² of boards; null for frames, wool and air, which are not counted. */
  surfaceMass: number | null;
  /** Where the mass was read; empty where there is none. */
  whereFrom: string;
  /** Depth of wool from the yard side of this layer, m. */
  fill: number;
  studs: CutStud[];
}

type Cavity = Extract<Layer, { kind: "cavity" }>;
type Board = Extract<Layer, { kind: "board" }>;

/** Lengths below this are binary dust of a subtraction, m. */
const DUST = 5e-4;

const plain = { surfaceMass: null, whereFrom: "", fill: 0, studs: [] };

/**
 * The layers of a construction as the builder reads them, from the yard to the room: a damped board brings its compound,
 * a cavity is split into its rows of studs and the gap that stays clear. Lengths in m, masses in kg/m².
 */
export function sheetLayersOf({ layers, fits }: Pick<Construction, "layers" | "fits">): SheetLayer[] {
  const rows = rowNames(fits);
  return layers.flatMap((layer): SheetLayer[] => {
    if (layer.kind === "board") return boardLayers(layer);
    if (layer.kind === "cavity") return cavityLayers(layer, rows);
    return [
      { ...plain, name: layer.name || "Gap, open to the air", look: "vented", thickness: layer.thickness },
    ];
  });
}

/** What the rows of timber in a cavity are called, from the yard. */
function rowNames(fits: Construction["fits"]): [string, string] {
  if (fits.includes("roof")) return ["Rafters", "Joists"];
  return fits.includes("floor") || fits.includes("ceiling") ? ["Joists", "Joists"] : ["Studs", "Studs"];
}

function boardLayers(board: Board): SheetLayer[] {
  const material = findMaterial(board.material);
  const layer: SheetLayer = {
    ...plain,
    name: board.name,
    look: lookOf(board.material),
    thickness: board.thickness,
    surfaceMass: material ? material.density * board.thickness : null,
    whereFrom: material ? massSource(material.source) : "",
  };
  if (board.bond !== "damped") return [layer];
  return [{ ...plain, name: "Damping compound", look: "compound", thickness: null }, layer];
}

const massSource = (source: string) => (source.startsWith("from memory") ? "typical, from memory" : source);

function lookOf(material: string): LayerLook {
  const family = findMaterial(material)?.family;
  if (material === "timber" || material === "hardwood") return "timber";
  if (material === "fibre_cement" || material === "roof_shingle") return "cladding";
  if (family === "wood") return "sheathing";
  if (family === "glass" || family === "masonry" || family === "metal") return family;
  return family === "limp" ? "compound" : "board";
}

function cavityLayers(cavity: Cavity, rows: [string, string]): SheetLayer[] {
  const framed = cavity.studs.reduce((sum, { depth }) => sum + depth, 0);
  const clear = cavity.thickness - framed;
  if (cavity.studs.length === 0) return [airLayer(cavity.name, cavity.thickness, cavity.fill)];
  if (clear < -DUST || cavity.connection === "staggered") return [interlockedRow(cavity, rows[0])];
  return separateRows(cavity, rows, clear);
}

/** Rows of studs with what is clear between them (two rows) or behind them (one row). Wool fills the rows first. */
function separateRows(cavity: Cavity, names: [string, string], clear: number): SheetLayer[] {
  let wool = cavity.fill;
  const rows = cavity.studs.map(({ depth, width }, row): SheetLayer => {
    const fill = Math.min(depth, wool);
    wool -= fill;
    const against =
      cavity.studs.length === 2 ? (row === 0 ? "yard" : "room") : clear > DUST ? "yard" : "both";
    return frameRow({ name: names[row] ?? names[0], depth, width, fill, studs: [{ depth, width, against }] });
  });
  if (clear <= DUST) return rows;
  const gap = airLayer(gapName(cavity, wool), clear, Math.max(0, wool));
  return [rows[0], gap, ...rows.slice(1)];
}

function gapName(cavity: Cavity, wool: number): string {
  if (cavity.connection === "resilient_channel") return "Resilient channel";
  if (cavity.connection === "clips") return "Clips and channel";
  return wool > DUST ? "Gap, no frame across it" : "Gap, kept clear";
}

/** Staggered studs stand in turn against either leaf and share one depth; a record may name one row for both. */
function interlockedRow(cavity: Cavity, name: string): SheetLayer {
  const [first, second = first] = cavity.studs;
  return frameRow({
    name: `${name}, staggered,`,
    depth: cavity.thickness,
    width: first.width,
    fill: cavity.fill,
    studs: [
      { ...first, against: "yard" },
      { ...second, against: "room" },
    ],
  });
}

function frameRow(row: {
  name: string;
  depth: number;
  width: number;
  fill: number;
  studs: CutStud[];
}): SheetLayer {
  const size = `${millimetres(row.studs[0].depth)} × ${millimetres(row.width)}`;
  return {
    ...plain,
    name: `${row.name} ${size}, ${woolWords(row.depth, row.fill)}`,
    look: "frame",
    thickness: row.depth,
    fill: row.fill,
    studs: row.studs,
  };
}

function airLayer(name: string, thickness: number, fill: number): SheetLayer {
  const said = fill > DUST && !/wool/i.test(name) ? `${name}, ${woolWords(thickness, fill)}` : name;
  return { ...plain, name: said, look: "gap", thickness, fill };
}

function woolWords(depth: number, fill: number): string {
  if (fill <= DUST) return "no wool";
  return fill >= depth - DUST ? "wool between" : `${millimetres(fill)} mm of wool`;
}

const millimetres = (metres: number) => Math.round(metres * 1000);
