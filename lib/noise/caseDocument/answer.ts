import { BAND_COUNT, FIRST_JUDGED, OCTAVE_BANDS, THIRD_BANDS, type Band } from "../bands";
import { ncOf, nrOf, type Rating } from "../criteria";
import { sumLevels } from "../levels";
import { toArithmetic, type Spectrum } from "../spectrum";
import { transmissionCached, type Description } from "../transmission";
import { toOut, type BandVerdict, type Out, type ReceiverVerdict } from "../verdict";
import { aWeighted, cWeighted } from "../weighting";

/** Answers in the form of the case document, full precision; `length` is 8 or 9 bands. */
type Answer = Record<string, unknown>;

function cut<T>(values: readonly T[], length: number): T[] {
  return values.slice(BAND_COUNT - length);
}

function fromOut(levels: readonly Out[]): Float64Array {
  return toArithmetic(levels.map((level) => (level === "unknown" ? null : level)));
}

function ratingWords({ value, band }: Rating): [Out | "above", Band | null] {
  return [value === Infinity ? "above" : toOut(value), band];
}

/** An excess counts even with unknown bands elsewhere; otherwise one unknown band leaves the least margin unknown. */
function leastMargin(bands: readonly BandVerdict[]): { min_margin: Out; deciding_band: Band | null } {
  const judged = bands.slice(FIRST_JUDGED).filter(({ limit }) => limit !== null);
  const numbers = judged.flatMap(({ margin, band }) =>
    typeof margin === "number" ? [{ margin, band }] : [],
  );
  const least = numbers.reduce<(typeof numbers)[number] | null>(
    (low, each) => (low === null || each.margin < low.margin ? each : low),
    null,
  );
  if (judged.some(({ margin }) => margin === "unknown") && !(least && least.margin < 0))
    return { min_margin: "unknown", deciding_band: null };
  return least
    ? { min_margin: least.margin, deciding_band: least.band }
    : { min_margin: "silent", deciding_band: null };
}

/** A band on which a curve says nothing has no limit to weigh against: unknown there, and no part of the least margin. */
function limitAnswer({ metric, bands, weighted, criterionId }: ReceiverVerdict, length: number): Answer {
  if (criterionId === null) return {};
  if (weighted) return { [metric === "dBA" ? "margin_dba" : "margin_dbc"]: weighted.margin };
  return {
    criterion: cut(bands, length).map(({ limit }) => limit ?? "unknown"),
    margin: cut(bands, length).map(({ margin }) => margin ?? "unknown"),
    ...leastMargin(bands),
  };
}

/** Levels by source and path; ways that bear the same name are summed, so that all still add up to the level. */
function contributionAnswer(
  contributions: ReceiverVerdict["contributions"],
  length: number,
): Record<string, Out[]> {
  const named = new Map<string, Float64Array>();
  for (const { sourceId, path, levels } of contributions) {
    const key = `${sourceId} | ${path}`;
    const before = named.get(key);
    const each = fromOut(levels);
    named.set(key, before ? before.map((level, band) => sumLevels([level, each[band]])) : each);
  }
  return Object.fromEntries(
    Array.from(named, ([key, levels]) => [key, cut(Array.from(levels, toOut), length)]),
  );
}

/** The answer of one listener: spectra in dB over `length` bands, with ratings and states. */
export function answerReceiver(verdict: ReceiverVerdict, length: number): Answer {
  const { bands, contributions, dba, dbc, state } = verdict;
  const levels = bands.map(({ level }) => level);
  return {
    levels: cut(levels, length),
    contributions: contributionAnswer(contributions, length),
    dba,
    dbc,
    nc: ratingWords(ncOf(fromOut(levels))),
    ...limitAnswer(verdict, length),
    known_levels: cut(bands, length).map(({ known }) => known),
    states: cut(bands, length).map((band) => band.state),
    state,
  };
}

/** The ratings of nine octave levels in dB. */
export function answerSpectrum(spectrum: Spectrum): Answer {
  const levels = toArithmetic(spectrum);
  return {
    dba: toOut(aWeighted(levels)),
    dbc: toOut(cWeighted(levels)),
    nc: ratingWords(ncOf(levels)),
    nr: ratingWords(nrOf(levels)),
  };
}

/** Third-octaves of an answer begin at 50 Hz; below, the loss is an estimate (solver method 0). */
const FIRST_PRINTED = THIRD_BANDS.indexOf(50);

/** Transmission loss of a construction, dB: third-octaves from 50 Hz to 10 kHz by their band, octaves from 63 Hz to 8 kHz. */
export function answerDescription(description: Description): Answer {
  const { third, octave } = transmissionCached(description);
  const printed = THIRD_BANDS.slice(FIRST_PRINTED).map((band, i) => [String(band), third[FIRST_PRINTED + i]]);
  return { third: Object.fromEntries(printed), octave: cut(octave, OCTAVE_BANDS.length - 1) };
}
