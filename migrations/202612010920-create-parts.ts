import type { QueryInterface } from "sequelize";

const KINDS = [
  "lot", "building", "space", "surface", "source", "outlet", "incidence", "path",
  "construction", "element", "fence", "receiver", "criterion", "situation",
];

/**
 * Every part of a plan has its key in `parts`, so that anything may point at any part. Keys between parts hold the project
 * as well: a part cannot point into another project. What belongs to a part goes with it (cascade); what a part only uses
 * holds it (no action, checked at the end of the statement, so that a whole project can still go).
 */
const owned = (column: string, table: string) =>
  `foreign key (project_id, ${column}) references ${table} (project_id, id) on delete cascade`;
const used = (column: string, table: string) => `foreign key (project_id, ${column}) references ${table} (project_id, id)`;

interface Table {
  columns?: string[];
  keys?: string[];
  indexes?: string[];
}

const named = "name text not null check (length(name) between 1 and 120)";

const TABLES: Record<string, Table> = {
  lots: { keys: ["unique (project_id)"] },
  buildings: { columns: [named] },
  spaces: {
    columns: [named, "building_id uuid not null"],
    keys: [used("building_id", "buildings")],
    indexes: ["building_id"],
  },
  surfaces: { columns: [named, "space_id uuid not null"], keys: [owned("space_id", "spaces")], indexes: ["space_id"] },
  sources: {
    columns: [named, "kind text not null check (length(kind) between 1 and 40)", "space_id uuid"],
    keys: [used("space_id", "spaces")],
    indexes: ["space_id"],
  },
  outlets: {
    columns: [named, "source_id uuid not null", "space_id uuid"],
    keys: [owned("source_id", "sources"), used("space_id", "spaces")],
    indexes: ["source_id", "space_id"],
  },
  paths: {
    columns: [named, "from_space_id uuid not null", "to_space_id uuid"],
    keys: [used("from_space_id", "spaces"), used("to_space_id", "spaces"), "check (to_space_id <> from_space_id)"],
    indexes: ["from_space_id", "to_space_id"],
  },
  constructions: {
    columns: [named, "catalogue_key text check (length(catalogue_key) <= 120)"],
    indexes: ["catalogue_key"],
  },
  elements: {
    columns: [
      named,
      "kind text not null check (length(kind) between 1 and 40)",
      "path_id uuid not null",
      "construction_id uuid",
    ],
    keys: [owned("path_id", "paths"), used("construction_id", "constructions")],
    indexes: ["path_id", "construction_id"],
  },
  incidences: {
    columns: ["source_id uuid not null", "element_id uuid not null"],
    keys: [owned("source_id", "sources"), owned("element_id", "elements"), "unique (source_id, element_id)"],
    indexes: ["element_id"],
  },
  fences: { columns: [named] },
  receivers: {
    columns: [named, "kind text not null check (kind in ('room', 'outdoor'))", "space_id uuid"],
    keys: [used("space_id", "spaces")],
    indexes: ["space_id"],
  },
  criteria: {
    columns: [named, "receiver_id uuid not null"],
    keys: [owned("receiver_id", "receivers")],
    indexes: ["receiver_id"],
  },
  situations: { columns: [named] },
};

const LINKS = `
create table situation_sources (
  project_id uuid not null,
  situation_id uuid not null,
  source_id uuid not null,
  rank integer not null default 0,
  share double precision not null check (share > 0 and share <= 1),
  primary key (situation_id, source_id),
  ${owned("situation_id", "situations")},
  ${owned("source_id", "sources")}
);
create index situation_sources_by_project on situation_sources (project_id);
create index situation_sources_by_source on situation_sources (source_id);
create table receiver_distances (
  project_id uuid not null,
  receiver_id uuid not null,
  source_id uuid not null,
  metres double precision not null check (metres between 0.05 and 1000),
  primary key (receiver_id, source_id),
  ${owned("receiver_id", "receivers")},
  ${owned("source_id", "sources")}
);
create index receiver_distances_by_project on receiver_distances (project_id);
create index receiver_distances_by_source on receiver_distances (source_id);
`;

function createTable([name, { columns = [], keys = [], indexes = [] }]: [string, Table]): string {
  const lines = [
    "project_id uuid not null",
    "id uuid not null",
    "rank integer not null default 0",
    ...columns,
    "params jsonb not null default '{}' check (jsonb_typeof(params) = 'object')",
    "primary key (project_id, id)",
    owned("id", "parts"),
    ...keys,
  ];
  const index = indexes.map((column) => `create index ${name}_by_${column} on ${name} (project_id, ${column});`);
  return [`create table ${name} (${lines.join(",\n  ")});`, ...index].join("\n");
}

const PARTS = `
create table parts (
  project_id uuid not null references projects (id) on delete cascade,
  id uuid not null unique,
  kind text not null check (kind in (${KINDS.map((kind) => `'${kind}'`).join(", ")})),
  primary key (project_id, id)
);
create index parts_by_kind on parts (project_id, kind);
`;

export async function up({ context }: { context: QueryInterface }) {
  await context.sequelize.query([PARTS, ...Object.entries(TABLES).map(createTable), LINKS].join("\n"));
}

export async function down({ context }: { context: QueryInterface }) {
  const tables = ["receiver_distances", "situation_sources", ...Object.keys(TABLES).reverse(), "parts"];
  await context.sequelize.query(tables.map((table) => `drop table ${table};`).join("\n"));
}
