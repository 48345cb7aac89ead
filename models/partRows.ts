import type { PartKind } from "../lib/noise/plan";
import { linkFields, noLinks } from "./partLinks";
import { partTables, type PartRow } from "./partTables";

/** A part of a plan as any of the kinds: its fields are known to its schema only. */
export type PlanPart = { id: string } & Record<string, unknown>;

/** The row of a part: fields with a column of their own, links left out, the rest as `params`. */
export function rowOf(kind: PartKind, projectId: string, part: PlanPart): Omit<PartRow, "rank"> {
  const { columns } = partTables[kind];
  const own = columns.map((column) => [column, part[column]]);
  const apart = new Set(["id", linkFields[kind], ...columns]);
  const params = Object.fromEntries(Object.entries(part).filter(([field]) => !apart.has(field)));
  return { projectId, id: part.id, ...Object.fromEntries(own), params };
}

/** The part a row stands for, not yet checked; `links` is what its link table holds. */
export function partOf(kind: PartKind, row: PartRow, links: unknown): PlanPart {
  const own = partTables[kind].columns.map((column) => [column, row[column]]);
  const field = linkFields[kind];
  const linked = field ? { [field]: links ?? noLinks(kind) } : {};
  return { ...row.params, ...Object.fromEntries(own), ...linked, id: row.id };
}
