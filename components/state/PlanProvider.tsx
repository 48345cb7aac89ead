"use client";

import { Provider, useSetAtom } from "jotai";
import { useHydrateAtoms } from "jotai/utils";
import { useEffect, type ReactNode } from "react";
import { answerAtom, type Answer } from "./plan";

/** State of one yard, kept while the reader walks between its pages. None is shared between requests. */
export function YardState({ children }: { children: ReactNode }) {
  return <Provider>{children}</Provider>;
}

/** Hands the answer a page came with to the yard's state, which keeps the greatest revision. */
export function PlanProvider({ answer, children }: { answer: Answer; children: ReactNode }) {
  useHydrateAtoms([[answerAtom, answer]]);
  const setAnswer = useSetAtom(answerAtom);
  useEffect(() => setAnswer(answer), [answer, setAnswer]);
  return children;
}
