import { beforeAll, describe, expect, it } from "vitest";
import { literal } from "sequelize";
import { DELETE as END } from "../../app/api/sessions/[key]/route";
import { DELETE as END_OTHERS } from "../../app/api/sessions/route";
import { PATCH as SETTINGS } from "../../app/api/me/route";
import { listDevices, type Device } from "../../app/_server/accounts/devices";
import { deviceWords } from "../../app/_server/accounts/deviceWords";
import { identify } from "../../app/_server/identity";
import { Session, type User } from "../../models/index";
import { ask, buildSession, buildUser } from "../build";

let user: User;
beforeAll(async () => {
  user = await buildUser();
});

const holds = async (cookie: string) => (await ask(SETTINGS, { method: "PATCH", cookie, body: { theme: "dark" } })).status === 204;
const listOf = async (cookie: string) => listDevices((await identify(cookie.slice(cookie.indexOf("=") + 1)))!);
const end = (cookie: string, key: string) => ask(END, { method: "DELETE", cookie, params: { key } });

describe("where somebody is signed in", () => {
  it("lists each session once, this one first, by a key that opens nothing", async () => {
    const [mine, other] = [await buildSession(user), await buildSession(user)];
    await Session.update({ device: "Mozilla/5.0 (X11; Linux x86_64)" }, { where: { idHash: other.idHash } });
    const devices = await listOf(mine.cookie);
    expect(devices.map(({ current, device }) => ({ current, device }))).toEqual([
      { current: true, device: "A device we do not know" },
      { current: false, device: "A computer" },
    ]);
    const text = JSON.stringify(devices);
    for (const { id, idHash } of [mine, other]) expect([text.includes(id), text.includes(idHash)]).toEqual([false, false]);
  });

  it("leaves out those that have had their time", async () => {
    const lone = await buildUser();
    const [mine, idle] = [await buildSession(lone), await buildSession(lone)];
    await Session.update({ seenAt: literal("now() - interval '13 hours'") as unknown as Date }, { where: { idHash: idle.idHash } });
    expect(await listOf(mine.cookie)).toHaveLength(1);
  });

  it("a change of id is no second device, and ending the device ends both ids", async () => {
    const lone = await buildUser();
    const { cookie, idHash } = await buildSession(lone, true);
    await Session.update({ issuedAt: literal("now() - interval '25 hours'") as unknown as Date }, { where: { idHash } });
    const renewed = (await ask(SETTINGS, { method: "PATCH", cookie, body: { theme: "dark" } })).headers.get("set-cookie")!.split(";")[0]!;
    const other = await buildSession(lone);
    const devices = await listOf(other.cookie);
    expect(devices).toHaveLength(2);
    expect((await end(other.cookie, devices[1]!.key)).status).toBe(204);
    expect([await holds(cookie), await holds(renewed), await holds(other.cookie)]).toEqual([false, false, true]);
  });
});

describe("ending them", () => {
  it("one ends at its next request", async () => {
    const lone = await buildUser();
    const [mine, lost] = [await buildSession(lone), await buildSession(lone)];
    const [, { key }] = (await listOf(mine.cookie)).slice(0, 2) as [Device, Device];
    expect((await end(mine.cookie, key)).status).toBe(204);
    expect([await holds(lost.cookie), await holds(mine.cookie)]).toEqual([false, true]);
    expect((await end(mine.cookie, key)).status).toBe(404);
  });

  it("those of others do not exist", async () => {
    const stranger = await buildUser();
    const [mine, theirs] = [await buildSession(user), await buildSession(stranger)];
    const [{ key }] = (await listOf(theirs.cookie)).slice(0, 1) as [Device];
    const [strange, absent] = [await end(mine.cookie, key), await end(mine.cookie, "00000000-0000-4000-8000-000000000000")];
    expect([strange.status, absent.status, await holds(theirs.cookie)]).toEqual([404, 404, true]);
    for (const made of ["x", "' or 1=1 --", theirs.idHash, theirs.id]) expect((await end(mine.cookie, made)).status).toBe(404);
  });

  it("all others end at once", async () => {
    const lone = await buildUser();
    const [mine, ...others] = [await buildSession(lone), await buildSession(lone), await buildSession(lone)];
    const stranger = await buildSession(user);
    expect((await ask(END_OTHERS, { method: "DELETE", cookie: mine!.cookie })).status).toBe(204);
    expect(await Promise.all(others.map(({ cookie }) => holds(cookie)))).toEqual([false, false]);
    expect([await holds(mine!.cookie), await holds(stranger.cookie)]).toEqual([true, true]);
  });
});

it.each([
  ["Mozilla/5.0 (X11; Linux x86_64; rv:140.0)", "A computer"],
  ["Mozilla/5.0 (Macintosh; Intel)", "A computer"],
  ["Mozilla/5.0 (Windows NT 10.0; Win64; x64)", "A computer"],
  ["Mozilla/5.0 (iPhone; like Mac OS X) Mobile/15E148", "A phone"],
  ["Mozilla/5.0 (Linux; Android 15) Mobile", "A phone"],
  ["Mozilla/5.0 (Linux; Android 15)", "A tablet"],
  ["<script>alert(1)</script>", "A device we do not know"],
  ["", "A device we do not know"],
])("%s is called %s", (userAgent, words) => expect(deviceWords(userAgent)).toBe(words));
