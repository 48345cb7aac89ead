import { BAND_COUNT } from "../bands";
import type { Construction } from "../construction";
import type { PathElement } from "../elements";
import { planSchema, type Plan, type Receiver, type Space, type Surface, type UnreadPlan } from "../plan";
import { areaFromDecay } from "../rooms";
import type { Basis } from "../spectrum";
import { CaseFault, readWith } from "./fault";
import type { Budget, CaseConstruction } from "./schema";
import { PROVENANCE, situationsOf, sourcesOf } from "./sourcesOf";

const LABORATORY: Basis[] = Array.from({ length: BAND_COUNT }, () => "laboratory");
const MEASURED: Basis[] = Array.from({ length: BAND_COUNT }, () => "measured");

function constructionOf(id: string, name: string, given: CaseConstruction): Construction {
  const shared = {
    id,
    name: name.trim().slice(0, 120) || id,
    fits: [],
    catalogueKey: null,
    layers: [],
    size: null,
    use: null,
    provenance: PROVENANCE,
  };
  if ("tl" in given) return { ...shared, tl: given.tl, bases: LABORATORY, description: null };
  return { ...shared, tl: null, bases: null, description: given };
}

function absorptionOf({ absorption, volume, air: roomAir }: Budget["rooms"][number]): Space["absorption"] {
  const air = absorption.air || roomAir;
  if ("surfaces" in absorption)
    return { kind: "surfaces", model: absorption.model, air, objects: absorption.objects };
  if (!air)
    return "area" in absorption
      ? { kind: "area", area: absorption.area }
      : { kind: "decay", seconds: absorption.rt };
  const area =
    "area" in absorption
      ? absorption.area
      : absorption.rt.map((seconds) => (seconds === null ? null : areaFromDecay(volume, seconds)));
  return { kind: "surfaces", model: "sabine", air, objects: [{ name: "room", area }] };
}

function surfacesOf({ id, absorption }: Budget["rooms"][number], r: number): Surface[] {
  if (!("surfaces" in absorption)) return [];
  return absorption.surfaces.map(({ name, area, alpha }, i) => ({
    id: `surface-${r}-${i}`,
    spaceId: id,
    name: name?.trim() || `surface ${i + 1}`,
    area,
    finishKey: null,
    alpha,
    bases: MEASURED,
    provenance: PROVENANCE,
  }));
}

function elementOf(given: Budget["elements"][number], i: number, constructionId: string | null): PathElement {
  const placed = {
    id: given.id,
    pathId: `path-${i}`,
    name: given.id,
    area: given.area ?? given.opening!, // its schema lets no element pass without one of them
    constructionId,
    limit: given.limit ?? null,
    position: given.position ?? null,
    normal: given.normal ?? null,
    size: given.size ?? null,
    directivity: given.directivity ?? null,
    diffuseness: given.diffuseness ?? null,
  };
  if (given.kind === "duct")
    return {
      ...placed,
      kind: "duct",
      params: { opening: given.opening!, run: given.run! }, // its schema asks a duct for both
    };
  if (given.kind === "door") return { ...placed, kind: "door", params: { gapArea: 0 } };
  if (given.kind === "window") return { ...placed, kind: "window", params: { openArea: 0 } };
  return { ...placed, kind: given.kind, params: {} };
}

function criteriaOf({ receivers }: Budget): UnreadPlan["criteria"] {
  return receivers.flatMap(({ id, criterion }, i) => {
    if (!criterion) return [];
    const levels = criterion.kind === "curve" ? criterion.levels : null;
    const value = criterion.kind === "curve" ? null : criterion.value;
    const edition = criterion.kind === "NC" ? (criterion.edition ?? "") : "";
    return [
      {
        id: `criterion-${i}`,
        receiverId: id,
        name: criterion.kind,
        metric: criterion.kind,
        value,
        levels,
        edition,
        averaging: criterion.averaging,
        hours: null,
        place: "",
        provenance: PROVENANCE,
      },
    ];
  });
}

function constructionsOf({ constructions, elements }: Budget) {
  const named = new Map(
    Object.entries(constructions).map(([name, given], i) => [
      name,
      constructionOf(`named-${i}`, name, given),
    ]),
  );
  const all = [...named.values()];
  const own = new Map<string, string>();
  const idOf = elements.map(({ id, tl, construction, kind }, i) => {
    if (kind === "leak" || kind === "duct") return null;
    if (typeof construction === "string") return named.get(construction)?.id ?? null;
    const given = tl ? { tl } : construction;
    if (!given) return null;
    const content = JSON.stringify(given);
    const same = own.get(content);
    if (same) return same;
    own.set(content, `own-${i}`);
    all.push(constructionOf(`own-${i}`, id, given));
    return `own-${i}`;
  });
  return { all, idOf };
}

/** Lists of a plan by the list of the document that fills them, for the bounds of a plan. */
const LISTS: Record<string, string> = {
  spaces: "rooms",
  surfaces: "rooms",
  paths: "elements",
  constructions: "elements",
  outlets: "sources",
  incidences: "sources",
  criteria: "receivers",
};

function lotOf({ options }: Budget): Plan["lot"] {
  return {
    id: "lot",
    street: "",
    outline: null,
    ground: options.ground,
    temperature: options.temperature,
    humidity: options.humidity,
    indoorTemperature: options.indoor_temperature,
    indoorHumidity: options.indoor_humidity,
    trees: [],
  };
}

function spaceOf(room: Budget["rooms"][number]): Space {
  const { id, building, volume } = room;
  return { id, buildingId: building, name: id, volume, box: null, absorption: absorptionOf(room) };
}

function receiverOf({ room, position, criterion: _, ...given }: Budget["receivers"][number]): Receiver {
  return { ...given, name: given.id, says: "", spaceId: room ?? null, position: position ?? null };
}

/** The plan of a budget. Throws a `CaseFault` where the bounds of a plan are passed. */
export function planOfBudget(budget: Budget): Plan {
  const { rooms, elements, fences, receivers } = budget;
  const constructions = constructionsOf(budget);
  const plan: UnreadPlan = {
    lot: lotOf(budget),
    buildings: [],
    spaces: rooms.map(spaceOf),
    surfaces: rooms.flatMap(surfacesOf),
    ...sourcesOf(budget),
    paths: elements.map(({ from, to, id }, i) => ({
      id: `path-${i}`,
      fromSpaceId: from,
      toSpaceId: to === "outdoors" ? null : to,
      name: id,
    })),
    constructions: constructions.all,
    elements: elements.map((each, i) => elementOf(each, i, constructions.idOf[i])),
    fences: fences.map((fence, i) => ({
      ...fence,
      id: fence.id ?? `fence-${i}`,
      name: fence.id ?? `fence ${i + 1}`,
    })),
    receivers: receivers.map(receiverOf),
    criteria: criteriaOf(budget),
    situations: situationsOf(budget),
  };
  try {
    return readWith(planSchema, plan);
  } catch (fault) {
    if (fault instanceof CaseFault && fault.path in LISTS)
      throw new CaseFault(fault.message, LISTS[fault.path]);
    throw fault;
  }
}
