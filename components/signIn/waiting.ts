import { formatNumber, withUnit } from "../format";

const HOUR = 3600;

/** "1 second", "11 seconds", "2 min 5 s", "14 min", "2 h 5 min": how long until the next try. */
export function waitWords(seconds: number): string {
  if (seconds < 60) return seconds === 1 ? "1 second" : `${seconds} seconds`;
  const [large, small, unit] = seconds < HOUR ? ([60, 1, ["min", "s"]] as const) : ([HOUR, 60, ["h", "min"]] as const);
  const words = withUnit(formatNumber(Math.floor(seconds / large)), unit[0]);
  const rest = Math.floor((seconds % large) / small);
  return rest === 0 ? words : `${words} ${withUnit(`${rest}`, unit[1])}`;
}
