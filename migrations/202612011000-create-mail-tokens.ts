import type { QueryInterface } from "sequelize";

/** Addresses that were checked, sessions that were proved, and the links that go out by mail. */
const forward = `
alter table users
  add column hat text not null default 'play' check (hat in ('play', 'advise', 'build')),
  add column email_checked_at timestamptz;
update users set email_checked_at = created_at;
-- A handle outlives a change of id and opens nothing: it names a session on the list of devices.
alter table sessions
  add column handle uuid not null default gen_random_uuid(),
  add column proved_at timestamptz not null default now();
-- A token is known by its SHA-256 only.
create table mail_tokens (
  token_hash text primary key check (length(token_hash) = 64),
  user_id uuid not null references users (id) on delete cascade,
  purpose text not null check (purpose in ('check', 'password', 'move', 'undo')),
  email text check (email = lower(email) and length(email) between 3 and 254),
  made_at timestamptz not null default now(),
  expires_at timestamptz not null,
  used_at timestamptz
);
create index mail_tokens_by_user on mail_tokens (user_id, purpose);
`;

const back = `
drop table mail_tokens;
alter table sessions drop column handle, drop column proved_at;
alter table users drop column hat, drop column email_checked_at;
`;

export async function up({ context }: { context: QueryInterface }) {
  await context.sequelize.query(forward);
}

export async function down({ context }: { context: QueryInterface }) {
  await context.sequelize.query(back);
}
