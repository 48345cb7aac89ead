import { readdirSync } from "node:fs";
import { fileURLToPath, pathToFileURL } from "node:url";
import pg from "pg";
import { type QueryInterface, QueryTypes, Sequelize } from "sequelize";
import { Umzug } from "umzug";

type Step = (given: { context: QueryInterface }) => Promise<unknown>;
type Migration = { up: Step; down: Step };

const folder = fileURLToPath(new URL("../migrations/", import.meta.url));
/** Any number that all our runs share: two runs at once take turns. */
const turn = 7_455_931;

/**
 * The migrations of a database, over one connection: each step and its record are one transaction,
 * so a step that fails half-way leaves nothing. Close it when done.
 */
export async function openMigrator(databaseUrl: string) {
  const sequelize = connect(databaseUrl);
  await sequelize.query("select pg_advisory_lock(:turn)", { replacements: { turn } });
  await sequelize.query("set lock_timeout = '3s'");
  await sequelize.query(
    "create table if not exists migrations (name text primary key, run_at timestamptz not null default now())",
  );
  const umzug = new Umzug({
    migrations: migrationNames().map((name) => wholeMigration(sequelize, name)),
    context: sequelize.getQueryInterface(),
    storage: {
      executed: () => recordedNames(sequelize),
      // The record is written inside the step's own transaction.
      logMigration: async () => {},
      unlogMigration: async () => {},
    },
    logger: undefined,
  });
  return { umzug, close: () => sequelize.close() };
}

/** One connection only, kept: every statement of a step runs inside the transaction begun on it. */
function connect(databaseUrl: string) {
  return new Sequelize(databaseUrl, {
    dialect: "postgres",
    dialectModule: pg,
    logging: false,
    pool: { min: 1, max: 1, idle: 3_600_000, evict: 3_600_000, acquire: 10_000 },
  });
}

function migrationNames() {
  return readdirSync(folder)
    .filter((file) => /^\d{8,12}-[a-z0-9-]+\.ts$/.test(file))
    .map((file) => file.replace(/\.ts$/, ""))
    .sort();
}

function wholeMigration(sequelize: Sequelize, name: string) {
  const load = () => import(pathToFileURL(`${folder}${name}.ts`).href) as Promise<Migration>;
  const context = sequelize.getQueryInterface();
  const replacements = { name };
  return {
    name,
    up: () =>
      inTransaction(sequelize, async () => {
        await (await load()).up({ context });
        await sequelize.query("insert into migrations (name) values (:name)", { replacements });
      }),
    down: () =>
      inTransaction(sequelize, async () => {
        await (await load()).down({ context });
        await sequelize.query("delete from migrations where name = :name", { replacements });
      }),
  };
}

async function inTransaction(sequelize: Sequelize, step: () => Promise<void>) {
  await sequelize.query("begin");
  try {
    await step();
    await sequelize.query("commit");
  } catch (fault) {
    await sequelize.query("rollback");
    throw fault;
  }
}

async function recordedNames(sequelize: Sequelize) {
  const rows = await sequelize.query<{ name: string }>("select name from migrations order by name", {
    type: QueryTypes.SELECT,
  });
  return rows.map(({ name }) => name);
}

/** `up` runs all that are missing; `down` takes back the last one, `down all` every one; `seed` loads the demo. */
async function obey(verbs: string[], databaseUrl: string) {
  for (const [index, verb] of verbs.entries()) {
    if (verb === "all") continue;
    if (verb === "seed") await (await import("./seed")).seed();
    else if (verb === "up") await move(databaseUrl, (umzug) => umzug.up());
    else if (verb === "down") await move(databaseUrl, (umzug) => umzug.down(verbs[index + 1] === "all" ? { to: 0 } : {}));
    else throw new Error(`There is no "${verb}" here: up, down, down all or seed.`);
  }
}

async function move(databaseUrl: string, by: (umzug: Umzug<QueryInterface>) => Promise<{ name: string }[]>) {
  const { umzug, close } = await openMigrator(databaseUrl);
  try {
    for (const { name } of await by(umzug)) console.log(`migrated ${name}`);
  } finally {
    await close();
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href) {
  const databaseUrl = process.env.DATABASE_URL;
  if (!databaseUrl) throw new Error("DATABASE_URL is not set.");
  const verbs = process.argv.slice(2);
  await obey(verbs.length ? verbs : ["up"], databaseUrl);
  process.exit(0);
}
