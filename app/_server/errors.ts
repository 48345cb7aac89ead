import "server-only";
import { randomUUID } from "node:crypto";
import { PartFault } from "@/models/parts";
import { log } from "./log";

/** Why an answer is not what was asked for; the status follows. */
const statuses = {
  unreadable: 400,
  "signed out": 401,
  refused: 403,
  reauthenticate: 403,
  unchecked: 403,
  missing: 404,
  conflict: 409,
  "too large": 413,
  "wrong type": 415,
  invalid: 422,
  "revision needed": 428,
  "too many": 429,
  busy: 503,
} as const;
export type RefusalCode = keyof typeof statuses;

interface Details {
  fields?: Record<string, string>;
  /** Seconds. */
  retryAfter?: number;
  /** What the answer holds besides the refusal. */
  more?: object;
}

/** A refusal in words for the reader. Anything else that is thrown is a fault. */
export class Refusal extends Error {
  constructor(
    readonly code: RefusalCode,
    message: string,
    readonly details: Details = {},
  ) {
    super(message);
  }
}

export const notFound = () => new Refusal("missing", "There is nothing here.");

const busy = (message: string) => new Refusal("busy", message, { retryAfter: 2 });

/** The answer to whatever was thrown: a refusal in its own words, a fault without its words. */
export function answerError(thrown: unknown, requestId: string): Response {
  const refusal = refusalOf(thrown);
  if (!refusal) {
    log.error({ requestId, err: thrown }, "fault");
    return errorAnswer(500, { code: "fault", message: "Something went wrong on our side. Nothing is lost.", requestId });
  }
  const { code, message, details } = refusal;
  const status = statuses[code];
  if (status >= 500) log.warn({ requestId, ...(thrown !== refusal && { err: thrown }) }, message);
  const error = { code, message, ...(details.fields && { fields: details.fields }), requestId };
  return errorAnswer(status, error, details);
}

/** What a page throws on: the framework writes down all that it catches, so a fault goes there with a number only. */
export function pageFault(thrown: unknown): Error {
  if (thrown instanceof Refusal) return thrown;
  const requestId = randomUUID();
  log.error({ requestId, err: thrown }, "fault of a page");
  return new Error(`Fault ${requestId}`);
}

function errorAnswer(status: number, error: object, { retryAfter, more }: Details = {}): Response {
  const headers = { "Cache-Control": "private, no-store", ...(retryAfter && { "Retry-After": String(retryAfter) }) };
  return Response.json({ error, ...more }, { status, headers });
}

function refusalOf(thrown: unknown): Refusal | undefined {
  if (thrown instanceof Refusal) return thrown;
  if (thrown instanceof PartFault) return partRefusal(thrown);
  return databaseRefusal(thrown);
}

function partRefusal({ reason, message, fields }: PartFault): Refusal {
  if (reason === "missing") return notFound();
  return new Refusal(reason === "held" ? "conflict" : "invalid", message, { fields });
}

/** PostgreSQL's condition behind an error of the database layer, if there is one. */
export function databaseCode(thrown: unknown): string | undefined {
  const causes = thrown instanceof Error ? [thrown, "original" in thrown ? thrown.original : undefined] : [];
  return causes.map((cause) => (cause as { code?: unknown } | undefined)?.code).find((code) => typeof code === "string");
}

/** Conditions that pass: the work may simply be tried again. */
const passing = new Set(["40001", "40P01"]);
const full = new Set(["53100"]);
const slow = new Set(["55P03", "57014", "57P01", "57P02", "57P03", "25P03", "53300", ...passing]);
const broken = /^(08...|EPIPE|ECONN\w+|ETIMEDOUT)$/;

export const mayRetry = (thrown: unknown) => passing.has(databaseCode(thrown) ?? "");

function databaseRefusal(thrown: unknown): Refusal | undefined {
  const code = databaseCode(thrown);
  if (code && full.has(code)) return busy("We cannot save just now: the disk is full. What you typed stays here.");
  if ((code && (slow.has(code) || broken.test(code))) || isConnectionFault(thrown)) {
    return busy("We cannot reach the yard's records just now. Try again in a moment.");
  }
  // A check or key of the database that the schemas do not know of.
  if (code === "23514" || code === "23503" || code === "23505") return new Refusal("invalid", "This value does not fit.");
  return undefined;
}

function isConnectionFault(thrown: unknown): boolean {
  if (!(thrown instanceof Error)) return false;
  return /^Sequelize(Connection|HostNot)/.test(thrown.name) || /Connection terminated|connection timeout|query read timeout|not queryable|Client was closed|connection manager was closed/i.test(thrown.message);
}
