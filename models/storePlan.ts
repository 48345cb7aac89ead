import type { Plan } from "../lib/noise/plan";
import { checkReferences } from "./checkPart";
import type { PlanPart } from "./partRows";
import { insertPart } from "./parts";
import { partKinds, partTables, type Place } from "./partTables";

/** Writes a whole plan, checked and with ids of its own, into a project that has none yet. */
export async function storePlan(place: Place, plan: Plan): Promise<void> {
  for (const kind of partKinds) {
    const list = partTables[kind].list;
    const parts = (list ? plan[list] : [plan.lot]) as PlanPart[]; // every part has an id
    for (const [rank, part] of parts.entries()) {
      await checkReferences(kind, place.projectId, part, place.transaction);
      await insertPart(place, kind, part, rank);
    }
  }
}
