import { randomUUID } from "node:crypto";
import { expect, it } from "vitest";
import { DELETE, PATCH } from "../../app/api/projects/[projectId]/[part]/[partId]/route";
import { POST } from "../../app/api/projects/[projectId]/[part]/route";
import { fieldOf } from "../../lib/noise/sound/field";
import { mayArrive } from "../../lib/noise/sound/emitters";
import { countPairs, MOST_PAIRS } from "../../lib/noise/sound/pairs";
import { effectiveLoss } from "../../lib/noise/effective";
import { cutTowards } from "../../lib/noise/outdoors/face";
import type { Plan } from "../../lib/noise/plan";
import { connection } from "../../models/index";
import { insertPart, planOf } from "../../models/parts";
import { ask, buildMember, buildPlan, buildProject, buildTeam, cookieOf } from "../build";

/** The pairs that a verdict reckons with. */
function reckoned(plan: Plan): number {
  const losses = new Map(plan.constructions.map((one) => [one.id, effectiveLoss(one)]));
  const { emitters, points } = fieldOf(plan, losses, []);
  const cuts = emitters.flatMap((emitter) => points.filter((point) => mayArrive(emitter, point)).map((point) => cutTowards(emitter.face, point.end.at)));
  return cuts.reduce((sum, [across, up]) => sum + across * up, 0);
}

it("the pairs of the demo's yard are those its verdict reckons with, and adding an element adds to them", () => {
  const { plan, idOf } = buildPlan();
  const door = plan.elements.find(({ id }) => id === idOf("yard-door"))!;
  expect(countPairs(plan)).toBe(reckoned(plan));
  expect(countPairs(plan)).toBeGreaterThan(100);
  expect(countPairs({ ...plan, elements: [...plan.elements, { ...door, id: "second" }] })).toBeGreaterThan(countPairs(plan));
  expect(countPairs({ ...plan, receivers: [] })).toBe(0);
});

it("a change that makes more than can be weighed is refused in words and leaves nothing; taking away is not", async () => {
  const team = await buildTeam();
  const { project, plan, idOf } = await buildProject(team, "Crowded");
  const cookie = await cookieOf(await buildMember(team, "owner"));
  const door = plan.elements.find(({ id }) => id === idOf("yard-door"))!;
  const bedroom = plan.receivers.find(({ id }) => id === idOf("no9-bedroom"))!.spaceId;
  const pathIds = plan.paths.filter(({ fromSpaceId, toSpaceId }) => fromSpaceId === bedroom && toSpaceId === null).map(({ id }) => id);
  const window = plan.elements.find(({ pathId, position }) => pathIds.includes(pathId) && position)!;
  let crowded = plan;
  while (countPairs(crowded) <= MOST_PAIRS) {
    const copies = [door, window].map((one) => ({ ...one, id: randomUUID() }));
    crowded = { ...crowded, elements: [...crowded.elements, ...copies] };
  }
  expect(crowded.elements.length).toBeLessThan(400);
  const extra = crowded.elements.slice(plan.elements.length);
  await connection.transaction(async (transaction) => {
    for (const part of extra) await insertPart({ projectId: project.id, transaction }, "element", part);
  });

  const { id: _, ...values } = door;
  const params = { projectId: project.id, part: "elements" };
  const added = await ask(POST, { method: "POST", cookie, params, revision: 0, body: values });
  expect(added.status).toBe(409);
  expect(((await added.json()) as { error: { message: string } }).error.message).toMatch(/^This would be more ways .* of at most 20000\. /);
  const changed = await ask(PATCH, { method: "PATCH", cookie, params: { ...params, partId: extra[0]!.id }, revision: 0, body: { area: 1.5 } });
  expect(changed.status).toBe(409);
  const after = await connection.transaction((transaction) => planOf(project.id, transaction));
  expect(after.elements).toEqual(crowded.elements);
  expect((await project.reload()).revision).toBe(0);

  let revision = 0;
  // As many as it takes.
  const fewer = extra.findIndex((_, gone) => countPairs({ ...plan, elements: [...plan.elements, ...extra.slice(gone)] }) <= MOST_PAIRS);
  for (const { id } of extra.slice(0, fewer)) {
    expect((await ask(DELETE, { method: "DELETE", cookie, params: { ...params, partId: id }, revision })).status).toBe(200);
    revision += 1;
  }
  const again = await ask(PATCH, { method: "PATCH", cookie, params: { ...params, partId: extra[fewer]!.id }, revision, body: { area: 1.5 } });
  expect(again.status).toBe(200);
});
