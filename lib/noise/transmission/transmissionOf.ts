import { exactMidband, OCTAVE_BANDS, THIRD_BANDS } from "../bands";
import { levelOf } from "../levels";
import type { Description } from "./description";
import { modelOf, type Model, type TransmissionFacts } from "./modelOf";

export type Transmission = {
  /** dB at `THIRD_BANDS`. */
  readonly third: readonly number[];
  /** dB at `OCTAVE_BANDS`. */
  readonly octave: readonly number[];
  readonly facts: TransmissionFacts;
};

const SAMPLES = [0, 1, 2, 3, 4].map((i) => 10 ** (0.05 * ((2 * (i + 0.5)) / 5 - 1)));

/**
 * Transmission loss of a described construction in dB: third-octaves 25 Hz to 10 kHz, octaves 31.5 Hz to 8 kHz, always
 * finite and never below 0. Solver method, section 2; third-octaves by 2.2, octaves as the mean of three tau.
 */
export function transmissionOf(description: Description): Transmission {
  const model = modelOf(description);
  const tau = THIRD_BANDS.map((nominal) => meanTransmission(model, exactMidband(nominal)));
  return {
    third: tau.map((each) => -levelOf(each)),
    octave: OCTAVE_BANDS.map((_, i) => -levelOf(octaveMean(tau, i))),
    facts: model.facts,
  };
}

/** Octave i holds the thirds 3i to 3i + 2: 31.5 Hz has 25, 31.5 and 40 Hz. */
function octaveMean(tau: readonly number[], i: number): number {
  return (tau[3 * i] + tau[3 * i + 1] + tau[3 * i + 2]) / 3;
}

function meanTransmission(model: Model, midband: number): number {
  const sum = SAMPLES.reduce((total, factor) => {
    const { air, bridge, cap } = model.partsAt(midband * factor);
    return total + air + bridge + cap;
  }, 0);
  // No passive element lets more through than arrives; the formulas for free waves and bridges alone do not know it.
  return Math.min(1, sum / SAMPLES.length);
}
