"use client";

import { scaleLinear } from "d3-scale";
import { line } from "d3-shape";
import { formatNumber, withUnit } from "../format";
import { useDrawnWidth } from "../ui/useDrawnWidth";

interface Props {
  /** Parts per million after so many minutes. */
  at: (minutes: number) => number;
  /** The same with no air brought in; dashed. */
  sealed?: (minutes: number) => number;
  aim: number;
  minutes: number;
}

const PROMISED = { 390: 334, 720: 560, 1024: 420, 1440: 600 };
const HEIGHT = 250;
const STEP = 1000;

/** Carbon dioxide over two hours against the aim, which is a ledge. */
export function AirChart({ at, sealed, aim, minutes }: Props) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(PROMISED, 640);
  const frame = { left: 50, right: width - 62, top: 26, foot: HEIGHT - 30 };
  const most = Math.ceil((Math.max(at(minutes), sealed?.(minutes) ?? 0, aim) * 1.08) / STEP) * STEP;
  const x = scaleLinear().domain([0, minutes]).range([frame.left, frame.right]);
  const y = scaleLinear().domain([0, most]).range([frame.foot, frame.top]);
  const step = most > 6 * STEP ? Math.ceil(most / 6 / STEP) * STEP : STEP;
  const ticks = Array.from({ length: Math.floor(most / step) + 1 }, (_, index) => index * step);
  const steps = Array.from({ length: 41 }, (_, index) => (index * minutes) / 40);
  const draw = (curve: (minutes: number) => number) =>
    line<number>()
      .x((one) => x(one))
      .y((one) => y(curve(one)))
      .digits(1)(steps) ?? "";
  const notches = Array.from({ length: Math.floor((frame.right - frame.left) / 12) }, (_, index) => `M${frame.left + 6 + index * 12} ${y(aim) + 2}v5`).join("");
  const label = `Carbon dioxide after two hours about ${withUnit(formatNumber(Math.round(at(minutes) / 50) * 50), "ppm")}, aim ${withUnit(formatNumber(aim), "ppm")}`;
  return (
    <div ref={place} className="min-w-0">
      <svg width={width} height={HEIGHT} viewBox={`0 0 ${width} ${HEIGHT}`} role="img" aria-label={label} fontSize="12" className="block max-w-full">
        <path d={ticks.map((tick) => `M${frame.left} ${Math.round(y(tick)) + 0.5}H${frame.right}`).join("")} strokeWidth="1" className="stroke-rule" />
        {ticks.map((tick) => (
          <text key={tick} x={frame.left - 8} y={y(tick) + 4} textAnchor="end">
            {formatNumber(tick)}
          </text>
        ))}
        <text x={frame.left - 8} y={12} textAnchor="end" fontWeight="650">
          ppm
        </text>
        {[0, 30, 60, 90, 120].map((tick) => (
          <text key={tick} x={x(tick)} y={frame.foot + 20} textAnchor="middle">
            {tick}
          </text>
        ))}
        <text x={frame.right + 16} y={frame.foot + 20} className="fill-ink2!">
          min
        </text>
        <path d={`M${frame.left} ${y(aim)}H${frame.right}`} strokeWidth="4.5" className="stroke-ink" />
        <path d={notches} strokeWidth="1.2" className="stroke-ink" />
        {sealed && <path d={draw(sealed)} fill="none" strokeWidth="1.6" strokeDasharray="5 4" className="stroke-ink2" />}
        <path d={draw(at)} fill="none" strokeWidth="2.4" strokeDasharray={sealed ? undefined : "5 4"} className="stroke-ink" />
        {namesOf({ aim: y(aim), now: y(at(minutes)), sealed: sealed && y(sealed(minutes)) }).map(({ words, at: height }) => (
          <text key={words} x={frame.right + 5} y={height + 4} fontWeight={words === "your aim" ? 700 : 400}>
            {words}
          </text>
        ))}
      </svg>
    </div>
  );
}

const APART = 15;

/** Names at the ends of the lines, pushed apart downward. */
function namesOf({ aim, now, sealed }: { aim: number; now: number; sealed?: number }) {
  const names = [
    { words: "your aim", at: aim },
    { words: sealed === undefined ? "fan off" : "fan on", at: now },
    ...(sealed === undefined ? [] : [{ words: "fan off", at: sealed }]),
  ].toSorted((one, other) => one.at - other.at);
  for (let index = 1; index < names.length; index += 1) names[index]!.at = Math.max(names[index]!.at, names[index - 1]!.at + APART);
  return names;
}
