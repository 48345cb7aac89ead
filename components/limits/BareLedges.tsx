"use client";

import { wholeDecibels } from "../format";
import { outlinePoise } from "../marks/poise";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { useWidthClass } from "../ui/useWidthClass";
import type { WidthClass } from "../ui/widthClass";
import { chartForms, levelAxisOf, LOWEST_DRAWN, type LevelAxis, type Slot } from "../verdict/axis";
import { isNumber } from "../verdict/columns";
import { spreadApart } from "../walls/spreadApart";
import { isOver, ledgesSentence, nearRuns, PROVABLE, type Ledge } from "./ledges";

const promised: Record<WidthClass, number> = { 390: 334, 720: 620, 1024: 908, 1440: 800 };
/** Room for the words beside the last band. */
const sides: Record<WidthClass, number> = { 390: 4, 720: 132, 1024: 148, 1440: 148 };
const lefts: Record<WidthClass, number> = { 390: 30, 720: 44, 1024: 48, 1440: 48 };
const TOP = 44;
const FOOT = 52;
const POISE = { width: 26, height: 11 } as const;

interface Drawn {
  ledges: readonly Ledge[];
  slots: readonly Slot[];
  axis: LevelAxis;
}

function slotsOf(ledges: readonly Ledge[], left: number, right: number): Slot[] {
  const width = (right - left) / ledges.length;
  return ledges.map((_, at) => ({ x: left + width * (at + 0.5), width }));
}

function Grid({ axis, left, right }: { axis: LevelAxis; left: number; right: number }) {
  return (
    <g>
      {axis.ticks.map((tick) => (
        <g key={tick}>
          <path d={`M${left} ${Math.round(axis.y(tick)) + 0.5}H${right}`} className="stroke-rule" />
          <text x={left - 8} y={axis.y(tick) + 4} fontSize="13" textAnchor="end" className="fill-ink2">
            {wholeDecibels(tick)}
          </text>
        </g>
      ))}
      <text x={left - 8} y="16" fontSize="13" textAnchor="end" className="font-semibold">
        dB
      </text>
    </g>
  );
}

/** What a test could not prove: one dashed box round each stretch of bands, from the top of the chart to its foot. */
function NearBoxes({ ledges, slots, axis }: Drawn) {
  const runs = nearRuns(ledges);
  return (
    <g fill="none" strokeDasharray="4 3" className="stroke-edge">
      {runs.map(({ from, to }) => {
        const x = slots[from]!.x - slots[from]!.width / 2 + 2;
        return <rect key={from} x={x} y={TOP - 34} width={slots[to]!.x + slots[to]!.width / 2 - 2 - x} height={axis.height + 34} />;
      })}
    </g>
  );
}

function NearWords({ ledges, slots }: Drawn) {
  const widest = nearRuns(ledges).toSorted((one, other) => other.to - other.from - (one.to - one.from))[0];
  if (!widest || widest.to - widest.from < 3) return null;
  const x = slots[widest.from]!.x - slots[widest.from]!.width / 2 + 10;
  return (
    <g fontSize="13">
      <text x={x} y={TOP - 16} className="font-[650]">
        Too near the night to prove
      </text>
      <text x={x} y={TOP} className="fill-ink2">
        less than {PROVABLE} dB above it
      </text>
    </g>
  );
}

/** Ledges, with thin links from one to the next: bands are steps, not a curve. */
function Ledges({ ledges, slots, axis }: Drawn) {
  const half = (at: number) => slots[at]!.width * 0.37;
  const links = ledges.map(({ limit, index }, at) => {
    const next = ledges[at + 1];
    if (limit === null || !next || next.limit === null || index === null || next.index === null) return "";
    return `M${slots[at]!.x + half(at)} ${axis.y(limit)}L${slots[at + 1]!.x - half(at + 1)} ${axis.y(next.limit)}`;
  });
  return (
    <g fill="none" className="stroke-ink">
      <path d={links.join("")} strokeWidth="1.2" />
      {ledges.map(({ label, limit }, at) => {
        if (limit === null) return null;
        const { x, width } = slots[at]!;
        const y = axis.y(limit);
        const notches = [1, 2, 3, 4, 5].map((notch) => `M${x - half(at) + (notch * half(at)) / 3} ${y}v6`).join("");
        return (
          <g key={label}>
            <path d={`M${x - width * 0.37} ${y}h${width * 0.74}`} strokeWidth="4.5" />
            <path d={notches} strokeWidth="1.2" />
          </g>
        );
      })}
    </g>
  );
}

/** Where you are, dimmed: this chart is about the limit. Above a ledge the poise stands with its foot at the level. */
function Levels({ ledges, slots, axis }: Drawn) {
  return (
    <g fill="none" strokeWidth="1.4" strokeLinejoin="round" className="stroke-edge">
      {ledges.map((ledge, at) => {
        const { x, width } = slots[at]!;
        const wide = Math.min(POISE.width, width * 0.6);
        if (!isNumber(ledge.level)) {
          return ledge.level === "unknown" ? <circle key={ledge.label} cx={x} cy={axis.y(ledge.limit ?? 0) + 16} r="6" strokeDasharray="3 2.5" /> : null;
        }
        const y = axis.y(ledge.level);
        if (isOver(ledge)) return <path key={ledge.label} d={`M${x} ${axis.y(ledge.limit!) - 2}V${y}${outlinePoise(x, y - POISE.height, wide, POISE.height)}`} />;
        return (
          <g key={ledge.label}>
            {ledge.limit !== null && <path d={`M${x} ${axis.y(ledge.limit)}V${y}`} />}
            <path d={outlinePoise(x, y, wide, POISE.height)} className="fill-sheet" />
            {ledge.level < LOWEST_DRAWN && <path d={`M${x - 4} ${y + POISE.height + 3}l4 4 4-4`} />}
          </g>
        );
      })}
    </g>
  );
}

function Night({ ledges, slots, axis }: Drawn) {
  const points = ledges.map(({ night }, at) => (night === null ? null : ([slots[at]!.x, axis.y(night)] as const)));
  const line = points.map((point, at) => (point ? `${points[at - 1] ? "L" : "M"}${point[0]} ${point[1]}` : "")).join("");
  return (
    <g className="stroke-ink2">
      <path d={line} fill="none" strokeWidth="1.4" strokeDasharray="2 3" />
      {points.map((point) => point && <circle key={point[0]} cx={point[0]} cy={point[1]} r="2.6" className="fill-ink2" stroke="none" />)}
    </g>
  );
}

/** Names of the lines, each beside what it names in the last band. */
function SideWords({ ledges, slots, axis, right }: Drawn & { right: number }) {
  const at = ledges.findLastIndex(({ index }) => index !== null);
  const { limit, level, night } = ledges[at]!;
  const named = [
    { words: "the limit", y: limit, strong: true },
    { words: "the night itself", y: night, strong: false },
    { words: "your level, dimmed", y: isNumber(level) ? Math.max(level, LOWEST_DRAWN) : null, strong: false },
  ]
    .flatMap(({ y, ...rest }) => (y === null ? [] : [{ ...rest, y: axis.y(y) + (rest.words.startsWith("your") ? POISE.height / 2 : 0) }]))
    .toSorted((one, other) => one.y - other.y);
  const placed = spreadApart(named.map(({ y }) => y), 19, TOP, TOP + axis.height);
  const from = slots[at]!.x + slots[at]!.width * 0.42;
  return (
    <g fontSize="13">
      {named.map(({ words, y, strong }, i) => (
        <g key={words}>
          <path d={`M${from} ${y}L${right + 14} ${placed[i]}`} className="stroke-edge" />
          <text x={right + 18} y={placed[i]! + 4} className={strong ? "font-[650]" : "fill-ink2"}>
            {words}
          </text>
        </g>
      ))}
    </g>
  );
}

interface Props {
  name: string;
  ledges: readonly Ledge[];
  /** The band you are looking at, its place in the spectra. */
  lit: number | null;
  onLight: (index: number) => void;
}

/** The limit bare: notched ledges, the levels dimmed, the night dotted. */
export function BareLedges({ name, ledges, lit, onLight }: Props) {
  const widthClass = useWidthClass();
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 1000);
  const narrow = widthClass === 390;
  const form = chartForms[widthClass];
  const whole = ledges.some(({ index }) => index === null);
  const [left, right] = [lefts[widthClass], width - (whole ? 8 : sides[widthClass])];
  const slots = slotsOf(ledges, left, right);
  const values = ledges.flatMap(({ limit, level, night }) => [limit, isNumber(level) ? level : null, night]).filter((value) => value !== null);
  const axis = levelAxisOf(values, form, TOP);
  const height = TOP + axis.height + FOOT;
  const drawn = { ledges, slots, axis };
  const night = ledges.some((ledge) => ledge.night !== null);
  return (
    <figure ref={place} className="min-w-0 overflow-hidden">
      <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} role="img" aria-label={ledgesSentence(name, ledges)} className="block">
        {ledges.map(({ index, label }, at) => (
          <rect
            key={label}
            x={slots[at]!.x - slots[at]!.width / 2}
            width={slots[at]!.width}
            height={height}
            className={index !== null && index === lit ? "fill-lampwash" : "fill-transparent"}
            onClick={() => index !== null && onLight(index)}
          />
        ))}
        <g className="pointer-events-none">
          <Grid axis={axis} left={left} right={right} />
          <NearBoxes {...drawn} />
          <Levels {...drawn} />
          <Ledges {...drawn} />
          <Night {...drawn} />
          {!narrow && <NearWords {...drawn} />}
          {!narrow && !whole && <SideWords {...drawn} right={right} />}
          <text x={left - 8} y={height - 8} fontSize="13" textAnchor="end" className="fill-ink2">
            Hz
          </text>
          {ledges.map(({ label, index }, at) => (
            <text key={label} x={slots[at]!.x} y={height - 8} fontSize={narrow ? 12 : 13.5} textAnchor="middle" className={index !== null && index === lit ? "font-[700]" : "font-[600]"}>
              {label}
            </text>
          ))}
        </g>
      </svg>
      <figcaption className="mt-1 text-second text-ink2">
        {(narrow || whole) && <>Notched line: the limit. {night && "Dotted: the night itself. "}Pale: your level. </>}
        {ledges.some(({ near }) => near) && (
          <>Dashed box: the limit is less than {PROVABLE} dB above the night, so a test cannot prove it there (from memory: ISO 16283-1).</>
        )}
      </figcaption>
    </figure>
  );
}
