import { BAND_COUNT, EXACT_BANDS } from "./bands";
import type { Construction } from "./construction";
import { countLeaves, describeLayers, massOf, thicknessOf } from "./layers";
import { toArithmetic, type Basis, type Spectrum } from "./spectrum";
import { transmissionCached, type TransmissionFacts } from "./transmission";

/** What a construction lets the solver reckon with: loss in dB per band (NaN unknown) and what each band rests on. */
export interface EffectiveLoss {
  readonly loss: Float64Array;
  readonly bases: readonly Basis[];
  readonly surfaceMass: number | null;
  readonly thickness: number | null;
  readonly facts: TransmissionFacts | null;
  /** A spectrum of the very thing leads. */
  readonly laboratory: boolean;
}

/** One leaf below its lowest measured band, dB per octave. */
const LEAF_SLOPE = -6;

/** Loss as arithmetic: "silent" lets nothing pass. */
function lossOf(spectrum: Spectrum): Float64Array {
  return toArithmetic(spectrum).map((loss) => (loss === -Infinity ? Infinity : loss));
}

function nearestKnown(loss: Float64Array, band: number): number {
  for (let step = 1; step < BAND_COUNT; step += 1) {
    for (const other of [band + step, band - step]) {
      if (other >= 0 && other < BAND_COUNT && !Number.isNaN(loss[other])) return other;
    }
  }
  return -1;
}

/** How far a band lies from its nearest measured one, dB; NaN where the method has no rule (solver method 0). */
function extensionFrom(
  construction: Construction,
  model: readonly number[] | null,
  band: number,
  nearest: number,
): number {
  if (model) return model[band] - model[nearest];
  if (countLeaves(construction) !== 1) return NaN;
  return nearest > band ? LEAF_SLOPE * (nearest - band) : 0;
}

/** A laboratory spectrum with its missing bands extended, marked estimated. */
function extended(
  construction: Construction,
  tl: Spectrum,
  model: readonly number[] | null,
): Pick<EffectiveLoss, "loss" | "bases"> {
  const measured = lossOf(tl);
  const loss = measured.slice();
  const bases = Array.from(measured, (_, band): Basis => construction.bases?.[band] ?? "laboratory");
  measured.forEach((value, band) => {
    if (!Number.isNaN(value)) return;
    const nearest = nearestKnown(measured, band);
    loss[band] = nearest < 0 ? NaN : measured[nearest] + extensionFrom(construction, model, band, nearest);
    bases[band] = "estimated";
  });
  return { loss, bases };
}

function calculated(
  octave: readonly number[],
  { estimatedBelow }: TransmissionFacts,
): Pick<EffectiveLoss, "loss" | "bases"> {
  const bases = EXACT_BANDS.map((band): Basis => (band < estimatedBelow ? "estimated" : "calculated"));
  return { loss: Float64Array.from(octave), bases };
}

function unknownLoss(): Pick<EffectiveLoss, "loss" | "bases"> {
  return { loss: new Float64Array(BAND_COUNT).fill(NaN), bases: EXACT_BANDS.map((): Basis => "estimated") };
}

/**
 * Transmission loss of a construction, dB over the nine bands, with its bases. A spectrum of the very thing leads; else
 * it is calculated from the layers (solver method 2); where neither is there every band is unknown.
 */
export function effectiveLoss(construction: Construction): EffectiveLoss {
  const description = describeLayers(construction);
  const model = description && transmissionCached(description);
  const { tl } = construction;
  const spectrum = tl
    ? extended(construction, tl, model?.octave ?? null)
    : model
      ? calculated(model.octave, model.facts)
      : unknownLoss();
  return {
    ...spectrum,
    surfaceMass: massOf(construction) ?? model?.facts.surfaceMass ?? null,
    thickness: thicknessOf(construction) ?? model?.facts.thickness ?? null,
    facts: model?.facts ?? null,
    laboratory: tl !== null,
  };
}
