import { expect } from "vitest";
import { PATCH } from "../../../app/api/projects/[projectId]/[part]/[partId]/route";
import { GET } from "../../../app/api/projects/[projectId]/route";
import type { Answer } from "../../../app/_server/weigh";
import { ask } from "../../build";
import type { MortalCluster } from "./cluster";
import { buildWriters, expectNothingLost, writeOn, type Sent, type Writer } from "./writers";

const WRITERS = 8;

const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

async function send({ projectId, receiverId, cookie, revision }: Writer, says: string): Promise<Sent> {
  const params = { projectId, part: "receivers", partId: receiverId };
  const answer = await ask(PATCH, { method: "PATCH", cookie, params, revision, body: { says } });
  const body = (await answer.json()) as { revision?: number; current?: { revision: number } };
  return { status: answer.status, revision: body.revision ?? body.current?.revision };
}

/** Kills the database under the handlers' writers again and again, and expects what was confirmed to be there, and the rest to have been told so. */
export async function killUnderWriters(cluster: MortalCluster, kills: number): Promise<void> {
  process.env.DATABASE_URL = cluster.url;
  const writers = await buildWriters(WRITERS);
  let isOver = false;
  const writing = writers.map((writer) => writeOn(writer, send, () => isOver));
  const back: number[] = [];
  for (let kill = 0; kill < kills; kill += 1) {
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
}
