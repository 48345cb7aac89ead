"use client";

import type { PathVerdict } from "@/lib/noise/verdict";
import { percent, timesWords, wholeDecibels } from "../format";
import { MarginWords } from "../marks/MarginWords";
import { armOf, BeamArm, Blocks, Bracket, BreakLine, Crate, CRATE, FOOT, Hanger, PIVOT, Weight, WEIGHT_AT } from "./BasketParts";
import { isNumber, type Column } from "./columns";
import { Settle, Tilt } from "./Settle";
import { stackOf } from "./stack";

/** A stack higher than this many crates is cut with a break line. */
const CUT = 2.2;

/** Decoration only, always beside the number. */
export const tiltOf = (margin: number): number => Math.max(-5, Math.min(5, 1.25 * margin));

interface Props {
  column: Column;
  paths: readonly PathVerdict[];
  litId: string | null;
  width: number;
}

/** "1.9 times" of an excess, "52 % spent" of what is left within the limit. */
export function SpentWords({ column }: { column: Column }) {
  if (column.spent === null || column.limit === null) return null;
  const words = column.state === "over" ? timesWords(column.spent) : `${percent(column.spent)} spent`;
  return <MarginWords state={column.state}>{column.state === "not weighed" ? "not weighed" : words}</MarginWords>;
}

function basketSentence(column: Column): string {
  if (column.limit === null) return `No limit ${column.where}, so no crate to fill.`;
  if (!isNumber(column.margin) || column.spent === null) return `Not weighed ${column.where}.`;
  const amount = column.state === "over" ? `${timesWords(column.spent)} the allowance` : `${percent(column.spent)} of the allowance`;
  return `Crate of the allowance ${column.where}, ${wholeDecibels(column.limit)} ${column.unit}: what arrives fills ${amount}.`;
}

/** The lit band only: blocks of energy in a crate whose height is the allowance. Overfull shows as overfull. */
export function Basket({ column, paths, litId, width }: Props) {
  const { limit, spent, margin, state } = column;
  const filled = limit !== null && spent !== null && Number.isFinite(spent) ? spent : 0;
  const cut = filled > CUT;
  const height = Math.min(filled, CUT) * CRATE.height;
  const crate = FOOT - CRATE.height;
  const top = FOOT - height;
  const tilt = isNumber(margin) && limit !== null ? tiltOf(margin) : 0;
  const radians = (tilt * Math.PI) / 180;
  const hung = armOf(width) * WEIGHT_AT;
  const arm = { x: PIVOT.x - 52 * Math.cos(radians), y: PIVOT.y - 52 * Math.sin(radians) + 3 };
  return (
    <svg width={width} height={FOOT + 6} viewBox={`0 0 ${width} ${FOOT + 6}`} role="img" aria-label={basketSentence(column)} className="block">
      <path d={`M${PIVOT.x} ${PIVOT.y}V16`} strokeWidth="2.4" className="stroke-ink" />
      <circle cx={PIVOT.x} cy="10" r="6" fill="none" strokeWidth="2.4" className="stroke-ink" />
      <Tilt degrees={tilt} x={PIVOT.x} y={PIVOT.y}>
        <BeamArm end={armOf(width)} dashed={state === "not weighed"} />
      </Tilt>
      {limit !== null && <Weight x={PIVOT.x + hung * Math.cos(radians)} y={PIVOT.y + hung * Math.sin(radians)} allowed={limit} unit={column.unit} />}
      <circle cx={PIVOT.x} cy={PIVOT.y} r="4.5" strokeWidth="2.2" className="fill-sheet stroke-ink" />
      <Hanger from={arm} to={Math.min(top, crate) - 6} />
      <Settle y={top}>
        <Blocks blocks={stackOf(paths, column, litId)} height={height} width={CRATE.width - 12} />
      </Settle>
      {limit !== null && <Crate top={crate} />}
      {limit !== null && (
        <text x={CRATE.left + CRATE.width + 22} y={state === "over" ? crate + 20 : crate - 6} fontSize="14">
          the allowance
        </text>
      )}
      {limit !== null && state !== "not weighed" && <Bracket top={top} crate={crate} state={state} />}
      {cut && <BreakLine y={top + 26} />}
      {cut && (
        <text x={CRATE.left + CRATE.width + 22} y={top + 12} fontSize="14" className="fill-over font-[650]">
          {timesWords(filled)}
        </text>
      )}
    </svg>
  );
}
