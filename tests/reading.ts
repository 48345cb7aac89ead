import type { Locator, Page } from "playwright-core";

/** Words as a reader hears them: a space that does not break is a space. */
export const wordsOf = async (locator: Locator) => (await locator.innerText()).replace(/\s+/g, " ").trim();

/** The sentence at the top of a page. */
export const sentenceOf = (page: Page) => wordsOf(page.getByRole("heading", { level: 1 }));

/** What the strip over every stage says of the worst listener. */
export const stripOf = (page: Page) => wordsOf(page.locator("#verdict").getByRole("status"));

/** Its first line alone: who leads, and by how much, without the way it moved. */
export const leadOf = (page: Page) => wordsOf(page.locator("#verdict").getByRole("status").locator("p").first());
