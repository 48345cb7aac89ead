import type { PathVerdict } from "@/lib/noise/verdict";
import { marginWords, oneDecimal, percent, spokenFigure, withUnit } from "../format";
import { isNumber, type Column } from "./columns";

const staysCapital = (name: string) => /^(No\.|[A-Z][A-Z0-9])/.test(name);

/** A part's name inside a sentence: "the yard door"; what follows a comma is left out; numbers and initials keep their letters. */
export function inSentence(whole: string): string {
  const name = staysCapital(whole) ? whole : whole.split(",")[0]!;
  if (/^(the|our|your|my) /i.test(name)) return name.charAt(0).toLowerCase() + name.slice(1);
  return `the ${staysCapital(name) ? name : name.charAt(0).toLowerCase() + name.slice(1)}`;
}

/** "52 dB, limit 49, 3 dB over, at 63 Hz" */
export function columnSentence(column: Column): string {
  const level = isNumber(column.level) ? withUnit(spokenFigure(column.level), column.unit) : spokenFigure(column.level);
  const limit = column.limit === null ? "" : `, limit ${spokenFigure(column.limit)}, ${marginWords(column.state, column.margin)}`;
  return `${level}${limit}, ${column.where}`;
}

export function chartSentence(columns: readonly Column[], lit: Column): string {
  const over = columns.filter(({ state, limit }) => state === "over" && limit !== null).length;
  const limited = columns.filter(({ limit }) => limit !== null).length;
  const count = limited === 0 ? "Level band by band, no limit" : `Level and limit band by band, ${over} of ${limited} over`;
  return `${count}; lit: ${columnSentence(lit)}.`;
}

export function sharesSentence(loudest: PathVerdict | undefined, share: number, lit: Column): string {
  if (!loudest || share === 0) return `Shares of the energy that arrives: nothing ${lit.where}.`;
  return `Shares of the energy that arrives; ${lit.where} ${inSentence(loudest.name)} has the most, ${percent(share)}.`;
}

export const marginFigure = (column: Column): string => (column.margin === null ? "" : oneDecimal(column.margin));
