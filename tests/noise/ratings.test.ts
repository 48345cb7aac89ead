import { describe, expect, test } from "vitest";
import { limitLevels, ncLevels, ncOf, NC_EDITIONS, nrLevels, nrOf } from "../../lib/noise/criteria";
import { sumLevels } from "../../lib/noise/levels";
import { aWeighted, cWeighted, WEIGHTS } from "../../lib/noise/weighting";
import budget from "./truth/budget.json";
import truth from "./truth/ratings.json";

const withSilence = (levels: readonly (number | null)[]) => levels.map((level) => level ?? -Infinity);
const SPECTRUM = withSilence([null, ...budget.ratings.levels]);

describe("ratings of the worked spectrum", () => {
  const { dba, dbc, nc, nr, tolerance, marginsToNC25 } = budget.ratings;
  test("weighted totals", () => {
    expect(Math.abs(aWeighted(SPECTRUM) - dba)).toBeLessThanOrEqual(tolerance);
    expect(Math.abs(cWeighted(SPECTRUM) - dbc)).toBeLessThanOrEqual(tolerance);
  });
  test("NC and NR with their bands", () => {
    expect(ncOf(SPECTRUM).value).toBeCloseTo(nc[0], 2);
    expect(ncOf(SPECTRUM).band).toBe(nc[1]);
    expect(nrOf(SPECTRUM).value).toBeCloseTo(nr[0], 2);
    expect(nrOf(SPECTRUM).band).toBe(nr[1]);
  });
  test("room left to NC-25", () => {
    const left = Array.from(ncLevels(25))
      .slice(1)
      .map((limit, band) => limit - budget.ratings.levels[band]);
    expect(left).toEqual(marginsToNC25);
  });
});

describe("printed ratings", () => {
  test.each(truth.nc.map((each) => [each.source, each] as const))("%s", (_, { levels, value, tolerance }) => {
    const rating = ncOf(withSilence(levels)).value;
    if (value === "above") expect(rating).toBe(Infinity);
    else expect(Math.abs(rating - Number(value))).toBeLessThanOrEqual(tolerance ?? 0);
  });
  test.each(truth.nr.map((each) => [each.source, each] as const))(
    "%s",
    (_, { levels, value, tolerance, band }) => {
      expect(Math.abs(nrOf(levels).value - value)).toBeLessThanOrEqual(tolerance);
      if (band) expect(nrOf(levels).band).toBe(band);
    },
  );
  test("A-weighting of a flat band, from its third at the midband", () => {
    expect(truth.weighting.level + WEIGHTS.A[0]).toBeCloseTo(truth.weighting.band31, 6);
    expect(truth.weighting.level + WEIGHTS.A[1]).toBeCloseTo(truth.weighting.band63, 6);
  });
});

describe("a rating", () => {
  test("names the lower of two bands with the same value", () => {
    const onCurve = Array.from(ncLevels(30));
    expect(ncOf(onCurve).band).toBe(31.5);
  });
  test.each(NC_EDITIONS)("gives every curve of %s back", (edition) => {
    for (const rating of [15, 22.5, 40, 67])
      expect(
        ncOf(
          ncLevels(rating, edition).map((x) => (Number.isNaN(x) ? -Infinity : x)),
          edition,
        ).value,
      ).toBeCloseTo(rating, 9);
  });
  test("the editions differ where they are printed to differ", () => {
    expect(ncLevels(30, "classic")[5]).toBe(31);
    expect(ncLevels(30)[5]).toBe(32);
  });
  test("falls below the family by parallel shift", () => {
    const low = ncLevels(15).map((level) => level - 4);
    expect(ncOf(low).value).toBeCloseTo(11, 9);
  });
  test("above the family names the band that stands furthest above the highest curve", () => {
    const loud = new Array(9).fill(110);
    expect(ncOf(loud)).toEqual({ value: Infinity, band: 4000 });
    expect(ncOf([...loud.slice(0, 4), 130, ...loud.slice(5)])).toEqual({ value: Infinity, band: 500 });
  });
  test("is unknown with one unknown band, and silent in silence", () => {
    expect(ncOf([NaN, ...SPECTRUM.slice(1)]).value).toBeNaN();
    expect(aWeighted([NaN, ...SPECTRUM.slice(1)])).toBeNaN();
    expect(ncOf(new Array(9).fill(-Infinity))).toEqual({ value: -Infinity, band: null });
  });
  test("a level at 1 kHz equals its NR number", () => expect(nrLevels(33)[5]).toBe(33));
  test("a limit of silence stands for the least level", () => {
    const limits = limitLevels({
      metric: "curve",
      value: null,
      edition: "",
      levels: ["silent", 30, null, 30, 30, 30, 30, 30, 30],
    });
    expect(Array.from(limits.slice(0, 3))).toEqual([-100, 30, NaN]);
  });
});

describe("sums", () => {
  test("two equal sources are 3.01 dB louder", () => expect(sumLevels([60, 60])).toBeCloseTo(63.0103, 4));
  test("silence vanishes and the unknown spreads", () => {
    expect(sumLevels([50, -Infinity])).toBeCloseTo(50, 12);
    expect(sumLevels([])).toBe(-Infinity);
    expect(sumLevels([50, NaN])).toBeNaN();
  });
  test("three equal parts are 4.77 dB louder", () => expect(sumLevels([50, 50, 50])).toBeCloseTo(54.7712, 4));
});
