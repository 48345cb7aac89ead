import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { Plan, Situation } from "@/lib/noise/plan";
import type { Source } from "@/lib/noise/sources";
import { bandWords, capitalise, countWords, formatNumber, listWords, percent, withUnit, type BasisWord } from "../format";
import type { Answer } from "../state/plan";
import { leadOf } from "../walls/answer";
import { placementOf, type SourceDesk } from "./desk";
import { countKnown, loudestBand } from "./spectrum";

type Kinds = Pick<SourceDesk, "kinds">;

/** "Live room", "outdoors, no place yet", "2 duct mouths". */
export function whereWords(source: Source, plan: Plan, kinds: Kinds): string {
  const placement = placementOf(kinds, source.kind);
  if (placement === "room") return plan.spaces.find(({ id }) => id === source.spaceId)?.name ?? "no room yet";
  if (placement === "outdoor") return source.position ? "outdoors" : "outdoors, no place yet";
  const own = ({ sourceId }: { sourceId: string }) => sourceId === source.id;
  if (placement === "fan") return `in a duct with ${countWords(plan.outlets.filter(own).length, "mouth")}`;
  const walls = plan.incidences.filter(own).length;
  return walls > 0 ? `given at ${countWords(walls, "wall or opening", "walls and openings")}` : "given at no wall yet";
}

export interface HowKnown {
  basis: BasisWord;
  word?: string;
  doubt?: number;
}

/** What a source's figures rest on, with the doubt at its loudest band. */
export function howKnown(source: Pick<Source, "power" | "basis">, doubts: readonly (number | null)[] | undefined): HowKnown {
  const band = loudestBand(source.power);
  if (band === null) return { basis: "unknown", word: "no figures yet" };
  const doubt = doubts?.[band] ?? undefined;
  return source.basis === "typed" ? { basis: "estimated", word: "your figure", doubt } : { basis: source.basis, doubt };
}

/** Where a source's figures were read: "Own measurement, 1 m away in Live room". */
export function provenanceWords({ provenance: { document, clause, memory } }: Pick<Source, "provenance">): string {
  const remembered = memory && !/from memory/i.test(`${document} ${clause}`);
  return `${remembered ? "from memory: " : ""}${[document, clause].filter(Boolean).join(": ")}`;
}

export const knownWords = (power: Source["power"]): string => `${countKnown(power)} of ${OCTAVE_BANDS.length}`;

const called = ({ says, name }: Source) => says || name;

/** "Four sources, and your kit decides". */
export function headingWords(answer: Answer): string {
  const { sources } = answer.plan;
  const deciding = sources.find(({ id }) => id === leadOf(answer)?.receiver.facts.sourceId);
  const many = capitalise(countWords(sources.length, "source"));
  if (!deciding) return many;
  return sources.length === 1 ? `One source, ${called(deciding)}` : `${many}, and ${called(deciding)} decides`;
}

/** How much of what reaches the leading listener comes from the deciding source. */
export function decidingWords(answer: Answer): string {
  const lead = leadOf(answer);
  const deciding = answer.plan.sources.find(({ id }) => id === lead?.receiver.facts.sourceId);
  if (!lead || !deciding) return "What plays, how loud, where and when. What is not known here is not known in the verdict.";
  const where = lead.receiver.weighted ? "" : ` at ${bandWords(OCTAVE_BANDS[lead.bandIndex]!)}`;
  return `${percent(lead.receiver.facts.sourceShare)} of what reaches ${lead.name}${where} comes from ${called(deciding)}.`;
}

/** Listeners whose verdict is taken in that situation, by name. */
export function leadsFor({ id }: Situation, { plan, verdict }: Answer): string[] {
  return verdict.receivers
    .filter(({ situationId }) => situationId === id)
    .map(({ receiverId }) => plan.receivers.find((receiver) => receiver.id === receiverId)?.name ?? "a listener");
}

/** What goes with a removed source, in words; empty where nothing does. */
export function goingWords({ mouths, incidences, situations }: { mouths: number; incidences: number; situations: number }): string {
  const parts = [
    mouths > 0 && countWords(mouths, "duct mouth"),
    incidences > 0 && countWords(incidences, "level at a wall", "levels at walls"),
    situations > 0 && `its place in ${countWords(situations, "situation")}`,
  ].filter((words): words is string => Boolean(words));
  return parts.length > 0 ? `With it went ${listWords(parts)}.` : "";
}

/** 10 lg of a share of the time, dB: "3.5 dB lower". */
export const shareWords = (share: number): string =>
  share === 1 ? "all the time" : `${percent(share)} of the time, ${withUnit(formatNumber(-10 * Math.log10(share), 1), "dB")} lower over the whole period`;
