import type { Plan } from "../../lib/noise/plan";
import { changeOf } from "../plan/fieldSpec";
import { partsOf } from "../plan/partsOf";
import type { PlanChange } from "../plan/save";
import { movedBy, toMillimetre, type Spot } from "./geometry";
import type { Thing } from "./things";

/** What moving a thing by so many metres east and north changes. A building takes with it what is in it. */
export function moveOf(plan: Plan, { part, id }: Thing, dx: number, dy: number): PlanChange[] {
  if (part === "trees") return changeTree(plan, Number(id), ({ at, ...tree }) => ({ ...tree, at: movedBy(at, dx, dy) }));
  if (part === "buildings") return moveBuilding(plan, id, dx, dy);
  if (part === "fences") {
    const fence = plan.fences.find((one) => one.id === id);
    return fence ? changeOf(part, id, { p1: movedBy(fence.p1, dx, dy), p2: movedBy(fence.p2, dx, dy) }) : [];
  }
  if (part === "elements") return slideElement(plan, id, dx, dy);
  const position = partsOf(plan, part).find((one) => one.id === id)?.position as Spot | null | undefined;
  return position ? changeOf(part, id, { position: movedBy(position, dx, dy) }) : [];
}

type Tree = Plan["lot"]["trees"][number];

/** Trees are one list of the lot: the whole list is sent. */
export function changeTree({ lot }: Plan, at: number, changed: (tree: Tree) => Tree): PlanChange[] {
  if (!lot.trees[at]) return [];
  return changeOf("lots", lot.id, { trees: lot.trees.map((tree, index) => (index === at ? changed(tree) : tree)) });
}

/** What stands in a face stays in it: it slides along, never out. */
function slideElement({ elements }: Plan, id: string, dx: number, dy: number): PlanChange[] {
  const element = elements.find((one) => one.id === id);
  if (!element?.position) return [];
  const [nx, ny] = element.normal ?? [0, 0];
  const out = dx * nx + dy * ny;
  const flat = nx * nx + ny * ny || 1;
  const along = [toMillimetre(dx - (out * nx) / flat), toMillimetre(dy - (out * ny) / flat)] as const;
  return along[0] || along[1] ? changeOf("elements", id, { position: movedBy(element.position, ...along) }) : [];
}

function moveBuilding(plan: Plan, id: string, dx: number, dy: number): PlanChange[] {
  const building = plan.buildings.find((one) => one.id === id);
  if (!building) return [];
  const shell = building.footprint ? changeOf("buildings", id, { footprint: building.footprint.map((corner) => movedBy(corner, dx, dy)) }) : [];
  return [...shell, ...moveInside(plan, id, dx, dy)];
}

/** Rooms of a building with their walls, sources, mouths and listeners. */
function moveInside(plan: Plan, buildingId: string, dx: number, dy: number): PlanChange[] {
  const rooms = plan.spaces.filter((space) => space.buildingId === buildingId);
  const inside = new Set<string | null>(rooms.map(({ id }) => id));
  const faces = new Set(plan.paths.filter(({ fromSpaceId, toSpaceId }) => inside.has(fromSpaceId) || (toSpaceId !== null && inside.has(toSpaceId))).map(({ id }) => id));
  const placed = (part: string, parts: readonly { id: string; position: Spot | null }[]) =>
    parts.flatMap(({ id, position }) => (position ? changeOf(part, id, { position: movedBy(position, dx, dy) }) : []));
  const indoors = <P extends { spaceId: string | null }>(parts: readonly P[]) => parts.filter(({ spaceId }) => spaceId !== null && inside.has(spaceId));
  return [
    ...rooms.flatMap(({ id, box }) => (box ? changeOf("spaces", id, { box: { ...box, at: movedBy(box.at, dx, dy) } }) : [])),
    ...placed("elements", plan.elements.filter(({ pathId }) => faces.has(pathId))),
    ...placed("sources", indoors(plan.sources)),
    ...placed("outlets", indoors(plan.outlets)),
    ...placed("receivers", indoors(plan.receivers)),
  ];
}

/** The plan as it will look with these changes of what stands in it: for the drawing while a key is held. */
export function withChanges(plan: Plan, changes: readonly PlanChange[]): Plan {
  return changes.reduce((drawn, change) => (change.act === "change" ? withPatch(drawn, change) : drawn), plan);
}

function withPatch(plan: Plan, { part, id, patch }: Extract<PlanChange, { act: "change" }>): Plan {
  if (part === "lots") return { ...plan, lot: { ...plan.lot, ...patch } };
  return { ...plan, [part]: partsOf(plan, part).map((one) => (one.id === id ? { ...one, ...patch } : one)) };
}
