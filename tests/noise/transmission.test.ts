import { describe, expect, test } from "vitest";
import { OCTAVE_BANDS, THIRD_BANDS } from "../../lib/noise/bands";
import { elementKinds } from "../../lib/noise/elements";
import { levelOf } from "../../lib/noise/levels";
import { descriptionSchema, transmissionOf } from "../../lib/noise/transmission";
import truth from "./truth/transmission.json";
import { printedNumbers } from "./transmissionNumbers";

/** The values of a printed row that the sheet leaves out are absent or undefined. */
type Printed = Record<string, number | undefined>;

function largestDeviation(found: readonly number[], bands: readonly number[], printed: Printed): number {
  const deviations = Object.entries(printed)
    .filter(([, value]) => value !== undefined)
    .map(([band, value]) => Math.abs(found[bands.indexOf(Number(band))] - Number(value)));
  expect(deviations.every(Number.isFinite)).toBe(true);
  return Math.max(0, ...deviations);
}

function unitOfLastDigit(printed: string): number {
  const [digits, exponent = "0"] = printed.split("e");
  const decimals = digits.split(".")[1]?.length ?? 0;
  return 10 ** (Number(exponent) - decimals);
}

/** Quantities in which the rule of integration shows in the fifth digit. */
const byQuadrature = /^(drive|bridge)/;

function toleranceOf(quantity: string, printed: string): number {
  if (quantity === "loss") return 0.006;
  return byQuadrature.test(quantity) ? 3e-4 * Number(printed) : 0.501 * unitOfLastDigit(printed);
}

describe("the worked examples", () => {
  test.each(truth.examples)("$name: every printed third-octave and octave", (example) => {
    const found = transmissionOf(descriptionSchema.parse(example.description));
    const third = largestDeviation(found.third, THIRD_BANDS, example.third);
    const octave = largestDeviation(found.octave, OCTAVE_BANDS, example.octave);
    expect(third).toBeLessThanOrEqual(example.toleranceDb);
    expect(octave).toBeLessThanOrEqual(example.toleranceDb);
  });

  const detailed = truth.examples.filter((example) => example.at500Hz);
  test.each(detailed)("$name: the numbers on the way, at 500 Hz", ({ description, at500Hz }) => {
    const found = printedNumbers(descriptionSchema.parse(description), 500);
    for (const [quantity, printed] of Object.entries(at500Hz!.values)) {
      const deviation = Math.abs(found[quantity] - Number(printed));
      const words = `${quantity}: ${found[quantity]} for ${printed}`;
      expect(deviation, words).toBeLessThanOrEqual(toleranceOf(quantity, printed));
    }
  });
});

describe("a second computation apart from this one", () => {
  test.each(truth.second.constructions)("$name", ({ description, octave, toleranceDb }) => {
    const found = transmissionOf(descriptionSchema.parse(description));
    expect(largestDeviation(found.octave, OCTAVE_BANDS, octave)).toBeLessThanOrEqual(toleranceDb);
  });
});

describe("the demo lot", () => {
  test.each(truth.demo)("$name", ({ description, octave, toleranceDb }) => {
    const found = transmissionOf(descriptionSchema.parse(description));
    expect(largestDeviation(found.octave, OCTAVE_BANDS, octave)).toBeLessThanOrEqual(toleranceDb);
  });

  test("the heavy door with its gap", () => {
    const { description, area, gapArea, surfaceMass, octave, exactly, toleranceDb } = truth.door;
    const leaf = transmissionOf(descriptionSchema.parse(description));
    const loss = Float64Array.from(leaf.octave);
    const passing = elementKinds.door.passing({ area, loss, params: { gapArea } });
    const door = Array.from(passing, (each) => -levelOf(each / area));
    expect(leaf.facts.surfaceMass).toBeCloseTo(surfaceMass, 6);
    expect(largestDeviation(door, OCTAVE_BANDS, octave)).toBeLessThanOrEqual(toleranceDb);
    expect(largestDeviation(door, OCTAVE_BANDS, exactly.octave)).toBeLessThanOrEqual(exactly.toleranceDb);
  });
});
