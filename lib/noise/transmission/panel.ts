import { SPEED_OF_SOUND } from "../air";
import { gaussNodes } from "./gaussNodes";

/** Width and height of the panel, m. */
export type Size = readonly [number, number];

/** Half of the sides of a wall in the laboratory, and of a pane, where no size is given. */
export const DEFAULT_PANEL: Size = [3.66, 2.44];
export const DEFAULT_PANE: Size = [1.5, 1.25];

/** Cosines of incidence and weights of the integral over a diffuse field. */
export const INCIDENCE = gaussNodes(96);
const { nodes, weights } = INCIDENCE;

/** The forced radiation of a finite panel at one frequency: q, p, h of the formula, its mean, and the weight per node. */
export type DiffuseWindow = {
  readonly q: number;
  readonly p: number;
  readonly h: number;
  readonly meanEfficiency: number;
  /** min(1, x sigma(x)) 2x dx at each of the nodes of `INCIDENCE`. */
  readonly weights: Float64Array;
};

/**
 * How much of a diffuse field's transmission a panel of this size lets through at each angle, at `frequency` Hz.
 * Davy 2009, J. Acoust. Soc. Am. 126, from memory; solver method, section 2.2. No limiting angle is used.
 */
export function diffuseWindow([width, height]: Size, frequency: number): DiffuseWindow {
  const k = (2 * Math.PI * frequency) / SPEED_OF_SOUND;
  const area = width * height;
  const halfSide = area / (width + height);
  const q = (2 * Math.PI) / (k * k * area);
  const p = Math.min(1, 1.3 * Math.sqrt(Math.PI / (2 * k * halfSide)));
  const h = 1 / Math.max(1e-6, (2 / 3) * Math.sqrt((2 * k * halfSide) / Math.PI) - 0.124);
  return { q, p, h, ...weighNodes(q, p, h) };
}

function weighNodes(q: number, p: number, h: number) {
  const alpha = h / p - 1;
  const share = new Float64Array(nodes.length);
  let meanEfficiency = 0;
  for (let i = 0; i < nodes.length; i++) {
    const x = nodes[i];
    const g = x >= p ? x : h - alpha * x;
    const sigma = 1 / Math.sqrt(g * g + q * q);
    meanEfficiency += sigma * weights[i];
    share[i] = Math.min(1, x * sigma) * 2 * x * weights[i];
  }
  return { meanEfficiency, weights: share };
}
