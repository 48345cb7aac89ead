import { AIR_IMPEDANCE, SPEED_OF_SOUND as c } from "../air";
import { criticalFrequencyAt, totalLossFactor, type Leaf } from "./leaf";
import type { Size } from "./panel";

const PI = Math.PI;

/**
 * Radiation efficiency (0 to 2) of the free bending waves of a panel at `frequency` Hz, below 0.9 of its critical
 * frequency. EN 12354-1 Annex B, from memory; solver method, section 2.4.
 */
export function freeRadiation([width, height]: Size, criticalFrequency: number, frequency: number): number {
  const longer = Math.max(width, height);
  const shorter = Math.min(width, height);
  const first = (c ** 2 / (4 * criticalFrequency)) * (1 / longer ** 2 + 1 / shorter ** 2);
  const small = 4 * longer * shorter * (frequency / c) ** 2;
  const large = Math.sqrt((2 * PI * frequency * (longer + shorter)) / (16 * c));
  if (first > criticalFrequency / 2) return Math.min(2, small, large);
  const sigma = modalRadiation({ longer, shorter, criticalFrequency, frequency });
  return Math.min(2, frequency < first ? Math.min(sigma, small) : sigma);
}

type Modes = { longer: number; shorter: number; criticalFrequency: number; frequency: number };

function modalRadiation({ longer, shorter, criticalFrequency: fc, frequency }: Modes): number {
  const ratio = Math.sqrt(frequency / fc);
  const rest = 1 - ratio ** 2;
  const edges = (rest * Math.log((1 + ratio) / (1 - ratio)) + 2 * ratio) / (4 * PI ** 2 * rest ** 1.5);
  const perimeter = ((2 * (longer + shorter)) / (longer * shorter)) * (c / fc) * edges;
  if (frequency >= fc / 2) return perimeter;
  const corners =
    (8 * c ** 2 * (1 - 2 * ratio ** 2)) / (fc ** 2 * PI ** 4 * longer * shorter * ratio * Math.sqrt(rest));
  return perimeter + corners;
}

/**
 * Transmission coefficient of the free waves of an element of one leaf, to be added to the forced part; 0 from 0.9 of
 * the critical frequency on. EN 12354-1 Annex B, from memory; solver method, section 2.4.
 */
export function resonantTransmission(leaf: Leaf, size: Size, frequency: number): number {
  const fc = criticalFrequencyAt(leaf, frequency);
  if (frequency >= 0.9 * fc) return 0;
  const [width, height] = size;
  const shape = (width + height) ** 2 / (width ** 2 + height ** 2);
  const massLaw = ((2 * AIR_IMPEDANCE) / (2 * PI * frequency * leaf.mass)) ** 2;
  const sigma = freeRadiation(size, fc, frequency);
  return (massLaw * shape * Math.sqrt(fc / frequency) * sigma ** 2) / totalLossFactor(leaf, frequency);
}
