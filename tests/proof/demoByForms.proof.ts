import { readFileSync } from "node:fs";
import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { planSchema, type Plan } from "@/lib/noise/plan";
import type { Verdict } from "@/lib/noise/verdict";
import { idOf } from "../../scripts/idOf";
import { address, listenForComplaints, openBrowser, signIn } from "../browser";
import { open, type Entry } from "../journeys/enter/fields";
import { enterListener } from "../journeys/enter/limits";
import { enterRoom } from "../journeys/enter/rooms";
import { enterSituation, enterSource } from "../journeys/enter/sources";
import { addElement, finishElement } from "../journeys/enter/walls";
import { enterBuilding, enterFence, enterLot, enterSides, makeYard } from "../journeys/enter/yard";

const read = (file: string): unknown => JSON.parse(readFileSync(file, "utf8"));
const demo = planSchema.parse(read("data/examples/plumtree-row.json"));
const recordsIn = (file: string) => (read(file) as { records: { key: string; name: string }[] }).records;
const [finishes, constructions] = [recordsIn("data/finishes.json"), recordsIn("data/constructions.json")];

const nameIn = (list: readonly { id: string; name: string }[]) => (id: string) => list.find((one) => one.id === id)!.name;
const calledIn = (records: typeof finishes) => (key: string) => records.find((record) => record.key === key)!.name;
const roomName = nameIn(demo.spaces);

function constructionOf({ constructionId }: Plan["elements"][number]): string | undefined {
  const construction = demo.constructions.find(({ id }) => id === constructionId);
  return construction && calledIn(constructions)(construction.catalogueKey!);
}

let browser: Browser;
let page: Page;
let entry: Entry;
let complaints: string[];

beforeAll(async () => {
  browser = await openBrowser();
  page = await browser.newPage({ viewport: { width: 1440, height: 1000 } });
  page.setDefaultTimeout(60_000);
  complaints = listenForComplaints(page);
  await signIn(page, "ines");
});

afterAll(() => browser.close());

interface Weighed {
  plan: Plan;
  verdict: Verdict;
}

const answerOf = async (projectId: string) => (await (await page.request.get(`${address}/api/projects/${projectId}`)).json()) as Weighed;

/** State, levels and margins of every listener by its name, 63 Hz to 8 kHz. */
function readingOf({ plan, verdict }: Weighed) {
  return new Map(
    verdict.receivers.map(({ receiverId, state, bands }) => {
      const judged = bands.slice(1);
      return [nameIn(plan.receivers)(receiverId), { state, levels: judged.map(({ level }) => level), margins: judged.map(({ margin }) => margin) }];
    }),
  );
}

describe("the whole demo lot entered by the forms", () => {
  it("makes an empty yard out of three sizes", async () => {
    await page.goto(`${address}/projects/new`, { waitUntil: "networkidle" });
    entry = await makeYard(page, "Entered by hand", demo);
  });

  it("draws lot, buildings and fence", async () => {
    await open(entry, "yard");
    await enterLot(entry, demo.lot);
    for (const building of demo.buildings) await enterBuilding(entry, building);
    for (const fence of demo.fences) await enterFence(entry, fence);
  });

  it("gives the buildings their rooms, lined or by nine figures", async () => {
    await open(entry, "rooms");
    const names = { building: nameIn(demo.buildings), finish: calledIn(finishes) };
    for (const space of demo.spaces) {
      const surfaces = demo.surfaces.filter(({ spaceId }) => spaceId === space.id);
      await enterRoom(entry, space, surfaces, names);
    }
  });

  it("puts in what plays, with figures of its own", async () => {
    await open(entry, "sources");
    for (const source of demo.sources) {
      const mouths = demo.outlets.filter(({ sourceId }) => sourceId === source.id);
      await enterSource(entry, source, mouths, roomName);
    }
    for (const situation of demo.situations) await enterSituation(entry, situation, nameIn(demo.sources));
  });

  it("builds every wall, roof, door and opening out of the library", async () => {
    await open(entry, "walls");
    for (const element of demo.elements) await addElement(entry, demo, element, constructionOf(element));
    const { plan } = await answerOf(entry.projectId);
    for (const element of demo.elements) await finishElement(entry, element, plan.elements.find(({ name }) => name === element.name)!);
  });

  it("says who listens and what each may hear", async () => {
    await open(entry, "limits");
    for (const receiver of demo.receivers) await enterListener(entry, demo, receiver, demo.criteria.find(({ receiverId }) => receiverId === receiver.id)!);
    await open(entry, "yard");
    await enterSides(entry, demo.receivers);
  });

  it("is weighed like the demo itself, within 0.05 dB at every listener", async () => {
    const [wanted, entered] = [readingOf(await answerOf(idOf("project", "plumtree-row"))), readingOf(await answerOf(entry.projectId))];
    expect([...entered.keys()].toSorted()).toEqual([...wanted.keys()].toSorted());
    for (const [name, { state, levels, margins }] of wanted) {
      const here = entered.get(name)!;
      expect(here.state, name).toBe(state);
      const figures = [...levels, ...margins];
      [...here.levels, ...here.margins].forEach((figure, at) => {
        if (typeof figures[at] === "number") expect(Math.abs(Number(figure) - figures[at]), `${name}, figure ${at}`).toBeLessThan(0.05);
        else expect(figure, `${name}, figure ${at}`).toEqual(figures[at]);
      });
    }
    expect(complaints).toEqual([]);
  });
});
