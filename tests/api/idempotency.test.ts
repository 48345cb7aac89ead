import { beforeAll, expect, it } from "vitest";
import { POST as CHANGES } from "../../app/api/projects/[projectId]/changes/route";
import { POST } from "../../app/api/projects/[projectId]/[part]/route";
import { GET } from "../../app/api/projects/[projectId]/route";
import type { Answer } from "../../app/_server/weigh";
import { connection, IdempotencyKey, Project } from "../../models/index";
import { ask } from "../build";
import { buildStage, cookieFor, type Actor, type Stage } from "./actors";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

const revisionNow = async () => (await stage.project.reload()).revision;
const fencesNow = async () => ((await (await ask(GET, { cookie: stage.cookies.owner, params: { projectId: stage.project.id } })).json()) as Answer).plan.fences.length;

function fence(name: string) {
  const { id: _, ...values } = stage.plan.fences[0]!;
  return { ...values, name };
}

interface Asking {
  key?: string;
  name?: string;
  revision: number;
  actor?: Actor;
  projectId?: string;
}

function add({ key, name = "A fence", revision, actor = "owner", projectId = stage.project.id }: Asking) {
  const headers: Record<string, string> = key === undefined ? {} : { "idempotency-key": key };
  return ask(POST, { method: "POST", cookie: cookieFor(stage, actor), params: { projectId, part: "fences" }, revision, body: fence(name), headers });
}

it("asked again on the old revision, because the answer was lost: one fence, and the same answer to the byte", async () => {
  const [revision, fences] = [await revisionNow(), await fencesNow()];
  const first = await add({ key: "lost", revision });
  const again = await add({ key: "lost", revision });
  expect([first.status, again.status]).toEqual([200, 200]);
  expect(await again.text()).toBe(await first.text());
  expect([await revisionNow(), await fencesNow()]).toEqual([revision + 1, fences + 1]);
});

it("without a key each request is a wish of its own", async () => {
  const [revision, fences] = [await revisionNow(), await fencesNow()];
  expect((await add({ revision })).status).toBe(200);
  expect((await add({ revision: revision + 1 })).status).toBe(200);
  expect(await fencesNow()).toBe(fences + 2);
});

it("the same key with another body is refused with 422, and nothing is done", async () => {
  const revision = await revisionNow();
  expect((await add({ key: "twice", name: "One", revision })).status).toBe(200);
  expect((await add({ key: "twice", name: "Other", revision: revision + 1 })).status).toBe(422);
  expect(await revisionNow()).toBe(revision + 1);
});

it("the same key at another person's is another key", async () => {
  const revision = await revisionNow();
  expect((await add({ key: "shared", revision })).status).toBe(200);
  expect((await add({ key: "shared", revision: revision + 1, actor: "acoustician" })).status).toBe(200);
  expect(await revisionNow()).toBe(revision + 2);
});

it("twenty twins at once: one effect; the others get its answer or 409", async () => {
  const [revision, fences] = [await revisionNow(), await fencesNow()];
  const answers = await Promise.all(Array.from({ length: 20 }, () => add({ key: "twins", revision })));
  const statuses = answers.map(({ status }) => status);
  expect(statuses.filter((status) => status !== 200 && status !== 409)).toEqual([]);
  expect(statuses).toContain(200);
  expect([await revisionNow(), await fencesNow()]).toEqual([revision + 1, fences + 1]);
});

it("while its twin is under way a request is told so with 409", async () => {
  const revision = await revisionNow();
  const holder = await connection.transaction();
  await Project.findOne({ where: { id: stage.project.id }, lock: holder.LOCK.UPDATE, transaction: holder });
  const first = add({ key: "slow", revision });
  await new Promise((resolve) => setTimeout(resolve, 300));
  const twin = await add({ key: "slow", revision });
  await holder.rollback();
  expect(twin.status).toBe(409);
  expect(((await twin.json()) as { error: { message: string } }).error.message).toContain("being saved already");
  expect((await first).status).toBe(200);
});

it("a refused act leaves its key free: late, asked again on the new revision, it is done", async () => {
  const revision = await revisionNow();
  expect((await add({ key: "late", revision: revision - 1 })).status).toBe(409);
  expect((await add({ key: "late", name: "", revision })).status).toBe(422);
  expect((await add({ key: "late", revision })).status).toBe(200);
});

it("a right that was lost meanwhile is asked for before an old answer is given", async () => {
  const revision = await revisionNow();
  expect((await add({ key: "right", revision, actor: "client" })).status).toBe(403);
  expect((await add({ key: "right", revision, actor: "other owner" })).status).toBe(404);
  expect(await IdempotencyKey.count({ where: { key: "right" } })).toBe(0);
});

it("several changes as one are done once as well", async () => {
  const [revision, fences] = [await revisionNow(), await fencesNow()];
  const body = { changes: [{ act: "add", part: "fences", values: fence("One") }, { act: "add", part: "fences", values: fence("Two") }] };
  const asked = { method: "POST", cookie: stage.cookies.owner, params: { projectId: stage.project.id }, revision, body, headers: { "idempotency-key": "several" } };
  const answers = [await ask(CHANGES, asked), await ask(CHANGES, asked)];
  expect(answers.map(({ status }) => status)).toEqual([200, 200]);
  expect(await fencesNow()).toBe(fences + 2);
});

it.each([[""], ["two words"], ["x".repeat(256)]])("a key that cannot be read is refused with 400: %j", async (key) => {
  const revision = await revisionNow();
  const request = new Request("http://localhost:3000/api", {
    method: "POST",
    headers: { cookie: stage.cookies.owner, "sec-fetch-site": "same-origin", "content-type": "application/json", "if-match": `"${revision}"`, "idempotency-key": key },
    body: JSON.stringify(fence("None")),
  });
  const answer = await POST(request, { params: Promise.resolve({ projectId: stage.project.id, part: "fences" }) });
  expect([answer.status, await revisionNow()]).toEqual([400, revision]);
});

it("a key is forgotten after 48 hours, and old ones are swept when a new one is written", async () => {
  const [revision, fences] = [await revisionNow(), await fencesNow()];
  await add({ key: "old", revision });
  await add({ key: "older", revision: revision + 1 });
  await connection.query("update idempotency_keys set made_at = now() - interval '49 hours' where key in ('old', 'older')");
  expect((await add({ key: "old", revision: revision + 2 })).status).toBe(200);
  expect(await fencesNow()).toBe(fences + 3);
  expect(await IdempotencyKey.count({ where: { key: ["old", "older"] } })).toBe(1);
});
