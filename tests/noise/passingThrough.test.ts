import { describe, expect, test } from "vitest";
import { answerOf, buildCase, flat, type Answered } from "./buildCase";

const position = [-6, 4, 1];
const run = [{ kind: "end", s: 0.03, flush: false }];
const OUTSIDE: Record<string, Record<string, unknown>> = {
  "an outdoor source": { id: "pump", kind: "outdoor", position, lw: flat(90) },
  "the mouth of a fan": { id: "pump", kind: "fan", lw: flat(90), outlets: [{ id: "mouth", position, run }] },
  "a level given at a wall": { id: "pump", kind: "incident", at: { wall: flat(70) } },
};
const line = { id: "line", kind: "outdoor", position: [6, 2, 1.5] };
const receivers = [line, { id: "bed", kind: "room", room: "bed" }, { id: "ear", kind: "room", room: "live" }];

function heard(source: Record<string, unknown>): Record<string, Answered> {
  return answerOf(buildCase({ sources: [source], receivers }));
}
const numbers = (levels: readonly unknown[]) => levels.map(Number);

/** A source inside that makes those levels in the room of 10 m2 with 11 m2 of 40 dB: L_W = L_p + 10 lg((A + S tau)/4). */
function kitFor(levels: readonly unknown[]) {
  return {
    id: "pump",
    kind: "room",
    room: "live",
    lw: numbers(levels).map((level) => level + 10 * Math.log10((10 + 11e-4) / 4)),
  };
}

describe("what enters one house from outdoors sounds out of it again", () => {
  test.each(Object.entries(OUTSIDE))(
    "%s: as loud as a source inside that makes the same level there",
    (_, source) => {
      const outside = heard(source);
      const inside = heard(kitFor(outside.ear.levels));
      expect(inside.ear.levels[3]).toBeCloseTo(Number(outside.ear.levels[3]), 9);
      for (const [listener, path] of [
        ["bed", "pump | wall > window"],
        ["line", "pump | wall"],
      ]) {
        const [through, made] = [outside[listener].contributions[path], inside[listener].contributions[path]];
        numbers(made).forEach((level, band) => expect(numbers(through)[band]).toBeCloseTo(level, 6));
      }
    },
  );
  test("and never comes back into the house it left", () => {
    const { ear } = heard(OUTSIDE["an outdoor source"]);
    expect(Object.keys(ear.contributions).sort()).toEqual(["pump | wall", "pump | window > wall"]);
  });
  test("and is part of the level, not beside it", () => {
    const { bed } = heard(OUTSIDE["an outdoor source"]);
    const sum = Object.values(bed.contributions).reduce(
      (energy, levels) => energy + 10 ** (Number(levels[3]) / 10),
      0,
    );
    expect(10 * Math.log10(sum)).toBeCloseTo(Number(bed.levels[3]), 9);
  });
});
