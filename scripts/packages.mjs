import { readFileSync } from "node:fs";
import { join } from "node:path";
import { alone } from "./lock.mjs";
import { root } from "./places.mjs";
import { runGroup } from "./run.mjs";
import { Sentence } from "./sentence.mjs";

/** Settings of npm that say where packages come from; all others are dropped, as `omit=dev` would break the build. */
const kept = /^npm_config_(registry|userconfig|globalconfig|cache|proxy|https_proxy|noproxy|ca|cafile|strict_ssl)$/i;

/** Brings node_modules to the state of the lock file. */
export function ensurePackages() {
  checkNode();
  return alone("packages", async () => {
    if (packagesAreCurrent()) return;
    console.log("Packages: installing from the lock file (about two minutes) ...");
    const code = await runGroup(...npm("ci", "--include=dev"), {
      cwd: root,
      env: plainEnvironment(),
      name: "packages",
    });
    if (code !== 0) throw new Sentence("The packages could not be installed: is the package registry within reach?");
  });
}

function checkNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major > 20 || (major === 20 && minor >= 9)) return;
  throw new Sentence(`Stillyard needs Node 20.9 or newer; this is ${process.versions.node}.`);
}

/** npm leaves a copy of what it installed; each package of the lock must stand in it, save optional ones of other machines. */
function packagesAreCurrent() {
  const wanted = packagesIn("package-lock.json");
  const present = packagesIn("node_modules/.package-lock.json");
  if (!wanted || !present) return false;
  return Object.entries(wanted).every(([path, { version, integrity, optional }]) => {
    if (path === "") return true;
    const found = present[path];
    return found ? found.version === version && found.integrity === integrity : Boolean(optional);
  });
}

function packagesIn(file) {
  try {
    return JSON.parse(readFileSync(join(root, file), "utf8")).packages;
  } catch {
    return undefined;
  }
}

function npm(...args) {
  const path = process.env.npm_execpath;
  return path?.endsWith("npm-cli.js") ? [process.execPath, [path, ...args]] : ["npm", args];
}

function plainEnvironment() {
  const entries = Object.entries(process.env);
  return Object.fromEntries(entries.filter(([key]) => key !== "NODE_ENV" && (kept.test(key) || !/^npm_config_/i.test(key))));
}
