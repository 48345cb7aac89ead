import { spawnSync } from "node:child_process";
import { readFileSync, rmSync } from "node:fs";
import { createServer } from "node:net";
import { expect, it, vi } from "vitest";
import { Sentence, tellFault } from "../../scripts/sentence.mjs";

function told(fault: unknown): unknown {
  const print = vi.spyOn(console, "error").mockImplementation(() => {});
  tellFault(fault);
  const [words] = print.mock.calls[0]!;
  print.mockRestore();
  return words;
}

it.each([["ENOSPC", /disk is full at \/x: free some space/], ["EACCES", /may not write at \/x/], ["EROFS", /disk that takes writing/]])("%s is told in one sentence that says what to do", (code, words) => {
  expect(told(Object.assign(new Error(`${code}: write`), { code, path: "/x" }))).toMatch(words);
});

it("a sentence is told as it is, and any other fault whole", () => {
  const fault = new Error("unknown");
  expect([told(new Sentence("Do this.")), told(fault)]).toEqual(["Do this.", fault]);
});

it("an old Node is told what is needed, in words of old", () => {
  const script = readFileSync("scripts/node.mjs", "utf8");
  expect(script).not.toMatch(/=>|`|\bconst\b|\blet\b|\?\.|\?\?/);
  const old = (version: string) => spawnSync(process.execPath, ["-e", `Object.defineProperty(process, "versions", { value: { node: "${version}" } });${script}`], { encoding: "utf8" });
  for (const version of ["12.22.0", "18.20.1", "20.8.9"]) {
    expect(old(version)).toMatchObject({ status: 1, stderr: expect.stringContaining(`needs Node 20.9 or newer; this is ${version}`) });
  }
  for (const version of ["20.9.0", "22.1.0"]) expect(old(version).status).toBe(0);
});

it("a port that is taken ends the start at once with one sentence", async () => {
  const holder = createServer();
  const port = await new Promise<number>((resolve) => holder.listen(0, "127.0.0.1", () => resolve((holder.address() as { port: number }).port)));
  const state = `/tmp/stillyard-port-${port}`;
  const { status, stderr } = spawnSync(process.execPath, ["scripts/start.mjs"], { encoding: "utf8", env: { ...process.env, PORT: String(port), STILLYARD_STATE: state } });
  holder.close();
  rmSync(state, { recursive: true, force: true });
  expect([status, stderr.trim()]).toEqual([1, `Port ${port} is taken by another program: free it, or choose another with PORT=3001 npm start.`]);
});
