/**
 * Daily measure of noise on bare ears: 85 dB(A) for eight hours, halved for every 3 dB more (NIOSH 98-126, recommended
 * exposure limit). A reckoning for adults at work; it says nothing of one person's ears.
 */
export const EXPOSURE = { level: 85, minutes: 480, halvedBy: 3 } as const;

/** Minutes a day after which that measure is full, at a level in dB(A): 8 h / 2^((L - 85)/3). Silence is Infinity, unknown NaN. */
export function dailyMinutes(level: number): number {
  return EXPOSURE.minutes / 2 ** ((level - EXPOSURE.level) / EXPOSURE.halvedBy);
}
