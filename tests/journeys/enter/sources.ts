import type { Locator } from "playwright-core";
import type { DuctPiece } from "@/lib/noise/ducts/run";
import type { Outlet, Plan } from "@/lib/noise/plan";
import type { Source } from "@/lib/noise/sources";
import { choose, pasteNine, pick, press, saved, typeAll, under, unfold, type Entry } from "./fields";

type Named = (id: string) => string;

const place = (position: readonly number[] | null) => ({ "East, x": position?.[0] ?? null, "North, y": position?.[1] ?? null, "Height, z": position?.[2] ?? null });

/** A source with figures of one's own: levels, doubt, place, and the mouths of its duct where it has one. */
export async function enterSource(entry: Entry, source: Source, mouths: readonly Outlet[], roomName: Named): Promise<void> {
  const { page } = entry;
  const { name, says, kind, spaceId, position, power, deviation, params } = source;
  await page.getByRole("button", { name: "Add a source", exact: true }).click();
  const form = page.locator("#add-source");
  await pick(form, "What it is", kind);
  if (spaceId) await pick(form, "It stands in", { label: roomName(spaceId) });
  await press(entry, "Add one without figures, to measure or type", form);
  await form.waitFor({ state: "detached" });
  await typeAll(entry, { Name: name, "What the sentence calls it": says });
  await page.getByRole("heading", { name: `${name}, sound power`, exact: true }).waitFor();
  if (power) await pasteNine(entry, "Sound power, re 1 pW, dB", power);
  await unfold(page, "Doubt of each band");
  if (deviation) await pasteNine(entry, "Standard deviation, plus or minus, dB", deviation);
  await typeAll(entry, place(position));
  if ("q" in params) await typeAll(entry, { "Directivity factor Q": params.q });
  for (const mouth of mouths) await enterMouth(entry, mouth, roomName);
}

async function enterMouth(entry: Entry, { name, spaceId, position, run }: Outlet, roomName: Named): Promise<void> {
  const field = entry.page.getByRole("textbox", { name: "Name of the mouth", exact: true });
  const all = under(entry, "Mouths of its duct").getByRole("listitem").filter({ has: field });
  const before = await all.count();
  await press(entry, "Add a mouth");
  await all.nth(before).waitFor();
  const values = await Promise.all((await all.all()).map((one) => one.getByRole("textbox", { name: "Name of the mouth", exact: true }).inputValue()));
  const mouth = all.nth(values.indexOf(`Mouth ${before + 1}`));
  await choose(entry, "It opens into", { label: spaceId ? roomName(spaceId) : "The yard" }, mouth);
  await typeAll(entry, place(position), mouth);
  await enterRun(entry, run, mouth);
  await typeAll(entry, { "Name of the mouth": name }, mouth);
}

/** Pieces of a duct from where it begins to its mouth. Silencers are put in at the beginning, ends at the end. */
export async function enterRun(entry: Entry, run: readonly DuctPiece[], scope: Locator): Promise<void> {
  const { page } = entry;
  const pieces = scope.getByRole("listitem").filter({ has: page.getByRole("heading", { level: 3, name: /^\d+\. (Silencer|End of the run)$/ }) });
  for (const { kind } of run) {
    const standing = await scope.getByRole("heading", { name: kind === "silencer" ? /Silencer$/ : /End of the run$/ }).count();
    if (standing >= run.filter((piece) => piece.kind === kind).length) continue;
    const before = await pieces.count();
    await press(entry, kind === "silencer" ? "Add a silencer" : "Add an end", scope);
    await pieces.nth(before).waitFor();
  }
  for (const [at, piece] of run.entries()) {
    const fields = pieces.nth(at);
    if (piece.kind === "silencer") await pasteNine(entry, "What it holds back, dB", piece.il, fields);
    else {
      await typeAll(entry, { "Free cross-section": Number((piece.s * 1e4).toPrecision(12)) }, fields);
      const flush = fields.getByRole("checkbox", { name: "Flush with a wall or ceiling" });
      if ((await flush.isChecked()) !== piece.flush) await saved(entry, () => flush.click());
    }
  }
}

/** What plays at once; a new situation has everything at work all the time. */
export async function enterSituation(entry: Entry, { name, says, playing }: Plan["situations"][number], sourceName: Named): Promise<void> {
  await press(entry, "Add a situation");
  const blocks = entry.page.locator("#situations section");
  await blocks.first().waitFor();
  const block = blocks.last();
  await typeAll(entry, { "Name of the situation": name, "How the sentence begins": says }, block);
  for (const { sourceId, share } of playing) await typeAll(entry, { [`Share of the time, ${sourceName(sourceId)}`]: share * 100 }, block);
}
