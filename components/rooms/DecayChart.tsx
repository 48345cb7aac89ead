"use client";

import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { Out } from "@/lib/noise/verdict";
import { bandWords, formatBand, formatNumber, withUnit } from "../format";
import { useFigures, withMark } from "../ui/figures";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { decayScales, drawDecay, longestOf, type DecayScales, type Frame } from "./decayGeometry";

interface Props {
  decay: readonly Out[];
  /** As it was before the last change here; dashed. */
  before?: readonly Out[];
  /** Hz, below which the room answers in single tones. */
  statisticalFrom: number | null;
  /** Index of the lit band. */
  litBand: number;
  onLight: (band: number) => void;
}

const PROMISED = { 390: 334, 720: 580, 1024: 420, 1440: 600 };
const HEIGHT = 340;

/** How long the room rings, band by band. */
export function DecayChart(props: Props) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(PROMISED, 680);
  const { decay, before, statisticalFrom, litBand, onLight } = props;
  const { mark } = useFigures();
  const frame = { left: 38, right: width - (before ? 56 : 26), top: 26, foot: HEIGHT - 34 };
  const scales = decayScales(frame, longestOf(decay, before ?? []));
  return (
    <div ref={place} className="min-w-0">
      <svg width={width} height={HEIGHT} viewBox={`0 0 ${width} ${HEIGHT}`} role="img" aria-label={describe(decay)} className="block max-w-full">
        <Columns scales={scales} frame={frame} litBand={litBand} onLight={onLight} />
        <Grid scales={scales} frame={frame} litBand={litBand} mark={mark} />
        {statisticalFrom !== null && <Tones from={statisticalFrom} scales={scales} frame={frame} />}
        {before && <path d={drawDecay(before, scales)} fill="none" strokeWidth="1.6" strokeDasharray="5 4" className="stroke-ink2" />}
        <path d={drawDecay(decay, scales)} fill="none" strokeWidth="2.4" strokeLinejoin="round" className="stroke-ink" />
        <Beads decay={decay} scales={scales} litBand={litBand} mark={mark} />
        {before && <EndNames decay={decay} before={before} scales={scales} right={frame.right} />}
      </svg>
    </div>
  );
}

interface PartProps {
  scales: DecayScales;
  frame: Frame;
  litBand: number;
}

/** The lit column, and a place to press in each; the choice of band beside the table does the same. */
function Columns({ scales, frame, litBand, onLight }: PartProps & { onLight: (band: number) => void }) {
  return OCTAVE_BANDS.map((band, index) => (
    <rect
      key={band}
      x={scales.x(band) - scales.pitch / 2}
      y={frame.top - 12}
      width={scales.pitch}
      height={frame.foot - frame.top + 40}
      onClick={() => onLight(index)}
      className={index === litBand ? "fill-lampwash" : "cursor-pointer fill-transparent"}
    />
  ));
}

function Grid({ scales, frame, litBand, mark }: PartProps & { mark: "point" | "comma" }) {
  return (
    <g fontSize="12" className="pointer-events-none">
      <path d={scales.ticks.map((tick) => `M${frame.left} ${Math.round(scales.y(tick)) + 0.5}H${frame.right}`).join("")} strokeWidth="1" className="stroke-rule" />
      {scales.ticks.map((tick) => (
        <text key={tick} x={frame.left - 8} y={scales.y(tick) + 4} textAnchor="end">
          {withMark(formatNumber(tick, tick === 0 ? 0 : 1), mark)}
        </text>
      ))}
      <text x={frame.left - 8} y={12} textAnchor="end" fontWeight="650">
        s
      </text>
      {OCTAVE_BANDS.map((band, index) => (
        <text key={band} x={scales.x(band)} y={frame.foot + 22} textAnchor="middle" fontWeight={index === litBand ? 700 : 400} letterSpacing={scales.pitch < 29 ? "-0.4" : undefined}>
          {formatBand(band)}
        </text>
      ))}
      <text x={frame.right + 4} y={frame.foot + 22} className="fill-ink2!">
        Hz
      </text>
    </g>
  );
}

/** Left of the line a room answers in single tones. */
function Tones({ from, scales, frame }: { from: number; scales: DecayScales; frame: Frame }) {
  const x = Math.min(scales.x(from), frame.right);
  if (x <= frame.left) return null;
  const right = x < (frame.left + frame.right) / 2;
  return (
    <g className="pointer-events-none">
      <path d={`M${x} ${frame.top - 10}V${frame.foot}`} strokeWidth="1.5" strokeDasharray="2 4" className="stroke-ink" />
      <text x={x + (right ? 6 : -6)} y={frame.foot - 9} textAnchor={right ? "start" : "end"} fontSize="12" strokeWidth="4" paintOrder="stroke" className="fill-ink2! stroke-sheet">
        left of this line: single tones
      </text>
    </g>
  );
}

function Beads({ decay, scales, litBand, mark }: { decay: readonly Out[]; scales: DecayScales; litBand: number; mark: "point" | "comma" }) {
  return decay.map((seconds, index) => {
    if (typeof seconds !== "number") return null;
    const [x, y] = [scales.x(OCTAVE_BANDS[index]!), scales.y(seconds)];
    const lit = index === litBand;
    return (
      <g key={index} className="pointer-events-none">
        <circle cx={x} cy={y} r={lit ? 6 : 4.5} strokeWidth="1.8" className={lit ? "fill-lamp stroke-ink" : "fill-sheet stroke-ink"} />
        {lit && (
          <text x={x} y={y - 12} textAnchor="middle" fontSize="13" fontWeight="700">
            {withMark(formatNumber(seconds, 2), mark)}
          </text>
        )}
      </g>
    );
  });
}

const APART = 15;

function EndNames({ decay, before, scales, right }: { decay: readonly Out[]; before: readonly Out[]; scales: DecayScales; right: number }) {
  const [now, old] = [decay.at(-1), before.at(-1)];
  if (typeof now !== "number" || typeof old !== "number") return null;
  const y = scales.y(now);
  const shift = scales.y(old) - y;
  const oldY = Math.abs(shift) < APART ? y + (shift < 0 ? -APART : APART) : y + shift;
  return (
    <g fontSize="12">
      <text x={right + 4} y={y + 4} fontWeight="700">
        now
      </text>
      <text x={right + 4} y={oldY + 4}>
        before
      </text>
    </g>
  );
}

function describe(decay: readonly Out[]): string {
  const known = decay.flatMap((seconds, index) =>
    typeof seconds === "number" ? [`${bandWords(OCTAVE_BANDS[index]!)} ${withUnit(formatNumber(seconds, 2), "s")}`] : [],
  );
  return known.length ? `Decay time per band: ${known.join(", ")}` : "Decay time per band: not known";
}
