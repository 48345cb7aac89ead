import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { idOf } from "../../scripts/idOf";
import { address, listenForComplaints, openBrowser, signIn } from "../browser";
import { sentenceOf, wordsOf } from "../reading";

const project = `/projects/${idOf("project", "plumtree-row")}`;
const stages = ["yard", "rooms", "sources", "walls", "limits"];

let browser: Browser;
let page: Page;
let complaints: string[];

beforeAll(async () => {
  browser = await openBrowser();
  page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
  complaints = listenForComplaints(page);
  await signIn(page, "maro");
});

afterAll(() => browser.close());

async function open(path: string): Promise<void> {
  await page.goto(address + project + path, { waitUntil: "networkidle" });
}

const main = () => page.locator("main");

/** Every field but what only turns the page: the air of a room, there to be tried and kept nowhere, and the band a chart shows. */
const changing = () =>
  main()
    .locator("input, textarea, select")
    .evaluateAll((fields) => {
      const tried = (field: Element) => field.closest("section")?.querySelector("h2")?.textContent === "Air";
      const shows = (field: Element) => field.id !== "" && document.querySelector(`label[for="${CSS.escape(field.id)}"]`)?.textContent === "Band";
      return fields.filter((field) => !tried(field) && !shows(field)).map((field) => field.outerHTML.slice(0, 160));
    });
const dead = () => main().locator("button, a, summary").evaluateAll((controls) => controls.filter((one) => one.matches(":disabled, [aria-disabled=true], a:not([href])")).map((one) => one.outerHTML.slice(0, 160)));
const verbs = /^(add|remove|duplicate|draw|choose|use|copy|undo|save|measure|type|replace|put)\b/i;

async function acts(): Promise<string[]> {
  const names = await main().getByRole("button").evaluateAll((buttons) => buttons.map((one) => (one.getAttribute("aria-label") ?? one.textContent ?? "").trim()));
  return names.filter((name) => verbs.test(name));
}

describe("a builder, who may read everything and change nothing here", () => {
  it.each(stages)("finds the stage %s as text, with one line why", async (stage) => {
    await open(`/${stage}`);
    expect((await wordsOf(main())).match(/Only [^.]*\bcan change[^.]*\./g) ?? []).toHaveLength(1);
    expect(await changing()).toEqual([]);
    expect(await acts()).toEqual([]);
    expect(await dead()).toEqual([]);
  });

  it("reads on the budget what is over, where and by how much", async () => {
    await open("");
    expect(await sentenceOf(page)).toMatch(/4 dB over/);
    expect(await dead()).toEqual([]);
  });

  it("reads the door: what it is made of, what it stops, what to see to when it is hung", async () => {
    await open(`/walls/${idOf("plumtree-row", "yard-door")}`);
    expect(await sentenceOf(page)).toMatch(/door/i);
    const words = await wordsOf(main());
    expect(words).toMatch(/Only .*Ines.* can change/);
    expect(words).toMatch(/63/);
    expect(words).toMatch(/kg/);
    expect(await main().getByRole("radio").count()).toBe(0);
    expect(await acts()).toEqual([]);
  });

  it("is told the same by the product when a change is sent all the same", async () => {
    expect(await sendFence()).toBe(403);
    expect(complaints).toEqual([]);
  });
});

/** The status of an answer to a fence that no page of a builder offers. */
function sendFence(): Promise<number> {
  return page.evaluate(async (path) => {
    const body = JSON.stringify({ name: "Fence", p1: [0, 0], p2: [1, 0], height: 1.8, thickness: 0 });
    const answer = await fetch(`/api${path}/fences`, { method: "POST", headers: { "Content-Type": "application/json", "If-Match": '"1"' }, body });
    return answer.status;
  }, project);
}
