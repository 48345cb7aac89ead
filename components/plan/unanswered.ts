import type { PlanChange, TouchedPart } from "./planChange";

/** What was asked of the server, as it was sent. */
export interface Request {
  method: "PATCH" | "POST" | "DELETE";
  address: string;
  body?: Record<string, unknown>;
}

interface Asked {
  key: string;
  request: Request;
}

/**
 * Acts that had no answer. The same act asked again bears the same key, so that it is done once even if only its answer was
 * lost. Once the server has answered anything, the screen shows what is so, and the same act is a new wish.
 */
const unanswered = new Map<string, Asked>();

export function keyOf(request: Request): string {
  const { method, address, body } = request;
  const act = JSON.stringify([method, address, body]);
  const asked = unanswered.get(act) ?? { key: freshKey(), request };
  unanswered.set(act, asked);
  return asked.key;
}

export const forgetUnanswered = (): void => unanswered.clear();

/** 128 bits of chance; `crypto.randomUUID` is there on secure addresses only. */
export function freshKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, "0")).join("");
}

/** Whether a part was touched by an act of ours whose answer was lost: nobody else was quicker then. */
export function isOwnLostAct({ id, act, after }: TouchedPart): boolean {
  if (act !== "change" || !after) return false;
  return [...unanswered.values()].some(({ request }) => patchesOf(request, id).some((patch) => holds(after, patch)));
}

function patchesOf({ method, address, body }: Request, id: string): unknown[] {
  if (method === "PATCH") return address.endsWith(`/${id}`) ? [body] : [];
  const changes = (body?.changes ?? []) as readonly PlanChange[];
  return changes.flatMap((change) => (change.act === "change" && change.id === id ? [change.patch] : []));
}

/** Whether what stands has all that a patch asked for; of nested fields those that it names. */
function holds(stands: unknown, patch: unknown): boolean {
  if (!isRecord(patch) || !isRecord(stands)) return JSON.stringify(stands) === JSON.stringify(patch);
  return Object.entries(patch).every(([field, value]) => holds(stands[field], value));
}

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === "object" && value !== null && !Array.isArray(value);
