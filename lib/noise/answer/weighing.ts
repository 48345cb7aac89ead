import { BAND_COUNT, FIRST_JUDGED, OCTAVE_BANDS } from "../bands";
import { limitLevels } from "../criteria";
import { doubtsOf, weightedDoubt } from "./doubt";
import { energyOf, levelOf, weightedSum } from "../levels";
import { ALL_BANDS, hasBand, type BandMask } from "../model/masks";
import type { Criterion } from "../plan";
import type { Field } from "../sound/field";
import type { Hearing } from "../sound/hearing";
import { partsOf, type Parts } from "../sound/parts";
import type { Playing } from "../sound/playing";
import { leadingOf, stateOf, type Weighed } from "../states";
import { marginOf, toOut, type BandVerdict, type ReceiverVerdict } from "../verdict";
import { WEIGHT_FACTORS } from "../weighting";

export interface WeighedBand extends Weighed {
  readonly index: number;
  /** dB; NaN where the criterion is silent on the band. */
  readonly limit: number;
  readonly known: number;
  readonly unknown: boolean;
  readonly doubt: number;
}
export interface WeighedTotal extends Weighed {
  readonly limit: number;
  readonly known: number;
  readonly unknown: boolean;
  readonly doubt: number;
  readonly factors: Float64Array;
}

/** One listener against one limit in one situation. */
export interface Weighing extends Weighed {
  readonly criterion: Criterion | null;
  readonly playing: Playing;
  readonly hearing: Hearing;
  readonly parts: Parts;
  readonly energy: Float64Array;
  readonly unknown: BandMask;
  readonly bands: readonly WeighedBand[];
  /** For limits on a weighted total. */
  readonly total: WeighedTotal | null;
  /** Index of the leading band; -1 where there is none. */
  readonly leading: number;
  readonly metric: ReceiverVerdict["metric"];
  readonly doubt: number;
}

function energyAt({ bySource }: Hearing, { weights }: Playing): Float64Array {
  const energy = new Float64Array(BAND_COUNT);
  weights.forEach((weight, s) =>
    energy.forEach((_, band) => (energy[band] += weight * bySource[s * BAND_COUNT + band])),
  );
  return energy;
}

function unknownIn({ unknown, placed }: Hearing, { weights }: Playing): BandMask {
  return placed ? unknown.reduce((mask, each, s) => (weights[s] > 0 ? mask | each : mask), 0) : ALL_BANDS;
}

/** Unknown blocks a pass, never a fail: known parts that are over the limit alone are over. */
function knownMargin(limit: number, known: number, unknown: boolean): number {
  const margin = marginOf(limit, known);
  return unknown && !(margin < 0) ? NaN : margin;
}

function weighBand(
  index: number,
  limit: number,
  energy: number,
  unknown: boolean,
  doubt: number,
): WeighedBand {
  const known = levelOf(energy);
  const margin = Number.isNaN(limit) ? NaN : knownMargin(limit, known, unknown);
  return { index, limit, known, unknown, doubt, margin, state: stateOf(margin, doubt) };
}

function weighTotal(
  { metric, value }: Criterion,
  energy: Float64Array,
  unknown: BandMask,
  doubts: Float64Array,
): WeighedTotal | null {
  if ((metric !== "dBA" && metric !== "dBC") || value === null) return null;
  const factors = WEIGHT_FACTORS[metric === "dBA" ? "A" : "C"];
  const known = levelOf(weightedSum(energy, factors));
  const margin = knownMargin(value, known, unknown !== 0);
  const doubt = weightedDoubt(doubts, energy, factors);
  return {
    limit: value,
    known,
    unknown: unknown !== 0,
    doubt,
    factors,
    margin,
    state: stateOf(margin, doubt),
  };
}

/** Band with most energy, weighted; -1 in silence. */
function loudestBand(energy: Float64Array, factors: Float64Array): number {
  let loudest = -1;
  energy.forEach((each, band) => {
    const weighted = each * factors[band];
    if (weighted > 0 && (loudest < 0 || weighted > energy[loudest] * factors[loudest])) loudest = band;
  });
  return loudest;
}

function metricOf(criterion: Criterion | null): ReceiverVerdict["metric"] {
  if (!criterion) return "none";
  return criterion.metric === "dBA" || criterion.metric === "dBC" ? criterion.metric : "bands";
}

/** Weighs a listener; state and figure are taken over 63 Hz to 8 kHz, or over the weighted total. */
export function weigh(
  field: Field,
  hearing: Hearing,
  playing: Playing,
  criterion: Criterion | null,
): Weighing {
  const energy = energyAt(hearing, playing);
  const unknown = unknownIn(hearing, playing);
  const parts = partsOf(field, hearing, playing);
  const doubts = doubtsOf(parts, energy);
  const limits = criterion ? limitLevels(criterion) : new Float64Array(BAND_COUNT).fill(NaN);
  const bands = Array.from(limits, (limit, i) =>
    weighBand(i, limit, energy[i], hasBand(unknown, i), doubts[i]),
  );
  const total = criterion && weighTotal(criterion, energy, unknown, doubts);
  const lead = leadingOf(bands.filter(({ index, limit }) => index >= FIRST_JUDGED && !Number.isNaN(limit)));
  const leading = lead?.index ?? loudestBand(energy, total?.factors ?? WEIGHT_FACTORS.A);
  const { state, margin } = total ?? lead ?? { state: "not weighed" as const, margin: NaN };
  const doubt = total?.doubt ?? doubts[leading] ?? NaN;
  return {
    criterion,
    playing,
    hearing,
    parts,
    energy,
    unknown,
    bands,
    total,
    leading,
    metric: metricOf(criterion),
    state,
    margin,
    doubt,
  };
}

/** Share of the allowance that a band spends, 1 = the limit; of a weighted limit with its weighted energy. */
function spentOf({ total }: Weighing, { index, limit, known }: WeighedBand): number | null {
  if (total) return (total.factors[index] * energyOf(known)) / energyOf(total.limit);
  return Number.isNaN(limit) ? null : energyOf(known - limit);
}

/** The bands of a weighed listener on their way out: levels, limits, margins and doubts in dB. */
export function bandVerdicts(weighing: Weighing): BandVerdict[] {
  return weighing.bands.map((band) => ({
    band: OCTAVE_BANDS[band.index],
    level: toOut(band.unknown ? NaN : band.known),
    known: toOut(band.known),
    limit: Number.isNaN(band.limit) ? null : toOut(band.limit),
    margin: Number.isNaN(band.limit) ? null : toOut(band.margin),
    spent: spentOf(weighing, band),
    doubt: band.doubt,
    state: band.state,
  }));
}

/** The weighted total on its way out, dB; null where the limit speaks of bands. */
export function weightedVerdict({ total }: Weighing): ReceiverVerdict["weighted"] {
  if (!total) return null;
  const { known, unknown, limit, margin, doubt } = total;
  return {
    level: toOut(unknown ? NaN : known),
    known: toOut(known),
    limit,
    margin: toOut(margin),
    spent: energyOf(known - limit),
    doubt,
  };
}

/** 31.5 Hz has its own mark: shown, never judged. */
export function lowestVerdict({ bands: [lowest], total }: Weighing): ReceiverVerdict["lowest"] {
  if (total || Number.isNaN(lowest.limit)) return null;
  return {
    state: lowest.state,
    margin: Number.isFinite(lowest.margin) ? lowest.margin : null,
    doubt: lowest.doubt,
  };
}
