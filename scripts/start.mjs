import { readFileSync } from "node:fs";
import { createServer } from "node:net";
import { join } from "node:path";
import { ensureBuild } from "./build.mjs";
import { openDatabase, prepareDatabase } from "./database.mjs";
import { isLoopback } from "./headers.mjs";
import { takeLock } from "./lock.mjs";
import { ensurePackages } from "./packages.mjs";
import { root } from "./places.mjs";
import { endRuns } from "./run.mjs";
import { productEnvironment } from "./secrets.mjs";
import { Sentence, tellFault } from "./sentence.mjs";
import { endOnSignal, portTaken, serveProduct } from "./serve.mjs";

const developing = process.argv.includes("--dev");
const port = readPort();
const origin = process.env.STILLYARD_ORIGIN ?? `http://localhost:${port}`;
/** The demo's passwords are printed below: it stays off an address others can open, unless asked for. */
const demo = (process.env.STILLYARD_DEMO ?? (isLoopback(origin) ? "on" : "off")) === "on";

const begun = { database: undefined, product: undefined, lock: undefined };
let ending = false;

const end = endOnSignal(async () => {
  ending = true;
  endRuns();
  await settled(begun.product, (product) => product.stop());
  await settled(begun.database, (database) => database.stop());
  begun.lock?.release();
});

try {
  await start();
} catch (fault) {
  // A step cut short by the signal that ends us is no fault of its own.
  if (!ending) {
    tellFault(fault);
    await end(1);
  }
}

async function start() {
  begun.lock = lockStart();
  await refuseTakenPort();
  await ensurePackages();
  goOn();
  begun.database = openDatabase();
  const { url, secrets, folder } = await begun.database;
  if (folder && !folder.startsWith(root)) console.log(`Database: kept in ${folder}`);
  const environment = productEnvironment({ secrets, databaseUrl: url, port });
  goOn();
  if (!developing) await ensureBuild();
  goOn();
  const ready = prepareDatabase(environment, { demo });
  Object.assign(process.env, environment);
  begun.product = serveProduct({ developing, ready });
  const { inbox } = await begun.product;
  begun.lock.tell({ origin, port, serving: true });
  console.log(`\nStillyard is ready: ${origin}\n`);
  if (demo) printSignIns();
  if (inbox) console.log(`Mail is not sent but kept here: ${inbox}\n`);
  else if (!process.env.STILLYARD_SMTP) console.log("Mail waits: no server is named for it (STILLYARD_SMTP).\n");
  console.log("Stop it with Ctrl-C.");
}

/** One start at a time in this folder; a second one says where the first is. */
function lockStart() {
  const lock = takeLock("start", { origin, port });
  if (lock.held) return lock;
  const { pid, serving, origin: address } = lock.holder;
  throw new Sentence(`Stillyard ${serving ? "already runs" : "is already being started"} from this folder: ${address} (process ${pid}).`);
}

function readPort() {
  const value = Number(process.env.PORT || 3000);
  if (Number.isInteger(value) && value > 0 && value < 65_536) return value;
  console.error(`PORT must be a number between 1 and 65535, not "${process.env.PORT}".`);
  process.exit(1);
}

/** Told before the long steps, not after them. */
function refuseTakenPort() {
  return new Promise((resolve, reject) => {
    const probe = createServer().once("error", () => reject(portTaken(port)));
    probe.listen(port, "127.0.0.1", () => probe.close(resolve));
  });
}

function goOn() {
  if (ending) throw new Sentence("Stopped.");
}

/** Undoes a step if it was begun and came to something. */
async function settled(step, undo) {
  const value = await Promise.resolve(step).catch(() => undefined);
  if (value) await undo(value);
}

function printSignIns() {
  const people = JSON.parse(readFileSync(join(root, "data/examples/people.json"), "utf8"));
  console.log("Sign in to the demo as:");
  for (const { name, role, email, password } of people) console.log(`  ${email}  ${password}  (${name}, ${role})`);
  console.log();
}
