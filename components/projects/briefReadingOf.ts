import type { Answer } from "../state/plan";
import { readingOf, type Reading } from "../verdict/reading";

/** The leading listener's reading, without what only the desk shows: it travels with the page. */
export function briefReadingOf({ plan, verdict }: Answer): Reading | null {
  const reading = readingOf(plan, verdict, verdict.leadingReceiverId);
  if (!reading) return null;
  return {
    ...reading,
    plan: { ...plan, surfaces: [], constructions: [], incidences: [] },
    verdict: { ...verdict, receivers: [reading.weighed], elements: {}, constructions: {}, spaces: {} },
    weighed: { ...reading.weighed, contributions: [], rest: null },
  };
}
