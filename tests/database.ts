import { randomUUID } from "node:crypto";
import pg from "pg";

/** Makes a database with the whole schema and no rows, and gives its address. It goes with the cluster. */
export const createDatabase = () => makeDatabase("template template_app");

/** Makes a database that nobody has prepared, and gives its address. */
export const createEmptyDatabase = () => makeDatabase("");

async function makeDatabase(how: string): Promise<string> {
  const name = `t_${randomUUID().replaceAll("-", "")}`;
  await asAdmin(`create database ${name} ${how}`);
  return Object.assign(new URL(adminAddress()), { pathname: `/${name}` }).href;
}

/** Empties every table of this file's database but the record of migrations. */
export async function emptyTables(): Promise<void> {
  const client = new pg.Client({ connectionString: process.env.DATABASE_URL });
  await client.connect();
  const { rows } = await client.query<{ name: string }>(
    "select quote_ident(tablename) as name from pg_tables where schemaname = 'public' and tablename <> 'migrations'",
  );
  if (rows.length) await client.query(`truncate ${rows.map(({ name }) => name).join(", ")} cascade`);
  await client.end();
}

function adminAddress(): string {
  const address = process.env.DATABASE_ADMIN_URL;
  if (!address) throw new Error("DATABASE_ADMIN_URL is not set: this belongs to the project `database`.");
  return address;
}

/** The template takes one copy at a time: a twin that comes in between waits. */
async function asAdmin(statement: string, tries = 50): Promise<void> {
  const client = new pg.Client({ connectionString: adminAddress() });
  await client.connect();
  try {
    await client.query(statement);
  } catch (fault) {
    const busy = fault instanceof pg.DatabaseError && fault.code === "55006";
    if (!busy || tries === 1) throw fault;
    await new Promise((resolve) => setTimeout(resolve, 100));
    await asAdmin(statement, tries - 1);
  } finally {
    await client.end();
  }
}
