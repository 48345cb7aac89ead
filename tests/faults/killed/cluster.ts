import { execFileSync } from "node:child_process";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { startPassingCluster } from "../../../scripts/postgres.mjs";
import { programsFor, runProgram, serverAccount } from "../../../scripts/postgresPrograms.mjs";

/** A PostgreSQL server of one test, durable as the product's own, that can be killed and started again. */
export interface MortalCluster {
  url: string;
  kill: () => void;
  revive: () => Promise<void>;
  stop: () => Promise<void>;
}

export async function startMortalCluster(): Promise<MortalCluster> {
  const { url, data, stop } = await startPassingCluster({ durable: true });
  migrate(url);
  return { url, stop, kill: () => killServer(data), revive: () => revive(data, url) };
}

function migrate(url: string) {
  const script = ["--conditions=react-server", "--import", "tsx", "scripts/migrate.ts", "up"];
  execFileSync(process.execPath, script, { env: { ...process.env, DATABASE_URL: url, NODE_ENV: "test" }, stdio: ["ignore", "ignore", "inherit"] });
}

/** SIGKILL for the server and every process it has begun, as a machine that loses its power. */
function killServer(data: string) {
  const server = Number(readFileSync(join(data, "postmaster.pid"), "utf8").split("\n")[0]);
  const numbers = readdirSync("/proc").filter((name) => /^\d+$/.test(name)).map(Number);
  for (const pid of [server, ...numbers.filter((number) => parentOf(number) === server)]) endAtOnce(pid);
}

function endAtOnce(pid: number) {
  try {
    process.kill(pid, "SIGKILL");
  } catch (fault) {
    if ((fault as NodeJS.ErrnoException).code !== "ESRCH") throw fault; // gone with the first
  }
}

function parentOf(pid: number): number {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    return Number(stat.slice(stat.lastIndexOf(")") + 2).split(" ")[1]);
  } catch {
    return 0;
  }
}

/** As long as a killed process is not quite gone, its memory stands in the way of the next server. */
async function revive(data: string, url: string, tries = 20): Promise<void> {
  const settings = [`-p ${new URL(url).port}`, "-c listen_addresses=127.0.0.1", "-c unix_socket_directories=''"].join(" ");
  const given = { account: serverAccount(), programs: programsFor(data) };
  const code = await runProgram(given, "pg_ctl", ["-D", data, "-l", join(data, "..", "server.log"), "-w", "-t", "60", "-o", settings, "start"]);
  if (code === 0) return;
  if (tries === 0) throw new Error(`PostgreSQL did not come back: ${readFileSync(join(data, "..", "server.log"), "utf8").slice(-1_000)}`);
  await new Promise((resolve) => setTimeout(resolve, 250));
  return revive(data, url, tries - 1);
}
