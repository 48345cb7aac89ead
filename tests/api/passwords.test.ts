import { readFileSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { POST as CHANGE } from "../../app/api/password/route";
import { POST as PROOF } from "../../app/api/proof/route";
import { POST as SIGN_IN } from "../../app/api/session/route";
import { PATCH as SETTINGS } from "../../app/api/me/route";
import { passwordFault } from "../../app/_server/accounts/passwordRules";
import { requireProof } from "../../app/_server/accounts/proof";
import { identify } from "../../app/_server/identity";
import { hashPassword } from "../../app/_server/passwords";
import people from "../../data/examples/people.json";
import { literal } from "sequelize";
import { Session, type User } from "../../models/index";
import { ask, buildSession, buildUser, hashOf } from "../build";
import type { MailServer } from "../mailServer";
import { mailsTo, openPost } from "../post";

let post: MailServer;
beforeAll(async () => {
  post = await openPost();
});
afterAll(() => post.stop());

const OLD = "the first of two long phrases";
const NEW = "and this is the second of them";
const nora = { name: "Nora Ellery", email: "n.ellery@workshop.example" };
let network = 0;
const elsewhere = () => ({ "x-stillyard-address": `203.0.113.${(network += 1)}` });
const cookieIn = (answer: Response) => answer.headers.get("set-cookie")!.split(";")[0]!;
const sealIn = (cookie: string) => cookie.slice(cookie.indexOf("=") + 1);
const holds = async (cookie: string) => (await ask(SETTINGS, { method: "PATCH", cookie, body: { theme: "dark" } })).status === 204;
const codeOf = async (answer: Response) => ((await answer.json()) as { error: { code: string } }).error.code;

describe("what a password may be", () => {
  it.each([
    ["fourteen signs", /At least 15/],
    ["🥁🥁 fourteen in", /At least 15/],
    ["x y".repeat(43), /At most 128/],
    ["passwordpassword", /first that anybody/],
    ["Password1234567890", /first that anybody/],
    ["12345678901234567890", /first that anybody/],
    ["qwertyuiopqwertyuiop", /first that anybody/],
    ["aaaaaaaaaaaaaaaaaaaa", /first that anybody/],
    ["sunshine dragon 2024!", /first that anybody/],
    ["Stillyard stillyard 7", /made of names/],
    ["noraellery2024noraellery", /made of names/],
    ["Workshop-Ellery-99", /made of names/],
  ])("%s is refused", (password, words) => expect(passwordFault(password, nora)).toMatch(words));

  it.each([OLD, "correct horse battery staple", "größere Ruhe hinterm Zaun", "nora likes a very quiet yard", "x".repeat(3) + " marks the quiet spot", ...people.map(({ password }) => password)])(
    "%s is taken",
    (password) => expect(passwordFault(password, nora)).toBeUndefined(),
  );

  it("the list holds ten thousand different ones and says where it is from", () => {
    const lines = readFileSync("data/common-passwords.txt", "utf8").trim().split("\n");
    const marks = lines.filter((line) => !line.startsWith("#"));
    expect([marks.length, new Set(marks).size, marks.every((mark) => /^[\w-]{8}$/.test(mark))]).toEqual([10_000, 10_000, true]);
    expect(lines.find((line) => line.startsWith("# Source:"))).toBeDefined();
  });
});

describe("changing it", () => {
  let user: User;
  const change = (cookie: string | undefined, body: object) => ask(CHANGE, { method: "POST", cookie, body, headers: { "user-agent": "Firefox/1 (X11; Linux)" } });
  beforeAll(async () => {
    user = await buildUser({ name: "Nora", passwordHash: await hashPassword(OLD) });
  });

  it("asks for the one that holds, and for a good one", async () => {
    const { cookie } = await buildSession(user);
    const wrong = await change(cookie, { current: NEW, password: NEW });
    expect([wrong.status, Object.keys(((await wrong.json()) as { error: { fields: object } }).error.fields)]).toEqual([422, ["current"]]);
    const poor = await change(cookie, { current: OLD, password: "passwordpassword" });
    expect([poor.status, Object.keys(((await poor.json()) as { error: { fields: object } }).error.fields)]).toEqual([422, ["password"]]);
    expect((await change(undefined, { current: OLD, password: NEW })).status).toBe(401);
    expect(await holds(cookie)).toBe(true);
  });

  it("ends every session, gives this browser a new one, and a letter tells the owner", async () => {
    const [mine, other] = [await buildSession(user, true), await buildSession(user)];
    const answer = await change(mine.cookie, { current: OLD, password: NEW });
    expect([answer.status, answer.headers.get("set-cookie")]).toEqual([204, expect.stringContaining("Max-Age=2592000")]);
    expect([await holds(mine.cookie), await holds(other.cookie), await holds(cookieIn(answer))]).toEqual([false, false, true]);
    expect(await Session.count({ where: { userId: user.id } })).toBe(1);
    expect((await mailsTo(post, user.email)).map(({ subject }) => subject)).toEqual(["Your password was changed"]);
    const enter = (password: string) => ask(SIGN_IN, { method: "POST", body: { email: user.email, password }, headers: elsewhere() });
    expect([(await enter(OLD)).status, (await enter(NEW)).status]).toEqual([401, 200]);
  });

  it("is not guessed through an open session: of twenty tries at the same moment five are looked at", async () => {
    const { cookie } = await buildSession(user);
    const guess = () => change(cookie, { current: "a guess of whoever found it", password: NEW });
    const answers = await Promise.all(Array.from({ length: 20 }, guess));
    expect(answers.map(({ status }) => status).sort()).toEqual([...Array<number>(5).fill(422), ...Array<number>(15).fill(429)]);
  });
});

describe("the password again", () => {
  let user: User;
  beforeAll(async () => {
    user = await buildUser({ passwordHash: await hashPassword(OLD) });
  });
  const prove = (cookie: string, password = OLD) => ask(PROOF, { method: "POST", cookie, body: { password } });
  const age = (idHash: string, ago: string) => Session.update({ provedAt: literal(`now() - interval '${ago}'`) as unknown as Date }, { where: { idHash } });
  const asked = async (cookie: string) => {
    const reader = (await identify(sealIn(cookie)))!;
    try {
      requireProof(reader);
      return "passes";
    } catch (thrown) {
      return (thrown as { code: string }).code;
    }
  };

  it.each([["9 minutes", "passes"], ["11 minutes", "reauthenticate"]])("given %s ago: %s", async (ago, outcome) => {
    const { cookie, idHash } = await buildSession(user);
    await age(idHash, ago);
    expect(await asked(cookie)).toBe(outcome);
  });

  it("gives the session a new id with the proof; the old one holds a minute, without it", async () => {
    const { cookie, idHash } = await buildSession(user);
    await age(idHash, "2 hours");
    const answer = await prove(cookie);
    expect(answer.status).toBe(204);
    expect([await asked(cookieIn(answer)), await asked(cookie)]).toEqual(["passes", "reauthenticate"]);
    const [before, after] = [await Session.findByPk(idHash), await Session.findOne({ where: { userId: user.id, replacedAt: null }, order: [["issuedAt", "DESC"]] })];
    expect([after!.handle, after!.beganAt]).toEqual([before!.handle, before!.beganAt]);
    await Session.update({ replacedAt: literal("now() - interval '61 seconds'") as unknown as Date }, { where: { idHash } });
    expect([await holds(cookie), await holds(cookieIn(answer))]).toEqual([false, true]);
  });

  it("a daily change of the id brings no proof", async () => {
    const { cookie, idHash } = await buildSession(user, true);
    await age(idHash, "2 hours");
    await Session.update({ issuedAt: literal("now() - interval '25 hours'") as unknown as Date }, { where: { idHash } });
    const answer = await ask(SETTINGS, { method: "PATCH", cookie, body: { theme: "dark" } });
    expect(await asked(cookieIn(answer))).toBe("reauthenticate");
  });

  it("is refused where it is another one", async () => {
    const { cookie, id } = await buildSession(user);
    const answer = await prove(cookie, NEW);
    expect([answer.status, await codeOf(answer)]).toEqual([422, "invalid"]);
    expect((await Session.findByPk(hashOf(id)))!.replacedAt).toBeNull();
  });
});
