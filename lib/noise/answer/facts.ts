import { rankOf, type Way } from "./paths";
import type { Weighing } from "./weighing";
import { OCTAVE_BANDS } from "../bands";
import { dropWithout } from "../levels";
import { sourceKinds } from "../sources";
import type { Part } from "../sound/parts";
import type { SentenceFacts } from "../verdict";

const NAMED = 3;

/** The source with most energy where the listener is weighed. */
export function leadingSource(weighing: Weighing): Part | null {
  const ranked = weighing.parts.sources.map((part) => ({ part, rank: rankOf(weighing, part.energy) }));
  const lead = ranked.reduce<(typeof ranked)[number] | null>(
    (best, each) => (each.rank > (best?.rank ?? 0) ? each : best),
    null,
  );
  return lead?.part ?? null;
}

/** What the sentence of a listener is built from, at the leading band or of the weighted total. */
export function factsOf(weighing: Weighing, ways: readonly Way[]): SentenceFacts {
  const whole = rankOf(weighing, weighing.energy);
  const shareOf = (energy: Float64Array) => (whole > 0 ? Math.min(1, rankOf(weighing, energy) / whole) : 0);
  const lead = leadingSource(weighing);
  const source = lead?.source?.source;
  const leading = ways
    .slice(0, NAMED)
    .map(({ id, energy }) => ({ pathId: id, share: shareOf(energy) }))
    .filter(({ share }) => share > 0);
  const [first, second] = leading.map(({ share }) => share);
  return {
    sourceId: source?.id ?? null,
    voice:
      source && weighing.leading >= 0 ? sourceKinds[source.kind].voice(OCTAVE_BANDS[weighing.leading]) : "",
    sourceShare: lead ? shareOf(lead.energy) : 0,
    leading,
    dropFirst: dropWithout(first ?? 0),
    dropFirstTwo: dropWithout((first ?? 0) + (second ?? 0)),
  };
}
