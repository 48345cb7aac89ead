import type { PathKind } from "@/lib/noise/elements/kind";
import type { Basis } from "@/lib/noise/spectrum";
import type { Out, State } from "@/lib/noise/verdict";

export type { PathKind, State };

/** A figure as it travels: a number, silence, or not known (`null` in plans, the word in verdicts). */
export type Figure = Out | null;

export const NO_BREAK_SPACE = "\u00a0";
const MINUS = "\u2212";
const DASH = "\u2013";

export const stateWords: Record<State, string> = {
  under: "under",
  tight: "tight",
  over: "over",
  "not weighed": "not weighed",
};

export const pathKindWords: Record<PathKind, string> = {
  wall: "Wall",
  roof: "Roof",
  floor: "Floor",
  window: "Window",
  "outdoor unit": "Outdoor unit",
  duct: "Duct",
  leak: "Leak",
  door: "Door",
  flanking: "Round the side",
  "in the room": "In the room",
};

export type BasisWord = Basis | "unknown";

export const basisWords: Record<BasisWord, string> = {
  measured: "measured",
  laboratory: "laboratory",
  calculated: "calculated",
  estimated: "estimated",
  unknown: "unknown",
};

/** Groups thousands with a no-break space and writes the minus as a minus: "9 200", "−2.8". */
export function formatNumber(value: number, decimals = 0): string {
  const [whole = "", fraction] = Math.abs(value).toFixed(decimals).split(".");
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, NO_BREAK_SPACE);
  const digits = fraction === undefined ? grouped : `${grouped}.${fraction}`;
  return value < 0 && /[1-9]/.test(digits) ? MINUS + digits : digits;
}

/** As many decimals as the value needs, at most `most`: 15.6, 277, 0.05. */
export function formatQuantity(value: number, most = 3): string {
  const text = formatNumber(value, most);
  return text.includes(".") ? text.replace(/\.?0+$/, "") : text;
}

export function withUnit(value: string, unit: string): string {
  return `${value}${NO_BREAK_SPACE}${unit}`;
}

const isFigure = (figure: Figure | undefined): figure is number => typeof figure === "number" && Number.isFinite(figure);

function formatFigure(figure: Figure, decimals: number): string {
  if (figure === "silent") return "silent";
  if (!isFigure(figure)) return DASH;
  return formatNumber(figure, decimals);
}

export const wholeDecibels = (figure: Figure): string => formatFigure(figure, 0);
export const oneDecimal = (figure: Figure): string => formatFigure(figure, 1);

/** What a screen reader should say where the eye sees a dash. */
export function spokenFigure(figure: Figure, decimals = 0): string {
  const text = formatFigure(figure, decimals);
  return text === DASH ? "unknown" : text.replace(MINUS, "minus ");
}

/** The name of an octave band on an axis: 31.5, 63, 1k, 8k. */
export function formatBand(band: number): string {
  return band >= 1000 ? `${band / 1000}k` : `${band}`;
}

/** The name of an octave band in a sentence: 63 Hz, 1 kHz. */
export function bandWords(band: number): string {
  return band >= 1000 ? withUnit(`${band / 1000}`, "kHz") : withUnit(`${band}`, "Hz");
}

/** Whole decibels of a distance from the limit, without its sign; never a "0" that hides a difference. */
function wholeDistance(margin: number): string {
  const whole = Math.round(Math.abs(margin));
  return whole === 0 ? "less than 1" : formatNumber(whole);
}

/** "3 dB over", "1 dB under, tight", "6 dB under", "not weighed". */
export function marginWords(state: State, margin?: Figure): string {
  if (state === "not weighed" || !isFigure(margin)) return stateWords[state];
  if (state === "over") return `${withUnit(wholeDistance(margin), "dB")} over`;
  const tail = state === "tight" ? ", tight" : "";
  return margin === 0 ? `at the limit${tail}` : `${withUnit(wholeDistance(margin), "dB")} under${tail}`;
}

/** The short form beside a poise: "3 over", "<1", "13". */
export function poiseLabel(state: State, margin?: Figure): string {
  if (state === "not weighed" || !isFigure(margin)) return DASH;
  const whole = Math.round(Math.abs(margin));
  const distance = whole === 0 && margin !== 0 ? "<1" : formatNumber(whole);
  return state === "over" ? `${distance} over` : distance;
}

/** Part of the allowance that is used up: 1 is the limit. */
export function spentOf(margin: number): number {
  return 10 ** (-margin / 10);
}

export function percent(fraction: number): string {
  const whole = Math.round(fraction * 100);
  if (whole === 0 && fraction > 0) return withUnit("<1", "%");
  return withUnit(formatNumber(whole), "%");
}

export const percentSpent = (margin: number): string => percent(spentOf(margin));

/** "1.9 times", "7 times"; one decimal below ten, where it can be told apart. */
export function timesWords(ratio: number): string {
  const decimals = ratio < 9.95 && Math.abs(ratio - Math.round(ratio)) >= 0.05 ? 1 : 0;
  return withUnit(formatNumber(ratio, decimals), "times");
}

const numberWords = [
  "no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten", "eleven", "twelve",
];

export const numberWord = (count: number): string => numberWords[count] ?? formatNumber(count);

/** "no yards", "one yard", "four yards", "13 yards". */
export function countWords(count: number, one: string, many = `${one}s`): string {
  return `${numberWord(count)} ${count === 1 ? one : many}`;
}

export function capitalise(sentence: string): string {
  return sentence.charAt(0).toUpperCase() + sentence.slice(1);
}

/** "Ines", "Ines and Tobi", "Ines, Tobi and Maro". */
export function listWords(words: readonly string[]): string {
  if (words.length < 2) return words[0] ?? "";
  return `${words.slice(0, -1).join(", ")} and ${words[words.length - 1]}`;
}

/** Reads what a person types: comma or point, spaces between thousands, either minus. Undefined when it is no number. */
export function parseNumber(text: string): number | undefined {
  const plain = text.replace(/[\s\u00a0\u202f]/g, "").replace(MINUS, "-").replace(",", ".");
  return /^[-+]?(\d+\.?\d*|\.\d+)$/.test(plain) ? Number(plain) : undefined;
}
