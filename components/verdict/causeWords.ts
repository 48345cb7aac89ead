import type { PathVerdict } from "@/lib/noise/verdict";
import { bandWords, capitalise } from "../format";
import { inSentence } from "./chartWords";
import { bandRangeWords } from "./notesWords";
import type { Reading } from "./reading";

/** Below this share of the energy no single source is named as the one that does it. */
export const MOST = 0.5;

const partsOf = ({ weighed }: Reading): PathVerdict[] =>
  weighed.facts.leading.flatMap(({ pathId }) => weighed.paths.find(({ id }) => id === pathId) ?? []);

/** A second path this near to the first shares the blame with it. */
const NEARLY = 0.75;
/** A path below this share is not named beside the first. */
const NAMED = 0.15;

/** "by the roof and the yard door in nearly equal parts" */
function waysOut(reading: Reading): string {
  const shares = reading.weighed.facts.leading.map(({ share }) => share);
  const names = partsOf(reading).map(({ name }) => inSentence(name));
  const [first = 0, second = 0] = shares;
  if (names.length < 2 || second < NAMED) return `by ${names[0]}`;
  if (second >= NEARLY * first) return `by ${names[0]} and ${names[1]} in nearly equal parts`;
  return `mostly by ${names[0]}, then by ${names[1]}`;
}

/** Sound that comes through no part of the building has no way out to speak of. */
const comesDirect = (path: PathVerdict | undefined) => !path || path.kind === "outdoor unit" || path.kind === "in the room" || path.kind === "duct";

function atBand({ weighed }: Reading): string {
  if (weighed.band === null) return "";
  return weighed.weighted ? `, most of it at ${bandWords(weighed.band)}` : `, at ${bandWords(weighed.band)}`;
}

/** What does it, at which band, and by which way it leaves. */
export function causeWords(reading: Reading): string {
  const { facts } = reading.weighed;
  const culprit = facts.sourceShare >= MOST && facts.voice ? `${capitalise(facts.voice)} ${/[^s]s$/.test(facts.voice) ? "do" : "does"} it` : "Several sources do it together";
  const parts = partsOf(reading);
  if (comesDirect(parts[0])) return `${culprit}${atBand(reading)}.`;
  return `${culprit}${atBand(reading)}, and it leaves ${waysOut(reading)}.`;
}

/** The bands that stay over with one path silent; 31.5 Hz never counts, and a limit for the whole has none. */
const bandsLeft = ({ weighed }: Reading, path: PathVerdict) =>
  weighed.weighted
    ? []
    : weighed.bands
        .filter(({ limit }, index) => {
          const without = path.without[index];
          return index > 0 && typeof limit === "number" && typeof without === "number" && without > limit;
        })
        .map(({ band }) => band);

/** What silencing the loudest path, or the two loudest, would be worth against an excess. */
export function remedyWords(reading: Reading): string {
  const { margin, facts } = reading.weighed;
  const [first, second] = partsOf(reading);
  if (margin === null || !first) return "";
  const left = bandsLeft(reading, first);
  if (margin + facts.dropFirst >= 0 && left.length > 0) {
    return `Silence ${inSentence(first.name)} alone and you are still over, ${bandRangeWords(left)}.`;
  }
  if (margin + facts.dropFirst >= 0) return `With ${inSentence(first.name)} silent you would be under.`;
  if (!second) return "";
  if (margin + facts.dropFirstTwo >= 0) return "Treat only one of them and you are still over.";
  return "Even with both of them silent you would be over.";
}

/** The largest part of the doubt, as the thing to do about it. */
export function settleWords({ weighed }: Reading): string {
  const largest = weighed.doubts[0];
  if (!largest || largest.basis === "measured") return "";
  const name = largest.partId ? inSentence(largest.name) : largest.name.toLowerCase();
  if (largest.what === "outdoors") return "The largest part of the doubt lies in the way through the yard: a measurement where it arrives would settle it.";
  return `A measurement of ${name} would settle most of it.`;
}

/** For a verdict within the limit: where it comes nearest. */
export function nearestWords(reading: Reading): string {
  const { band, weighted } = reading.weighed;
  if (band === null) return "";
  const parts = partsOf(reading);
  const way = comesDirect(parts[0]) ? "" : `, where it leaves ${waysOut(reading)}`;
  return weighted ? `The largest part of the sound lies at ${bandWords(band)}${way}.` : `It comes nearest to the limit at ${bandWords(band)}${way}.`;
}
