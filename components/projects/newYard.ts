import type { BrowserPlace } from "./browserPlace";

/** What is typed on the page of a new yard; sizes in m, null where nothing is known. */
export interface NewYard {
  name: string;
  says: string;
  street: string;
  teamId: string;
  start: "empty" | "example";
  lot: Sizes<"width" | "depth">;
  buildingName: string;
  building: Sizes<"width" | "depth" | "eaves">;
  roomName: string;
  room: Sizes<"width" | "depth" | "height">;
  /** Null until the reader chooses: then what the browser says holds. */
  timeZone: string | null;
  currency: string | null;
}
export type Sizes<Side extends string> = Record<Side, number | null>;

export const emptyYard = (start: NewYard["start"], teamId: string): NewYard => ({
  ...{ name: "", says: "", street: "", start, teamId },
  lot: { width: null, depth: null },
  buildingName: "",
  building: { width: null, depth: null, eaves: null },
  roomName: "",
  room: { width: null, depth: null, height: null },
  timeZone: null,
  currency: null,
});

const known = <Side extends string>(sizes: Sizes<Side>) => Object.fromEntries(Object.entries(sizes).filter(([, size]) => size !== null));

/** Sizes that were begun; nothing where none is known. What is missing of them the server asks for beside its field. */
function begun<Side extends string>(sizes: Sizes<Side>, name = "") {
  const told = known(sizes);
  const called = name.trim() === "" ? {} : { name };
  return Object.keys(told).length > 0 || name.trim() !== "" ? { ...told, ...called } : undefined;
}

/** The body of the request that makes it. */
export function bodyOf(yard: NewYard, place: BrowserPlace): Record<string, unknown> {
  const { name, says, start, teamId } = yard;
  const facts = { name, says, start, teamId, timeZone: yard.timeZone ?? place.timeZone, currency: yard.currency ?? place.currency };
  if (start === "example") return facts;
  return { ...facts, street: yard.street, lot: begun(yard.lot), building: begun(yard.building, yard.buildingName), room: begun(yard.room, yard.roomName) };
}
