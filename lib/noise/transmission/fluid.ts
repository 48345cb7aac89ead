import { AIR_IMPEDANCE, SPEED_OF_SOUND } from "../air";

/** A layer of fluid at one frequency: thickness m, wavenumber 1/m and impedance N s/m³ as real and imaginary parts. */
export type FluidLayer = {
  readonly thickness: number;
  readonly wavenumber: readonly [number, number];
  readonly impedance: readonly [number, number];
};

/** What lies between two leaves: depth and fill in m, flow resistivity of the fill in N s/m⁴. */
export type Cavity = { readonly depth: number; readonly fill: number; readonly flowResistivity: number };

const THINNEST_REST = 0.002;
const LOSS_BESIDE_FILL = 0.02;

/** The layers of a cavity from leaf 1 on, at `frequency` Hz: the fill first, then what air is left. Solver method, 2.3. */
export function cavityLayers({ depth, fill, flowResistivity }: Cavity, frequency: number): FluidLayer[] {
  if (fill === 0) return [airLayer(depth, frequency, emptyCavityLoss(frequency))];
  const rest = depth - fill;
  const wool = fillLayer(fill, frequency, flowResistivity);
  return rest > THINNEST_REST ? [wool, airLayer(rest, frequency, LOSS_BESIDE_FILL)] : [wool];
}

/** Fitted: what studs, frames and glazing bars take from the air of an empty cavity. */
function emptyCavityLoss(frequency: number): number {
  return Math.min(1, 0.06 * (500 / frequency) ** 1.3);
}

function airLayer(thickness: number, frequency: number, loss: number): FluidLayer {
  const k = (2 * Math.PI * frequency) / SPEED_OF_SOUND;
  return {
    thickness,
    wavenumber: [k, (-k * loss) / 2],
    impedance: [AIR_IMPEDANCE, (-AIR_IMPEDANCE * loss) / 2],
  };
}

/** Fibrous fill: Miki 1990, J. Acoust. Soc. Jpn (E) 11, from memory. */
function fillLayer(thickness: number, frequency: number, flowResistivity: number): FluidLayer {
  const ratio = (1000 * frequency) / flowResistivity;
  const forImpedance = ratio ** -0.632;
  const forWavenumber = ratio ** -0.618;
  const k = (2 * Math.PI * frequency) / SPEED_OF_SOUND;
  return {
    thickness,
    wavenumber: [k * (1 + 7.81 * forWavenumber), -k * 11.41 * forWavenumber],
    impedance: [AIR_IMPEDANCE * (1 + 5.5 * forImpedance), -AIR_IMPEDANCE * 8.43 * forImpedance],
  };
}
