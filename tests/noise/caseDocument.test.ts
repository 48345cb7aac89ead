import { describe, expect, test } from "vitest";
import { answerCase, CaseFault } from "../../lib/noise/caseDocument";
import { answerOf, buildCase, flat } from "./buildCase";

function faultOf(document: unknown): { message: string; path: string } {
  try {
    answerCase(document);
  } catch (error) {
    if (error instanceof CaseFault) return { message: error.message, path: error.path };
    throw error;
  }
  throw new Error("no fault");
}
const [wall, window] = buildCase().elements;

describe("a fault says where and why", () => {
  test.each([
    [
      "a spectrum of seven",
      buildCase({ sources: [{ id: "kit", kind: "room", room: "live", lw: flat(1).slice(1) }] }),
      "sources[0].lw",
      /8 values/,
    ],
    [
      "eight bands and nine",
      buildCase({ sources: [{ id: "kit", kind: "room", room: "live", lw: [...flat(1), 1] }] }),
      "sources[0].lw",
      /one number of bands/,
    ],
    [
      "a room that is not there",
      buildCase({ elements: [{ ...wall, from: "hall" }, window] }),
      "elements[0].from",
      /no room is called "hall"/,
    ],
    [
      "a construction that is not there",
      buildCase({ elements: [{ ...wall, tl: undefined, construction: "brick" }, window] }),
      "elements[0].construction",
      /no construction is called/,
    ],
    ["a name that stands twice", buildCase({ elements: [wall, wall] }), "elements[1].id", /stands twice/],
    ["no loss at all", buildCase({ elements: [{ ...wall, tl: undefined }] }), "elements[0].tl", /either/],
    ["a word of its own", buildCase({ elements: [{ ...wall, colour: "red" }] }), "elements[0]", /colour/],
    [
      "three leaves",
      buildCase({ elements: [{ ...wall, tl: undefined, construction: { kind: "layered", layers: [] } }] }),
      "elements[0].construction.kind",
      /not built/,
    ],
    [
      "a level beyond the field's range",
      buildCase({ sources: [{ id: "kit", kind: "room", room: "live", lw: flat(400) }] }),
      "sources[0].lw[0]",
      /./,
    ],
    [
      "a source that has no distance to give",
      buildCase({ receivers: [{ id: "bed", kind: "room", room: "bed", distances: { horn: 2 } }] }),
      "receivers[0].distances.horn",
      /no source/,
    ],
    [
      "a spectrum of three",
      buildCase({ sources: [{ id: "kit", kind: "room", room: "live", lw: [1, 2, 3] }] }),
      "sources[0].lw",
      /8 values/,
    ],
    [
      "a level from outdoors between two rooms",
      buildCase({
        elements: [wall, window, { ...wall, id: "inner", to: "bed" }],
        sources: [{ id: "road", kind: "incident", at: { inner: flat(50) } }],
      }),
      "sources[0].at.inner",
      /between two rooms/,
    ],
    [
      "more rooms than a plan holds",
      buildCase({
        rooms: Array.from({ length: 41 }, (_, i) => ({ ...buildCase().rooms[0], id: `r${i}` })),
        elements: [],
        sources: [],
        receivers: [{ id: "ear", kind: "room", room: "r0" }],
      }),
      "rooms",
      /40/,
    ],
    [
      "lists without end inside one another",
      buildCase({ title: JSON.parse("[".repeat(60) + "]".repeat(60)) as unknown }),
      `title${"[0]".repeat(20)}`,
      /20 deep/,
    ],
    ["neither kind of document", {}, "", /neither/],
    ["a list", [], "", /one object/],
    ["loss ratings", { tl: {} }, "tl", /not built/],
  ])("%s", (_, document, path, message) => {
    const fault = faultOf(JSON.parse(JSON.stringify(document)));
    expect(fault.path).toBe(path);
    expect(fault.message).toMatch(message);
  });
});

describe("other documents", () => {
  test("constructions: thirds from 50 Hz and octaves from 63 Hz", () => {
    const pane = { kind: "single", leaf: { plies: [["glass", 0.006]] }, size: [1.5, 1.25] };
    const { pane: answer } = answerCase({ constructions: { pane: { construction: pane } } }) as Record<
      string,
      { third: Record<string, number>; octave: number[] }
    >;
    expect(Object.keys(answer.third)).toHaveLength(24);
    expect(answer.third["500"]).toBeCloseTo(30.5, 1);
    expect(answer.octave).toHaveLength(8);
    expect(answer.octave[3]).toBeCloseTo(30.4, 1);
  });
  test("spectra: totals and ratings", () => {
    const answer = answerCase({ spectra: { night: { levels: [52, 45, 38, 31, 27, 24, 20, 18] } } }) as Record<
      string,
      Record<string, unknown>
    >;
    expect(Object.keys(answer.night)).toEqual(["dba", "dbc", "nc", "nr"]);
    expect(answer.night.nc).toEqual([expect.closeTo(26.25, 2), 125]);
  });
  test("ways of one name stand together and still add up to the level", () => {
    const mouth = { id: "mouth", room: "live", run: [] };
    const sources = [{ id: "fan", kind: "fan", lw: flat(60), outlets: [mouth, mouth] }];
    const { ear } = answerOf(buildCase({ sources, receivers: [{ id: "ear", kind: "room", room: "live" }] }));
    expect(Object.keys(ear.contributions)).toEqual(["fan | mouth"]);
    expect(Number(ear.contributions["fan | mouth"][3])).toBeCloseTo(Number(ear.levels[3]), 9);
  });
  test("a curve that says nothing on a band leaves it unknown, in words", () => {
    const levels = [null, ...flat(30).slice(1)];
    const { bed } = answerOf(
      buildCase({
        receivers: [{ id: "bed", kind: "room", room: "bed", criterion: { kind: "curve", levels } }],
      }),
    );
    expect([bed.criterion?.[0], bed.margin?.[0], typeof bed.margin?.[1]]).toEqual([
      "unknown",
      "unknown",
      "number",
    ]);
    expect(typeof bed.min_margin).toBe("number");
  });
  test("a thing in a room may take nothing in a band", () => {
    const [live, bed] = buildCase().rooms;
    const absorption = {
      surfaces: [{ area: 60, alpha: flat(0.15) }],
      objects: [{ area: [0, ...flat(2).slice(1)] }],
    };
    const { ear } = answerOf(
      buildCase({
        rooms: [{ ...live, absorption }, bed],
        elements: [],
        receivers: [{ id: "ear", kind: "room", room: "live" }],
      }),
    );
    // 105 + 10 lg(4/9) and 105 + 10 lg(4/11).
    expect(Number(ear.levels[0])).toBeCloseTo(101.478, 3);
    expect(Number(ear.levels[1])).toBeCloseTo(100.607, 3);
  });
  test("rooms by decay, surfaces and with air", () => {
    const absorptions = [
      { rt: flat(0.8) },
      { rt: flat(0.8), air: true },
      {
        surfaces: [{ area: 60, alpha: flat(0.15) }],
        objects: [{ area: flat(1) }],
        model: "eyring",
        air: true,
      },
    ];
    const levels = absorptions.map((absorption) => {
      const rooms = [{ id: "live", building: "s", volume: 45, absorption }];
      const receivers = [{ id: "ear", kind: "room", room: "live" }];
      const answer = answerCase(buildCase({ rooms, elements: [], receivers })) as Record<
        string,
        { levels: number[] }
      >;
      return answer.ear.levels;
    });
    // 105 + 10 lg(4/A), A = 55.26 x 45/(343.2 x 0.8) = 9.057 m2.
    expect(levels[0][3]).toBeCloseTo(101.451, 2);
    expect(levels[1][7]).toBeLessThan(levels[0][7] - 1);
    // A = -60 ln(0.85) + 1 = 10.751 m2 and little air at 500 Hz.
    expect(levels[2][3]).toBeCloseTo(100.66, 1);
  });
});
