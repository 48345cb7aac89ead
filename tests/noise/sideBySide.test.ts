import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { elementKinds } from "../../lib/noise/elements";
import { lossSideBySide } from "./sideBySide";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
const BANDS = 9;

describe("parts side by side", () => {
  const tl = fc.array(between(-10, 120), { minLength: BANDS, maxLength: BANDS });
  const parts = fc.array(fc.record({ area: between(0.01, 100), tl }), { minLength: 1, maxLength: 6 });

  test("let through something between the best and the worst of them", () => {
    fc.assert(
      fc.property(parts, (all) => {
        lossSideBySide(all, BANDS).forEach((value, band) => {
          const losses = all.map((one) => one.tl[band]);
          expect(value).toBeGreaterThanOrEqual(Math.min(...losses) - 1e-9);
          expect(value).toBeLessThanOrEqual(Math.max(...losses) + 1e-9);
        });
      }),
    );
  });

  test("of which half is shut and half open lose 3.01 dB; the unknown stays unknown", () => {
    const shut = { area: 1, tl: [Infinity, Infinity, Infinity] };
    expect(lossSideBySide([shut, { area: 1 }], 3)[0]).toBeCloseTo(3.0103, 4);
    expect(lossSideBySide([shut, { area: 1, tl: [0, NaN, Infinity] }], 3).slice(1)).toEqual([NaN, Infinity]);
  });
});

describe("an opening in a door or window", () => {
  const loss = Float64Array.from({ length: BANDS }, () => 40);
  test.each([
    ["door", (open: number) => elementKinds.door.passing({ area: 2, loss, params: { gapArea: open } })],
    ["window", (open: number) => elementKinds.window.passing({ area: 2, loss, params: { openArea: open } })],
  ] as const)("lets more through the larger it is: %s", (_, passing) => {
    fc.assert(
      fc.property(between(0.001, 0.1), between(1.01, 3), (open, times) => {
        const [shut, small, large] = [0, open, open * times].map(passing);
        small.forEach((each, band) => {
          expect(each).toBeGreaterThan(shut[band]);
          expect(large[band]).toBeGreaterThan(each);
        });
      }),
    );
  });
});
