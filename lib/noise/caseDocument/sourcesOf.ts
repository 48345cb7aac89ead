import type { Plan } from "../plan";
import type { Budget } from "./schema";

export const PROVENANCE = { document: "the document itself", clause: "", memory: false };

type SourcePlan = Pick<Plan, "sources" | "outlets" | "incidences">;
type Given = Budget["sources"][number];

function sourceOf(source: Given): Plan["sources"][number] {
  const shared = {
    id: source.id,
    name: source.id,
    says: "",
    spaceId: null,
    position: null,
    power: source.kind === "incident" ? null : source.lw,
    deviation: null,
    basis: "typed" as const,
    provenance: PROVENANCE,
  };
  if (source.kind === "room")
    return { ...shared, kind: "instrument", spaceId: source.room, params: { q: source.q } };
  if (source.kind === "outdoor") {
    const { position, directivity } = source;
    return { ...shared, kind: "condenser", position, params: { directivity } };
  }
  return { ...shared, kind: source.kind === "fan" ? "fan" : "traffic", params: {} };
}

/** The mouths of a fan: each at the end of the run that all share and of its own. */
function outletsOf(source: Given): Plan["outlets"] {
  if (source.kind !== "fan") return [];
  return source.outlets.map(({ id, room, position, directivity, run }) => ({
    id,
    sourceId: source.id,
    name: id,
    spaceId: room ?? null,
    position: position ?? null,
    directivity,
    run: [...source.run, ...run],
  }));
}

function incidencesOf(source: Given, s: number): Plan["incidences"] {
  if (source.kind !== "incident") return [];
  return Object.entries(source.at).map(([elementId, levels], i) => ({
    id: `incidence-${s}-${i}`,
    sourceId: source.id,
    elementId,
    levels,
  }));
}

/** Sources of a budget with their mouths and given levels. */
export function sourcesOf({ sources }: Budget): SourcePlan {
  return {
    sources: sources.map(sourceOf),
    outlets: sources.flatMap(outletsOf),
    incidences: sources.flatMap(incidencesOf),
  };
}

/** Shares of the time stand in one situation; where no source has one, everything runs. */
export function situationsOf({ sources }: Budget): Plan["situations"] {
  if (sources.every(({ share }) => share === undefined)) return [];
  const playing = sources
    .filter(({ share }) => share !== 0)
    .map(({ id, share }) => ({ sourceId: id, share: share ?? 1 }));
  return [{ id: "situation", name: "as given", says: "", playing }];
}
