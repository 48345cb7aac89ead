import type { QueryInterface } from "sequelize";

/** How often a session asks, and what was answered to a key that came with a creating request. */
const forward = `
-- Counts are worth a minute: unlogged, so that counting costs no write to the log and no wait for the disk.
create unlogged table request_counts (
  session text primary key check (length(session) = 64),
  minute_from timestamptz not null,
  requests integer not null,
  writes_from timestamptz not null,
  writes integer not null
);
-- Counts one request and gives the seconds to wait, 0 where the session is within its bounds.
-- A window begins with its first request; a clock that was set back by more than a window begins a new one. Who waited for
-- the row comes with a moment older than the row's.
create function count_request(asked text, wrote integer, most_requests integer, most_writes integer) returns integer
language plpgsql as $$
declare
  moment timestamptz := clock_timestamp();
  minute interval := interval '1 minute';
  short interval := interval '10 seconds';
  counted request_counts;
begin
  insert into request_counts as standing values (asked, moment, 1, moment, wrote)
  on conflict (session) do update set
    minute_from = case when moment - standing.minute_from between -minute and minute then standing.minute_from else moment end,
    requests = case when moment - standing.minute_from between -minute and minute then standing.requests + 1 else 1 end,
    writes_from = case when moment - standing.writes_from between -short and short then standing.writes_from else moment end,
    writes = case when moment - standing.writes_from between -short and short then standing.writes + wrote else wrote end
  returning * into counted;
  if counted.requests = 1 then
    delete from request_counts where session in (
      select session from request_counts where minute_from < moment - interval '1 hour' limit 100 for update skip locked
    );
  end if;
  if counted.requests > most_requests then
    return greatest(1, ceil(extract(epoch from counted.minute_from + minute - moment)));
  elsif wrote > 0 and counted.writes > most_writes then
    return greatest(1, ceil(extract(epoch from counted.writes_from + short - moment)));
  end if;
  return 0;
end $$;

create table idempotency_keys (
  user_id uuid not null references users (id) on delete cascade,
  key text not null check (length(key) between 1 and 255),
  route text not null check (length(route) <= 300),
  body_hash text not null check (length(body_hash) = 64),
  answer jsonb not null,
  made_at timestamptz not null default now(),
  primary key (user_id, key)
);
create index idempotency_keys_by_age on idempotency_keys (made_at);
-- Keys live for 48 hours. Whoever writes one takes some old ones away, and an old one of the same name in any case.
create function sweep_idempotency_keys() returns trigger language plpgsql as $$
begin
  delete from idempotency_keys where user_id = new.user_id and key = new.key and made_at < now() - interval '48 hours';
  delete from idempotency_keys where (user_id, key) in (
    select user_id, key from idempotency_keys where made_at < now() - interval '48 hours' limit 100 for update skip locked
  );
  return new;
end $$;
create trigger sweep_before_insert before insert on idempotency_keys for each row execute function sweep_idempotency_keys();
`;

const back = `
drop table idempotency_keys;
drop function sweep_idempotency_keys();
drop function count_request(text, integer, integer, integer);
drop table request_counts;
`;

export async function up({ context }: { context: QueryInterface }) {
  await context.sequelize.query(forward);
}

export async function down({ context }: { context: QueryInterface }) {
  await context.sequelize.query(back);
}
