import type { Plan } from "../plan";
import type { Budget } from "./schema";

export const PROVENANCE = { document: "the document itself", clause: "", memory: false };

type SourcePlan = Pick<Plan, "sources" | "outlets" | "incidences">;

function addSource(plan: SourcePlan, source: Budget["sources"][number], s: number): void {
  const shared = {
    id: source.id,
    name: source.id,
    says: "",
    spaceId: null,
    position: null,
    power: null,
    deviation: null,
    basis: "typed" as const,
    provenance: PROVENANCE,
  };
  if (source.kind === "room")
    plan.sources.push({
      ...shared,
      kind: "instrument",
      spaceId: source.room,
      power: source.lw,
      params: { q: source.q },
    });
  if (source.kind === "outdoor") {
    plan.sources.push({
      ...shared,
      kind: "condenser",
      position: source.position,
      power: source.lw,
      params: { directivity: source.directivity },
    });
  }
  if (source.kind === "fan") {
    plan.sources.push({ ...shared, kind: "fan", power: source.lw, params: {} });
    source.outlets.forEach(({ id, room, position, directivity, run }) =>
      plan.outlets.push({
        id,
        sourceId: source.id,
        name: id,
        spaceId: room ?? null,
        position: position ?? null,
        directivity,
        run: [...source.run, ...run],
      }),
    );
  }
  if (source.kind === "incident") {
    plan.sources.push({ ...shared, kind: "traffic", params: {} });
    Object.entries(source.at).forEach(([elementId, levels], i) =>
      plan.incidences.push({ id: `incidence-${s}-${i}`, sourceId: source.id, elementId, levels }),
    );
  }
}

/** Sources of a budget with their mouths and given levels. */
export function sourcesOf({ sources }: Budget): SourcePlan {
  const plan: SourcePlan = { sources: [], outlets: [], incidences: [] };
  sources.forEach((source, s) => addSource(plan, source, s));
  return plan;
}

/** Shares of the time stand in one situation; where no source has one, everything runs. */
export function situationsOf({ sources }: Budget): Plan["situations"] {
  if (sources.every(({ share }) => share === undefined)) return [];
  const playing = sources
    .filter(({ share }) => share !== 0)
    .map(({ id, share }) => ({ sourceId: id, share: share ?? 1 }));
  return [{ id: "situation", name: "as given", says: "", playing }];
}
