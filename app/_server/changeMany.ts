import "server-only";
import { z } from "zod";
import { PartFault, type Act, type Place } from "@/models/parts";
import { addOne, changeOne, removeOne } from "./partRoutes";
import { read } from "./sessionRoutes";

const MOST_CHANGES = 120;
const values = z.record(z.string().max(60), z.unknown());
/** A name for a part that this very request adds, so that later changes of the request can point at it. */
const newName = z.string().regex(/^new:[\w-]{1,60}$/);

const changeSchema = z.discriminatedUnion("act", [
  z.strictObject({ act: z.literal("add"), part: z.string().max(40), as: newName.optional(), values }),
  z.strictObject({ act: z.literal("change"), part: z.string().max(40), id: z.string().max(70), patch: values }),
  z.strictObject({ act: z.literal("remove"), part: z.string().max(40), id: z.string().max(70) }),
]);
type Change = z.infer<typeof changeSchema>;
const form = z.strictObject({ changes: z.array(changeSchema).min(1).max(MOST_CHANGES) });

/** Several changes as one: all of them or none. A refusal names the change it is about: "changes.3.values.area". */
export async function changeMany(place: Place, body: Record<string, unknown>): Promise<Act[]> {
  const { changes } = read(form, body);
  const ids = new Map<string, string>();
  const acts: Act[] = [];
  for (const [at, asked] of changes.entries()) {
    const change = named(asked, ids) as Change; // only texts were replaced by texts
    const done = await changeNext(place, change).catch((thrown: unknown) => Promise.reject(placed(thrown, at, change)));
    if (asked.act === "add" && asked.as && done[0]) ids.set(asked.as, done[0].id);
    acts.push(...done);
  }
  return acts;
}

function changeNext(place: Place, change: Change): Promise<Act[]> {
  const params = { projectId: place.projectId, part: change.part };
  if (change.act === "add") return addOne(place, params, change.values);
  const one = { ...params, partId: change.id };
  return change.act === "change" ? changeOne(place, one, change.patch) : removeOne(place, one);
}

/** The same value with every name of a new part replaced by the id that part got. */
function named(value: unknown, ids: ReadonlyMap<string, string>): unknown {
  if (typeof value === "string") return ids.get(value) ?? value;
  if (Array.isArray(value)) return value.map((one) => named(one, ids));
  if (typeof value !== "object" || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([field, one]) => [ids.get(field) ?? field, field === "as" ? one : named(one, ids)]));
}

function placed(thrown: unknown, at: number, { act }: Change): unknown {
  if (!(thrown instanceof PartFault)) return thrown;
  const inside = act === "add" ? "values" : act === "change" ? "patch" : "id";
  const fields = Object.entries(thrown.fields).map(([field, words]) => [`changes.${at}.${inside}.${field}`, words]);
  return new PartFault(thrown.reason, thrown.message, Object.fromEntries(fields));
}
