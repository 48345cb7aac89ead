import { randomBytes } from "node:crypto";
import { literal } from "sequelize";
import { afterAll, beforeAll, describe, expect, it, vi } from "vitest";
import { POST as CHECK } from "../../app/api/email-check/route";
import { POST as FORGOTTEN } from "../../app/api/forgotten-password/route";
import { POST as NEW_PASSWORD } from "../../app/api/new-password/route";
import { POST as SIGN_IN } from "../../app/api/session/route";
import { POST as SIGN_UP } from "../../app/api/sign-up/route";
import { hashPassword } from "../../app/_server/passwords";
import { Job, MailToken, Session, type User } from "../../models/index";
import { ask, buildSession, buildUser } from "../build";
import type { MailServer } from "../mailServer";
import { mailsTo, openPost, tokenIn } from "../post";

vi.mock("../../app/_server/passwordWorkers", () => import("../quickHash"));

let post: MailServer;
beforeAll(async () => {
  post = await openPost();
});
afterAll(() => post.stop());

const OLD = "what was chosen long ago";
const NEW = "what is chosen from now on";
let network = 0;
const elsewhere = () => ({ "x-stillyard-address": `203.0.113.${(network += 1)}` });
const forget = (email: string, headers = elsewhere()) => ask(FORGOTTEN, { method: "POST", body: { email }, headers });
const renew = (token: unknown, password = NEW) => ask(NEW_PASSWORD, { method: "POST", body: { token, password }, headers: elsewhere() });
const signIn = (email: string, password: string) => ask(SIGN_IN, { method: "POST", body: { email, password }, headers: elsewhere() });
const age = (user: User, ago: string) => MailToken.update({ expiresAt: literal(`expires_at - interval '${ago}'`) as unknown as Date }, { where: { userId: user.id } });

async function buildForgetful(): Promise<{ user: User; token: string }> {
  const user = await buildUser({ passwordHash: await hashPassword(OLD) });
  await forget(user.email);
  const [mail] = await mailsTo(post, user.email);
  return { user, token: tokenIn(mail!) };
}

describe("a forgotten password", () => {
  it("is replaced by way of the mailbox: all sessions end, none begins, the owner is told", async () => {
    const { user, token } = await buildForgetful();
    const { idHash } = await buildSession(user);
    const answer = await renew(token);
    expect([answer.status, await answer.json(), answer.headers.get("set-cookie")]).toEqual([200, { next: "/sign-in" }, null]);
    expect(await Session.findByPk(idHash)).toBeNull();
    expect([(await signIn(user.email, OLD)).status, (await signIn(user.email, NEW)).status]).toEqual([401, 200]);
    expect((await mailsTo(post, user.email)).map(({ subject }) => subject)).toEqual(["Your password was changed"]);
  });

  it("the answer is the same for a known and an unknown address, and only the known one gets mail", async () => {
    const user = await buildUser();
    const [known, unknown] = [await forget(user.email), await forget("nobody@yard.example")];
    expect([known.status, [...known.headers], await known.text()]).toEqual([unknown.status, [...unknown.headers], await unknown.text()]);
    expect(await mailsTo(post, user.email)).toHaveLength(1);
    expect(await mailsTo(post, "nobody@yard.example")).toEqual([]);
  });

  it.each(["known", "unknown"])("three times an hour for one %s address", async (kind) => {
    const email = kind === "known" ? (await buildUser()).email : "never@yard.example";
    const statuses = [];
    for (let count = 0; count < 4; count += 1) statuses.push((await forget(email)).status);
    expect(statuses).toEqual([202, 202, 202, 429]);
  });

  it("twenty times an hour from one address", async () => {
    const headers = { "x-stillyard-address": "198.51.100.3" };
    const statuses = [];
    for (let count = 0; count < 21; count += 1) statuses.push((await forget(`${count}@many.example`, headers)).status);
    expect(statuses).toEqual([...Array<number>(20).fill(202), 429]);
  });

  it("a password that is refused does not use the link up", async () => {
    const { token } = await buildForgetful();
    const refused = await renew(token, "short");
    expect([refused.status, (await refused.text()).includes("At least 15 characters")]).toEqual([422, true]);
    expect((await renew(token)).status).toBe(200);
  });

  it("shows at the same time that an unchecked address is theirs", async () => {
    const user = await buildUser({ emailCheckedAt: null });
    await forget(user.email);
    await renew(tokenIn((await mailsTo(post, user.email))[0]!));
    expect((await signIn(user.email, NEW)).status).toBe(200);
  });
});

describe("a link", () => {
  it("used by fifty at the same moment is used once", async () => {
    const { token } = await buildForgetful();
    const answers = await Promise.all(Array.from({ length: 50 }, () => renew(token)));
    const statuses = answers.map(({ status }) => status).sort();
    expect(statuses).toEqual([200, ...Array<number>(49).fill(404)]);
  });

  it("that is used, ended by a newer one, too old or was never made answers with the same bytes", async () => {
    const used = await buildForgetful();
    await renew(used.token);
    const ended = await buildForgetful();
    await forget(ended.user.email);
    const newer = tokenIn((await mailsTo(post, ended.user.email))[0]!);
    const late = await buildForgetful();
    await age(late.user, "31 minutes");
    const made = [used.token, ended.token, late.token, randomBytes(32).toString("base64url"), "", "x".repeat(1_900)];
    const answers = await Promise.all(made.map((token) => renew(token)));
    const texts = await Promise.all(answers.map(async (answer) => (await answer.text()).replace(/"requestId":"[^"]+"/, "")));
    expect(answers.map(({ status }) => status)).toEqual(Array(made.length).fill(404));
    expect(new Set(texts).size).toBe(1);
    expect((await renew(newer)).status).toBe(200);
  });

  it("holds half an hour for a password and a day for an address", async () => {
    const { user, token } = await buildForgetful();
    await age(user, "29 minutes");
    expect((await renew(token)).status).toBe(200);
    for (const [hours, status] of [["23 hours", 200], ["25 hours", 404]] as const) {
      const email = `${status}@hours.example`;
      await ask(SIGN_UP, { method: "POST", body: { name: "Nora", email, password: NEW, hat: "build" }, headers: elsewhere() });
      const checking = tokenIn((await mailsTo(post, email))[0]!);
      await MailToken.update({ expiresAt: literal(`expires_at - interval '${hours}'`) as unknown as Date }, { where: { purpose: "check", usedAt: null } });
      expect((await ask(CHECK, { method: "POST", body: { token: checking } })).status).toBe(status);
    }
  });

  it("of one purpose is of no use for another", async () => {
    const { token } = await buildForgetful();
    expect((await ask(CHECK, { method: "POST", body: { token } })).status).toBe(404);
    expect((await renew(token)).status).toBe(200);
  });

  it.each([[{}], [["a"]], [null], [1]])("%j is no token", async (token) => {
    expect((await renew(token)).status).toBe(422);
  });

  it("is stored nowhere: neither tokens nor jobs hold it", async () => {
    const { token } = await buildForgetful();
    expect(JSON.stringify([await MailToken.findAll(), await Job.findAll()])).not.toContain(token);
  });

  it("ended before its letter went out is not mailed", async () => {
    const user = await buildUser();
    post.mood = "451";
    await forget(user.email);
    expect(await mailsTo(post, user.email)).toEqual([]);
    post.mood = "takes";
    await MailToken.destroy({ where: { userId: user.id } });
    await Job.update({ dueAt: new Date(0) }, { where: { state: "waiting" } });
    expect(await mailsTo(post, user.email)).toEqual([]);
  });

  it("names the configured address, whatever a request says of itself", async () => {
    const user = await buildUser();
    const forged = { host: "forged.example", "x-forwarded-host": "forged.example", "x-forwarded-proto": "https", forwarded: "host=forged.example" };
    await ask(FORGOTTEN, { method: "POST", body: { email: user.email }, headers: { ...elsewhere(), ...forged } });
    await ask(SIGN_UP, { method: "POST", body: { name: "Nora", email: "forged@yard.example", password: NEW, hat: "play" }, headers: { ...elsewhere(), ...forged } });
    const mails = [...(await mailsTo(post, user.email)), ...(await mailsTo(post, "forged@yard.example"))];
    expect(mails).toHaveLength(2);
    for (const { text } of mails) {
      expect(text).toMatch(/http:\/\/localhost:3000\/(new-password|email-check)\?token=[\w-]{43}/);
      expect(text).not.toContain("forged");
    }
  });
});
