import { expect, it } from "vitest";
import people from "../../data/examples/people.json";
import type { Answer } from "../../app/_server/weigh";
import { idOf } from "../../scripts/idOf";

const address = process.env.STILLYARD_URL!;
const CLIENTS = 50;
const EACH = 20;

const route = `${address}/api/projects/${idOf("project", "plumtree-row")}`;
const roof = idOf("plumtree-row", "studio-roof");
const ours = { "Sec-Fetch-Site": "same-origin", "Content-Type": "application/json" };

async function signIn(key: string): Promise<string> {
  const { email, password } = people.find((person) => person.key === key)!;
  const answer = await fetch(`${address}/api/session`, { method: "POST", headers: ours, body: JSON.stringify({ email, password }) });
  expect(answer.status).toBe(200);
  return answer.headers.get("set-cookie")!.split(";")[0]!;
}

const areaOf = ({ plan }: Answer) => plan.elements.find(({ id }) => id === roof)!.area;
/** Who came too late waits for another while, longer each time. */
const aWhile = (tries: number) => new Promise((resolve) => setTimeout(resolve, Math.random() * Math.min(10_000, 200 * 2 ** tries)));

it(`${CLIENTS} clients adding one ${EACH} times: every 200 counts exactly once`, async () => {
  const cookies = [await signIn("ines"), await signIn("tobi")];
  async function open(tries = 0): Promise<Answer> {
    const answer = await fetch(route, { headers: { Cookie: cookies[0]! } });
    if (answer.status === 200) return (await answer.json()) as Answer;
    expect(answer.status).toBe(503);
    await aWhile(tries);
    return open(tries + 1);
  }
  const write = (cookie: string, revision: number, area: number) =>
    fetch(`${route}/elements/${roof}`, {
      method: "PATCH",
      headers: { ...ours, Cookie: cookie, "If-Match": `"${revision}"` },
      body: JSON.stringify({ area }),
    });
  const start = await open();
  const statuses = new Map<number, number>();

  async function addOne(cookie: string) {
    for (let tries = 0; ; tries += 1) {
      const answer = await open();
      const response = await write(cookie, answer.revision, areaOf(answer) + 1);
      await response.text();
      statuses.set(response.status, (statuses.get(response.status) ?? 0) + 1);
      if (response.status === 200) return;
      expect([409, 503]).toContain(response.status);
      await aWhile(tries);
    }
  }

  await Promise.all(
    Array.from({ length: CLIENTS }, async (_, place) => {
      for (let count = 0; count < EACH; count += 1) await addOne(cookies[place % 2]!);
    }),
  );
  const end = await open();
  console.log(`answers: ${[...statuses].map(([status, count]) => `${count} x ${status}`).join(", ")}`);
  expect(statuses.get(200)).toBe(CLIENTS * EACH);
  expect(end.revision - start.revision).toBe(CLIENTS * EACH);
  expect(areaOf(end) - areaOf(start)).toBeCloseTo(CLIENTS * EACH, 6);
  // The demo as it was found.
  expect((await write(cookies[0]!, end.revision, areaOf(start))).status).toBe(200);
});
