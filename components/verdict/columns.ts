import { FIRST_JUDGED, OCTAVE_BANDS, type Band } from "@/lib/noise/bands";
import type { BandVerdict, Out, PathVerdict, ReceiverVerdict, State } from "@/lib/noise/verdict";
import { bandWords, formatBand } from "../format";

/** One column of the chart, the shares and the table: a band, or the weighted whole of a dB(A) or dB(C) limit. */
export interface Column {
  /** Place in the spectra; null is the whole. */
  index: number | null;
  band: Band | null;
  /** On the axis: "63", "dB(A)". */
  label: string;
  /** In a sentence: "at 63 Hz", "over all bands". */
  where: string;
  unit: string;
  level: Out;
  known: Out;
  /** The level as the limit counts it: with a dB(A) or dB(C) limit the weighted level of the band. */
  counted: Out;
  limit: number | null;
  margin: Out | null;
  spent: number | null;
  doubt: number;
  state: State;
}

export const isNumber = (value: Out | null | undefined): value is number => typeof value === "number" && Number.isFinite(value);

export function weightedUnit(metric: ReceiverVerdict["metric"]): string {
  return metric === "dBC" ? "dB(C)" : "dB(A)";
}

function wholeOf(weighed: ReceiverVerdict): Column[] {
  const { weighted, metric, state } = weighed;
  if (!weighted) return [];
  const unit = weightedUnit(metric);
  return [{ ...weighted, counted: weighted.level, index: null, band: null, label: unit, where: "over all bands", unit, state }];
}

/** Spent is the weighted part of the allowance, so the band counts with limit + 10 lg(spent). */
function countedOf({ level, spent }: BandVerdict, { weighted }: ReceiverVerdict): Out {
  if (!weighted || !isNumber(level)) return level;
  return spent === null || spent <= 0 ? "silent" : weighted.limit + 10 * Math.log10(spent);
}

/** Nine bands; with a weighted limit a tenth column for the whole, which alone has a limit then. */
export function columnsOf(weighed: ReceiverVerdict): Column[] {
  const bands = weighed.bands.map((verdict, index) => ({
    ...verdict,
    index,
    counted: countedOf(verdict, weighed),
    limit: isNumber(verdict.limit) ? verdict.limit : null,
    label: formatBand(verdict.band),
    where: `at ${bandWords(verdict.band)}`,
    unit: "dB",
  }));
  return [...bands, ...wholeOf(weighed)];
}

/** The column one is looking at; without a choice the one that decides. */
export function litColumnOf(columns: readonly Column[], lit: number | null, leading: Band | null): Column {
  const whole = columns.find((column) => column.index === null);
  const chosen = lit ?? (whole ? null : (leading ?? OCTAVE_BANDS[FIRST_JUDGED]));
  return columns.find((column) => column.band === chosen) ?? columns[FIRST_JUDGED]!;
}

export function aloneOf(path: PathVerdict, column: Column): Out {
  return column.index === null ? (path.weighted?.level ?? "unknown") : (path.levels[column.index] ?? "unknown");
}

export function withoutOf(path: PathVerdict, column: Column): Out {
  return column.index === null ? (path.weighted?.without ?? "unknown") : (path.without[column.index] ?? "unknown");
}

/** The level with a path silenced, as the limit counts it: what the chart draws. */
export function countedWithout(path: PathVerdict, column: Column): Out {
  const without = withoutOf(path, column);
  if (!isNumber(without) || !isNumber(column.counted) || !isNumber(column.level)) return without;
  return without + column.counted - column.level;
}

export function shareOf(path: PathVerdict, column: Column): number {
  const share = column.index === null ? path.weighted?.share : path.shares[column.index];
  return share !== undefined && Number.isFinite(share) ? share : 0;
}

export function byShare(paths: readonly PathVerdict[], column: Column): PathVerdict[] {
  return [...paths].sort((one, other) => shareOf(other, column) - shareOf(one, column));
}
