import { AxeBuilder } from "@axe-core/playwright";
import type { Browser, BrowserContext, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { idOf } from "../../scripts/idOf";
import { address, listenForComplaints, openBrowser, signIn } from "../browser";

const project = `/projects/${idOf("project", "plumtree-row")}`;
const bare = `/projects/${idOf("project", "tern-cottage")}`;
const madeUp = "a".repeat(43);
/** What everybody may open. */
const doors = {
  "the first page": "/",
  "the sign-in page": "/sign-in",
  "the sign-up page": "/sign-up",
  "the page that says to look in the mail": "/check-mail",
  "a forgotten password": "/forgotten-password",
  "a new password": `/new-password?token=${madeUp}`,
  "a new password without a link": "/new-password",
  "an e-mail to be checked": `/email-check?token=${madeUp}`,
  "a dead link to check an e-mail": "/email-check",
  "a dead link to move an e-mail": "/email-move",
  "a dead link to undo that": "/email-undo",
  "the mail kept here": "/local-inbox",
  "a page that is not there": "/nothing-here",
};
const screens = {
  "the account": "/account",
  "the yards": "/projects",
  "the archived yards": "/projects?show=archived",
  "a new yard": "/projects/new",
  "the yard": `${project}/yard`,
  "the rooms": `${project}/rooms`,
  "the sources": `${project}/sources`,
  "the walls": `${project}/walls`,
  "the yard door": `${project}/walls/${idOf("plumtree-row", "yard-door")}`,
  "the roof": `${project}/walls/${idOf("plumtree-row", "studio-roof")}`,
  "the limits": `${project}/limits`,
  "the budget": project,
  "the budget of a dB(A) limit": `/projects/${idOf("project", "dell-end")}`,
  "the budget without a listener": bare,
  "the limits without a listener": `${bare}/limits`,
};
const widths = [320, 390, 1024, 1440];
const themes = ["light", "dark"] as const;
/** Widths at which axe looks at every screen; STILLYARD_SWEEP=whole has it look at all of them, which takes six minutes more. */
const examined: Record<(typeof themes)[number], readonly number[]> =
  process.env.STILLYARD_SWEEP === "whole" ? { light: widths, dark: widths } : { light: [1440], dark: [390] };

let browser: Browser;

beforeAll(async () => {
  browser = await openBrowser();
});

afterAll(() => browser.close());

async function openContext(theme: "light" | "dark"): Promise<BrowserContext> {
  return browser.newContext({ colorScheme: theme, reducedMotion: "reduce" });
}

/** Axe findings of any impact, each in one line. */
async function findingsOf(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.flatMap(({ id, nodes }) => nodes.map(({ target, failureSummary }) => `${id} ${target.join(" ")}: ${failureSummary ?? ""}`));
}

const sidewaysScroll = (page: Page) => page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

/** Loaded once and drawn anew at every width, as when a window is drawn narrower. */
async function expectSound(page: Page, path: string, theme: (typeof themes)[number]): Promise<void> {
  await page.setViewportSize({ width: widths[0]!, height: 900 });
  await page.goto(address + path, { waitUntil: "networkidle" });
  await expectNothingWrong(page, path, theme);
}

async function expectNothingWrong(page: Page, path: string, theme: (typeof themes)[number]): Promise<void> {
  for (const width of widths) {
    await page.setViewportSize({ width, height: 900 });
    await page.waitForTimeout(100);
    if (examined[theme].includes(width)) expect(await findingsOf(page), `${path} at ${width}`).toEqual([]);
    expect(await sidewaysScroll(page), `${path} scrolls sideways at ${width}`).toBeLessThanOrEqual(0);
  }
}

describe.each(themes)("every screen in the %s theme", (theme) => {
  let context: BrowserContext;
  let page: Page;
  let complaints: string[];

  beforeAll(async () => {
    context = await openContext(theme);
    page = await context.newPage();
    complaints = listenForComplaints(page);
  });

  afterAll(() => context.close());

  it.each(Object.entries(doors))("%s has no axe finding, and no sideways scroll at any width", async (_, path) => {
    await expectSound(page, path, theme);
    expect(complaints).toEqual([]);
  });

  describe("behind the sign-in page", () => {
    beforeAll(() => signIn(page, "ines"));

    it.each(Object.entries(screens))("%s has no axe finding, and no sideways scroll at any width", async (_, path) => {
      await expectSound(page, path, theme);
      expect(complaints).toEqual([]);
    });

    it("the form for another wall has none either", async () => {
      await page.setViewportSize({ width: 1440, height: 900 });
      await page.goto(`${address}${project}/walls`, { waitUntil: "networkidle" });
      await page.getByText("Add a wall or an opening").click();
      await expectNothingWrong(page, "the form for another wall", theme);
      expect(complaints).toEqual([]);
    });
  });
});

describe("what each role finds", () => {
  it.each(["ines", "tobi"])("%s may choose another door", async (person) => {
    const page = await (await openContext("light")).newPage();
    await signIn(page, person);
    await page.goto(address + screens["the yard door"]);
    expect(await page.getByRole("radio").count()).toBeGreaterThan(3);
    await page.context().close();
  });

  it.each(["anouk", "maro"])("%s reads the door and the reason why it cannot be changed here", async (person) => {
    const page = await (await openContext("light")).newPage();
    await signIn(page, person);
    await page.goto(address + screens["the yard door"]);
    expect(await page.getByRole("radio").count()).toBe(0);
    expect(await page.locator("main").innerText()).toMatch(/Only .*Ines.* can change/);
    await page.context().close();
  });

  it("nobody is led to the sign-in page and back", async () => {
    const page = await (await openContext("light")).newPage();
    await page.goto(address + screens["the roof"]);
    expect(new URL(page.url()).pathname).toBe("/sign-in");
    await page.context().close();
  });
});
