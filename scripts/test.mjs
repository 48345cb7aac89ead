import { existsSync, rmSync } from "node:fs";
import { join } from "node:path";
import { buildFolderForTests, ensureBuild } from "./build.mjs";
import { installPackage } from "./debian.mjs";
import { ensurePackages } from "./packages.mjs";
import { root } from "./places.mjs";
import { startPassingCluster } from "./postgres.mjs";
import { ensurePostgres } from "./postgresPrograms.mjs";
import { endRuns, runGroup } from "./run.mjs";
import { tellFault } from "./sentence.mjs";
import { endOnSignal } from "./serve.mjs";
import { runVitest } from "./vitest.mjs";

const quick = process.argv.includes("--quick");
const chromium = "/usr/bin/chromium";

const total = { passed: 0, failed: 0, skipped: 0 };
const begun = { cluster: undefined };

const end = endOnSignal(async () => {
  endRuns();
  await (await begun.cluster?.catch(() => undefined))?.stop();
  if (total.skipped) console.log(`${total.skipped} skipped`);
  console.log(`Tests: ${total.passed} passed, ${total.failed} failed`);
});

try {
  await testAll();
} catch (fault) {
  tellFault(fault);
  total.failed += 1;
}
await end(total.failed === 0 && total.passed > 0 ? 0 : 1);

async function testAll() {
  await ensurePackages();
  await ensurePostgres();
  if (!quick && !existsSync(chromium)) await installPackage("chromium", "The journeys need a browser.");
  await step("Types", checkTypes);
  await step("Lint", () => node("node_modules/eslint/bin/eslint.js", ".", "--max-warnings", "0"));
  begun.cluster = startPassingCluster();
  const { adminUrl } = await begun.cluster;
  add(await runVitest(["unit", "database", "components"], { DATABASE_ADMIN_URL: adminUrl }));
  if (!quick) await testInBrowser(adminUrl);
}

/** Every journey starts a product of its own from the one build. */
async function testInBrowser(adminUrl) {
  const folder = buildFolderForTests();
  const built = await step("Build", () => ensureBuild(folder).then(() => 0));
  if (!built) return console.error("The journeys were not run: there is no build.");
  add(await runVitest(["journeys"], { DATABASE_ADMIN_URL: adminUrl, STILLYARD_BUILD_FOLDER: folder }));
}

/** Types of pages and routes are written first; left-overs of routes that are gone would be read as errors. */
async function checkTypes() {
  for (const folder of [".next/types", ".next/dev/types", ".next-test/types"]) rmSync(join(root, folder), { recursive: true, force: true });
  const code = await node("node_modules/next/dist/bin/next", "typegen");
  return code || node("node_modules/typescript/bin/tsc", "--noEmit", "-p", ".");
}

function node(...args) {
  return runGroup(process.execPath, args, { cwd: root, env: { ...process.env, NEXT_TELEMETRY_DISABLED: "1" } });
}

/** One check that is not a test of the runner counts as one. */
async function step(name, check) {
  const began = Date.now();
  const code = await check().catch((fault) => (tellFault(fault), 1));
  console.log(`${name}: ${code === 0 ? "passed" : "failed"} (${Math.round((Date.now() - began) / 1000)} s)`);
  add(code === 0 ? { passed: 1, failed: 0, skipped: 0 } : { passed: 0, failed: 1, skipped: 0 });
  return code === 0;
}

function add(counts) {
  for (const key of Object.keys(total)) total[key] += counts[key];
}
