import type { Plan } from "../../lib/noise/plan";
import { changeOf, type FieldSpec } from "../plan/fieldSpec";
import { partsOf } from "../plan/partsOf";
import type { PlanChange } from "../plan/save";
import { toMillimetre, type Corner, type Spot } from "./geometry";

const REACH = 1000;
type Building = Plan["buildings"][number];
type Fence = Plan["fences"][number];
type Receiver = Plan["receivers"][number];

const patchOf = (part: string, id: string, field: string) => (value: unknown) => changeOf(part, id, { [field]: value });

const nameSpec = (part: string, { id, name }: { id: string; name: string }): FieldSpec => ({
  kind: "words",
  label: "Name",
  value: name,
  most: 120,
  wide: true,
  changes: patchOf(part, id, "name"),
});

const ROLES = [
  { value: "studio", label: "the studio" },
  { value: "neighbour", label: "a neighbour’s house" },
  { value: "own house", label: "our own house" },
  { value: "other", label: "something else" },
];

const AXES = [
  { value: "", label: "none, a flat roof" },
  { value: "x", label: "west to east" },
  { value: "y", label: "south to north" },
];

export function buildingSpecs(building: Building): FieldSpec[] {
  const patch = (field: string) => patchOf("buildings", building.id, field);
  const height = (field: "eaves" | "ridge", label: string): FieldSpec => ({ kind: "quantity", quantity: "length", label, value: building[field], min: 0, max: 60, optional: true, changes: patch(field) });
  return [
    nameSpec("buildings", building),
    { kind: "choice", label: "What it is", value: building.role, choices: ROLES, wide: true, changes: patch("role") },
    height("eaves", "Eaves over ground"),
    height("ridge", "Ridge over ground"),
    {
      kind: "choice",
      label: "The ridge runs",
      value: building.ridgeAxis ?? "",
      choices: AXES,
      wide: true,
      changes: (axis) => changeOf("buildings", building.id, { ridgeAxis: axis === "" ? null : axis }),
    },
  ];
}

/** Height of each floor over ground, from below. */
export const floorSpecs = ({ id, floors }: Building): FieldSpec[] =>
  floors.map((floor, at) => ({
    kind: "quantity",
    quantity: "length",
    label: floors.length === 1 ? "Floor over ground" : `Floor ${at + 1} over ground`,
    value: floor,
    min: -10,
    max: 60,
    changes: (value, plan) => {
      const standing = plan.buildings.find((one) => one.id === id)?.floors ?? [];
      return value === null ? [] : changeOf("buildings", id, { floors: standing.map((height, index) => (index === at ? value : height)) });
    },
  }));

export function fenceSpecs(fence: Fence): FieldSpec[] {
  const end = (field: "p1" | "p2", axis: 0 | 1, label: string): FieldSpec => ({
    kind: "quantity",
    quantity: "length",
    label,
    value: fence[field][axis],
    min: -REACH,
    max: REACH,
    changes: (value, plan) => {
      const standing = plan.fences.find(({ id }) => id === fence.id)?.[field];
      return standing && value !== null ? changeOf("fences", fence.id, { [field]: replaced(standing, axis, value) }) : [];
    },
  });
  const patch = (field: string) => patchOf("fences", fence.id, field);
  return [
    nameSpec("fences", fence),
    end("p1", 0, "From, east"),
    end("p1", 1, "From, north"),
    end("p2", 0, "To, east"),
    end("p2", 1, "To, north"),
    { kind: "quantity", quantity: "length", label: "Height", value: fence.height, min: 0.1, max: 30, changes: patch("height") },
    { kind: "quantity", quantity: "length", label: "Thickness", value: fence.thickness, min: 0, max: 20, hint: "Nought for boards.", changes: patch("thickness") },
  ];
}

const replaced = (corner: Corner, axis: 0 | 1, value: number): Corner => (axis === 0 ? [value, corner[1]] : [corner[0], value]);

/** East, north and height of a thing that stands at one place; a thing without a place gets one from the first figure. */
export function placeSpecs(part: "receivers" | "sources" | "outlets" | "elements", { id, position }: { id: string; position: Spot | null }, start: Spot): FieldSpec[] {
  const figure = (axis: 0 | 1 | 2, label: string, [min, max]: [number, number]): FieldSpec => ({
    kind: "quantity",
    quantity: "length",
    label,
    value: position?.[axis] ?? null,
    min,
    max,
    changes: (value, plan) => {
      if (value === null) return [];
      const standing = (partsOf(plan, part).find((one) => one.id === id)?.position as Spot | null | undefined) ?? start;
      return changeOf(part, id, { position: standing.map((was, index) => (index === axis ? toMillimetre(value) : was)) });
    },
  });
  return [figure(0, "East", [-REACH, REACH]), figure(1, "North", [-REACH, REACH]), figure(2, "Height over ground", [-20, 100])];
}

export const sourceSpecs = (part: "sources" | "outlets", one: { id: string; name: string; position: Spot | null }, start: Spot): FieldSpec[] => [
  nameSpec(part, one),
  ...placeSpecs(part, one, start),
];

const SIDES = [
  { value: "studio", label: "the studio’s side of a fence" },
  { value: "far", label: "the far side of a fence" },
];

export function receiverSpecs(receiver: Receiver, plan: Plan, start: Spot): FieldSpec[] {
  const patch = (field: string) => patchOf("receivers", receiver.id, field);
  const inRoom = receiver.kind === "room";
  return [
    nameSpec("receivers", receiver),
    { kind: "words", label: "In the sentence", value: receiver.says, most: 120, optional: true, wide: true, hint: "As in: what next door’s bedroom may hear.", changes: patch("says") },
    { kind: "choice", label: "Listens", value: receiver.kind, choices: [{ value: "room", label: "in a room" }, { value: "outdoor", label: "outdoors" }], changes: (kind, now) => changeKind(now, receiver.id, kind) },
    ...(inRoom ? [roomSpec(receiver, plan)] : []),
    { ...sideSpec(receiver), wide: !inRoom ? undefined : true },
    ...placeSpecs("receivers", receiver, start),
    ...(inRoom ? [] : [facadeSpec(receiver)]),
  ];
}

const roomSpec = ({ id, spaceId }: Receiver, { spaces }: Plan): FieldSpec => ({
  kind: "choice",
  label: "Room",
  value: spaceId ?? "",
  choices: [...(spaceId === null ? [{ value: "", label: "not chosen yet" }] : []), ...spaces.map((space) => ({ value: space.id, label: space.name }))],
  changes: (chosen, plan) => (chosen === "" ? [] : changeOf("receivers", id, { spaceId: chosen, ...middleOfRoom(plan, chosen) })),
});

const sideSpec = ({ id, side }: Receiver): FieldSpec => ({
  kind: "choice",
  label: "On a fence’s line, it stands on",
  value: side,
  choices: SIDES,
  changes: patchOf("receivers", id, "side"),
});

const facadeSpec = ({ id, facade }: Receiver): FieldSpec => ({
  kind: "tick",
  label: "In front of a house wall",
  hint: "The wall throws the sound back: it counts as heard there.",
  value: facade,
  wide: true,
  changes: patchOf("receivers", id, "facade"),
});

/** A listener who goes indoors needs a room: the first of a neighbour, else the first there is. */
function changeKind(plan: Plan, id: string, kind: string): PlanChange[] {
  if (kind !== "room") return changeOf("receivers", id, { kind, spaceId: null });
  const neighbours = new Set(plan.buildings.filter(({ role }) => role === "neighbour").map((building) => building.id));
  const room = plan.spaces.find(({ buildingId }) => neighbours.has(buildingId)) ?? plan.spaces[0];
  return changeOf("receivers", id, { kind, facade: false, spaceId: room?.id ?? null, ...(room && middleOfRoom(plan, room.id)) });
}

/** Ear height of somebody who sits. Common practice, no source. */
const EAR = 1.2;

function middleOfRoom({ spaces }: Plan, spaceId: string) {
  const box = spaces.find(({ id }) => id === spaceId)?.box;
  if (!box) return {};
  const { at, size } = box;
  const up = Math.min(EAR, size[2] / 2);
  return { position: [at[0] + size[0] / 2, at[1] + size[1] / 2, at[2] + up].map(toMillimetre) };
}
