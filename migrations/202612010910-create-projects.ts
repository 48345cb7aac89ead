import type { QueryInterface } from "sequelize";

/** A project, who was invited to it, and every change of its plan. */
const forward = `
create table projects (
  id uuid primary key,
  team_id uuid not null references teams (id) on delete restrict,
  name text not null check (length(name) between 1 and 120),
  says text not null default '' check (length(says) <= 400),
  stage text not null default '' check (length(stage) <= 120),
  time_zone text not null check (length(time_zone) between 1 and 60),
  currency text not null check (currency ~ '^[A-Z]{3}$'),
  revision integer not null default 0 check (revision >= 0),
  changed_at timestamptz not null default now(),
  archived_at timestamptz,
  created_at timestamptz not null default now()
);
create index projects_by_team on projects (team_id);
create table participations (
  project_id uuid not null references projects (id) on delete cascade,
  user_id uuid not null references users (id) on delete cascade,
  role text not null check (role in ('client', 'builder')),
  primary key (project_id, user_id, role)
);
create index participations_by_user on participations (user_id);
-- Revision n of a plan is the state after row n; row 0 does not exist.
create table revisions (
  project_id uuid not null references projects (id) on delete cascade,
  revision integer not null check (revision > 0),
  user_id uuid references users (id) on delete set null,
  role text not null check (role in ('owner', 'acoustician', 'client', 'builder')),
  at timestamptz not null default now(),
  acts jsonb not null check (jsonb_typeof(acts) = 'array'),
  primary key (project_id, revision)
);
`;

const back = `
drop table revisions;
drop table participations;
drop table projects;
`;

export async function up({ context }: { context: QueryInterface }) {
  await context.sequelize.query(forward);
}

export async function down({ context }: { context: QueryInterface }) {
  await context.sequelize.query(back);
}
