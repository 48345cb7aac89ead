import { gzipSync } from "node:zlib";
import type { Browser } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { idOf } from "../../scripts/idOf";
import { address, openBrowser, signIn } from "../browser";

const budget = `/projects/${idOf("project", "plumtree-row")}`;
const MOST = 185_000;

let browser: Browser;

beforeAll(async () => {
  browser = await openBrowser();
});

afterAll(() => browser.close());

describe("what the budget costs at the first load", () => {
  it("its scripts are at most 185 kB gzip", async () => {
    const context = await browser.newContext();
    const page = await context.newPage();
    await signIn(page, "ines");
    const fresh = await context.newPage();
    const scripts = new Map<string, Promise<number>>();
    fresh.on("response", (answer) => {
      if (answer.request().resourceType() !== "script") return;
      scripts.set(answer.url(), answer.body().then((body) => gzipSync(body).length));
    });
    await (await fresh.context().newCDPSession(fresh)).send("Network.setCacheDisabled", { cacheDisabled: true });
    await fresh.goto(address + budget, { waitUntil: "networkidle" });
    const total = (await Promise.all(scripts.values())).reduce((sum, bytes) => sum + bytes, 0);
    console.log(`first-load scripts of the budget: ${scripts.size} files, ${(total / 1000).toFixed(1)} kB gzip`);
    expect(scripts.size).toBeGreaterThan(3);
    expect(total).toBeLessThanOrEqual(MOST);
    await context.close();
  });
});
