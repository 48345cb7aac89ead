/** Nominal octave bands of every budget, Hz (IEC 61260-1). The only list of octave bands in the project. */
export const OCTAVE_BANDS = [31.5, 63, 125, 250, 500, 1000, 2000, 4000, 8000] as const;
export type Band = (typeof OCTAVE_BANDS)[number];
export const BAND_COUNT = OCTAVE_BANDS.length;

/** Index of the first band that a listener's state is taken over: 31.5 Hz is shown, never judged alone. */
export const FIRST_JUDGED = 1;

/** Nominal third-octave bands in which transmission loss is computed, Hz (IEC 61260-1). */
export const THIRD_BANDS = [
  25, 31.5, 40, 50, 63, 80, 100, 125, 160, 200, 250, 315, 400, 500, 630, 800, 1000, 1250, 1600, 2000, 2500, 3150, 4000,
  5000, 6300, 8000, 10000,
] as const;

/** Exact midband frequency behind a nominal one, Hz: 1000 * 10^(n/10) (IEC 61260-1, base ten). */
export function exactMidband(nominal: number): number {
  return 1000 * 10 ** (Math.round(10 * Math.log10(nominal / 1000)) / 10);
}

/** Exact midbands of the octave bands, Hz. */
export const EXACT_BANDS: readonly number[] = OCTAVE_BANDS.map(exactMidband);
