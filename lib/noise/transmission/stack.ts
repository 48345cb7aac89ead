import { AIR_IMPEDANCE, SPEED_OF_SOUND } from "../air";
import type { FluidLayer } from "./fluid";
import { criticalFrequencyAt, totalLossFactor, type Leaf } from "./leaf";
import {
  addSpring,
  multiplyInto,
  setLayer,
  transmissionThrough,
  type Impedance,
  type Matrix,
} from "./matrix";
import { INCIDENCE, type DiffuseWindow } from "./panel";
import type { StudSpring } from "./studs";

/** Impedance of a leaf without its angle: Z = resistance s⁴ + j (mass - bending s⁴), s the sine of incidence. */
type LeafImpedance = { mass: number; bending: number; resistance: number };

function leafImpedance(leaf: Leaf, frequency: number): LeafImpedance {
  const mass = 2 * Math.PI * frequency * leaf.mass;
  const bending = mass * (frequency / criticalFrequencyAt(leaf, frequency)) ** 2;
  return { mass, bending, resistance: bending * totalLossFactor(leaf, frequency) };
}

/** The impedance at the cosine of incidence `x`. */
function impedanceAt({ mass, bending, resistance }: LeafImpedance, x: number): Impedance {
  const sine4 = (1 - x * x) ** 2;
  return { real: resistance * sine4, imaginary: mass - bending * sine4 };
}

/**
 * Transmission coefficient of one leaf alone in a diffuse field, forced waves only (0 to 1), at `frequency` Hz.
 * Solver method, equation 2.3.
 */
export function leafTransmission(leaf: Leaf, frequency: number, window: DiffuseWindow): number {
  const impedance = leafImpedance(leaf, frequency);
  let tau = 0;
  for (let i = 0; i < INCIDENCE.nodes.length; i++) {
    const x = INCIDENCE.nodes[i];
    const z = impedanceAt(impedance, x);
    const scale = x / (2 * AIR_IMPEDANCE);
    const real = 1 + z.real * scale;
    const imaginary = z.imaginary * scale;
    tau += window.weights[i] / (real * real + imaginary * imaginary);
  }
  return tau;
}

export type Stack = {
  readonly leaf1: Leaf;
  readonly leaf2: Leaf;
  readonly layers: readonly FluidLayer[];
  readonly spring?: StudSpring;
};

/**
 * Transmission coefficient of two leaves and what lies between them in a diffuse field, without bridges (0 to 1).
 * Solver method, sections 2.2 and 2.3.
 */
export function stackTransmission(stack: Stack, frequency: number, window: DiffuseWindow): number {
  const first = leafImpedance(stack.leaf1, frequency);
  const second = leafImpedance(stack.leaf2, frequency);
  const k = (2 * Math.PI * frequency) / SPEED_OF_SOUND;
  const block = new Float64Array(8);
  const scratch = new Float64Array(8);
  let tau = 0;
  for (let i = 0; i < INCIDENCE.nodes.length; i++) {
    const x = INCIDENCE.nodes[i];
    fillBlock(block, scratch, stack.layers, k * k * (1 - x * x));
    if (stack.spring) addSpring(block, stack.spring);
    tau +=
      window.weights[i] *
      transmissionThrough(block, impedanceAt(first, x), impedanceAt(second, x), AIR_IMPEDANCE / x);
  }
  return tau;
}

function fillBlock(block: Matrix, scratch: Matrix, layers: readonly FluidLayer[], kx2: number): void {
  setLayer(block, layers[0], kx2);
  for (let i = 1; i < layers.length; i++) {
    setLayer(scratch, layers[i], kx2);
    multiplyInto(block, scratch);
  }
}
