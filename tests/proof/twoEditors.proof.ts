import { afterAll, beforeAll, expect, it } from "vitest";
import type { Answer } from "../../app/_server/weigh";
import { buildMember, buildProject, buildTeam, cookieOf } from "../build";
import { prepareServed, type Served } from "./ownServed";

const CLIENTS = 50;
const EACH = Number(process.env.STILLYARD_PROOF_TRIES ?? 20);

let product: Served;
let route: string;
let roof: string;
/** A person and a session for each client: nobody comes too often. */
let cookies: string[];

beforeAll(async () => {
  product = await (await prepareServed()).serve();
  const team = await buildTeam();
  const { project, idOf } = await buildProject(team);
  route = `${product.address}/api/projects/${project.id}`;
  roof = idOf("studio-roof");
  cookies = await Promise.all(Array.from({ length: CLIENTS }, async () => cookieOf(await buildMember(team, "acoustician"))));
});
afterAll(() => product.stop());

const areaOf = ({ plan }: Answer) => plan.elements.find(({ id }) => id === roof)!.area;
/** Who came too late waits for another while, longer each time. */
const aWhile = (tries: number) => new Promise((resolve) => setTimeout(resolve, Math.random() * Math.min(10_000, 200 * 2 ** tries)));

async function open(cookie: string, tries = 0): Promise<Answer> {
  const answer = await fetch(route, { headers: { Cookie: cookie } });
  if (answer.status === 200) return (await answer.json()) as Answer;
  expect(answer.status).toBe(503);
  await aWhile(tries);
  return open(cookie, tries + 1);
}

function write(cookie: string, revision: number, area: number): Promise<Response> {
  const headers = { "Sec-Fetch-Site": "same-origin", "Content-Type": "application/json", Cookie: cookie, "If-Match": `"${revision}"` };
  return fetch(`${route}/elements/${roof}`, { method: "PATCH", headers, body: JSON.stringify({ area }) });
}

it(`${CLIENTS} clients adding one ${EACH} times: every 200 counts exactly once`, async () => {
  const [first] = cookies as [string];
  const start = await open(first);
  const statuses = new Map<number, number>();

  async function addOne(cookie: string) {
    for (let tries = 0; ; tries += 1) {
      const answer = await open(cookie);
      const response = await write(cookie, answer.revision, areaOf(answer) + 1);
      await response.text();
      statuses.set(response.status, (statuses.get(response.status) ?? 0) + 1);
      if (response.status === 200) return;
      expect([409, 503]).toContain(response.status);
      await aWhile(tries);
    }
  }

  await Promise.all(
    cookies.map(async (cookie) => {
      for (let count = 0; count < EACH; count += 1) await addOne(cookie);
    }),
  );
  const end = await open(first);
  console.log(`answers: ${[...statuses].map(([status, count]) => `${count} x ${status}`).join(", ")}`);
  expect(statuses.get(200)).toBe(CLIENTS * EACH);
  expect(end.revision - start.revision).toBe(CLIENTS * EACH);
  expect(areaOf(end) - areaOf(start)).toBeCloseTo(CLIENTS * EACH, 6);
});
