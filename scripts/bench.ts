import { gzipSync } from "node:zlib";
import { BAND_COUNT } from "../lib/noise/bands";
import { PLAN_BOUNDS, planSchema, type Plan } from "../lib/noise/plan";
import { solve } from "../lib/noise/solve";
import { forWire } from "../lib/noise/wire";
import { buildBenchPlan, type BenchSize } from "./bench/benchPlan";
import { flatInput, flatLevels } from "./bench/flatLevels";

/** Times whole solves beside one flat function with the same arithmetic; exits 1 where a bound does not hold. */
const RUNS = 40;
const WARM = 15;
const MOST_RATIO = 3;
const MOST_AT_LIMITS = 500;
const SAME = 1e-6;

const HOUSEHOLD: BenchSize = { rooms: 12, perRoom: 10, sources: 10, receivers: 10 };
const DOUBLE: BenchSize = { ...HOUSEHOLD, rooms: 24 };
/** About 20 000 pairs, the most that one project may hold, with all sources and listeners. */
const AT_LIMITS: BenchSize = { rooms: 15, perRoom: 10, sources: 30, receivers: 20 };

function median(values: number[]): number {
  return values.sort((a, b) => a - b)[Math.floor(values.length / 2)];
}

function timeOnce(work: () => unknown): number {
  const start = performance.now();
  work();
  return performance.now() - start;
}

/** Medians of works run by turns, so that what else the machine does falls on all alike. */
function timeByTurns(works: readonly (() => unknown)[], runs = RUNS, warm = WARM): number[] {
  for (let i = 0; i < warm; i += 1) works.forEach((work) => work());
  const rounds = Array.from({ length: runs }, () => works.map(timeOnce));
  return works.map((_, w) => median(rounds.map((round) => round[w])));
}

/** As many situations and limits as a plan may hold, in turns over the loudest part and over the whole period. */
function withEverySituation(plan: Plan): Plan {
  const playing = plan.sources.map(({ id }) => ({ sourceId: id, share: 0.5 }));
  const situations = Array.from({ length: PLAN_BOUNDS.situations }, (_, i) => ({
    id: `t${i}`,
    name: `situation ${i}`,
    playing: playing.slice(i % playing.length),
  }));
  const criteria = Array.from({ length: PLAN_BOUNDS.criteria }, (_, i) => ({
    ...plan.criteria[0],
    id: `l${i}`,
    receiverId: plan.receivers[i % plan.receivers.length].id,
    averaging: i < plan.receivers.length ? "loudest" : "whole",
  }));
  return planSchema.parse({ ...plan, situations, criteria });
}

function largestDifference(size: BenchSize): number {
  const plan = buildBenchPlan(size);
  const { levels } = flatLevels(flatInput(plan));
  const differences = solve(plan).receivers.flatMap(({ bands }, r) =>
    bands.map(({ level }, band) => Math.abs(Number(level) - levels[r * BAND_COUNT + band])),
  );
  return Math.max(...differences);
}

function measure(size: BenchSize) {
  const plan = buildBenchPlan(size);
  const input = flatInput(plan);
  const wire = JSON.stringify(forWire(solve(plan)));
  const [milliseconds, flat] = timeByTurns([() => solve(plan), () => flatLevels(input)]);
  return {
    milliseconds,
    flat,
    bytes: wire.length,
    zipped: gzipSync(wire).length,
  };
}

const difference = largestDifference(HOUSEHOLD);
const [small, large, most] = [measure(HOUSEHOLD), measure(DOUBLE), measure(AT_LIMITS)];
const crowded = withEverySituation(buildBenchPlan(AT_LIMITS));
const [everySituation] = timeByTurns([() => solve(crowded)], 10, 5);
const ratio = small.milliseconds / small.flat;
const figures = {
  "levels against the flat function, dB": difference,
  "12 rooms, 120 elements: median solve, ms": small.milliseconds,
  "the flat function, ms": small.flat,
  ratio,
  "24 rooms, 240 elements: median solve, ms": large.milliseconds,
  growth: large.milliseconds / small.milliseconds,
  "at the limits: median solve, ms": most.milliseconds,
  "the same in 24 situations with 40 limits, ms": everySituation,
  "one answer, bytes": small.bytes,
  "one answer, gzip, bytes": small.zipped,
};
console.table(
  Object.fromEntries(Object.entries(figures).map(([name, value]) => [name, Number(value.toPrecision(4))])),
);
const inTime = most.milliseconds < MOST_AT_LIMITS && everySituation < MOST_AT_LIMITS;
const holds = difference <= SAME && ratio <= MOST_RATIO && inTime;
if (!holds) process.exitCode = 1;
