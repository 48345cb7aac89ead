import "server-only";
import { randomUUID } from "node:crypto";
import type { Transaction } from "sequelize";
import { z } from "zod";
import plumtreeRow from "@/data/examples/plumtree-row.json";
import { planSchema, type Plan } from "@/lib/noise/plan";
import { Project } from "@/models";
import { relabelPlan } from "@/models/relabelPlan";
import { storePlan } from "@/models/storePlan";
import { isCurrency, isTimeZone } from "./clocks";
import { Refusal } from "./errors";
import type { Reader } from "./identity";
import { isIdentifier } from "./request";
import { read } from "./sessionRoutes";
import { misfitsOf, startingPlan, startSchema } from "./startingPlan";
import { openTeam } from "./teams";

const timeZone = z.string().max(60).refine(isTimeZone, "This time zone is not known here.");
const currency = z.string().refine(isCurrency, "This currency is not known here.");

const form = startSchema.extend({
  name: z.string().trim().min(1).max(120),
  says: z.string().trim().max(400).default(""),
  timeZone,
  currency,
  teamId: z.string().refine(isIdentifier, "This value does not fit.").optional(),
  /** From nothing but sizes, or from a copy of the worked example. */
  start: z.enum(["empty", "example"]).default("empty"),
});

interface Given {
  reader: Reader;
  body: Record<string, unknown>;
  transaction: Transaction;
}

/** Makes a yard in a team of the reader's and gives its id. */
export async function newProject({ reader, body, transaction }: Given): Promise<string> {
  // Whether the reader may at all comes before what was typed.
  await openTeam(reader, undefined, transaction);
  const { name, says, timeZone: zone, currency: money, teamId, start, ...sizes } = read(form, body);
  const team = await openTeam(reader, teamId, transaction);
  const fields = start === "empty" ? misfitsOf(sizes) : {};
  if (Object.keys(fields).length) throw new Refusal("invalid", "This value does not fit.", { fields });
  const plan = start === "empty" ? startingPlan(sizes) : examplePlan();
  return storeProject({ teamId: team.id, name, says, stage: "", timeZone: zone, currency: money }, plan, transaction);
}

/** The worked example, as it ships. */
const examplePlan = (): Plan => planSchema.parse(plumtreeRow);

export interface NewFacts {
  teamId: string;
  name: string;
  says: string;
  stage: string;
  timeZone: string;
  currency: string;
}

/** Writes a new yard with a copy of a plan, every part under an id of its own. */
export async function storeProject(facts: NewFacts, plan: Plan, transaction: Transaction): Promise<string> {
  const id = randomUUID();
  const fields: (keyof NewFacts | "id")[] = ["id", "teamId", "name", "says", "stage", "timeZone", "currency"];
  await Project.create({ id, ...facts }, { fields, transaction });
  const ids = new Map<string, string>();
  const freshId = (old: string) => ids.get(old) ?? ids.set(old, randomUUID()).get(old)!;
  await storePlan({ projectId: id, transaction }, relabelPlan(plan, freshId));
  return id;
}
