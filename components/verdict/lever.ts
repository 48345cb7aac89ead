import type { Plan } from "@/lib/noise/plan";
import type { PathVerdict, ReceiverVerdict } from "@/lib/noise/verdict";
import type { PathKind } from "../format";
import { inSentence } from "./chartWords";
import { byShare, shareOf, type Column } from "./columns";

/** Among paths that carry nearly the same, the one that is least work to change leads: common practice, no source. */
const EASIEST_FIRST: readonly PathKind[] = ["door", "leak", "window", "duct", "roof", "floor", "wall"];
const NEARLY = 0.75;

const tries: Partial<Record<PathKind, string>> = {
  door: "Try a heavier door",
  window: "Try another window",
  roof: "Try another roof",
  wall: "Try another wall",
  floor: "Try another floor",
  duct: "See what the duct lets through",
  leak: "See what the leak lets through",
};

function isElement(plan: Plan, path: PathVerdict): boolean {
  return path.partId !== null && path.kind in tries && plan.elements.some(({ id }) => id === path.partId);
}

/** The leading path that can be changed: what one would try first. Null where nothing of the building leads. */
export function leverOf(plan: Plan, weighed: ReceiverVerdict, column: Column): PathVerdict | null {
  const sorted = byShare(weighed.paths, column).filter((path) => isElement(plan, path));
  const most = sorted[0] ? shareOf(sorted[0], column) : 0;
  if (most === 0) return null;
  const near = sorted.filter((path) => shareOf(path, column) >= NEARLY * most);
  const ease = ({ kind }: PathVerdict) => EASIEST_FIRST.indexOf(kind);
  return near.sort((one, other) => ease(one) - ease(other))[0]!;
}

export const tryWords = ({ kind, name }: PathVerdict): string => tries[kind] ?? `Open ${inSentence(name)}`;

/** The part whose page opens for a path; null for groups and for what is no part of the building. */
export function openableId(plan: Plan, path: PathVerdict): string | null {
  return isElement(plan, path) ? path.partId : null;
}
