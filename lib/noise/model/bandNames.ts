import { OCTAVE_BANDS } from "../bands";
import { ALL_BANDS, hasBand, type BandMask } from "./masks";

const nameOf = (band: number): string => (band >= 1000 ? `${band / 1000} kHz` : `${band} Hz`);

/** Bands in words, with their preposition: "at 63 Hz and 8 kHz", "in any band". */
export function bandNames(mask: BandMask): string {
  if (mask === ALL_BANDS) return "in any band";
  const names = OCTAVE_BANDS.filter((_, band) => hasBand(mask, band)).map(nameOf);
  const list =
    names.length < 2 ? names.join("") : `${names.slice(0, -1).join(", ")} and ${names[names.length - 1]}`;
  return `at ${list}`;
}
