import { writeFileSync } from "node:fs";
import type { Reporter, SerializedError, TestModule } from "vitest/node";

type Counts = { passed: number; failed: number; skipped: number };

/** Ends a run with one line of counts, and leaves them in STILLYARD_COUNTS for the runner of all steps. */
export default class ClosingLine implements Reporter {
  onTestRunEnd(modules: readonly TestModule[], faults: readonly SerializedError[]) {
    const counts = modules.map(countModule).reduce(add, { passed: 0, failed: faults.length, skipped: 0 });
    console.log(`${counts.passed} passed, ${counts.failed} failed, ${counts.skipped} skipped`);
    if (process.env.STILLYARD_COUNTS) writeFileSync(process.env.STILLYARD_COUNTS, JSON.stringify(counts));
  }
}

function countModule(module: TestModule): Counts {
  const tests = [...module.children.allTests()];
  const inState = (state: string) => tests.filter((test) => test.result().state === state).length;
  const passed = inState("passed");
  const skipped = inState("skipped");
  // A test that never ended counts as failed, and so does a file that broke outside its tests.
  const failed = tests.length - passed - skipped;
  const broken = !module.ok() && failed === 0 ? 1 : 0;
  return { passed, failed: failed + broken, skipped };
}

function add(a: Counts, b: Counts): Counts {
  return { passed: a.passed + b.passed, failed: a.failed + b.failed, skipped: a.skipped + b.skipped };
}
