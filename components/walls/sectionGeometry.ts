import type { SheetLayer } from "../../lib/noise/sheet";
import { spreadApart } from "./spreadApart";

/** A layer with its place in a drawing, px. */
export interface Strip {
  layer: SheetLayer;
  /** Number of its balloon and of its row in the table. */
  number: number;
  x: number;
  width: number;
}

/** Compound has no thickness of its own in the records; it is drawn as a line on the joint. */
const depthOf = (layer: SheetLayer) => layer.thickness ?? 0;

export const wholeThickness = (layers: readonly SheetLayer[]): number =>
  layers.reduce((sum, layer) => sum + depthOf(layer), 0);

/** Lays the layers side by side from `left`; `scale` is pixels to a metre. */
export function placeLayers(layers: readonly SheetLayer[], left: number, scale: number): Strip[] {
  let x = left;
  return layers.map((layer, index) => {
    const width = depthOf(layer) * scale;
    const strip = { layer, number: index + 1, x, width };
    x += width;
    return strip;
  });
}

export const BALLOON = 11;

/** Centres of the balloons: over their layers where there is room, moved aside where they would touch. */
export function placeBalloons(strips: readonly Strip[], low: number, high: number): number[] {
  return spreadApart(
    strips.map(({ x, width }) => x + width / 2),
    2 * BALLOON + 3,
    low + BALLOON,
    high - BALLOON,
  );
}

/** The layer a break line kinks over: a gap where one is wide enough, else the widest layer. */
export function breakOver(strips: readonly Strip[]): Strip {
  const gaps = strips.filter(({ layer, width }) => layer.look === "gap" && width > 34);
  return (gaps.length > 0 ? gaps : strips).reduce((most, strip) => (strip.width > most.width ? strip : most));
}

const SCALES_OF_BAR = [0.5, 0.2, 0.1, 0.05, 0.02, 0.01];

/** The longest round length, m, that is at most this many pixels. */
export function barLength(scale: number, most: number): number {
  return SCALES_OF_BAR.find((length) => length * scale <= most) ?? SCALES_OF_BAR.at(-1)!;
}
