import { findMaterial } from "../materials";
import { SPEED_OF_SOUND } from "../air";
import type { LeafDescription, PliedLeafDescription, PlyMaterial } from "./description";

/** One leaf as the formulas see it: mass kg/m², frequency Hz, thickness m (unknown for a leaf known only by mass). */
export type Leaf = {
  readonly mass: number;
  readonly criticalFrequency: number;
  readonly eta: number;
  readonly thickness?: number;
  /** A single ply of 40 mm or more: it bends like a thick plate. Longitudinal wave speed in m/s. */
  readonly thickPlate?: { readonly thickness: number; readonly waveSpeed: number };
  readonly isGlass: boolean;
  readonly isMasonry: boolean;
};

type Ply = {
  thickness: number;
  density: number;
  modulus: number;
  poisson: number;
  eta: number;
  family: string;
  /** Whether the fitted loss factor of gypsum boards holds: plain and fire rated board, which the measured walls have. */
  fitted: boolean;
};

const THICK_PLATE = 0.04;
const GYPSUM_ETA = 0.08; // fitted: edge and fastener friction included
const FITTED_BOARDS: readonly string[] = ["gypsum", "gypsum_x"]; // dense board is not among the measured walls
const DAMPED_ETA = 0.25; // engineering estimate, no open measurement behind it
const SCREWED_FRICTION = 1.5;

/** The leaf of a checked description. Solver method, section 2.1. */
export function leafOf(description: LeafDescription): Leaf {
  if ("plies" in description) return layLeaf(description);
  return {
    mass: description.m,
    criticalFrequency: description.fc,
    eta: description.eta,
    isGlass: false,
    isMasonry: false,
  };
}

function layLeaf({ plies: pairs, bond, eta }: PliedLeafDescription): Leaf {
  const plies = pairs.map(([material, thickness]) => plyOf(material, thickness));
  const mass = plies.reduce((sum, ply) => sum + ply.density * ply.thickness, 0);
  const stiffness =
    bond === "glued" ? gluedStiffness(plies) : plies.reduce((sum, ply) => sum + bendingStiffness(ply), 0);
  const thickness = plies.reduce((sum, ply) => sum + ply.thickness, 0);
  const only = plies.length === 1 && thickness >= THICK_PLATE ? plies[0] : undefined;
  return {
    mass,
    criticalFrequency: (SPEED_OF_SOUND ** 2 / (2 * Math.PI)) * Math.sqrt(mass / stiffness),
    eta: eta ?? lossFactorOf(plies, bond),
    thickness,
    ...(only && { thickPlate: { thickness, waveSpeed: waveSpeedOf(only) } }),
    isGlass: plies.every(({ family }) => family === "glass"),
    isMasonry: only !== undefined && (only.family === "masonry" || only.family === "own"),
  };
}

function plyOf(material: PlyMaterial, thickness: number): Ply {
  if (typeof material !== "string") {
    const { rho, E, nu, eta } = material;
    return { thickness, density: rho, modulus: E, poisson: nu, eta, family: "own", fitted: false };
  }
  const record = findMaterial(material);
  if (!record) throw new Error(`no material is called "${material}"`);
  const { density, youngsModulus, poissonRatio, lossFactor, family } = record;
  return {
    thickness,
    density,
    modulus: youngsModulus,
    poisson: poissonRatio,
    eta: lossFactor,
    family,
    fitted: FITTED_BOARDS.includes(material),
  };
}

function bendingStiffness({ modulus, thickness, poisson }: Ply): number {
  return (modulus * thickness ** 3) / (12 * (1 - poisson ** 2));
}

/** Full composite section about the common neutral axis, weights E/(1 - nu²). */
function gluedStiffness(plies: readonly Ply[]): number {
  let depth = 0;
  let weight = 0;
  let moment = 0;
  let aboutTop = 0;
  for (const { modulus, poisson, thickness } of plies) {
    const plate = modulus / (1 - poisson ** 2);
    const middle = depth + thickness / 2;
    weight += plate * thickness;
    moment += plate * thickness * middle;
    aboutTop += plate * (thickness ** 3 / 12 + thickness * middle ** 2);
    depth += thickness;
  }
  return aboutTop - moment ** 2 / weight;
}

function lossFactorOf(plies: readonly Ply[], bond: PliedLeafDescription["bond"]): number {
  if (bond === "damped" && plies.length > 1) return DAMPED_ETA;
  if (plies.some(({ fitted }) => fitted)) return GYPSUM_ETA;
  const weights = plies.map(({ modulus, thickness }) => modulus * thickness ** 3);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const mean = plies.reduce((sum, { eta }, i) => sum + eta * weights[i], 0) / total;
  return bond === "screwed" && plies.length > 1 ? mean * SCREWED_FRICTION : mean;
}

function waveSpeedOf({ modulus, density, poisson }: Ply): number {
  return Math.sqrt(modulus / (density * (1 - poisson ** 2)));
}

/** Critical frequency that counts at `frequency`, Hz. Thick plates: EN 12354-1 Annex B, from memory. */
export function criticalFrequencyAt({ criticalFrequency, thickPlate }: Leaf, frequency: number): number {
  if (!thickPlate) return criticalFrequency;
  const { thickness, waveSpeed } = thickPlate;
  const plateau = waveSpeed / (5.5 * thickness);
  if (frequency >= plateau) return 2 * criticalFrequency * (frequency / plateau) ** 3;
  const y = (4.05 * thickness * frequency) / waveSpeed;
  return criticalFrequency * (y + Math.sqrt(1 + y * y));
}

/** Loss factor with the losses at the edges, EN 12354-1 Annex C form, from memory. */
export function totalLossFactor({ eta, mass }: Leaf, frequency: number): number {
  return eta + mass / (485 * Math.sqrt(frequency));
}
