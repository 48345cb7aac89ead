// Longer than most: one list, its ways of looking and its acts, over one stand-in of the server.
import { cleanup, render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { ProjectList } from "@/components/projects/ProjectList";
import type { ProjectLine } from "@/components/projects/ProjectLine";
import { readYardView } from "@/components/projects/yardView";

const router = vi.hoisted(() => ({ refresh: vi.fn(), replace: vi.fn(), push: vi.fn() }));
vi.mock("next/navigation", () => ({ useRouter: () => router, useSearchParams: () => null }));

beforeEach(() => {
  window.history.replaceState(null, "", "/projects");
  Object.values(router).forEach((way) => way.mockClear());
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const yard = (line: Partial<ProjectLine>): ProjectLine => ({
  id: "1", href: "/projects/1", yardHref: "/projects/1/yard", revision: 4, name: "Lot 7", says: "Drums in a shed", stage: "As drawn", state: "under", margin: 6.2, doubt: 3,
  band: 63, listenerName: "No. 9, bedroom", weighedAt: "2027-01-14T20:04:00Z", changedAt: "2027-01-14T20:04:00Z", people: [{ name: "Ines", says: "yours" }],
  lot: [[0, 0], [20, 0], [20, 10], [0, 10]], buildings: [], archived: false, may: { rename: true, copy: true }, ...line,
});

function show(projects: ProjectLine[], { mayMake = true, address = "", facts = {} }: { mayMake?: boolean; address?: string; facts?: object } = {}) {
  window.history.replaceState(null, "", `/projects${address}`);
  const parts = new URLSearchParams(address);
  const all = { page: 1, pages: 1, found: projects.length, inUse: projects.length, archived: 0, paged: false, ...facts };
  return render(<ProjectList projects={projects} now="2027-01-14T21:30:00Z" timeZone="UTC" view={readYardView((name) => parts.get(name))} facts={all} mayMake={mayMake} />);
}

const names = () => screen.queryAllByRole("heading", { level: 2 }).map((heading) => heading.textContent).filter((name) => name !== "Start from a worked yard");
const rowOf = (name: string) => screen.getByRole("link", { name }).closest("li")!;
const menuOf = (name: string) => within(rowOf(name)).getByText("", { selector: "summary" });
const choose = async (name: string, action: string) => {
  await userEvent.click(menuOf(name));
  await userEvent.click(within(rowOf(name)).getByRole("button", { name: action }));
};
/** The server as the list sees it: each request gets the next answer. */
function answerWith(...answers: [number, object][]) {
  const asked: { address: string; method: string; body: unknown; headers: Record<string, string> }[] = [];
  vi.stubGlobal("fetch", vi.fn(async (address: string, { method, body, headers }: { method: string; body: string; headers: Record<string, string> }) => {
    asked.push({ address, method, body: JSON.parse(body) as unknown, headers });
    const [status, answer] = answers.shift()!;
    return new Response(JSON.stringify(answer), { status });
  }));
  return asked;
}

describe("the list of yards", () => {
  it("says of each yard its verdict, where it is worst, and who is in it", () => {
    show([yard({ state: "over", margin: -2.8 })]);
    const row = rowOf("Lot 7");
    for (const words of ["3 dB over", "63 Hz at No. 9, bedroom", "Weighed today 20:04", "Ines (yours)", "Drums in a shed"]) {
      expect(within(row).getByText(words)).toBeDefined();
    }
    expect(screen.getByRole("link", { name: "Lot 7" }).getAttribute("href")).toBe("/projects/1");
  });

  it("strikes a stale verdict back to not weighed and says what it was and why", () => {
    show([yard({ state: "not weighed", was: "tight", margin: 2.1, stale: "door seal, 2 limits" })]);
    expect(screen.getByText("not weighed")).toBeDefined();
    expect(screen.getByText("was 2 dB under, tight")).toBeDefined();
    expect(screen.getByText("Changed since: door seal, 2 limits")).toBeDefined();
  });

  it("counts in its head what needs a look", () => {
    show([yard({ id: "1", state: "over", margin: -1 }), yard({ id: "2", state: "over", margin: -4 }), yard({ id: "3", stale: "a limit" })]);
    expect(screen.getByText("Three yards. Two are over their limits, one has changed since it was weighed.")).toBeDefined();
  });

  it("draws all plans to one scale, also those that are not shown", async () => {
    const { container } = show([yard({ id: "1", name: "Long" }), yard({ id: "2", name: "Short", lot: [[5, 5], [15, 5], [15, 15], [5, 15]] })]);
    const widthOf = (name: string) => {
      const drawing = container.querySelector(`svg[aria-label='Plan of ${name}'] path`)!;
      const eastings = [...drawing.getAttribute("d")!.matchAll(/[ML]([\d.]+) /g)].map(([, x]) => Number(x));
      return Math.max(...eastings) - Math.min(...eastings);
    };
    const alone = widthOf("Short");
    expect(widthOf("Long") / alone).toBeCloseTo(2, 1);
    await userEvent.type(screen.getByRole("searchbox"), "short");
    expect(widthOf("Short")).toBe(alone);
  });

  it("shows the shape of the answer while there is no yard, and the worked example to copy", () => {
    show([]);
    expect(screen.getByRole("heading", { name: "No yard yet" })).toBeDefined();
    expect(screen.getAllByRole("link", { name: "New yard" })).toHaveLength(1);
    expect(screen.getByRole("button", { name: "Copy the example" })).toBeDefined();
    expect(screen.queryByRole("listitem")).toBeNull();
    expect(screen.queryByRole("searchbox")).toBeNull();
  });

  it("tells who is in no team that yards come by invitation, and offers nothing that would be refused", () => {
    show([], { mayMake: false });
    expect(screen.getByText(/come to you by invitation/)).toBeDefined();
    expect(screen.queryByRole("link", { name: "New yard" })).toBeNull();
    expect(screen.queryByRole("button", { name: "Copy the example" })).toBeNull();
  });

  it("holds a name of 120 letters and a hundred yards", () => {
    const long = "N".repeat(120);
    const { container } = show(Array.from({ length: 100 }, (_, place) => yard({ id: `${place}`, name: place === 3 ? long : `Yard ${place}` })));
    // By selectors: roles of some thousand nodes take this browser's stand-in too long.
    expect(container.querySelectorAll("li h2").length).toBe(100);
    expect([...container.querySelectorAll("li h2")].filter(({ textContent }) => textContent === long)).toHaveLength(1);
  });
});

describe("looking for yards", () => {
  const four = [
    yard({ id: "1", name: "Éclair lot 10", says: "Drums", changedAt: "2027-01-14T20:00:00Z", state: "over", margin: -2.8 }),
    yard({ id: "2", name: "Éclair lot 9", says: "Cello", changedAt: "2027-01-13T20:00:00Z", state: "under", margin: 8 }),
    yard({ id: "3", name: "Cottage", says: "Nothing yet", changedAt: "2027-01-12T20:00:00Z", state: "not weighed", margin: undefined }),
    yard({ id: "4", name: "Attic", says: "Two amps", changedAt: "2027-01-11T20:00:00Z", state: "over", margin: -9, people: [{ name: "Anouk" }] }),
  ];

  it("by words: in any order, without accents, of names, lines and people", async () => {
    show(four);
    const field = screen.getByRole("searchbox", { name: "Find a yard" });
    for (const [words, found] of [["eclair", ["Éclair lot 10", "Éclair lot 9"]], ["cello eclair", ["Éclair lot 9"]], ["anouk", ["Attic"]]] as const) {
      await userEvent.clear(field);
      await userEvent.type(field, words);
      expect(names()).toEqual(found);
      expect(new URLSearchParams(window.location.search).get("words")).toBe(words);
    }
    expect(router.replace).not.toHaveBeenCalled();
  });

  it("that fit nothing says so and leads back", async () => {
    show(four, { address: "?words=zither" });
    expect(screen.getByText("No yard fits “zither”.")).toBeDefined();
    await userEvent.click(screen.getByRole("button", { name: "Show all yards" }));
    expect(names()).toHaveLength(4);
    expect(window.location.search).toBe("");
  });

  it.each([
    ["", ["Éclair lot 10", "Éclair lot 9", "Cottage", "Attic"]],
    ["?order=name", ["Attic", "Cottage", "Éclair lot 9", "Éclair lot 10"]],
    ["?order=margin", ["Attic", "Éclair lot 10", "Éclair lot 9", "Cottage"]],
    ["?show=over", ["Éclair lot 10", "Attic"]],
    ["?show=not weighed", ["Cottage"]],
    ["?show=over&order=margin&words=e", ["Éclair lot 10"]],
    ["?show=nonsense&order=&page=-1", ["Éclair lot 10", "Éclair lot 9", "Cottage", "Attic"]],
  ])("the address %j shows them so", (address, found) => {
    show(four, { address });
    expect(names()).toEqual(found);
  });

  it("puts its order and its filter into the address", async () => {
    show(four);
    await userEvent.selectOptions(screen.getByRole("combobox", { name: "Order" }), "Worst margin");
    expect(names()[0]).toBe("Attic");
    await userEvent.click(screen.getByRole("link", { name: "Under 1" }));
    expect(names()).toEqual(["Éclair lot 9"]);
    expect(window.location.search).toBe("?show=under&order=margin");
    expect(screen.getByRole("link", { name: "Under 1" }).getAttribute("aria-current")).toBe("true");
  });

  it("asks the server for the archived ones, and shows no other under that heading meanwhile", async () => {
    show(four, { facts: { archived: 2 } });
    await userEvent.click(screen.getByRole("link", { name: "Archived 2" }));
    expect(router.replace).toHaveBeenCalledWith("/projects?show=archived", { scroll: false });
    expect(screen.getByRole("link", { name: "All 4" }).getAttribute("aria-current")).toBe("true");
  });

  it("over several pages looks through all of them when Enter is pressed, and says which these are", async () => {
    show(four, { facts: { paged: true, pages: 2, found: 104, inUse: 104 } });
    expect(screen.getByText(/Yards 1 to 100 of 104/)).toBeDefined();
    expect(screen.getByRole("link", { name: "Page 2" }).getAttribute("href")).toBe("/projects?page=2");
    await userEvent.type(screen.getByRole("searchbox"), "plum{Enter}");
    expect(router.replace.mock.calls).toEqual([["/projects?words=plum", { scroll: false }]]);
    expect(names()).toHaveLength(4);
  });
});

describe("what can be done with a yard", () => {
  const answered = (revision: number): [number, object] => [200, { revision, plan: {}, verdict: {} }];

  it("is renamed in place by Enter; the list is asked for anew and the next change bears the new revision", async () => {
    const asked = answerWith(answered(5), answered(6));
    show([yard({})]);
    await choose("Lot 7", "Rename");
    await userEvent.keyboard("Lot 8{Enter}"); // the name is selected, so that typing replaces it
    expect(await screen.findByRole("link", { name: "Lot 8" })).toBeDefined();
    expect(asked[0]).toMatchObject({ address: "/api/projects/1", method: "PATCH", body: { name: "Lot 8" }, headers: { "If-Match": '"4"' } });
    expect(router.refresh).toHaveBeenCalledTimes(1);
    expect(document.activeElement).toBe(menuOf("Lot 8"));
    await choose("Lot 8", "Rename");
    await userEvent.keyboard("Lot 9{Enter}");
    await screen.findByRole("link", { name: "Lot 9" });
    expect(asked[1]!.headers["If-Match"]).toBe('"5"');
  });

  it("keeps its name on Esc, and refuses none at all", async () => {
    const asked = answerWith();
    show([yard({})]);
    await choose("Lot 7", "Rename");
    const field = screen.getByRole("textbox", { name: "Name of the yard" });
    await userEvent.clear(field);
    await userEvent.keyboard("{Enter}");
    expect(screen.getByText("A yard needs a name.")).toBeDefined();
    await userEvent.keyboard("{Escape}");
    expect(screen.getByRole("link", { name: "Lot 7" })).toBeDefined();
    expect(asked).toEqual([]);
  });

  it("keeps what was typed beside the reason where the name is not taken", async () => {
    answerWith([422, { error: { message: "This value does not fit.", fields: { name: "At most 120 characters." } } }]);
    show([yard({})]);
    await choose("Lot 7", "Rename");
    const field = screen.getByRole<HTMLInputElement>("textbox", { name: "Name of the yard" });
    await userEvent.keyboard("Lot 8{Enter}");
    expect(await screen.findByText("At most 120 characters.")).toBeDefined();
    expect(field.value).toBe("Lot 8");
  });

  it("is duplicated; what comes of it is said, and leads to the copy", async () => {
    const asked = answerWith([201, { id: "2", next: "/projects/2" }]);
    show([yard({})]);
    await choose("Lot 7", "Duplicate");
    const link = await screen.findByRole("link", { name: "Open the copy" });
    expect(link.getAttribute("href")).toBe("/projects/2");
    expect(document.activeElement).toBe(link);
    expect(asked[0]).toMatchObject({ address: "/api/projects/1/copy", method: "POST" });
    expect(asked[0]!.headers["Idempotency-Key"]).toMatch(/^[0-9a-f-]{32,36}$/);
    expect(router.refresh).toHaveBeenCalledTimes(1);
  });

  it("a copy whose answer was lost is asked for again as the same wish, a copy after it as another", async () => {
    const asked = answerWith([503, { error: { message: "We cannot reach the yard's records just now." } }], [201, { id: "2", next: "/projects/2" }], [201, { id: "3", next: "/projects/3" }]);
    show([yard({})]);
    await choose("Lot 7", "Duplicate");
    expect(await screen.findByText("“Lot 7” was not copied")).toBeDefined();
    await choose("Lot 7", "Duplicate");
    await screen.findByRole("link", { name: "Open the copy" });
    await choose("Lot 7", "Duplicate");
    await waitFor(() => expect(asked).toHaveLength(3));
    const [first, second, third] = asked.map(({ headers }) => headers["Idempotency-Key"]);
    expect(second).toBe(first);
    expect(third).not.toBe(first);
  });

  it("a copy that is on its way already keeps its wish: the next try makes no second one", async () => {
    const twin = { error: { message: "This very change is being saved already." } };
    const asked = answerWith([503, { error: { message: "We cannot reach the yard's records just now." } }], [409, twin], [201, { id: "2", next: "/projects/2" }]);
    show([yard({})]);
    await choose("Lot 7", "Duplicate");
    await screen.findByText("“Lot 7” was not copied");
    await choose("Lot 7", "Duplicate");
    await screen.findByText("This very change is being saved already.");
    await choose("Lot 7", "Duplicate");
    await screen.findByRole("link", { name: "Open the copy" });
    expect(new Set(asked.map(({ headers }) => headers["Idempotency-Key"])).size).toBe(1);
  });

  it("is archived, and restored from the strip that says so", async () => {
    const asked = answerWith(answered(5), answered(6));
    show([yard({}), yard({ id: "2", name: "Attic" })]);
    await choose("Lot 7", "Archive");
    const undo = await screen.findByRole("button", { name: "Restore it" });
    expect(names()).toEqual(["Attic"]);
    expect(document.activeElement).toBe(undo);
    await userEvent.click(undo);
    await screen.findByText("“Lot 7” is back among your yards");
    expect(asked.map(({ body, headers }) => [body, headers["If-Match"]])).toEqual([[{ archived: true }, '"4"'], [{ archived: false }, '"5"']]);
  });

  it("an archived one offers to be restored or copied, not renamed", async () => {
    show([yard({ archived: true })], { address: "?show=archived" });
    await userEvent.click(menuOf("Lot 7"));
    expect(within(rowOf("Lot 7")).getAllByRole("button").map(({ textContent }) => textContent)).toEqual(["Duplicate", "Restore"]);
  });

  it("whoever may change nothing is told so and can still open it", async () => {
    show([yard({ may: { rename: false, copy: false } })]);
    await userEvent.click(menuOf("Lot 7"));
    expect(within(rowOf("Lot 7")).queryAllByRole("button")).toEqual([]);
    expect(within(rowOf("Lot 7")).getByRole("link", { name: "Open the yard" }).getAttribute("href")).toBe("/projects/1/yard");
    expect(screen.getByText(/its team may rename/)).toBeDefined();
  });

  it("its menu closes on Esc and gives the focus back", async () => {
    show([yard({})]);
    const summary = menuOf("Lot 7");
    await userEvent.click(summary);
    await userEvent.tab();
    await userEvent.keyboard("{Escape}");
    expect([(summary.parentElement as HTMLDetailsElement).open, document.activeElement]).toEqual([false, summary]);
  });

  it("the example is copied once however often the button is pressed, and opened", async () => {
    const asked = answerWith([201, { id: "9", next: "/projects/9/yard" }]);
    show([]);
    await userEvent.dblClick(screen.getByRole("button", { name: "Copy the example" }));
    await waitFor(() => expect(router.push).toHaveBeenCalledWith("/projects/9"));
    expect(asked).toHaveLength(1);
    expect(asked[0]).toMatchObject({ address: "/api/projects", body: { start: "example", currency: "USD" } });
  });
});
