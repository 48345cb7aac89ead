import "server-only";
import type { Plan } from "@/lib/noise/plan";
import { solve } from "@/lib/noise/solve";
import type { Note, Verdict } from "@/lib/noise/verdict";
import { forWire } from "@/lib/noise/wire";
import { partTables, type Damage, type StoredPlan } from "@/models/parts";
import { log } from "./log";
import { notWeighed } from "./notWeighed";

/** What every reader of a plan gets: never a plan beside another plan's verdict. */
export interface Answer {
  revision: number;
  plan: Plan;
  verdict: Verdict;
}

/** Answers kept in memory, over all projects: a revision never changes. */
const KEPT = 100;

interface Kept extends Answer {
  /** Whether every row was read: only then does the plan hold all that the rows hold. */
  whole: boolean;
}

declare global {
  var stillyardAnswers: Map<string, Kept> | undefined;
}

const answers = () => (globalThis.stillyardAnswers ??= new Map<string, Kept>());

/** The whole plan of a revision, where memory holds it. */
export function keptPlan(projectId: string, revision: number): Plan | undefined {
  const kept = answers().get(`${projectId}:${revision}`);
  return kept?.whole ? kept.plan : undefined;
}

export function keptAnswer(projectId: string, revision: number): Answer | undefined {
  const kept = answers().get(`${projectId}:${revision}`);
  return kept && { revision, plan: kept.plan, verdict: kept.verdict };
}

/** The plan of a revision with its verdict. Solved outside every transaction; the save stands whatever becomes of it. */
export function weigh(projectId: string, revision: number, stored: StoredPlan): Answer {
  const kept = keptAnswer(projectId, revision);
  if (kept) return kept;
  const answer = { revision, plan: stored.plan, verdict: forWire(judge(stored)) };
  keep(`${projectId}:${revision}`, { ...answer, whole: stored.damage.length === 0 });
  return answer;
}

function keep(key: string, answer: Kept) {
  answers().set(key, answer);
  const [oldest] = answers().keys();
  if (answers().size > KEPT && oldest !== undefined) answers().delete(oldest);
}

/** The whole verdict. A plan with rows that cannot be read is not weighed: what is missing might be the loudest. */
export function judge({ plan, damage }: StoredPlan): Verdict {
  if (damage.length) return notWeighed(plan, damage.map(damageNote));
  try {
    return solve(plan);
  } catch (fault) {
    log.error({ err: fault }, "solve failed");
    return notWeighed(plan, [{ partId: null, text: "This plan could not be weighed. The plan itself is kept." }]);
  }
}

function damageNote({ kind, id }: Damage): Note {
  return { partId: id, text: `One ${partTables[kind].word} could not be read and is left out. Nothing is weighed until it is mended.` };
}
