import "server-only";
import { env } from "./env";

/** Said over the sign-in form where the way to this address is not encrypted. */
export function signInNotice(): string | undefined {
  return env().trustworthy ? undefined : "This address is not encrypted: use it only in a network you trust.";
}
