import type { Locator, Page } from "playwright-core";

const hasFocus = (wanted: Locator) => wanted.evaluate((element) => element === document.activeElement);

/** Walks with the Tab key, and nothing else, until the wanted thing has the focus. */
export async function tabTo(wanted: Locator, most = 200): Promise<void> {
  const page = wanted.page();
  await wanted.waitFor();
  for (let step = 0; step < most; step += 1) {
    if (await hasFocus(wanted)) return;
    await page.keyboard.press("Tab");
  }
  throw new Error(`${most} presses of Tab did not reach ${wanted}.`);
}

/** Walks to a button or a link and presses it. */
export async function press(wanted: Locator): Promise<void> {
  await tabTo(wanted);
  await wanted.page().keyboard.press("Enter");
}

/** Walks to a field and types over what stands there; leaving it is the next key's work. */
export async function typeInto(field: Locator, words: string): Promise<void> {
  await tabTo(field);
  await field.page().keyboard.press("ControlOrMeta+A");
  await field.page().keyboard.type(words);
}

/** Walks to a closed choice and goes down or up in it until it says what is wanted. */
export async function pick(choice: Locator, wanted: string): Promise<void> {
  await tabTo(choice);
  const [at, to] = await choice.evaluate((select: HTMLSelectElement, label) => [select.selectedIndex, [...select.options].findIndex((option) => option.label === label)] as const, wanted);
  if (to < 0) throw new Error(`There is no ${wanted} to choose.`);
  for (let step = at; step !== to; step += Math.sign(to - at)) await choice.page().keyboard.press(to > at ? "ArrowDown" : "ArrowUp");
}

/** Waits until a page's scripts are there: a key pressed before that reaches nobody. */
export async function settle(page: Page): Promise<void> {
  await page.waitForLoadState("networkidle");
}
