import { createHash } from "node:crypto";
import { existsSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { alone, holderOf } from "./lock.mjs";
import { root } from "./places.mjs";
import { runGroup } from "./run.mjs";
import { Sentence } from "./sentence.mjs";

/** All a build reads. */
const sources = [
  "app", "components", "data", "lib", "models", "public", "scripts/headers.mjs",
  "instrumentation.ts", "next.config.mjs", "package-lock.json", "postcss.config.mjs", "proxy.ts", "tailwind.config.ts", "tsconfig.json",
];

/** Builds when the sources changed since the last build; gives the folder to serve from. */
export function ensureBuild(folder = ".next") {
  return alone(`build${folder}`, async () => {
    const stamp = stampOfSources();
    if (stampOf(folder) === stamp) return folder;
    console.log("Build: the pages changed, building them (about a minute) ...");
    rmSync(join(root, folder, "stamp"), { force: true });
    // Types of routes that are gone would break the build.
    for (const types of ["types", "dev/types"]) rmSync(join(root, folder, types), { recursive: true, force: true });
    await build(folder);
    writeFileSync(join(root, folder, "stamp"), stamp);
    return folder;
  });
}

/** The folder for a build by a test: never the one a running product is being served from while it is older. */
export function buildFolderForTests() {
  return stampOf(".next") !== stampOfSources() && holderOf("start") ? ".next-test" : ".next";
}

async function build(folder) {
  const env = { ...process.env, NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1", STILLYARD_BUILD_FOLDER: folder };
  const code = await runGroup(process.execPath, ["node_modules/next/dist/bin/next", "build"], {
    cwd: root,
    env,
    name: `build${folder}`,
  });
  if (code !== 0) throw new Sentence("The build failed.");
}

function stampOf(folder) {
  const path = join(root, folder, "stamp");
  return existsSync(path) && existsSync(join(root, folder, "BUILD_ID")) ? readFileSync(path, "utf8") : undefined;
}

function stampOfSources() {
  const hash = createHash("sha256");
  for (const path of sources.flatMap(filesUnder)) hash.update(`${path}\0`).update(readFileSync(join(root, path))).update("\0");
  return hash.digest("hex");
}

function filesUnder(path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [path];
  return readdirSync(full).sort().flatMap((name) => filesUnder(join(path, name)));
}
