import { spawn } from "node:child_process";
import { closeSync, existsSync, openSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";
import { birthOf } from "./lock.mjs";
import { inState } from "./places.mjs";

const living = new Set();

/** Runs a command with its words in a log, whose end is shown when it fails. */
export async function runLogged(name, command, args) {
  const log = openSync(inState(`${name}.log`), "w");
  const code = await run(command, args, { stdio: ["ignore", log, log] });
  closeLog(name, log, code);
  return code;
}

/** Runs a command to its end and gives its exit code; a signal counts as 1. */
export function run(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: ["ignore", "inherit", "inherit"], ...options });
    child.once("error", reject);
    child.once("exit", (code) => resolve(code ?? 1));
  });
}

/**
 * Runs a long command as a group of its own, which `endRuns` ends with all its helpers.
 * A named one writes its words to a log of that name, whose end is shown when it fails, and first
 * ends a twin that an earlier process left behind when it was killed.
 */
export async function runGroup(command, args, { name, ...options } = {}) {
  if (name) await endTwin(name);
  const log = name ? openSync(inState(`${name}.log`), "w") : undefined;
  const stdio = name ? ["ignore", log, log] : ["ignore", "inherit", "inherit"];
  const child = spawn(command, args, { ...options, stdio, detached: true });
  const ended = new Promise((resolve, reject) => child.once("error", reject).once("exit", (code) => resolve(code ?? 1)));
  living.add(child);
  if (name && child.pid) writeFileSync(inState(`${name}.run`), JSON.stringify({ pid: child.pid, born: birthOf(child.pid) }));
  const code = await ended;
  living.delete(child);
  if (name) rmSync(inState(`${name}.run`), { force: true });
  if (name) closeLog(name, log, code);
  return code;
}

function closeLog(name, log, code) {
  closeSync(log);
  if (code !== 0) console.error(readFileSync(inState(`${name}.log`), "utf8").split("\n").slice(-60).join("\n"));
}

async function endTwin(name) {
  const record = inState(`${name}.run`);
  if (!existsSync(record)) return;
  const { pid, born } = JSON.parse(readFileSync(record, "utf8"));
  while (born !== null && birthOf(pid) === born) {
    endGroup(pid, "SIGKILL");
    await sleep(100);
  }
}

/** Ends every group still running. */
export function endRuns() {
  for (const child of living) endGroup(child.pid, "SIGTERM");
}

function endGroup(leader, signal) {
  try {
    process.kill(-leader, signal);
  } catch (fault) {
    // It came to its end by itself meanwhile.
    if (fault.code !== "ESRCH") throw fault;
  }
}
