import type { Plan } from "../../lib/noise/plan";

export type PathElement = Plan["elements"][number];

interface KindWords {
  one: string;
  many: string;
  /** Heading of the section, and what lies to its left when it faces the open. */
  section: string;
  outside: string;
}

const kinds: Record<PathElement["kind"], KindWords> = {
  wall: { one: "wall", many: "walls", section: "Section, looking down", outside: "Yard" },
  roof: { one: "roof", many: "roofs", section: "Section, turned on its side", outside: "Sky" },
  floor: { one: "floor", many: "floors", section: "Section, turned on its side", outside: "Below" },
  ceiling: { one: "ceiling", many: "ceilings", section: "Section, turned on its side", outside: "Above" },
  door: { one: "door", many: "doors", section: "The leaf, looking down", outside: "Yard" },
  window: { one: "window", many: "windows", section: "The panes, looking down", outside: "Yard" },
  leak: { one: "leak", many: "leaks", section: "", outside: "Yard" },
  duct: { one: "duct", many: "ducts", section: "", outside: "Yard" },
  flanking: { one: "path", many: "constructions", section: "Section", outside: "Yard" },
};

export const wordsOf = (element: PathElement): KindWords => kinds[element.kind];

/** "yard to room", or the two rooms by name. */
export function directionOf(element: PathElement, plan: Plan): string {
  const path = plan.paths.find(({ id }) => id === element.pathId);
  const [left, right] = sidesOf(element, plan);
  return path?.toSpaceId == null ? `${left.toLowerCase()} to room` : `${left} to ${right}`;
}

/** Names of the two sides of an element, from the left of its section: outdoors, or the space it leads to. */
export function sidesOf(element: PathElement, plan: Plan): [string, string] {
  const path = plan.paths.find(({ id }) => id === element.pathId);
  const nameOf = (spaceId: string | null | undefined) => plan.spaces.find(({ id }) => id === spaceId)?.name;
  return [nameOf(path?.toSpaceId) ?? wordsOf(element).outside, nameOf(path?.fromSpaceId) ?? "Room"];
}
