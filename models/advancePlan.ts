import type { Plan } from "../lib/noise/plan";
import type { PlanPart } from "./partRows";
import { partKinds, partTables } from "./partTables";
import type { Act } from "./Revision";

/** The plan after these acts, as its rows would give it: what is added stands last, what is changed keeps its place. */
export function advancePlan(plan: Plan, acts: readonly Act[]): Plan {
  return acts.reduce(advance, plan);
}

function advance(plan: Plan, { kind: name, id, act, after }: Act): Plan {
  const kind = partKinds.find((one) => one === name);
  if (!kind) return plan; // an act on the project, not on its plan
  const { list } = partTables[kind];
  if (!list) return { ...plan, [kind]: after };
  const parts = plan[list] as PlanPart[]; // every part has an id
  return { ...plan, [list]: act === "add" ? [...parts, after] : parts.flatMap((part) => (part.id === id ? (after ?? []) : [part])) };
}
