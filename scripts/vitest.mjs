import { existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { root } from "./places.mjs";
import { runGroup } from "./run.mjs";

/** Runs projects of the test runner; a run that ends without its counts is one failure. */
export async function runVitest(projects, environment = {}, more = []) {
  const folder = mkdtempSync(join(tmpdir(), "stillyard-counts-"));
  const file = join(folder, "counts.json");
  const args = ["node_modules/vitest/vitest.mjs", "run", ...projects.flatMap((name) => ["--project", name]), ...more];
  const code = await runGroup(process.execPath, args, {
    cwd: root,
    env: { ...process.env, ...environment, NODE_ENV: "test", STILLYARD_COUNTS: file },
  });
  const counts = existsSync(file) ? JSON.parse(readFileSync(file, "utf8")) : { passed: 0, failed: 0, skipped: 0 };
  rmSync(folder, { recursive: true });
  if (code !== 0 && counts.failed === 0) counts.failed = 1;
  return counts;
}
