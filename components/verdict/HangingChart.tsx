"use client";

import { line } from "d3-shape";
import type { PathVerdict } from "@/lib/noise/verdict";
import { bandWords, wholeDecibels } from "../format";
import { useWidthClass } from "../ui/useWidthClass";
import { chartForms, drawnValues, levelAxisOf, placeColumns, type LevelAxis, type Slot } from "./axis";
import { countedWithout, isNumber, type Column } from "./columns";
import { chartSentence } from "./chartWords";
import { DirectLabels } from "./DirectLabels";
import { HungBand, LEDGE_PART } from "./HungBand";

const TOP = 26;
const FOOT = 44;
const BELOW = 22;
interface Props {
  columns: readonly Column[];
  lit: Column;
  path: PathVerdict | null;
  /** The lit path silenced in every band, not only in the lit one. */
  trial: boolean;
  limitName: string | null;
  /** What the drawn levels are counted in. */
  unit: string;
  width: number;
  onBand: (column: Column) => void;
}

function Grid({ axis, left, right }: { axis: LevelAxis; left: number; right: number }) {
  return (
    <g>
      {axis.ticks.map((tick) => (
        <g key={tick}>
          <path d={`M${left} ${Math.round(axis.y(tick)) + 0.5}H${right}`} className="stroke-rule" />
          <text x={left - 12} y={axis.y(tick) + 4} fontSize="13" textAnchor="end" className="fill-ink2">
            {wholeDecibels(tick)}
          </text>
        </g>
      ))}
      <text x={left - 12} y="12" fontSize="13" textAnchor="end" className="font-semibold">
        dB
      </text>
    </g>
  );
}

/** Thin links from ledge to ledge: octave bands are steps, not a curve. Without limits one faint line joins the levels. */
function drawLinks(columns: readonly Column[], slots: readonly Slot[], axis: LevelAxis): string {
  const points = columns.map(({ limit }, index) => {
    const half = (slots[index]!.width * LEDGE_PART) / 2;
    return limit === null || columns[index]!.index === null ? null : { from: slots[index]!.x - half, to: slots[index]!.x + half, y: axis.y(limit) };
  });
  return points
    .map((point, index) => {
      const next = points[index + 1];
      return point && next ? `M${point.to} ${point.y}L${next.from} ${next.y}` : "";
    })
    .join("");
}

function drawFaintLine(columns: readonly Column[], slots: readonly Slot[], axis: LevelAxis): string {
  const drawn = columns.filter(({ index, limit }) => index !== null && limit === null);
  const path = line<Column>()
    .defined(({ counted }) => isNumber(counted))
    .x((column) => slots[column.index!]!.x)
    .y(({ counted }) => axis.y(isNumber(counted) ? counted : 0));
  return path(drawn) ?? "";
}

/** Dashed: what is left with the lit path silenced, in the lit band or, on trial, in all. On a block it lies above, else below the marks. */
function Ghost({ columns, lit, path, trial, slots, axis, over }: Pick<Props, "columns" | "lit" | "path" | "trial"> & { slots: readonly Slot[]; axis: LevelAxis; over: boolean }) {
  if (!path) return null;
  const lines = columns.map((column, index) => {
    if ((column.state === "over" && column.limit !== null) !== over) return "";
    const level = countedWithout(path, column);
    if (!isNumber(level) || (!trial && column !== lit)) return "";
    const { x, width } = slots[index]!;
    return `M${x - width * 0.46} ${axis.y(level)}h${width * 0.92}`;
  });
  return <path d={lines.join("")} strokeWidth="2.2" strokeDasharray="4.5 2.5" fill="none" className="stroke-ink" />;
}

/** The limit as notched ledges, each band's level hung from it on a rod as long as the room left. */
export function HangingChart(props: Props) {
  const { columns, lit, path, width, onBand } = props;
  const widthClass = useWidthClass();
  const form = chartForms[widthClass];
  const narrow = widthClass === 390;
  const slots = placeColumns(columns, form, width);
  const ghosts = path ? columns.map((column) => countedWithout(path, column)).filter(isNumber) : [];
  const axis = levelAxisOf([...drawnValues(columns), ...(props.trial ? ghosts : [])], form, TOP);
  const height = TOP + axis.height + FOOT + BELOW;
  const drawn = { ...props, slots, axis };
  const room = { left: form.left + (width - form.left) / 18, right: width - 4, top: TOP - 14, bottom: TOP + axis.height - 8 };
  return (
    <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} role="img" aria-label={chartSentence(columns, lit)} className="block">
      {columns.map((column, index) => (
        <rect
          key={column.label}
          x={slots[index]!.x - slots[index]!.width / 2}
          width={slots[index]!.width}
          height={height}
          className={column === lit ? "cursor-pointer fill-lampwash" : "cursor-pointer fill-transparent hover:fill-well"}
          onClick={() => onBand(column)}
        />
      ))}
      <g className="pointer-events-none">
        <Grid axis={axis} left={form.left} right={width - form.ruler} />
        <path d={drawLinks(columns, slots, axis)} fill="none" strokeWidth="1.2" className="stroke-ink" />
        <path d={drawFaintLine(columns, slots, axis)} fill="none" strokeWidth="1.2" className="stroke-edge" />
        <Ghost {...drawn} over={false} />
        {columns.map((column, index) => (
          <HungBand key={column.label} column={column} slot={slots[index]!} axis={axis} figure={form.figure} lit={column === lit} />
        ))}
        <Ghost {...drawn} over />
        {!narrow && <DirectLabels {...drawn} room={room} />}
        <text x={form.left - 12} y={height - 8} fontSize="13" textAnchor="end" className="fill-ink2">
          Hz
        </text>
        {columns.map((column, index) => (
          <text key={column.label} x={slots[index]!.x} y={height - 8} fontSize={narrow ? 12 : 13.5} textAnchor="middle" className="font-[620]">
            <title>{column.band ? bandWords(column.band) : column.where}</title>
            {column.label}
          </text>
        ))}
      </g>
    </svg>
  );
}
