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
    if (isWithinBounds(request.headers.get("x-stillyard-address") ?? "", Date.now())) log.warn({ report: gist(text) }, "content policy");
    return emptyAnswer();
  });
}

const told = ["document-uri", "effective-directive", "blocked-uri", "source-file", "line-number"];

/** Which rule was broken where. Never the text as it came, nor the query of an address: there may be more in them. */
export function gist(text: string): Record<string, string> {
  const { "csp-report": report } = parse(text);
  if (typeof report !== "object" || report === null) return {};
  const fields = Object.entries(report).filter(([field, value]) => told.includes(field) && /string|number/.test(typeof value));
  return Object.fromEntries(fields.map(([field, value]) => [field, String(value).split(/[?#]/)[0]!.slice(0, 200)]));
}

function parse(text: string): { "csp-report"?: unknown } {
  try {
    return (JSON.parse(text) as object | null) ?? {};
  } catch {
    return {};
  }
}

function isWithinBounds(address: string, now: number): boolean {
  for (const [key, { from }] of counts) if (now - from > MINUTE) counts.delete(key);
  const count = counts.get(address) ?? { from: now, reports: 0 };
  counts.set(address, { ...count, reports: count.reports + 1 });
  return count.reports < PER_MINUTE;
}
