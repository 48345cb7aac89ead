/** "22", "22:00", "7.30" and "0730" as a clock writes them; undefined where it is no time of day. */
export function readClock(words: string): string | undefined {
  const [, hours, minutes = "00"] = /^\s*(\d{1,2})(?:[:.h]?(\d{2}))?\s*$/.exec(words) ?? [];
  if (hours === undefined || Number(hours) > 24 || Number(minutes) > 59 || (Number(hours) === 24 && minutes !== "00")) return undefined;
  return `${hours.padStart(2, "0")}:${minutes}`;
}
