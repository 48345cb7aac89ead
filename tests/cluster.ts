import { execFileSync } from "node:child_process";
import pg from "pg";
import { startPassingCluster } from "../scripts/postgres.mjs";

export const templateName = "template_app";

/** Gives the tests a PostgreSQL server, their own unless one is named, with a template that holds the migrated schema. */
export default async function prepareCluster() {
  const own = process.env.DATABASE_ADMIN_URL ? undefined : await startPassingCluster();
  process.env.DATABASE_ADMIN_URL ??= own?.adminUrl;
  await createTemplate(process.env.DATABASE_ADMIN_URL!);
  return async () => {
    await own?.stop();
  };
}

async function createTemplate(adminUrl: string) {
  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  await admin.query(`drop database if exists ${templateName} with (force)`);
  await admin.query(`create database ${templateName}`);
  await admin.end();
  const template = Object.assign(new URL(adminUrl), { pathname: `/${templateName}` });
  migrate(template.href);
}

function migrate(databaseUrl: string) {
  const script = ["--conditions=react-server", "--import", "tsx", "scripts/migrate.ts", "up"];
  execFileSync(process.execPath, script, {
    env: { ...process.env, DATABASE_URL: databaseUrl, NODE_ENV: "test" },
    stdio: ["ignore", "ignore", "inherit"],
  });
}
