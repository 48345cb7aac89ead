import "server-only";
import { randomUUID } from "node:crypto";
import { type Transaction, QueryTypes } from "sequelize";
import { connection, Job } from "@/models";
import { databaseNow, fromNow } from "../moments";

const LEASE_SECONDS = 60;
export const MOST_TRIES = 8;
const FIRST_WAIT = 15;
const LONGEST_WAIT = 3_600;

export interface Claimed {
  id: string;
  kind: string;
  payload: Record<string, unknown>;
  /** Which try this is, from 1. */
  tries: number;
  madeAt: Date;
  lease: string;
}

export interface Wanted {
  id?: string;
  kind: string;
  payload: Record<string, unknown>;
}

/** Writes a job in the transaction of the act that it follows, and wakes this process's loop once that is committed. */
export async function writeJob({ id = randomUUID(), kind, payload }: Wanted, transaction: Transaction): Promise<void> {
  await Job.create({ id, kind, payload }, { fields: ["id", "kind", "payload"], transaction });
  transaction.afterCommit(() => globalThis.stillyardJobs?.wake());
}

/** The oldest job that is due, ours for a minute; two askers never get the same. */
export async function claimJob(): Promise<Claimed | undefined> {
  const lease = randomUUID();
  const rows = await connection.query<Omit<Claimed, "lease">>(claim, { bind: [lease, LEASE_SECONDS], type: QueryTypes.SELECT });
  return rows[0] && { ...rows[0], lease };
}

const claim = `
  update jobs set lease = $1, leased_until = now() + make_interval(secs => $2), tries = tries + 1
  where id = (
    select id from jobs
    where state = 'waiting' and due_at <= now() and (leased_until is null or leased_until < now())
    order by due_at, id limit 1 for update skip locked
  )
  returning id, kind, payload, tries, made_at as "madeAt"`;

const held = ({ id, lease }: Claimed) => ({ id, lease, state: "waiting" as const });

/** Whether the job is still ours, and if so for another minute. */
export async function renewLease(job: Claimed): Promise<boolean> {
  const [count] = await Job.update({ leasedUntil: fromNow(LEASE_SECONDS) }, { where: held(job), fields: ["leasedUntil"] });
  return count === 1;
}

export async function finishJob(job: Claimed): Promise<void> {
  await endJob(job, "done", null);
}

/** The next try comes 15 s later, then twice that and so on up to an hour; after the eighth the job is dead. */
export async function failJob(job: Claimed, fault: string): Promise<"waiting" | "dead"> {
  const words = fault.slice(0, 500);
  if (job.tries >= MOST_TRIES) {
    await endJob(job, "dead", words);
    return "dead";
  }
  const dueAt = fromNow(Math.min(FIRST_WAIT * 2 ** (job.tries - 1), LONGEST_WAIT));
  await Job.update({ dueAt, fault: words, lease: null, leasedUntil: null }, { where: held(job), fields: ["dueAt", "fault", "lease", "leasedUntil"] });
  return "waiting";
}

async function endJob(job: Claimed, state: "done" | "dead", fault: string | null) {
  const values = { state, fault, endedAt: databaseNow(), lease: null, leasedUntil: null };
  await Job.update(values, { where: held(job), fields: ["state", "fault", "endedAt", "lease", "leasedUntil"] });
}

/** Hands a job back untried: another process may have it at once. */
export async function handBack(job: Claimed): Promise<void> {
  const values = { tries: job.tries - 1, lease: null, leasedUntil: null };
  await Job.update(values, { where: held(job), fields: ["tries", "lease", "leasedUntil"] });
}
