import { ownAddress, sessionRoute } from "../addresses";

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
  | { kind: "wait"; message: string }
  | { kind: "fault"; message: string };

const UNREACHABLE = "Your e-mail and password are still in the fields. Try again in a few seconds.";

async function readAnswer(answer: Response): Promise<{ next?: unknown; message?: unknown }> {
  const body: { next?: unknown; error?: { message?: unknown } } | null = await answer.json().catch(() => null);
  return { next: body?.next, message: body?.error?.message };
}

const words = (message: unknown, otherwise: string): string =>
  typeof message === "string" && message !== "" ? message : otherwise;

export async function signIn(credentials: Credentials): Promise<SignInOutcome> {
  let answer: Response;
  try {
    answer = await fetch(sessionRoute, {
      method: "POST",
      headers: { "Content-Type": "application/json" },
      body: JSON.stringify(credentials),
    });
  } catch {
    return { kind: "fault", message: UNREACHABLE };
  }
  const { next, message } = await readAnswer(answer);
  if (answer.ok) return { kind: "in", next: ownAddress(typeof next === "string" ? next : undefined) };
  if (answer.status === 429) return { kind: "wait", message: words(message, "Too many tries. Wait a little, then try again.") };
  if (answer.status >= 500) return { kind: "fault", message: words(message, UNREACHABLE) };
  return { kind: "refused", message: words(message, "E-mail and password do not fit together. The e-mail is kept; type the password again.") };
}
