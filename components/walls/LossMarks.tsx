import { OCTAVE_BANDS } from "../../lib/noise/bands";
import { formatBand, formatNumber, wholeDecibels, withUnit } from "../format";
import type { Frame, LossPoint, LossScales } from "./lossGeometry";
import { spreadApart } from "./spreadApart";

export function LitColumn({ x, pitch, frame }: { x: number; pitch: number; frame: Frame }) {
  return (
    <rect
      x={x - pitch / 2}
      y={frame.top - 8}
      width={pitch}
      height={frame.foot - frame.top + 36}
      className="fill-lampwash"
    />
  );
}

export function Grid({ scales, frame, litBand }: { scales: LossScales; frame: Frame; litBand: number }) {
  return (
    <g fontSize="12">
      <path
        d={scales.ticks
          .map((tick) => `M${frame.left} ${Math.round(scales.y(tick)) + 0.5}H${frame.right}`)
          .join("")}
        strokeWidth="1"
        className="stroke-rule"
      />
      {scales.ticks.map((tick) => (
        <text key={tick} x={frame.left - 8} y={scales.y(tick) + 4} textAnchor="end">
          {formatNumber(tick)}
        </text>
      ))}
      <text x={frame.left - 8} y={12} textAnchor="end" fontWeight="650">
        dB
      </text>
      {OCTAVE_BANDS.map((band, index) => (
        <text
          key={band}
          x={scales.x(band)}
          y={frame.foot + 22}
          textAnchor="middle"
          fontWeight={index === litBand ? 700 : 400}
          letterSpacing={scales.pitch < 29 ? "-0.4" : undefined}
        >
          {formatBand(band)}
        </text>
      ))}
      <text x={frame.right + 3} y={frame.foot + 22} className="fill-ink3!">
        Hz
      </text>
    </g>
  );
}

/** The resonance of the leaves on the air between them, left out where it lies below the lowest band. */
interface SwingProps {
  frequency: number;
  scales: LossScales;
  frame: Frame;
  named: boolean;
}

export function Swing({ frequency, scales, frame, named }: SwingProps) {
  const x = scales.x(frequency);
  if (x < frame.left || x > frame.right) return null;
  const lines = named ? ["the leaves swing", `together at ${withUnit(formatNumber(frequency), "Hz")}`] : [];
  const after = x < frame.left + 150;
  return (
    <g>
      <path
        d={`M${x} ${frame.top + 4}V${frame.foot}`}
        strokeWidth="1.5"
        strokeDasharray="2 3"
        className="stroke-ink"
      />
      {lines.map((line, index) => (
        <text
          key={line}
          x={x + (after ? 7 : -7)}
          y={frame.top + 14 + index * 15}
          textAnchor={after ? "start" : "end"}
          fontSize="12"
          fontWeight="600"
          paintOrder="stroke"
          strokeWidth="4"
          className="stroke-sheet"
        >
          {line}
        </text>
      ))}
    </g>
  );
}

export function LitFigure({ point, scales }: { point: LossPoint; scales: LossScales }) {
  const below = scales.y(point.loss) + 18;
  return (
    <text
      x={scales.x(point.band) + 11}
      y={below < scales.y(0) ? below : scales.y(point.loss) - 14}
      fontSize="14"
      fontWeight="650"
      paintOrder="stroke"
      strokeWidth="4"
      className="stroke-sheet"
    >
      {withUnit(wholeDecibels(point.loss), "dB")}
    </text>
  );
}

interface Ending {
  name?: string;
  point?: LossPoint;
}

/** Names at the right ends of the lines, moved apart where the lines meet. */
export function EndNames({
  scales,
  frame,
  own,
  other,
}: {
  scales: LossScales;
  frame: Frame;
  own: Ending;
  other: Ending;
}) {
  const named = [own, other].flatMap(({ name, point }, index) =>
    name && point ? [{ name, y: scales.y(point.loss), bold: index === 0 }] : [],
  );
  const sorted = named.toSorted((one, two) => one.y - two.y);
  const places = spreadApart(
    sorted.map(({ y }) => y),
    17,
    20,
    frame.foot - 6,
  );
  return sorted.map(({ name, bold }, index) => (
    <text
      key={bold ? "own" : "other"}
      x={frame.right - scales.pitch / 2 + 10}
      y={places[index]! + 4}
      fontSize="13"
      fontWeight={bold ? 650 : 400}
      className={bold ? undefined : "fill-ink2!"}
    >
      {name}
    </text>
  ));
}
