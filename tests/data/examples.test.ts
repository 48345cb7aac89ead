import { readFileSync, readdirSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { z } from "zod";
import { planSchema, type Plan } from "../../lib/noise/plan";
import { library, read } from "./records";

const person = z.string();
const peopleSchema = z.array(
  z.strictObject({
    key: person,
    name: z.string().min(1),
    initials: z.string().length(2),
    email: z.email().endsWith("@stillyard.example"),
    password: z.string().min(15).max(64),
    role: z.enum(["owner", "acoustician", "client", "builder"]),
    start: z.enum(["I play", "I advise", "I build"]),
    says: z.string().min(1),
  }),
);
const projectsSchema = z.strictObject({
  team: z.strictObject({
    key: z.string(),
    name: z.string(),
    members: z.array(z.strictObject({ person, role: z.enum(["owner", "acoustician"]) })),
  }),
  projects: z.array(
    z.strictObject({
      key: z.string(),
      plan: z.string().endsWith(".json"),
      name: z.string().min(1),
      says: z.string().min(1),
      stage: z.string().max(120),
      timeZone: z.string(),
      currency: z.string().length(3),
      participants: z.array(z.strictObject({ person, role: z.enum(["client", "builder"]) })),
    }),
  ),
});

const people = peopleSchema.parse(read("examples/people.json"));
const { team, projects } = projectsSchema.parse(read("examples/projects.json"));
const plans = projects.map(({ key, plan }) => [key, planSchema.parse(read(`examples/${plan}`))] as const);

function partsOf({ lot, ...lists }: Plan): { id: string }[] {
  return [lot, ...Object.values(lists).flatMap((parts) => parts.map(({ id }) => ({ id })))];
}

describe.each(plans)("the example %s", (key, plan) => {
  test("is kept whole: checking it changes and drops nothing, and adds only what has a default", () => {
    expect(plan).toMatchObject(read(`examples/${key}.json`) as object);
  });

  test("calls every part by a name of its own", () => {
    const ids = partsOf(plan).map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const id of ids) expect(id).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
  });

  test("points only at parts that are there", () => {
    const { spaces, paths, sources, elements, receivers } = plan;
    const spaceIds = idsOf(spaces);
    for (const { buildingId } of spaces) expect(idsOf(plan.buildings)).toContain(buildingId);
    for (const { spaceId } of plan.surfaces) expect(spaceIds).toContain(spaceId);
    for (const { fromSpaceId, toSpaceId } of paths)
      expect([...spaceIds, null]).toEqual(expect.arrayContaining([fromSpaceId, toSpaceId]));
    for (const { spaceId } of [...sources, ...receivers, ...plan.outlets])
      expect([...spaceIds, null]).toContain(spaceId);
    for (const { pathId, constructionId } of elements) {
      expect(idsOf(paths)).toContain(pathId);
      expect([...idsOf(plan.constructions), null]).toContain(constructionId);
    }
    for (const { sourceId } of [...plan.outlets, ...plan.situations.flatMap(({ playing }) => playing)])
      expect(idsOf(sources)).toContain(sourceId);
    for (const { receiverId } of plan.criteria) expect(idsOf(receivers)).toContain(receiverId);
  });

  test("copies its constructions and finishes from the library as they stand there", () => {
    for (const { catalogueKey, layers, tl, bases, provenance } of plan.constructions) {
      expect(library.constructions.find((record) => record.key === catalogueKey)).toMatchObject({
        layers,
        tl,
        bases,
        provenance,
      });
    }
    for (const { finishKey, alpha, bases, provenance } of plan.surfaces) {
      expect(library.finishes.find((record) => record.key === finishKey)).toMatchObject({
        alpha,
        bases,
        provenance,
      });
    }
  });

  test("gives every source nine figures and every element outdoors a place", () => {
    for (const { power } of plan.sources) expect(power).not.toContain(null);
    const outdoors = plan.paths.filter(({ toSpaceId }) => toSpaceId === null).map(({ id }) => id);
    for (const { pathId, position, normal } of plan.elements) {
      if (!outdoors.includes(pathId)) continue;
      expect(position).not.toBeNull();
      expect(normal).not.toBeNull();
    }
  });
});

describe("people and projects", () => {
  test("every role is held by somebody who is there", () => {
    const keys = people.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
    const roles = [...team.members, ...projects.flatMap(({ participants }) => participants)];
    for (const { person: held, role } of roles)
      expect(people.find(({ key }) => key === held)?.role).toBe(role);
    expect(new Set(roles.map(({ role }) => role))).toEqual(
      new Set(["owner", "acoustician", "client", "builder"]),
    );
  });

  test("every project keeps a time zone and a currency that the runtime knows", () => {
    for (const { timeZone, currency } of projects) {
      expect(() => new Intl.DateTimeFormat("en", { timeZone })).not.toThrow();
      expect(() => new Intl.NumberFormat("en", { style: "currency", currency })).not.toThrow();
    }
  });

  test("every file of the folder belongs to one of them", () => {
    const folder = readdirSync(new URL("../../data/examples", import.meta.url));
    expect(folder.sort()).toEqual(
      ["lot-7.case.json", "people.json", "projects.json", ...projects.map(({ plan }) => plan)].sort(),
    );
  });

  test("no address of the net stands in the examples", () => {
    for (const name of readdirSync(new URL("../../data/examples", import.meta.url))) {
      expect(readFileSync(new URL(`../../data/examples/${name}`, import.meta.url), "utf8")).not.toMatch(
        /https?:|www\./,
      );
    }
  });
});

function idsOf(parts: readonly { id: string }[]): string[] {
  return parts.map(({ id }) => id);
}
