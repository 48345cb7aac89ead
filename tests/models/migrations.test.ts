import pg from "pg";
import { afterAll, expect, it } from "vitest";
import { openMigrator } from "../../scripts/migrate";

const client = new pg.Client({ connectionString: process.env.DATABASE_URL });
afterAll(() => client.end());

async function schema(): Promise<string[]> {
  const { rows } = await client.query<{ line: string }>(`
    select table_name || '.' || column_name || ' ' || data_type || ' ' || is_nullable as line
      from information_schema.columns where table_schema = 'public'
    union all
    select conrelid::regclass || ' ' || conname || ' ' || pg_get_constraintdef(oid) from pg_constraint
      where connamespace = 'public'::regnamespace
    union all
    select indexdef from pg_indexes where schemaname = 'public'
    order by 1`);
  return rows.map(({ line }) => line).filter((line) => !/\bmigrations\b/.test(line));
}

it("every migration goes up, down and up again to the same schema", async () => {
  await client.connect();
  const { umzug, close } = await openMigrator(process.env.DATABASE_URL!);
  try {
    const before = await schema();
    expect(before.length).toBeGreaterThan(100);
    for (let left = (await umzug.executed()).length; left > 0; left -= 1) await umzug.down();
    expect(await schema()).toEqual([]);
    await umzug.up();
    expect(await schema()).toEqual(before);
  } finally {
    await close();
  }
});
