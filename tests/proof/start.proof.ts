import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { chmodSync, mkdtempSync, readFileSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { freePort } from "../../scripts/port.mjs";

let state: string;
let port: number;

beforeAll(async () => {
  state = mkdtempSync(join(tmpdir(), "stillyard-start-"));
  // The account of the database passes through.
  chmodSync(state, 0o711);
  port = await freePort();
});

afterAll(() => rmSync(state, { recursive: true, force: true }));

function begin(): ChildProcess {
  const environment: NodeJS.Dict<string> = { ...process.env, PORT: String(port), STILLYARD_STATE: state };
  for (const name of ["DATABASE_URL", "DATABASE_ADMIN_URL", "STILLYARD_ORIGIN", "NODE_ENV", "VITEST"]) delete environment[name];
  return spawn(process.execPath, ["scripts/start.mjs"], { env: environment as NodeJS.ProcessEnv, stdio: "ignore" });
}

/** Seconds until the product answers. */
async function untilAnswered(child: ChildProcess): Promise<number> {
  const began = Date.now();
  while (!(await answers())) {
    if (child.exitCode !== null) throw new Error(`The start ended with ${child.exitCode}.`);
    if (Date.now() - began > 300_000) throw new Error("The product did not answer within 300 s.");
    await pause(50);
  }
  return (Date.now() - began) / 1_000;
}

async function answers(): Promise<boolean> {
  return fetch(`http://localhost:${port}/api/health`).then(
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
    expect(await once(begin(), "exit")).toEqual([1, null]);
    expect(await answers()).toBe(true);
    await end(first, "SIGTERM");
  });

  it("killed outright at 20 moments, the next start needs no repair", async () => {
    const slowest = { seconds: 0 };
    for (let turn = 0; turn < 20; turn += 1) {
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
