import "server-only";
import type { Transaction } from "sequelize";
import { Membership, Team } from "@/models";
import { rightOf } from "./access";
import { pageFault, Refusal } from "./errors";
import type { Reader } from "./identity";
import { inOneMoment } from "./transactions";

export interface OwnTeam {
  id: string;
  name: string;
}

/** The teams in which the reader may make a yard, those the reader owns first. */
export async function teamsFor({ id }: Reader, transaction: Transaction): Promise<OwnTeam[]> {
  const memberships = await Membership.findAll({ where: { userId: id }, transaction });
  const making = memberships.filter(({ role }) => rightOf([role], "make project")?.right === "may");
  const teams = await Team.findAll({ where: { id: making.map(({ teamId }) => teamId) }, order: [["createdAt", "ASC"], ["id", "ASC"]], transaction });
  const owns = ({ id: teamId }: Team) => making.some((one) => one.teamId === teamId && one.role === "owner");
  return [...teams.filter(owns), ...teams.filter((team) => !owns(team))].map(({ id: teamId, name }) => ({ id: teamId, name }));
}

/** The same for a page. */
export function teamsOfPage(reader: Reader): Promise<OwnTeam[]> {
  return inOneMoment((transaction) => teamsFor(reader, transaction)).catch((thrown: unknown) => Promise.reject(pageFault(thrown)));
}

/** The team a new yard is made in: the one asked for, or the reader's first. */
export async function openTeam(reader: Reader, teamId: string | undefined, transaction: Transaction): Promise<OwnTeam> {
  const teams = await teamsFor(reader, transaction);
  if (teams.length === 0) throw new Refusal("refused", "You are in no team. Yards come to you by invitation; to make your own, sign up for a team.");
  const team = teamId === undefined ? teams[0] : teams.find(({ id }) => id === teamId);
  if (!team) throw new Refusal("invalid", "This value does not fit.", { fields: { teamId: "You make no yards in such a team." } });
  return team;
}
