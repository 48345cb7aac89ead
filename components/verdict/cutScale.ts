import type { CrossCut } from "@/lib/noise/verdict";

/** Metres of the cut to pixels: one scale for both directions. */
export interface CutScale {
  perMetre: number;
  ground: number;
  x: (along: number) => number;
  y: (height: number) => number;
}

const EDGE = 6;

function topOf({ buildings, trees, listener }: CrossCut): number {
  const heights = buildings.flatMap(({ outline }) => outline.map(([, height]) => height));
  return Math.max(3, listener.height, ...heights, ...trees.map(({ height }) => height));
}

export function cutScaleOf(cut: CrossCut, width: number, room: { top: number; ground: number }): CutScale {
  const length = Math.max(1, cut.to - cut.from);
  const perMetre = Math.min((width - 2 * EDGE) / length, (room.ground - room.top) / topOf(cut));
  const left = (width - perMetre * length) / 2;
  return { perMetre, ground: room.ground, x: (along) => left + (along - cut.from) * perMetre, y: (height) => room.ground - height * perMetre };
}

export interface ScaleBar {
  metres: number;
  length: number;
  x: number;
}

const ROUND_LENGTHS = [20, 10, 5, 2, 1];
const LONGEST = 150;
const LABEL = 40;

/** The longest round bar that finds a free place on its line. */
export function scaleBarOf(perMetre: number, taken: readonly (readonly [number, number])[], width: number): ScaleBar | null {
  for (const metres of ROUND_LENGTHS.filter((length) => length * perMetre <= LONGEST)) {
    const length = metres * perMetre;
    const x = freeStretch(taken, length + LABEL, width);
    if (x !== null) return { metres, length, x };
  }
  return null;
}

/** Left end of a bar of this width, as near the middle as the taken stretches let it stand; null where none is free. */
function freeStretch(taken: readonly (readonly [number, number])[], bar: number, width: number): number | null {
  const middle = (width - bar) / 2;
  const starts = Array.from({ length: Math.max(1, Math.floor((width - bar) / 6)) }, (_, index) => index * 6);
  const free = starts.filter((start) => taken.every(([from, to]) => start + bar < from || start > to));
  return free.sort((one, other) => Math.abs(one - middle) - Math.abs(other - middle))[0] ?? null;
}
