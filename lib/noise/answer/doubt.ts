import { BAND_COUNT } from "../bands";
import { weightedSum } from "../levels";
import { OUTDOOR_DEVIATION } from "../model/deviations";
import type { Part, Parts } from "../sound/parts";
import type { ReceiverVerdict } from "../verdict";

/** Read once: a loop would ask the other module at every turn. */
const BANDS = BAND_COUNT;

/** Doubt of a level without any energy to judge by, dB. */
const NO_ENERGY = 3;

function deviationOf({ element, source, what }: Part, band: number): number {
  if (what === "source") return source ? source.deviations[band] : 0;
  return element ? element.deviations[band] : 0;
}

type Doubt = ReceiverVerdict["doubts"][number];

function basisOf({ element, source, what }: Part, band: number): string {
  if (what === "source") return source ? source.source.basis : "";
  return element ? element.bases[band] : "";
}

/** Parts that carry a deviation: sources, leaving elements, elements of entry (solver method 2.9). */
function carriers({ sources, ways, entering }: Parts): Part[] {
  return [...sources, ...ways.filter(({ what, element }) => what === "leaving" && element), ...entering];
}

/** One standard deviation of a listener's level per band, dB: root of the summed squares of share times deviation. */
export function doubtsOf(parts: Parts, energy: Float64Array): Float64Array {
  const squares = new Float64Array(BANDS);
  for (const part of carriers(parts)) {
    for (let band = 0; band < BANDS; band += 1)
      squares[band] += (part.energy[band] * deviationOf(part, band)) ** 2;
  }
  return squares.map((sum, band) => {
    if (energy[band] === 0) return NO_ENERGY;
    return Math.sqrt(sum + (parts.outdoors[band] * OUTDOOR_DEVIATION) ** 2) / energy[band];
  });
}

/** The parts of the doubt at a band, dB, largest first; they add as squares. */
export function doubtParts(parts: Parts, energy: Float64Array, band: number): Doubt[] {
  const whole = energy[band];
  if (whole === 0) return [];
  const carried = carriers(parts).map((part): Doubt => ({
    what: part.what,
    partId: part.id,
    name: part.name,
    basis: basisOf(part, band),
    decibels: (part.energy[band] / whole) * deviationOf(part, band),
  }));
  const outdoors = (parts.outdoors[band] / whole) * OUTDOOR_DEVIATION;
  const travel: Doubt = {
    what: "outdoors",
    partId: null,
    name: "the way outdoors",
    basis: "calculated",
    decibels: outdoors,
  };
  return [...carried, travel].filter(({ decibels }) => decibels > 0).sort((a, b) => b.decibels - a.decibels);
}

/** Doubt of a weighted total, dB: the energy-weighted mean over bands (solver method 2.9). */
export function weightedDoubt(doubts: Float64Array, energy: Float64Array, factors: Float64Array): number {
  const whole = weightedSum(energy, factors);
  const weighted = factors.map((factor, band) => doubts[band] * factor);
  return whole > 0 ? weightedSum(energy, weighted) / whole : NO_ENERGY;
}
