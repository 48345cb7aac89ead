import type { Transaction } from "sequelize";
import { partSchemas, type Plan, type PartKind } from "../lib/noise/plan";
import { readLinks } from "./partLinks";
import { partOf, type PlanPart } from "./partRows";
import { partKinds, partTables, type PartRow } from "./partTables";

/** A row that its kind can no longer read; it is left out of the plan, and so is what points at it. */
export interface Damage {
  kind: PartKind;
  id: string;
}

export interface StoredPlan {
  plan: Plan;
  damage: Damage[];
}

/** The plan of a project, from its rows. */
export async function planOf(projectId: string, transaction: Transaction): Promise<Plan> {
  return (await readPlan(projectId, transaction)).plan;
}

/** The plan of a project and what of it cannot be read. */
export async function readPlan(projectId: string, transaction: Transaction): Promise<StoredPlan> {
  const links = await readLinks({ projectId, transaction });
  const standing = new Map<string, PartKind>();
  const damage: Damage[] = [];
  const plan: Record<string, unknown> = {};
  // In writing order: when a part is read, all it may point at has been.
  for (const kind of partKinds) {
    const parts: PlanPart[] = [];
    for (const row of await readRows(kind, projectId, transaction)) {
      const part = readPart(kind, row, links[kind]?.get(row.id));
      if (part && standsWhole(kind, part, standing)) {
        standing.set(part.id, kind);
        parts.push(part);
      } else damage.push({ kind, id: row.id });
    }
    plan[partTables[kind].list ?? kind] = kind === "lot" ? (parts[0] ?? bareLot(projectId)) : parts;
  }
  return { plan: plan as Plan, damage }; // every part was checked by its schema, every list is filled
}

async function readRows(kind: PartKind, projectId: string, transaction: Transaction): Promise<PartRow[]> {
  const rows = await partTables[kind].model.findAll({
    where: { projectId },
    order: [["rank", "ASC"], ["id", "ASC"]],
    raw: true,
    transaction,
  });
  return rows as unknown as PartRow[]; // raw rows are the plain columns
}

function readPart(kind: PartKind, row: PartRow, links: unknown): PlanPart | undefined {
  const read = partSchemas[kind].safeParse(partOf(kind, row, links));
  return read.success ? (read.data as PlanPart) : undefined; // every schema has an id
}

function standsWhole(kind: PartKind, part: PlanPart, standing: ReadonlyMap<string, PartKind>): boolean {
  return partTables[kind].references.every(({ field, to }) => part[field] === null || standing.get(String(part[field])) === to);
}

/** Ground of a project that has none: nothing drawn, middling ground, air of ISO 9613-1's reference conditions. */
export const bareLot = (id: string): Plan["lot"] =>
  partSchemas.lot.parse({
    id,
    outline: null,
    ground: [0.5, 0.5, 0.5],
    temperature: 10,
    humidity: 70,
    indoorTemperature: 20,
    indoorHumidity: 50,
  });
