import { OCTAVE_BANDS, type Band } from "@/lib/noise/bands";
import type { ReceiverVerdict } from "@/lib/noise/verdict";
import { bandWords, formatNumber, listWords, marginWords } from "../format";
import { inSentence } from "./chartWords";
import type { Reading } from "./reading";

export function lowestIsWorse({ lowest, margin }: ReceiverVerdict): boolean {
  return lowest !== null && lowest.margin !== null && margin !== null && lowest.margin < margin;
}

/** 31.5 Hz never decides; where it is worse it is said. */
export function lowestWords({ weighed }: Reading): string {
  if (!lowestIsWorse(weighed)) return "";
  return `At 31.5\u00a0Hz it is ${marginWords(weighed.lowest!.state, weighed.lowest!.margin)}; that band is shown but does not decide.`;
}

/** "below 125 Hz", "above 2 kHz", "in every band", "at 63 Hz and 1 kHz" */
export function bandRangeWords(bands: readonly Band[]): string {
  const indices = bands.map((band) => OCTAVE_BANDS.indexOf(band)).sort((one, other) => one - other);
  const first = indices[0] ?? 0;
  const last = indices[indices.length - 1] ?? 0;
  if (indices.length === OCTAVE_BANDS.length) return "in every band";
  const unbroken = last - first === indices.length - 1;
  if (unbroken && first === 0) return `below ${bandWords(OCTAVE_BANDS[last + 1]!)}`;
  if (unbroken && last === OCTAVE_BANDS.length - 1) return `above ${bandWords(OCTAVE_BANDS[first - 1]!)}`;
  if (unbroken && indices.length > 2) return `from ${bandWords(OCTAVE_BANDS[first]!)} to ${bandWords(OCTAVE_BANDS[last]!)}`;
  return `at ${listWords(indices.map((index) => bandWords(OCTAVE_BANDS[index]!)))}`;
}

/** At most this many parts are named; the disclosure below names all of them. */
const NAMES = 3;

export function restsOnWords({ weighed: { restsOn } }: Reading): string {
  if (restsOn.length === 0) return "";
  const named = restsOn.slice(0, NAMES).map(({ name, bands }) => `${inSentence(name)} ${bandRangeWords(bands)}`);
  const more = restsOn.length > NAMES ? `; and ${formatNumber(restsOn.length - NAMES)} more` : "";
  return `Rests on estimates: ${named.join("; ")}${more}.`;
}
