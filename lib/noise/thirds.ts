import { energyOf, levelOf, sumLevels } from "./levels";

/** Three third-octaves make one octave: index 0 to 2 is 25, 31.5 and 40 Hz. */
function inThrees<T>(values: readonly number[], combine: (three: number[]) => T): T[] {
  if (values.length % 3 !== 0) throw new RangeError("third-octaves come in threes");
  return Array.from({ length: values.length / 3 }, (_, i) => combine(values.slice(3 * i, 3 * i + 3)));
}

/** Octave levels from third-octave levels, dB: the energy sum (solver method 1). */
export function octaveLevels(thirds: readonly number[]): number[] {
  return inThrees(thirds, sumLevels);
}

/** Octave transmission loss from third-octaves, dB: -10 lg of the mean tau (flat spectrum inside the octave). */
export function octaveLoss(thirds: readonly number[]): number[] {
  return inThrees(thirds, (three) => -levelOf(three.reduce((sum, loss) => sum + energyOf(-loss), 0) / 3));
}
