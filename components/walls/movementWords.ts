import { formatNumber, withUnit } from "../format";

/** "2 dB better than before", "less than 1 dB worse than before", "as before". */
export function movementWords(moved: number): string {
  if (Math.abs(moved) < 0.05) return "as before";
  const whole = Math.round(Math.abs(moved));
  const amount = whole === 0 ? `less than ${withUnit("1", "dB")}` : withUnit(formatNumber(whole), "dB");
  return `${amount} ${moved > 0 ? "better" : "worse"} than before`;
}
