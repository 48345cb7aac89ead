import type { Plan } from "@/lib/noise/plan";

export interface Hours {
  from: string;
  to: string;
}

export const DAY = 1440;

/** Minutes after midnight of "18:30"; 24:00 is the end of the day. */
export function minuteOf(clock: string): number {
  const [hours = 0, minutes = 0] = clock.split(":").map(Number);
  return 60 * hours + minutes;
}

/** Parts of one day: hours that pass midnight are two of them; equal ends are the whole day. */
export function spansOf({ from, to }: Hours): [number, number][] {
  const [start, end] = [minuteOf(from), minuteOf(to)];
  if (start === end) return [[0, DAY]];
  const spans: [number, number][] = start < end ? [[start, end]] : [[start, DAY], [0, end]];
  return spans.filter(([one, two]) => two > one);
}

export const minutesIn = (hours: Hours): number => spansOf(hours).reduce((sum, [from, to]) => sum + to - from, 0);

/** Minutes a day that lie in both. */
export function minutesShared(one: Hours, other: Hours): number {
  return spansOf(one).reduce(
    (sum, [from, to]) => sum + spansOf(other).reduce((inner, [start, end]) => inner + Math.max(0, Math.min(to, end) - Math.max(from, start)), 0),
    0,
  );
}

/** "20 minutes", "1 hour", "2 h 30 min". */
export function lastingWords(minutes: number): string {
  const whole = Math.round(minutes);
  const [hours, rest] = [Math.floor(whole / 60), whole % 60];
  if (hours === 0) return `${rest} ${rest === 1 ? "minute" : "minutes"}`;
  if (rest === 0) return `${hours} ${hours === 1 ? "hour" : "hours"}`;
  return `${hours}\u00a0h ${rest}\u00a0min`;
}

/** Hours that the limits of a yard speak of, each once. */
export function limitHours({ criteria }: Pick<Plan, "criteria">): Hours[] {
  const seen = new Map<string, Hours>();
  for (const { hours } of criteria) if (hours) seen.set(`${hours.from} ${hours.to}`, hours);
  return [...seen.values()];
}
