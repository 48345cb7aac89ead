"use client";

import type { PathVerdict } from "@/lib/noise/verdict";
import { percent } from "../format";
import { HatchBox } from "../marks/HatchBox";
import { useWidthClass } from "../ui/useWidthClass";
import { chartForms, placeColumns } from "./axis";
import { byShare, shareOf, type Column } from "./columns";
import { sharesSentence } from "./chartWords";
import { stackOf } from "./stack";

const COLUMN_PART = 0.62;
const TOP = 14;
const BOTTOM = 10;
/** Drops that the ruler names, dB. */
const DROPS = [0, 1, 2, 3, 4, 6, 10];
const HAIRLINE = 0.02;

interface Props {
  columns: readonly Column[];
  paths: readonly PathVerdict[];
  lit: Column;
  litId: string | null;
  width: number;
  onBand: (column: Column) => void;
  onPath: (pathId: string) => void;
}

/** All energy of one band as a column: parts of it add up, so they may be stacked. */
function ShareColumn({ column, paths, litId, x, width, foot, height, onPath }: Pick<Props, "paths" | "litId" | "onPath"> & { column: Column; x: number; width: number; foot: number; height: number }) {
  const blocks = stackOf(paths, column, litId);
  return (
    <g>
      {blocks.map(({ path, lit, from, to }) => {
        const thin = to - from < HAIRLINE;
        const tall = (to - from) * height;
        return (
          <g key={path.id} onClick={() => onPath(path.id)}>
            <title>{`${path.name}: ${percent(to - from)} ${column.where}`}</title>
            {!thin && <HatchBox kind={path.kind} lit={lit} x={x} y={foot - to * height} width={width} height={tall} outline={1.2} />}
            {thin && <path d={`M${x} ${foot - to * height}h${width}`} strokeWidth="1" className="stroke-ink" />}
          </g>
        );
      })}
      <rect x={x} y={foot - height} width={width} height={height} fill="none" strokeWidth="1.5" className={blocks.length > 0 ? "stroke-ink" : "stroke-edge"} strokeDasharray={blocks.length > 0 ? undefined : "3 3"} />
    </g>
  );
}

/** The foot of the lit part, read here, says how far the band falls with that path silenced: d = -10 lg(1 - s). */
function DropRuler({ x, foot, height }: { x: number; foot: number; height: number }) {
  const place = (drop: number) => foot - height * 10 ** (-drop / 10);
  return (
    <g className="stroke-ink" fill="none" strokeWidth="1.3">
      <path d={`M${x} ${foot - height}V${foot}`} />
      {DROPS.map((drop) => (
        <g key={drop}>
          <path d={`M${x} ${place(drop)}h8`} />
          <text x={x + 13} y={place(drop) + 4} fontSize="12" stroke="none">
            {drop === 0 ? "0" : `\u2212${drop}`}
          </text>
        </g>
      ))}
    </g>
  );
}

function PercentAxis({ x, foot, height, narrow }: { x: number; foot: number; height: number; narrow: boolean }) {
  return [0, 50, 100].map((part) => (
    <text key={part} x={x} y={foot - (part / 100) * height + 4} fontSize={narrow ? 12 : 13} textAnchor="end" className="fill-ink2">
      {narrow ? part : `${part}\u00a0%`}
    </text>
  ));
}

/** One column per band, 100 % = all energy arriving, hatched by path, the lit path on top. */
export function Shares({ columns, paths, lit, litId, width, onBand, onPath }: Props) {
  const widthClass = useWidthClass();
  const form = chartForms[widthClass];
  const narrow = widthClass === 390;
  const slots = placeColumns(columns, form, width);
  const top = TOP + 8;
  const foot = top + form.sharesHeight;
  const height = foot + BOTTOM;
  const loudest = byShare(paths, lit)[0];
  return (
    <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} role="img" aria-label={sharesSentence(loudest, loudest ? shareOf(loudest, lit) : 0, lit)} className="block">
      {columns.map((column, index) => (
        <g key={column.label} className="cursor-pointer" onClick={() => onBand(column)}>
          <rect x={slots[index]!.x - slots[index]!.width / 2} width={slots[index]!.width} height={height} className={column === lit ? "fill-lampwash" : "fill-transparent"} />
          <ShareColumn column={column} paths={paths} litId={litId} x={slots[index]!.x - (slots[index]!.width * COLUMN_PART) / 2} width={slots[index]!.width * COLUMN_PART} foot={foot} height={form.sharesHeight} onPath={onPath} />
        </g>
      ))}
      <PercentAxis x={form.left - 12 + (narrow ? 4 : 0)} foot={foot} height={form.sharesHeight} narrow={narrow} />
      {narrow ? (
        <text x={form.left - 8} y="10" fontSize="12" textAnchor="end" className="font-semibold">
          %
        </text>
      ) : (
        <>
          <DropRuler x={width - form.ruler + 4} foot={foot} height={form.sharesHeight} />
          <text x={width} y="12" fontSize="12" textAnchor="end" className="font-semibold">
            drop, dB
          </text>
        </>
      )}
    </svg>
  );
}
