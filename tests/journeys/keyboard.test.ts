import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { idOf } from "../../scripts/idOf";
import { address, listenForComplaints, openBrowser, signIn } from "../browser";
import { pick, press, tabTo, typeInto } from "../keyboard";

const project = `/projects/${idOf("project", "plumtree-row")}`;

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

async function open(stage: string): Promise<void> {
  await page.goto(`${address}${project}/${stage}`, { waitUntil: "networkidle" });
}

/** The next answer to a change of the plan. */
const saved = () => page.waitForResponse((answer) => ["POST", "PATCH", "DELETE"].includes(answer.request().method()) && answer.url().includes("/api/projects/"));

async function pressAndSave(button: Parameters<typeof press>[0]): Promise<void> {
  const answer = saved();
  await press(button);
  expect((await answer).status()).toBeLessThan(300);
}

/** Types into a field and leaves it with the Tab key. */
async function typeAndLeave(field: Parameters<typeof press>[0], words: string): Promise<void> {
  await typeInto(field, words);
  const answer = saved();
  await page.keyboard.press("Tab");
  expect((await answer).status()).toBe(200);
}

describe("with Tab, Enter and the arrows alone", () => {
  it("a fence is added, made higher and removed again", async () => {
    await open("yard");
    await pressAndSave(page.getByRole("button", { name: "Add a fence" }));
    await expect.poll(() => page.locator("main h2").first().innerText()).toMatch(/^Fence/);
    await typeAndLeave(page.getByLabel("Height", { exact: false }).first(), "2.1");
    await page.getByText(/2\.1\s*m/).first().waitFor();
    await pressAndSave(page.getByRole("button", { name: "Remove", exact: true }));
    await page.getByText(/is removed\./).waitFor();
  });

  it("a surface is added to a room out of the library, and taken away again", async () => {
    await open("rooms");
    const lines = page.getByRole("button", { name: /^Remove / });
    const before = await lines.count();
    const finish = await page.getByLabel("Another surface").locator("option").nth(2).innerText();
    await pick(page.getByLabel("Another surface"), finish);
    await typeInto(page.getByLabel("Its area", { exact: false }), "3");
    await pressAndSave(page.getByRole("button", { name: "Add it" }));
    await expect.poll(() => lines.count()).toBe(before + 1);
    await pressAndSave(page.getByRole("button", { name: `Remove ${finish}`, exact: true }).last());
    await expect.poll(() => lines.count()).toBe(before);
  });

  it("a source is added, and removed again", async () => {
    await open("sources");
    const before = await page.getByRole("option").count();
    await press(page.getByRole("button", { name: "Add a source" }));
    await pick(page.getByLabel("What it is"), "Instrument or voice");
    await pressAndSave(page.getByRole("button", { name: "Add Piano, practice" }));
    await page.getByRole("option", { name: /^Piano, practice/, selected: true }).waitFor();
    await pressAndSave(page.getByRole("button", { name: "Remove this source" }));
    await page.getByText(/^Piano, practice removed/).waitFor();
    await expect.poll(() => page.getByRole("option").count()).toBe(before);
  });

  it("a limit is added beside the first, chosen with the arrows, and removed again", async () => {
    await open("limits");
    await press(page.getByText("Another limit for this listener"));
    await pick(page.getByLabel("A limit of the library").first(), "NC-20");
    await pressAndSave(page.getByRole("button", { name: "Copy it beside this one" }));
    await page.getByRole("radio", { name: /^NC-20/, checked: true }).waitFor({ state: "attached" });
    await tabTo(page.getByRole("radio", { name: /^NC-20/ }));
    await page.keyboard.press("ArrowUp");
    await page.keyboard.press("ArrowDown");
    expect(await page.getByRole("radio", { name: /^NC-20/ }).isChecked()).toBe(true);
    await pressAndSave(page.getByRole("button", { name: "Remove this limit" }));
    await page.getByText(/NC-20 is removed/).waitFor();
    expect(complaints).toEqual([]);
  });
});
