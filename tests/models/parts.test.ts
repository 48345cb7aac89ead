import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import type { PartKind } from "../../lib/noise/plan";
import type { Act } from "../../models/index";
import { Part } from "../../models/Part";
import { addPart, advancePlan, changePart, planOf, removePart, type Place } from "../../models/parts";
import { PathElement } from "../../models/PathElement";
import { Project } from "../../models/Project";
import { storePlan } from "../../models/storePlan";
import { buildPlan, buildProject, buildTeam, type BuiltProject } from "../build";
import { faultOf, trial } from "./trial";

let built: BuiltProject;
let other: BuiltProject;
beforeAll(async () => {
  const team = await buildTeam();
  built = await buildProject(team);
  other = await buildProject(team);
});

describe("changing a part", () => {
  it("a patch is merged and the whole is kept", async () => {
    const id = built.idOf("yard-door");
    const before = built.plan.elements.find((element) => element.id === id)!;
    const { acts, after } = await trial(built, async (place) => {
      const acts = await changePart(place, "element", id, { area: 2.1, params: { gapArea: 0.001 } });
      return { acts, after: await planOf(built.project.id, place.transaction) };
    });
    const expected = { ...before, area: 2.1, params: { gapArea: 0.001 } };
    expect(acts).toEqual([{ kind: "element", id, act: "change", before, after: expected }]);
    expect(after.elements.find((element) => element.id === id)).toEqual(expected);
  });

  it("a patch that changes nothing leaves no act", async () => {
    const id = built.idOf("yard-door");
    const { area } = built.plan.elements.find((element) => element.id === id)!;
    expect(await trial(built, (place) => changePart(place, "element", id, { area }))).toEqual([]);
  });

  it.each<[PartKind, string, object, string]>([
    ["element", "yard-door", { area: -1 }, "area"],
    ["element", "yard-door", { params: { gapArea: 99 } }, "params.gapArea"],
    ["element", "yard-door", { width: 3 }, "width"],
    ["element", "yard-door", { pathId: "nowhere" }, "pathId"],
    ["element", "yard-door", { constructionId: [1, 2] }, "constructionId"],
    ["receiver", "no9-bedroom", { name: "" }, "name"],
    ["situation", "still-night", { playing: [{ sourceId: "nobody", share: 1 }] }, "playing.0.sourceId"],
  ])("refuses %s %s %j at its field", async (kind, slug, patch, field) => {
    const fault = await faultOf(built, (place) => changePart(place, kind, built.idOf(slug), patch));
    expect(fault.reason).toBe("invalid");
    expect(Object.keys(fault.fields)).toContain(field);
    expect(fault.fields[field]).toMatch(/\.$/);
  });

  it("a part of another project is not there", async () => {
    const fault = await faultOf(built, (place) => changePart(place, "element", other.idOf("yard-door"), { area: 2 }));
    expect(fault.reason).toBe("missing");
  });
});

describe("adding and removing", () => {
  it("a new part comes last and gets an id of its own", async () => {
    const { id: _, ...fence } = built.plan.fences[0]!;
    const { acts, plan } = await trial(built, async (place) => ({
      acts: await addPart(place, "fence", { ...fence, name: "Second fence" }),
      plan: await planOf(built.project.id, place.transaction),
    }));
    expect(plan.fences.at(-1)).toEqual({ ...fence, id: acts[0]!.id, name: "Second fence" });
    expect(acts[0]).toMatchObject({ kind: "fence", act: "add", before: null });
  });

  it("a construction in use is held, and the refusal names who holds it", async () => {
    const door = built.plan.elements.find(({ id }) => id === built.idOf("yard-door"))!;
    const fault = await faultOf(built, (place) => removePart(place, "construction", door.constructionId!));
    expect(fault.reason).toBe("held");
    expect(fault.message).toContain(door.name);
  });

  it("what belongs to a part goes with it, key and all, and every loss is an act", async () => {
    const receiver = built.idOf("no9-bedroom");
    const limits = built.plan.criteria.filter(({ receiverId }) => receiverId === receiver).map(({ id }) => id);
    const { acts, keys } = await trial(built, async (place) => {
      const acts = await removePart(place, "receiver", receiver);
      return { acts, keys: await Part.count({ where: { id: [receiver, ...limits] }, transaction: place.transaction }) };
    });
    expect(acts.map(({ id, act }) => [id, act])).toEqual([receiver, ...limits].map((id) => [id, "remove"]));
    expect(keys).toBe(0);
  });

  it("a source leaves the situations it played in, and that is said", async () => {
    const fan = built.idOf("fan");
    const { acts, plan } = await trial(built, async (place) => ({ acts: await removePart(place, "source", fan), plan: await planOf(built.project.id, place.transaction) }));
    expect(plan.situations.flatMap(({ playing }) => playing).some(({ sourceId }) => sourceId === fan)).toBe(false);
    expect(plan.outlets).toEqual([]);
    expect(acts.filter(({ kind }: Act) => kind === "situation").map(({ act }) => act)).toEqual(["change"]);
  });

  it("a plan moved on by the acts is the plan its rows give", async () => {
    const { id: _, ...fence } = built.plan.fences[0]!;
    const steps: ((place: Place) => Promise<Act[]>)[] = [
      (place) => changePart(place, "element", built.idOf("yard-door"), { area: 2.2 }),
      (place) => addPart(place, "fence", { ...fence, name: "West fence" }),
      (place) => changePart(place, "lot", built.plan.lot.id, { temperature: 3 }),
      (place) => removePart(place, "source", built.idOf("fan")),
      (place) => removePart(place, "receiver", built.idOf("no9-bedroom")),
      (place) => changePart(place, "situation", built.idOf("still-night"), { playing: [] }),
    ];
    await trial(built, async (place) => {
      let plan = built.plan;
      for (const step of steps) {
        plan = advancePlan(plan, await step(place));
        expect(plan).toEqual(await planOf(built.project.id, place.transaction));
      }
    });
  });

  it("a room that is still used cannot go", async () => {
    const fault = await faultOf(built, (place) => removePart(place, "space", built.plan.paths[0]!.fromSpaceId));
    expect(fault.reason).toBe("held");
  });

  it("a yard holds no more listeners than the solver is bound to", async () => {
    const { id: _, ...receiver } = built.plan.receivers[0]!;
    const fault = await faultOf(built, async (place) => {
      for (let count = built.plan.receivers.length; count <= 20; count += 1) await addPart(place, "receiver", receiver);
    });
    expect(fault.message).toContain("at most 20");
  });

  it("a whole project goes with all its parts", async () => {
    const { teamId } = built.project;
    const left = await trial(built, async ({ transaction }) => {
      const { plan } = buildPlan();
      const project = { id: randomUUID(), teamId, name: "Gone", timeZone: "CET", currency: "EUR" };
      await Project.create(project, { fields: ["id", "teamId", "name", "timeZone", "currency"], transaction });
      await storePlan({ projectId: project.id, transaction }, plan);
      await Project.destroy({ where: { id: project.id }, transaction });
      return PathElement.count({ where: { projectId: project.id }, transaction });
    });
    expect(left).toBe(0);
  });
});
