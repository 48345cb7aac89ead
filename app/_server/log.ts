import "server-only";
import pino from "pino";

/** Of a fault its kind, words and place. An error of the database layer also holds the statement and every value in it. */
export function faultOf(thrown: unknown): object {
  if (!(thrown instanceof Error)) return { type: typeof thrown };
  const { name, message, stack } = thrown;
  const code = "original" in thrown ? (thrown.original as { code?: unknown } | undefined)?.code : undefined;
  return { type: name, message, stack, ...(typeof code === "string" && { code }) };
}

/** One line of JSON each on standard output. Never a password, a token or the text of a body. */
export const log = pino({
  name: "stillyard",
  serializers: { err: faultOf },
  level: process.env.LOG_LEVEL ?? (process.env.NODE_ENV === "test" ? "silent" : "warn"),
});
