import { type ChildProcess, fork } from "node:child_process";
import { once } from "node:events";
import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { freePort } from "../../scripts/port.mjs";
import { buildWriters, expectNothingLost, writeOn, type Sent, type Writer } from "./killed/writers";

/** More of them in the slow proofs. */
const KILLS = Number(process.env.STILLYARD_KILLS ?? 3);
const WRITERS = 4;

let writers: Writer[];
let port: number;
const children: ChildProcess[] = [];
beforeAll(async () => {
  writers = await buildWriters(WRITERS);
  port = await freePort();
});
afterEach(() => children.splice(0).forEach((child) => child.kill("SIGKILL")));
afterAll(async () => {
  const { connection } = await import("../../models/index");
  await connection.close();
});

async function begin(): Promise<ChildProcess> {
  const execArgv = ["--conditions=react-server", "--import", "tsx"];
  const child = fork("tests/faults/killed/app.ts", { env: { ...process.env, PORT: String(port), NODE_ENV: "production" }, execArgv });
  children.push(child);
  await once(child, "message");
  return child;
}

async function send({ projectId, receiverId, cookie, revision }: Writer, says: string): Promise<Sent> {
  try {
    const headers = { cookie, "sec-fetch-site": "same-origin", "content-type": "application/json", "if-match": `"${revision}"` };
    const answer = await fetch(`http://127.0.0.1:${port}/api/projects/${projectId}/receivers/${receiverId}`, { method: "PATCH", headers, body: JSON.stringify({ says }) });
    const body = (await answer.json()) as { revision?: number; current?: { revision: number } };
    return { status: answer.status, revision: body.revision ?? body.current?.revision };
  } catch {
    return { status: 0 };
  }
}

const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

describe("the process of the product", () => {
  it(`killed ${KILLS} times under ${WRITERS} writers: no confirmed change is lost, none is half there, and the next start needs no repair`, async () => {
    let isOver = false;
    const writing = writers.map((writer) => writeOn(writer, send, () => isOver));
    for (let kill = 0; kill < KILLS; kill += 1) {
      const child = await begin();
      const confirmed = writers.map((writer) => writer.confirmed.length);
      while (writers.some((writer, place) => writer.confirmed.length === confirmed[place])) await pause(10);
      await pause(((kill * 137) % 500) + 20);
      const gone = once(child, "exit");
      child.kill("SIGKILL");
      await gone;
    }
    isOver = true;
    await Promise.all(writing);
    const refused = writers.flatMap((writer) => writer.refused);
    console.log(`${writers.reduce((sum, { confirmed }) => sum + confirmed.length, 0)} confirmed, ${refused.length} without an answer or late`);
    expect(refused.filter(({ status }) => status !== 0 && status !== 409)).toEqual([]);
    await expectNothingLost(writers);
  }, 300_000);

  it("asked to end under load: what was begun is answered, nothing is half there, and the exit code is 0", async () => {
    for (const writer of writers) writer.refused.length = 0;
    const child = await begin();
    let isOver = false;
    const writing = writers.map((writer) => writeOn(writer, send, () => isOver));
    const confirmed = writers.map((writer) => writer.confirmed.length);
    while (writers.some((writer, place) => writer.confirmed.length === confirmed[place])) await pause(10);
    const gone = once(child, "exit");
    const from = performance.now();
    child.kill("SIGTERM");
    expect(await gone).toEqual([0, null]);
    expect(performance.now() - from).toBeLessThan(20_000);
    isOver = true;
    await Promise.all(writing);
    const refused = writers.flatMap((writer) => writer.refused);
    // Only those who came when the door was closed already had no answer.
    expect(refused.filter(({ status }) => status !== 0 && status !== 409)).toEqual([]);
    await expectNothingLost(writers);
    for (const { confirmed: words, projectId } of writers) {
      const { Revision } = await import("../../models/index");
      const rows = await Revision.findAll({ where: { projectId }, order: [["revision", "DESC"]], limit: 1 });
      expect((rows[0]!.acts[0]!.after as { says: string }).says).toBe(words.at(-1));
    }
  }, 120_000);
});
