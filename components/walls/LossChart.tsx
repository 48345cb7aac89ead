"use client";

import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { Out } from "../../lib/noise/verdict";
import { bandWords, wholeDecibels } from "../format";
import { axisOf, drawDoubt, drawLine, lossScales, pointsOf, type LossPoint } from "./lossGeometry";
import { LossKey } from "./LossKey";
import { EndNames, Grid, LitColumn, LitFigure, Swing } from "./LossMarks";
import { useDrawnWidth } from "../ui/useDrawnWidth";

interface Props {
  /** Of the element as it stands: "this wall". */
  name: string;
  loss: readonly Out[];
  doubts: readonly number[];
  /** Dashed beside it: what stood here before, or what is about to be chosen. */
  other?: { name: string; loss: readonly Out[] };
  /** Hz; marked where the two leaves move against each other on the air between them. */
  massAirMass: number | null;
  /** Index of the lit band. */
  litBand: number;
}

const PROMISED = { 390: 334, 720: 540, 1024: 280, 1440: 420 };
const HEIGHT = 330;
/** Below this width the names leave the drawing for a key above it: the bands need all of it for theirs. */
const ROOM_FOR_NAMES = 400;

/** What an element stops, band by band, with its doubt, beside what it is compared with. */
export function LossChart(props: Props) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(PROMISED, 560);
  return (
    <div ref={place} className="min-w-0">
      {width < ROOM_FOR_NAMES && <LossKey {...props} other={props.other?.name} />}
      <Drawing {...props} width={width} named={width >= ROOM_FOR_NAMES} />
    </div>
  );
}

interface DrawingProps extends Props {
  width: number;
  /** Whether the lines bear their names themselves. */
  named: boolean;
}

function Drawing({ name, loss, doubts, other, massAirMass, litBand, width, named }: DrawingProps) {
  const points = pointsOf(loss, doubts);
  const compared = other ? pointsOf(other.loss, []) : [];
  const frame = { left: 36, right: width - (named ? 78 : 22), top: 26, foot: HEIGHT - 34 };
  const scales = lossScales(frame, axisOf([...points, ...compared]));
  const lit = points.find(({ band }) => band === OCTAVE_BANDS[litBand]);
  return (
    <svg
      width={width}
      height={HEIGHT}
      viewBox={`0 0 ${width} ${HEIGHT}`}
      role="img"
      aria-label={describeLoss(name, points, other?.name)}
      className="block max-w-full"
    >
      <LitColumn x={scales.x(OCTAVE_BANDS[litBand]!)} pitch={scales.pitch} frame={frame} />
      <Grid scales={scales} frame={frame} litBand={litBand} />
      <path d={drawDoubt(points, scales)} className="fill-ink" fillOpacity="0.13" />
      {massAirMass !== null && (
        <Swing frequency={massAirMass} scales={scales} frame={frame} named={named} />
      )}
      <path
        d={drawLine(compared, scales)}
        fill="none"
        strokeWidth="1.6"
        strokeDasharray="5 4"
        className="stroke-ink2"
      />
      <path
        d={drawLine(points, scales)}
        fill="none"
        strokeWidth="2.4"
        strokeLinejoin="round"
        className="stroke-ink"
      />
      {points.map((point) => (
        <circle
          key={point.band}
          cx={scales.x(point.band)}
          cy={scales.y(point.loss)}
          r={4}
          strokeWidth="1.8"
          className={point === lit ? "fill-lamp stroke-ink" : "fill-sheet stroke-ink"}
        />
      ))}
      {lit && <LitFigure point={lit} scales={scales} />}
      {named && (
        <EndNames
          scales={scales}
          frame={frame}
          own={{ name, point: points.at(-1) }}
          other={{ name: other?.name, point: compared.at(-1) }}
        />
      )}
    </svg>
  );
}

function describeLoss(name: string, points: readonly LossPoint[], other?: string): string {
  const first = points[0];
  const last = points.at(-1);
  if (!first || !last) return `What ${name} stops is not known in any band.`;
  const rising = `${wholeDecibels(first.loss)} decibels at ${bandWords(first.band)}, ${wholeDecibels(last.loss)} at ${bandWords(last.band)}`;
  return `What ${name} stops per octave band: ${rising}${other ? `; dashed: ${other}` : ""}.`;
}
