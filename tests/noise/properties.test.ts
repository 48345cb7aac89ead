import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { BAND_COUNT } from "../../lib/noise/bands";
import { readBudget } from "../../lib/noise/caseDocument";
import type { Plan } from "../../lib/noise/plan";
import { solve } from "../../lib/noise/solve";
import { STATES, type Out, type ReceiverVerdict, type Verdict } from "../../lib/noise/verdict";
import { forWire } from "../../lib/noise/wire";
import { anyPlan } from "./anyPlan";
import { answerOf, buildCase, flat } from "./buildCase";

const whole = (plan: Plan): Verdict => solve(plan, { contributions: Infinity });
const energy = (level: Out): number =>
  level === "silent" ? 0 : level === "unknown" ? NaN : 10 ** (level / 10);

/** Every number of a verdict, with where it stands. */
function numbersIn(value: unknown, path = ""): [string, number][] {
  if (typeof value === "number") return [[path, value]];
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, each]) => numbersIn(each, `${path}.${key}`));
}

function near(a: number, b: number): boolean {
  return Math.abs(a - b) <= 1e-7 * Math.max(Math.abs(a), Math.abs(b), 1e-200);
}

function expectContributionsToAddUp({ bands, contributions, rest }: ReceiverVerdict): void {
  bands.forEach(({ level }, band) => {
    if (level === "unknown") return;
    const parts = contributions
      .map(({ levels }) => energy(levels[band]))
      .concat(rest ? [energy(rest[band])] : []);
    const sum = parts.reduce((total, part) => total + part, 0);
    expect(near(sum, energy(level)), `${sum} beside ${energy(level)} at band ${band}`).toBe(true);
  });
}

describe("any plan", () => {
  test("has a verdict: no exception, no number that is not finite, and travels as JSON", () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        const verdict = whole(plan);
        expect(numbersIn(verdict).filter(([, value]) => !Number.isFinite(value))).toEqual([]);
        expect(verdict.receivers.every(({ state }) => STATES.includes(state))).toBe(true);
        expect(verdict.receivers.map(({ receiverId }) => receiverId)).toEqual(
          plan.receivers.map(({ id }) => id),
        );
        expect(Object.keys(verdict.elements).sort()).toEqual(plan.elements.map(({ id }) => id).sort());
        const sent = JSON.stringify(forWire(verdict));
        expect(JSON.stringify(JSON.parse(sent))).toBe(sent);
      }),
      { numRuns: 200 },
    );
  });

  test("has contributions that add up to each level, on the wire too", () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        whole(plan).receivers.forEach(expectContributionsToAddUp);
        forWire(solve(plan, { contributions: 5 })).receivers.forEach(expectContributionsToAddUp);
      }),
      { numRuns: 100 },
    );
  });

  test("has paths whose shares add up to one wherever there is energy", () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        for (const { bands, paths } of forWire(solve(plan)).receivers) {
          bands.forEach(({ known }, band) => {
            const sum = paths.reduce((total, { shares }) => total + shares[band], 0);
            expect(Math.abs(sum - (known === "silent" ? 0 : 1))).toBeLessThan(1e-6);
          });
        }
      }),
      { numRuns: 100 },
    );
  });

  test("is never passed with an unknown band, and never failed by one", () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        for (const { bands } of whole(plan).receivers) {
          for (const { level, known, limit, state } of bands) {
            if (typeof limit !== "number" || level !== "unknown") continue;
            expect(state).toBe(typeof known === "number" && known > limit ? "over" : "not weighed");
          }
        }
      }),
      { numRuns: 100 },
    );
  });

  test("solved twice is the same", () => {
    fc.assert(
      fc.property(anyPlan, (plan) => {
        expect(solve(plan)).toEqual(solve(structuredClone(plan)));
      }),
      { numRuns: 50 },
    );
  });
});

/** Two rooms of a studio and one of a neighbour, with everything known. */
function buildPlan(): Plan {
  const rooms = [
    ...buildCase().rooms,
    { id: "lobby", building: "studio", volume: 20, absorption: { area: flat(5) } },
  ];
  const elements = [
    ...buildCase().elements,
    { id: "inner", kind: "door", from: "live", to: "lobby", area: 2, tl: flat(27) },
    {
      id: "front",
      kind: "door",
      from: "lobby",
      to: "outdoors",
      area: 2,
      tl: flat(24),
      position: [0, 4, 1],
      normal: [0, 1, 0],
    },
    {
      id: "pane",
      kind: "window",
      from: "bed",
      to: "outdoors",
      area: 1,
      tl: flat(28),
      position: [12, 2, 1.2],
      normal: [-1, 0, 0],
    },
  ];
  const sources = [
    { id: "kit", kind: "room", room: "live", lw: flat(105) },
    { id: "unit", kind: "outdoor", position: [1, -4, 0.6], lw: flat(60) },
    {
      id: "fan",
      kind: "fan",
      lw: flat(55),
      outlets: [
        { id: "grille", room: "lobby" },
        { id: "cowl", position: [-2, 4, 2] },
      ],
    },
  ];
  return readBudget(buildCase({ rooms, elements, sources, fences: [{ p1: [6, -9], p2: [6, 9], height: 2 }] }))
    .plan;
}
const levelsOf = (plan: Plan) => whole(plan).receivers[0].bands.map(({ level }) => level);

describe("true properties", () => {
  test("the order of parts does not matter", () => {
    const plan = buildPlan();
    const turned = {
      ...plan,
      spaces: plan.spaces.toReversed(),
      elements: plan.elements.toReversed(),
      sources: plan.sources.toReversed(),
      paths: plan.paths.toReversed(),
    };
    levelsOf(turned).forEach((level, band) =>
      level === "silent"
        ? expect(levelsOf(plan)[band]).toBe(level)
        : expect(Number(level)).toBeCloseTo(Number(levelsOf(plan)[band]), 9),
    );
  });
  test("a second identical source adds 3.01 dB", () => {
    const twice = answerOf(
      buildCase({ sources: ["a", "b"].map((id) => ({ id, kind: "room", room: "live", lw: flat(105) })) }),
    );
    const once = answerOf(buildCase());
    expect(Number(twice.bed.levels[3]) - Number(once.bed.levels[3])).toBeCloseTo(3.0103, 4);
  });
  test("adding a source never lowers a level", () => {
    fc.assert(
      fc.property(
        fc.constantFrom("room", "outdoor"),
        fc.double({ min: 0, max: 130, noNaN: true }),
        fc.double({ min: -20, max: 30, noNaN: true }),
        (kind, power, x) => {
          const added =
            kind === "room"
              ? { id: "new", kind, room: "bed", lw: flat(power) }
              : { id: "new", kind, position: [x, -3, 1], lw: flat(power) };
          const more = answerOf(buildCase({ sources: [...buildCase().sources, added] })).bed.levels;
          answerOf(buildCase()).bed.levels.forEach((level, band) =>
            expect(Number(more[band])).toBeGreaterThanOrEqual(Number(level)),
          );
        },
      ),
      { numRuns: 30 },
    );
  });
  test("a leak never lowers the level of a listener that only its path connects, the source room's level held", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.0001, max: 1, noNaN: true }), (area) => {
        const leak = {
          id: "leak",
          kind: "leak",
          from: "live",
          to: "outdoors",
          area,
          position: [0, 1, 1],
          normal: [1, 0, 0],
        };
        const live = { id: "live", kind: "room", room: "live" };
        const at = (elements: unknown[]) =>
          answerOf(buildCase({ elements, receivers: [...buildCase().receivers, live] }));
        const [tight, leaking] = [at(buildCase().elements), at([...buildCase().elements, leak])];
        const drop = (answer: typeof tight) => Number(answer.live.levels[3]) - Number(answer.bed.levels[3]);
        expect(drop(leaking)).toBeLessThanOrEqual(drop(tight) + 1e-9);
      }),
      { numRuns: 30 },
    );
  });
  test("what is louder by 10 dB at the source is louder by 10 dB at the listener", () => {
    const louder = answerOf(
      buildCase({ sources: [{ id: "kit", kind: "room", room: "live", lw: flat(115) }] }),
    ).bed.levels;
    answerOf(buildCase()).bed.levels.forEach((level, band) =>
      expect(Number(louder[band]) - Number(level)).toBeCloseTo(10, 9),
    );
  });
  test("a path silenced leaves the level that its verdict foretells", () => {
    const plan = buildPlan();
    const [verdict] = whole(plan).receivers;
    const loudest = verdict.paths.find(({ kind }) => kind === "wall");
    const wall = plan.elements.findIndex(({ id }) => id === loudest?.partId);
    // Closed to the outside by the largest loss a spectrum may hold; its room gains what the wall no longer drains.
    const shut = {
      ...plan,
      constructions: plan.constructions.map((each) =>
        each.id === plan.elements[wall].constructionId
          ? { ...each, tl: new Array(BAND_COUNT).fill(150) }
          : each,
      ),
    };
    levelsOf(shut).forEach((level, band) => {
      if (typeof level === "number")
        expect(Math.abs(level - Number(loudest?.without[band]))).toBeLessThan(0.01);
    });
  });
});
