import { monitorEventLoopDelay, performance } from "node:perf_hooks";
import { beforeAll, expect, it } from "vitest";
import { openOwnDatabase } from "./ownDatabase";

/** Handlers as functions, with the real hashing and a real database: nothing of the way there blurs the times. */
const TRIES = Number(process.env.STILLYARD_PROOF_TRIES ?? 200);
const PASSWORD = "known to its owner and nobody else";

type Route = (request: Request) => Promise<Response>;
let routes: Record<"signIn" | "signUp" | "forgotten", Route>;
let known: string[];

beforeAll(async () => {
  await openOwnDatabase();
  routes = {
    signIn: (await import("../../app/api/session/route")).POST,
    signUp: (await import("../../app/api/sign-up/route")).POST,
    forgotten: (await import("../../app/api/forgotten-password/route")).POST,
  };
  const { buildUser } = await import("../build");
  const { hashPassword } = await import("../../app/_server/passwords");
  const passwordHash = await hashPassword(PASSWORD);
  const users = await Promise.all(Array.from({ length: TRIES }, (_, place) => buildUser({ email: `known${place}@yard.example`, passwordHash })));
  known = users.map(({ email }) => email);
});

let asked = 0;
/** Each from an address of its own, so that no throttle answers in the handler's place. */
function ask(route: Route, body: object): Promise<Response> {
  asked += 1;
  const address = `10.${(asked >> 16) & 255}.${(asked >> 8) & 255}.${asked & 255}`;
  const headers = { "sec-fetch-site": "same-origin", "content-type": "application/json", "x-stillyard-address": address };
  return route(new Request("http://localhost:3000/api", { method: "POST", headers, body: JSON.stringify(body) }));
}

const median = (times: number[]) => times.toSorted((one, other) => one - other)[Math.floor(times.length / 2)]!;

it.each<["signIn" | "signUp" | "forgotten", number, (email: string) => object]>([
  ["signIn", 401, (email) => ({ email, password: "a guess like any other guess" })],
  ["signUp", 202, (email) => ({ email, password: PASSWORD, name: "Nora", hat: "play" })],
  ["forgotten", 202, (email) => ({ email })],
])("%s: the medians for known and unknown accounts differ by less than 10 ms", async (name, status, bodyOf) => {
  const times = { known: [] as number[], unknown: [] as number[] };
  for (let place = 0; place < TRIES; place += 1) {
    const emails = { known: known[place]!, unknown: `unknown${place}.${name}@yard.example` };
    // Both at once, so that a busy moment falls on both, and each kind first as often as the other.
    const order = place % 2 ? (["known", "unknown"] as const) : (["unknown", "known"] as const);
    await Promise.all(
      order.map(async (kind) => {
        const from = performance.now();
        expect((await ask(routes[name], bodyOf(emails[kind]))).status).toBe(status);
        times[kind].push(performance.now() - from);
      }),
    );
  }
  const [one, other] = [median(times.known), median(times.unknown)];
  console.log(`${name}: known ${one.toFixed(1)} ms, unknown ${other.toFixed(1)} ms`);
  expect(Math.abs(one - other)).toBeLessThan(10);
});

it("a hundred sign-ins at once: all get in, and the event loop is held up less than 100 ms in 99 of 100 cases", async () => {
  const { Throttle } = await import("../../models/index");
  await Throttle.destroy({ truncate: true });
  const delay = monitorEventLoopDelay({ resolution: 5 });
  delay.enable();
  await Promise.all(known.slice(0, 100).map(enter));
  delay.disable();
  const p99 = delay.percentile(99) / 1e6;
  console.log(`event loop: p99 ${p99.toFixed(1)} ms, longest ${(delay.max / 1e6).toFixed(1)} ms`);
  expect(p99).toBeLessThan(100);
});

/** Whoever is asked to come back does so. */
async function enter(email: string): Promise<void> {
  const answer = await ask(routes.signIn, { email, password: PASSWORD });
  if (answer.status !== 503) return expect(answer.status).toBe(200);
  await new Promise((resolve) => setTimeout(resolve, Number(answer.headers.get("retry-after")) * 1_000));
  return enter(email);
}
