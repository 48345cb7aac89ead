import type { Plan } from "../../lib/noise/plan";
import type { PlanChange } from "../plan/save";
import type { PathElement } from "./elementWords";
import { areaOfFace, inFace, normalOf, placeInFace, sizeOfFace, takenOf, toMillimetre, type Face } from "./faces";

export type ElementKindName = PathElement["kind"];

/** What the form to add an element holds, in SI. */
export interface Draft {
  /** The boundary it stands in; null makes a new one. */
  pathId: string | null;
  fromSpaceId: string;
  /** Null is outdoors. */
  toSpaceId: string | null;
  pathName: string;
  kind: ElementKindName;
  name: string;
  /** Of elements to outdoors; null leaves the place open. */
  face: Face | null;
  width: number | null;
  height: number | null;
  /** Centre along the face and over the floor, m; null is its middle, or on the floor for a door. */
  along: number | null;
  up: number | null;
  area: number | null;
  catalogueKey: string | null;
}

const spaceOf = ({ spaces }: Plan, id: string | null) => spaces.find((space) => space.id === id);

/** "Live room, east face", "Live room to control room". */
export function boundaryName(plan: Plan, { fromSpaceId, toSpaceId, face }: Pick<Draft, "fromSpaceId" | "toSpaceId" | "face">): string {
  const from = spaceOf(plan, fromSpaceId)?.name ?? "Room";
  const to = spaceOf(plan, toSpaceId)?.name;
  const words = to ? `${from} to ${to}` : face === "roof" ? `${from}, roof` : `${from}, ${face ?? "outer"} face`;
  return words.slice(0, 120);
}

const surfaces = new Set<ElementKindName>(["wall", "roof", "floor", "ceiling", "flanking"]);
export const isSurface = (kind: ElementKindName): boolean => surfaces.has(kind);

/** Usual sizes to begin with, m. Common practice, no source. */
const usual: Partial<Record<ElementKindName, [number, number]>> = { door: [0.9, 2.1], window: [1.2, 1] };
const SILL = 0.9;
/** A leak of a square centimetre, a duct 200 mm across. */
const holes: Partial<Record<ElementKindName, number>> = { leak: 0.0001, duct: 0.0314 };

/** Width and height of what is added: a surface fills its face, an opening has a usual size. */
export function sizeOfDraft(plan: Plan, draft: Draft): [number, number] | null {
  const box = spaceOf(plan, draft.fromSpaceId)?.box;
  const face = draft.face && draft.toSpaceId === null && box ? sizeOfFace(box, draft.face) : undefined;
  const base = isSurface(draft.kind) ? face : usual[draft.kind];
  const [width, height] = [draft.width ?? base?.[0], draft.height ?? base?.[1]];
  return width !== undefined && height !== undefined ? [width, height] : null;
}

/** Area, m²: as typed; of a surface its face without what stands in it; of an opening its width times its height. */
export function areaOfDraft(plan: Plan, draft: Draft): number | null {
  if (draft.area !== null) return draft.area;
  if (holes[draft.kind] !== undefined) return holes[draft.kind]!;
  const size = sizeOfDraft(plan, draft);
  if (!size) return null;
  const whole = toMillimetre(size[0] * size[1]);
  const box = spaceOf(plan, draft.fromSpaceId)?.box;
  if (!isSurface(draft.kind) || !draft.pathId || !draft.face || !box) return whole;
  const fills = draft.width === null && draft.height === null;
  const left = toMillimetre(areaOfFace(box, draft.face) - takenOf(inFace(plan, draft.pathId, draft.face)));
  return fills && left > 0 ? left : whole;
}

/** Where its centre stands, m; null between two rooms, and where the room has not been drawn. */
export function placeOfDraft(plan: Plan, draft: Draft): [number, number, number] | null {
  const box = spaceOf(plan, draft.fromSpaceId)?.box;
  if (!box || !draft.face || draft.toSpaceId !== null) return null;
  const [across, high] = sizeOfFace(box, draft.face);
  return placeInFace(box, draft.face, draft.along ?? across / 2, draft.up ?? usualHeight(plan, draft, high));
}

function usualHeight(plan: Plan, draft: Draft, high: number): number {
  const [, height = 0] = sizeOfDraft(plan, draft) ?? [];
  if (draft.face === "roof" || isSurface(draft.kind)) return high / 2;
  if (draft.kind === "door") return height / 2;
  return draft.kind === "window" ? Math.min(SILL + height / 2, high / 2 + SILL) : high / 2;
}

/** Nine bands of which none is known. */
const unknownBands = () => new Array<null>(9).fill(null);

function paramsOf(kind: ElementKindName, area: number): object {
  if (kind === "door") return { gapArea: 0 };
  if (kind === "window") return { openArea: 0 };
  if (kind !== "duct") return {};
  return { opening: area, run: [{ kind: "silencer", il: unknownBands() }, { kind: "end", s: area, flush: true }] };
}

const NEW_PATH = "new:boundary";

/** The changes that add an element, with its boundary where there is none yet; none while its area is open. */
export function additionOf(plan: Plan, draft: Draft): PlanChange[] {
  const area = areaOfDraft(plan, draft);
  if (area === null) return [];
  const { pathId, fromSpaceId, toSpaceId, face, kind, name, catalogueKey } = draft;
  const boundary: PlanChange[] = pathId
    ? []
    : [{ act: "add", part: "paths", as: NEW_PATH, values: { fromSpaceId, toSpaceId, name: draft.pathName.trim() || boundaryName(plan, draft) } }];
  const position = placeOfDraft(plan, draft);
  const sized = kind !== "leak" && kind !== "duct" ? sizeOfDraft(plan, draft) : null;
  const values = {
    pathId: pathId ?? NEW_PATH,
    kind,
    name: name.trim(),
    area,
    constructionId: null,
    position,
    normal: position && face ? normalOf(face) : null,
    size: sized,
    params: paramsOf(kind, area),
    ...(catalogueKey && { construction: { catalogueKey } }),
  };
  return [...boundary, { act: "add", part: "elements", values }];
}
