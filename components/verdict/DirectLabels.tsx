import type { PathVerdict } from "@/lib/noise/verdict";
import { wholeDecibels } from "../format";
import type { LevelAxis, Slot } from "./axis";
import { inSentence } from "./chartWords";
import { countedWithout, isNumber, type Column } from "./columns";
import { POISE } from "./HungBand";
import { overlaps, placeLabel, type Box, type Label } from "./placeLabels";

/** Width of a letter of chart text at 13 px, a little generous. */
const LETTER = 6.5;
/** Half of "4 over" in the figures of the chart, and a little air. */
const OVER_WORDS = 40;

interface Props {
  columns: readonly Column[];
  slots: readonly Slot[];
  axis: LevelAxis;
  lit: Column;
  path: PathVerdict | null;
  limitName: string | null;
  unit: string;
  /** Where labels may stand. */
  room: Box;
}

/** Everything a direct label must keep clear of. */
function boxesOf({ columns, slots, axis }: Props): Box[] {
  return columns.flatMap(({ limit, counted, known, state }, index) => {
    const { x, width } = slots[index]!;
    const values = [limit, isNumber(counted) ? counted : known].filter(isNumber).map(axis.y);
    if (values.length === 0) return [];
    const head = state === "over" ? POISE.height + 28 : 8;
    const foot = state === "over" ? 10 : POISE.height + 26;
    const half = Math.max(width / 2 + 2, state === "over" ? OVER_WORDS : 0);
    return [{ left: x - half, right: x + half, top: Math.min(...values) - head, bottom: Math.max(...values) + foot }];
  });
}

function Lines({ box, words, bold }: { box: Box; words: readonly string[]; bold?: boolean }) {
  return words.map((text, index) => (
    <text key={text} x={box.left} y={box.top + 12 + index * 16} fontSize="13" strokeWidth="4" strokeLinejoin="round" className={bold ? "stroke-sheet font-[650] [paint-order:stroke]" : "fill-ink2 stroke-sheet [paint-order:stroke]"}>
      {text}
    </text>
  ));
}

function labelOf(words: readonly string[], anchor: Label["anchor"]): Label {
  return { anchor, height: words.length * 16, width: Math.max(...words.map((text) => text.length)) * LETTER };
}

/** From what a label speaks of to its nearest side. */
function Leader({ box, anchor }: Pick<Placed, "box" | "anchor">) {
  const x = Math.max(box.left + 2, Math.min(box.right - 2, anchor.x));
  const y = box.top > anchor.y ? box.top - 2 : box.bottom + 2;
  const aside = anchor.x < box.left - 4;
  return <path d={`M${anchor.x} ${anchor.y}${aside ? `L${box.left - 5} ${box.top + 12}` : `L${x} ${y}`}`} fill="none" className="stroke-ink2" />;
}

interface Placed {
  box: Box;
  words: string[];
  anchor: Label["anchor"];
}

function place(words: string[], anchor: Label["anchor"], taken: readonly Box[], room: Box): Placed | null {
  const box = placeLabel(labelOf(words, anchor), taken, room);
  return box && { box, words, anchor };
}

/** "dashed: 50 dB, were the yard door silent", tied to the end of the dashed line. */
function placeGhost({ columns, slots, axis, lit, path, unit, room }: Props, taken: readonly Box[]): Placed | null {
  const silent = path ? countedWithout(path, lit) : "unknown";
  const slot = slots[columns.indexOf(lit)];
  if (!path || !slot || !isNumber(silent)) return null;
  const words = [`dashed: ${wholeDecibels(silent)} ${unit}, were`, `${inSentence(path.name)} silent`];
  return place(words, { x: slot.x + slot.width * 0.46, y: axis.y(silent) }, taken, room);
}

/** Whether the way from a label to its anchor runs through another label. */
function crosses({ box, anchor }: Placed, other: Box): boolean {
  const way = { left: Math.min(anchor.x, box.left) - 4, right: Math.max(anchor.x, box.left) + 4, top: Math.min(box.bottom, anchor.y), bottom: Math.max(box.top, anchor.y) };
  return overlaps(way, other);
}

/** Ledges in the middle of the chart first. */
const LIMIT_AT = [3, 4, 5, 2, 6, 1, 7, 0, 8, 9];

/** The name of the limit, tied to the end of a ledge. */
function placeLimit({ columns, slots, axis, limitName, room }: Props, taken: readonly Box[], ghost: Placed | null): Placed | null {
  if (limitName === null) return null;
  const words = [`The limit: ${limitName.replace(/^The /, "the ")}`];
  for (const at of LIMIT_AT) {
    const limit = columns[at]?.limit ?? null;
    if (limit === null) continue;
    const { x, width } = slots[at]!;
    const placed = place(words, { x: x + width * 0.33, y: axis.y(limit) - 4 }, ghost ? [...taken, ghost.box] : taken, room);
    if (placed && !(ghost && crosses(placed, ghost.box))) return placed;
  }
  return null;
}

/** What the eye would otherwise look up in a legend; left out where there is no room for it. */
export function DirectLabels(props: Props) {
  const taken = boxesOf(props);
  const ghost = placeGhost(props, taken);
  const limit = placeLimit(props, taken, ghost);
  return (
    <>
      {ghost && <Leader {...ghost} />}
      {ghost && <Lines {...ghost} />}
      {limit && <Leader {...limit} />}
      {limit && <Lines {...limit} bold />}
    </>
  );
}
