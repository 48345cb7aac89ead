import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { idOf } from "../../scripts/idOf";
import { address, listenForComplaints, openBrowser, signIn } from "../browser";
import { leadOf, stripOf } from "../reading";

const project = `/projects/${idOf("project", "plumtree-row")}`;

let browser: Browser;
let page: Page;
let complaints: string[];
/** What the strip says while the yard stands as it is drawn. */
let drawn: string;

beforeAll(async () => {
  browser = await openBrowser();
  page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
  complaints = listenForComplaints(page);
  await signIn(page, "tobi");
});

afterAll(() => browser.close());

const names = () => page.locator("main li h2").allInnerTexts();
const strip = () => stripOf(page);
const standing = () => leadOf(page);

async function open(stage: string): Promise<void> {
  await page.goto(`${address}${project}/${stage}`, { waitUntil: "networkidle" });
}

describe("an acoustician's list of yards", () => {
  it("is searched by a word as it is typed", async () => {
    await page.goto(`${address}/projects`, { waitUntil: "networkidle" });
    const all = (await names()).length;
    expect(all).toBeGreaterThan(2);
    await page.getByRole("searchbox", { name: "Find a yard" }).fill("plumtree");
    await expect.poll(names).toHaveLength(1);
    expect(await names()).toEqual([expect.stringMatching(/plumtree/i)]);
    await page.getByRole("searchbox", { name: "Find a yard" }).fill("");
    await expect.poll(names).toHaveLength(all);
  });

  it("is put in the order of its names, and of its margins", async () => {
    await page.getByLabel("Order").selectOption({ label: "Name" });
    await expect.poll(names).toEqual((await names()).toSorted((one, two) => one.localeCompare(two)));
    await page.getByLabel("Order").selectOption({ label: "Worst margin" });
    await expect.poll(async () => page.locator("main li:has(h2)").first().innerText()).toMatch(/over/);
  });

  it("leads into a yard", async () => {
    await page.getByRole("link", { name: /plumtree/i }).first().click();
    await page.waitForURL(new RegExp(`${project}$`));
  });
});

describe("an acoustician's change, stage by stage, each seen in the strip and taken back", () => {
  it("sources: brushes instead of sticks bring the kit under its limit", async () => {
    await open("sources");
    drawn = await standing();
    expect(drawn).toMatch(/4 dB over/);
    await page.getByRole("option", { name: /kit/i }).first().click();
    await page.getByRole("button", { name: "Use the figures of Drum kit, brushes" }).click();
    await expect.poll(strip).toMatch(/better than before/);
    expect(await strip()).not.toMatch(/over/);
    await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(standing).toBe(drawn);
  });

  it("limits: a rating curve in place of the measured night lets more through, and the night comes back", async () => {
    await open("limits");
    await beside("NC-15");
    await page.getByRole("radio", { name: /^NC-15/ }).waitFor({ state: "attached" });
    await page.getByRole("radio", { name: /^The night at No. 9/ }).check({ force: true });
    await page.getByRole("button", { name: "Remove this limit" }).click();
    await expect.poll(strip).toMatch(/better than before/);
    expect(await standing()).not.toBe(drawn);
    await page.getByRole("button", { name: "Bring it back" }).click();
    await expect.poll(standing).toBe(drawn);
    await page.getByRole("radio", { name: /^NC-15/ }).check({ force: true });
    await page.getByRole("button", { name: "Remove this limit" }).click();
    await page.getByText(/^NC-15 is removed/).waitFor();
  });

  it("rooms: bare surfaces let more out than those that are drawn", async () => {
    await open("rooms");
    const finish = page.getByRole("group", { name: "Finish" });
    await finish.getByRole("button", { name: "Bare" }).click();
    await page.getByText("The finish is bare now.").waitFor();
    await expect.poll(strip).toMatch(/worse than before/);
    await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(standing).toBe(drawn);
    // The strip's rounded words may be the same before and after: what counts again is seen here.
    await expect.poll(() => finish.getByRole("button", { name: "Own figures" }).getAttribute("aria-pressed")).toBe("true");
    expect(complaints).toEqual([]);
  });
});

/** Another limit of the library, copied beside the one that stands. */
async function beside(label: string): Promise<void> {
  const panel = page.locator("details").filter({ hasText: "Another limit for this listener" });
  await panel.locator("summary").click();
  await panel.getByLabel("A limit of the library").selectOption({ label });
  await panel.getByRole("button", { name: "Copy it beside this one" }).click();
}
