import { OCTAVE_BANDS } from "@/lib/noise/bands";

export type Comma = "decimal" | "separator";

/** Nine levels found in a text, null where none was; undefined where the text holds no levels. */
export type ReadLevels = (number | null)[] | undefined;

/** What a comma most likely means: between figures where points mark decimals, else a decimal mark. */
export function guessComma(text: string): Comma {
  const decimals = text.replace(/\b31\.5\b/g, "");
  return /\d\.\d/.test(decimals) ? "separator" : "decimal";
}

interface Token {
  value: number;
  /** Index of the band it names, -1 where it names none. */
  band: number;
}

const FIGURE = /[-\u2212]?\d+(?:\.\d+)?(?:\s?k(?:hz)?\b)?/gi;

function tokensOf(text: string, comma: Comma): Token[] {
  const plain = comma === "decimal" ? text.replace(/(\d),(\d)/g, "$1.$2") : text.replace(/,/g, " ");
  return [...plain.matchAll(FIGURE)].map(([figure]) => {
    const number = Number(figure.replace("\u2212", "-").replace(/\s?k(hz)?$/i, ""));
    const value = /k/i.test(figure) ? number * 1000 : number;
    return { value, band: OCTAVE_BANDS.findIndex((band) => band === value) };
  });
}

const isLevel = ({ value }: Token): boolean => value >= -30 && value <= 160;

/** A row of bands and under it a row of levels. */
function fromTable(tokens: readonly Token[]): ReadLevels {
  const start = tokens.findIndex((_, at) => [0, 1, 2, 3].every((step) => tokens[at + step]?.band === tokens[at]!.band + step && tokens[at]!.band >= 0));
  if (start < 0) return undefined;
  const first = tokens[start]!.band;
  let count = 1;
  while (tokens[start + count]?.band === first + count) count += 1;
  const levels = tokens.slice(start + count, start + 2 * count);
  return levels.length > 0 ? OCTAVE_BANDS.map((_, i) => valueAt(levels[i - first])) : undefined;
}

const valueAt = (token: Token | undefined): number | null => (token && isLevel(token) ? token.value : null);

/** Each band beside its level: "63 104.0  125 101.0". */
function fromPairs(tokens: readonly Token[]): ReadLevels {
  const levels: (number | null)[] = OCTAVE_BANDS.map(() => null);
  for (let at = 0; at + 1 < tokens.length; at += 1) {
    const { band } = tokens[at]!;
    if (band < 0 || levels[band] !== null || !isLevel(tokens[at + 1]!)) continue;
    levels[band] = tokens[at + 1]!.value;
    at += 1;
  }
  return levels.filter((level) => level !== null).length > 2 ? levels : undefined;
}

/** Nine levels alone, or eight from 63 Hz up. */
function fromRow(tokens: readonly Token[]): ReadLevels {
  if (!tokens.every(isLevel)) return undefined;
  const values = tokens.map(({ value }) => value);
  if (values.length === OCTAVE_BANDS.length) return values;
  return values.length === OCTAVE_BANDS.length - 1 ? [null, ...values] : undefined;
}

/** Reads levels from what a meter or a table gives: bands over levels, bands beside levels, or levels alone. */
export function readMeasurement(text: string, comma: Comma = guessComma(text)): ReadLevels {
  const tokens = tokensOf(text, comma);
  const line = text.split(/\r?\n/).map((row) => fromRow(tokensOf(row, comma)));
  return fromTable(tokens) ?? fromPairs(tokens) ?? fromRow(tokens) ?? line.find(Boolean);
}
