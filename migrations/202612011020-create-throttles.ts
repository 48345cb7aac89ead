import type { QueryInterface } from "sequelize";

/** Tries that are counted, and the browsers that were signed in before. Keys are keyed hashes: no address stands here. */
const forward = `
create table throttles (
  key text primary key check (length(key) = 43),
  tries integer not null check (tries >= 0),
  since timestamptz not null,
  last_at timestamptz not null
);
create index throttles_by_last on throttles (last_at);
create table known_browsers (
  id_hash text not null check (length(id_hash) = 64),
  user_id uuid not null references users (id) on delete cascade,
  seen_at timestamptz not null default now(),
  primary key (id_hash, user_id)
);
create index known_browsers_by_user on known_browsers (user_id);
`;

const back = `
drop table known_browsers;
drop table throttles;
`;

export async function up({ context }: { context: QueryInterface }) {
  await context.sequelize.query(forward);
}

export async function down({ context }: { context: QueryInterface }) {
  await context.sequelize.query(back);
}
