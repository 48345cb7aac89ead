import { atom } from "jotai";
import type { Plan } from "@/lib/noise/plan";
import type { Verdict } from "@/lib/noise/verdict";

/** What the server says of a plan: never a plan beside another plan's verdict. */
export interface Answer {
  revision: number;
  plan: Plan;
  verdict: Verdict;
}

const heldAnswer = atom<Answer | null>(null);

/** The answer on the screen. It only ever moves on: a late one of an older revision changes nothing. */
export const answerAtom = atom(
  (get) => {
    const answer = get(heldAnswer);
    if (!answer) throw new Error("The page has given no plan.");
    return answer;
  },
  (get, set, next: Answer) => {
    const held = get(heldAnswer);
    if (!held || next.revision > held.revision) set(heldAnswer, next);
  },
);

/** Greatest revision seen on this yard's pages; 0 before the first. */
export const revisionAtom = atom((get) => get(heldAnswer)?.revision ?? 0);

/** What the reader looks at: a listener, a band in Hz, a path; null is whatever leads. */
export const litReceiverAtom = atom<string | null>(null);
export const litBandAtom = atom<number | null>(null);
export const litPathAtom = atom<string | null>(null);

/** Whether a change is on its way. */
export const savingAtom = atom(false);
