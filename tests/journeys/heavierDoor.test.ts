import type { Browser, Locator, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { idOf } from "../../scripts/idOf";
import { address, listenForComplaints, openBrowser, signIn } from "../browser";

const project = `/projects/${idOf("project", "plumtree-row")}`;
const door = `${project}/walls/${idOf("plumtree-row", "yard-door")}`;
const roof = `${project}/walls/${idOf("plumtree-row", "studio-roof")}`;

let browser: Browser;
let page: Page;
let complaints: string[];

beforeAll(async () => {
  browser = await openBrowser();
  page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
  complaints = listenForComplaints(page);
  await signIn(page, "ines");
});

afterAll(() => browser.close());

/** Walks the choices with the arrow keys until the wanted one is marked, then puts it in with Enter. */
async function chooseByKeyboard(name: RegExp): Promise<void> {
  await page.getByRole("radio", { checked: true }).focus();
  const count = await page.getByRole("radio").count();
  for (let step = 0; step < count; step += 1) {
    const marked = await page.getByRole("radio", { checked: true }).getAttribute("aria-label");
    if (name.test(marked ?? "")) break;
    await page.keyboard.press("ArrowDown");
  }
  const saved = page.waitForResponse((answer) => answer.request().method() === "PATCH");
  await page.keyboard.press("Enter");
  expect((await saved).status()).toBe(200);
}

/** Words as a reader hears them: a space that does not break is a space. */
const wordsOf = async (locator: Locator) => (await locator.innerText()).replace(/\s+/g, " ");
const verdict = () => wordsOf(page.locator("#verdict").getByRole("status"));
const sentence = () => wordsOf(page.getByRole("heading", { level: 1 }));

/** The story of the demo lot: its words follow from the solver's figures, checked against the method's own in tests/data. */
describe("the musician tries a heavier door, by keyboard alone", () => {
  it("reads on the budget that the kit is 4 dB over in next door's bedroom at 63 Hz", async () => {
    await page.goto(address + project);
    expect(await sentence()).toMatch(/your kit will be 4 dB over what next door[’']s bedroom may hear/);
    expect(await wordsOf(page.locator("main"))).toContain("at 63 Hz");
  });

  it("puts the heavy door in: 1 dB over still", async () => {
    await page.goto(address + door);
    await chooseByKeyboard(/^Heavy door/i);
    await expect.poll(verdict).toMatch(/1 dB over/);
    expect(await verdict()).toMatch(/2\.[345] dB better than before/);
  });

  it("hangs the roof's ceiling on clips as well: under, and tight", async () => {
    await page.goto(address + roof);
    await chooseByKeyboard(/clips/i);
    await expect.poll(verdict).toMatch(/3 dB under, tight/);
  });

  it("gives the ceiling joists of its own: under by more than the doubt", async () => {
    await page.goto(address + roof);
    await chooseByKeyboard(/joists of its own, \d/i);
    await expect.poll(verdict).toMatch(/6 dB under(?!, tight)/);
  });

  it("finds the new verdict on the budget, and puts everything back", async () => {
    await page.goto(address + project);
    expect(await sentence()).toMatch(/6 dB under/);
    await page.goto(address + roof);
    await chooseByKeyboard(/resilient channel/i);
    await page.goto(address + door);
    await chooseByKeyboard(/^Hardwood door/i);
    await expect.poll(verdict).toMatch(/4 dB over/);
    expect(complaints).toEqual([]);
  });
});
