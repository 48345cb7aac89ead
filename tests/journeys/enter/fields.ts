import type { Locator, Page } from "playwright-core";
import { address } from "../../browser";

/** A page on which a yard is entered, and the yard. */
export interface Entry {
  page: Page;
  projectId: string;
}

const routeOf = ({ projectId }: Entry) => `${address}/api/projects/${projectId}`;

/** Does something that saves, and waits for the answer. A refusal ends the journey with its words. */
export async function saved(entry: Entry, act: () => Promise<unknown>): Promise<void> {
  const answered = entry.page.waitForResponse((answer) => answer.request().method() !== "GET" && answer.url().startsWith(routeOf(entry)), { timeout: 60_000 });
  const [answer] = await Promise.all([answered, act()]);
  if (!answer.ok()) throw new Error(`${answer.request().method()} ${answer.url()} ${answer.request().postData()}: ${answer.status()} ${await answer.text()}`);
}

const textbox = (scope: Locator | Page, name: string) => scope.getByRole("textbox", { name, exact: true });
/** A figure is written with a true minus and with narrow spaces between thousands. */
const figureIn = (shown: string) => Number(shown.replace("\u2212", "-").replace(/\s/g, ""));
const sameFigure = (shown: string, wanted: string | number) => shown.trim() !== "" && figureIn(shown) === wanted;

/** Types into a field that saves by itself; a field that says it already is left alone. */
export async function type(entry: Entry, name: string, value: string | number, scope: Locator | Page = entry.page): Promise<void> {
  const field = textbox(scope, name);
  const shown = await field.inputValue();
  if (shown === `${value}` || sameFigure(shown, value)) return;
  await saved(entry, async () => {
    await field.fill(`${value}`);
    await field.press("Enter");
  });
}

/** Types one after the other; what is null is left as it is. */
export async function typeAll(entry: Entry, values: Record<string, string | number | null>, scope?: Locator): Promise<void> {
  for (const [name, value] of Object.entries(values)) if (value !== null) await type(entry, name, value, scope);
}

/** Chooses in a list that saves by itself. */
export async function choose(entry: Entry, name: string, choice: string | { label: string }, scope: Locator | Page = entry.page): Promise<void> {
  const list = scope.getByRole("combobox", { name, exact: true });
  const chosen = await list.evaluate((select: HTMLSelectElement) => ({ value: select.value, label: select.selectedOptions[0]?.label }));
  if (typeof choice === "string" ? chosen.value === choice : chosen.label === choice.label) return;
  await saved(entry, () => list.selectOption(choice));
}

/** Fills fields of a form that saves nothing until it is sent. */
export async function fill(scope: Locator, values: Record<string, string | number | null>): Promise<void> {
  for (const [name, value] of Object.entries(values)) {
    if (value === null) continue;
    const field = textbox(scope, name);
    await field.fill(`${value}`);
    await field.blur();
  }
}

export const pick = (scope: Locator, name: string, choice: string | { label: string }) => scope.getByRole("combobox", { name, exact: true }).selectOption(choice);

/** Puts nine figures into a row as a reader does: pasted into its first field. */
export async function pasteNine(entry: Entry, row: string, figures: readonly (number | string | null)[], scope: Locator | Page = entry.page): Promise<void> {
  const first = scope.getByRole("group", { name: row, exact: true }).getByRole("textbox").first();
  await saved(entry, async () => {
    await first.focus();
    await first.evaluate((field, text) => {
      const clipboardData = new DataTransfer();
      clipboardData.setData("text", text);
      field.dispatchEvent(new ClipboardEvent("paste", { clipboardData, bubbles: true, cancelable: true }));
    }, figures.map((figure) => figure ?? "?").join("\t"));
  });
}

export const press = (entry: Entry, name: string, scope: Locator | Page = entry.page) =>
  saved(entry, () => scope.getByRole("button", { name, exact: true }).click());

/** Opens a folded part; one that is open stays. */
export async function unfold(scope: Locator | Page, words: string): Promise<void> {
  const summary = scope.locator("summary", { hasText: words }).first();
  const isOpen = await summary.evaluate((element) => (element.parentElement as HTMLDetailsElement).open); // a summary stands in its details
  if (!isOpen) await summary.click();
}

/** One of a few choices side by side. */
export const segment = (scope: Locator, group: string, choice: string) => scope.getByRole("group", { name: group, exact: true }).locator("label", { hasText: choice });

/** The innermost part of a page under a heading. */
export const under = ({ page }: Entry, heading: string) => page.locator("section").filter({ has: page.getByRole("heading", { name: heading, exact: true }) }).last();

export async function open(entry: Entry, stage: string): Promise<void> {
  await entry.page.goto(`${address}/projects/${entry.projectId}/${stage}`, { waitUntil: "networkidle", timeout: 60_000 });
}
