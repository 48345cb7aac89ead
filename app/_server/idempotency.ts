import "server-only";
import { createHash } from "node:crypto";
import { fn, type Transaction } from "sequelize";
import { IdempotencyKey, User } from "@/models";
import { Refusal } from "./errors";
import type { Reader } from "./identity";

const LIFETIME = 48 * 3_600_000;

interface Asked {
  request: Request;
  reader: Pick<Reader, "id">;
  body: object;
  transaction: Transaction;
}

/**
 * Does a creating act once for each `Idempotency-Key` of a person, inside the act's own transaction. Asked again with the
 * same key and body it gives what the act came to, and acts no more; a request without a key simply acts.
 */
export async function once<T extends object>({ request, reader, body, transaction }: Asked, act: () => Promise<T>): Promise<T> {
  const key = readKey(request);
  if (key === undefined) return act();
  const { pathname } = new URL(request.url);
  const asked = { userId: reader.id, key, route: `${request.method} ${pathname}`.slice(0, 300), bodyHash: hashOf(body) };
  await refuseTwin(asked, transaction);
  const done = await findKey(asked, transaction);
  if (done) return repeated<T>(done, asked);
  const answer = await act();
  const fields: (keyof typeof asked | "answer")[] = ["userId", "key", "route", "bodyHash", "answer"];
  await IdempotencyKey.create({ ...asked, answer }, { fields, transaction });
  return answer;
}

const hashOf = (body: object) => createHash("sha256").update(JSON.stringify(body)).digest("hex");

/** The key a request came with: what tells one wish asked twice from two wishes. */
function readKey(request: Request): string | undefined {
  const key = request.headers.get("idempotency-key");
  if (key === null) return undefined;
  if (/^[\x21-\x7e]{1,255}$/.test(key)) return key;
  throw new Refusal("unreadable", "The Idempotency-Key could not be read: 1 to 255 letters, digits and signs.");
}

/** One request with a key at a time. The lock goes with the transaction, whichever way that ends. */
async function refuseTwin({ userId, key }: { userId: string; key: string }, transaction: Transaction) {
  const free = fn("pg_try_advisory_xact_lock", fn("hashtextextended", `${userId} ${key}`, 0));
  const row = await User.findOne({ where: { id: userId }, attributes: [[free, "free"]], raw: true, transaction });
  if ((row as unknown as { free: boolean } | null)?.free) return; // the one attribute asked for
  throw new Refusal("conflict", "This very change is being saved already.", { retryAfter: 1 });
}

/** A key younger than 48 hours by the database's time; older ones wait for the sweep. */
async function findKey({ userId, key }: { userId: string; key: string }, transaction: Transaction) {
  const attributes = { include: [[fn("now"), "now"]] as [ReturnType<typeof fn>, string][] };
  const row = await IdempotencyKey.findOne({ where: { userId, key }, attributes, transaction });
  const now = row?.get("now") as Date | undefined; // asked for beside the columns
  return row && now && now.getTime() - row.madeAt.getTime() < LIFETIME ? row : undefined;
}

function repeated<T extends object>(done: IdempotencyKey, asked: { route: string; bodyHash: string }): T {
  if (done.route === asked.route && done.bodyHash === asked.bodyHash) return done.answer as T; // stored by the same route
  throw new Refusal("invalid", "This Idempotency-Key was used for something else before.");
}
