"use client";

import { Provider } from "jotai";
import { useState, type ReactNode } from "react";
import { createPlanStore, type Answer } from "./plan";

/** State of one yard's page; give it the yard's id as key. */
export function PlanProvider({ answer, children }: { answer: Answer; children: ReactNode }) {
  const [store] = useState(() => createPlanStore(answer));
  return <Provider store={store}>{children}</Provider>;
}
