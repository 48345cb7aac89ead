import { beforeAll, expect, it } from "vitest";
import { connection } from "../../models/index";
import { findRoutes } from "../api/routes";
import { buildStage, type Stage } from "../api/actors";
import { ask, buildSession } from "../build";
import { chanceFrom, malformedBody } from "../malformed";

/** More of them in the slow proofs. */
const BODIES = Number(process.env.STILLYARD_MALFORMED ?? 300);
const SEED = 20_261_201;

let stage: Stage;
beforeAll(async () => {
  process.env.STILLYARD_REQUESTS_A_MINUTE = "300";
  process.env.STILLYARD_WRITES_IN_10_S = "20";
  stage = await buildStage();
});

/** What passes by itself: counts, throttles and the mark of when a session was last seen. */
const passing = new Set(["request_counts", "throttles", "sessions", "migrations", "known_browsers"]);

/** One number for all rows of the database. */
async function digest(): Promise<Record<string, string>> {
  const [tables] = await connection.query("select tablename as name from pg_tables where schemaname = 'public' order by 1");
  const sums: Record<string, string> = {};
  for (const { name } of tables as { name: string }[]) {
    if (passing.has(name)) continue;
    const [[row]] = await connection.query(`select md5(coalesce(string_agg(t::text, '' order by t::text), '')) as sum from ${name} t`);
    sums[name] = (row as { sum: string }).sum;
  }
  return sums;
}

/** Every part of the plan as somebody would add it, and several changes as one. */
function soundBodies(): { part: string; partId: string; body: object }[] {
  const { plan } = stage;
  const lists = ["buildings", "spaces", "surfaces", "sources", "outlets", "incidences", "paths", "constructions", "elements", "fences", "receivers", "criteria", "situations"] as const;
  const parts = lists.flatMap((part) => {
    const [first] = plan[part];
    if (!first) return [];
    const { id: partId, ...body } = first;
    return [{ part, partId, body: body as object }];
  });
  return parts.flatMap((one) => [one, { ...one, body: { changes: [{ act: "add", part: one.part, as: "new:x", values: one.body }, { act: "change", part: one.part, id: one.partId, patch: one.body }] } }]);
}

it(`${BODIES} malformed bodies over every route that changes something: refused, nothing of them kept, no fault, none for coming too often`, async () => {
  const routes = (await findRoutes()).filter(({ method, name }) => method !== "GET" && method !== "DELETE" && !name.endsWith("/csp") && !name.includes("[...missing]"));
  const sound = soundBodies();
  expect([routes.length >= 6, sound.length >= 16]).toEqual([true, true]);
  const before = await digest();
  const { revision } = await stage.project.reload();
  const chance = chanceFrom(SEED);
  const statuses = new Map<number, number>();
  let cookie = "";
  for (let turn = 0; turn < BODIES; turn += 1) {
    // Spread over sessions, so that the bound on one does not answer for the code.
    if (turn % 15 === 0) cookie = (await buildSession(stage.users.owner)).cookie;
    const { name, method, handler } = routes[turn % routes.length]!;
    const { part, partId, body } = sound[Math.floor(chance() * sound.length)]!;
    const text = malformedBody(chance, body);
    const answer = await ask(handler, { method, cookie, revision, params: { projectId: stage.project.id, part, partId }, body: text });
    statuses.set(answer.status, (statuses.get(answer.status) ?? 0) + 1);
    const said = await answer.text();
    if (answer.status < 400 || answer.status >= 500) throw new Error(`turn ${turn}, ${name} ${part}: ${answer.status} ${said.slice(0, 300)} for ${text.slice(0, 600)}`);
    expect(JSON.parse(said)).toMatchObject({ error: { message: expect.stringMatching(/^[A-Z].*\.$/s) } });
  }
  console.log(`malformed bodies: ${[...statuses].map(([status, count]) => `${count} x ${status}`).join(", ")}`);
  expect(statuses.get(429)).toBeUndefined();
  expect(await digest()).toEqual(before);
}, 600_000);
