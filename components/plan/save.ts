import { changesRoute, partRoute, projectRouteAddress } from "../addresses";
import type { Answer } from "../state/plan";
import type { PlanChange, TouchedPart } from "./planChange";
import { forgetUnanswered, isOwnLostAct, keyOf, type Request } from "./unanswered";

export type { PlanChange, TouchedPart } from "./planChange";

export interface ChangedBy {
  name: string;
  /** ISO 8601. */
  at: string;
  /** Whether `parts` holds all that was touched since; of very many changes only the last are named. */
  whole: boolean;
  parts: TouchedPart[];
}

export type Saved =
  | { kind: "saved"; answer: Answer }
  | { kind: "stale"; current: Answer; changedBy: ChangedBy }
  | { kind: "refused"; message: string; fields: Record<string, string> }
  | { kind: "signedOut"; message: string }
  | { kind: "gone"; message: string }
  | { kind: "failed"; message: string };

export interface Written {
  projectId: string;
  revision: number;
  /** The segment of the address: "elements", "receivers" ... */
  part: string;
}

type Values = Record<string, unknown>;

/** Changes one part. */
export function savePart({ id, patch, ...written }: Written & { id: string; patch: Values }): Promise<Saved> {
  const address = partRoute(written.projectId, written.part, id);
  return write({ method: "PATCH", address, body: patch }, written.revision, (touched) => touched.has(id));
}

/** Removes one part and what belongs to it; never replayed by itself. */
export function removePart({ id, ...written }: Written & { id: string }): Promise<Saved> {
  const address = partRoute(written.projectId, written.part, id);
  return write({ method: "DELETE", address }, written.revision, () => true);
}

/** Adds a part; what others changed meanwhile does not stand in its way. */
export function addPart({ values, ...written }: Written & { values: Values }): Promise<Saved> {
  const address = partRoute(written.projectId, written.part);
  return write({ method: "POST", address, body: values }, written.revision, () => false);
}

/** Several changes as one: all of them or none. Sent again by itself only where nobody touched what it touches. */
export function saveChanges({ projectId, revision, changes }: { projectId: string; revision: number; changes: readonly PlanChange[] }): Promise<Saved> {
  const ids = changes.flatMap((change) => (change.act === "add" ? [] : [change.id]));
  const removes = changes.some(({ act }) => act === "remove");
  const collides = (touched: ReadonlySet<string>) => removes || ids.some((id) => touched.has(id));
  return write({ method: "POST", address: changesRoute(projectId), body: { changes } }, revision, collides);
}

/** Renames, archives or restores a yard. */
export function saveProject({ projectId, revision, patch }: { projectId: string; revision: number; patch: Values }): Promise<Saved> {
  const address = projectRouteAddress(projectId);
  return write({ method: "PATCH", address, body: patch }, revision, (touched) => touched.has(projectId));
}

/**
 * Sends a change; when somebody else was quicker and touched nothing this change touches, sends it once more. A change of
 * our own whose answer never came is nobody else's.
 */
async function write(request: Request, revision: number, collides: (touched: ReadonlySet<string>) => boolean): Promise<Saved> {
  const key = keyOf(request);
  const first = await send(request, revision, key);
  if (first.kind !== "stale") return first;
  const { whole, parts } = first.changedBy;
  const touched = new Set(parts.filter((part) => !isOwnLostAct(part)).map(({ id }) => id));
  return !whole || collides(touched) ? first : send(request, first.current.revision, key);
}

const SECONDS = 30;

async function send({ method, address, body }: Request, revision: number, key: string): Promise<Saved> {
  try {
    const response = await fetch(address, {
      method,
      headers: { "If-Match": `"${revision}"`, "Idempotency-Key": key, ...(body && { "Content-Type": "application/json" }) },
      body: body && JSON.stringify(body),
      signal: AbortSignal.timeout(SECONDS * 1000),
    });
    const saved = await savedOf(response);
    if (isSettled(response.status)) forgetUnanswered();
    return saved;
  } catch {
    return { kind: "failed", message: "No answer from the server. What you typed is kept here; try again." };
  }
}

/** Whether an answer tells what became of the act: a fault, a lock or a wait does not. */
const isSettled = (status: number) => status < 500 && status !== 409 && status !== 429;

/** The error part of an answer, as the routes write it. */
interface ErrorAnswer {
  error: { message: string; fields?: Record<string, string> };
  current?: Answer;
  changedBy?: ChangedBy;
}

async function savedOf(response: Response): Promise<Saved> {
  if (response.ok) return { kind: "saved", answer: (await response.json()) as Answer };
  const { error, current, changedBy } = (await response.json()) as ErrorAnswer;
  const { message, fields = {} } = error;
  if (response.status === 409 && current && changedBy) return { kind: "stale", current, changedBy };
  if (response.status === 401) return { kind: "signedOut", message };
  if (response.status === 404) return { kind: "gone", message };
  if (response.status >= 500 || response.status === 429) return { kind: "failed", message };
  return { kind: "refused", message, fields };
}
