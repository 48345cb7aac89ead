import type { Building, Plan, Space, Surface } from "@/lib/noise/plan";

export type Size = [number, number, number];
export type BySurfaces = Extract<Space["absorption"], { kind: "surfaces" }>;

/** A room with the building it is in and what lines it. */
export interface Room {
  space: Space;
  building: Building | null;
  surfaces: Surface[];
}

export function roomOf(plan: Plan, spaceId: string): Room | null {
  const space = plan.spaces.find(({ id }) => id === spaceId);
  if (!space) return null;
  return {
    space,
    building: plan.buildings.find(({ id }) => id === space.buildingId) ?? null,
    surfaces: plan.surfaces.filter((surface) => surface.spaceId === spaceId),
  };
}

export interface RoomGroup {
  heading: string;
  rooms: Space[];
}

/** The studio's rooms first, then those where others listen; a group without rooms is left out. */
export function groupRooms({ spaces, buildings }: Plan): RoomGroup[] {
  const studios = new Set(buildings.filter(({ role }) => role === "studio").map(({ id }) => id));
  const inStudio = spaces.filter(({ buildingId }) => studios.has(buildingId));
  const elsewhere = spaces.filter(({ buildingId }) => !studios.has(buildingId));
  return [
    { heading: "In the studio", rooms: inStudio },
    { heading: "Neighbours’ and other rooms", rooms: elsewhere },
  ].filter(({ rooms }) => rooms.length > 0);
}

/** m2; of a room without a drawn size nothing is known. */
export const floorArea = ({ box }: Space): number | null => (box ? box.size[0] * box.size[1] : null);

export const boxVolume = ([width, depth, height]: Size): number => Number((width * depth * height).toPrecision(6));

/** Rounding in what was typed: a volume this near to the box's is the box's. */
const FOLLOWS = 0.015;

/** Whether the volume is that of the box, so that it moves with the size; false where another was typed. */
export function volumeFollows({ box, volume }: Space): boolean {
  return box === null || Math.abs(volume - boxVolume(box.size)) <= FOLLOWS * volume;
}
