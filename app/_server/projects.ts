import "server-only";
import type { Transaction } from "sequelize";
import { Membership, Participation, Project, User } from "@/models";
import { readPlan, type StoredPlan } from "@/models/parts";
import { rightOf, writes, type ActName, type Role } from "./access";
import { notFound, Refusal } from "./errors";
import type { Reader } from "./identity";
import { isIdentifier } from "./request";
import { judge, keptAnswer, weigh, type Answer } from "./weigh";

export interface Opened {
  project: Project;
  /** The role by which the act is done. */
  role: Role;
  roles: Role[];
}

interface Opening {
  reader: Reader;
  projectId: string;
  act: ActName;
  transaction: Transaction;
}

/** The one place where a right is asked. What the reader may not read does not exist. */
export async function openProject({ reader, projectId, act, transaction }: Opening): Promise<Opened> {
  if (!isIdentifier(projectId)) throw notFound();
  const project = await Project.findOne({ where: { id: projectId }, transaction });
  // Asked even where there is no project: the time of the answer tells nothing either.
  const roles = await rolesOf(reader, project ?? { id: NOTHING, teamId: NOTHING }, transaction);
  const right = rightOf(roles, act);
  if (!project || !right) throw notFound();
  if (right.right === "refused") throw new Refusal("refused", await refusalWords(project, reader, transaction));
  if (project.archivedAt && writes.has(act)) throw archivedRefusal();
  return { project, role: right.role, roles };
}

export const archivedRefusal = () => new Refusal("conflict", "This yard is archived. Restore it to change it.");

/** An id that nothing has. */
const NOTHING = "00000000-0000-0000-0000-000000000000";

export async function rolesOf(reader: Reader, { id, teamId }: Pick<Project, "id" | "teamId">, transaction: Transaction): Promise<Role[]> {
  const membership = await Membership.findOne({ where: { teamId, userId: reader.id }, transaction });
  const participations = await Participation.findAll({ where: { projectId: id, userId: reader.id }, transaction });
  return [...(membership ? [membership.role] : []), ...participations.map(({ role }) => role)];
}

/** "Only Ines and Tobi can change this yard." */
export async function refusalWords(project: Project, reader: Reader, transaction: Transaction): Promise<string> {
  const people = await peopleOf(project, reader, transaction);
  const names = people.filter(({ role }) => rightOf([role], "edit plan")?.right === "may").map(({ name }) => name);
  return `Only ${inWords(names)} can change this yard.`;
}

function inWords(names: readonly string[]): string {
  const last = names.at(-1) ?? "the team";
  return names.length > 1 ? `${names.slice(0, -1).join(", ")} and ${last}` : last;
}

export interface Person {
  name: string;
  role: Role;
  /** Whether it is the reader. */
  you: boolean;
}

const withUser = [{ model: User, as: "user", attributes: ["name"], required: true }];
/** A row read with `withUser`. */
type Named = { user: { name: string } };

/** Who is at work on a project: names and roles, never addresses. */
export async function peopleOf(project: Project, reader: Reader, transaction: Transaction): Promise<Person[]> {
  return (await peopleOfEach([project], reader, transaction))(project);
}

/** The same for several projects, asked for at once. */
export async function peopleOfEach(projects: readonly Project[], reader: Reader, transaction: Transaction): Promise<(project: Project) => Person[]> {
  const members = await Membership.findAll({ where: { teamId: projects.map(({ teamId }) => teamId) }, include: withUser, transaction });
  const invited = await Participation.findAll({ where: { projectId: projects.map(({ id }) => id) }, include: withUser, transaction });
  return ({ id, teamId }) =>
    [...members.filter((one) => one.teamId === teamId), ...invited.filter((one) => one.projectId === id)]
      .map((row) => ({ name: (row as typeof row & Named).user.name, role: row.role as Role, you: row.userId === reader.id }))
      .sort((one, other) => order.indexOf(one.role) - order.indexOf(other.role) || one.name.localeCompare(other.name));
}

const order: readonly Role[] = ["owner", "acoustician", "client", "builder"];

/**
 * Gathers inside a transaction what an answer needs; the answer itself is made outside it. One that memory holds is held
 * on to: others may push it out of memory meanwhile.
 */
export async function prepareAnswer({ id, revision }: Project, transaction: Transaction): Promise<() => Answer> {
  const kept = keptAnswer(id, revision);
  if (kept) return () => kept;
  const stored = await readPlan(id, transaction);
  return () => weigh(id, revision, stored);
}

/** All of one listener's verdict: every contribution, not the largest only. */
export function receiverVerdictOf(stored: StoredPlan, receiverId: string) {
  const verdict = judge(stored).receivers.find((one) => one.receiverId === receiverId);
  if (!verdict) throw notFound();
  return verdict;
}
