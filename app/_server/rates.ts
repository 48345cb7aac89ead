import "server-only";
import { col, fn } from "sequelize";
import { Session } from "@/models";
import { env } from "./env";
import { Refusal } from "./errors";

/**
 * Counts a request of a session, in the database, so that every process counts the same. Refused are more than 300 in a
 * minute, and more than 20 changes in 10 seconds.
 */
export async function countRequest(idHash: string, method: string): Promise<void> {
  const { requestsAMinute, writesIn10s } = env();
  const writes = method === "GET" || method === "HEAD" ? 0 : 1;
  const seconds = fn("count_request", col("id_hash"), writes, requestsAMinute, writesIn10s);
  const row = await Session.findOne({ where: { idHash }, attributes: [[seconds, "wait"]], raw: true });
  const wait = (row as unknown as { wait: number } | null)?.wait ?? 0; // the one attribute asked for
  if (wait > 0) throw tooMany(wait);
}

function tooMany(seconds: number): Refusal {
  const when = seconds === 1 ? "a second" : `${seconds} seconds`;
  return new Refusal("too many", `That was too much at once. Nothing is lost: try again in ${when}.`, { retryAfter: seconds });
}
