import { describe, expect, test } from "vitest";
import { balanceRooms } from "../../lib/noise/balance";
import { entryGain, endReflection } from "../../lib/noise/ducts/attenuation";
import { levelOf } from "../../lib/noise/levels";
import {
  airArea,
  areaFromDecay,
  decayOf,
  directFactor,
  filled,
  statisticalFrom,
  surfaceArea,
} from "../../lib/noise/rooms";
import { answerOf, buildCase, flat } from "./buildCase";
import { expectClose, upper } from "./close";
import budget from "./truth/budget.json";
import truth from "./truth/rooms.json";

const everywhere = (value: number) => new Float64Array(9).fill(value);

describe("decay and absorption", () => {
  const { sabineEyring, measured, air, level, office } = truth;
  const linings = sabineEyring.surfaces.map((area, i) => ({
    area,
    alpha: everywhere(sabineEyring.alpha[i]),
  }));
  test.each(["sabine", "eyring"] as const)("the decay by %s", (model) => {
    const seconds = decayOf(sabineEyring.volume, surfaceArea(linings, model)[4]);
    expect(Math.abs(seconds / sabineEyring[model] - 1)).toBeLessThanOrEqual(sabineEyring.relativeTolerance);
  });
  test("an area from a measured decay", () => {
    expect(
      Math.abs(areaFromDecay(measured.volume, measured.seconds) / measured.area - 1),
    ).toBeLessThanOrEqual(measured.relativeTolerance);
  });
  test("the air of a room absorbs 4 m V", () => {
    const found = airArea(air.volume, 20, 50);
    const one = airArea(1, 20, 50);
    expect(found[8] / one[8]).toBeCloseTo(air.volume, 9);
    // 104 dB/km at 20 degC, 50 % and 8 kHz (ISO 9613-1) is m = 0.0239 1/m.
    expect(found[8]).toBeCloseTo((air.area / air.m) * 0.02395, 1);
  });
  test("power to level at a distance", () => {
    const found = level.q.map((q) => -levelOf(directFactor(q, level.distance) + 4 / level.area));
    expectClose(found, level.difference, level.tolerance);
    expectClose(
      [-levelOf(directFactor(office.q, office.distance) + 4 / office.roomConstant)],
      [office.difference],
      office.tolerance,
    );
  });
  test("missing absorption is that of 125 Hz below and of 4 kHz above, and stays unknown between", () => {
    expect(Array.from(filled([null, null, 0.3, null, 0.4, 0.5, 0.6, 0.7, null]))).toEqual([
      0.3,
      0.3,
      0.3,
      NaN,
      0.4,
      0.5,
      0.6,
      0.7,
      0.7,
    ]);
  });
  test("a small room answers in single tones below Schroeder's frequency", () => {
    expect(statisticalFrom(40, everywhere(0.5))).toBeCloseTo(223.6, 1);
    expect(statisticalFrom(40, everywhere(NaN))).toBeNull();
  });
});

describe("the worked room", () => {
  const { oneRoom } = budget;
  const document = (distances: Record<string, number>) => ({
    rooms: [{ id: "live", building: "s", volume: oneRoom.volume, absorption: { area: oneRoom["A, m2"] } }],
    sources: [{ id: "kit", kind: "room", room: "live", lw: oneRoom.LW, q: oneRoom.q }],
    receivers: [{ id: "ear", kind: "room", room: "live", distances }],
  });
  test("far from the source", () =>
    expectClose(answerOf(document({})).ear.levels, oneRoom["Lp reverberant"], oneRoom.tolerance));
  test("1.5 m from it", () =>
    expectClose(
      answerOf(document({ kit: oneRoom.distance })).ear.levels,
      oneRoom["Lp at 1.5 m"],
      oneRoom.tolerance,
    ));
  test("its decay", () =>
    expectClose(
      oneRoom["A, m2"].map((area) => decayOf(oneRoom.volume, area)),
      oneRoom["T, s (V 45)"],
      0.001,
    ));
});

describe("the worked row of three rooms", () => {
  const { threeRooms } = budget;
  const answer = answerOf({
    rooms: Object.entries(threeRooms.absorption).map(([id, area]) => ({
      id,
      building: "s",
      volume: 40,
      absorption: { area: flat(area) },
    })),
    sources: [{ id: "kit", kind: "room", room: "live", lw: flat(threeRooms.lw) }],
    elements: threeRooms.links.map(([from, to, area, tl], i) => ({
      id: `e${i}`,
      kind: "wall",
      from,
      to,
      area,
      tl: flat(Number(tl)),
    })),
    receivers: Object.keys(threeRooms.absorption).map((room) => ({ id: room, kind: "room", room })),
  });
  test.each(Object.entries(threeRooms.levels))("%s", (room, level) =>
    expectClose([answer[room].levels[3]], [level], threeRooms.tolerance),
  );
  test("what arrives in the control room, by its last element", () => {
    expectClose(
      [answer.control.contributions["kit | e2"][3], answer.control.contributions["kit | e3"][3]],
      [threeRooms.arriving.lobby, threeRooms.arriving.live],
      threeRooms.tolerance,
    );
  });
  test("the printed diagonal: absorption and all that passes", () => {
    const rooms = Object.keys(threeRooms.absorption);
    const links = threeRooms.links.map(([from, to, area, tl]) => ({
      from: rooms.indexOf(String(from)),
      to: rooms.indexOf(String(to)),
      passing: everywhere(Number(area) * 10 ** (-Number(tl) / 10)),
    }));
    const { diagonal } = balanceRooms(Object.values(threeRooms.absorption).map(everywhere), links);
    expectClose(
      diagonal.slice(0, 3),
      threeRooms.matrix.map((row, i) => row[i]),
      1e-6,
    );
  });
});

describe("the balance", () => {
  test("closes: what is absorbed and what leaves is what was given", () => {
    const absorption = [5, 7, 9, 4].map(everywhere);
    const links = [
      [0, 1, 0.3],
      [1, 2, 0.02],
      [2, 3, 1.5],
      [3, 0, 0.001],
      [0, -1, 0.2],
      [2, -1, 0.4],
    ].map(([from, to, g]) => ({ from, to, passing: everywhere(g) }));
    const { inverse, count } = balanceRooms(absorption, links);
    const energies = [0, 1, 2, 3].map((room) => 4 * inverse[room * count]);
    const spent =
      energies.reduce((sum, x, room) => sum + x * absorption[room][0], 0) +
      0.2 * energies[0] +
      0.4 * energies[2];
    expect(spent).toBeCloseTo(4, 12);
  });
  test("keeps rooms apart that no link joins", () => {
    const { groups, inverse, count } = balanceRooms([5, 7, 9].map(everywhere), [
      { from: 0, to: 2, passing: everywhere(0.1) },
    ]);
    expect(Array.from(groups)).toEqual([0, 1, 0]);
    expect(inverse[0 * count + 1]).toBe(0);
  });
});

describe("ducts", () => {
  const { duct } = budget;
  test("end reflection", () =>
    expectClose(
      upper(endReflection(Math.PI * (duct.diameter / 2) ** 2, true)),
      duct["end reflection"],
      duct.tolerance,
    ));
  test("what a mouth takes in", () =>
    expectClose(upper(entryGain(duct.opening)), duct.dL_entry, duct.tolerance));

  /** The run of the example with its elbow and flexible piece as one insertion loss. */
  const inserted = duct.silencer.map((loss, band) => loss + duct.elbow[band] + duct["flex 2 m"][band]);
  const run = [
    { kind: "silencer", il: inserted },
    { kind: "end", s: Math.PI * (duct.diameter / 2) ** 2, flush: true },
  ];
  const room = { id: "live", building: "s", volume: 45, absorption: { area: budget.oneRoom["A, m2"] } };
  test("fan to room", () => {
    const fan = {
      id: "fan",
      kind: "fan",
      lw: duct["fan LW"],
      outlets: [{ id: "grille", room: "live", run }],
    };
    const { levels, contributions } = answerOf({
      rooms: [room],
      sources: [fan],
      receivers: [{ id: "ear", kind: "room", room: "live" }],
    }).ear;
    expectClose(levels, duct["Lp room, fan"], duct.tolerance);
    expect(Object.keys(contributions)).toEqual(["fan | grille"]);
  });
  test("drums through the duct to outdoors", () => {
    const vent = {
      id: "vent",
      kind: "duct",
      from: "live",
      to: "outdoors",
      opening: duct.opening,
      run,
      position: [0, 0, 2],
    };
    const at = (distance: number) => ({ id: "ear", kind: "outdoor", position: [distance, 0, 2] });
    const document = {
      options: { ground: [0, 0, 0] },
      rooms: [room],
      elements: [vent],
      sources: [{ id: "kit", kind: "room", room: "live", lw: budget.oneRoom.LW }],
    };
    const { levels } = answerOf({ ...document, receivers: [at(10)] }).ear;
    // 10 m over hard ground: 31 dB of divergence, 3 dB of ground, air below 0.04 dB/m below 4 kHz.
    expectClose(
      levels.slice(0, 6),
      duct["LW outdoors"].slice(0, 6).map((power) => power - 31 + 3),
      0.12,
    );
  });
  test("a room hears another through a duct both ways alike", () => {
    const rooms = ["a", "b"].map((id) => ({ ...room, id }));
    const vent = { id: "vent", kind: "duct", from: "a", to: "b", opening: duct.opening, run };
    const from = (source: string, ear: string) =>
      answerOf({
        rooms,
        elements: [vent],
        sources: [{ id: "kit", kind: "room", room: source, lw: flat(100) }],
        receivers: [{ id: "ear", kind: "room", room: ear }],
      }).ear.levels;
    expectClose(from("a", "b"), from("b", "a").map(Number), 1e-9);
  });
  test("a piece that is not built is refused by name", () => {
    const vent = {
      id: "vent",
      kind: "duct",
      from: "live",
      to: "outdoors",
      opening: 0.02,
      run: [{ kind: "elbow", width: 0.15 }],
    };
    expect(() => answerOf(buildCase({ elements: [vent] }))).toThrow(/"elbow" is not built/);
  });
});
