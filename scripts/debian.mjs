import { accessSync, constants, existsSync } from "node:fs";
import { spawnSync } from "node:child_process";
import { delimiter, join } from "node:path";
import { run, runLogged } from "./run.mjs";
import { Sentence } from "./sentence.mjs";

const clusterSettings = "/etc/postgresql-common/createcluster.conf";

/** Installs a Debian package, as root or through a sudo that asks for no password. */
export async function installPackage(name, why) {
  const byHand = `${why} Install it with: sudo apt-get install -y ${name}`;
  if (!onPath("apt-get")) throw new Sentence(`${why} Install it with your system's packages and try again.`);
  const prefix = rights();
  if (!prefix) throw new Sentence(byHand);
  console.log(`${why} Installing Debian's package ${name} ...`);
  if (name === "postgresql") await keepServerAsleep(prefix);
  const install = ["install", "-y", "--no-install-recommends", name];
  const done = (await apt(prefix, install)) || ((await apt(prefix, ["update"])) && (await apt(prefix, install)));
  if (!done) throw new Sentence(byHand);
}

/** The full path of a command, if the machine has it. */
export function onPath(command) {
  return (process.env.PATH ?? "")
    .split(delimiter)
    .map((folder) => join(folder, command))
    .find(isExecutable);
}

function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

function rights() {
  if (process.getuid() === 0) return [];
  return spawnSync("sudo", ["-n", "true"], { stdio: "ignore" }).status === 0 ? ["sudo", "-n"] : undefined;
}

async function apt(prefix, args) {
  const options = ["-q", "-o", "DPkg::Lock::Timeout=300", "-o", "Dpkg::Options::=--force-confold"];
  const [command, ...rest] = [...prefix, "env", "DEBIAN_FRONTEND=noninteractive", "apt-get", ...options, ...args];
  return (await runLogged("apt", command, rest)) === 0;
}

/** Without this file the package would create and start a server of its own on port 5432. */
async function keepServerAsleep(prefix) {
  if (existsSync(clusterSettings)) return;
  const script = `mkdir -p /etc/postgresql-common && echo 'create_main_cluster = false' > ${clusterSettings}`;
  const [command, ...rest] = [...prefix, "sh", "-c", script];
  await run(command, rest);
}
