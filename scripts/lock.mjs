import { linkSync, readFileSync, renameSync, rmSync, unlinkSync, writeFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";
import { inState } from "./places.mjs";

/** Takes a named lock, or returns what its living holder wrote about itself. A dead holder's lock is taken over. */
export function takeLock(name, says = {}) {
  const path = inState(`${name}.lock`);
  const mine = `${path}.${process.pid}`;
  const write = (more) => writeFileSync(mine, JSON.stringify({ ...more, pid: process.pid, born: birthOf(process.pid) }));
  for (;;) {
    write(says);
    if (linked(mine, path)) return { held: true, tell: (more) => (write(more), renameSync(mine, path)), release: () => rmSync(path, { force: true }) };
    const text = readOr(path, "");
    const holder = parse(text);
    if (holder && birthOf(holder.pid) === holder.born) return (unlinkSync(mine), { held: false, holder });
    setAside(path, text);
  }
}

/** Runs a task alone among the processes of this checkout; waits for its turn. */
export async function alone(name, task) {
  let lock = takeLock(name);
  while (!lock.held) {
    await sleep(300);
    lock = takeLock(name);
  }
  try {
    return await task();
  } finally {
    lock.release();
  }
}

/** The living holder of a lock, if there is one. */
export function holderOf(name) {
  const holder = parse(readOr(inState(`${name}.lock`), ""));
  return holder && birthOf(holder.pid) === holder.born ? holder : undefined;
}

/** Link is the one step two processes cannot both take. Our own note is then the lock's second name. */
function linked(mine, path) {
  try {
    linkSync(mine, path);
    unlinkSync(mine);
    return true;
  } catch (fault) {
    if (fault.code === "EEXIST") return false;
    throw fault;
  }
}

/** Removes a dead lock; should a newcomer have taken it meanwhile, theirs is put back. */
function setAside(path, dead) {
  const aside = `${path}.dead.${process.pid}`;
  try {
    renameSync(path, aside);
  } catch (fault) {
    if (fault.code === "ENOENT") return;
    throw fault;
  }
  if (readOr(aside, "") !== dead) linked(aside, path);
  rmSync(aside, { force: true });
}

/** When a process began, so that a number used again is not taken for the old process; null when it is gone. */
export function birthOf(pid) {
  const stat = readOr(`/proc/${pid}/stat`, "");
  // Field 22 of proc(5); the name in brackets may hold blanks. Z and X are dead already.
  const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
  if (stat) return "ZX".includes(fields[0]) ? null : fields[19];
  return process.platform === "linux" || !answers(pid) ? null : "unknown";
}

function answers(pid) {
  try {
    return process.kill(pid, 0);
  } catch (fault) {
    return fault.code === "EPERM";
  }
}

function readOr(path, otherwise) {
  try {
    return readFileSync(path, "utf8");
  } catch {
    return otherwise;
  }
}

function parse(text) {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
