import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { WidthClass } from "../ui/widthClass";
import { isNumber, type Column } from "./columns";

/** Measures of the charts for one width class, pixels. */
export interface ChartForm {
  left: number;
  /** Room for the drop ruler. */
  ruler: number;
  /** Width of the column of the weighted whole. */
  whole: number;
  perDecibel: number;
  sharesHeight: number;
  figure: number;
}

/** `left`, `ruler` and `whole` are repeated as column widths in FiguresTable, so that the table stands under the chart. */
export const chartForms: Record<WidthClass, ChartForm> = {
  390: { left: 32, ruler: 4, whole: 44, perDecibel: 3.2, sharesHeight: 104, figure: 16 },
  720: { left: 84, ruler: 52, whole: 76, perDecibel: 4.4, sharesHeight: 130, figure: 19 },
  1024: { left: 84, ruler: 52, whole: 76, perDecibel: 5, sharesHeight: 150, figure: 20 },
  1440: { left: 84, ruler: 52, whole: 76, perDecibel: 4.14, sharesHeight: 122, figure: 20 },
};

export const promisedWidths: Record<WidthClass, number> = { 390: 334, 720: 640, 1024: 924, 1440: 710 };

export interface Slot {
  x: number;
  width: number;
}

const HALF_OCTAVE = Math.SQRT2;

// A scale library would bring its interpolation of colours to every reader of this page; two mappings need none of it.
/** Base-2 logarithmic mapping of [low, high] to [left, right]: an octave is one pitch. */
function octaveScale([low, high]: readonly [number, number], [left, right]: readonly [number, number]): (band: number) => number {
  return (band) => left + ((right - left) * Math.log2(band / low)) / Math.log2(high / low);
}

/** Middle and width of each column: octave bands on a logarithmic axis of base 2, the whole to their right. */
export function placeColumns(columns: readonly Column[], form: ChartForm, width: number): Slot[] {
  const whole = columns.some((column) => column.index === null) ? form.whole : 0;
  const right = width - form.ruler - whole;
  const low = OCTAVE_BANDS[0] / HALF_OCTAVE;
  const high = OCTAVE_BANDS[OCTAVE_BANDS.length - 1]! * HALF_OCTAVE;
  const scale = octaveScale([low, high], [form.left, right]);
  const pitch = (right - form.left) / OCTAVE_BANDS.length;
  return columns.map(({ band }) => (band === null ? { x: right + whole / 2, width: whole } : { x: scale(band), width: pitch }));
}

/** Below this a level is drawn at the foot of the chart with a chevron: far under anything that can be heard. */
export const LOWEST_DRAWN = -20;

export interface LevelAxis {
  low: number;
  high: number;
  height: number;
  y: (decibels: number) => number;
  ticks: number[];
}

/** What stands above the highest mark, pixels; marks at the lowest line have the foot of the chart for theirs. */
const HEAD_ROOM = 16;

/** 0 to 70 dB, extended in tens until every mark has room for its label. */
export function levelAxisOf(values: readonly number[], form: ChartForm, top: number): LevelAxis {
  const most = Math.max(...values, 0) + HEAD_ROOM / form.perDecibel;
  const least = Math.max(Math.min(...values, 0), LOWEST_DRAWN);
  const high = Math.max(70, Math.ceil(most / 10) * 10);
  const low = Math.floor(least / 10) * 10;
  const height = (high - low) * form.perDecibel;
  const ticks = Array.from({ length: (high - low) / 10 + 1 }, (_, index) => low + 10 * index);
  return { low, high, height, y: (decibels) => top + (high - Math.max(decibels, LOWEST_DRAWN)) * form.perDecibel, ticks };
}

export function drawnValues(columns: readonly Column[]): number[] {
  return columns.flatMap(({ counted, known, limit }) => (limit === null ? [counted] : [counted, known, limit])).filter(isNumber);
}
