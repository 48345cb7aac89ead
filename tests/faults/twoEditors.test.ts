import { beforeAll, describe, expect, it } from "vitest";
import { PATCH } from "../../app/api/projects/[projectId]/[part]/[partId]/route";
import { GET } from "../../app/api/projects/[projectId]/route";
import type { Answer } from "../../app/_server/weigh";
import { Revision } from "../../models/index";
import { buildStage, type Stage } from "../api/actors";
import { ask } from "../build";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

interface StaleAnswer {
  error: { code: string; message: string };
  current: Answer;
  changedBy: { name: string; at: string; whole: boolean; parts: { kind: string; id: string; act: string; before: object; after: object }[] };
}

const open = async () => (await (await ask(GET, { cookie: stage.cookies.owner, params: { projectId: stage.project.id } })).json()) as Answer;

function change(slug: string, body: object, revision: number | undefined, who: "owner" | "acoustician" = "owner") {
  const params = { projectId: stage.project.id, part: "elements", partId: stage.idOf(slug) };
  return ask(PATCH, { method: "PATCH", cookie: stage.cookies[who], params, revision, body });
}

const elementOf = ({ plan }: Answer, slug: string) => plan.elements.find(({ id }) => id === stage.idOf(slug))!;

describe("two editors", () => {
  it("a change without a revision is asked for one", async () => {
    expect((await change("yard-door", { area: 2 }, undefined)).status).toBe(428);
  });

  it("a revision that cannot be read is said to be so", async () => {
    const params = { projectId: stage.project.id, part: "elements", partId: stage.idOf("yard-door") };
    const answer = await ask(PATCH, { method: "PATCH", cookie: stage.cookies.owner, params, body: { area: 2 }, headers: { "if-match": "*" } });
    expect(answer.status).toBe(400);
  });

  it("on one part the second is shown both values, and nothing is overwritten", async () => {
    const start = await open();
    const before = elementOf(start, "yard-door");
    const first = await change("yard-door", { area: 2.05 }, start.revision, "acoustician");
    expect(((await first.json()) as Answer).revision).toBe(start.revision + 1);
    const second = await change("yard-door", { area: 1.7 }, start.revision);
    expect(second.status).toBe(409);
    const { current, changedBy, error } = (await second.json()) as StaleAnswer;
    expect(error.message).toContain("Aron");
    expect(changedBy).toMatchObject({ name: "Aron", parts: [{ kind: "element", id: before.id, act: "change", before, after: { ...before, area: 2.05 } }] });
    expect(Math.abs(Date.parse(changedBy.at) - Date.now())).toBeLessThan(60_000);
    expect(elementOf(current, "yard-door").area).toBe(2.05);
    expect(current).toEqual(await open());
  });

  it("on different parts the change can be sent again on the new revision, and both stand", async () => {
    const start = await open();
    await change("yard-door", { area: 2.2 }, start.revision, "acoustician");
    const late = await change("east-wall", { area: 9 }, start.revision);
    const { current, changedBy } = (await late.json()) as StaleAnswer;
    expect(changedBy.parts.map(({ id }) => id)).toEqual([stage.idOf("yard-door")]);
    const again = (await (await change("east-wall", { area: 9 }, current.revision)).json()) as Answer;
    expect([elementOf(again, "yard-door").area, elementOf(again, "east-wall").area]).toEqual([2.2, 9]);
  });

  it("who is more than a hundred changes behind is told that not all of them are named", async () => {
    const start = await open();
    let { revision } = start;
    for (let count = 0; count < 101; count += 1, revision += 1) await change("yard-door", { area: 3 + count / 100 }, revision);
    const changedSince = async (made: number) => ((await (await change("yard-door", { area: 1 }, made)).json()) as StaleAnswer).changedBy;
    expect(await changedSince(start.revision)).toMatchObject({ whole: false });
    expect(await changedSince(start.revision + 1)).toMatchObject({ whole: true });
    await change("yard-door", { area: 2.2 }, revision);
  });

  it("each change leaves who, in which role, and the part before and after", async () => {
    const { revision } = await open();
    await change("yard-door", { area: 2.4 }, revision, "acoustician");
    const row = await Revision.findOne({ where: { projectId: stage.project.id, revision: revision + 1 } });
    expect(row).toMatchObject({ userId: stage.users.acoustician.id, role: "acoustician" });
    expect(row!.acts).toMatchObject([{ kind: "element", before: { area: 2.2 }, after: { area: 2.4 } }]);
  });

  it("the plan and its verdict are of the same revision", async () => {
    const { revision } = await open();
    const quiet = (await (await change("yard-door", { area: 0.5 }, revision)).json()) as Answer;
    const loud = (await (await change("yard-door", { area: 5 }, quiet.revision)).json()) as Answer;
    const margin = ({ verdict }: Answer) => verdict.receivers.find(({ receiverId }) => receiverId === stage.idOf("no9-bedroom"))!.margin!;
    expect(margin(loud)).toBeLessThan(margin(quiet));
  });
});

/** The full count is a slow proof of its own. */
const CLIENTS = 12;
const EACH = 10;

/** Who came too late waits for another while, longer each time. */
const aWhile = (tries: number) => new Promise((resolve) => setTimeout(resolve, Math.random() * Math.min(5_000, 100 * 2 ** tries)));

it(`${CLIENTS} clients adding one ${EACH} times: every 200 counts exactly once`, async () => {
  const slug = "studio-roof";
  const start = await open();
  const from = elementOf(start, slug).area;
  let granted = 0;

  async function addOne() {
    for (let tries = 0; ; tries += 1) {
      const answer = await open();
      const response = await change(slug, { area: elementOf(answer, slug).area + 1 }, answer.revision);
      if (response.status === 200) {
        granted += 1;
        return;
      }
      if (response.status !== 409 && response.status !== 503) throw new Error(`${response.status} ${await response.text()}`);
      await aWhile(tries);
    }
  }

  await Promise.all(Array.from({ length: CLIENTS }, async () => {
    for (let count = 0; count < EACH; count += 1) await addOne();
  }));
  const end = await open();
  expect(granted).toBe(CLIENTS * EACH);
  expect(end.revision - start.revision).toBe(granted);
  expect(elementOf(end, slug).area).toBeCloseTo(from + granted, 6);
  const rows = await Revision.count({ where: { projectId: stage.project.id } });
  expect(rows).toBe(end.revision);
}, 300_000);
