import { formatQuantity } from "../format";
import type { Figures } from "../ui/figures";
import type { PlanScale } from "./planScale";

/** Metres to a small and a large notch, by the reader's units: a metre and five, or five feet and twenty. */
const FOOT = 0.3048;
const notches = {
  metric: { unit: "m", per: 1, small: 1, large: 5 },
  us: { unit: "ft", per: FOOT, small: 5, large: 20 },
} as const;

interface Props {
  scale: PlanScale;
  units: Figures["units"];
}

function stepsBetween(from: number, to: number, step: number): number[] {
  const first = Math.ceil(from / step - 1e-9);
  return Array.from({ length: Math.max(0, Math.floor(to / step + 1e-9) - first + 1) }, (_, index) => (first + index) * step);
}

/** The edge of the sheet with a rule above and one on the left, the north arrow and the scale bar. */
export function PlanGround({ scale, units }: Props) {
  const { left, top, right, bottom } = scale;
  return (
    <g aria-hidden="true">
      <rect x={left} y={top} width={right - left} height={bottom - top} fill="none" strokeWidth="1.5" className="stroke-ink" />
      <Rules scale={scale} units={units} />
      <North x={right - 24} y={top + 34} />
      <ScaleBar scale={scale} units={units} />
    </g>
  );
}

function Rules({ scale, units }: Props) {
  const { small, large, per } = notches[units];
  const { west, east, south, north } = scale.extent;
  const isLarge = (value: number) => Math.abs(value / large - Math.round(value / large)) < 1e-6;
  const dense = scale.scale * small * per < 4;
  const steps = (from: number, to: number) => stepsBetween(from / per, to / per, small).filter((value) => !dense || isLarge(value));
  const crowded = scale.scale * large * per < 34;
  const named = (value: number) => isLarge(value) && (!crowded || Math.abs(value % (2 * large)) < 1e-6);
  return (
    <>
      {steps(west, east).map((value) => {
        const [x] = scale.at([value * per, north]);
        return (
          <g key={`x${value}`}>
            <path d={`M${x} ${scale.top}v${isLarge(value) ? -9 : -5}`} className="stroke-ink" strokeWidth={isLarge(value) ? 1.5 : 1} />
            {named(value) && (
              <text x={x} y={scale.top - 13} textAnchor="middle" className="text-chart">
                {formatQuantity(value)}
              </text>
            )}
          </g>
        );
      })}
      {steps(south, north).map((value) => {
        const [, y] = scale.at([west, value * per]);
        return (
          <g key={`y${value}`}>
            <path d={`M${scale.left} ${y}h${isLarge(value) ? -9 : -5}`} className="stroke-ink" strokeWidth={isLarge(value) ? 1.5 : 1} />
            {named(value) && (
              <text x={scale.left - 13} y={y + 4} textAnchor="end" className="text-chart">
                {formatQuantity(value)}
              </text>
            )}
          </g>
        );
      })}
    </>
  );
}

function North({ x, y }: { x: number; y: number }) {
  return (
    <>
      <circle cx={x} cy={y} r="13" fill="none" strokeWidth="1.3" className="stroke-ink" />
      <path d={`M${x} ${y + 13}v-10`} strokeWidth="1.3" className="stroke-ink" />
      <path d={`M${x} ${y - 13}l5.5 16h-11z`} className="fill-ink" />
      <text x={x} y={y - 18} textAnchor="middle" className="text-chart font-semibold">
        N
      </text>
    </>
  );
}

function ScaleBar({ scale, units }: Props) {
  const { unit, per, large } = notches[units];
  const length = large * per * scale.scale;
  const [x, y] = [scale.right - length - 22, scale.bottom - 14];
  return (
    <>
      <path d={`M${x} ${y - 6}v6h${length}v-6`} fill="none" strokeWidth="1.5" className="stroke-ink" />
      <Halo x={x} y={y - 10} anchor="middle" words="0" />
      <Halo x={x + length} y={y - 10} anchor="middle" words={`${large} ${unit}`} />
    </>
  );
}

/** Text that stays readable on lines: a halo of its ground. */
export function Halo({ x, y, anchor = "start", words, className = "text-chart" }: { x: number; y: number; anchor?: "start" | "middle" | "end"; words: string; className?: string }) {
  return (
    <text x={x} y={y} textAnchor={anchor} paintOrder="stroke" strokeWidth="4" strokeLinejoin="round" className={`stroke-sheet ${className}`}>
      {words}
    </text>
  );
}
