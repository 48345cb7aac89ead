import { scaleLinear, scaleLog } from "d3-scale";
import { line } from "d3-shape";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { Out } from "@/lib/noise/verdict";

export interface Frame {
  left: number;
  right: number;
  top: number;
  foot: number;
}

export interface DecayScales {
  x: (frequency: number) => number;
  y: (seconds: number) => number;
  ticks: number[];
  /** Pixels from band to band. */
  pitch: number;
}

const ROOM_ABOVE = 1.12;
const STEPS = [0.1, 0.2, 0.5, 1, 2, 5, 10];

/** Seconds from nought, so that every mark is held; octave bands at equal pitch. */
export function decayScales({ left, right, top, foot }: Frame, longest: number): DecayScales {
  const step = STEPS.find((one) => (longest * ROOM_ABOVE) / one <= 5) ?? 10;
  const most = Math.max(step, Math.ceil((longest * ROOM_ABOVE) / step) * step);
  const first = OCTAVE_BANDS[0] / Math.SQRT2;
  const last = OCTAVE_BANDS.at(-1)! * Math.SQRT2;
  return {
    x: scaleLog().base(2).domain([first, last]).range([left, right]),
    y: scaleLinear().domain([0, most]).range([foot, top]),
    ticks: Array.from({ length: Math.round(most / step) + 1 }, (_, index) => Number((index * step).toFixed(1))),
    pitch: (right - left) / OCTAVE_BANDS.length,
  };
}

/** A line over the bands whose figure is known; it breaks where one is not. */
export function drawDecay(decay: readonly Out[], { x, y }: DecayScales): string {
  return (
    line<Out>()
      .defined((seconds) => typeof seconds === "number")
      .x((_, index) => x(OCTAVE_BANDS[index]!))
      .y((seconds) => y(seconds as number))
      .digits(1)([...decay]) ?? ""
  );
}

export const longestOf = (...rows: readonly (readonly Out[])[]): number =>
  Math.max(0.3, ...rows.flat().flatMap((seconds) => (typeof seconds === "number" ? [seconds] : [])));
