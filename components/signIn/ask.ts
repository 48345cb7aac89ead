/** What became of something that was asked of the server about an account. */
export type Answered =
  | { kind: "done"; body: { next?: unknown } | null }
  /** Fields that do not fit, each with its words. */
  | { kind: "invalid"; message: string; fields: Record<string, string> }
  | { kind: "refused"; status: number; code: string; message: string }
  /** Asked too often; seconds until the next try, 0 where the answer does not say. */
  | { kind: "wait"; message: string; seconds: number }
  | { kind: "fault"; message: string };

interface Told {
  code: string;
  message: string;
  fields: Record<string, string>;
}

const UNREACHABLE = "What you typed is still in the fields. Try again in a few seconds.";

const text = (value: unknown): string => (typeof value === "string" ? value : "");

function toldIn(body: unknown): Told {
  const { error } = (body ?? {}) as { error?: { code?: unknown; message?: unknown; fields?: unknown } };
  const fields = Object.entries(error?.fields ?? {}).filter((one): one is [string, string] => typeof one[1] === "string");
  return { code: text(error?.code), message: text(error?.message), fields: Object.fromEntries(fields) };
}

const secondsOf = (answer: Response): number => Math.max(0, Math.ceil(Number(answer.headers.get("Retry-After")) || 0));

/** Asks, and never throws: a server that cannot be reached is an answer too. */
export async function ask(method: "POST" | "PATCH" | "DELETE", route: string, sent?: object): Promise<Answered> {
  let answer: Response;
  try {
    answer = await fetch(route, {
      method,
      ...(sent && { headers: { "Content-Type": "application/json" }, body: JSON.stringify(sent) }),
    });
  } catch {
    return { kind: "fault", message: UNREACHABLE };
  }
  const body: { next?: unknown } | null = await answer.json().catch(() => null);
  if (answer.ok) return { kind: "done", body };
  const { code, message, fields } = toldIn(body);
  if (answer.status === 429) return { kind: "wait", message: message || "Too many tries. Wait a little, then try again.", seconds: secondsOf(answer) };
  if (answer.status === 422) return { kind: "invalid", message: message || "This does not fit.", fields };
  if (answer.status >= 500) return { kind: "fault", message: message || UNREACHABLE };
  return { kind: "refused", status: answer.status, code, message };
}
