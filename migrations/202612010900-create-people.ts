import type { QueryInterface } from "sequelize";

/** Who there is: people, the teams they belong to, and where they are signed in. */
const forward = `
create table teams (
  id uuid primary key,
  name text not null check (length(name) between 1 and 120),
  created_at timestamptz not null default now()
);
create table users (
  id uuid primary key,
  email text not null unique check (email = lower(email) and length(email) between 3 and 254),
  name text not null check (length(name) between 1 and 120),
  password_hash text not null,
  theme text not null default 'system' check (theme in ('light', 'dark', 'system')),
  created_at timestamptz not null default now()
);
create table memberships (
  team_id uuid not null references teams (id) on delete cascade,
  user_id uuid not null references users (id) on delete cascade,
  role text not null check (role in ('owner', 'acoustician')),
  primary key (team_id, user_id)
);
create index memberships_by_user on memberships (user_id);
-- A session is known by the hash of its id only. began_at outlives a change of id, issued_at does not.
create table sessions (
  id_hash text primary key check (length(id_hash) = 64),
  user_id uuid not null references users (id) on delete cascade,
  keep boolean not null default false,
  device text not null default '' check (length(device) <= 200),
  began_at timestamptz not null default now(),
  issued_at timestamptz not null default now(),
  seen_at timestamptz not null default now(),
  replaced_at timestamptz
);
create index sessions_by_user on sessions (user_id, seen_at desc);
`;

const back = `
drop table sessions;
drop table memberships;
drop table users;
drop table teams;
`;

export async function up({ context }: { context: QueryInterface }) {
  await context.sequelize.query(forward);
}

export async function down({ context }: { context: QueryInterface }) {
  await context.sequelize.query(back);
}
