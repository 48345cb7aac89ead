import type { Link } from "../balance";
import type { EffectiveLoss } from "../effective";
import { elementKinds, type PathElement } from "../elements";
import type { PathKind } from "../elements/kind";
import { BEHIND_BUILDING, DIFFUSE, IN_FRONT, OVER_ROOF } from "../facade";
import { energyOf } from "../levels";
import { liesFlat, type Face } from "../outdoors/face";
import type { Path, Plan } from "../plan";
import type { Note } from "../verdict";
import { passingOfElement, type ElementPassing } from "./passing";
import type { RoomModel } from "./roomModels";

/** An element between two rooms or between a room and outdoors, ready to reckon with. */
export interface ElementModel extends ElementPassing, Link {
  readonly index: number;
  readonly element: PathElement;
  readonly kind: PathKind;
  /** Building of the room it belongs to. */
  readonly building: string;
  /** Null between rooms and where it has no place. */
  readonly face: Face | null;
  /** 10^(C_d/10). */
  readonly diffuse: number;
}

/** Elements that stand between two spaces, with what every element of the plan lets pass. */
export interface ElementModels {
  readonly elements: readonly ElementModel[];
  /** Of every element of the plan, placed or not. */
  readonly passings: ReadonlyMap<string, ElementPassing>;
}

/** Whether an element has neither a front nor a back: a roof of any pitch, and whatever lies flat, a roof window or a cowl. */
function isLikeRoof({ kind, normal }: PathElement): boolean {
  return kind === "roof" || (normal !== null && liesFlat(normal));
}

function faceOf(element: PathElement): Face | null {
  const { position, normal, size } = element;
  return position && { at: position, normal, size, likeRoof: isLikeRoof(element) };
}

/** D_c towards the front and the back of an element, as factors; equal for roofs, flat faces and free duct mouths (solver method 5). */
export function directivityOf(element: PathElement): { front: number; back: number } {
  const { directivity, kind, normal } = element;
  if (directivity !== null) return { front: energyOf(directivity), back: energyOf(directivity) };
  if (isLikeRoof(element)) return { front: energyOf(OVER_ROOF), back: energyOf(OVER_ROOF) };
  if (kind === "duct" && !normal) return { front: 1, back: 1 };
  return { front: energyOf(IN_FRONT), back: energyOf(BEHIND_BUILDING) };
}

function noteOf(partId: string, text: string): Note {
  return { partId, text };
}

/** Rooms on both sides of a path as indices, -1 outdoors; null where the path leads nowhere. */
function sidesOf(
  path: Path | undefined,
  rooms: ReadonlyMap<string, RoomModel>,
): { from: number; to: number } | null {
  const from = path && rooms.get(path.fromSpaceId)?.index;
  const to = path && (path.toSpaceId === null ? -1 : rooms.get(path.toSpaceId)?.index);
  return from === undefined || to === undefined || from === to ? null : { from, to };
}

/** Elements of a plan with what they let pass. What stands nowhere or is made of nothing becomes a note. */
export function elementModels(
  plan: Plan,
  losses: ReadonlyMap<string, EffectiveLoss>,
  rooms: readonly RoomModel[],
  notes: Note[],
): ElementModels {
  const paths = new Map(plan.paths.map((path) => [path.id, path]));
  const roomsById = new Map(rooms.map((room) => [room.space.id, room]));
  const passings = new Map<string, ElementPassing>();
  const elements: ElementModel[] = [];
  for (const element of plan.elements) {
    const kind = elementKinds[element.kind];
    const loss = element.constructionId === null ? null : (losses.get(element.constructionId) ?? null);
    if (kind.constructed && !loss) notes.push(noteOf(element.id, `${element.name} has no construction yet.`));
    const passing = passingOfElement(element, loss);
    passings.set(element.id, passing);
    const sides = sidesOf(paths.get(element.pathId), roomsById);
    if (!sides) {
      notes.push(noteOf(element.id, `${element.name} does not stand between two spaces.`));
      continue;
    }
    const outdoors = sides.to < 0;
    const face = outdoors ? faceOf(element) : null;
    if (outdoors && !face)
      notes.push(
        noteOf(element.id, `${element.name} has no place on the lot, so what leaves by it is not known.`),
      );
    elements.push({
      ...passing,
      ...sides,
      index: elements.length,
      element,
      kind: kind.path,
      building: rooms[sides.from].space.buildingId,
      face,
      diffuse: energyOf(element.diffuseness ?? DIFFUSE),
    });
  }
  return { elements, passings };
}
