import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import type { Plan } from "../../lib/noise/plan";
import { changePart, planOf, readPlan } from "../../models/parts";
import { partKinds, partTables } from "../../models/partTables";
import { Project } from "../../models/Project";
import { storePlan } from "../../models/storePlan";
import { buildPlan, buildProject, buildTeam, type BuiltProject } from "../build";
import { trial } from "./trial";

let built: BuiltProject;
beforeAll(async () => {
  built = await buildProject(await buildTeam());
});

describe("rows and plan", () => {
  it("the demo's plan comes back from its rows as it went in", async () => {
    expect(await trial(built, ({ transaction }) => planOf(built.project.id, transaction))).toEqual(built.plan);
  });

  it("a plan read back and stored again is the same plan, in the same order", async () => {
    const { plan } = buildPlan();
    const reversed: Plan = { ...plan, elements: plan.elements.toReversed(), sources: plan.sources.toReversed() };
    const { teamId } = built.project;
    const back = await trial(built, async ({ transaction }) => {
      const project = { id: randomUUID(), teamId, name: "Copy", timeZone: "CET", currency: "EUR" };
      await Project.create(project, { fields: ["id", "teamId", "name", "timeZone", "currency"], transaction });
      await storePlan({ projectId: project.id, transaction }, reversed);
      return planOf(project.id, transaction);
    });
    expect(back).toEqual(reversed);
  });

  it("distances and shares of the time keep their figures to the last digit", async () => {
    const receiver = built.plan.receivers[0]!;
    const source = built.plan.sources[0]!;
    const after = await trial(built, async (place) => {
      await changePart(place, "receiver", receiver.id, { distances: { [source.id]: 0.1 + 0.2 } });
      return planOf(built.project.id, place.transaction);
    });
    expect(after.receivers[0]!.distances).toEqual({ [source.id]: 0.1 + 0.2 });
  });

  it("a row that can no longer be read is left out with all that points at it, and named", async () => {
    const space = built.plan.paths[0]!.fromSpaceId;
    const { plan, damage } = await trial(built, async ({ projectId, transaction }) => {
      await partTables.space.model.update({ params: { volume: "large" } }, { where: { projectId, id: space }, fields: ["params"], transaction });
      return readPlan(projectId, transaction);
    });
    expect(damage).toContainEqual({ kind: "space", id: space });
    expect(plan.spaces.some(({ id }) => id === space)).toBe(false);
    expect(plan.paths.some(({ fromSpaceId }) => fromSpaceId === space)).toBe(false);
    const paths = new Set(plan.paths.map(({ id }) => id));
    expect(plan.elements.every(({ pathId }) => paths.has(pathId))).toBe(true);
    expect(plan.fences).toEqual(built.plan.fences);
  });

  it("no id of another part stands inside params", async () => {
    const ids = new Set(partKinds.flatMap((kind) => (partTables[kind].list ? built.plan[partTables[kind].list].map(({ id }) => id) : [])));
    for (const kind of partKinds) {
      const rows = await partTables[kind].model.findAll({ where: { projectId: built.project.id } });
      for (const row of rows) {
        const text = JSON.stringify(row.get("params"));
        expect([...text.matchAll(/"([0-9a-f-]{36})"/g)].map(([, id]) => id!).filter((id) => ids.has(id))).toEqual([]);
      }
    }
  });
});
