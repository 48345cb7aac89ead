import { describe, expect, test } from "vitest";
import { answerOf, buildCase, flat } from "./buildCase";

const at = (band: number, value: number | null, rest: number) =>
  flat(rest).map((each, i) => (i === band ? value : each));
const BAND = 2;

function bedWith(change: Record<string, unknown>, limit = 60) {
  const receivers = [
    { id: "bed", kind: "room", room: "bed", criterion: { kind: "curve", levels: flat(limit) } },
  ];
  return answerOf(buildCase({ receivers, ...change })).bed;
}
const kit = (lw: unknown) => ({ sources: [{ id: "kit", kind: "room", room: "live", lw }] });

describe("an unknown band of a source", () => {
  const bed = bedWith(kit(at(BAND, null, 105)));
  test("is unknown at the listener, there alone", () => {
    expect(bed.levels.map((level) => level === "unknown")).toEqual(flat(0).map((_, i) => i === BAND));
    expect(bed.contributions["kit | wall > window"][BAND]).toBe("unknown");
    expect(bed.known_levels[BAND]).toBe("silent");
  });
  test("blocks a pass", () => {
    expect([bed.states[BAND], bed.state, bed.min_margin, bed.dba]).toEqual([
      "not weighed",
      "not weighed",
      "unknown",
      "unknown",
    ]);
  });
  test("never blocks a fail elsewhere", () => {
    const over = bedWith(kit(at(BAND, null, 105)), 5);
    expect(over.state).toBe("over");
    expect(Number(over.min_margin)).toBeLessThan(0);
  });
  test("is over where the known parts alone are", () => {
    const sources = [
      ...kit(flat(105)).sources,
      { id: "amp", kind: "room", room: "live", lw: flat(0).map(() => null) },
    ];
    const bed2 = bedWith({ sources }, 5);
    expect(bed2.states.every((state) => state === "over")).toBe(true);
    expect(bed2.levels).toEqual(new Array(8).fill("unknown"));
    expect(Number(bed2.margin?.[0])).toBeCloseTo(5 - Number(bed2.known_levels[0]), 9);
  });
});

describe("silence", () => {
  test("is not unknown", () => {
    const bed = bedWith(kit([...flat(105).slice(0, 7), "silent"]));
    expect(bed.levels[7]).toBe("silent");
    expect(bed.state).toBe("under");
  });
  test("has no unknown way: a wall nobody knows passes nothing of a source that is silent there", () => {
    const [wall, window] = buildCase().elements;
    const elements = [{ ...wall, tl: at(7, null, 40) }, window];
    expect(bedWith({ ...kit([...flat(105).slice(0, 7), "silent"]), elements }).levels[7]).toBe("silent");
  });
});

describe("an unknown element", () => {
  const [wall, window] = buildCase().elements;
  const unknown = flat(0).map(() => null);
  test("on the way makes the listener unknown, and is closed for the known sum", () => {
    const second = { ...wall, id: "second", tl: unknown };
    const bed = bedWith({ elements: [wall, window, second] });
    expect(bed.levels).toEqual(new Array(8).fill("unknown"));
    expect(Number(bed.known_levels[0])).toBeCloseTo(Number(bedWith({}).levels[0]), 9);
  });
  test("off the way changes nothing", () => {
    const rooms = [
      ...buildCase().rooms,
      { id: "store", building: "shed", volume: 20, absorption: { area: flat(5) } },
    ];
    const shed = { ...wall, id: "shed", from: "store", tl: unknown, position: [30, 0, 1], normal: [1, 0, 0] };
    const bed = bedWith({ rooms, elements: [wall, window, shed] });
    expect(bed.levels.every((level) => typeof level === "number")).toBe(true);
  });
  test("behind the source's room but away from the listener changes nothing", () => {
    const rooms = [
      ...buildCase().rooms,
      { id: "lobby", building: "studio", volume: 20, absorption: { area: flat(5) } },
    ];
    const inner = { id: "inner", kind: "wall", from: "live", to: "lobby", area: 8, tl: unknown };
    expect(
      bedWith({ rooms, elements: [wall, window, inner] }).levels.every((level) => typeof level === "number"),
    ).toBe(true);
  });
  test("between rooms matters where the next room leads out", () => {
    const rooms = [
      ...buildCase().rooms,
      { id: "lobby", building: "studio", volume: 20, absorption: { area: flat(5) } },
    ];
    const inner = { id: "inner", kind: "wall", from: "live", to: "lobby", area: 8, tl: unknown };
    const front = { ...wall, id: "front", from: "lobby" };
    expect(bedWith({ rooms, elements: [wall, window, inner, front] }).levels).toEqual(
      new Array(8).fill("unknown"),
    );
  });
  test("without a place makes what leaves by it unknown", () => {
    const { position: _, ...nowhere } = { ...wall, id: "nowhere" };
    expect(bedWith({ elements: [wall, window, nowhere] }).levels).toEqual(new Array(8).fill("unknown"));
  });
});

describe("an unknown room", () => {
  test("of the source makes the listener unknown", () => {
    const rooms = buildCase().rooms.map((room) =>
      room.id === "live" ? { ...room, absorption: { area: at(BAND, null, 10) } } : room,
    );
    expect(bedWith({ rooms }).levels[BAND]).toBe("unknown");
    expect(bedWith({ rooms }).known_levels[BAND]).toBe("silent");
  });
  test("takes 125 Hz for 63 Hz and 4 kHz for 8 kHz where these are missing", () => {
    const rooms = buildCase().rooms.map((room) => ({
      ...room,
      absorption: { area: [null, ...flat(9).slice(0, 6), null] },
    }));
    expect(bedWith({ rooms }).levels.every((level) => typeof level === "number")).toBe(true);
  });
});

describe("nine bands", () => {
  const nine = (value: number) => new Array(9).fill(value);
  const document = {
    rooms: [{ id: "live", building: "s", volume: 45, absorption: { area: nine(10) } }],
    sources: [{ id: "kit", kind: "room", room: "live", lw: [120, ...flat(60)] }],
    receivers: [{ id: "ear", kind: "room", room: "live", criterion: { kind: "curve", levels: nine(70) } }],
  };
  test("31.5 Hz never changes the listener's state", () => {
    const { ear } = answerOf(document);
    expect([ear.states[0], ear.state]).toEqual(["over", "under"]);
    expect(ear.levels).toHaveLength(9);
  });
});

describe("a room of which nothing absorbs anything to speak of", () => {
  const dead = { ...buildCase().rooms[0], absorption: { surfaces: [{ area: 0.03, alpha: flat(1e-300) }], air: false } };
  test("has no level, and blocks a pass", () => {
    const rooms = buildCase().rooms.map((room: { id: string }) => (room.id === dead.id ? dead : room));
    const bed = bedWith({ rooms });
    expect(bed.levels.every((level) => level === "unknown")).toBe(true);
    expect(bed.state).toBe("not weighed");
  });
});
