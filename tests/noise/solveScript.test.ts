import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { answerOf, buildCase } from "./buildCase";

const ROOT = fileURLToPath(new URL("../..", import.meta.url));
let folder = "";
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "stillyard-case-"));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function runSolve(name: string, input = "") {
  return spawnSync(
    process.execPath,
    ["--conditions=react-server", "--import", "tsx", "scripts/solve.ts", name],
    { cwd: ROOT, input, encoding: "utf8" },
  );
}

describe("npm run solve", () => {
  test("answers a file with one document, in full precision", () => {
    const file = join(folder, "case.json");
    writeFileSync(file, JSON.stringify(buildCase()));
    const { stdout, status } = runSolve(file);
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toEqual(JSON.parse(JSON.stringify(answerOf(buildCase()))));
  });
  test("reads standard input and tells a fault on standard error", () => {
    const { stderr, stdout, status } = runSolve(
      "-",
      JSON.stringify(buildCase({ receivers: [{ id: "r", kind: "room", room: "attic" }] })),
    );
    expect([status, stdout]).toEqual([1, ""]);
    expect(JSON.parse(stderr)).toEqual({
      error: { message: 'no room is called "attic"', path: "receivers[0].room" },
    });
  });
  test("tells what is not JSON", () => {
    const { stderr, status } = runSolve("-", "{");
    expect(status).toBe(1);
    expect(JSON.parse(stderr).error.message.length).toBeGreaterThan(5);
  });
});
