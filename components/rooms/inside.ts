import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { Plan, Space } from "@/lib/noise/plan";
import { elementAddress, limitsAddress, sourcesAddress, wallsAddress } from "../addresses";
import { bandWords, formatNumber, withUnit } from "../format";

type PlanElement = Plan["elements"][number];

/** Something in a room or in its walls: a line of the list and, where it has a place, a balloon of the drawing. */
export interface Thing {
  id: string;
  what: "source" | "listener" | "mouth" | "opening";
  name: string;
  says: string;
  href: string;
  /** Metres on the lot; null where no place is drawn. */
  at: readonly [number, number] | null;
  /** Of an opening: the way out of the room, so that its balloon stands inside. */
  outward: readonly [number, number] | null;
  /** Of its balloon; null without a place. */
  number: number | null;
}

type Unnumbered = Omit<Thing, "number">;

/** Sources, listeners, mouths of ducts, doors and other openings of a room, numbered where they can be drawn. */
export function thingsIn(plan: Plan, space: Space, projectId: string): Thing[] {
  const things = [
    ...sourcesIn(plan, space, projectId),
    ...listenersIn(plan, space, projectId),
    ...mouthsIn(plan, space, projectId),
    ...openingsOf(plan, space, projectId),
  ];
  let count = 0;
  return things.map((thing) => ({ ...thing, number: thing.at && space.box ? ++count : null }));
}

const placeOf = (position: readonly number[] | null): [number, number] | null => (position ? [position[0]!, position[1]!] : null);

function sourcesIn({ sources }: Plan, { id }: Space, projectId: string): Unnumbered[] {
  return sources
    .filter(({ spaceId }) => spaceId === id)
    .map(({ id: own, name, power, position }) => ({
      id: own, name, what: "source", says: loudest(power), href: sourcesAddress(projectId), at: placeOf(position), outward: null,
    }));
}

/** The band a source is loudest in, of those known. */
function loudest(power: readonly (number | "silent" | null)[] | null): string {
  const known = (power ?? []).flatMap((level, band) => (typeof level === "number" ? [{ level, band }] : []));
  const most = known.toSorted((one, two) => two.level - one.level)[0];
  return most ? `${withUnit(formatNumber(most.level), "dB")} of power at ${bandWords(OCTAVE_BANDS[most.band]!)}` : "no level known";
}

function listenersIn({ receivers }: Plan, { id }: Space, projectId: string): Unnumbered[] {
  return receivers
    .filter(({ spaceId }) => spaceId === id)
    .map(({ id: own, name, position }) => ({
      id: own, name, what: "listener", says: "listens here", href: limitsAddress(projectId), at: placeOf(position), outward: null,
    }));
}

function mouthsIn({ outlets }: Plan, { id }: Space, projectId: string): Unnumbered[] {
  return outlets
    .filter(({ spaceId }) => spaceId === id)
    .map(({ id: own, name, position }) => ({
      id: own, name, what: "mouth", says: "mouth of a duct", href: wallsAddress(projectId), at: placeOf(position), outward: null,
    }));
}

const openingWords: Partial<Record<PlanElement["kind"], string>> = { door: "door", window: "window", duct: "air run", leak: "leak" };

function openingsOf({ paths, elements, spaces }: Plan, { id }: Space, projectId: string): Unnumbered[] {
  return elements.flatMap((element): Unnumbered[] => {
    const path = paths.find((one) => one.id === element.pathId);
    const word = openingWords[element.kind];
    if (!word || !path || (path.fromSpaceId !== id && path.toSpaceId !== id)) return [];
    const beyond = path.fromSpaceId === id ? path.toSpaceId : path.fromSpaceId;
    const to = beyond === null ? "outdoors" : (spaces.find((one) => one.id === beyond)?.name ?? "another room");
    const outward = element.normal && ([element.normal[0], element.normal[1]] as const);
    const href = elementAddress(projectId, element.id);
    return [{ id: element.id, name: element.name, what: "opening", says: `${word} to ${to}`, href, at: placeOf(element.position), outward }];
  });
}
