import { afterAll, beforeAll, expect, it } from "vitest";
import { PATCH } from "../../app/api/projects/[projectId]/[part]/[partId]/route";
import { GET } from "../../app/api/projects/[projectId]/route";
import type { Answer } from "../../app/_server/weigh";
import { ask } from "../build";
import { startMortalCluster, type MortalCluster } from "./killed/cluster";
import { buildWriters, expectNothingLost, writeOn, type Sent, type Writer } from "./killed/writers";

/** More of them in the slow proofs. */
const KILLS = Number(process.env.STILLYARD_KILLS ?? 2);
const WRITERS = 8;

let cluster: MortalCluster;
let writers: Writer[];
beforeAll(async () => {
  cluster = await startMortalCluster();
  process.env.DATABASE_URL = cluster.url;
  writers = await buildWriters(WRITERS);
}, 120_000);
afterAll(() => cluster.stop());

const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

async function send({ projectId, receiverId, cookie, revision }: Writer, says: string): Promise<Sent> {
  const params = { projectId, part: "receivers", partId: receiverId };
  const answer = await ask(PATCH, { method: "PATCH", cookie, params, revision, body: { says } });
  const body = (await answer.json()) as { revision?: number; current?: { revision: number } };
  return { status: answer.status, revision: body.revision ?? body.current?.revision };
}

it(`PostgreSQL killed ${KILLS} times under ${WRITERS} writers: every confirmed change is there, the others are told 503 within 6 s, and service comes back by itself`, async () => {
  let isOver = false;
  const writing = writers.map((writer) => writeOn(writer, send, () => isOver));
  const back: number[] = [];
  for (let kill = 0; kill < KILLS; kill += 1) {
    await pause(700 + 300 * kill);
    cluster.kill();
    await pause(500);
    await cluster.revive();
    const from = performance.now();
    const confirmed = writers.map((writer) => writer.confirmed.length);
    while (writers.some((writer, place) => writer.confirmed.length === confirmed[place])) {
      await pause(20);
      if (performance.now() - from > 15_000) throw new Error("A writer did not get through again within 15 s.");
    }
    back.push(performance.now() - from);
  }
  isOver = true;
  await Promise.all(writing);
  const refused = writers.flatMap((writer) => writer.refused);
  const slowest = Math.max(...refused.map(({ milliseconds }) => milliseconds));
  console.log(`${writers.reduce((sum, { confirmed }) => sum + confirmed.length, 0)} confirmed, ${refused.length} refused, slowest refusal ${slowest.toFixed(0)} ms, all writing again after ${back.map((value) => value.toFixed(0)).join(", ")} ms`);
  expect(refused.length).toBeGreaterThan(0);
  // 409: the change was kept though its answer was cut off.
  expect(refused.filter(({ status }) => status !== 503 && status !== 409)).toEqual([]);
  expect(slowest).toBeLessThan(6_000);
  await expectNothingLost(writers);
  const [{ projectId, cookie }] = writers as [Writer];
  const opened = (await (await ask(GET, { cookie, params: { projectId } })).json()) as Answer;
  expect(opened.verdict.solver).not.toBe("none");
}, 300_000);
