import type { Plan } from "../../lib/noise/plan";
import { changeOf } from "../plan/fieldSpec";
import { partsOf } from "../plan/partsOf";
import type { PlanChange } from "../plan/save";
import type { Thing } from "./things";

export interface Removal {
  changes: PlanChange[];
  /** What brings it back; a part that was removed comes back under a new key. */
  undo: PlanChange[];
}

/** Removing a thing, and how to bring it back with what belongs to it. */
export function removalOf(plan: Plan, { part, id }: Thing): Removal {
  if (part === "trees") return removeTree(plan, Number(id));
  const standing = partsOf(plan, part).find((one) => one.id === id);
  if (!standing) return { changes: [], undo: [] };
  return { changes: [{ act: "remove", part, id }], undo: [backAgain(part, standing), ...ownedAgain(plan, part, id)] };
}

function removeTree({ lot }: Plan, at: number): Removal {
  const trees = lot.trees.filter((_, index) => index !== at);
  return { changes: changeOf("lots", lot.id, { trees }), undo: changeOf("lots", lot.id, { trees: lot.trees }) };
}

const AGAIN = "new:again";

function backAgain(part: string, standing: { id: string } & Record<string, unknown>): PlanChange {
  const { id: _, ...values } = standing;
  return { act: "add", part, as: AGAIN, values };
}

function ownedAgain(plan: Plan, part: string, id: string): PlanChange[] {
  const owned = (list: string, field: string): PlanChange[] =>
    partsOf(plan, list)
      .filter((one) => one[field] === id)
      .map(({ id: _, ...values }) => ({ act: "add", part: list, values: { ...values, [field]: AGAIN } }));
  if (part === "receivers") return owned("criteria", "receiverId");
  if (part === "elements") return owned("incidences", "elementId");
  if (part !== "sources") return [];
  return [...owned("outlets", "sourceId"), ...owned("incidences", "sourceId"), ...playingAgain(plan, id)];
}

/** A source that is removed is taken out of every situation, and comes back into them. */
function playingAgain({ situations }: Plan, id: string): PlanChange[] {
  return situations
    .filter(({ playing }) => playing.some(({ sourceId }) => sourceId === id))
    .flatMap((situation) =>
      changeOf("situations", situation.id, {
        playing: situation.playing.map((one) => (one.sourceId === id ? { ...one, sourceId: AGAIN } : one)),
      }),
    );
}
