"use client";

import type { Criterion, Plan, Receiver } from "@/lib/noise/plan";
import type { Saved } from "../plan/save";
import { usePlannedSave } from "../plan/usePlannedSave";
import type { PlanSave } from "../plan/usePlanSave";
import type { LimitPatch } from "./limitPatches";

export interface Edits {
  /** Changes a limit from what stands when the change is sent, if there is anything to change; `field` is where a refusal is shown. */
  limit: (id: string, field: string, patch: (standing: Criterion) => LimitPatch | { libraryKey: string } | undefined) => Promise<Saved | undefined>;
  listener: (id: string, field: string, patch: (standing: Receiver, plan: Plan) => Partial<Receiver>) => Promise<Saved | undefined>;
  errorOf: (id: string, field: string, path?: string) => string | undefined;
}

const spotOf = (id: string, field: string) => `${id} ${field}`;

/** Edits of limits and listeners: quick changes of one thing build on each other, and each has a place for its refusal. */
export function useLimitEdits(save: PlanSave): Edits {
  const planned = usePlannedSave(save);
  return {
    limit: (id, field, patch) =>
      planned(({ criteria }) => {
        const standing = criteria.find((limit) => limit.id === id);
        const changed = standing && patch(standing);
        return changed ? [{ act: "change", part: "criteria", id, patch: { ...changed } }] : [];
      }, spotOf(id, field)),
    listener: (id, field, patch) =>
      planned((plan) => {
        const standing = plan.receivers.find((receiver) => receiver.id === id);
        return standing ? [{ act: "change", part: "receivers", id, patch: { ...patch(standing, plan) } }] : [];
      }, spotOf(id, field)),
    errorOf: (id, field, path = field) => save.errorOf(spotOf(id, field), path) ?? save.errorOf(spotOf(id, field)),
  };
}
