import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { POST } from "../../app/api/sign-up/route";
import { runNextJob, startJobs } from "../../app/_server/jobs/loop";
import { claimJob, failJob, finishJob, MOST_TRIES, renewLease, type Claimed } from "../../app/_server/jobs/queue";
import { literal } from "sequelize";
import { Job, User } from "../../models/index";
import { ask } from "../build";
import { freePort } from "../../scripts/port.mjs";
import { openMailServer, type MailServer, type Mood } from "../mailServer";

vi.mock("../../app/_server/passwordWorkers", () => import("../quickHash"));

let port: number;
let server: MailServer | undefined;
beforeAll(async () => {
  port = await freePort();
  process.env.STILLYARD_SMTP = `smtp://127.0.0.1:${port}`;
});
beforeEach(() => Job.destroy({ truncate: true }));
afterEach(async () => {
  await server?.stop();
  server = undefined;
});

let count = 0;
const signUp = () => {
  const email = `${(count += 1)}@faults.example`;
  const body = { name: "Nora", email, password: "a hedge, a hammock and a hum", hat: "play" };
  return ask(POST, { method: "POST", body, headers: { "x-stillyard-address": `203.0.113.${count}` } });
};
const only = async () => (await Job.findAll())[0]!;
const makeDue = () => Job.update({ dueAt: literal("now()") as unknown as Date }, { where: { state: "waiting" } });
const secondsUntilDue = async (job: Job) => ((await job.reload()).dueAt.getTime() - Date.now()) / 1_000;

describe("a mail server that does not take mail", () => {
  it.each<[string, Mood | undefined]>([
    ["is closed", undefined],
    ["says 451", "451"],
    ["says nothing", "silent"],
    ["takes the mail and hangs up before it says so", "takes, then cuts"],
  ])(
    "%s: the act succeeds, the mail waits and comes on its return",
    async (_, mood) => {
      server = mood && (await openMailServer(mood, port));
      expect((await signUp()).status).toBe(202);
      expect(await User.count({ where: { email: `${count}@faults.example` } })).toBe(1);
      expect(await runNextJob()).toBe(true);
      const waiting = await only();
      expect([waiting.state, waiting.tries, waiting.lease, waiting.fault === null]).toEqual(["waiting", 1, null, false]);
      expect(await secondsUntilDue(waiting)).toBeGreaterThan(5);
      expect(await runNextJob()).toBe(false);

      server ??= await openMailServer("takes", port);
      server.mood = "takes";
      await makeDue();
      await runNextJob();
      expect([(await only()).state, await runNextJob()]).toEqual(["done", false]);
      // What was cut after it was taken comes again as the very same mail: its number and words are equal.
      const cut = mood === "takes, then cuts";
      expect(server.received).toHaveLength(cut ? 2 : 1);
      expect(new Set(server.received.map((mail) => JSON.stringify(mail))).size).toBe(1);
      expect(server.received[0]).toMatchObject({ id: `<${waiting.id}@localhost>`, to: `${count}@faults.example` });
    },
    45_000,
  );

  it("is tried eight times, each wait twice the one before up to an hour; then the mail is dead and says why", async () => {
    await signUp();
    const waits = [];
    for (let tries = 1; tries <= MOST_TRIES; tries += 1) {
      await runNextJob();
      const job = await only();
      if (job.state === "waiting") waits.push(Math.round(await secondsUntilDue(job)));
      await makeDue();
    }
    expect(waits.map((wait, place) => Math.abs(wait - 15 * 2 ** place) <= 3)).toEqual(Array(7).fill(true));
    const dead = await only();
    expect([dead.state, dead.tries, dead.fault?.includes("ECONNREFUSED")]).toEqual(["dead", 8, true]);
    expect(await runNextJob()).toBe(false);
  });
});

describe("a job", () => {
  const write = async (kind = "none of ours") => Job.create({ id: crypto.randomUUID(), kind, payload: {} }, { fields: ["id", "kind", "payload"] });
  const lapse = () => Job.update({ leasedUntil: literal("now() - interval '1 second'") as unknown as Date }, { where: { state: "waiting" } });

  it("is claimed once, though twenty ask at the same moment", async () => {
    for (let count = 0; count < 5; count += 1) await write();
    const claimed = (await Promise.all(Array.from({ length: 20 }, () => claimJob()))).filter((job) => job !== undefined);
    expect([claimed.length, new Set(claimed.map(({ id }) => id)).size]).toEqual([5, 5]);
  });

  it("of a process that was killed is another's after a minute, and what the dead one still says counts nothing", async () => {
    await write();
    const lost = (await claimJob())!;
    expect(await claimJob()).toBeUndefined();
    expect((((await only()).leasedUntil!.getTime() - Date.now()) / 1_000)).toBeGreaterThan(50);
    await lapse();
    const found = (await claimJob()) as Claimed;
    expect([found.id, found.tries]).toEqual([lost.id, 2]);
    expect(await renewLease(lost)).toBe(false);
    await finishJob(lost);
    await failJob(lost, "late");
    expect([(await only()).state, (await only()).fault, (await only()).lease]).toEqual(["waiting", null, found.lease]);
    expect(await renewLease(found)).toBe(true);
  });

  it("that takes its process with it each time is not tried for ever", async () => {
    await write("letter");
    for (let tries = 0; tries < MOST_TRIES; tries += 1) {
      await claimJob();
      await lapse();
    }
    await runNextJob();
    expect([(await only()).state, (await only()).fault]).toEqual(["dead", "Each try ended with its process."]);
  });

  it("of an unknown kind fails in words and holds up no other", async () => {
    await write();
    expect(await runNextJob()).toBe(true);
    expect((await only()).fault).toBe("There is no kind of job called none of ours.");
  });
});

describe("the loop", () => {
  it("does what an act leaves behind at once, and hands back what it holds when the process ends", async () => {
    server = await openMailServer("takes", port);
    startJobs();
    await new Promise((resolve) => setTimeout(resolve, 300));
    await signUp();
    await expect.poll(() => server!.received.length, { timeout: 3_000 }).toBe(1);
    await expect.poll(async () => (await only()).state).toBe("done");

    await Job.destroy({ truncate: true });
    server.mood = "silent";
    await signUp();
    await expect.poll(async () => (await only()).lease).not.toBeNull();
    const from = performance.now();
    await globalThis.stillyardJobs!.stop();
    expect(performance.now() - from).toBeLessThan(7_000);
    const left = await only();
    expect([left.state, left.lease, left.tries]).toEqual(["waiting", null, 0]);
    globalThis.stillyardJobs = undefined;
  }, 30_000);
});
