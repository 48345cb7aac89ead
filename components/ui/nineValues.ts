import { BAND_COUNT, OCTAVE_BANDS } from "@/lib/noise/bands";
import { bandWords, capitalise, countWords, numberWord, parseNumber } from "../format";

/** One band of a row: a number, silence, or (null) not known. */
export type BandFigure = number | "silent" | null;

const isNumber = (text: string): boolean => parseNumber(text) !== undefined;

/** Cells as a table gives them: an empty cell between two tabs or semicolons is a cell; spaces only part figures. */
function cellsBetween(text: string, mark: RegExp): string[] {
  return text
    .trim()
    .split(mark)
    .map((cell) => cell.trim());
}

/**
 * Cells of a pasted text, in their order. Parted by tabs, semicolons or lines; else by spaces; else by commas. Between
 * digits that stand alone a comma is a decimal mark: "92,5 104,0" are two, "92.5,104.0" are two, "92,5" is one.
 */
export function cellsOf(pasted: string): string[] {
  const text = pasted.replace(/^[^\S\t]+|[^\S\t]+$/g, "");
  if (/[\t;\n]/.test(text)) return cellsBetween(text.replace(/^\n+|\n+$/g, ""), /\t|;|\r?\n/);
  const spaced = text.split(/,\s+|\s+/).filter(Boolean);
  const commas = text.split(",").length - 1;
  if (spaced.length > 1 || commas < 2) return commas === 1 && /\.\d/.test(text) ? cellsBetween(text, /,/) : spaced;
  return cellsBetween(text, /,/);
}

/** A figure of a cell; undefined where it is none. Empty, a dash and a question mark are "not known". */
export function figureOf(cell: string): BandFigure | undefined {
  const text = cell.trim().toLowerCase();
  if (/^([-\u2013\u2212?]|n\/?a)?$/.test(text)) return null;
  return text === "silent" ? "silent" : parseNumber(text);
}

/** Where pasted cells go in a row of nine, or why they cannot. */
export type Pasted = { from: number; cells: string[]; says: string } | { refused: string };

/**
 * Places the cells of a pasted text in a row of nine: from the field it was pasted into, moved down where they would
 * reach past the last band. Undefined when there are not several figures: then it is an ordinary paste.
 */
export function placePasted(text: string, field: number): Pasted | undefined {
  const cells = cellsOf(text);
  if (cells.length < 2 || !cells.some(isNumber)) return undefined;
  if (cells.length > BAND_COUNT)
    return { refused: `${capitalise(countWords(cells.length, "value"))} pasted, but there are nine bands. Nothing was changed.` };
  const from = Math.min(field, BAND_COUNT - cells.length);
  return { from, cells, says: sayPasted(cells, from) };
}

function sayPasted(cells: readonly string[], from: number): string {
  const read = cells.filter(isNumber).length;
  if (read === BAND_COUNT) return "Nine values pasted.";
  const span = `${bandWords(OCTAVE_BANDS[from]!)} to ${bandWords(OCTAVE_BANDS[from + cells.length - 1]!)}`;
  const left = OCTAVE_BANDS.filter((_, i) => i < from || i >= from + cells.length).map(bandWords);
  const empty = OCTAVE_BANDS.filter((_, i) => figureOf(cells[i - from] ?? "0") === null).map(bandWords);
  return [
    `${capitalise(numberWord(read))} of nine pasted, ${span}.`,
    left.length > 0 && `Left as before: ${left.join(", ")}.`,
    empty.length > 0 && `Not known: ${empty.join(", ")}.`,
  ]
    .filter(Boolean)
    .join(" ");
}
