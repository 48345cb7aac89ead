import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { address, listenForComplaints, openBrowser, signIn } from "../browser";

let browser: Browser;

beforeAll(async () => {
  browser = await openBrowser();
});

afterAll(() => browser.close());

/** Opens a page and leaves its scripts half a second after everything has loaded. */
async function settle(page: Page, path: string): Promise<void> {
  await page.goto(address + path, { waitUntil: "load" });
  await page.waitForTimeout(500);
}

describe("the content policy in a browser", () => {
  it("blocks nothing of our own before sign-in, a page that is not there included", async () => {
    const page = await browser.newPage();
    const complaints = listenForComplaints(page);
    for (const path of ["/", "/sign-in", "/sign-up", "/check-mail", "/forgotten-password", "/new-password?token=x", "/email-check", "/email-move", "/email-undo", "/local-inbox", "/nothing-here"]) {
      await settle(page, path);
    }
    expect(complaints).toEqual([]);
    await page.close();
  });

  it("blocks nothing of our own on any page a signed-in reader can click to from the list of yards", async () => {
    const page = await browser.newPage();
    const complaints = listenForComplaints(page);
    await signIn(page, "ines");
    await settle(page, "/projects");
    const seen = new Set<string>();
    let open = ["/account", "/projects?show=archived", ...(await ownLinks())];
    while (open.length && seen.size < 25) {
      const path = open.shift()!;
      seen.add(path);
      await settle(page, path);
      open = [...open, ...(await ownLinks())].filter((found) => !seen.has(found));
    }
    expect([...seen].filter((path) => /\/(yard|rooms|sources|walls|limits)$/.test(path)).length).toBeGreaterThanOrEqual(5);
    expect(complaints).toEqual([]);
    await page.close();

    async function ownLinks(): Promise<string[]> {
      const links = await page.locator("a[href^='/projects']").evaluateAll((found) => found.map((link) => link.getAttribute("href")!));
      return [...new Set(links.map((link) => link.split("#")[0]!))];
    }
  });

  it("blocks an inline script and an inline style that are not ours", async () => {
    const page = await browser.newPage();
    const complaints = listenForComplaints(page);
    await settle(page, "/sign-in");
    await page.evaluate(() => {
      document.body.insertAdjacentHTML("beforeend", `<p id="probe" style="color: rgb(1, 2, 3)">probe</p><img src="x" onerror="window.broken = true">`);
    });
    await page.waitForTimeout(500);
    expect(await page.evaluate(() => getComputedStyle(document.querySelector("#probe")!).color)).not.toBe("rgb(1, 2, 3)");
    expect(await page.evaluate(() => "broken" in window)).toBe(false);
    expect(complaints.length).toBeGreaterThan(0);
    await page.close();
  });
});
