import type { Plan } from "@/lib/noise/plan";
import { choose, press, type, typeAll, type Entry } from "./fields";

const list = ({ page }: Entry) => page.getByRole("region", { name: "Everything in the yard", exact: true });

async function light(entry: Entry, name: string): Promise<void> {
  const line = list(entry).getByRole("listitem").filter({ has: entry.page.getByText(name, { exact: true }) });
  await line.getByRole("button").click();
  await lit(entry, name);
}

/** What was added or pressed has its fields open: they stand under its name. */
const lit = ({ page }: Entry, name: string | RegExp) => page.getByRole("heading", { name, exact: true, level: 2 }).waitFor();

const isRectangle = (outline: readonly (readonly number[])[]) => outline.length === 4;

async function enterOutline(entry: Entry, outline: readonly (readonly number[])[]): Promise<void> {
  const { page } = entry;
  const [xs, ys] = [outline.map(([x]) => x!), outline.map(([, y]) => y!)];
  const [west, south] = [Math.min(...xs), Math.min(...ys)];
  if (isRectangle(outline)) {
    const rounded = (metres: number) => Number(metres.toFixed(3));
    return typeAll(entry, {
      "West side at": west,
      "South side at": south,
      "Width, west to east": rounded(Math.max(...xs) - west),
      "Depth, south to north": rounded(Math.max(...ys) - south),
    });
  }
  await page.getByRole("button", { name: "Corner by corner", exact: true }).click();
  for (let corner = 4; corner < outline.length; corner += 1) {
    await press(entry, "Add a corner");
    await page.getByRole("textbox", { name: `Corner ${corner + 1}, east` }).waitFor();
  }
  for (const [at, [east, north]] of outline.entries()) await typeAll(entry, { [`Corner ${at + 1}, east`]: east!, [`Corner ${at + 1}, north`]: north! });
}

export async function enterLot(entry: Entry, { street, outline, ground, trees, ...air }: Plan["lot"]): Promise<void> {
  if (outline) await enterOutline(entry, outline);
  await type(entry, "Street", street);
  for (const [at, label] of ["Ground by the studio", "Ground between", "Ground by the listener"].entries()) await choose(entry, label, `${ground[at]}`);
  await typeAll(entry, { "Air outdoors": air.temperature, "Humidity outdoors": air.humidity, "Air indoors": air.indoorTemperature, "Humidity indoors": air.indoorHumidity });
  for (const [at, tree] of trees.entries()) {
    await press(entry, "Add a tree");
    await lit(entry, `Tree ${at + 1}`);
    await typeAll(entry, { East: tree.at[0], North: tree.at[1], Height: tree.height, "Crown, across": tree.crown });
  }
}

/** A building with its outline and floors; one that is on the list by its name is lit, any other is added. */
export async function enterBuilding(entry: Entry, { name, role, footprint, floors, eaves, ridge, ridgeAxis }: Plan["buildings"][number]): Promise<void> {
  const { page } = entry;
  if ((await list(entry).getByText(name, { exact: true }).count()) > 0) await light(entry, name);
  else {
    await press(entry, "Add a building");
    await lit(entry, /^(Studio|House)( \d+)?$/);
    await type(entry, "Name", name);
  }
  await choose(entry, "What it is", role);
  await typeAll(entry, { "Eaves over ground": eaves, "Ridge over ground": ridge });
  await choose(entry, "The ridge runs", ridgeAxis ?? "");
  if (footprint) await enterOutline(entry, footprint);
  for (let floor = 1; floor < floors.length; floor += 1) {
    await press(entry, "Add a floor");
    await page.getByRole("textbox", { name: `Floor ${floor + 1} over ground` }).waitFor();
  }
  for (const [at, height] of floors.entries()) await type(entry, floors.length === 1 ? "Floor over ground" : `Floor ${at + 1} over ground`, height);
}

export async function enterFence(entry: Entry, { name, p1, p2, height, thickness }: Plan["fences"][number]): Promise<void> {
  await press(entry, "Add a fence");
  await lit(entry, /^Fence( \d+)?$/);
  await typeAll(entry, { Name: name, "From, east": p1[0], "From, north": p1[1], "To, east": p2[0], "To, north": p2[1], Height: height, Thickness: thickness });
}

/** On which side of a fence's line each listener stands. */
export async function enterSides(entry: Entry, receivers: Plan["receivers"]): Promise<void> {
  for (const { name, side } of receivers) {
    await light(entry, name);
    await choose(entry, "On a fence’s line, it stands on", side);
  }
}

/** Makes a yard out of the sizes of its lot, its studio and the first room, and says which one it is. */
export async function makeYard(page: Entry["page"], name: string, { lot, buildings, spaces }: Plan): Promise<Entry> {
  const studio = buildings.find(({ role }) => role === "studio");
  const room = spaces.find(({ buildingId }) => buildingId === studio?.id);
  const sizeOf = (outline: readonly (readonly number[])[]) => [0, 1].map((axis) => {
    const along = outline.map((corner) => corner[axis]!);
    return Number((Math.max(...along) - Math.min(...along)).toFixed(3));
  });
  const form = page.locator("form", { has: page.getByRole("button", { name: "Make the yard" }) });
  const put = async (label: string, value: string | number, group = form) => {
    await group.getByRole("textbox", { name: label, exact: true }).fill(`${value}`);
  };
  await put("Name", name, form.locator("section", { has: page.getByRole("heading", { name: "What it is" }) }));
  const group = (legend: string) => form.getByRole("group", { name: legend, exact: true });
  if (lot.outline) {
    const [width, depth] = sizeOf(lot.outline);
    await put("Width, west to east", width!, group("The lot"));
    await put("Depth, south to north", depth!, group("The lot"));
  }
  if (studio?.footprint) {
    const [width, depth] = sizeOf(studio.footprint);
    await put("Name", studio.name, group("The studio building"));
    await put("Width outside", width!);
    await put("Depth outside", depth!);
    if (studio.eaves !== null) await put("Height of the eaves", studio.eaves);
  }
  if (room?.box) {
    const [width, depth, height] = room.box.size;
    await put("Name", room.name, group("The first room"));
    await put("Width inside", width);
    await put("Depth inside", depth);
    await put("Height inside", height);
  }
  await page.getByRole("button", { name: "Make the yard" }).click();
  await page.waitForURL(/\/projects\/[0-9a-f-]{36}/);
  return { page, projectId: /projects\/([0-9a-f-]{36})/.exec(page.url())![1]! };
}

