import "server-only";

const MINUTE = 60;
const HOUR = 60 * MINUTE;

/** most: so many within a time. free: so many, then each further one waits twice as long as the one before. */
export type Rule = { most: number; within: number } | { free: number; within: number; longest: number };

export const rules = {
  "sign-in of an account": { free: 5, within: 15 * MINUTE, longest: 900 },
  "sign-in from an address": { most: 50, within: 15 * MINUTE },
  "sign-in from a known browser": { free: 5, within: 15 * MINUTE, longest: 900 },
  "password again": { free: 5, within: 15 * MINUTE, longest: 900 },
  "sign-up from an address": { most: 3, within: 3 * HOUR },
  "forgotten password of an account": { most: 3, within: HOUR },
  "forgotten password from an address": { most: 20, within: HOUR },
  "letter to check an address": { most: 1, within: 5 * MINUTE },
  "link of a letter from an address": { most: 50, within: 15 * MINUTE },
  "move to another address": { most: 3, within: HOUR },
} as const satisfies Record<string, Rule>;
export type RuleName = keyof typeof rules;

export interface Count {
  tries: number;
  since: Date;
  lastAt: Date;
}

/** Whether one more try may be made at `now`: the count with it, or the whole seconds to wait. */
export function judge(rule: Rule, count: Count, now: Date): { wait: number; next?: Count } {
  const left = "most" in rule ? untilAnew(rule, count, now) : untilNext(rule, count, now);
  if (left > 0) return { wait: Math.ceil(left) };
  const anew = count.tries === 0 || isOver(rule, count, now);
  return { wait: 0, next: anew ? { tries: 1, since: now, lastAt: now } : { tries: count.tries + 1, since: count.since, lastAt: now } };
}

const seconds = (from: Date, to: Date) => (to.getTime() - from.getTime()) / 1_000;

function untilAnew({ most, within }: { most: number; within: number }, { tries, since }: Count, now: Date): number {
  return tries < most ? 0 : within - seconds(since, now);
}

function untilNext(rule: { free: number; longest: number }, { tries, lastAt }: Count, now: Date): number {
  return waitAfter(rule, tries) - seconds(lastAt, now);
}

/** 0 for the free ones, then 1, 2, 4 ... seconds. */
function waitAfter({ free, longest }: { free: number; longest: number }, tries: number): number {
  return tries < free ? 0 : Math.min(2 ** (tries - free), longest);
}

/** A long count ends only when it was quiet for a whole time after its last wait. */
function isOver(rule: Rule, { tries, since, lastAt }: Count, now: Date): boolean {
  const grown = "free" in rule && tries >= rule.free;
  return grown ? seconds(lastAt, now) > rule.within + waitAfter(rule, tries) : seconds(since, now) > rule.within;
}
