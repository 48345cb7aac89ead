import { beforeAll, expect, it } from "vitest";
import { PATCH as SETTINGS } from "../../app/api/me/route";
import { GET } from "../../app/api/projects/[projectId]/route";
import { countRequest } from "../../app/_server/rates";
import { connection } from "../../models/index";
import { ask, buildSession, hashOf } from "../build";
import { buildStage, type Stage } from "./actors";

let stage: Stage;
beforeAll(async () => {
  process.env.STILLYARD_REQUESTS_A_MINUTE = "300";
  process.env.STILLYARD_WRITES_IN_10_S = "20";
  stage = await buildStage();
});

const freshCookie = async () => (await buildSession(stage.users.owner)).cookie;
const read = (cookie: string) => ask(GET, { cookie, params: { projectId: stage.project.id } });
const write = (cookie: string) => ask(SETTINGS, { method: "PATCH", cookie, body: { theme: "dark" } });

/** Moves a session's windows into the past, or with a negative count into the future, as a clock that was set back does. */
const age = (idHash: string, seconds: number) =>
  connection.query("update request_counts set minute_from = minute_from - :by * interval '1 s', writes_from = writes_from - :by * interval '1 s' where session = :idHash", {
    replacements: { idHash, by: seconds },
  });

async function statuses(count: number, work: () => Promise<Response>): Promise<Map<number, number>> {
  const counts = new Map<number, number>();
  for (let left = count; left > 0; left -= 1) {
    const { status } = await work();
    counts.set(status, (counts.get(status) ?? 0) + 1);
  }
  return counts;
}

it("a session may change something twenty times in ten seconds; the next is told in words when to come again", async () => {
  const { cookie, idHash } = await buildSession(stage.users.owner);
  expect(await statuses(20, () => write(cookie))).toEqual(new Map([[204, 20]]));
  const refused = await write(cookie);
  expect(refused.status).toBe(429);
  const seconds = Number(refused.headers.get("retry-after"));
  expect(seconds).toBeGreaterThanOrEqual(1);
  expect(seconds).toBeLessThanOrEqual(10);
  const { error } = (await refused.json()) as { error: { code: string; message: string } };
  expect(error).toMatchObject({ code: "too many", message: expect.stringMatching(/Nothing is lost: try again in \d+ seconds\./) });
  expect((await read(cookie)).status).toBe(200);
  await age(idHash, 11);
  expect((await write(cookie)).status).toBe(204);
});

it("a session may ask three hundred times a minute, and then reads nothing until the minute is over", async () => {
  const { cookie, idHash } = await buildSession(stage.users.owner);
  await connection.query("insert into request_counts values (:idHash, clock_timestamp() - interval '20 s', 298, clock_timestamp() - interval '20 s', 0)", { replacements: { idHash } });
  expect(await statuses(4, () => read(cookie))).toEqual(new Map([[200, 2], [429, 2]]));
  const seconds = Number((await read(cookie)).headers.get("retry-after"));
  expect(seconds).toBeGreaterThan(30);
  expect(seconds).toBeLessThanOrEqual(40);
  expect((await read(await freshCookie())).status).toBe(200);
  await age(idHash, 41);
  expect((await read(cookie)).status).toBe(200);
});

it("forty changes at once are counted one by one", async () => {
  const cookie = await freshCookie();
  const answers = await Promise.all(Array.from({ length: 40 }, () => write(cookie)));
  expect(answers.filter(({ status }) => status === 204)).toHaveLength(20);
  expect(answers.filter(({ status }) => status === 429)).toHaveLength(20);
});

it("a clock that is set back locks nobody out", async () => {
  const { cookie, idHash } = await buildSession(stage.users.owner);
  await statuses(21, () => write(cookie));
  await age(idHash, -3_600);
  expect((await write(cookie)).status).toBe(204);
});

it("a session that is none is not counted, and counts of an hour ago are swept", async () => {
  const stranger = hashOf("nobody's id");
  await countRequest(stranger, "GET");
  const { idHash } = await buildSession(stage.users.owner);
  await countRequest(idHash, "GET");
  await age(idHash, 3_700);
  await read(await freshCookie());
  const [rows] = await connection.query("select session from request_counts where session in (:both)", { replacements: { both: [stranger, idHash] } });
  expect(rows).toEqual([]);
});

it("counting costs a request less than five milliseconds", async () => {
  const { idHash } = await buildSession(stage.users.owner);
  const times: number[] = [];
  for (let turn = 0; turn < 100; turn += 1) {
    const from = performance.now();
    await countRequest(idHash, "GET");
    times.push(performance.now() - from);
  }
  const median = times.sort((one, other) => one - other)[50]!;
  console.log(`counting one request: median ${median.toFixed(2)} ms`);
  expect(median).toBeLessThan(5);
});
