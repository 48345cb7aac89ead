import { describe, expect, test } from "vitest";
import { planSchema, type Plan } from "../../lib/noise/plan";
import { readBudget } from "../../lib/noise/caseDocument";
import { solve } from "../../lib/noise/solve";
import { compareWeighed, leadingOf, stateOf, type Weighed } from "../../lib/noise/states";
import { forWire } from "../../lib/noise/wire";
import demo from "../../data/examples/plumtree-row.json";
import { buildCase, flat } from "./buildCase";

const planOf = (change: Record<string, unknown> = {}) => readBudget(buildCase(change)).plan;
const demoPlan = planSchema.parse(demo);

describe("a state", () => {
  test("follows from the unrounded margin and the doubt", () => {
    expect([stateOf(-0.001, 3), stateOf(0, 3), stateOf(2.999, 3), stateOf(3, 3), stateOf(NaN, 3)]).toEqual([
      "over",
      "tight",
      "tight",
      "under",
      "not weighed",
    ]);
  });
  test("leads in the order over, not weighed, tight, under, then by the smallest margin, then as it stands", () => {
    const all: Weighed[] = [
      { state: "under", margin: 4 },
      { state: "tight", margin: 2 },
      { state: "not weighed", margin: NaN },
      { state: "over", margin: -1 },
      { state: "over", margin: -3 },
    ];
    expect(all.toSorted(compareWeighed).map(({ state, margin }) => `${state} ${margin}`)).toEqual([
      "over -3",
      "over -1",
      "not weighed NaN",
      "tight 2",
      "under 4",
    ]);
    const [first, second] = [
      { state: "tight", margin: 2 },
      { state: "tight", margin: 2 },
    ] as const;
    expect(leadingOf([first, second])).toBe(first);
  });
});

describe("the doubt of a listener", () => {
  test("is the root of the summed squares of share times deviation", () => {
    // One source typed (3), one wall and one window of the laboratory (2 at 500 Hz), all outdoors (3).
    const [{ bands, doubts }] = solve(planOf()).receivers;
    expect(bands[4].doubt).toBeCloseTo(Math.sqrt(9 + 4 + 4 + 9), 9);
    expect(doubts.reduce((sum, { decibels }) => sum + decibels ** 2, 0)).toBeCloseTo(bands[1].doubt ** 2, 9);
  });
  test("falls with two sources that share the level", () => {
    const sources = ["a", "b"].map((id) => ({ id, kind: "room", room: "live", lw: flat(105) }));
    expect(solve(planOf({ sources })).receivers[0].bands[4].doubt).toBeCloseTo(
      Math.sqrt(2 * 1.5 ** 2 + 4 + 4 + 9),
      9,
    );
  });
});

describe("several situations and limits", () => {
  const base = planOf({
    sources: [...buildCase().sources, { id: "unit", kind: "outdoor", position: [8, 0, 1], lw: flat(60) }],
  });
  const situations: Plan["situations"] = [
    { id: "quiet", name: "quiet", says: "", playing: [{ sourceId: "unit", share: 1 }] },
    { id: "loud", name: "loud", says: "", playing: [{ sourceId: "kit", share: 0.5 }] },
  ];
  test("the worst leads and is named", () => {
    const [verdict] = solve({ ...base, situations }).receivers;
    const alone = situations.map((situation) => solve({ ...base, situations: [situation] }).receivers[0]);
    expect(verdict.margin).toBe(Math.min(...alone.map(({ margin }) => margin ?? NaN)));
    expect(verdict.situationId).toBe(alone[0].margin === verdict.margin ? "quiet" : "loud");
  });
  test("what a situation does not name is off", () => {
    const [verdict] = solve({ ...base, situations: [situations[0]] }).receivers;
    expect(new Set(verdict.contributions.map(({ sourceId }) => sourceId))).toEqual(new Set(["unit"]));
  });
  test("the strictest of several limits leads", () => {
    const [criterion] = base.criteria;
    const stricter = { ...criterion, id: "strict", levels: new Array(9).fill(12) };
    expect(solve({ ...base, criteria: [criterion, stricter] }).receivers[0].criterionId).toBe("strict");
  });
});

describe("a limit on a weighted total", () => {
  const receivers = [{ id: "bed", kind: "room", room: "bed", criterion: { kind: "dBA", value: 20 } }];
  const [verdict] = solve(
    planOf({
      receivers,
      elements: [
        ...buildCase().elements,
        {
          id: "second",
          kind: "door",
          from: "live",
          to: "outdoors",
          area: 2,
          tl: flat(30),
          position: [0, 2, 1],
          normal: [1, 0, 0],
        },
      ],
    }),
  ).receivers;
  test("is weighed by the total", () => {
    expect(verdict.weighted?.margin).toBeCloseTo(20 - Number(verdict.dba), 9);
    expect(verdict.margin).toBe(verdict.weighted?.margin);
    expect([verdict.metric, verdict.lowest]).toEqual(["dBA", null]);
  });
  test("leads in the band with most weighted energy", () => expect(verdict.band).toBe(2000));
  test("has paths that share the weighted total", () => {
    expect(verdict.paths.reduce((sum, { weighted }) => sum + (weighted?.share ?? NaN), 0)).toBeCloseTo(1, 9);
    expect(verdict.paths[0].partId).toBe("second");
  });
  test("spends its allowance band by band", () => {
    expect(verdict.bands.reduce((sum, { spent }) => sum + (spent ?? NaN), 0)).toBeCloseTo(
      verdict.weighted?.spent ?? NaN,
      9,
    );
  });
});

describe("the demo's verdict", () => {
  const verdict = solve(demoPlan);
  const receiver = (id: string) => verdict.receivers.find(({ receiverId }) => receiverId === id)!;
  test("is led by the neighbour's bedroom, 3.7 dB over at 63 Hz, by the roof and the door", () => {
    expect(verdict.leadingReceiverId).toBe("no9-bedroom");
    const { state, margin, band, facts } = receiver("no9-bedroom");
    expect([state, band]).toEqual(["over", 63]);
    expect(margin).toBeCloseTo(-3.7, 1);
    expect(facts).toMatchObject({ sourceId: "kit", voice: "the kick drum" });
    expect(facts.leading.map(({ pathId }) => pathId).slice(0, 2)).toEqual(["studio-roof", "yard-door"]);
    expect(facts.dropFirstTwo).toBeGreaterThan(facts.dropFirst);
  });
  test("cuts both yards open, with the stations in their order and each quieter than the last outdoors", () => {
    const { crossCut } = receiver("no9-bedroom");
    expect(crossCut?.stations.map(({ kind }) => kind)).toEqual([
      "source",
      "leaving",
      "fence",
      "window",
      "listener",
    ]);
    const at63 = crossCut?.stations.map(({ levels }) => Number(levels[1])) ?? [];
    expect(at63.toSorted((a, b) => b - a)).toEqual(at63);
    expect(crossCut?.buildings.map(({ id }) => id)).toEqual(["studio", "no9"]);
    expect(crossCut?.fences[0].along).toBeCloseTo(9.15, 2);
    const [studio, house] = crossCut?.buildings ?? [];
    expect(house.outline).toHaveLength(5);
    expect(house.rooms.find(({ lit }) => lit)?.floor).toBeCloseTo(2.8, 9);
    expect(studio.outline[1][0]).toBeLessThan(0);
  });
  test("hears in bed what its stations and bands say alike", () => {
    const { crossCut, bands, dba } = receiver("no9-bedroom");
    const last = crossCut?.stations.at(-1);
    expect(last?.levels).toEqual(bands.map(({ level }) => level));
    expect(last?.dba).toBe(dba);
  });
  test("on the wire has 12 contributions and the rest, and the same levels", () => {
    const wired = forWire(verdict);
    wired.receivers.forEach(({ contributions, bands }, i) => {
      expect(contributions.length).toBeLessThanOrEqual(12);
      expect(bands).toEqual(verdict.receivers[i].bands);
    });
    expect(wired.receivers[0].rest).not.toBeNull();
  });
  test("lists every contribution when asked to, loudest first", () => {
    const all = solve(demoPlan, { contributions: Infinity }).receivers[0];
    expect(all.rest).toBeNull();
    expect(all.contributions.length).toBeGreaterThan(12);
  });
  test("says what is missing in a sentence", () => {
    const bare = {
      ...demoPlan,
      elements: demoPlan.elements.map((each) =>
        each.id === "yard-door" ? { ...each, constructionId: null } : each,
      ),
    };
    const { notes, receivers } = solve(bare);
    expect(notes).toContainEqual({
      partId: "yard-door",
      text: expect.stringContaining("has no construction yet"),
    });
    expect(receivers[0].bands[1].level).toBe("unknown");
    // What is known alone, the roof, is over already: unknown never blocks a fail.
    expect([receivers[0].state, receivers[0].bands[4].state]).toEqual(["over", "not weighed"]);
  });
});

describe("leaks", () => {
  test("of one building stand together", () => {
    const leak = (id: string) => ({
      id,
      kind: "leak",
      from: "live",
      to: "outdoors",
      area: 0.001,
      position: [0, 1, 1],
      normal: [1, 0, 0],
    });
    const [verdict] = solve(planOf({ elements: [...buildCase().elements, leak("a"), leak("b")] })).receivers;
    expect(verdict.paths.map(({ id, partId }) => [id, partId])).toContainEqual(["leaks:studio", null]);
  });
});
