import "server-only";
import { answer, emptyAnswer } from "./answer";
import { log } from "./log";
import { readText } from "./request";

const REPORT_BYTES = 8 * 1024;
const PER_MINUTE = 10;
const MINUTE = 60_000;

interface Count {
  from: number;
  reports: number;
}

/** Reports per address in the running minute; in memory, since nothing rests on them. */
const counts = new Map<string, Count>();

/** Takes what a browser reports of the content policy: logged, within bounds, never answered with a word. */
export function reportRoute(request: Request): Promise<Response> {
  return answer(async () => {
    const text = await readText(request, REPORT_BYTES);
    if (isWithinBounds(request.headers.get("x-stillyard-address") ?? "", Date.now())) log.warn({ report: text }, "content policy");
    return emptyAnswer();
  });
}

function isWithinBounds(address: string, now: number): boolean {
  for (const [key, { from }] of counts) if (now - from > MINUTE) counts.delete(key);
  const count = counts.get(address) ?? { from: now, reports: 0 };
  counts.set(address, { ...count, reports: count.reports + 1 });
  return count.reports < PER_MINUTE;
}
