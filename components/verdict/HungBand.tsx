import clsx from "clsx";
import { poiseLabel, wholeDecibels } from "../format";
import { outlineLowerHalf, outlinePoise } from "../marks/poise";
import type { LevelAxis, Slot } from "./axis";
import { LOWEST_DRAWN } from "./axis";
import { isNumber, type Column } from "./columns";
import { Settle } from "./Settle";

export const POISE = { width: 30, height: 13 } as const;

/** As wide as it is meant to be, or as its band allows. */
export const poiseWidth = (slot: Slot): number => Math.min(POISE.width, slot.width * 0.62);
export const LEDGE_PART = 0.74;

export const markColour = {
  under: "text-under",
  tight: "text-tight",
  over: "text-over",
  "not weighed": "text-ink3",
} as const;

interface Props {
  column: Column;
  slot: Slot;
  axis: LevelAxis;
  /** Height of the Besley figures. */
  figure: number;
  /** The lit band keeps its word "over" even where neighbours stand close. */
  lit: boolean;
}

/** The limit of one band: a ledge with five notches beneath. */
function Ledge({ x, y, width }: { x: number; y: number; width: number }) {
  const notches = [1, 2, 3, 4, 5].map((notch) => `M${x - width / 2 + (notch * width) / 6} ${y}v6`).join("");
  return (
    <g className="stroke-ink">
      <path d={`M${x - width / 2} ${y}h${width}`} strokeWidth="4.5" />
      <path d={notches} strokeWidth="1.2" />
    </g>
  );
}

function Figure({ x, y, size, children }: { x: number; y: number; size: number; children: React.ReactNode }) {
  return (
    <text x={x} y={y} fontSize={size} textAnchor="middle" strokeWidth="4" strokeLinejoin="round" className="figure fill-current stroke-sheet font-[660] [paint-order:stroke]">
      {children}
    </text>
  );
}

interface Hung {
  x: number;
  y: number;
  /** Width of the poise. */
  wide: number;
  size: number;
  label: string;
}

/** Over: the excess stands on the ledge as a block, the poise on top of it with its bottom edge at the level. */
function Standing({ x, ledge, y, wide, size, label }: Hung & { ledge: number }) {
  return (
    <Settle y={y}>
      <path d={`M${x - wide * 0.7} ${ledge - 2}V${y}h${wide * 1.4}V${ledge - 2}Z`} fill="currentColor" />
      <path d={outlinePoise(x, y - POISE.height, wide, POISE.height)} fill="currentColor" />
      <Figure x={x} y={y - POISE.height - 6} size={size}>
        {label}
      </Figure>
    </Settle>
  );
}

function Hanging({ x, ledge, y, wide, size, label, half, beyond }: Hung & { ledge: number | null; half: boolean; beyond: boolean }) {
  const top = ledge === null ? y : Math.max(y, ledge + 2.5);
  return (
    <Settle y={top}>
      {ledge !== null && <path d={`M${x} ${ledge}V${top}`} stroke="currentColor" strokeWidth="1.8" />}
      <path d={outlinePoise(x, top, wide, POISE.height)} stroke="currentColor" strokeWidth="1.8" strokeLinejoin="round" className="fill-sheet" />
      {half && <path d={outlineLowerHalf(x, top, wide, POISE.height)} fill="currentColor" />}
      {beyond && <path d={`M${x - 4} ${top + 4}l4 4 4-4`} fill="none" stroke="currentColor" strokeWidth="1.6" />}
      <Figure x={x} y={top + POISE.height + size * 0.88} size={size}>
        {label}
      </Figure>
    </Settle>
  );
}

/** No valid figure: the dashed bead, and a gap where the poise would hang. */
function Unweighed({ x, y }: { x: number; y: number }) {
  return (
    <g className="stroke-ink3" fill="none" strokeWidth="1.8">
      <path d={`M${x} ${y}v8`} strokeDasharray="3 2.5" />
      <circle cx={x} cy={y + 15} r="6.5" strokeDasharray="3 2.5" className="fill-sheet" />
    </g>
  );
}

/** Whether the words stand clear of what the neighbouring bands write. */
function fits(label: string, size: number, slot: Slot, lit: boolean): boolean {
  const width = label.length * size * 0.56;
  return width < slot.width + (lit ? slot.width - size * 1.2 : -2);
}

/** Limit and level of one band, with the room left between them. */
export function HungBand({ column, slot, axis, figure, lit }: Props) {
  const { limit, state, margin } = column;
  const drawn = isNumber(column.counted) ? column.counted : state === "over" && isNumber(column.known) ? column.known : null;
  const ledge = limit === null ? null : axis.y(limit);
  const label = limit === null ? wholeDecibels(column.counted) : poiseLabel(state, margin);
  const shared = { x: slot.x, wide: poiseWidth(slot), size: figure, label: fits(label, figure, slot, lit) ? label : label.replace(" over", "") };
  return (
    <g className={clsx(limit === null ? "text-ink2" : markColour[state])}>
      {ledge !== null && <Ledge x={slot.x} y={ledge} width={slot.width * LEDGE_PART} />}
      {drawn === null && column.level !== "silent" && <Unweighed x={slot.x} y={ledge ?? axis.y(0) - 30} />}
      {drawn !== null && state === "over" && ledge !== null && <Standing {...shared} ledge={ledge} y={axis.y(drawn)} />}
      {drawn !== null && (state !== "over" || ledge === null) && (
        <Hanging {...shared} ledge={ledge} y={axis.y(drawn)} half={state === "tight" && ledge !== null} beyond={drawn < LOWEST_DRAWN} />
      )}
    </g>
  );
}
