import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { chmodSync, mkdtempSync, readFileSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { freePort } from "../../scripts/port.mjs";

/** Moments at which a start is killed. */
const KILLS = Number(process.env.STILLYARD_KILLS ?? 20);

let state: string;
let port: number;

beforeAll(async () => {
  state = freshState();
  port = await freePort();
});

function freshState(): string {
  const folder = mkdtempSync(join(tmpdir(), "stillyard-start-"));
  // The account of the database passes through.
  chmodSync(folder, 0o711);
  return folder;
}

afterAll(() => rmSync(state, { recursive: true, force: true }));

interface Place {
  state: string;
  port: number;
}

function begin(place: Place = { state, port }): ChildProcess {
  const environment: NodeJS.Dict<string> = { ...process.env, PORT: String(place.port), STILLYARD_STATE: place.state };
  for (const name of ["DATABASE_URL", "DATABASE_ADMIN_URL", "STILLYARD_ORIGIN", "NODE_ENV", "VITEST"]) delete environment[name];
  return spawn(process.execPath, ["scripts/start.mjs"], { env: environment as NodeJS.ProcessEnv, stdio: ["ignore", "ignore", "pipe"] });
}

/** What a start that ends by itself says, and how it ends. */
async function endOf(child: ChildProcess): Promise<{ code: unknown; says: string }> {
  let says = "";
  child.stderr!.setEncoding("utf8").on("data", (piece: string) => (says += piece));
  const [code] = await once(child, "close");
  return { code, says };
}

/** Seconds until the product answers. */
async function untilAnswered(child: ChildProcess, at = port): Promise<number> {
  child.stderr!.resume();
  const began = Date.now();
  while (!(await answers(at))) {
    if (child.exitCode !== null) throw new Error(`The start ended with ${child.exitCode}.`);
    if (Date.now() - began > 300_000) throw new Error("The product did not answer within 300 s.");
    await pause(50);
  }
  return (Date.now() - began) / 1_000;
}

async function answers(at = port): Promise<boolean> {
  return fetch(`http://localhost:${at}/api/health`).then(
    (answer) => answer.ok,
    () => false,
  );
}

async function end(child: ChildProcess, signal: NodeJS.Signals): Promise<unknown[]> {
  const gone = once(child, "exit");
  child.kill(signal);
  return gone;
}

/** Processes that name this proof's state folder. A step of a killed start may come to its own end within 10 s. */
async function leftOver(patience = 100): Promise<string[]> {
  const numbers = readdirSync("/proc").filter((name) => /^\d+$/.test(name) && Number(name) !== process.pid);
  const left = numbers.filter((number) => `${read(number, "cmdline")}${read(number, "environ")}`.includes(state));
  if (left.length === 0 || patience === 0) return left.map((number) => read(number, "cmdline").replaceAll("\0", " "));
  await pause(100);
  return leftOver(patience - 1);
}

function read(number: string, file: string): string {
  try {
    return readFileSync(`/proc/${number}/${file}`, "utf8");
  } catch {
    return "";
  }
}

function pause(milliseconds: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, milliseconds));
}

describe("start and end of the product", () => {
  it("the second start answers within 10 s, and SIGTERM leaves no process", async () => {
    const seconds: number[] = [];
    for (let turn = 0; turn < 3; turn += 1) {
      const child = begin();
      seconds.push(await untilAnswered(child));
      expect(await end(child, "SIGTERM")).toEqual([0, null]);
      expect(await leftOver(0)).toEqual([]);
    }
    console.log(`answered after ${seconds.map((value) => value.toFixed(1)).join(", ")} s`);
    expect(Math.max(...seconds.slice(1))).toBeLessThan(10);
  });

  it("a second start beside a running one leaves it alone and says so by its exit code", async () => {
    const first = begin();
    await untilAnswered(first);
    const { code, says } = await endOf(begin());
    expect({ code, says }).toEqual({ code: 1, says: expect.stringContaining(`already runs from this folder: http://localhost:${port}`) });
    expect(await answers()).toBe(true);
    await end(first, "SIGTERM");
  });

  it("two first starts at once in one folder: one serves, the other says where that one is", async () => {
    const here = { state: freshState(), port: await freePort() };
    const there = { ...here, port: await freePort() };
    const children = [begin(here), begin(there)] as const;
    const ends = children.map(endOf);
    const [late] = await Promise.all([Promise.race(ends), Promise.any([untilAnswered(children[0], here.port), untilAnswered(children[1], there.port)])]);
    const ports = [here.port, there.port];
    const serving = (await answers(here.port)) ? 0 : 1;
    expect(late).toEqual({ code: 1, says: expect.stringContaining(`already being started from this folder: http://localhost:${ports[serving]}`) });
    expect(await answers(ports[1 - serving])).toBe(false);
    expect(await end(children[serving]!, "SIGTERM")).toEqual([0, null]);
    rmSync(here.state, { recursive: true, force: true });
  });

  it("two first starts at once, each with a state of its own: both serve, each from a database of its own", async () => {
    const places = await Promise.all([0, 1].map(async () => ({ state: freshState(), port: await freePort() })));
    const children = places.map((place) => begin(place));
    await Promise.all(children.map((child, place) => untilAnswered(child, places[place]!.port)));
    for (const place of places) expect(readdirSync(place.state)).toContain("postgres");
    expect(await end(children[0]!, "SIGTERM")).toEqual([0, null]);
    expect(await answers(places[1]!.port)).toBe(true);
    expect(await end(children[1]!, "SIGTERM")).toEqual([0, null]);
    for (const place of places) rmSync(place.state, { recursive: true, force: true });
  });

  it(`killed outright at ${KILLS} moments, the next start needs no repair`, async () => {
    const slowest = { seconds: 0 };
    for (let turn = 0; turn < KILLS; turn += 1) {
      // Every fifth time from nothing, so that the laying out of the database is cut as well.
      if (turn % 5 === 0) rmSync(join(state, "postgres"), { recursive: true, force: true });
      await end(await killedLater(turn), "SIGKILL");
      const child = begin();
      slowest.seconds = Math.max(slowest.seconds, await untilAnswered(child));
      expect(await end(child, "SIGTERM")).toEqual([0, null]);
      expect(await leftOver()).toEqual([]);
    }
    console.log(`the slowest start after a kill answered after ${slowest.seconds.toFixed(1)} s`);
  });
});

/** From the first moments of a start to the time it serves. */
async function killedLater(turn: number): Promise<ChildProcess> {
  const child = begin();
  await pause(100 + (turn % 5) * 300 + turn * 40);
  return child;
}
