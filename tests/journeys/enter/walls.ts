import type { Plan } from "@/lib/noise/plan";
import { fill, open, pick, press, typeAll, unfold, type Entry } from "./fields";
import { enterRun } from "./sources";

type Element = Plan["elements"][number];

const faces: [string, (normal: readonly number[]) => boolean][] = [
  ["roof", ([, , z]) => z === 1],
  ["east", ([x]) => x === 1],
  ["west", ([x]) => x === -1],
  ["north", ([, y]) => y === 1],
  ["south", ([, y]) => y === -1],
];
const isHole = ({ kind }: Element) => kind === "leak" || kind === "duct";
const tidy = (metres: number) => Number(metres.toFixed(3));

/** Adds an element by the form, with its boundary where that is not there yet. */
export async function addElement(entry: Entry, plan: Plan, element: Element, constructionName: string | undefined): Promise<void> {
  const { page } = entry;
  await unfold(page, "Add a wall or an opening");
  const form = page.locator("form", { has: page.getByRole("button", { name: "Add it", exact: true }) });
  const path = plan.paths.find(({ id }) => id === element.pathId)!;
  const roomName = (id: string) => plan.spaces.find((space) => space.id === id)!.name;
  const boundaries = await form.getByRole("combobox", { name: "It stands in" }).locator("option").allInnerTexts();
  if (boundaries.includes(path.name)) await pick(form, "It stands in", { label: path.name });
  else {
    await pick(form, "It stands in", { label: "a new boundary" });
    await pick(form, "From room", { label: roomName(path.fromSpaceId) });
    await pick(form, "To", { label: path.toSpaceId ? roomName(path.toSpaceId) : "outdoors" });
    await fill(form, { "Name of the boundary": path.name });
  }
  await pick(form, "Kind", element.kind);
  const face = element.normal && faces.find(([, looks]) => looks(element.normal!))![0];
  if (face) await pick(form, "It faces", face);
  await fill(form, { Name: element.name, ...sizes(element, face), ...along(plan, element, face) });
  await fill(form, areas(element));
  if (constructionName) await pick(form, "Made of", { label: constructionName });
  await press(entry, "Add it", form);
  await page.getByRole("link").filter({ has: page.getByText(element.name, { exact: true }) }).last().waitFor();
}

const sizes = (element: Element, face: string | null): Record<string, number> =>
  isHole(element) || !element.size ? {} : { Width: element.size[0], [face === "roof" ? "Depth" : "Height"]: element.size[1] };

function areas(element: Element): Record<string, number> {
  const inSquareCentimetres = Number((element.area * 1e4).toPrecision(12));
  if (element.kind === "leak") return { "Open area": inSquareCentimetres };
  if (element.kind === "duct") return { "Cross-section of the mouth": inSquareCentimetres };
  return { Area: element.area };
}

/** Where its centre is in the face of its room. */
function along({ paths, spaces }: Plan, { pathId, position }: Element, face: string | null): Record<string, number> {
  const box = spaces.find(({ id }) => id === paths.find((path) => path.id === pathId)?.fromSpaceId)?.box;
  if (!position || !face || !box) return {};
  const from = (axis: 0 | 1 | 2) => tidy(position[axis] - box.at[axis]);
  if (face === "roof") return { "Centre along the face, from the west": from(0), "Centre, from the south": from(1) };
  const eastOrWest = face === "east" || face === "west";
  return { [`Centre along the face, from the ${eastOrWest ? "south" : "west"}`]: from(eastOrWest ? 1 : 0), "Centre over the floor": from(2) };
}

const asPlaced = (one: Element, other: Element) => JSON.stringify(one.position) === JSON.stringify(other.position);
const openPart = (element: Element) => (element.kind === "window" ? element.params.openArea : 0);

/** Figures that stand only on the page of an element: a place off its room's face, a window's open part, a duct's run. */
export async function finishElement(entry: Entry, wanted: Element, standing: Element): Promise<void> {
  if (asPlaced(wanted, standing) && openPart(wanted) === 0 && wanted.kind !== "duct") return;
  const { page } = entry;
  await open(entry, `walls/${standing.id}`);
  if (!asPlaced(wanted, standing) && wanted.position) {
    const [east, north, up] = wanted.position;
    await unfold(page, "Where it stands");
    await typeAll(entry, { "Centre, east": east, "Centre, north": north, "Centre over ground": up });
  }
  if (openPart(wanted) > 0) await typeAll(entry, { "Open part": openPart(wanted) });
  if (wanted.kind === "duct") await enterRun(entry, wanted.params.run, page.locator("main"));
}

