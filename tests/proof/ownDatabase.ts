import { randomUUID } from "node:crypto";
import pg from "pg";
import { openMigrator } from "../../scripts/migrate";

/** A migrated database of this file's own beside the served product's, named before the handlers are imported. */
export async function openOwnDatabase(): Promise<void> {
  const adminUrl = process.env.DATABASE_ADMIN_URL;
  if (!adminUrl) throw new Error("DATABASE_ADMIN_URL is not set: run npm run proof.");
  const name = `p_${randomUUID().replaceAll("-", "")}`;
  const admin = new pg.Client({ connectionString: adminUrl });
  await admin.connect();
  await admin.query(`create database ${name}`);
  await admin.end();
  const url = Object.assign(new URL(adminUrl), { pathname: `/${name}` }).href;
  const { umzug, close } = await openMigrator(url);
  await umzug.up();
  await close();
  process.env.DATABASE_URL = url;
  process.env.STILLYARD_ORIGIN ??= "http://localhost:3000";
  process.env.STILLYARD_SESSION_KEYS ??= "c3RpbGx5YXJkLXRlc3RzLW9ubHktc2Vzc2lvbi1rZXkx";
  process.env.STILLYARD_PEPPER ??= "c3RpbGx5YXJkLXRlc3RzLW9ubHktcGVwcGVyLXBlcHBlcg";
  // What a session may ask is not what is proved with it.
  process.env.STILLYARD_REQUESTS_A_MINUTE ??= "1000000";
  process.env.STILLYARD_WRITES_IN_10_S ??= "1000000";
}
