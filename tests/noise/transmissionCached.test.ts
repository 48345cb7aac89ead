import { describe, expect, test } from "vitest";
import { descriptionSchema, transmissionCached, transmissionOf } from "../../lib/noise/transmission";

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
