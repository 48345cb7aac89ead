import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";

const root = fileURLToPath(new URL("../../", import.meta.url));

function filesOf(folder: string): { file: string; text: string }[] {
  return readdirSync(root + folder, { recursive: true, encoding: "utf8" })
    .filter((file) => /\.tsx?$/.test(file))
    .map((file) => ({ file: `${folder}/${file}`, text: readFileSync(`${root}${folder}/${file}`, "utf8") }));
}

const files = [...filesOf("models"), ...filesOf("app")];
const shipped = [...files, ...filesOf("scripts").filter(({ file }) => file === "scripts/seed.ts")];

/** The arguments of each call of a method, brackets balanced. */
function callsOf(text: string, method: RegExp): string[] {
  return [...text.matchAll(method)].map(({ index, 0: start }) => {
    let depth = 1;
    let end = index + start.length;
    for (; depth > 0 && end < text.length; end += 1) depth += text[end] === "(" ? 1 : text[end] === ")" ? -1 : 0;
    return text.slice(index, end);
  });
}

const calls = (method: RegExp) => shipped.flatMap(({ file, text }) => callsOf(text, method).map((call) => ({ file, call })));

describe("the sources keep to the rules of the database", () => {
  it("there is something to read", () => {
    expect(files.length).toBeGreaterThan(40);
    expect(calls(/\.(create|bulkCreate)\(/g).length).toBeGreaterThan(5);
  });

  it("nothing is written to, removed or looked for everywhere at once", () => {
    expect(shipped.filter(({ text }) => /where:\s*\{\s*\}/.test(text)).map(({ file }) => file)).toEqual([]);
    expect(calls(/\.(destroy|findAll|findOne|count)\(/g).filter(({ call }) => !/\bwhere\b/.test(call))).toEqual([]);
    expect(shipped.filter(({ text }) => /truncate/i.test(text)).map(({ file }) => file)).toEqual([]);
  });

  it("no key of a request becomes a key of a query", () => {
    expect(shipped.filter(({ text }) => /(where|order|attributes|include):\s*(body|params|patch|request)/.test(text)).map(({ file }) => file)).toEqual([]);
  });

  it("what only the server may read says so in its first line", () => {
    const server = [...filesOf("app/_server").map(({ file }) => file), "models/index.ts"];
    const silent = server.filter((file) => !readFileSync(root + file, "utf8").startsWith('import "server-only";'));
    expect(silent).toEqual([]);
  });
});
