import { cleanup, screen, waitFor, within } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import type { Plan } from "@/lib/noise/plan";
import { plumtreePlan } from "./fixtures/answers";
import { answerOf, showSources } from "./fixtures/sourcesDesk";
import { answerWith } from "./fixtures/wallDesk";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const withKit = (changes: Partial<Plan["sources"][number]>): Plan => ({
  ...plumtreePlan,
  sources: plumtreePlan.sources.map((source, i) => (i === 0 ? ({ ...source, ...changes } as typeof source) : source)),
});
const bodyOf = (sent: ReturnType<typeof answerWith>, at = 0) => JSON.parse(String(sent.mock.calls[at]![1].body)) as Record<string, unknown>;
const row = (name: RegExp) => within(screen.getByRole("listbox", { name: "Sources" })).getByRole("option", { name });

describe("the stage of the sources", () => {
  it("says how many there are and which one decides", () => {
    showSources();
    expect(screen.getByRole("heading", { level: 1 }).textContent).toBe("Four sources, and your kit decides");
    expect(row(/^Drum kit, Live room, loudest at 125\u00a0Hz with 112\u00a0dB, .*18:00.*23:30/).getAttribute("aria-selected")).toBe("true");
  });

  it("is one tab stop, the arrows light the next source, and its fields follow", async () => {
    const user = showSources();
    row(/^Drum kit/).focus();
    await user.keyboard("{ArrowDown}{ArrowDown}");
    expect(row(/^Condenser/).getAttribute("aria-selected")).toBe("true");
    expect(screen.getByRole<HTMLInputElement>("textbox", { name: "Name" }).value).toBe("Condenser");
    await user.keyboard("{Enter}");
    expect(document.activeElement?.id).toBe("lit-source");
  });

  it("saves nine pasted levels as the source's own", async () => {
    const sent = answerWith({ status: 200, body: answerOf(withKit({ power: [90, 91, 92, 93, 94, 95, 96, 97, 98], basis: "typed" }), 2) });
    const user = showSources();
    const levels = within(screen.getByRole("group", { name: "Sound power, re 1 pW, dB" }));
    await user.click(levels.getByRole("textbox", { name: "63 Hz" }));
    await user.paste("90\t91\t92\t93\t94\t95\t96\t97\t98");
    await waitFor(() => expect(sent).toHaveBeenCalledOnce());
    expect(sent.mock.calls[0]![0]).toBe("/api/projects/p1/sources/kit");
    expect(bodyOf(sent)).toEqual({ power: [90, 91, 92, 93, 94, 95, 96, 97, 98] });
    await waitFor(() => expect(row(/^Drum kit/).textContent).toContain("your figure"));
  });

  it("gives the mouth of a fan its silencer, in front of what stands", async () => {
    const sent = answerWith({ status: 200, body: answerOf(plumtreePlan, 2) });
    const user = showSources();
    await user.click(row(/^Fan/));
    await user.click(screen.getAllByRole("button", { name: "Add a silencer" })[0]!);
    await waitFor(() => expect(sent).toHaveBeenCalledOnce());
    expect(sent.mock.calls[0]![0]).toBe("/api/projects/p1/outlets/fan-grille");
    const before = plumtreePlan.outlets.find(({ id }) => id === "fan-grille")!.run;
    expect(bodyOf(sent)).toEqual({ run: [{ kind: "silencer", il: new Array(9).fill(null) }, ...before] });
  });

  it("says of a band nobody knows that it can be over, but never under", () => {
    showSources({ plan: withKit({ power: [null, 111, 112, 105, 102, 98, 98, 100, 98] }) });
    expect(screen.getByText(/Not known: 31\.5.Hz\. An unknown band can be over, but never under\./)).toBeDefined();
    expect(screen.getByRole("img", { name: /Drum kit, sound power.*31\.5.Hz unknown/ })).toBeDefined();
  });

  it("keeps a refused value where it was typed, with the reason", async () => {
    answerWith({ status: 422, body: { error: { message: "This value does not fit.", fields: { name: "At most 120 characters." } } } });
    const user = showSources();
    const field = screen.getByRole<HTMLInputElement>("textbox", { name: "Name" });
    await user.clear(field);
    await user.type(field, "The very loud kit{Enter}");
    expect(await screen.findByText("At most 120 characters.")).toBeDefined();
    expect(field.value).toBe("The very loud kit");
  });

  it("takes a pasted measurement only when it is told to, and can be undone", async () => {
    const measured = withKit({ power: [null, 98, 95, 93, 92, 91, 90, 88, 84], basis: "measured" });
    const sent = answerWith({ status: 200, body: answerOf(measured, 2) }, { status: 200, body: answerOf(plumtreePlan, 3) });
    const user = showSources();
    await user.click(screen.getByLabelText("Paste from the meter’s file or a table"));
    await user.paste("63 104,0  125 101,0  250 99,0  500 98,0  1000 97,0  2000 96,0  4000 94,0  8000 90,0");
    expect(screen.getByText(/Eight of nine, nothing at 31\.5.Hz\./)).toBeDefined();
    expect(sent).not.toHaveBeenCalled();
    await user.click(screen.getByRole("button", { name: "Use for Drum kit" }));
    await waitFor(() => expect(sent).toHaveBeenCalledOnce());
    expect(bodyOf(sent)).toEqual({ measured: { levels: [null, 104, 101, 99, 98, 97, 96, 94, 90], distance: 1, spaceId: "live-room", note: "" } });
    await user.click(await screen.findByRole("button", { name: "Undo" }));
    await waitFor(() => expect(sent).toHaveBeenCalledTimes(2));
    expect(bodyOf(sent, 1)).toMatchObject({ power: plumtreePlan.sources[0]!.power, basis: "measured" });
  });

  it("adds a record of the library in one press, at work in every situation, and lights it", async () => {
    const added = { ...plumtreePlan.sources[1]!, id: "sax", name: "Saxophone" };
    const sent = answerWith({ status: 200, body: answerOf({ ...plumtreePlan, sources: [...plumtreePlan.sources, added] }, 2) });
    const user = showSources();
    await user.click(screen.getByRole("button", { name: "Add a source" }));
    await user.selectOptions(screen.getByRole("combobox", { name: "What it is" }), "Instrument or voice");
    await user.click(screen.getByRole("button", { name: "Add Saxophone" }));
    await waitFor(() => expect(sent).toHaveBeenCalledOnce());
    expect(sent.mock.calls[0]![0]).toBe("/api/projects/p1/changes");
    expect(bodyOf(sent)).toMatchObject({ changes: [{ act: "add", values: { libraryKey: "saxophone", spaceId: "live-room" } }, { act: "change", part: "situations" }] });
    await waitFor(() => expect(row(/^Saxophone/).getAttribute("aria-selected")).toBe("true"));
  });

  it("says what went with a removed source and offers it back", async () => {
    const without: Plan = { ...plumtreePlan, sources: plumtreePlan.sources.slice(0, 3), outlets: [], situations: plumtreePlan.situations.map((one) => ({ ...one, playing: one.playing.slice(0, 3) })) };
    const sent = answerWith({ status: 200, body: answerOf(without, 2) }, { status: 200, body: answerOf(plumtreePlan, 3) });
    const user = showSources();
    await user.click(row(/^Fan/));
    await user.click(screen.getByRole("button", { name: "Remove this source" }));
    expect(await screen.findByText("Fan removed. With it went two duct mouths and its place in one situation.")).toBeDefined();
    await user.click(screen.getByRole("button", { name: "Undo" }));
    await waitFor(() => expect(sent).toHaveBeenCalledTimes(2));
    expect((bodyOf(sent, 1) as { changes: { act: string; part: string }[] }).changes.map(({ act, part }) => `${act} ${part}`)).toEqual(["add sources", "add outlets", "add outlets", "change situations"]);
  });

  it("warns bare ears by the minute, and says whose measure it is", () => {
    showSources({ plan: withKit({ hours: { from: "18:00", to: "23:00" } }) });
    expect(screen.getByRole("heading", { name: "Bare ears: 8 minutes a day" })).toBeDefined();
    expect(screen.getByText(/its hours here hold 5 hours of playing/)).toBeDefined();
    expect(screen.getByText(/NIOSH 98-126/)).toBeDefined();
    expect(screen.getByText(/That is 1 hour inside the hours of the limit at No\. 9, bedroom, 22:00 to 07:00/)).toBeDefined();
  });

  it("does not warn bare ears beside a source outdoors", async () => {
    const user = showSources();
    await user.click(row(/^Condenser/));
    expect(screen.queryByRole("heading", { name: /Bare ears/ })).toBeNull();
  });

  it("says where shares of the time count and what a share is worth", async () => {
    const half = { ...plumtreePlan, situations: plumtreePlan.situations.map((one) => ({ ...one, playing: [{ sourceId: "kit", share: 0.5 }, ...one.playing.slice(1)] })) };
    showSources({ plan: half });
    expect(screen.getByText(/shares of the time change nothing now/)).toBeDefined();
    expect(screen.getByText(/50.% of the time, 3\.0.dB lower over the whole period/)).toBeDefined();
    expect(screen.getByText(/^Leads for No\. 9, bedroom/)).toBeDefined();
  });

  it("switches a source off in a situation", async () => {
    const sent = answerWith({ status: 200, body: answerOf(plumtreePlan, 2) });
    const user = showSources();
    await user.click(screen.getByRole("checkbox", { name: "Bass amp" }));
    await waitFor(() => expect(sent).toHaveBeenCalledOnce());
    expect(bodyOf(sent)).toEqual({ playing: plumtreePlan.situations[0]!.playing.filter(({ sourceId }) => sourceId !== "bass-amp") });
  });

  it("spreads one figure of a street over all outer faces of a room", async () => {
    const street = { ...plumtreePlan.sources[2]!, id: "street", name: "Street", kind: "traffic", power: null, deviation: null, params: {} } as Plan["sources"][number];
    const sent = answerWith({ status: 200, body: answerOf(plumtreePlan, 2) });
    const user = showSources({ plan: { ...plumtreePlan, sources: [...plumtreePlan.sources, street] } });
    await user.click(row(/^Street/));
    expect(screen.getByText("Given at no wall yet, so what it adds is not known.")).toBeDefined();
    await user.selectOptions(screen.getByRole("combobox", { name: "Where it arrives" }), "Live room: all outer faces");
    await user.type(screen.getByRole("textbox", { name: "Level there" }), "55");
    await user.click(screen.getByRole("button", { name: "Add" }));
    await waitFor(() => expect(sent).toHaveBeenCalledOnce());
    const { changes } = bodyOf(sent) as { changes: { part: string; values: { levels: number[] } }[] };
    expect(changes.length).toBeGreaterThan(1);
    expect(changes.every(({ part, values }) => part === "incidences" && values.levels.length === 9)).toBe(true);
  });

  it("reads as text, with the reason, for who may not change it", () => {
    showSources({ may: { edit: false, reason: "Only Ines and Tobi can change this yard." } });
    expect(screen.getByText("Only Ines and Tobi can change this yard.")).toBeDefined();
    expect(screen.queryByRole("textbox")).toBeNull();
    expect(screen.queryByRole("checkbox")).toBeNull();
    expect(screen.queryByRole("button", { name: /Add|Use|Remove/ })).toBeNull();
  });

  it("says what to do first where nothing plays yet", () => {
    showSources({ plan: { ...plumtreePlan, sources: [], outlets: [], situations: [] } });
    expect(screen.getByRole("heading", { name: "Nothing plays here yet" })).toBeDefined();
    expect(screen.getByText(/Add what you play first/)).toBeDefined();
  });
});
