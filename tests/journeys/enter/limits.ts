import type { Criterion, Plan, Receiver } from "@/lib/noise/plan";
import { fill, pasteNine, pick, press, saved, segment, type, typeAll, under, type Entry } from "./fields";

/** A listener, where it listens, and its limit in nine figures of one's own. */
export async function enterListener(entry: Entry, { spaces, buildings }: Plan, receiver: Receiver, limit: Criterion): Promise<void> {
  const { page } = entry;
  const { name, says, kind, spaceId, position } = receiver;
  const form = page.getByRole("form", { name: "A listener", exact: true });
  if (!(await form.isVisible())) await page.getByRole("button", { name: "Add a listener", exact: true }).click();
  await fill(form, { "Who or where": name, "In a sentence": says });
  await segment(form, "Where they listen", kind === "room" ? "In a room" : "Outdoors").click();
  if (kind === "room") {
    const space = spaces.find(({ id }) => id === spaceId)!;
    await pick(form, "Room", { label: `${buildings.find(({ id }) => id === space.buildingId)!.name}: ${space.name}` });
  } else await fill(form, place(position));
  await pick(form, "Their limit", { label: "Own figures" });
  await press(entry, "Add the listener", form);
  await form.waitFor({ state: "detached" });
  await typeAll(entry, place(position), under(entry, "The listener"));
  await enterLimit(entry, limit);
}

const place = (position: readonly number[] | null) => ({ East: position?.[0] ?? null, North: position?.[1] ?? null, "Height over ground": position?.[2] ?? null });

async function enterLimit(entry: Entry, { name, levels, hours, place: words, provenance }: Criterion): Promise<void> {
  if (levels) await pasteNine(entry, "The nine figures, dB", levels);
  await typeAll(entry, { "Name of this limit": name, "In words": words, "Where it stands": provenance.document, "Clause, table or page": provenance.clause });
  const side = under(entry, "Hours").last();
  const chosen = await side.getByRole("group", { name: "Hours it holds", exact: true }).getByRole("radio", { name: hours ? "From and to" : "All hours" }).isChecked();
  if (!chosen && !hours) await saved(entry, () => segment(side, "Hours it holds", "All hours").click());
  if (!hours) return;
  if (!chosen) {
    await segment(side, "Hours it holds", "From and to").click();
    await fill(side, { From: hours.from });
  }
  await type(entry, "From", hours.from, side);
  await type(entry, "To", hours.to, side);
}
