import { readFileSync } from "node:fs";
import { Agent, request as send } from "node:http";
import { afterAll, beforeAll, expect, it } from "vitest";
import { buildMember, buildProject, buildSession, buildTeam } from "../build";
import { prepareServed, type Served } from "./ownServed";

const PEOPLE = 60;
const EVERY = 2_000;
const SECONDS = Number(process.env.STILLYARD_LOAD_SECONDS ?? 300);

interface Person {
  cookie: string;
  /** An address of the loopback interface for each: nobody answers for the others. */
  from: string;
  project: string;
  receiver: string;
  revision: number;
}

let product: Served;
let people: Person[];
/** Idle connections go before the server's own five seconds are over: one that closes just now takes no request. */
const agent = new Agent({ keepAlive: true, timeout: 3_000 });

beforeAll(async () => {
  product = await (await prepareServed()).serve();
  const team = await buildTeam();
  people = [];
  for (let place = 0; place < PEOPLE; place += 1) {
    const owner = await buildMember(team, "owner", `Person ${place}`);
    const { project, plan } = await buildProject(team, `Yard ${place}`);
    const { cookie } = await buildSession(owner);
    people.push({ cookie, from: `127.0.0.${place + 2}`, project: project.id, receiver: plan.receivers[0]!.id, revision: project.revision });
  }
});
afterAll(async () => {
  agent.destroy();
  await product.stop();
});

interface Took {
  status: number;
  milliseconds: number;
  text: string;
}

function ask({ cookie, from }: Person, method: string, path: string, more: Record<string, string> = {}, body?: string): Promise<Took> {
  const { port } = new URL(product.address);
  const began = performance.now();
  return new Promise((resolve, reject) => {
    const headers = { host: new URL(product.address).host, cookie, "sec-fetch-site": "same-origin", ...more };
    const asked = send({ host: "127.0.0.1", port, localAddress: from, agent, method, path, headers }, async (response) => {
      let text = "";
      for await (const piece of response) text += piece;
      resolve({ status: response.statusCode ?? 0, milliseconds: performance.now() - began, text });
    });
    asked.on("error", reject);
    asked.end(body);
  });
}

/** What people do, one after the other: two changes, a look at the plan as data, a look at a page. */
async function act(person: Person, turn: number): Promise<{ kind: string; took: Took }> {
  const path = `/api/projects/${person.project}`;
  if (turn % 4 === 2) return { kind: "read", took: await ask(person, "GET", path) };
  if (turn % 4 === 3) return { kind: "page", took: await ask(person, "GET", `/projects/${person.project}`) };
  const more = { "if-match": `"${person.revision}"`, "content-type": "application/json", "idempotency-key": `${person.project}-${turn}` };
  const took = await ask(person, "PATCH", `${path}/receivers/${person.receiver}`, more, JSON.stringify({ says: `Turn ${turn}` }));
  if (took.status === 200) person.revision = (JSON.parse(took.text) as { revision: number }).revision;
  return { kind: "change", took };
}

/** Megabytes of a process that are in memory. */
function memoryOf(pid: number): number {
  return Number(/VmRSS:\s+(\d+)/.exec(readFileSync(`/proc/${pid}/status`, "utf8"))![1]) / 1_024;
}

/** Milliseconds a process has worked on all cores: fields 14 and 15 of proc(5), in hundredths of a second. */
function workOf(pid: number): number {
  const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
  const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
  return (Number(fields[11]) + Number(fields[12])) * 10;
}

const rank = (times: readonly number[], share: number) => times.toSorted((one, other) => one - other)[Math.ceil(times.length * share) - 1] ?? 0;
const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

it(`${PEOPLE} people, one act each every two seconds, for ${SECONDS} s: 95 of 100 within 300 ms, no fault, nobody told to wait, memory bounded`, async () => {
  // The first answers compile and fill what stays: they are not what is measured.
  for (const person of people) for (let turn = 0; turn < 4; turn += 1) await act(person, turn);
  const memory = [memoryOf(product.pid)];
  const work = workOf(product.pid);
  const times: Record<string, number[]> = {};
  const statuses = new Map<number, number>();
  const end = performance.now() + SECONDS * 1_000;
  const watching = setInterval(() => memory.push(memoryOf(product.pid)), 1_000);
  const acting = Promise.all(
    people.map(async (person, place) => {
      await pause((EVERY / PEOPLE) * place);
      for (let turn = 4; performance.now() < end; turn += 1) {
        const next = performance.now() + EVERY;
        const { kind, took } = await act(person, turn);
        (times[kind] ??= []).push(took.milliseconds);
        statuses.set(took.status, (statuses.get(took.status) ?? 0) + 1);
        await pause(Math.max(0, next - performance.now()));
      }
    }),
  );
  await acting.finally(() => clearInterval(watching));
  const all = Object.values(times).flat();
  const each = Object.entries(times).map(([kind, list]) => `${kind} ${rank(list, 0.5).toFixed(0)}/${rank(list, 0.95).toFixed(0)} ms`);
  const perAct = (workOf(product.pid) - work) / all.length;
  const growth = Math.max(...memory) - memory[0]!;
  console.log(`${all.length} acts: p50/p95 ${each.join(", ")}; all ${rank(all, 0.5).toFixed(0)}/${rank(all, 0.95).toFixed(0)} ms; answers ${JSON.stringify([...statuses])}; ${perAct.toFixed(0)} ms of work an act; memory ${memory[0]!.toFixed(0)} MB, at most ${growth.toFixed(0)} MB more`);
  expect([...statuses.keys()]).toEqual([200]);
  expect(rank(all, 0.95)).toBeLessThan(300);
  expect(growth).toBeLessThan(150);
});
