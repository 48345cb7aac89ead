import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import { dirname, join, relative, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";

const ROOT = fileURLToPath(new URL("..", import.meta.url));
const ROOMS = ["app", "components", "data", "lib", "migrations", "models", "scripts", "tests"];
const ENDINGS = [".ts", ".tsx", ".mjs"];

interface Import {
  /** File of the project, or the name of a package. */
  readonly to: string;
  readonly typeOnly: boolean;
}
interface SourceFile {
  readonly name: string;
  readonly text: string;
  readonly imports: readonly Import[];
}

function filesIn(folder: string): string[] {
  if (!existsSync(folder)) return [];
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory())
      return entry.name.startsWith(".") || entry.name === "node_modules" ? [] : filesIn(path);
    return ENDINGS.some((ending) => entry.name.endsWith(ending)) ? [path] : [];
  });
}

/** The file that an import line means; the bare name of a package. */
function targetOf(file: string, words: string): string {
  const base = words.startsWith("@/")
    ? join(ROOT, words.slice(2))
    : words.startsWith(".")
      ? resolve(dirname(file), words)
      : null;
  if (!base) return words;
  const found = [
    base,
    ...ENDINGS.map((ending) => base + ending),
    ...ENDINGS.map((ending) => join(base, `index${ending}`)),
  ].find((path) => existsSync(path) && statSync(path).isFile());
  return relative(ROOT, found ?? base);
}

const FROM = /(?:^|\n)\s*(import|export)\s+(type\s+)?([^"'();]*?)\s*from\s*["']([^"']+)["']/g;
const BARE = /(?:^|\n)\s*import\s*["']([^"']+)["']/g;
const CALLED = /\bimport\(\s*["']([^"']+)["']\s*\)/g;

function isTypeOnly(keyword: string | undefined, names: string): boolean {
  if (keyword) return true;
  const listed = /^\{([\s\S]*)\}$/
    .exec(names.trim())?.[1]
    .split(",")
    .map((name) => name.trim())
    .filter(Boolean);
  return listed !== undefined && listed.length > 0 && listed.every((name) => name.startsWith("type "));
}

function importsOf(file: string, text: string): Import[] {
  const from = [...text.matchAll(FROM)].map(([, , type, names, words]) => ({
    to: targetOf(file, words),
    typeOnly: isTypeOnly(type, names),
  }));
  const plain = [...text.matchAll(BARE), ...text.matchAll(CALLED)].map(([, words]) => ({
    to: targetOf(file, words),
    typeOnly: false,
  }));
  return [...from, ...plain];
}

/** Code without comments, texts and the words between quotes. */
function codeOf(text: string): string {
  return text
    .replace(/\/\*[\s\S]*?\*\//g, "")
    .replace(/(^|[^:"'`])\/\/[^\n]*/g, "$1")
    .replace(/"(?:[^"\\\n]|\\.)*"/g, '""');
}

const files: SourceFile[] = ROOMS.flatMap((room) => filesIn(join(ROOT, room))).map((path) => {
  const text = readFileSync(path, "utf8");
  return { name: relative(ROOT, path), text, imports: importsOf(path, text) };
});
const inRoom = (room: string) => files.filter(({ name }) => name.startsWith(`${room}/`));
const ours = (to: string) => ROOMS.some((room) => to.startsWith(`${room}/`));

/** Import lines of a room that break a rule, as "file imports target". */
function breaches(room: string, breaks: (each: Import, file: SourceFile) => boolean): string[] {
  return inRoom(room).flatMap((file) =>
    file.imports.filter((each) => breaks(each, file)).map(({ to }) => `${file.name} imports ${to}`),
  );
}
const into =
  (...rooms: string[]) =>
  ({ to }: Import) =>
    rooms.some((room) => to.startsWith(`${room}/`));

describe("imports go down or stay on their floor", () => {
  test("the reader of import lines sees them", () => {
    expect(files.length).toBeGreaterThan(50);
    const solver = files.find(({ name }) => name === "lib/noise/solve.ts");
    expect(solver?.imports.map(({ to }) => to)).toContain("lib/noise/effective.ts");
    expect(importsOf(join(ROOT, "lib/noise/x.ts"), 'import { type A, type B } from "./bands";')).toEqual([
      { to: "lib/noise/bands.ts", typeOnly: true },
    ]);
  });
  test("data holds no code", () => expect(inRoom("data").map(({ name }) => name)).toEqual([]));
  test("lib/noise imports data, zod and mathjs alone", () => {
    expect(
      breaches(
        "lib",
        ({ to }) =>
          !to.startsWith("lib/noise/") && !to.startsWith("data/") && to !== "zod" && to !== "mathjs",
      ),
    ).toEqual([]);
  });
  test("lib/noise has no clock, chance, process or network", () => {
    const impure = /\bnew Date\b|\bDate\.|\bMath\.random\b|\bprocess\.|\bfetch\(|\bperformance\./;
    expect(
      inRoom("lib")
        .filter(({ text }) => impure.test(codeOf(text)))
        .map(({ name }) => name),
    ).toEqual([]);
  });
  test("models know neither pages nor components", () =>
    expect(breaches("models", into("app", "components", "tests", "scripts"))).toEqual([]));
  test("a model imports no other model: associations stand together in the index", () => {
    const isModel = (name: string) => /^models\/[A-Z]\w*\.ts$/.test(name);
    expect(inRoom("models").filter(({ name }) => isModel(name)).length).toBeGreaterThan(10);
    expect(breaches("models", ({ to }, { name }) => isModel(name) && isModel(to))).toEqual([]);
  });
  test("components know neither models nor pages", () =>
    expect(breaches("components", into("models", "app", "tests", "scripts", "data"))).toEqual([]));
  test("components take values of bands.ts alone from lib/noise", () => {
    expect(
      breaches(
        "components",
        ({ to, typeOnly }) => to.startsWith("lib/noise/") && to !== "lib/noise/bands.ts" && !typeOnly,
      ),
    ).toEqual([]);
  });
  test("the front door knows no components", () => {
    expect(
      breaches("app", ({ to }, { name }) => name.startsWith("app/_server/") && to.startsWith("components/")),
    ).toEqual([]);
  });
  test("pages open models through the front door; a route may also use models/parts", () => {
    const allowed = (file: string, to: string) => to === "models/parts.ts" && file.endsWith("/route.ts");
    expect(
      breaches(
        "app",
        ({ to, typeOnly }, { name }) =>
          !name.startsWith("app/_server/") && to.startsWith("models/") && !typeOnly && !allowed(name, to),
      ),
    ).toEqual([]);
  });
  test("migrations import nothing of ours", () => {
    expect(breaches("migrations", ({ to }) => ours(to) && !to.startsWith("migrations/"))).toEqual([]);
  });
  test("the front door and the index of models are for the server only", () => {
    const guarded = files.filter(
      ({ name }) => name === "models/index.ts" || (name.startsWith("app/_server/") && name.endsWith(".ts")),
    );
    expect(
      guarded
        .filter(({ imports }) => imports.every(({ to }) => to !== "server-only"))
        .map(({ name }) => name),
    ).toEqual([]);
  });
});

/** Circles of import lines, each as the way round. */
function circles(): string[] {
  const next = new Map(files.map(({ name, imports }) => [name, imports.map(({ to }) => to)]));
  const done = new Set<string>();
  const found: string[] = [];
  const walk = (name: string, way: readonly string[]): void => {
    if (way.includes(name)) return void found.push([...way.slice(way.indexOf(name)), name].join(" > "));
    if (done.has(name)) return;
    for (const to of next.get(name) ?? []) if (next.has(to)) walk(to, [...way, name]);
    done.add(name);
  };
  for (const { name } of files) walk(name, []);
  return found;
}

describe("files", () => {
  test("import each other in no circle", () => expect(circles()).toEqual([]));
  test("above 250 lines say why in their first line", () => {
    const long = files.filter(({ text }) => text.split("\n").length > 251 && !/^(\/\/|\/\*)/.test(text));
    expect(long.map(({ name }) => name)).toEqual([]);
  });
  test("are not called utils or types", () => {
    expect(
      files
        .filter(({ name }) => /(^|\/)(utils?|types|helpers)\.(ts|tsx|mjs)$/.test(name))
        .map(({ name }) => name),
    ).toEqual([]);
  });
  test("know no any", () => {
    const untyped = /(:\s*|\bas\s+|<)any\b(?!\w)|\bany\[\]/;
    expect(
      files
        .filter(({ name, text }) => name !== "tests/house.test.ts" && untyped.test(codeOf(text)))
        .map(({ name }) => name),
    ).toEqual([]);
  });
  test("of the screen carry no style of their own: the content policy blocks it", () => {
    const styled = /\bstyle\s*=\s*[{"]|\bstyle:\s*[{"]|\.style\.|setAttribute\("style"/;
    const screen = [...inRoom("app"), ...inRoom("components")];
    expect(screen.length).toBeGreaterThan(10);
    expect(screen.filter(({ text }) => styled.test(text)).map(({ name }) => name)).toEqual([]);
  });
});
