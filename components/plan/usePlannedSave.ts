"use client";

import { useStore } from "jotai";
import { useRef } from "react";
import type { Plan } from "../../lib/noise/plan";
import { answerAtom } from "../state/plan";
import type { PlanChange, Saved } from "./save";
import type { PlanSave } from "./usePlanSave";

export type PlannedSave = (planned: (plan: Plan) => PlanChange[], spot: string) => Promise<Saved | undefined>;

/**
 * Saves what a change does to the plan that stands when its turn comes, not to the one that was drawn when it was typed.
 * Where that is nothing, nothing is sent.
 */
export function usePlannedSave(save: PlanSave): PlannedSave {
  const store = useStore();
  const queue = useRef<Promise<unknown>>(Promise.resolve());
  return (planned, spot) => {
    const sent = queue.current.then(() => {
      const changes = planned(store.get(answerAtom).plan);
      return changes.length > 0 ? save.save(changes, spot) : undefined;
    });
    queue.current = sent.catch(() => undefined); // the next change must not wait for one that failed
    return sent;
  };
}
