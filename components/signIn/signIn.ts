import { ownAddress, sessionRoute } from "../addresses";
import { ask } from "./ask";

export interface Credentials {
  email: string;
  password: string;
  keep: boolean;
  next?: string;
}

export type SignInOutcome =
  | { kind: "in"; next: string }
  /** E-mail and password do not belong together, or one of them cannot be read. */
  | { kind: "refused"; message: string }
  /** They belong together, but nobody has opened the link in the mail yet. */
  | { kind: "unchecked"; message: string }
  | { kind: "wait"; message: string; seconds: number }
  | { kind: "fault"; message: string };

const UNREACHABLE = "Your e-mail and password are still in the fields. Try again in a few seconds.";
const MISFIT = "E-mail and password do not fit together. The e-mail is kept; type the password again.";
const UNCHECKED = "A link went to this e-mail when you signed up. Open it and press the button there.";

export async function signIn(credentials: Credentials): Promise<SignInOutcome> {
  const answered = await ask("POST", sessionRoute, credentials);
  switch (answered.kind) {
    case "done": {
      const next = answered.body?.next;
      return { kind: "in", next: ownAddress(typeof next === "string" ? next : undefined) };
    }
    case "wait":
      return answered;
    case "fault":
      return { kind: "fault", message: answered.message.includes("fields") ? UNREACHABLE : answered.message };
    case "refused":
      if (answered.code === "unchecked") return { kind: "unchecked", message: answered.message || UNCHECKED };
      return { kind: "refused", message: answered.message || MISFIT };
    case "invalid":
      return { kind: "refused", message: answered.message || MISFIT };
  }
}
