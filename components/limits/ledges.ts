import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { Criterion } from "@/lib/noise/plan";
import type { Out, ReceiverVerdict } from "@/lib/noise/verdict";
import { bandWords, formatBand } from "../format";
import { columnsOf, isNumber } from "../verdict/columns";
import { weightedWords } from "./limitWords";

/** A test can show that a limit is kept only where it lies so far above the night, dB. From memory: ISO 16283-1. */
export const PROVABLE = 6;

/** One column of the bare chart: a band, or the whole of a limit on a weighted total. */
export interface Ledge {
  index: number | null;
  label: string;
  where: string;
  limit: number | null;
  level: Out;
  /** Level of the night itself. */
  night: number | null;
  /** The limit lies too near the night for a test to prove it. */
  near: boolean;
}

const numberOr = (value: Out | null | undefined): number | null => (isNumber(value) ? value : null);

/** Limit, level and night in every band. Levels are those the listener's verdict was taken with. */
export function ledgesOf(limit: Criterion, weighed: ReceiverVerdict | undefined): Ledge[] {
  const own = weighed?.criterionId === limit.id ? weighed : undefined;
  const numbered = limit.metric === "NC" || limit.metric === "NR";
  const columns = own ? columnsOf(own) : [];
  const bands = OCTAVE_BANDS.map((band, index) => {
    const allowed = numberOr(limit.levels ? limit.levels[index] : numbered ? own?.bands[index]?.limit : null);
    const night = numberOr(limit.background?.[index]);
    const level = columns[index]?.counted ?? weighed?.bands[index]?.level ?? "unknown";
    return { index, label: formatBand(band), where: bandWords(band), limit: allowed, level, night, near: allowed !== null && night !== null && allowed - night < PROVABLE };
  });
  return [...bands, ...wholeOf(limit, weighed)];
}

function wholeOf({ metric, value }: Criterion, weighed: ReceiverVerdict | undefined): Ledge[] {
  if (metric !== "dBA" && metric !== "dBC") return [];
  const level = (metric === "dBA" ? weighed?.dba : weighed?.dbc) ?? "unknown";
  return [{ index: null, label: weightedWords[metric], where: "over all bands", limit: value, level, night: null, near: false }];
}

export interface Run {
  from: number;
  to: number;
}

/** Stretches of neighbouring bands that lie too near the night. */
export function nearRuns(ledges: readonly Ledge[]): Run[] {
  return ledges.reduce<Run[]>((runs, { near }, index) => {
    const last = runs.at(-1);
    if (!near) return runs;
    if (last?.to === index - 1) return [...runs.slice(0, -1), { ...last, to: index }];
    return [...runs, { from: index, to: index }];
  }, []);
}

export const isOver = ({ limit, level }: Ledge): boolean => limit !== null && isNumber(level) && level > limit;

/** The drawing in a sentence. */
export function ledgesSentence(name: string, ledges: readonly Ledge[]): string {
  const limited = ledges.filter(({ limit }) => limit !== null);
  const over = limited.filter(isOver).map(({ where }) => where);
  const near = ledges.filter((ledge) => ledge.near).length;
  if (limited.length === 0) return `${name}: no figure yet, so no ledge is drawn.`;
  return [
    `${name}: the limit ${limited.length === 1 && limited[0]!.index === null ? "over all bands" : `in ${limited.length} of nine bands`}.`,
    over.length > 0 ? `Your level is above it ${over.length === 1 && over[0] === "over all bands" ? "" : "at "}${over.join(", ")}.` : "Your level is above it nowhere that is known.",
    near > 0 ? `In ${near} bands the limit is too near the night to prove.` : "",
  ]
    .filter(Boolean)
    .join(" ");
}
