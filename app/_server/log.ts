import "server-only";
import pino from "pino";

/** One line of JSON each on standard output. Never a password, a token or the text of a body. */
export const log = pino({
  name: "stillyard",
  level: process.env.LOG_LEVEL ?? (process.env.NODE_ENV === "test" ? "silent" : "warn"),
});
