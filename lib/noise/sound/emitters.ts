import type { PathKind } from "../elements/kind";
import { BEHIND_FACADE } from "../facade";
import { directivityOf, type ElementModel } from "../model/elementModels";
import type { SourceModel } from "../model/sourceModels";
import type { Place } from "../outdoors/barrier";
import { centresOf, cutTowards, isBehind, type Face } from "../outdoors/face";
import { addRay, endAt, type End, type Yard } from "../outdoors/ray";

/** Something that sounds outdoors: an element of a room that is played in, an outdoor source, or the mouth of a run. */
export interface Emitter {
  /** Id of the element, source or outlet. */
  readonly id: string;
  readonly name: string;
  readonly kind: PathKind;
  readonly element: ElementModel | null;
  /** Index of the only source it sounds for; -1 for an element. */
  readonly source: number;
  /** Power of that source, pW; empty for an element. */
  readonly power: Float64Array;
  /** What stands in a path's name: nothing for an outdoor source. */
  readonly label: string | null;
  readonly face: Face;
  readonly front: number;
  readonly back: number;
  readonly ends: Map<number, End[]>;
}

/** Somewhere outdoors that sound arrives at: an element of a listener's building or a listener. */
export interface Point {
  readonly end: End;
  readonly element: ElementModel | null;
  readonly face: Face | null;
}

const NOTHING = new Float64Array(0);

function elementEmitter(model: ElementModel, face: Face): Emitter {
  const { element, kind } = model;
  const { front, back } = directivityOf(element);
  return {
    id: element.id,
    name: element.name,
    kind,
    element: model,
    source: -1,
    power: NOTHING,
    label: element.id,
    face,
    front,
    back,
    ends: new Map(),
  };
}

/** What a source lets sound outdoors: itself, or the mouths of its runs. */
export function sourceEmitters({ source, emissions, index }: SourceModel): Emitter[] {
  return emissions.flatMap(({ at, directivity, outlet, energy }): Emitter[] => {
    if (!at) return [];
    const face: Face = { at, normal: null, size: null, likeRoof: false };
    const shared = {
      element: null,
      source: index,
      power: energy,
      face,
      front: directivity,
      back: directivity,
      ends: new Map(),
    };
    if (outlet) return [{ ...shared, id: outlet.id, name: outlet.name, kind: "duct", label: outlet.id }];
    return [{ ...shared, id: source.id, name: source.name, kind: "outdoor unit", label: null }];
  });
}

/** All emitters of a plan; `sounding` tells the rooms that sound can be in. */
export function emittersOf(
  elements: readonly ElementModel[],
  sources: readonly SourceModel[],
  sounding: (room: number) => boolean,
): Emitter[] {
  const faces = elements.flatMap((model) =>
    model.face && sounding(model.from) ? [elementEmitter(model, model.face)] : [],
  );
  return [...faces, ...sources.flatMap(sourceEmitters)];
}

/** Ends of the rays from a face towards a place; kept, since many places ask for the same cut. */
function endsTowards({ face, ends }: Emitter, place: Place): End[] {
  const [across, up] = cutTowards(face, place);
  const key = across * 100 + up;
  const known = ends.get(key) ?? centresOf(face, [across, up]).map((at) => endAt(at));
  ends.set(key, known);
  return known;
}

/** Whether sound of that emitter may arrive at that point: a building never enters itself (solver method 6). */
export function mayArrive({ element }: Emitter, point: Point): boolean {
  return !element || !point.element || element.building !== point.element.building;
}

/** Adds to `out` the energy at a point of an emitter of power 1, free field (solver method 5 and 6). */
export function addTravel(
  yard: Yard,
  emitter: Emitter,
  { end, face }: Point,
  out: Float64Array,
  offset: number,
): void {
  const directed = isBehind(emitter.face, end.at) ? emitter.back : emitter.front;
  const shaded = face && isBehind(face, emitter.face.at) ? BEHIND_FACADE : 1;
  const ends = endsTowards(emitter, end.at);
  for (const from of ends) addRay(yard, from, end, (directed * shaded) / ends.length, out, offset);
}
