import { randomUUID } from "node:crypto";
import { isDeepStrictEqual } from "node:util";
import type { Transaction } from "sequelize";
import { PLAN_BOUNDS, type PartKind } from "../lib/noise/plan";
import { checkPart, checkReferences } from "./checkPart";
import { Part } from "./Part";
import { PartFault } from "./PartFault";
import { readLinks, saveLinks } from "./partLinks";
import { partOf, rowOf, type PlanPart } from "./partRows";
import { partTables, type PartTable, type Place } from "./partTables";
import type { Act } from "./Revision";

export { advancePlan } from "./advancePlan";
export { fieldWords } from "./checkPart";
export { PartFault } from "./PartFault";
export { partKindOf, partKinds, partTables, type Place } from "./partTables";
export { bareLot, planOf, readPlan, type Damage, type StoredPlan } from "./planOf";
export { removePart } from "./removePart";
export type { Act } from "./Revision";

/** Adds a part with the id it brings, or one of its own. */
export async function addPart(place: Place, kind: PartKind, values: object): Promise<Act[]> {
  const { id = randomUUID() } = values as { id?: string }; // only the server's own callers bring an id
  const part = checkPart(kind, { ...values, id });
  await checkRoom(place, kind);
  await checkReferences(kind, place.projectId, part, place.transaction);
  await insertPart(place, kind, part);
  return [{ kind, id: part.id, act: "add", before: null, after: part }];
}

/**
 * Changes a part: the patch is merged into what stands, `params` field by field, and the whole is checked by its one
 * schema. Nothing is written, and no act returned, when nothing changes.
 */
export async function changePart(place: Place, kind: PartKind, id: string, patch: object): Promise<Act[]> {
  const before = await findPart(place, kind, id);
  const after = checkPart(kind, { ...merged(before, patch), id }, patch);
  if (isDeepStrictEqual(before, after)) return [];
  await checkReferences(kind, place.projectId, after, place.transaction);
  await updatePart(place, kind, after);
  return [{ kind, id, act: "change", before, after }];
}

function merged(before: PlanPart, patch: object): object {
  const whole: Record<string, unknown> = { ...before, ...patch };
  if (isRecord(before.params) && isRecord(whole.params)) whole.params = { ...before.params, ...whole.params };
  return whole;
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === "object" && value !== null && !Array.isArray(value);

/** The part as it stands, found by id and project. A row its kind can no longer read counts as what is to be mended. */
export async function findPart({ projectId, transaction }: Place, kind: PartKind, id: string): Promise<PlanPart> {
  const { model, word } = partTables[kind];
  const row = await model.findOne({ where: { projectId, id }, transaction });
  if (!row) throw new PartFault("missing", `There is no such ${word} here.`);
  const links = await readLinks({ projectId, transaction }, [kind]);
  return partOf(kind, row.get({ plain: true }), links[kind]?.get(id));
}

/** A copy of what is being changed is held to the bounds of one project. */
async function checkRoom({ projectId, transaction }: Place, kind: PartKind) {
  const { model, list, word } = partTables[kind];
  const bound = list ? PLAN_BOUNDS[list] : 1;
  const standing = await model.count({ where: { projectId }, transaction });
  if (standing >= bound) throw new PartFault("held", `A yard holds at most ${bound} of these: no further ${word}.`);
}

/** Writes a checked part and its key; `rank` puts it last unless told otherwise. */
export async function insertPart({ projectId, transaction }: Place, kind: PartKind, part: PlanPart, rank?: number) {
  const { model } = partTables[kind];
  await Part.create({ projectId, id: part.id, kind }, { fields: ["projectId", "id", "kind"], transaction });
  const last = rank ?? (await lastRank(model, projectId, transaction)) + 1;
  const row = { ...rowOf(kind, projectId, part), rank: last };
  await model.create(row, { fields: [...columnsOf(kind), "projectId", "id", "rank"], transaction });
  await saveLinks(kind, part, { projectId, transaction });
}

async function updatePart({ projectId, transaction }: Place, kind: PartKind, part: PlanPart) {
  const { model } = partTables[kind];
  const row = rowOf(kind, projectId, part);
  await model.update(row, { where: { projectId, id: part.id }, fields: columnsOf(kind), transaction });
  await saveLinks(kind, part, { projectId, transaction });
}

const columnsOf = (kind: PartKind): string[] => [...partTables[kind].columns, "params"];

async function lastRank(model: PartTable["model"], projectId: string, transaction: Transaction): Promise<number> {
  return Number((await model.max("rank", { where: { projectId }, transaction })) ?? -1);
}
