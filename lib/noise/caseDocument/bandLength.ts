import { BAND_COUNT } from "../bands";
import { CaseFault, pathWords, type Key } from "./fault";

const isBandValue = (value: unknown) => typeof value === "number" || value === null || value === "silent";

/** The reason why a spectrum of that many values is refused. */
export function spectrumLength(length: number): string {
  return `a spectrum has 8 values (63 Hz to 8 kHz) or 9 (from 31.5 Hz); this one has ${length}`;
}

/** Shortest list that can only be meant as a spectrum: places have three numbers, grounds three. */
const LEAST = 4;

/** Lists and objects inside one another, far more than any document needs. */
const DEEPEST = 20;

/** How many bands a document speaks of, 8 or 9: one length throughout. Throws where two are mixed. */
export function bandLengthOf(document: unknown): number {
  let found: number | null = null;
  const walk = (value: unknown, path: Key[]): void => {
    if (path.length > DEEPEST)
      throw new CaseFault(
        `lists and objects stand more than ${DEEPEST} deep inside one another`,
        pathWords(path),
      );
    if (Array.isArray(value)) {
      const isSpectrum = value.length >= LEAST && value.every(isBandValue);
      if (!isSpectrum) return value.forEach((each, i) => walk(each, [...path, i]));
      if (value.length !== BAND_COUNT && value.length !== BAND_COUNT - 1) {
        throw new CaseFault(spectrumLength(value.length), pathWords(path));
      }
      if (found !== null && found !== value.length) {
        throw new CaseFault(
          `a document uses one number of bands throughout; elsewhere it is ${found}`,
          pathWords(path),
        );
      }
      found = value.length;
    } else if (typeof value === "object" && value !== null) {
      Object.entries(value).forEach(([key, each]) => walk(each, [...path, key]));
    }
  };
  walk(document, []);
  return found ?? BAND_COUNT - 1;
}
