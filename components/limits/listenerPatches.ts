import type { Plan, Receiver } from "@/lib/noise/plan";

type Place = [number, number, number];

/** Ear height of somebody lying in bed, m above the floor, and of somebody standing outdoors, m above ground. */
const IN_BED = 0.7;
const STANDING = 1.5;

/** The middle of a room as it is drawn; null where it is not drawn. */
export function middleOf(plan: Plan, spaceId: string | null): Place | null {
  const box = plan.spaces.find(({ id }) => id === spaceId)?.box;
  if (!box) return null;
  const { at, size } = box;
  return [tidy(at[0] + size[0] / 2), tidy(at[1] + size[1] / 2), tidy(at[2] + Math.min(IN_BED, size[2] / 2))];
}

/** On the first fence, half way along; null where there is none. */
export function onTheFence({ fences }: Plan): Place | null {
  const [fence] = fences;
  return fence ? [tidy((fence.p1[0] + fence.p2[0]) / 2), tidy((fence.p1[1] + fence.p2[1]) / 2), STANDING] : null;
}

const tidy = (metres: number): number => Number(metres.toFixed(2));

export interface Rooms {
  value: string;
  label: string;
}

/** Every room with the house it is in, those of the neighbours first. */
export function roomChoices({ spaces, buildings }: Plan): Rooms[] {
  const houseOf = (id: string) => buildings.find((building) => building.id === id);
  const abroad = (buildingId: string) => (houseOf(buildingId)?.role === "neighbour" ? 0 : 1);
  return spaces
    .toSorted((one, other) => abroad(one.buildingId) - abroad(other.buildingId))
    .map(({ id, name, buildingId }) => ({ value: id, label: [houseOf(buildingId)?.name, name].filter(Boolean).join(": ") }));
}

/** A room can be chosen once one is drawn. */
export const placeChoices = (plan: Plan): { value: Receiver["kind"]; label: string }[] => [
  ...(plan.spaces.length > 0 ? [{ value: "room", label: "In a room" } as const] : []),
  { value: "outdoor", label: "Outdoors" },
];

export interface NewListener {
  name: string;
  says: string;
  kind: Receiver["kind"];
  spaceId: string | null;
  position: Place | null;
  side: Receiver["side"];
}

export function listenerValues(plan: Plan, { kind, spaceId, position, ...rest }: NewListener): Record<string, unknown> {
  const room = kind === "room";
  return { ...rest, kind, spaceId: room ? spaceId : null, position: room ? middleOf(plan, spaceId) : position, facade: false, distances: {} };
}

/** Another place for a listener. In another room the middle of it, until somebody says where exactly. */
export function moveInto(plan: Plan, spaceId: string): Partial<Receiver> {
  return { kind: "room", spaceId, position: middleOf(plan, spaceId), facade: false };
}

export function moveOut(plan: Plan): Partial<Receiver> {
  return { kind: "outdoor", spaceId: null, position: onTheFence(plan) };
}

/** "Corner house: bedroom", "outdoors, on the face of a house". */
export function placeWords(plan: Plan, { kind, spaceId, facade, position }: Receiver): string {
  if (kind === "room") return roomChoices(plan).find(({ value }) => value === spaceId)?.label ?? "no room chosen";
  if (!position) return "outdoors, not placed yet";
  return facade ? "outdoors, on the face of a house" : "outdoors";
}
