import type { Plan } from "../lib/noise/plan";
import { linkFields } from "./partLinks";
import type { PlanPart } from "./partRows";
import { partKinds, partTables } from "./partTables";

/** The same plan under other ids: every id and everything that points at one goes through `idOf`. */
export function relabelPlan(plan: Plan, idOf: (id: string) => string): Plan {
  const lists = partKinds.map((kind) => {
    const { list, references } = partTables[kind];
    const fields = ["id", ...references.map(({ field }) => field)];
    const relabel = (part: PlanPart) => relabelLinks(relabelFields(part, fields, idOf), linkFields[kind], idOf);
    // Each list of a plan holds parts with ids.
    return list ? [list, (plan[list] as PlanPart[]).map(relabel)] : [kind, relabel(plan.lot as PlanPart)];
  });
  return Object.fromEntries(lists) as Plan; // the same lists under the same names
}

function relabelFields(part: PlanPart, fields: readonly string[], idOf: (id: string) => string): PlanPart {
  const changed = fields.filter((field) => typeof part[field] === "string").map((field) => [field, idOf(String(part[field]))]);
  return { ...part, ...Object.fromEntries(changed) };
}

function relabelLinks(part: PlanPart, field: string | undefined, idOf: (id: string) => string): PlanPart {
  if (field === "playing") {
    const playing = part.playing as Plan["situations"][0]["playing"];
    return { ...part, playing: playing.map((one) => ({ ...one, sourceId: idOf(one.sourceId) })) };
  }
  if (field === "distances") {
    const distances = Object.entries(part.distances as object).map(([id, metres]) => [idOf(id), metres]);
    return { ...part, distances: Object.fromEntries(distances) };
  }
  return part;
}
