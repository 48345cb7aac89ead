import "server-only";
import { createHmac } from "node:crypto";
import { env } from "./env";
import { askWorker } from "./passwordWorkers";

export const PASSWORD_COST = 12;

/**
 * What is hashed in place of a password: 64 letters whatever its length, since bcrypt reads no further than 72 bytes, and
 * worthless without the pepper.
 */
function secretOf(password: string): string {
  return createHmac("sha384", env().pepper).update(password.normalize("NFC"), "utf8").digest("base64");
}

export async function hashPassword(password: string, cost = PASSWORD_COST): Promise<string> {
  return String(await askWorker({ verb: "hash", secret: secretOf(password), cost }));
}

/** Hash of a password nobody has, of the same cost: an unknown address takes as long as a known one. */
const NOBODY = "$2b$12$4C8hleqvzkFmA.4Uxe3XOOgp7vtqkHEWBCkTn8v3cA/Wgpkq0rK.i";

/** Whether it is the password of that hash; without a hash the work is done all the same and the answer is no. */
export async function matchesPassword(password: string, hash: string | undefined): Promise<boolean> {
  const matches = await askWorker({ verb: "compare", secret: secretOf(password), hash: hash ?? NOBODY });
  return matches === true && hash !== undefined;
}

/** Whether a hash was made when less work was enough. */
export const isCheaper = (hash: string) => Number(hash.split("$")[2]) < PASSWORD_COST;
