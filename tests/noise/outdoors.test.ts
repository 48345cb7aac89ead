import { describe, expect, test } from "vitest";
import { exactMidband, OCTAVE_BANDS } from "../../lib/noise/bands";
import { levelOf, sumLevels } from "../../lib/noise/levels";
import { airAttenuation, airAttenuations } from "../../lib/noise/outdoors/air";
import { detourOver, largestDetour, screening, type Screen } from "../../lib/noise/outdoors/barrier";
import { centresOf, cutTowards, isBehind, liesFlat, type Face } from "../../lib/noise/outdoors/face";
import { groundAttenuation, groundShape } from "../../lib/noise/outdoors/ground";
import { addRay, endAt, type Yard } from "../../lib/noise/outdoors/ray";
import { aWeighted } from "../../lib/noise/weighting";
import { expectClose, upper } from "./close";
import air from "./truth/air.json";
import budget from "./truth/budget.json";
import truth from "./truth/outdoors.json";

const STILL: Yard = { air: new Float64Array(9), ground: [0, 0, 0], screens: [] };
const bandsOf = (bands: readonly number[]) =>
  bands.map((band) => OCTAVE_BANDS.findIndex((each) => each === band));

function groundOf(
  heights: readonly [number, number],
  across: number,
  ground: readonly [number, number, number],
): Float64Array {
  const out = new Float64Array(9);
  groundAttenuation(groundShape(heights[0]), groundShape(heights[1]), across, ground, out);
  return out;
}

function levelsAt(yard: Yard, from: readonly number[], to: readonly number[], power: number): number[] {
  const out = new Float64Array(9);
  addRay(yard, endAt([from[0], from[1], from[2]]), endAt([to[0], to[1], to[2]]), 1, out);
  return Array.from(out, (energy) => power + levelOf(energy));
}

function screenedBy(
  from: [number, number, number],
  to: [number, number, number],
  screen: Screen,
  share: number,
): number[] {
  const out = new Float64Array(9);
  screening(detourOver(from, to, screen, share), out);
  return Array.from(out, levelOf);
}

describe("attenuation by the air", () => {
  test.each(
    air.table2.atmospheres.map((each) => [`${each.temperature} degC, ${each.humidity} %`, each] as const),
  )("Table 2 at %s", (_, row) => {
    row.attenuation.forEach((printed, i) => {
      const found = airAttenuation(exactMidband(air.table2.bands[i]), row.temperature, row.humidity) * 1000;
      const known = row.temperature === 15 && row.humidity === 80 && air.table2.bands[i] === 1000;
      const half = printed >= 100 ? 1 : 0.0505;
      expect(Math.abs(found - (known ? 4.15 : printed))).toBeLessThanOrEqual(half);
    });
  });
  test.each(air.cells.rows.map((row) => [row.slice(0, 3).join(" "), row] as const))(
    "Table 1 at %s",
    (_, [temperature, humidity, band, printed]) => {
      const found = airAttenuation(exactMidband(band), temperature, humidity) * 1000;
      expect(Math.abs(found / printed - 1)).toBeLessThanOrEqual(air.cells.relativeTolerance);
    },
  );
  test.each(air.rows.map((row) => [`${row.temperature} degC, ${row.humidity} %`, row] as const))(
    "Table 1, row %s",
    (_, row) => {
      row.bands.forEach((band, i) => {
        const found = airAttenuation(exactMidband(band), row.temperature, row.humidity) * 1000;
        expect(Math.abs(found / row.attenuation[i] - 1)).toBeLessThanOrEqual(0.005);
      });
    },
  );
});

describe("published propagation cases", () => {
  const { cases } = truth;
  test.each(["T01", "T03", "T04"] as const)("%s", (name) => {
    const { ground, levels, total, totalA } = cases[name];
    const yard: Yard = {
      air: airAttenuations(cases.temperature, cases.humidity),
      ground: [ground[0], ground[1], ground[2]],
      screens: [],
    };
    const found = levelsAt(yard, cases.sourceAt, cases.receiverAt, cases.lw);
    expectClose(upper(found), levels, cases.tolerance);
    expectClose(
      [sumLevels(upper(found)), aWeighted([-Infinity, ...upper(found)])],
      [total, totalA],
      cases.tolerance,
    );
  });
  test("divergence", () => {
    const found = truth.divergence.distances.map(
      (distance) => -levelsAt({ ...STILL, ground: [1, 1, 1] }, [0, 0, 100], [distance, 0, 100], 0)[8],
    );
    expectClose(found, truth.divergence.expected, 0.01);
  });
});

describe("ground", () => {
  test("hard ground near by gains 3 dB in every band", () => {
    const { across, heights, expected } = truth.hardGround;
    expectClose(groundOf([heights[0], heights[1]], across, [0, 0, 0]), new Array(9).fill(expected), 1e-9);
  });
  test("porous ground under a very long path", () => {
    const found = groundOf([0, 0], 1e6, [1, 1, 1]);
    expectClose(
      bandsOf(truth.porousGround.bands).map((band) => found[band]),
      truth.porousGround.expected,
      0.01,
    );
  });
  test("31.5 Hz takes the row of 63 Hz", () => {
    const found = groundOf([1, 4], 300, [0.3, 0.6, 1]);
    expect(found[0]).toBe(found[1]);
  });
});

describe("a screen", () => {
  const wall = (height: number, x: number, thickness = 0): Screen => ({
    p1: [x, -50],
    p2: [x, 50],
    height,
    thickness,
  });

  test("with its edge on the sight line takes 10 lg 3", () => {
    expectClose(
      screenedBy([0, 0, 2], [100, 0, 2], wall(2, 50), 0.5),
      new Array(9).fill(truth.onSightLine.expected),
      0.005,
    );
  });
  test("just under the sight line takes less", () => {
    const { bands, expected, tolerance } = truth.underSightLine;
    const found = screenedBy([0, 0, 2], [100, 0, 2], wall(1.5, 50), 0.5);
    expectClose(
      bandsOf(bands).map((band) => found[band]),
      expected,
      tolerance,
    );
  });
  test("the reckoned case at 200 m", () => {
    const { Agr, Abar, tolerance } = truth.barrier;
    expectClose(upper(groundOf([1.5, 1.5], 200, [1, 1, 1])), Agr, tolerance);
    const height = 1.5 + Math.sqrt(101 ** 2 - 100 ** 2);
    const found = upper(screenedBy([0, 0, 1.5], [200, 0, 1.5], wall(height, 100), 0.5));
    // Printed as D_z - A_gr, never below 0: where it is above 0 and not at its cap, D_z follows from both.
    const expected = Abar.map((bar, band) => bar + Agr[band]);
    Abar.forEach((bar, band) =>
      expect(bar === 0 ? found[band] <= Agr[band] : Math.abs(found[band] - expected[band]) <= tolerance).toBe(
        true,
      ),
    );
  });

  const { fencePath } = budget;
  const yardWith = (height: number): Yard => ({
    air: airAttenuations(10, 70),
    ground: [0, 1, 1],
    screens: [wall(height, 5)],
  });
  test.each([
    ["2", fencePath["Lp 2 m fence"]],
    ["3", fencePath["Lp 3 m fence"]],
  ] as const)("of %s m on the worked path", (height, levels) => {
    const found = levelsAt(yardWith(Number(height)), [0, 0, 1], [14, 0, 4], fencePath.lw);
    expectClose(upper(found), levels, fencePath.tolerance);
    const detour = detourOver([0, 0, 1], [14, 0, 4], wall(Number(height), 5), 5 / 14);
    expect(detour.z).toBeCloseTo(fencePath.pathDifference[height], 4);
  });
  test("its parts on the worked path", () => {
    expectClose(
      upper(airAttenuations(10, 70)).map((each) => each * fencePath.distance),
      fencePath.Aatm,
      0.002,
    );
    expectClose(upper(groundOf([1, 4], 14, [0, 1, 1])), fencePath.Agr, 0.01);
    expectClose(
      upper(screenedBy([0, 0, 1], [14, 0, 4], wall(2, 5), 5 / 14)),
      fencePath["Dz 2 m fence"],
      0.01,
    );
    expectClose(
      upper(screenedBy([0, 0, 1], [14, 0, 4], wall(3, 5), 5 / 14)),
      fencePath["Dz 3 m fence"],
      0.01,
    );
  });
  test("of several the one with the largest path difference counts", () => {
    const both = largestDetour([0, 0, 1], [14, 0, 2], [wall(2, 5), wall(3, 7)]);
    expect(both).toEqual(largestDetour([0, 0, 1], [14, 0, 2], [wall(3, 7)]));
  });
  test("does not screen whoever stands on its line, unless beyond it", () => {
    const screens = [wall(2, 5)];
    expect(largestDetour([5.05, 0, 1], [14, 0, 2], screens)).toBeNull();
    expect(largestDetour([0, 0, 1], [5.05, 0, 1], screens)).toBeNull();
    expect(largestDetour([0, 0, 1], [4.95, 0, 1], screens, true)?.z).toBeGreaterThan(0);
  });
  test("ends where its line ends", () => {
    expect(largestDetour([0, 60, 1], [14, 60, 2], [wall(2, 5)])).toBeNull();
  });
  test("that is thick screens more, up to 25 dB", () => {
    const thin = screenedBy([0, 0, 1], [14, 0, 1], wall(4, 5), 5 / 14);
    const thick = screenedBy([0, 0, 1], [14, 0, 1], wall(4, 5, 1), 5 / 14);
    thick.forEach((screened, band) => expect(screened).toBeGreaterThan(thin[band] - 1e-9));
    expect(Math.max(...screenedBy([0, 0, 1], [14, 0, 1], wall(20, 5, 2), 5 / 14))).toBeCloseTo(25, 9);
    expect(Math.max(...screenedBy([0, 0, 1], [14, 0, 1], wall(20, 5), 5 / 14))).toBeCloseTo(20, 9);
  });
});

describe("a face", () => {
  const face: Face = { at: [0, 0, 1.5], normal: [1, 0, 0], size: [4, 2.4], likeRoof: false };
  test("is one part from twice its longest side on", () => {
    expect(cutTowards(face, [8, 0, 1.5])).toEqual([1, 1]);
    expect(cutTowards(face, [7.9, 0, 1.5])).toEqual([2, 1]);
    expect(cutTowards(face, [0.2, 0, 1.5])).toEqual([8, 5]);
    expect(cutTowards({ ...face, size: [40, 30] }, [1, 0, 1.5])).toEqual([12, 12]);
  });
  test("has parts across and up, in its plane", () => {
    expect(centresOf(face, [2, 2])).toEqual(
      expect.arrayContaining(
        [
          [0, 1, 0.9],
          [0, -1, 2.1],
        ].map((at) => at.map((x) => expect.closeTo(x, 9))),
      ),
    );
    const roof: Face = { at: [0, 0, 3], normal: [0, 0, 1], size: [4, 2], likeRoof: true };
    expect(centresOf(roof, [2, 1])).toEqual([
      [-1, 0, 3],
      [1, 0, 3],
    ]);
  });
  test("has a front that holds its plane, and a roof has no back", () => {
    expect(isBehind(face, [0, 3, 1])).toBe(false);
    expect(isBehind(face, [-0.1, 3, 1])).toBe(true);
    expect(isBehind({ ...face, likeRoof: true }, [-0.1, 3, 1])).toBe(false);
  });
  test("lies flat from more than 45 degrees of lean on, looking up or down", () => {
    const leans = [
      [0, 0, 1],
      [0, 0, -1],
      [0.5, 0.5, 0.8],
      [0.6, 0.6, 0.8],
      [0, 1, 0],
    ] as const;
    expect(leans.map(liesFlat)).toEqual([true, true, true, false, false]);
  });
});
