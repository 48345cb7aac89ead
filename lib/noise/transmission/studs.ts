import { ADIABATIC_BULK_MODULUS, ISOTHERMAL_BULK_MODULUS, SPEED_OF_SOUND } from "../air";
import type { Cavity } from "./fluid";
import type { Leaf } from "./leaf";

/** Impedance per area of the boards between stiff studs acting as a spring beside the cavity, N s/m³. */
export type StudSpring = { readonly real: number; readonly imaginary: number };

const SPRING_LOSS = 0.1;
const STRIP_FACTOR = 2; // fitted

function reducedOf(first: number, second: number): number {
  return (first * second) / (first + second);
}

function airStiffness({ depth, fill }: Cavity): number {
  return (fill > 0 ? ISOTHERMAL_BULK_MODULUS : ADIABATIC_BULK_MODULUS) / depth;
}

/** Frequency at which two leaves swing together on the air between them, Hz. */
export function massAirMass(leaf1: Leaf, leaf2: Leaf, cavity: Cavity): number {
  return Math.sqrt(airStiffness(cavity) / reducedOf(leaf1.mass, leaf2.mass)) / (2 * Math.PI);
}

/** Stiffness per area of the board strips between studs at `spacing` m, N/m³. Solver method, section 2.6 (factor fitted). */
export function studStiffness(leaf1: Leaf, leaf2: Leaf, spacing: number): number {
  return reducedOf(stripStiffness(leaf1, spacing), stripStiffness(leaf2, spacing));
}

function stripStiffness({ mass, criticalFrequency }: Leaf, spacing: number): number {
  const rootOfStiffnessPerMass = SPEED_OF_SOUND ** 2 / (2 * Math.PI * criticalFrequency); // sqrt(B/m)
  const frequency = STRIP_FACTOR * (Math.PI / (2 * spacing ** 2)) * rootOfStiffnessPerMass;
  return mass * (2 * Math.PI * frequency) ** 2;
}

/** Mass-air-mass resonance lifted by stiff studs, Hz. */
export function studResonance(leaf1: Leaf, leaf2: Leaf, cavity: Cavity & { stiffness: number }): number {
  const stiffness = cavity.stiffness + airStiffness(cavity);
  return Math.sqrt(stiffness / reducedOf(leaf1.mass, leaf2.mass)) / (2 * Math.PI);
}

/** That spring at `frequency` Hz: stiffness per area in N/m³, faded out above the resonance in Hz. Solver method, 2.6. */
export function studSpring(stiffness: number, resonance: number, frequency: number): StudSpring {
  const size = stiffness / (2 * Math.PI * frequency * (1 + (frequency / resonance) ** 4));
  return { real: SPRING_LOSS * size, imaginary: -size };
}

/** Below the resonance the spring carries what the bridge would; the share left to the bridge, 0 to 1. */
export function bridgeShare(resonance: number, frequency: number): number {
  return 1 / (1 + (resonance / frequency) ** 4);
}
