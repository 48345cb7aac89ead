import "server-only";
import example from "@/data/examples/plumtree-row.json";
import { findConstruction } from "@/lib/noise/catalogue";
import { planSchema, type Plan } from "@/lib/noise/plan";
import { solve } from "@/lib/noise/solve";
import type { Verdict } from "@/lib/noise/verdict";

/** The example's own parts that the three builds exchange. */
const LEAF = "yard-leaf";
const DOOR = "yard-door";
const SHELL = "shell-roof";

const HEAVY_DOOR = { [LEAF]: "door-mdf-3x18-damped" };
const builds = {
  a: {},
  b: HEAVY_DOOR,
  c: { ...HEAVY_DOOR, [SHELL]: "roof-own-joists-350" },
} as const satisfies Record<string, Record<string, string>>;

export type LandingKey = keyof typeof builds;

export interface LandingAnswer {
  key: LandingKey;
  plan: Plan;
  verdict: Verdict;
}

function recordOf(key: string) {
  const record = findConstruction(key);
  if (!record) throw new Error(`The catalogue has no construction ${key}.`);
  return record;
}

/** The example with constructions of the catalogue in place of its own; a door takes the gap that its record suggests. */
function rebuild(plan: Plan, swaps: Record<string, string>): Plan {
  const constructions = plan.constructions.map((own) => {
    const key = swaps[own.id];
    if (key === undefined) return own;
    const { key: _key, says: _says, suggested: _suggested, ...record } = recordOf(key);
    return { ...record, id: own.id };
  });
  const leaf = swaps[LEAF];
  const gapArea = leaf === undefined ? undefined : recordOf(leaf).suggested?.gapArea;
  const elements = plan.elements.map((element) =>
    element.id === DOOR && gapArea !== undefined ? { ...element, params: { ...element.params, gapArea } } : element,
  );
  return planSchema.parse({ ...plan, constructions, elements });
}

function weighAll(): LandingAnswer[] {
  const asDrawn = planSchema.parse(example);
  return Object.entries(builds).map(([key, swaps]) => {
    const plan = rebuild(asDrawn, swaps);
    return { key: key as LandingKey, plan, verdict: solve(plan) };
  });
}

let weighed: LandingAnswer[] | undefined;

/** The example as drawn and its two better builds, weighed once in the life of the process. */
export const landingAnswers = (): LandingAnswer[] => (weighed ??= weighAll());
