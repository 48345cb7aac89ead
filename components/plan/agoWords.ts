import { countWords } from "../format";

const MINUTE = 60_000;

/** "a moment ago", "two minutes ago", "13 minutes ago", "more than an hour ago". */
export function agoWords(iso: string | undefined, now = Date.now()): string {
  const minutes = iso === undefined ? 0 : Math.floor((now - Date.parse(iso)) / MINUTE);
  if (!(minutes >= 1)) return "a moment ago";
  if (minutes >= 60) return "more than an hour ago";
  return minutes === 1 ? "a minute ago" : `${countWords(minutes, "minute")} ago`;
}
