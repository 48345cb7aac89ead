import type { Plan, Space, Surface } from "@/lib/noise/plan";
import { choose, fill, pasteNine, pick, press, saved, typeAll, under, unfold, type Entry } from "./fields";

type Named = (id: string) => string;

async function openRoom(entry: Entry, { name, buildingId, box }: Space, buildingName: Named): Promise<void> {
  const { page } = entry;
  const line = page.getByRole("navigation", { name: "Rooms", exact: true }).getByRole("button").filter({ has: page.getByText(name, { exact: true }) });
  if ((await line.count()) > 0) await line.click();
  else {
    await page.getByRole("button", { name: /^Add (a|the first) room$/ }).click();
    const form = page.locator("form", { has: page.getByRole("button", { name: "Not now" }) });
    await pick(form, "Building", { label: buildingName(buildingId) });
    await fill(form, { Name: name, "Inside width": box?.size[0] ?? null, "Inside depth": box?.size[1] ?? null, Height: box?.size[2] ?? null });
    await press(entry, "Add it", form);
  }
  await page.getByRole("heading", { level: 1, name, exact: true }).waitFor();
}

/** A room, its box and volume, and how it swallows sound: by nine figures of its own, or by its surfaces. */
export async function enterRoom(entry: Entry, space: Space, surfaces: readonly Surface[], names: { building: Named; finish: Named }): Promise<void> {
  const { box, volume, absorption } = space;
  await openRoom(entry, space, names.building);
  const sheet = under(entry, "Size and finish");
  await unfold(sheet, "Where it stands");
  if (box) {
    const [west, south, floor] = box.at;
    const [width, depth, height] = box.size;
    await typeAll(entry, { "Inside width": width, "Inside depth": depth, Height: height }, sheet);
    await typeAll(entry, { "West wall, east of nought": west, "South wall, north of nought": south, "Floor over ground": floor }, sheet);
  }
  await typeAll(entry, { Volume: volume }, sheet);
  await removeSurfaces(entry);
  if (absorption.kind === "surfaces") {
    for (const surface of surfaces) await enterSurface(entry, surface, names.finish);
    return;
  }
  await press(entry, "Own figures", sheet);
  await choose(entry, "You give", absorption.kind, sheet);
  const [row, figures] = absorption.kind === "area" ? ["Absorption area, m²", absorption.area] : ["Decay time, s", absorption.seconds];
  await pasteNine(entry, row!, figures as (number | null)[], sheet);
}

/** A room comes lined as most are; here it is lined anew. */
async function removeSurfaces(entry: Entry): Promise<void> {
  const remove = under(entry, "Surfaces").getByRole("button", { name: /^Remove / });
  for (let left = await remove.count(); left > 0; left -= 1) {
    await saved(entry, () => remove.first().click());
    await remove.nth(left - 1).waitFor({ state: "detached" });
  }
}

async function enterSurface(entry: Entry, { name, area, finishKey }: Plan["surfaces"][number], finishName: Named): Promise<void> {
  const sheet = under(entry, "Surfaces");
  const lines = sheet.getByRole("listitem");
  const before = await lines.count();
  const finish = finishName(finishKey ?? "");
  await pick(sheet, "Another surface", { label: finish });
  await fill(sheet, { "Its area": area });
  await press(entry, "Add it", sheet);
  await lines.nth(before).waitFor();
  for (const line of await lines.all()) {
    const field = line.getByRole("textbox", { name: "Name", exact: true });
    if ((await field.inputValue()) === finish) return typeAll(entry, { Name: name }, line);
  }
}
