import { scaleLinear, scaleLog } from "d3-scale";
import { area, line } from "d3-shape";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { Out } from "../../lib/noise/verdict";

export interface LossPoint {
  band: number;
  loss: number;
  doubt: number;
}

/** The bands whose loss is a number; silence and the unknown have no place on the axis. */
export function pointsOf(loss: readonly Out[], doubts: readonly number[]): LossPoint[] {
  return OCTAVE_BANDS.flatMap((band, index) => {
    const value = loss[index];
    return typeof value === "number" ? [{ band, loss: value, doubt: doubts[index] ?? 0 }] : [];
  });
}

/** Axis in twenties that holds every mark and its doubt, from 0 unless a mark lies below. */
export function axisOf(points: readonly LossPoint[]): [number, number] {
  const low = Math.min(0, ...points.map(({ loss }) => Math.floor(loss / 20) * 20));
  const high = Math.max(60, ...points.map(({ loss, doubt }) => Math.ceil((loss + doubt) / 20) * 20));
  return [low, high];
}

export interface Frame {
  left: number;
  right: number;
  top: number;
  foot: number;
}

export interface LossScales {
  x: (frequency: number) => number;
  y: (decibels: number) => number;
  ticks: number[];
  /** Pixels from band to band. */
  pitch: number;
}

/** Octave bands at equal pitch; decibels upward. */
export function lossScales({ left, right, top, foot }: Frame, [low, high]: [number, number]): LossScales {
  const first = OCTAVE_BANDS[0] / Math.SQRT2;
  const last = OCTAVE_BANDS.at(-1)! * Math.SQRT2;
  const x = scaleLog().base(2).domain([first, last]).range([left, right]);
  const y = scaleLinear().domain([low, high]).range([foot, top]);
  const ticks = Array.from({ length: (high - low) / 20 + 1 }, (_, index) => low + index * 20);
  return { x, y, ticks, pitch: (right - left) / OCTAVE_BANDS.length };
}

export function drawLine(points: readonly LossPoint[], { x, y }: LossScales): string {
  return (
    line<LossPoint>()
      .x(({ band }) => x(band))
      .y(({ loss }) => y(loss))
      .digits(1)([...points]) ?? ""
  );
}

/** One standard deviation to both sides, as far as the axis reaches. */
export function drawDoubt(points: readonly LossPoint[], { x, y, ticks }: LossScales): string {
  const low = ticks[0] ?? 0;
  const band = area<LossPoint>()
    .x((point) => x(point.band))
    .y0(({ loss, doubt }) => y(Math.max(low, loss - doubt)))
    .y1(({ loss, doubt }) => y(loss + doubt))
    .digits(1);
  return band([...points]) ?? "";
}
