import { formatNumber, withUnit } from "../format";

/** "2.4 dB better than before", "as before": one decimal, since two rounded margins beside it may differ by more. */
export function movementWords(moved: number): string {
  if (Math.abs(moved) < 0.05) return "as before";
  return `${withUnit(formatNumber(Math.abs(moved), 1), "dB")} ${moved > 0 ? "better" : "worse"} than before`;
}
