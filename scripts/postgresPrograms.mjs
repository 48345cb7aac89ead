import { spawnSync } from "node:child_process";
import { existsSync, readFileSync, readdirSync } from "node:fs";
import { dirname, join } from "node:path";
import { installPackage, onPath } from "./debian.mjs";
import { run } from "./run.mjs";
import { Sentence } from "./sentence.mjs";

const packaged = "/usr/lib/postgresql";

/** Finds PostgreSQL's programs, installing Debian's package where there are none. */
export async function ensurePostgres() {
  if (!programFolders().length) await installPackage("postgresql", "PostgreSQL is not on this machine.");
  if (!programFolders().length) throw new Sentence("PostgreSQL was installed, but its programs are not where they should be.");
}

/** Folders with a server in them, newest version first. */
function programFolders() {
  const versions = existsSync(packaged) ? readdirSync(packaged) : [];
  const folders = versions.sort((a, b) => Number(b) - Number(a)).map((version) => join(packaged, version, "bin"));
  const elsewhere = onPath("postgres");
  return [...folders, ...(elsewhere ? [dirname(elsewhere)] : [])].filter((folder) => existsSync(join(folder, "postgres")));
}

/** A cluster is only read by the version that wrote it. */
export function programsFor(data) {
  const written = join(data, "PG_VERSION");
  if (!existsSync(written)) return programFolders()[0];
  const version = readFileSync(written, "utf8").trim();
  const match = programFolders().find((folder) => versionOf(folder) === version);
  if (match) return match;
  throw new Sentence(`The database in ${data} was written by PostgreSQL ${version}, which is not on this machine.`);
}

function versionOf(folder) {
  const said = spawnSync(join(folder, "postgres"), ["--version"], { encoding: "utf8" }).stdout ?? "";
  return /(\d+)/.exec(said)?.[1];
}

/** PostgreSQL refuses to run as root: root lends it to the package's own account. */
export function serverAccount() {
  if (process.getuid() !== 0) return undefined;
  const line = readFileSync("/etc/passwd", "utf8").split("\n").find((entry) => entry.startsWith("postgres:"));
  if (!line) throw new Sentence("PostgreSQL does not run as root, and this machine has no account named postgres.");
  const [, , uid, gid, , home] = line.split(":");
  return { uid: Number(uid), gid: Number(gid), home };
}

/** Whether the account may pass through a folder. */
export function reaches(account, folder) {
  return spawnSync("test", ["-x", folder], asAccount(account)).status === 0;
}

/** Streams stay closed: a server that inherits a pipe keeps its reader waiting for ever. */
export function runProgram({ account, programs }, name, args) {
  return run(join(programs, name), args, { ...asAccount(account), stdio: "ignore" });
}

/** How to run as an account, from a folder that any account may stand in. */
export function asAccount(account) {
  return account ? { uid: account.uid, gid: account.gid, cwd: "/" } : { cwd: "/" };
}
