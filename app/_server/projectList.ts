import "server-only";
import { Op, type Transaction } from "sequelize";
import { Membership, Participation, Project } from "@/models";
import { rightOf } from "./access";
import { pageFault } from "./errors";
import type { Reader } from "./identity";
import { facts, type ProjectFacts } from "./projectPage";
import { peopleOf, prepareAnswer, rolesOf, type Person } from "./projects";
import { inOneMoment } from "./transactions";
import type { Answer } from "./weigh";

export interface ListedProject {
  project: ProjectFacts;
  changedAt: Date;
  people: Person[];
  answer: Answer;
}

/** The reader's yards, the one changed last first; at most a hundred. */
export async function listProjects(reader: Reader): Promise<ListedProject[]> {
  const found = await inOneMoment(async (transaction) => {
    const projects = await findProjects(reader, transaction);
    const rows = [];
    for (const project of projects) {
      const roles = await rolesOf(reader, project, transaction);
      if (rightOf(roles, "open project")?.right !== "may") continue;
      rows.push({ project, people: await peopleOf(project, reader, transaction), finish: await prepareAnswer(project, transaction) });
    }
    return rows;
  }).catch((thrown: unknown) => Promise.reject(pageFault(thrown)));
  return found.map(({ project, people, finish }) => ({
    project: facts(project),
    changedAt: project.changedAt,
    people,
    answer: finish(),
  }));
}

async function findProjects({ id }: Reader, transaction: Transaction): Promise<Project[]> {
  const teams = await Membership.findAll({ where: { userId: id }, transaction });
  const invited = await Participation.findAll({ where: { userId: id }, transaction });
  const mine = [{ teamId: teams.map(({ teamId }) => teamId) }, { id: invited.map(({ projectId }) => projectId) }];
  return Project.findAll({
    where: { archivedAt: null, [Op.or]: mine },
    order: [["changedAt", "DESC"], ["id", "ASC"]],
    limit: 100,
    transaction,
  });
}
