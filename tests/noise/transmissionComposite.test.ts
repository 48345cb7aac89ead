import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  combineLimit,
  composite,
  descriptionSchema,
  gapCombined,
  transmissionCached,
  transmissionOf,
} from "../../lib/noise/transmission";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

function expectSame(found: readonly number[], expected: readonly number[]): void {
  found.forEach((value, i) => expect(value).toBeCloseTo(expected[i], 6));
}

describe("parts side by side", () => {
  const tl = fc.array(between(-10, 120), { minLength: 9, maxLength: 9 });
  const part = fc.record({ area: between(0.01, 100), tl });
  const parts = fc.array(part, { minLength: 1, maxLength: 6 });

  test("let through something between the best and the worst of them", () => {
    fc.assert(
      fc.property(parts, (all) => {
        composite(all).forEach((value, band) => {
          const losses = all.map((one) => one.tl[band]);
          expect(value).toBeGreaterThanOrEqual(Math.min(...losses) - 1e-9);
          expect(value).toBeLessThanOrEqual(Math.max(...losses) + 1e-9);
        });
      }),
    );
  });

  test("may be named in any order", () => {
    fc.assert(fc.property(parts, (all) => expectSame(composite([...all].reverse()), composite(all))));
  });

  test("keep apart what lets nothing through and what is not known", () => {
    const shut = { area: 1, tl: [Infinity, Infinity, Infinity] };
    const open = { area: 1, tl: [0, NaN, Infinity] };
    expect(composite([shut, open])[0]).toBeCloseTo(10 * Math.log10(2), 9);
    expect(composite([shut, open]).slice(1)).toEqual([NaN, Infinity]);
    expect(combineLimit([Infinity, NaN, Infinity], Infinity)).toEqual([Infinity, NaN, Infinity]);
    expect(combineLimit([Infinity], 55)[0]).toBeCloseTo(55, 9);
    expect(gapCombined([NaN, Infinity], 2, 0)).toEqual([NaN, Infinity]);
  });

  test("of differing bands, or none, are refused", () => {
    expect(() => composite([])).toThrow(RangeError);
    expect(() =>
      composite([
        { area: 1, tl: [1] },
        { area: 1, tl: [1, 2] },
      ]),
    ).toThrow(RangeError);
  });

  test("lose by a gap and by a limit, the more the larger the gap", () => {
    fc.assert(
      fc.property(tl, between(0.001, 0.1), between(1, 3), between(30, 80), (given, gap, times, limit) => {
        const small = gapCombined(given, 2, gap);
        const large = gapCombined(given, 2, gap * times);
        const limited = combineLimit(given, limit);
        given.forEach((value, i) => {
          expect(small[i]).toBeLessThan(value);
          expect(large[i]).toBeLessThanOrEqual(small[i]);
          expect(limited[i]).toBeLessThanOrEqual(Math.min(value, limit));
        });
      }),
    );
  });
});

describe("a remembered transmission loss", () => {
  const wall = (thickness: number) =>
    descriptionSchema.parse({ kind: "single", leaf: { plies: [["mdf", thickness]] } });

  test("is the computed one, and is computed once", () => {
    const found = transmissionCached(wall(0.0301));
    expect(found).toEqual(transmissionOf(wall(0.0301)));
    expect(transmissionCached(wall(0.0301))).toBe(found);
  });

  test("is forgotten after 500 others, unless it was asked for again", () => {
    const [dropped, asked] = [transmissionCached(wall(0.0302)), transmissionCached(wall(0.0303))];
    for (let i = 0; i < 499; i++) transmissionCached(wall(0.031 + i / 1e6));
    expect(transmissionCached(wall(0.0303))).toBe(asked);
    transmissionCached(wall(0.04));
    expect(transmissionCached(wall(0.0303))).toBe(asked);
    expect(transmissionCached(wall(0.0302))).not.toBe(dropped);
  });
});
