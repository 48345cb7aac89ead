import { describe, expect, test } from "vitest";
import { levelOf } from "../../lib/noise/levels";
import { readBudget } from "../../lib/noise/caseDocument";
import { fieldOf } from "../../lib/noise/sound/field";
import { effectiveLoss } from "../../lib/noise/effective";
import { answerOf, flat } from "./buildCase";
import { expectClose } from "./close";
import { lossSideBySide } from "./sideBySide";
import budget from "./truth/budget.json";
import radiation from "./truth/radiation.json";

describe("the worked composite of wall, door and leak", () => {
  const { composite: truth } = budget;
  const walls = { wall: truth["R wall"], door: truth["R door"], leak: undefined };
  const parts = (["wall", "door", "leak"] as const).map((name) => ({
    area: truth.areas[name],
    tl: walls[name],
  }));
  test("with its leak", () => expectClose(lossSideBySide(parts, 8), truth["R' composite"], truth.tolerance));
  test("without it", () =>
    expectClose(lossSideBySide(parts.slice(0, 2), 8), truth["R' without leak"], truth.tolerance));
  test("through the rooms: what enters the next room is the composite's", () => {
    const elements = parts.map(({ area, tl }, i) => ({
      id: `e${i}`,
      kind: i === 2 ? "leak" : "wall",
      from: "live",
      to: "next",
      area,
      ...(i < 2 && { tl }),
    }));
    const rooms = ["live", "next"].map((id) => ({
      id,
      building: "s",
      volume: 40,
      absorption: { area: flat(10) },
    }));
    const document = {
      rooms,
      elements,
      sources: [{ id: "kit", kind: "room", room: "live", lw: flat(100) }],
      receivers: ["live", "next"].map((room) => ({ id: room, kind: "room", room })),
    };
    const { live, next } = answerOf(document);
    // L1 - L2 = R' + 10 lg((A + S tau)/S): the next room loses through the same parts.
    const through = truth["R' composite"].map((r) => 13.9027 * 10 ** (-r / 10));
    const difference = live.levels.map(
      (level, band) =>
        Number(level) - Number(next.levels[band]) - 10 * Math.log10((10 + through[band]) / 13.9027),
    );
    expectClose(difference, truth["R' composite"], truth.tolerance);
  });
});

describe("the worked way from the studio to the neighbour's bedroom", () => {
  const { neighbour: truth } = budget;
  const { line, bedroom } = answerOf(truth.case);
  test("at the line", () => {
    expectClose(line.levels, truth.line.levels, truth.tolerance);
    expectClose(line.contributions["kit | wall"], truth.line.wall, truth.tolerance);
    expectClose(line.contributions["kit | door"], truth.line.door, truth.tolerance);
    expectClose([line.dba], [truth.line.dba], truth.tolerance);
    expectClose([line.margin_dba ?? NaN], [45 - truth.line.dba], truth.tolerance);
    expectClose(line.nc.map(Number), truth.line.nc, truth.tolerance);
  });
  test("in the bedroom", () => {
    expectClose(bedroom.levels, truth.bedroom.levels, truth.tolerance);
    for (const path of ["kit | wall > window", "kit | door > window"] as const)
      expectClose(bedroom.contributions[path], truth.bedroom[path], truth.tolerance);
    expectClose(bedroom.margin ?? [], truth.bedroom.margin, truth.tolerance);
    expectClose([bedroom.dba], [truth.bedroom.dba], truth.tolerance);
    expectClose(bedroom.nc.map(Number), truth.bedroom.nc, truth.tolerance);
    expect(bedroom.deciding_band).toBe(125);
  });
});

describe("sound radiated by a built-up side", () => {
  const { wall, door, cap, Rprime, LW, levelInside, diffuseness, tolerance } = radiation;
  const nine = (values: readonly number[]) => [null, ...values, null, null, null, null, null];
  const elements = [wall, door].map(({ area, R }, i) => ({
    id: `e${i}`,
    kind: "wall",
    from: "hall",
    to: "outdoors",
    area,
    tl: nine(R),
    position: [0, 0, 5],
    normal: [1, 0, 0],
    diffuseness,
  }));
  const document = {
    rooms: [{ id: "hall", building: "h", volume: 5000, absorption: { area: new Array(9).fill(500) } }],
    elements,
    sources: [{ id: "s", kind: "room", room: "hall", lw: new Array(9).fill(100) }],
    receivers: [{ id: "r", kind: "outdoor", position: [50, 0, 2] }],
  };
  test("the composite, below its cap", () => {
    const parts = [wall, door].map(({ area, R }) => ({ area, tl: R }));
    expectClose(lossSideBySide(parts, Rprime.length), Rprime, tolerance);
    expect(Math.max(...Rprime)).toBeLessThan(cap);
  });
  test("the power per level inside", () => {
    const { plan } = readBudget(document);
    const field = fieldOf(
      plan,
      new Map(plan.constructions.map((each) => [each.id, effectiveLoss(each)])),
      [],
    );
    const found = LW.map((_, i) => {
      const radiated = field.emitters.reduce((sum, __, m) => sum + field.emitted[m * 9 + i + 1], 0);
      return levelInside[i] + levelOf(radiated / field.inside[i + 1]);
    });
    expectClose(found, LW, tolerance);
  });
});
