import type { Criterion, Plan, Receiver, Situation } from "@/lib/noise/plan";
import type { ReceiverVerdict, Verdict } from "@/lib/noise/verdict";

/** One listener with everything of plan and verdict that the words are made of. */
export interface Reading {
  plan: Plan;
  verdict: Verdict;
  receiver: Receiver;
  weighed: ReceiverVerdict;
  criterion: Criterion | null;
  situation: Situation | null;
}

/** What there is to say of a listener; of the first where this one is not known, null where nobody listens. */
export function readingOf(plan: Plan, verdict: Verdict, receiverId: string | null): Reading | null {
  const weighed = verdict.receivers.find((one) => one.receiverId === receiverId) ?? verdict.receivers[0];
  const receiver = plan.receivers.find(({ id }) => id === weighed?.receiverId);
  if (!weighed || !receiver) return null;
  const criterion = plan.criteria.find(({ id }) => id === weighed.criterionId) ?? null;
  const situation = plan.situations.find(({ id }) => id === weighed.situationId) ?? null;
  return { plan, verdict, receiver, weighed, criterion, situation };
}
