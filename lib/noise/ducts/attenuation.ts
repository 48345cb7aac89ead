import { SPEED_OF_SOUND } from "../air";
import { BAND_COUNT, EXACT_BANDS } from "../bands";
import { energyOf, levelOf } from "../levels";
import { toArithmetic } from "../spectrum";
import type { DuctPiece } from "./run";

const FLUSH = 0.7;
const FREE = 1;

const diameterOf = (section: number): number => Math.sqrt((4 * section) / Math.PI);

/** (a c/(pi f D))^2 of a mouth of that cross-section, m2. */
function mouthTerm(section: number, a: number, frequency: number): number {
  return ((a * SPEED_OF_SOUND) / (Math.PI * frequency * diameterOf(section))) ** 2;
}

/**
 * End reflection of a mouth, dB over the nine bands: 10 lg(1 + (a c/(pi f D))^2), a = 0.7 flush, 1.0 free (solver
 * method 7). Cross-section in m2.
 */
export function endReflection(section: number, flush: boolean): Float64Array {
  const a = flush ? FLUSH : FREE;
  return Float64Array.from(EXACT_BANDS, (frequency) => levelOf(1 + mouthTerm(section, a, frequency)));
}

/**
 * What a mouth in a room takes in beyond its area, dB: 10 lg max(1, (lambda^2/(pi S))/(1 + (0.7 c/(pi f D))^2)), by
 * reciprocity of a flush mouth (solver method 7).
 */
export function entryGain(section: number): Float64Array {
  return Float64Array.from(EXACT_BANDS, (frequency) => {
    const wavelength = SPEED_OF_SOUND / frequency;
    const gain = wavelength ** 2 / (Math.PI * section) / (1 + mouthTerm(section, FLUSH, frequency));
    return levelOf(Math.max(1, gain));
  });
}

function pieceAttenuation(piece: DuctPiece): Float64Array {
  return piece.kind === "silencer" ? toArithmetic(piece.il) : endReflection(piece.s, piece.flush);
}

/** Attenuation of a whole run, dB over the nine bands; NaN where a piece is not known. */
export function runAttenuation(run: readonly DuctPiece[]): Float64Array {
  const total = new Float64Array(BAND_COUNT);
  for (const piece of run) pieceAttenuation(piece).forEach((loss, band) => (total[band] += loss));
  return total;
}

/** S tau of a duct entered at a mouth of that opening, m2: S 10^((dL_entry - attenuations)/10) (solver method 7). */
export function ductPassing(opening: number, run: readonly DuctPiece[]): Float64Array {
  const lost = runAttenuation(run);
  return entryGain(opening).map((gain, band) => opening * energyOf(gain - lost[band]));
}
