import { ensureBuild, buildFolderForTests } from "./build.mjs";
import { ensurePackages } from "./packages.mjs";
import { startPassingCluster } from "./postgres.mjs";
import { ensurePostgres } from "./postgresPrograms.mjs";
import { serveForTests } from "./product.mjs";
import { endRuns } from "./run.mjs";
import { tellFault } from "./sentence.mjs";
import { endOnSignal } from "./serve.mjs";
import { runVitest } from "./vitest.mjs";

/** The slow proofs against a served product; words after `npm run proof --` choose files. */
const chosen = process.argv.slice(2);
const begun = { cluster: undefined, product: undefined };
let code = 1;

const end = endOnSignal(async () => {
  endRuns();
  await (await begun.product?.catch(() => undefined))?.stop();
  await (await begun.cluster?.catch(() => undefined))?.stop();
});

try {
  code = await prove();
} catch (fault) {
  tellFault(fault);
}
await end(code);

async function prove() {
  await ensurePackages();
  await ensurePostgres();
  const folder = await ensureBuild(buildFolderForTests());
  begun.cluster = startPassingCluster();
  const { adminUrl, url } = await begun.cluster;
  begun.product = serveForTests({ databaseUrl: url, folder });
  const { address } = await begun.product;
  const counts = await runVitest(["proof"], { DATABASE_ADMIN_URL: adminUrl, STILLYARD_URL: address, STILLYARD_BUILD_FOLDER: folder }, chosen);
  console.log(`Proofs: ${counts.passed} passed, ${counts.failed} failed`);
  return counts.failed === 0 ? 0 : 1;
}
