import type { Plan } from "@/lib/noise/plan";
import type { PathVerdict, Verdict } from "@/lib/noise/verdict";
import { byShare, columnsOf, isNumber, litColumnOf, shareOf, type Column } from "../verdict/columns";
import { readingOf, type Reading } from "../verdict/reading";
import { stationsOf } from "../verdict/stations";
import type { BuildKey, LandingBuild, Made, Night, Share } from "./LandingBuild";

const minutesOf = (clock: string): number => Number(clock.slice(0, 2)) * 60 + Number(clock.slice(3));

/** When the limit of the example holds. */
export function nightOf(plan: Plan, verdict: Verdict): Night {
  const hours = readingOf(plan, verdict, verdict.leadingReceiverId)?.criterion?.hours;
  if (!hours) throw new Error("The example's limit says no hours.");
  return { from: minutesOf(hours.from), to: minutesOf(hours.to) };
}

/** What the element of this kind that lets most through is made of. */
function madeOf({ plan, verdict, weighed }: Reading, kind: "door" | "roof", column: Column): Made {
  const path = byShare(weighed.paths, column).find((one) => one.kind === kind);
  const element = plan.elements.find(({ id }) => id === path?.partId);
  const construction = plan.constructions.find(({ id }) => id === element?.constructionId);
  const solved = construction && verdict.constructions[construction.id];
  return {
    name: construction?.name ?? "",
    thickness: solved?.thickness ?? null,
    surfaceMass: solved?.surfaceMass ?? null,
  };
}

/** Below this share a way is drawn with the rest. */
const LEAST = 0.02;

function sharesOf(paths: readonly PathVerdict[], column: Column): Share[] {
  const walls = paths.filter(({ kind }) => kind === "wall").reduce((sum, path) => sum + shareOf(path, column), 0);
  const others = byShare(paths.filter(({ kind }) => kind !== "wall"), column);
  const shares: Share[] = [
    { kind: "wall", name: "Walls", share: walls },
    ...others.map((path) => ({ kind: path.kind, name: path.name, share: shareOf(path, column) })),
  ];
  return shares.filter(({ share }) => share >= LEAST).sort((one, other) => other.share - one.share);
}

/** What the landing page shows of one weighed build: the bed next door in the band that decides. */
export function landingBuildOf(key: BuildKey, plan: Plan, verdict: Verdict): LandingBuild {
  const reading = readingOf(plan, verdict, verdict.leadingReceiverId);
  const weighed = reading?.weighed;
  if (!reading || !weighed?.crossCut || weighed.margin === null || weighed.doubt === null) throw new Error("The example was not weighed.");
  const column = litColumnOf(columnsOf(weighed), null, weighed.band);
  if (!isNumber(column.level) || column.limit === null) throw new Error("The example has no level or no limit.");
  return {
    key,
    state: weighed.state,
    margin: weighed.margin,
    doubt: weighed.doubt,
    where: column.where,
    level: column.level,
    limit: column.limit,
    door: madeOf(reading, "door", column),
    roof: madeOf(reading, "roof", column),
    shares: sharesOf(weighed.paths, column),
    cut: { ...weighed.crossCut, stations: [] },
    stations: stationsOf(reading, column, false),
  };
}
