import { changesRoute, partRoute, projectRouteAddress } from "../addresses";
import type { Answer } from "../state/plan";

/** What happened to one part of a plan. */
export interface TouchedPart {
  kind: string;
  id: string;
  act: "add" | "change" | "remove";
  before: Record<string, unknown> | null;
  after: Record<string, unknown> | null;
}

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

/** One change of a plan. `as` names a part that is added, "new:room", so that later changes of the list point at it. */
export type PlanChange =
  | { act: "add"; part: string; values: Values; as?: `new:${string}` }
  | { act: "change"; part: string; id: string; patch: Values }
  | { act: "remove"; part: string; id: string };

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

interface Request {
  method: "PATCH" | "POST" | "DELETE";
  address: string;
  body?: Values;
}

/** Sends a change; when somebody else was quicker and touched nothing this change touches, sends it once more. */
async function write(request: Request, revision: number, collides: (touched: ReadonlySet<string>) => boolean): Promise<Saved> {
  const key = keyOf(request);
  const first = await send(request, revision, key);
  if (first.kind !== "stale") return first;
  const { whole, parts } = first.changedBy;
  const touched = new Set(parts.map(({ id }) => id));
  return !whole || collides(touched) ? first : send(request, first.current.revision, key);
}

/**
 * Keys of acts that had no answer. The same act asked again bears the same key, so that it is done once even if only its
 * answer was lost. Once the server has answered anything, the screen shows what is so, and the same act is a new wish.
 */
const unanswered = new Map<string, string>();

function keyOf({ method, address, body }: Request): string {
  const act = JSON.stringify([method, address, body]);
  const key = unanswered.get(act) ?? freshKey();
  unanswered.set(act, key);
  return key;
}

/** 128 bits of chance; `crypto.randomUUID` is there on secure addresses only. */
export function freshKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, "0")).join("");
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
    if (isSettled(response.status)) unanswered.clear();
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
