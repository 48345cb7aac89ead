import type { Task } from "../app/_server/passwordWorkers";

/** Stands in for the password worker where a test asks thousands of times: the same verbs without the work, counted. */
export const hashing = { compared: 0, hashed: 0 };

export function askWorker({ verb, secret, hash }: Task): Promise<unknown> {
  hashing[verb === "hash" ? "hashed" : "compared"] += 1;
  return Promise.resolve(verb === "hash" ? `$2b$12$${secret}` : hash === `$2b$12$${secret}`);
}
