import { createHash, randomBytes } from "node:crypto";
import { sealData } from "iron-session";
import { literal } from "sequelize";
import { beforeAll, describe, expect, it } from "vitest";
import { DELETE, POST } from "../../app/api/session/route";
import { PATCH as SETTINGS } from "../../app/api/me/route";
import { GET } from "../../app/api/projects/[projectId]/route";
import { cookieName, unsealId } from "../../app/_server/cookies";
import { hashPassword, matchesPassword } from "../../app/_server/passwords";
import { Session, type User } from "../../models/index";
import { ask, buildSession, buildUser } from "../build";
import { buildStage, type Stage } from "./actors";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

const open = (cookie?: string) => ask(GET, { cookie, params: { projectId: stage.project.id } });
const PASSWORD = "a quiet yard behind the house";

/** Moves the moments of a session back by the database's own clock. */
async function age(idHash: string, moments: Partial<Record<"beganAt" | "issuedAt" | "seenAt" | "replacedAt", string>>) {
  const values = Object.fromEntries(Object.entries(moments).map(([field, ago]) => [field, literal(`now() - interval '${ago}'`)]));
  await Session.update(values, { where: { idHash }, fields: Object.keys(values) as (keyof Session)[] as never });
}

const cookieIn = (answer: Response) => answer.headers.get("set-cookie")!.split(";")[0]!;
const keyOf = async (cookie: string) => createHash("sha256").update((await unsealId(cookie.split("=").slice(1).join("=")))!).digest("hex");

describe("the cookie", () => {
  it("holds a sealed id of 256 bits and nothing else, in under 512 bytes", async () => {
    const user = await buildUser({ email: "cookie@stillyard.example", passwordHash: await hashPassword(PASSWORD) });
    const answer = await ask(POST, { method: "POST", body: { email: " Cookie@Stillyard.example ", password: PASSWORD } });
    expect([answer.status, await answer.json()]).toEqual([200, { next: "/projects" }]);
    const header = answer.headers.getSetCookie()[0]!;
    expect(header).toMatch(/^__Host-stillyard=/);
    expect(header.split("; ").slice(1).sort()).toEqual(["HttpOnly", "Path=/", "SameSite=Lax", "Secure"]);
    expect(header.length).toBeLessThan(512);
    const id = await unsealId(cookieIn(answer).slice(cookieName().length + 1));
    expect(Buffer.from(id!, "base64url")).toHaveLength(32);
    const rows = await Session.findAll({ where: { userId: user.id } });
    expect(JSON.stringify(rows)).not.toContain(id);
    expect(await keyOf(cookieIn(answer))).toBe(rows[0]!.idHash);
  });

  it("stays for who asks to be kept", async () => {
    await buildUser({ email: "keep@stillyard.example", passwordHash: await hashPassword(PASSWORD) });
    const answer = await ask(POST, { method: "POST", body: { email: "keep@stillyard.example", password: PASSWORD, keep: true } });
    expect(answer.headers.get("set-cookie")).toContain("Max-Age=2592000");
  });
});

describe("replayed cookies", () => {
  it("signed out: ended for every copy", async () => {
    const { cookie } = await buildSession(stage.users.client);
    expect((await open(cookie)).status).toBe(200);
    const answer = await ask(DELETE, { method: "DELETE", cookie });
    expect([answer.status, answer.headers.get("clear-site-data")]).toEqual([204, '"cache"']);
    expect(answer.headers.get("set-cookie")).toContain("Max-Age=0");
    expect((await open(cookie)).status).toBe(401);
  });

  it("signed out a moment after a new id was given: neither id holds, whichever signs out", async () => {
    for (const leaver of ["old", "new"] as const) {
      const { cookie, idHash } = await buildSession(stage.users.client, true);
      await age(idHash, { issuedAt: "25 hours", beganAt: "25 hours" });
      const renewed = cookieIn(await open(cookie));
      const other = await buildSession(stage.users.client, true);
      await ask(DELETE, { method: "DELETE", cookie: leaver === "old" ? cookie : renewed });
      expect([(await open(cookie)).status, (await open(renewed)).status, (await open(other.cookie)).status]).toEqual([401, 401, 200]);
    }
  });

  it("sealed with another key", async () => {
    const { id } = await buildSession(stage.users.client);
    const seal = await sealData({ id }, { password: { 1: randomBytes(32).toString("base64url") }, ttl: 0 });
    expect((await open(`${cookieName()}=${seal}`)).status).toBe(401);
  });

  it("one bit flipped, anywhere", async () => {
    const { cookie } = await buildSession(stage.users.client);
    const start = cookieName().length + 1;
    for (let at = start; at < cookie.length; at += 7) {
      const flipped = String.fromCharCode(cookie.charCodeAt(at) ^ 1);
      if (flipped === ";" || flipped === cookie[at]) continue;
      const answer = await open(cookie.slice(0, at) + flipped + cookie.slice(at + 1));
      // The last letter of base64 carries bits that mean nothing; there the seal is the same.
      if (answer.status !== 401) expect(at).toBeGreaterThan(cookie.length - 4);
    }
  });

  it.each([["", 401], ["x", 401], ["Fe26.2*1*2*3", 401], ["y".repeat(4000), 401]])("made up: %s", async (seal, status) => {
    expect((await open(`${cookieName()}=${seal}`)).status).toBe(status);
  });

  it.each<[string, "client" | "owner", boolean, Parameters<typeof age>[1], number]>([
    ["idle 11 h", "client", false, { seenAt: "11 hours" }, 200],
    ["idle 13 h", "client", false, { seenAt: "13 hours" }, 401],
    ["kept, idle 6 days", "client", true, { seenAt: "6 days", beganAt: "6 days" }, 200],
    ["kept, idle 8 days", "client", true, { seenAt: "8 days", beganAt: "8 days" }, 401],
    ["kept, 31 days in all", "client", true, { beganAt: "31 days" }, 401],
    ["a member idle 3 h", "owner", true, { seenAt: "3 hours" }, 200],
    ["a member idle 5 h", "owner", true, { seenAt: "5 hours" }, 401],
    ["a member after 23 h", "owner", true, { beganAt: "23 hours" }, 200],
    ["a member after 25 h", "owner", true, { beganAt: "25 hours" }, 401],
    ["replaced 50 s ago", "client", false, { replacedAt: "50 seconds" }, 200],
    ["replaced 70 s ago", "client", false, { replacedAt: "70 seconds" }, 401],
  ])("%s", async (_, who, keep, moments, status) => {
    const { cookie, idHash } = await buildSession(stage.users[who], keep);
    await age(idHash, moments);
    expect((await open(cookie)).status).toBe(status);
  });
});

describe("a new id", () => {
  it("each day, once, though ten ask at the same moment; the old one holds a minute more", async () => {
    const { cookie, idHash } = await buildSession(stage.users.client, true);
    await age(idHash, { issuedAt: "25 hours", beganAt: "25 hours" });
    const answers = await Promise.all(Array.from({ length: 10 }, () => open(cookie)));
    expect(answers.map(({ status }) => status)).toEqual(Array(10).fill(200));
    const fresh = answers.filter(({ headers }) => headers.has("set-cookie"));
    expect(fresh).toHaveLength(1);
    const renewed = cookieIn(fresh[0]!);
    const [before, after] = [await Session.findByPk(idHash), await Session.findByPk(await keyOf(renewed))];
    expect(after!.beganAt).toEqual(before!.beganAt);
    expect((await open(renewed)).status).toBe(200);
    expect((await open(cookie)).status).toBe(200);
    await age(idHash, { replacedAt: "61 seconds" });
    expect((await open(cookie)).status).toBe(401);
    expect((await open(renewed)).status).toBe(200);
  });

  it("at sign-in, and the session of that browser ends", async () => {
    const user = await buildUser({ email: "again@stillyard.example", passwordHash: await hashPassword(PASSWORD) });
    const { cookie, idHash } = await buildSession(user);
    const answer = await ask(POST, { method: "POST", cookie, body: { email: user.email, password: PASSWORD } });
    expect(cookieIn(answer)).not.toBe(cookie);
    expect(await Session.findByPk(idHash)).toBeNull();
  });

  it("ten sessions at most: the one seen longest ago goes", async () => {
    const user = await buildUser({ email: "many@stillyard.example", passwordHash: await hashPassword(PASSWORD) });
    const sessions = [];
    for (let count = 0; count < 10; count += 1) sessions.push(await buildSession(user));
    await age(sessions[4]!.idHash, { seenAt: "2 hours" });
    await ask(POST, { method: "POST", body: { email: user.email, password: PASSWORD } });
    expect(await Session.count({ where: { userId: user.id } })).toBe(10);
    expect(await Session.findByPk(sessions[4]!.idHash)).toBeNull();
  });
});

it("an id that was replaced goes before any that holds", async () => {
  const user = await buildUser({ email: "replaced@stillyard.example", passwordHash: await hashPassword(PASSWORD) });
  const sessions = [];
  for (let count = 0; count < 10; count += 1) sessions.push(await buildSession(user));
  await age(sessions[2]!.idHash, { seenAt: "2 hours" });
  await age(sessions[7]!.idHash, { replacedAt: "30 seconds" });
  await ask(POST, { method: "POST", body: { email: user.email, password: PASSWORD } });
  expect(await Session.findByPk(sessions[7]!.idHash)).toBeNull();
  expect(await Session.findByPk(sessions[2]!.idHash)).not.toBeNull();
});

describe("signing in", () => {
  const tryOf = async (email: string, password: string) => {
    const answer = await ask(POST, { method: "POST", body: { email, password } });
    const { error } = (await answer.json()) as { error: Record<string, unknown> };
    delete error.requestId;
    return { status: answer.status, error, cookies: answer.headers.get("set-cookie") };
  };

  it("an unknown address and a wrong password get the same answer after the same work", async () => {
    const user = await buildUser({ email: "known@stillyard.example", passwordHash: await hashPassword(PASSWORD) });
    await tryOf("warm@stillyard.example", PASSWORD);
    const times = { known: [] as number[], unknown: [] as number[] };
    for (let round = 0; round < 3; round += 1) {
      for (const who of ["known", "unknown"] as const) {
        const from = performance.now();
        expect(await tryOf(who === "known" ? user.email : "unknown@stillyard.example", "not this one at all")).toEqual({
          status: 401,
          error: { code: "signed out", message: "E-mail and password do not fit together." },
          cookies: null,
        });
        times[who].push(performance.now() - from);
      }
    }
    // Without the work an unknown address would be answered in a few milliseconds.
    expect(Math.min(...times.unknown)).toBeGreaterThan(Math.min(...times.known) / 2);
  });

  it("a hash of older, lesser cost is made anew with the password that fits, and with no other", async () => {
    const older = await hashPassword(PASSWORD, 10);
    const user = await buildUser({ email: "older@stillyard.example", passwordHash: older });
    await tryOf(user.email, "not this one at all");
    expect((await user.reload()).passwordHash).toBe(older);
    const enter = () => ask(POST, { method: "POST", body: { email: user.email, password: PASSWORD } });
    expect((await enter()).status).toBe(200);
    const { passwordHash } = await user.reload();
    expect(passwordHash).toMatch(/^\$2[aby]\$12\$/);
    expect((await enter()).status).toBe(200);
    expect((await user.reload()).passwordHash).toBe(passwordHash);
  });

  it("passwords that differ only after their 72nd byte are different", async () => {
    for (const length of [73, 200]) {
      const hash = await hashPassword("a".repeat(length));
      expect(await matchesPassword("a".repeat(length), hash)).toBe(true);
      expect(await matchesPassword("a".repeat(length - 1) + "b", hash)).toBe(false);
      expect(await matchesPassword("a".repeat(length - 1), hash)).toBe(false);
    }
  });

  it.each([["/projects/x", "/projects/x"], ["//elsewhere.example", "/projects"], ["/\\elsewhere.example", "/projects"], ["https://elsewhere.example", "/projects"], ["/api/session", "/projects"]])(
    "the way back %s leads to %s",
    async (next, address) => {
      const email = `${randomBytes(4).toString("hex")}@stillyard.example`;
      await buildUser({ email, passwordHash: await hashPassword(PASSWORD) });
      const answer = await ask(POST, { method: "POST", body: { email, password: PASSWORD, next } });
      expect(await answer.json()).toEqual({ next: address });
    },
  );

  it.each([[{}], [{ email: ["a"], password: PASSWORD }], [{ email: { "$ne": 1 }, password: PASSWORD }], [{ email: "a", password: PASSWORD, role: "owner" }]])("refuses %j", async (body) => {
    expect((await ask(POST, { method: "POST", body })).status).toBe(422);
  });

  it("when more than two work and twenty wait, the next is asked to come back", async () => {
    const tries = await Promise.all(Array.from({ length: 26 }, (_, count) => ask(POST, { method: "POST", body: { email: `q${count}@stillyard.example`, password: PASSWORD } })));
    const statuses = tries.map(({ status }) => status);
    expect(statuses.filter((status) => status === 503).length).toBeGreaterThanOrEqual(3);
    expect(statuses.filter((status) => status === 401).length).toBeGreaterThanOrEqual(20);
    expect(tries.find(({ status }) => status === 503)!.headers.get("retry-after")).toBe("5");
  });
});

it("a reader keeps a theme of their own, and nothing else can be set there", async () => {
  const user: User = stage.users.client;
  const cookie = (await buildSession(user)).cookie;
  expect((await ask(SETTINGS, { method: "PATCH", cookie, body: { theme: "dark" } })).status).toBe(204);
  expect((await user.reload()).theme).toBe("dark");
  for (const body of [{ theme: "red" }, { theme: "dark", email: "x@stillyard.example" }, { passwordHash: "x" }]) {
    expect((await ask(SETTINGS, { method: "PATCH", cookie, body })).status).toBe(422);
  }
});
