import { projectRouteAddress, projectsRoute } from "../addresses";
import { freshKey } from "../plan/unanswered";

export type Made =
  | { kind: "made"; id: string; next: string }
  | { kind: "refused"; message: string; fields: Record<string, string> }
  | { kind: "failed"; message: string };

/** Wishes whose answer never came: asked again they bear the same key, so that no second yard is made. */
const unanswered = new Map<string, string>();

/** Makes a yard out of sizes, or out of the worked example. */
export const makeYard = (values: object): Promise<Made> => ask(projectsRoute, values);

/** Copies a yard with everything drawn in it. */
export const copyYard = (projectId: string): Promise<Made> => ask(`${projectRouteAddress(projectId)}/copy`, {});

async function ask(address: string, values: object): Promise<Made> {
  const body = JSON.stringify(values);
  const wish = `${address} ${body}`;
  const key = unanswered.get(wish) ?? freshKey();
  unanswered.set(wish, key);
  try {
    const headers = { "Content-Type": "application/json", "Idempotency-Key": key };
    const response = await fetch(address, { method: "POST", headers, body, signal: AbortSignal.timeout(30_000) });
    const made = await madeOf(response);
    // A twin on its way (409) may yet be done: the next try must bear its key.
    if (response.status < 500 && response.status !== 409) unanswered.delete(wish);
    return made;
  } catch {
    return { kind: "failed", message: "No answer from the server. What you typed is kept here; try again." };
  }
}

async function madeOf(response: Response): Promise<Made> {
  const body = (await response.json()) as { id?: string; next?: string; error?: { message: string; fields?: Record<string, string> } };
  if (response.ok && body.id && body.next) return { kind: "made", id: body.id, next: body.next };
  const { message = "Something went wrong on our side. Nothing is lost.", fields = {} } = body.error ?? {};
  return response.status >= 500 ? { kind: "failed", message } : { kind: "refused", message, fields };
}
