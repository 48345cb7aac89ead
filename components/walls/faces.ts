import type { Plan } from "../../lib/noise/plan";
import { formatQuantity, withUnit } from "../format";
import type { PathElement } from "./elementWords";

export type Spot = [number, number, number];
type Box = NonNullable<Plan["spaces"][number]["box"]>;

/** Faces of a room to the open, by where they look. */
export const FACES = ["north", "east", "south", "west", "roof"] as const;
export type Face = (typeof FACES)[number];

const normals: Record<Face, Spot> = { north: [0, 1, 0], east: [1, 0, 0], south: [0, -1, 0], west: [-1, 0, 0], roof: [0, 0, 1] };

export const faceWords: Record<Face, string> = { north: "north", east: "east", south: "south", west: "west", roof: "up, the roof" };

export const normalOf = (face: Face): Spot => normals[face];

const SAME = 1e-6;

/** The face a normal belongs to; null where it is turned otherwise. */
export function faceOf(normal: readonly number[] | null): Face | null {
  if (!normal) return null;
  return FACES.find((face) => normals[face].every((part, axis) => Math.abs(part - normal[axis]!) < SAME)) ?? null;
}

export const toMillimetre = (metres: number): number => Number(metres.toFixed(3));

/** Width and height of a face of a room, m: as seen from outside; a roof from above. */
export function sizeOfFace({ size: [width, depth, height] }: Box, face: Face): [number, number] {
  if (face === "roof") return [width, depth];
  return face === "north" || face === "south" ? [width, height] : [depth, height];
}

/**
 * The centre of something in a face of a room: so far along the face from its west or south end, so far over the floor. In
 * the roof both are taken from the south-west corner.
 */
export function placeInFace({ at: [x, y, z], size: [width, depth, height] }: Box, face: Face, along: number, up: number): Spot {
  const places: Record<Face, Spot> = {
    north: [x + along, y + depth, z + up],
    south: [x + along, y, z + up],
    east: [x + width, y + along, z + up],
    west: [x, y + along, z + up],
    roof: [x + along, y + up, z + height],
  };
  return places[face].map(toMillimetre) as Spot;
}

export const areaOfFace = (box: Box, face: Face): number => {
  const [across, up] = sizeOfFace(box, face);
  return across * up;
};

/** Elements of a boundary that stand in one face. */
export const inFace = ({ elements }: Plan, pathId: string, face: Face): PathElement[] =>
  elements.filter((element) => element.pathId === pathId && faceOf(element.normal) === face);

/** What is taken off the area of a face before anything else is put there, m². */
export const takenOf = (elements: readonly PathElement[]): number => elements.reduce((sum, { area }) => sum + area, 0);

/** Areas are typed and rounded by hand: below this share of a face nothing is said. */
const ROUGH = 0.05;
const STICKS_OUT = 0.02;

const inMetres = (area: number) => withUnit(formatQuantity(area, 1), "m²");

/** What does not fit between the things in a boundary and the face of the room they stand in. Said, never refused. */
export function faceDoubts(plan: Plan, pathId: string): string[] {
  const path = plan.paths.find(({ id }) => id === pathId);
  const box = plan.spaces.find(({ id }) => id === path?.fromSpaceId)?.box;
  if (!path || path.toSpaceId !== null || !box) return [];
  return FACES.flatMap((face) => {
    const here = inFace(plan, pathId, face);
    if (here.length === 0) return [];
    return [...areaDoubt(box, face, here), ...here.flatMap((element) => edgeDoubt(box, face, element))];
  });
}

function areaDoubt(box: Box, face: Face, here: readonly PathElement[]): string[] {
  if (face === "roof") return []; // a pitched roof is larger than the room below it
  const [taken, whole] = [takenOf(here), areaOfFace(box, face)];
  if (taken <= whole * (1 + ROUGH)) return [];
  return [`What stands in the ${face} face adds up to ${inMetres(taken)}, and that face of the room has ${inMetres(whole)}.`];
}

function edgeDoubt(box: Box, face: Face, { name, kind, position, size }: PathElement): string[] {
  if (!position || !size || face === "roof" || kind === "wall") return [];
  const [across, up] = sizeOfFace(box, face);
  const axis = face === "north" || face === "south" ? 0 : 1;
  const along = position[axis] - box.at[axis];
  const over = position[2] - box.at[2];
  const outside = along - size[0] / 2 < -STICKS_OUT || along + size[0] / 2 > across + STICKS_OUT || over - size[1] / 2 < -STICKS_OUT || over + size[1] / 2 > up + STICKS_OUT;
  return outside ? [`${name} reaches out of the ${face} face of the room.`] : [];
}
