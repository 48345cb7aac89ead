import "server-only";
import { Op, type Order, type Transaction } from "sequelize";
import { Membership, Participation, Project } from "@/models";
import { rightOf, type Role } from "./access";
import { pageFault } from "./errors";
import type { Reader } from "./identity";
import { facts, type ProjectFacts } from "./projectPage";
import { peopleOfEach, prepareAnswer, type Person } from "./projects";
import { inOneMoment } from "./transactions";
import type { Answer } from "./weigh";

export interface ListedProject {
  project: ProjectFacts;
  changedAt: Date;
  people: Person[];
  may: { rename: boolean; copy: boolean };
  answer: Answer;
}

/** Which of the reader's yards: those in use or the archived ones, a page of them. */
export interface WantedProjects {
  archived: boolean;
  /** From 1. */
  page: number;
  order: "changed" | "name";
  /** Part of a name or of the line under it; only asked for where there is more than one page. */
  words: string;
}

export interface ProjectPage {
  listed: ListedProject[];
  /** The page shown, from 1, of so many. */
  page: number;
  pages: number;
  /** How many fit `words`. */
  found: number;
  /** How many there are in all, in use and archived. */
  inUse: number;
  archived: number;
  /** Whether the reader's yards in use (or archived ones) fill more than one page: then words are looked for here. */
  paged: boolean;
}

export const PAGE_SIZE = 100;
const orders: Record<WantedProjects["order"], Order> = {
  changed: [["changedAt", "DESC"], ["id", "ASC"]],
  name: [["name", "ASC"], ["id", "ASC"]],
};
const all: WantedProjects = { archived: false, page: 1, order: "changed", words: "" };

/** A page of the reader's yards with their verdicts, the one changed last first unless told otherwise. */
export async function listProjects(reader: Reader, wanted: WantedProjects = all): Promise<ProjectPage> {
  const { rows, ...page } = await inOneMoment(async (transaction) => {
    const mine = await rolesOfReader(reader, transaction);
    const { projects, ...page } = await findPage(mine, wanted, transaction);
    const peopleOf = await peopleOfEach(projects, reader, transaction);
    const rows = [];
    for (const project of projects) {
      const roles = mine.rolesIn(project);
      if (rightOf(roles, "open project")?.right !== "may") continue;
      rows.push({ project, roles, people: peopleOf(project), finish: await prepareAnswer(project, transaction) });
    }
    return { ...page, rows };
  }).catch((thrown: unknown) => Promise.reject(pageFault(thrown)));
  return { ...page, listed: rows.map(listedOf) };
}

interface Row {
  project: Project;
  roles: Role[];
  people: Person[];
  finish: () => Answer;
}

function listedOf({ project, roles, people, finish }: Row): ListedProject {
  const mayDo = (act: "rename project" | "copy project") => rightOf(roles, act)?.right === "may";
  return {
    project: facts(project),
    changedAt: project.changedAt,
    people,
    may: { rename: mayDo("rename project"), copy: mayDo("copy project") },
    answer: finish(),
  };
}

interface Mine {
  where: object;
  rolesIn: (project: Project) => Role[];
}

/** What the reader is in each team and yard, and how to find those yards. */
async function rolesOfReader({ id }: Reader, transaction: Transaction): Promise<Mine> {
  const teams = await Membership.findAll({ where: { userId: id }, transaction });
  const invited = await Participation.findAll({ where: { userId: id }, transaction });
  return {
    where: { [Op.or]: [{ teamId: teams.map(({ teamId }) => teamId) }, { id: invited.map(({ projectId }) => projectId) }] },
    rolesIn: (project) => [
      ...teams.filter(({ teamId }) => teamId === project.teamId).map(({ role }) => role),
      ...invited.filter(({ projectId }) => projectId === project.id).map(({ role }) => role),
    ],
  };
}

async function findPage({ where }: Mine, wanted: WantedProjects, transaction: Transaction) {
  const inUse = await Project.count({ where: { ...where, archivedAt: null }, transaction });
  const archived = await Project.count({ where: { ...where, archivedAt: { [Op.ne]: null } }, transaction });
  const paged = (wanted.archived ? archived : inUse) > PAGE_SIZE;
  const named = paged && wanted.words ? { [Op.and]: [{ [Op.or]: [{ name: holding(wanted.words) }, { says: holding(wanted.words) }] }] } : {};
  const asked = { ...where, ...named, archivedAt: wanted.archived ? { [Op.ne]: null } : null };
  const found = await Project.count({ where: asked, transaction });
  const pages = Math.max(1, Math.ceil(found / PAGE_SIZE));
  const page = Math.min(Math.max(1, wanted.page), pages);
  const projects = await Project.findAll({ where: asked, order: orders[wanted.order], limit: PAGE_SIZE, offset: (page - 1) * PAGE_SIZE, transaction });
  return { projects, found, pages, page, inUse, archived, paged };
}

/** Any text that holds these words, whatever the case; the pattern's own signs are taken as letters. */
const holding = (words: string) => ({ [Op.iLike]: `%${words.replace(/[\\%_]/g, "\\$&")}%` });
