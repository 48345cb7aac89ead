import { serveForTests } from "../../scripts/product.mjs";
import { freePort } from "../../scripts/port.mjs";
import { secretsFresh } from "../../scripts/secrets.mjs";
import { createEmptyDatabase } from "../database";

export interface Served {
  address: string;
  pid: number;
  stop: () => Promise<unknown>;
}

/**
 * A served product with a database of its own, whose rows the builders of the tests write: sessions among them, so that
 * many people are signed in without many sign-ins. `serve` starts it, again and again on the same port where it was killed.
 */
export async function prepareServed(): Promise<{ serve: () => Promise<Served> }> {
  const databaseUrl = await createEmptyDatabase();
  const given = { databaseUrl, folder: process.env.STILLYARD_BUILD_FOLDER, port: await freePort(), secrets: secretsFresh() };
  return {
    serve: async () => {
      const { address, environment, pid, stop } = await serveForTests(given);
      Object.assign(process.env, environment);
      return { address, pid: pid!, stop };
    },
  };
}
