import { expect } from "vitest";

/** Expects two lists of decibels to agree within a tolerance, band by band, and says where they do not. */
export function expectClose(
  found: ArrayLike<number | string>,
  expected: readonly number[],
  tolerance: number,
): void {
  const wrong = expected.flatMap((value, i) => {
    const difference = Math.abs(Number(found[i]) - value);
    return difference <= tolerance + 1e-9 ? [] : [`[${i}] ${String(found[i])} instead of ${value}`];
  });
  expect(wrong).toEqual([]);
}

/** The upper eight of nine bands. */
export function upper<T>(values: ArrayLike<T>): T[] {
  return Array.from(values).slice(1);
}
