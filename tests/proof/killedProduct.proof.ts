import { afterAll, beforeAll, expect, it } from "vitest";
import { prepareServed, type Served } from "./ownServed";
import { buildWriters, expectNothingLost, writeOn, type Sent, type Writer } from "../faults/killed/writers";

const KILLS = Number(process.env.STILLYARD_KILLS ?? 20);
const WRITERS = 8;

let product: Served;
let again: () => Promise<Served>;
let writers: Writer[];
beforeAll(async () => {
  again = (await prepareServed()).serve;
  product = await again();
  writers = await buildWriters(WRITERS);
});
afterAll(() => product.stop());

async function send({ projectId, receiverId, cookie, revision }: Writer, says: string): Promise<Sent> {
  try {
    const headers = { cookie, "sec-fetch-site": "same-origin", "content-type": "application/json", "if-match": `"${revision}"` };
    const answer = await fetch(`${product.address}/api/projects/${projectId}/receivers/${receiverId}`, { method: "PATCH", headers, body: JSON.stringify({ says }) });
    const body = (await answer.json()) as { revision?: number; current?: { revision: number } };
    // One session writes at most twice a second for long.
    if (answer.status === 200) await pause(500);
    return { status: answer.status, revision: body.revision ?? body.current?.revision };
  } catch {
    return { status: 0 };
  }
}

const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

it(`the built product killed at ${KILLS} moments under ${WRITERS} writers: no confirmed change is lost, none is half there`, async () => {
  let isOver = false;
  const writing = writers.map((writer) => writeOn(writer, send, () => isOver));
  for (let kill = 0; kill < KILLS; kill += 1) {
    const confirmed = writers.map((writer) => writer.confirmed.length);
    while (writers.some((writer, place) => writer.confirmed.length === confirmed[place])) await pause(10);
    await pause((kill * 137) % 900);
    process.kill(product.pid, "SIGKILL");
    product = await again();
  }
  isOver = true;
  await Promise.all(writing);
  const refused = writers.flatMap((writer) => writer.refused);
  console.log(`${writers.reduce((sum, { confirmed }) => sum + confirmed.length, 0)} confirmed, ${refused.length} without an answer or late`);
  expect(refused.filter(({ status }) => status !== 0 && status !== 409)).toEqual([]);
  await expectNothingLost(writers);
});
