import type { QueryInterface } from "sequelize";

/** Work that follows an act and is written in the act's own transaction. */
const forward = `
create table jobs (
  id uuid primary key,
  kind text not null check (length(kind) between 1 and 60),
  payload jsonb not null,
  state text not null default 'waiting' check (state in ('waiting', 'done', 'dead')),
  tries integer not null default 0 check (tries >= 0),
  due_at timestamptz not null default now(),
  lease uuid,
  leased_until timestamptz,
  fault text check (length(fault) <= 500),
  made_at timestamptz not null default now(),
  ended_at timestamptz
);
create index jobs_waiting on jobs (due_at) where state = 'waiting';
create index jobs_ended on jobs (ended_at) where state <> 'waiting';
`;

const back = `
drop table jobs;
`;

export async function up({ context }: { context: QueryInterface }) {
  await context.sequelize.query(forward);
}

export async function down({ context }: { context: QueryInterface }) {
  await context.sequelize.query(back);
}
