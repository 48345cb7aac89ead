import { CaseFault, pathWords, type Key } from "./fault";
import type { Budget } from "./schema";

function checkUnique(list: readonly { id: string }[], name: string): Set<string> {
  const ids = new Set<string>();
  list.forEach(({ id }, i) => {
    if (ids.has(id)) throw new CaseFault(`"${id}" stands twice`, pathWords([name, i, "id"]));
    ids.add(id);
  });
  return ids;
}

function check(ids: ReadonlySet<string>, id: string, what: string, path: readonly Key[]): void {
  if (!ids.has(id)) throw new CaseFault(`no ${what} is called "${id.slice(0, 64)}"`, pathWords(path));
}

/** A level of the free field can only be given where an element faces it. */
function checkIncident(elements: Budget["elements"], id: string, path: readonly Key[]): void {
  const element = elements.find((each) => each.id === id);
  if (!element) throw new CaseFault(`no element is called "${id.slice(0, 64)}"`, pathWords(path));
  if (element.to !== "outdoors")
    throw new CaseFault(`"${id}" stands between two rooms, no sound from outdoors meets it`, pathWords(path));
}

function checkSource(
  source: Budget["sources"][number],
  at: Key[],
  rooms: Set<string>,
  elements: Budget["elements"],
): void {
  if (source.kind === "room") check(rooms, source.room, "room", [...at, "room"]);
  if (source.kind === "incident")
    Object.keys(source.at).forEach((id) => checkIncident(elements, id, [...at, "at", id]));
  if (source.kind !== "fan") return;
  source.outlets.forEach(({ room, position }, i) => {
    if (room !== undefined) check(rooms, room, "room", [...at, "outlets", i, "room"]);
    else if (!position)
      throw new CaseFault("an outlet needs a room or a position", pathWords([...at, "outlets", i]));
  });
}

/** Throws where a name in a budget means nothing, or two things bear the same name. */
export function checkReferences({ rooms, elements, sources, receivers, constructions }: Budget): void {
  const roomIds = checkUnique(rooms, "rooms");
  checkUnique(elements, "elements");
  const sourceIds = checkUnique(sources, "sources");
  checkUnique(receivers, "receivers");
  const names = new Set(Object.keys(constructions));
  elements.forEach(({ from, to, construction }, i) => {
    check(roomIds, from, "room", ["elements", i, "from"]);
    if (to !== "outdoors") check(roomIds, to, "room", ["elements", i, "to"]);
    if (to === from)
      throw new CaseFault("an element stands between two different spaces", pathWords(["elements", i, "to"]));
    if (typeof construction === "string")
      check(names, construction, "construction", ["elements", i, "construction"]);
  });
  sources.forEach((source, i) => checkSource(source, ["sources", i], roomIds, elements));
  receivers.forEach(({ kind, room, position, distances }, i) => {
    if (kind === "room") check(roomIds, room ?? "", "room", ["receivers", i, "room"]);
    else if (!position)
      throw new CaseFault("an outdoor receiver needs its position", pathWords(["receivers", i, "position"]));
    Object.keys(distances).forEach((id) => check(sourceIds, id, "source", ["receivers", i, "distances", id]));
  });
}
