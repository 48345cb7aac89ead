import fc from "fast-check";
import { literal } from "sequelize";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { POST } from "../../app/api/session/route";
import { browserCookieName } from "../../app/_server/cookies";
import { networkOf } from "../../app/_server/accounts/throttles";
import { judge, rules } from "../../app/_server/accounts/throttleRules";
import { hashPassword } from "../../app/_server/passwords";
import { KnownBrowser, Throttle, type User } from "../../models/index";
import { ask, buildUser } from "../build";
import { hashing } from "../quickHash";

vi.mock("../../app/_server/passwordWorkers", () => import("../quickHash"));

const PASSWORD = "known to its owner and nobody else";
let user: User;
beforeEach(async () => {
  await Throttle.destroy({ truncate: true });
  user = await buildUser({ passwordHash: await hashPassword(PASSWORD) });
  hashing.compared = 0;
});

interface Try {
  email?: string;
  password?: string;
  address?: string;
  cookie?: string;
}
const enter = ({ email = user.email, password = "a guess like any other guess", address = "192.0.2.1", cookie }: Try = {}) =>
  ask(POST, { method: "POST", body: { email, password }, cookie, headers: { "x-stillyard-address": address } });

/** Lets so many seconds pass for every count. */
const pass = (seconds: number) => {
  const earlier = (column: string) => literal(`${column} - interval '${seconds} seconds'`) as unknown as Date;
  return Throttle.update({ since: earlier("since"), lastAt: earlier("last_at") }, { where: { tries: [...Array(1_001).keys()] } });
};

const browserIn = (answer: Response) => answer.headers.getSetCookie().find((cookie) => cookie.startsWith(browserCookieName()))!.split(";")[0]!;

describe("a thousand guesses at one account", () => {
  it.each([["one address", 1], ["a hundred addresses", 100]])("from %s in 15 minutes: at most 30 reach the hash, and the owner gets in", async (_, addresses) => {
    const cookie = browserIn(await enter({ password: PASSWORD, address: "192.0.2.200" }));
    hashing.compared = 0;
    for (let step = 0; step < 100; step += 1) {
      await Promise.all(Array.from({ length: 10 }, (_, place) => enter({ address: `198.51.100.${(step * 10 + place) % addresses}` })));
      await pass(9);
    }
    expect(hashing.compared).toBeGreaterThanOrEqual(5);
    expect(hashing.compared).toBeLessThanOrEqual(30);
    expect((await enter({ password: PASSWORD, cookie, address: "198.51.100.0" })).status).toBe(200);
  });

  it("all at the same moment: five reach the hash, and one more for each second that it takes", async () => {
    const from = performance.now();
    const answers = await Promise.all(Array.from({ length: 200 }, (_, place) => enter({ address: `198.51.100.${place}` })));
    expect(hashing.compared).toBeGreaterThanOrEqual(5);
    expect(hashing.compared).toBeLessThanOrEqual(5 + (performance.now() - from) / 1_000);
    expect(answers.filter(({ status }) => status === 429).length).toBe(200 - hashing.compared);
  });

  it("at an account that is none take the same course", async () => {
    const email = "nobody@yard.example";
    const answers = [];
    for (let count = 0; count < 7; count += 1) answers.push(await enter({ email }));
    expect(answers.map(({ status }) => status)).toEqual([401, 401, 401, 401, 401, 429, 429]);
    expect(hashing.compared).toBe(5);
  });
});

describe("after five failures", () => {
  it("the answer says how long to wait, in a header and in words; waiting helps, and a refused try costs nothing", async () => {
    for (let count = 0; count < 5; count += 1) await enter();
    for (const wait of [1, 2, 4]) {
      const refused = await enter();
      const { error } = (await refused.json()) as { error: { code: string; message: string } };
      expect([refused.status, error.code, Number(refused.headers.get("retry-after"))]).toEqual([429, "too many", wait]);
      expect(error.message).toMatch(/^Too many tries\. Wait (a second|\d seconds), then try again\.$/);
      await pass(wait);
      expect((await enter()).status).toBe(401);
    }
  });

  it("the right password within its turn begins the count anew", async () => {
    for (let count = 0; count < 5; count += 1) await enter();
    await pass(1);
    expect((await enter({ password: PASSWORD })).status).toBe(200);
    const statuses = [];
    for (let count = 0; count < 5; count += 1) statuses.push((await enter()).status);
    expect(statuses).toEqual(Array(5).fill(401));
  });

  it("the wait grows to 15 minutes and no further, and is forgotten after a quiet time", () => {
    const rule = rules["sign-in of an account"];
    const start = new Date("2026-03-01T12:00:00Z");
    const later = (seconds: number) => new Date(start.getTime() + seconds * 1_000);
    for (const tries of [15, 40, 400]) {
      expect(judge(rule, { tries, since: start, lastAt: start }, later(1)).wait).toBe(899);
      expect(judge(rule, { tries, since: start, lastAt: start }, later(900)).next).toMatchObject({ tries: tries + 1 });
      expect(judge(rule, { tries, since: start, lastAt: start }, later(1_801)).next).toMatchObject({ tries: 1 });
    }
  });

  it("no course of tries gets more than 30 of them through in 15 minutes", () => {
    const rule = rules["sign-in of an account"];
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 60_000 }), { maxLength: 400 }), (gaps) => {
        const through: number[] = [];
        let at = 0;
        let count = { tries: 0, since: new Date(0), lastAt: new Date(0) };
        for (const gap of gaps) {
          at += gap;
          const { next } = judge(rule, count, new Date(at));
          if (next) through.push(at);
          count = next ?? count;
        }
        return through.every((from) => through.filter((moment) => moment >= from && moment < from + 900_000).length <= 30);
      }),
    );
  });
});

describe("from one address", () => {
  it("fifty failures in 15 minutes, whatever the account; another address goes on", async () => {
    const statuses = [];
    for (let count = 0; count < 52; count += 1) statuses.push((await enter({ email: `${count}@yard.example` })).status);
    expect(statuses).toEqual([...Array<number>(50).fill(401), 429, 429]);
    expect((await enter({ address: "192.0.2.2" })).status).toBe(401);
    await pass(901);
    expect((await enter({ email: "x@yard.example" })).status).toBe(401);
  });

  it("who gets in was no failure", async () => {
    for (let count = 0; count < 55; count += 1) expect((await enter({ password: PASSWORD })).status).toBe(200);
  });

  it.each([
    ["192.0.2.1", "192.0.2.1"],
    ["::ffff:192.0.2.1", "192.0.2.1"],
    ["2001:db8:1:2:3:4:5:6", "2001:db8:1:2"],
    ["2001:0DB8:0001:0002::9", "2001:db8:1:2"],
    ["2001:db8::1", "2001:db8:0:0"],
    ["::1", "0:0:0:0"],
    ["fe80::1%eth0", "fe80:0:0:0"],
  ])("%s is counted as %s", (address, network) => {
    expect(networkOf(new Request("http://localhost", { headers: { "x-stillyard-address": address } }))).toBe(network);
  });
});

describe("a browser that signed in before", () => {
  it("has a count of its own, for this account only", async () => {
    const cookie = browserIn(await enter({ password: PASSWORD }));
    for (let count = 0; count < 6; count += 1) await enter();
    expect((await enter()).status).toBe(429);
    const statuses = [];
    for (let count = 0; count < 6; count += 1) statuses.push((await enter({ cookie })).status);
    expect(statuses).toEqual([...Array<number>(5).fill(401), 429]);

    const other = await buildUser({ passwordHash: await hashPassword(PASSWORD) });
    for (let count = 0; count < 5; count += 1) await enter({ email: other.email });
    expect((await enter({ email: other.email, cookie })).status).toBe(429);
  });

  it("keeps its id through further sign-ins, and only the id's hash is stored", async () => {
    const cookie = browserIn(await enter({ password: PASSWORD }));
    await enter({ password: PASSWORD, cookie });
    expect(await KnownBrowser.count({ where: { userId: user.id } })).toBe(1);
    const answer = await enter({ password: PASSWORD });
    expect(answer.headers.getSetCookie().find((one) => one.startsWith(browserCookieName()))).toMatch(/; Path=\/; HttpOnly; SameSite=Lax; Secure; Max-Age=34560000$/);
    expect(await KnownBrowser.count({ where: { userId: user.id } })).toBe(2);
  });

  it("made up, it is known to nobody", async () => {
    for (let count = 0; count < 6; count += 1) await enter();
    expect((await enter({ cookie: `${browserCookieName()}=Fe26.2*1*2*3` })).status).toBe(429);
  });
});
