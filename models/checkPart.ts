import type { Transaction } from "sequelize";
import type { core } from "zod";
import { partSchemas, type PartKind } from "../lib/noise/plan";
import { Part } from "./Part";
import { PartFault } from "./PartFault";
import { linkedSources } from "./partLinks";
import type { PlanPart } from "./partRows";
import { partTables } from "./partTables";

/**
 * The part as its schema reads it. Fields that its kind does not know are refused, not dropped: a value that was typed is
 * either kept or said to be wrong. Refusals carry the field's path.
 */
export function checkPart(kind: PartKind, candidate: object, given: object = candidate): PlanPart {
  const read = partSchemas[kind].safeParse(candidate);
  if (!read.success) throw new PartFault("invalid", "This value does not fit.", fieldWords(read.error.issues));
  const part = read.data as PlanPart; // every schema has an id
  const unknown = unknownFields(given, part);
  if (unknown.length) {
    throw new PartFault("invalid", "This value does not fit.", Object.fromEntries(unknown.map((path) => [path, "There is no such field here."])));
  }
  return part;
}

/** Paths of what was given and is not in the part as it was read, at any depth. */
function unknownFields(given: object, known: object): string[] {
  return Object.entries(given).flatMap(([field, value]) => {
    if (!Object.hasOwn(known, field)) return [field];
    const read = (known as Record<string, unknown>)[field];
    return isObject(value) && isObject(read) ? unknownFields(value, read).map((inner) => `${field}.${inner}`) : [];
  });
}

const isObject = (value: unknown): value is object => typeof value === "object" && value !== null;

/** One sentence per field. */
export function fieldWords(issues: readonly core.$ZodIssue[]): Record<string, string> {
  return Object.fromEntries(issues.map((issue) => [issue.path.join("."), issueWords(issue)]));
}

function issueWords(issue: core.$ZodIssue): string {
  const text = "origin" in issue && issue.origin === "string";
  switch (issue.code) {
    case "too_small":
      return text ? "This cannot be empty." : issue.origin === "array" ? `At least ${issue.minimum}.` : `${issue.inclusive ? "At least" : "More than"} ${issue.minimum}.`;
    case "too_big":
      return text ? `At most ${issue.maximum} characters.` : `At most ${issue.maximum}.`;
    case "invalid_type":
      return issue.expected === "number" ? "A number is needed." : issue.expected === "string" ? "Words are needed." : "This value does not fit.";
    case "invalid_value":
      return issue.values.length > 1 ? `One of: ${issue.values.join(", ")}.` : "This value does not fit.";
    case "invalid_union":
      return unionWords(issue);
    case "custom":
      return issue.message;
    default:
      return "This value does not fit.";
  }
}

/** Of several forms a value may take, the words of the one that came nearest. */
function unionWords(issue: core.$ZodIssueInvalidUnion): string {
  const ranged = issue.errors.flat().find(({ code }) => code === "too_small" || code === "too_big");
  return ranged ? issueWords(ranged) : "This value does not fit.";
}

const readable = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

/** Every part this one points at stands in the same project and is of the right kind. */
export async function checkReferences(kind: PartKind, projectId: string, part: PlanPart, transaction: Transaction) {
  const pointers = pointersOf(kind, part);
  const ids = [...new Set(pointers.map(({ id }) => id).filter((id) => readable.test(id)))];
  const found = ids.length ? await Part.findAll({ where: { projectId, id: ids }, transaction }) : [];
  const kinds = new Map(found.map((row) => [row.id, row.kind]));
  const wrong = pointers.filter(({ id, to }) => kinds.get(id) !== to);
  const twice = pointers.filter(({ id, field }, at) => field.startsWith("playing.") && pointers.findIndex((other) => other.id === id) < at);
  const fields = [
    ...wrong.map(({ field, to }) => [field, `There is no such ${partTables[to].word} here.`]),
    ...twice.map(({ field }) => [field, "This source is already named."]),
  ];
  if (fields.length) throw new PartFault("invalid", "This value does not fit.", Object.fromEntries(fields));
}

function pointersOf(kind: PartKind, part: PlanPart): { field: string; id: string; to: PartKind }[] {
  const direct = partTables[kind].references
    .filter(({ field }) => part[field] !== null)
    .map(({ field, to }) => ({ field, to, id: String(part[field]) }));
  return [...direct, ...linkedSources(kind, part).map((one) => ({ ...one, to: "source" as const }))];
}
