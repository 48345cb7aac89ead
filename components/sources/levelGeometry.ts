import { OCTAVE_BANDS } from "@/lib/noise/bands";

type Level = number | "silent" | null;

/** Measures of the chart of one source, pixels: levels over, shares of the energy beneath. */
export interface LevelFrame {
  width: number;
  left: number;
  right: number;
  top: number;
  foot: number;
  sharesTop: number;
  sharesFoot: number;
  height: number;
  /** Whether the lines bear their names at their right ends. */
  named: boolean;
}

/** Below this width names leave the drawing. */
const ROOM_FOR_NAMES = 560;

export function frameOf(width: number): LevelFrame {
  const named = width >= ROOM_FOR_NAMES;
  const foot = named ? 292 : 228;
  const sharesTop = foot + (named ? 42 : 56);
  const sharesFoot = sharesTop + (named ? 90 : 76);
  return { width, left: 36, right: width - (named ? 104 : 22), top: 30, foot, sharesTop, sharesFoot, height: sharesFoot + 26, named };
}

export interface LevelScales {
  pitch: number;
  x: (index: number) => number;
  y: (level: number) => number;
  ticks: number[];
  low: number;
}

/** What an axis spans at least and at most, dB. */
const LEAST_SPAN = 40;
const MOST_SPAN = 70;

/** Octaves at equal pitch; decibels in tens round every bead with its doubt, and as much of what is `counted` as 70 dB hold. */
export function levelScales({ left, right, top, foot }: LevelFrame, levels: readonly Level[], doubts: readonly number[], counted: readonly Level[]): LevelScales {
  const marks = levels.flatMap((level, i) => (typeof level === "number" ? [level + (doubts[i] ?? 0), level - (doubts[i] ?? 0)] : []));
  const high = Math.ceil((Math.max(0, ...(marks.length > 0 ? marks : [80])) + 4) / 10) * 10;
  const least = Math.min(...marks, ...counted.filter((level) => typeof level === "number"), high);
  const low = Math.max(high - MOST_SPAN, Math.min(high - LEAST_SPAN, Math.floor((least - 4) / 10) * 10));
  const pitch = (right - left) / OCTAVE_BANDS.length;
  const ticks = Array.from({ length: (high - low) / 10 + 1 }, (_, i) => low + 10 * i);
  return { pitch, low, ticks, x: (index) => left + (index + 0.5) * pitch, y: (level) => top + ((high - level) / (high - low)) * (foot - top) };
}

/** A line through the bands that have a figure on the axis; a gap where one has none. */
export function drawThrough(levels: readonly Level[], { x, y, low }: LevelScales): string {
  let path = "";
  let drawn = false;
  levels.forEach((level, i) => {
    const there = typeof level === "number" && level >= low;
    if (there) path += `${drawn ? "L" : "M"}${x(i).toFixed(1)} ${y(level).toFixed(1)}`;
    drawn = there;
  });
  return path;
}
