import { fork } from "node:child_process";
import { join } from "node:path";
import { prepareDatabase } from "./database.mjs";
import { root } from "./places.mjs";
import { freePort } from "./port.mjs";
import { productEnvironment, secretsFresh } from "./secrets.mjs";
import { Sentence } from "./sentence.mjs";

/**
 * @param {{ databaseUrl: string, folder: string | undefined, port?: number, secrets?: ReturnType<typeof secretsFresh> }} given
 * Serves the built product with the demo on a free port, in a process of its own, for journeys and proofs. Its
 * `environment` lets a test write sessions that the product takes for its own.
 */
export async function serveForTests({ databaseUrl, folder, port: wanted, secrets = secretsFresh() }) {
  const port = wanted ?? (await freePort());
  const environment = {
    ...productEnvironment({ secrets, databaseUrl, port }),
    STILLYARD_BUILD_FOLDER: folder,
    STILLYARD_ORIGIN: `http://localhost:${port}`,
  };
  await prepareDatabase(environment, { demo: true });
  const child = fork(join(root, "scripts/serve.mjs"), { cwd: root, env: { ...process.env, ...environment } });
  const gone = new Promise((resolve) => child.once("exit", resolve));
  const ready = await Promise.race([new Promise((resolve) => child.once("message", () => resolve(true))), gone.then(() => false)]);
  if (!ready) throw new Sentence("The product could not be served for the tests.");
  return { address: environment.STILLYARD_ORIGIN, environment, pid: child.pid, stop: async () => (child.kill("SIGTERM"), await gone) };
}
