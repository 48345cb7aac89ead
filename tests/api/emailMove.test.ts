import { literal } from "sequelize";
import { afterAll, beforeAll, expect, it, vi } from "vitest";
import { POST as WISH } from "../../app/api/email/route";
import { POST as MOVE } from "../../app/api/email-move/route";
import { POST as UNDO } from "../../app/api/email-undo/route";
import { POST as SIGN_IN } from "../../app/api/session/route";
import { hashPassword } from "../../app/_server/passwords";
import { MailToken, Session, type User } from "../../models/index";
import { ask, buildSession, buildUser } from "../build";
import type { MailServer } from "../mailServer";
import { mailsTo, openPost, tokenIn } from "../post";

vi.mock("../../app/_server/passwordWorkers", () => import("../quickHash"));

let post: MailServer;
beforeAll(async () => {
  post = await openPost();
});
afterAll(() => post.stop());

const PASSWORD = "known to its owner and nobody else";
const build = async () => buildUser({ passwordHash: await hashPassword(PASSWORD) });
const wish = (cookie: string, email: string) => ask(WISH, { method: "POST", cookie, body: { email } });
const use = (route: typeof MOVE, token: string) => ask(route, { method: "POST", body: { token } });
const enter = async (email: string) => (await ask(SIGN_IN, { method: "POST", body: { email, password: PASSWORD } })).status;
const age = (user: User, ago: string) => MailToken.update({ expiresAt: literal(`expires_at - interval '${ago}'`) as unknown as Date }, { where: { userId: user.id } });

async function askToMove(email: string) {
  const user = await build();
  const { cookie, idHash } = await buildSession(user);
  expect((await wish(cookie, email)).status).toBe(202);
  const move = (await mailsTo(post, email))[0];
  const undo = (await mailsTo(post, user.email))[0]!;
  return { user, cookie, idHash, move, undo };
}

it("an account moves when the new mailbox says so, and not before", async () => {
  const { user, move } = await askToMove("new1@yard.example");
  expect([await enter("new1@yard.example"), await enter(user.email)]).toEqual([401, 200]);
  expect((await use(MOVE, tokenIn(move!))).status).toBe(200);
  expect([await enter("new1@yard.example"), await enter(user.email)]).toEqual([200, 401]);
  expect((await use(MOVE, tokenIn(move!))).status).toBe(404);
});

it("the old mailbox takes it back for seven days: sessions and password end, a new password is chosen there", async () => {
  const { user, cookie, move, undo } = await askToMove("new2@yard.example");
  await use(MOVE, tokenIn(move!));
  await age(user, "6 days");
  expect((await use(UNDO, tokenIn(undo))).status).toBe(200);
  expect(await Session.count({ where: { userId: user.id } })).toBe(0);
  expect((await wish(cookie, "new3@yard.example")).status).toBe(401);
  expect([(await user.reload()).email, await enter(user.email), await enter("new2@yard.example")]).toEqual([undo.to, 401, 401]);
  expect((await mailsTo(post, user.email)).map(({ subject }) => subject)).toEqual(["A new password"]);
});

it("whoever moved it cannot cut the way back off by moving on, nor take it again by a way back of their own", async () => {
  const { user, cookie, move, undo } = await askToMove("thief1@yard.example");
  const old = user.email;
  await use(MOVE, tokenIn(move!));
  await wish(cookie, "thief2@yard.example");
  const theirs = (await mailsTo(post, "thief1@yard.example")).at(-1)!;
  expect((await use(UNDO, tokenIn(undo))).status).toBe(200);
  expect((await use(UNDO, tokenIn(theirs))).status).toBe(404);
  expect((await user.reload()).email).toBe(old);
});

it("who only typed an address at sign-up keeps nobody from moving to it, or back to it", async () => {
  const { user, move, undo } = await askToMove("typed@yard.example");
  await buildUser({ email: "typed@yard.example", emailCheckedAt: null });
  expect((await use(MOVE, tokenIn(move!))).status).toBe(200);
  await buildUser({ email: user.email, emailCheckedAt: null });
  expect((await use(UNDO, tokenIn(undo))).status).toBe(200);
});

it("taken back before it was made, it can no longer be made", async () => {
  const { move, undo } = await askToMove("new4@yard.example");
  await use(UNDO, tokenIn(undo));
  expect((await use(MOVE, tokenIn(move!))).status).toBe(404);
});

it("the link holds an hour, the way back seven days", async () => {
  const { user, move, undo } = await askToMove("new5@yard.example");
  await age(user, "61 minutes");
  expect((await use(MOVE, tokenIn(move!))).status).toBe(404);
  await age(user, "8 days");
  expect((await use(UNDO, tokenIn(undo))).status).toBe(404);
});

it("asks for the password again after ten minutes", async () => {
  const { cookie, idHash } = await buildSession(await build());
  await Session.update({ provedAt: literal("now() - interval '11 minutes'") as unknown as Date }, { where: { idHash } });
  const answer = await wish(cookie, "new6@yard.example");
  expect([answer.status, ((await answer.json()) as { error: { code: string } }).error.code]).toEqual([403, "reauthenticate"]);
  expect(await mailsTo(post, "new6@yard.example")).toEqual([]);
});

it("an address that somebody else has is not told in the answer, and nothing moves there", async () => {
  const other = await build();
  const { user, move } = await askToMove(other.email);
  expect([move?.subject, await enter(other.email)]).toEqual(["You already have an account", 200]);
  expect((await user.reload()).email).not.toBe(other.email);
});

it("an address that was taken since the link went out moves nothing", async () => {
  const { user, move } = await askToMove("late@yard.example");
  await buildUser({ email: "late@yard.example" });
  expect((await use(MOVE, tokenIn(move!))).status).toBe(404);
  expect((await user.reload()).email).not.toBe("late@yard.example");
});
