import { readFileSync } from "node:fs";
import { fileURLToPath, pathToFileURL } from "node:url";
import type { Transaction } from "sequelize";
import { z } from "zod";
import { hashPassword } from "../app/_server/passwords";
import { planSchema } from "../lib/noise/plan";
import { connection, Membership, Participation, Project, Team, User } from "../models/index";
import { relabelPlan } from "../models/relabelPlan";
import { storePlan } from "../models/storePlan";
import { idOf } from "./idOf";

const peopleSchema = z.array(z.object({ key: z.string(), name: z.string(), email: z.email(), password: z.string().min(15) }));
type DemoPerson = z.infer<typeof peopleSchema>[number];

const projectSchema = z.object({
  key: z.string(),
  plan: z.string(),
  name: z.string(),
  says: z.string(),
  stage: z.string(),
  timeZone: z.string(),
  currency: z.string(),
  participants: z.array(z.object({ person: z.string(), role: z.enum(["client", "builder"]) })),
});
type DemoProject = z.infer<typeof projectSchema>;

const projectsSchema = z.object({
  team: z.object({
    key: z.string(),
    name: z.string(),
    members: z.array(z.object({ person: z.string(), role: z.enum(["owner", "acoustician"]) })),
  }),
  projects: z.array(projectSchema),
});
type DemoTeam = z.infer<typeof projectsSchema>["team"];

const folder = new URL("../data/examples/", import.meta.url);
const readJson = (file: string): unknown => JSON.parse(readFileSync(fileURLToPath(new URL(file, folder)), "utf8"));

/** Loads the demo: people, team, yards. One that stands is left alone; `fresh` takes it away first. */
export async function seed({ fresh = false }: { fresh?: boolean } = {}): Promise<void> {
  const people = peopleSchema.parse(readJson("people.json"));
  const { team, projects } = projectsSchema.parse(readJson("projects.json"));
  if (!fresh && (await Team.findByPk(idOf("team", team.key)))) return;
  const hashes = await Promise.all(people.map(({ password }) => hashPassword(password)));
  await connection.transaction(async (transaction) => {
    await removeDemo(people, team, transaction);
    await addPeople(people, hashes, transaction);
    await addTeam(team, transaction);
    for (const [place, project] of projects.entries()) await addProject(project, { team, place, transaction });
  });
}

async function removeDemo(people: DemoPerson[], team: DemoTeam, transaction: Transaction) {
  const teamId = idOf("team", team.key);
  await Project.destroy({ where: { teamId }, transaction });
  await Team.destroy({ where: { id: teamId }, transaction });
  await User.destroy({ where: { id: people.map(({ key }) => idOf("person", key)) }, transaction });
}

async function addPeople(people: DemoPerson[], hashes: string[], transaction: Transaction) {
  for (const [place, { key, name, email }] of people.entries()) {
    const user = { id: idOf("person", key), name, email, passwordHash: hashes[place]!, emailCheckedAt: new Date() };
    await User.create(user, { fields: ["id", "name", "email", "passwordHash", "emailCheckedAt"], transaction });
  }
}

async function addTeam({ key, name, members }: DemoTeam, transaction: Transaction) {
  const id = idOf("team", key);
  await Team.create({ id, name }, { fields: ["id", "name"], transaction });
  for (const { person, role } of members) {
    const membership = { teamId: id, userId: idOf("person", person), role };
    await Membership.create(membership, { fields: ["teamId", "userId", "role"], transaction });
  }
}

interface Setting {
  team: DemoTeam;
  place: number;
  transaction: Transaction;
}

async function addProject({ key, plan, participants, ...facts }: DemoProject, { team, place, transaction }: Setting) {
  const id = idOf("project", key);
  // The first yard is the one changed last.
  const changedAt = new Date(Date.now() - place * 60_000);
  const project = { ...facts, id, teamId: idOf("team", team.key), changedAt };
  const fields: (keyof typeof project)[] = ["id", "teamId", "name", "says", "stage", "timeZone", "currency", "changedAt"];
  await Project.create(project, { fields, transaction });
  await storePlan({ projectId: id, transaction }, relabelPlan(planSchema.parse(readJson(plan)), (slug) => idOf(key, slug)));
  for (const { person, role } of participants) {
    const participation = { projectId: id, userId: idOf("person", person), role };
    await Participation.create(participation, { fields: ["projectId", "userId", "role"], transaction });
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href) {
  await seed({ fresh: process.argv.includes("--fresh") });
  process.exit(0);
}
