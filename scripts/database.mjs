import { mkdirSync } from "node:fs";
import { root, stateFolder } from "./places.mjs";
import { startCluster } from "./postgres.mjs";
import { ensurePostgres } from "./postgresPrograms.mjs";
import { run } from "./run.mjs";
import { secretsIn } from "./secrets.mjs";
import { Sentence } from "./sentence.mjs";

/** The product's database: the one the environment names, else a cluster of this checkout's own. */
export async function openDatabase() {
  const url = process.env.DATABASE_URL;
  if (url) {
    mkdirSync(stateFolder, { recursive: true, mode: 0o711 });
    return { url, secrets: secretsIn(stateFolder), stop: async () => {} };
  }
  await ensurePostgres();
  const cluster = await startCluster();
  return { ...cluster, secrets: secretsIn(cluster.folder) };
}

/** Brings the schema up to date and, where asked, loads the demo. */
export async function prepareDatabase(environment, { demo }) {
  const verbs = demo ? ["up", "seed"] : ["up"];
  const args = ["--conditions=react-server", "--import", "tsx", "scripts/migrate.ts", ...verbs];
  const code = await run(process.execPath, args, { cwd: root, env: { ...process.env, ...environment } });
  if (code === 0) return;
  const named = process.env.DATABASE_URL ? " It is the one that DATABASE_URL names: is it running, and may its role make tables?" : "";
  throw new Sentence(`The database could not be brought up to date; the reason stands above.${named}`);
}
