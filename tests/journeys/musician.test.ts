import { randomUUID } from "node:crypto";
import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { address, listenForComplaints, openBrowser } from "../browser";
import { press, settle, tabTo, typeInto } from "../keyboard";
import { sentenceOf, stripOf, wordsOf } from "../reading";

const email = `mia.${randomUUID()}@stillyard.example`;
const password = "a snare under the pear tree";

let browser: Browser;
let page: Page;
let complaints: string[];

beforeAll(async () => {
  browser = await openBrowser();
  page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
  complaints = listenForComplaints(page);
});

afterAll(() => browser.close());

const main = () => page.locator("main");

/** Presses what leads to another page, and is there. */
async function follow(link: Parameters<typeof press>[0], where: RegExp): Promise<void> {
  await press(link);
  await page.waitForURL(where);
  await settle(page);
}

describe("a musician who has just heard of it, by keyboard alone", () => {
  it("reads on the first page what it is for, and signs up", async () => {
    await page.goto(address, { waitUntil: "networkidle" });
    expect(await sentenceOf(page)).toMatch(/what next door will hear before you build/);
    await follow(main().getByRole("link", { name: "Sign up as a musician" }), /\/sign-up\?hat=play$/);
    await typeInto(page.getByLabel("Name"), "Mia");
    await typeInto(page.getByLabel("E-mail"), email);
    await typeInto(page.getByLabel("Password", { exact: true }), password);
    await page.keyboard.press("Enter");
    await page.waitForURL(/\/check-mail$/);
    await expect.poll(() => wordsOf(main())).toContain(`A mail went to ${email}`);
  });

  it("is let in by the press of a button behind the mailed link, not by the link alone", async () => {
    await page.goto(`${address}/local-inbox`, { waitUntil: "networkidle" });
    const mail = page.getByRole("article").filter({ hasText: email }).first();
    await follow(mail.getByRole("link").first(), /\/email-check/);
    await press(page.getByRole("button", { name: "This e-mail is mine" }));
    await page.getByText("Your e-mail is checked").waitFor();
    await follow(main().getByRole("link", { name: "Sign in" }), /\/sign-in/);
    await typeInto(page.getByLabel("E-mail"), email);
    await typeInto(page.getByLabel("Password", { exact: true }), password);
    await page.keyboard.press("Enter");
    await page.waitForURL(/\/projects$/);
  });

  it("starts from the worked example and reads what next door hears", async () => {
    await settle(page);
    await press(page.getByRole("button", { name: "Copy the example" }));
    await page.waitForURL(/\/projects\/[0-9a-f-]{36}$/);
    await expect.poll(() => sentenceOf(page)).toMatch(/your kit will be 4 dB over what next door[’']s bedroom may hear/);
    expect(await wordsOf(main())).toContain("at 63 Hz");
  });

  it("follows the page's own advice to the door, and puts a heavier one in", async () => {
    await settle(page);
    await follow(main().getByRole("link", { name: /heavier door/i }).first(), /\/walls\/[0-9a-f-]{36}$/);
    await tabTo(page.getByRole("radio", { checked: true }));
    const heavy = page.getByRole("radio", { name: /^Heavy door/i });
    for (let step = await page.getByRole("radio").count(); step > 0 && !(await heavy.isChecked()); step -= 1) await page.keyboard.press("ArrowDown");
    const saved = page.waitForResponse((answer) => answer.request().method() === "PATCH");
    await page.keyboard.press("Enter");
    expect((await saved).status()).toBe(200);
    await expect.poll(() => stripOf(page)).toMatch(/1 dB over.* 2\.[345] dB better than before/);
  });

  it("finds the door on the budget: better, and 1 dB over still", async () => {
    await follow(page.locator("#verdict").getByRole("link", { name: "Budget" }), /\/projects\/[0-9a-f-]{36}$/);
    await expect.poll(() => sentenceOf(page)).toMatch(/1 dB over/);
    expect(complaints).toEqual([]);
  });
});
