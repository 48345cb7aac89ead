import { afterAll, beforeAll, describe, expect, it, vi } from "vitest";
import { POST as SIGN_IN } from "../../app/api/session/route";
import { POST as SIGN_UP } from "../../app/api/sign-up/route";
import { POST as CHECK } from "../../app/api/email-check/route";
import { hashPassword } from "../../app/_server/passwords";
import { sweep } from "../../app/_server/jobs/sweep";
import { Membership, Session, Team, Throttle, User } from "../../models/index";
import { literal } from "sequelize";
import { ask, buildUser } from "../build";
import type { MailServer } from "../mailServer";
import { mailsTo, openPost, tokenIn } from "../post";

vi.mock("../../app/_server/passwordWorkers", () => import("../quickHash"));

let post: MailServer;
beforeAll(async () => {
  post = await openPost();
});
afterAll(() => post.stop());

const PASSWORD = "a hedge, a hammock and a hum";
let network = 0;
const elsewhere = () => ({ "x-stillyard-address": `203.0.113.${(network += 1)}` });
const signUp = (email: string, more: object = {}, headers: Record<string, string> = {}) =>
  ask(SIGN_UP, { method: "POST", body: { name: "Nora", email, password: PASSWORD, hat: "play", ...more }, headers: { ...elsewhere(), ...headers } });
const signIn = (email: string, password = PASSWORD) => ask(SIGN_IN, { method: "POST", body: { email, password }, headers: elsewhere() });
const check = (token: unknown) => ask(CHECK, { method: "POST", body: { token } });
const codeOf = async (answer: Response) => ((await answer.json()) as { error: { code: string } }).error.code;

/** All of an answer that its asker can tell apart. */
const shown = async (answer: Response) => [answer.status, [...answer.headers], await answer.text()];

describe("signing up", () => {
  it("makes an account with a team of its own that opens once the address is checked", async () => {
    expect(await shown(await signUp(" Nora@Yard.example "))).toEqual(await shown(await signUp("other@yard.example")));
    const user = await User.findOne({ where: { email: "nora@yard.example" }, rejectOnEmpty: true });
    expect([user.name, user.hat, user.emailCheckedAt]).toEqual(["Nora", "play", null]);
    const [membership] = await Membership.findAll({ where: { userId: user.id } });
    expect([membership!.role, (await Team.findByPk(membership!.teamId))!.name]).toEqual(["owner", "Nora"]);

    expect([(await signIn(user.email)).status, await Session.count({ where: { userId: user.id } })]).toEqual([403, 0]);
    const mails = await mailsTo(post, user.email);
    const answer = await check(tokenIn(mails.at(-1)!));
    expect([answer.status, await answer.json()]).toEqual([200, { next: "/sign-in" }]);
    expect((await signIn(user.email)).status).toBe(200);
  });

  it("answers a known address with the same bytes, and tells its owner by mail alone", async () => {
    const user = await buildUser({ name: "Kim", email: "kim@yard.example", passwordHash: await hashPassword("what was there before") });
    const [known, unknown] = [await signUp(user.email), await signUp("new@yard.example")];
    expect([known.status, await shown(known)]).toEqual([202, await shown(unknown)]);
    const mails = await mailsTo(post, user.email);
    expect(mails.map(({ subject }) => subject)).toEqual(["You already have an account"]);
    expect(mails[0]!.text).not.toContain("token");
    const after = await user.reload();
    expect([after.name, await User.count({ where: { email: user.email } })]).toEqual(["Kim", 1]);
    expect((await signIn(user.email, "what was there before")).status).toBe(200);
    expect(await User.count({ where: { email: literal("email like '%stillyard.invalid'") as unknown as string } })).toBe(0);
  });

  it("the same address at the same moment from ten sides makes one account", async () => {
    const answers = await Promise.all(Array.from({ length: 10 }, () => signUp("ten@yard.example")));
    expect(answers.map(({ status }) => status)).toEqual(Array(10).fill(202));
    expect(await User.count({ where: { email: "ten@yard.example" } })).toBe(1);
  });

  it("who never checked the address is replaced by who asks for it now", async () => {
    const email = "taken@yard.example";
    await signUp(email, { name: "Stranger", password: "the stranger's own words" });
    const [first] = await mailsTo(post, email);
    await signUp(email, { name: "Owner" });
    const [second] = await mailsTo(post, email);
    expect((await check(tokenIn(first!))).status).toBe(404);
    expect((await check(tokenIn(second!))).status).toBe(200);
    expect([(await signIn(email, "the stranger's own words")).status, (await signIn(email)).status]).toEqual([401, 200]);
  });

  it("the right password before the address is checked says so, and the letter goes again at most every five minutes", async () => {
    const email = "early@yard.example";
    await signUp(email);
    await mailsTo(post, email);
    expect(await codeOf(await signIn(email, "not the one that was chosen"))).toBe("signed out");
    expect(await mailsTo(post, email)).toEqual([]);
    for (let count = 0; count < 3; count += 1) expect(await codeOf(await signIn(email))).toBe("unchecked");
    const mails = await mailsTo(post, email);
    expect(mails).toHaveLength(1);
    expect((await check(tokenIn(mails[0]!))).status).toBe(200);
  });

  it("an account whose address was not checked within a week goes with its team", async () => {
    await signUp("late@yard.example");
    const user = await User.findOne({ where: { email: "late@yard.example" }, rejectOnEmpty: true });
    const { teamId } = (await Membership.findOne({ where: { userId: user.id }, rejectOnEmpty: true }));
    await user.update({ createdAt: literal("now() - interval '6 days'") as unknown as Date });
    await sweep();
    expect(await User.findByPk(user.id)).not.toBeNull();
    await user.update({ createdAt: literal("now() - interval '8 days'") as unknown as Date });
    await sweep();
    expect([await User.findByPk(user.id), await Team.findByPk(teamId)]).toEqual([null, null]);
  });

  it("from one address three times in three hours", async () => {
    const headers = { "x-stillyard-address": "198.51.100.1" };
    const statuses = [];
    for (const name of ["a", "b", "c", "d"]) statuses.push((await signUp(`${name}@three.example`, {}, headers)).status);
    expect(statuses).toEqual([202, 202, 202, 429]);
    const refused = await signUp("e@three.example", {}, headers);
    expect(Number(refused.headers.get("retry-after"))).toBeGreaterThan(10_700);
    expect((await signUp("e@three.example", {}, { "x-stillyard-address": "198.51.100.2" })).status).toBe(202);
    expect(JSON.stringify(await Throttle.findAll())).not.toContain("198.51.100");
  });
});

describe("what is refused beside its field", () => {
  const faultsOf = async (answer: Response) => ((await answer.json()) as { error: { fields: Record<string, string> } }).error.fields;

  it.each<[string, object, string]>([
    ["no address", { email: "nora" }, "email"],
    ["no name", { name: "   " }, "name"],
    ["a name with a line of its own", { name: "Nora\nBuy now" }, "name"],
    ["a name of 121 characters", { name: "n".repeat(121) }, "name"],
    ["no hat of ours", { hat: "owner" }, "hat"],
    ["a short password", { password: "fourteen signs" }, "password"],
    ["a field that is none", { role: "owner" }, ""],
  ])("%s", async (_, fields, field) => {
    const answer = await signUp("field@yard.example", fields);
    expect(answer.status).toBe(422);
    if (field) expect(Object.keys(await faultsOf(answer))).toEqual([field]);
    expect(await User.count({ where: { email: "field@yard.example" } })).toBe(0);
  });

  it("a refused form is no try", async () => {
    const headers = { "x-stillyard-address": "198.51.100.9" };
    for (let count = 0; count < 5; count += 1) await signUp("f@yard.example", { password: "short" }, headers);
    expect((await signUp("f@yard.example", {}, headers)).status).toBe(202);
  });
});
