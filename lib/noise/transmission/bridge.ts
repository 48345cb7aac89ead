import { AIR_DENSITY, SPEED_OF_SOUND as c } from "../air";
import type { Connection } from "./description";
import { criticalFrequencyAt, type Leaf } from "./leaf";
import type { DiffuseWindow } from "./panel";

type LineKind = Exclude<Connection["kind"], "clips" | "none">;

/** Mobility of a line connection per metre, m²/(N s). Fitted to the open measurements. */
const LINE_MOBILITY: Record<LineKind, number> = {
  wood_stud: 6.0e-4,
  steel_stud: 1.1e-3,
  resilient_channel: 2.0e-3,
  staggered: 2.8e-3,
  double_stud: 6.0e-3,
};

const CLIP_COMPLIANCE = 3e-6; // m/N per clip, one rating behind it
const POINT_FACTOR = 3;

/** A leaf beside a connection, at one frequency: how strongly sound moves it, and its critical frequency there. */
export type BridgedLeaf = { readonly leaf: Leaf; readonly drive: number; readonly criticalFrequency: number };

/**
 * `tauLeaf` is the forced transmission of that leaf alone. Its drive is N of the solver method, section 2.5.
 */
export function bridgedLeaf(
  leaf: Leaf,
  tauLeaf: number,
  frequency: number,
  window: DiffuseWindow,
): BridgedLeaf {
  const criticalFrequency = criticalFrequencyAt(leaf, frequency);
  const ratio = frequency / criticalFrequency;
  const limit = ratio > 1 ? 1 / Math.sqrt(Math.max(1e-3, 1 - 1 / ratio)) : Infinity;
  const radiation = Math.min(window.meanEfficiency, limit);
  return { leaf, criticalFrequency, drive: tauLeaf / (1 - Math.min(tauLeaf, 0.5)) / radiation };
}

/** Size of a leaf's impedance along a line, N s/m². Cremer, Heckl and Ungar, Structure-Borne Sound, from memory. */
export function lineImpedance({ leaf, criticalFrequency }: BridgedLeaf, frequency: number): number {
  return 2 * Math.SQRT2 * leaf.mass * c * Math.sqrt(frequency / criticalFrequency);
}

function pointImpedance({ leaf, criticalFrequency }: BridgedLeaf): number {
  return (4 * c ** 2 * leaf.mass) / (Math.PI * criticalFrequency);
}

/**
 * Transmission coefficient through the connections between two leaves, at `frequency` Hz. Lines: Davy 1991 as printed
 * in Vigran, Building Acoustics, eq. 8.27, in the form of the solver method, 2.4; points: 2.5.
 */
export function bridgeTransmission(
  pair: readonly [BridgedLeaf, BridgedLeaf],
  connection: Connection,
  frequency: number,
): number {
  if (connection.kind === "none") return 0;
  if (connection.kind === "clips") return pointBridge(pair, connection.n, frequency);
  return lineBridge(pair, LINE_MOBILITY[connection.kind], { spacing: connection.spacing, frequency });
}

type Lines = { spacing: number; frequency: number };

function lineBridge(
  [one, two]: readonly [BridgedLeaf, BridgedLeaf],
  mobility: number,
  { spacing, frequency }: Lines,
) {
  // Z is real times (1 + j), so that 1/Z has equal parts of opposite sign.
  const part = Math.SQRT1_2 * (1 / lineImpedance(one, frequency) + 1 / lineImpedance(two, frequency));
  const opposing = part ** 2 + (mobility - part) ** 2;
  const boost = 1 + 1.5 * Math.min(1, 0.08 / Math.sqrt(one.leaf.eta * two.leaf.eta));
  const coupling = (Math.PI * frequency) / (8 * AIR_DENSITY ** 2 * c ** 3 * spacing);
  return (boost * one.drive * two.drive * coupling) / opposing;
}

function pointBridge(
  [one, two]: readonly [BridgedLeaf, BridgedLeaf],
  perArea: number,
  frequency: number,
): number {
  const mobility = 1 / pointImpedance(one) + 1 / pointImpedance(two);
  const opposing = mobility ** 2 + (2 * Math.PI * frequency * CLIP_COMPLIANCE) ** 2;
  const coupling = (perArea * Math.PI * frequency ** 2) / (4 * AIR_DENSITY ** 2 * c ** 4);
  return (POINT_FACTOR * one.drive * two.drive * coupling) / opposing;
}
