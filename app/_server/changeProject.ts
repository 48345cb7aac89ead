import "server-only";
import { fn, type Transaction } from "sequelize";
import { z } from "zod";
import type { Act, Project } from "@/models";
import { archivedRefusal } from "./projects";
import { read } from "./sessionRoutes";

const facts = z.strictObject({
  name: z.string().trim().min(1).max(120).optional(),
  says: z.string().trim().max(400).optional(),
  archived: z.boolean().optional(),
});

interface Given {
  project: Project;
  body: Record<string, unknown>;
  transaction: Transaction;
}

/** Renames, archives or restores a yard. */
export async function changeProject({ project, body, transaction }: Given): Promise<Act[]> {
  const { archived, ...words } = read(facts, body);
  if (project.archivedAt && archived !== false) throw archivedRefusal();
  const before = factsOf(project);
  const values = { ...words, ...(archived !== undefined && archived !== before.archived && { archivedAt: archived ? now() : null }) };
  await project.update(values, { fields: ["name", "says", "archivedAt"], transaction });
  const after = { ...before, ...words, archived: archived ?? before.archived };
  const same = JSON.stringify(before) === JSON.stringify(after);
  return same ? [] : [{ kind: "project", id: project.id, act: "change", before, after }];
}

const now = () => fn("now") as unknown as Date; // the database's time

const factsOf = ({ name, says, archivedAt }: Project) => ({ name, says, archived: archivedAt !== null });
