import { describe, expect, test } from "vitest";
import { answerOf, buildCase, flat } from "./buildCase";

// Solver method 5 and 6: +3 dB in front and -7 dB behind are said of vertical faces; a roof radiates 0 dB all round and
// has no back. What lies flat, whatever it is called, is no vertical face.
const UP = [0, 0, 1];
const DOWN = [0, 0, -1];
const [wall, window] = buildCase().elements;
const receivers = [
  { id: "above", kind: "outdoor", position: [9, 2, 8] },
  { id: "below", kind: "outdoor", position: [9, -2, 0.5] },
];

function yard(element: Record<string, unknown>): Record<string, number[]> {
  const answer = answerOf(buildCase({ elements: [{ ...wall, position: [0, 0, 3], ...element }], receivers }));
  return { above: answer.above.levels.map(Number), below: answer.below.levels.map(Number) };
}
const leftOver = (found: number[], known: number[]) => found.map((level, band) => level - known[band]);

function expectEach(found: number[], value: number): void {
  expect(found).toHaveLength(8);
  found.forEach((each) => expect(each).toBeCloseTo(value, 9));
}

describe("a face that lies flat", () => {
  test.each(["wall", "roof", "floor", "ceiling", "door", "window", "flanking"])(
    "radiates alike above and below its plane: %s",
    (kind) => {
      for (const normal of [UP, DOWN]) {
        const [found, even] = [yard({ kind, normal }), yard({ kind, normal, directivity: 0 })];
        expectEach(leftOver(found.above, even.above), 0);
        expectEach(leftOver(found.below, even.below), 0);
      }
    },
  );
  test.each([
    ["leak", { kind: "leak", area: 0.01, tl: undefined }],
    [
      "duct",
      { kind: "duct", area: undefined, tl: undefined, opening: 0.02, run: [{ kind: "end", s: 0.02 }] },
    ],
  ])("radiates alike above and below its plane: %s", (_, given) => {
    const [found, even] = [yard({ ...given, normal: UP }), yard({ ...given, normal: UP, directivity: 0 })];
    expectEach(leftOver(found.above, even.above), 0);
    expectEach(leftOver(found.below, even.below), 0);
  });
  test("is one that leans more than halfway back; what stands steeper has a front", () => {
    const leaning = { kind: "window", normal: [0.6, 0, 0.8] };
    expectEach(leftOver(yard(leaning).above, yard({ ...leaning, directivity: 0 }).above), 0);
    const steep = { kind: "window", normal: [0.8, 0, 0.6] };
    expectEach(leftOver(yard(steep).above, yard({ ...steep, directivity: 0 }).above), 3);
  });
  test("keeps a directivity that was typed in", () => {
    const typed = { kind: "door", normal: UP, directivity: 5 };
    expectEach(leftOver(yard(typed).above, yard({ ...typed, directivity: 0 }).above), 5);
  });
  test("takes in what comes from below its plane in full; a wall that looks away loses 10 dB", () => {
    const bedWith = (normal: number[]) => {
      const entry = { ...window, normal };
      const source = { id: "pump", kind: "outdoor", position: [0, 0, 1], lw: flat(90) };
      return answerOf(buildCase({ elements: [entry], sources: [source] })).bed.levels.map(Number);
    };
    expectEach(leftOver(bedWith(UP), bedWith([-1, 0, 0])), 0);
    expectEach(leftOver(bedWith([1, 0, 0]), bedWith([-1, 0, 0])), -10);
  });
});
