import type { QueryInterface } from "sequelize";

/** How somebody wants figures shown: the units of lengths and weights, and the mark between whole and fraction. */
const forward = `
alter table users
  add column units text not null default 'metric' check (units in ('metric', 'us')),
  add column decimal_mark text not null default 'point' check (decimal_mark in ('point', 'comma'));
`;

const back = `
alter table users drop column units, drop column decimal_mark;
`;

export async function up({ context }: { context: QueryInterface }) {
  await context.sequelize.query(forward);
}

export async function down({ context }: { context: QueryInterface }) {
  await context.sequelize.query(back);
}
