import "server-only";
import type { Transaction } from "sequelize";
import { z } from "zod";
import { readPlan } from "@/models/parts";
import { Refusal } from "./errors";
import type { Reader } from "./identity";
import { storeProject } from "./newProject";
import { openProject } from "./projects";
import { read } from "./sessionRoutes";

const form = z.strictObject({ name: z.string().trim().min(1).max(120).optional() });

interface Given {
  reader: Reader;
  params: { projectId: string };
  body: Record<string, unknown>;
  transaction: Transaction;
}

/**
 * Copies a yard's whole plan into a new yard of the same team and gives its id. People who were invited to the one are
 * not in the other, and its history stays with it.
 */
export async function copyProject({ reader, params: { projectId }, body, transaction }: Given): Promise<string> {
  const { project } = await openProject({ reader, projectId, act: "copy project", transaction });
  const { name = copyName(project.name) } = read(form, body);
  // The plan's rows and the revision they are of stand still while they are read.
  await project.reload({ lock: transaction.LOCK.SHARE, transaction });
  const { plan, damage } = await readPlan(projectId, transaction);
  if (damage.length) throw new Refusal("conflict", "Some of this yard cannot be read, so a copy would not be whole. Mend it first.");
  const { teamId, says, stage, timeZone, currency } = project;
  return storeProject({ teamId, name, says, stage, timeZone, currency }, plan, transaction);
}

/** "Copy of Lot 7", within the length of a name. */
const copyName = (name: string) => [..."Copy of ", ...name].slice(0, 120).join("").trim();
