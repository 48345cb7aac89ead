import { cleanup, fireEvent, render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import type { Answer } from "@/components/state/plan";
import { YardState } from "@/components/state/PlanProvider";
import { YardDesk } from "@/components/yard/YardDesk";
import { planSchema, type Plan } from "@/lib/noise/plan";
import { answerWith } from "./fixtures/wallDesk";
import { buildAnswer, demoPlan } from "./fixtures/wallsAnswer";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const locked = { edit: false, reason: "Only Ines and Tobi can change the yard." };

function show({ answer = buildAnswer(), may = { edit: true, reason: "" } }: { answer?: Answer; may?: typeof locked } = {}) {
  render(
    <YardState>
      <YardDesk projectId="p1" answer={answer} may={may} />
    </YardState>,
  );
  return userEvent.setup();
}

const saved = (change: (plan: Plan) => Plan, revision = 8) => ({ status: 200, body: buildAnswer({ revision, plan: planSchema.parse(change(demoPlan)) }) });
const bodyOf = (sent: ReturnType<typeof answerWith>, at = 0): unknown => JSON.parse(String(sent.mock.calls[at]![1].body));
const group = (name: string) => screen.getByRole("region", { name });
const plan = () => screen.getByRole("group", { name: /^Plan of the yard/ });

describe("the yard", () => {
  it("opens at the loudest way into the listener that leads, with its distance and share", () => {
    show();
    expect(screen.getByRole("heading", { level: 2, name: "Roof" })).toBeDefined();
    const row = screen.getByRole("button", { name: /^Roof.*48/, pressed: true });
    expect(row.textContent).toContain("16.2\u00a0m");
    expect(row.textContent).toContain("48\u00a0%");
  });

  it("opens the fields of what is pressed in the list, and lights it on the plan", async () => {
    const user = show();
    await user.click(within(group("Fences")).getByRole("button", { name: /^Fence, east line/ }));
    expect(screen.getByRole("textbox", { name: "Height" })).toHaveProperty("value", "1.8");
    expect(within(plan()).getByRole("button", { name: "Fence, east line" }).getAttribute("aria-pressed")).toBe("true");
  });

  it("opens the fields of what is pressed on the plan", async () => {
    const user = show();
    await user.click(within(plan()).getByRole("button", { name: "Our house" }));
    expect(screen.getByRole("combobox", { name: "What it is" })).toHaveProperty("value", "own house");
    expect(screen.getByRole("textbox", { name: "Corner 6, north" })).toHaveProperty("value", "−7.4");
  });

  it("keeps a figure that was typed just before, when two of one list follow each other", async () => {
    const first = (now: Plan): Plan => ({ ...now, fences: now.fences.map((fence) => ({ ...fence, p1: [7.2, -17.5] })) });
    const sent = answerWith(saved(first), saved(first, 9));
    const user = show();
    await user.click(within(group("Fences")).getByRole("button", { name: /^Fence, east line/ }));
    const east = screen.getByRole("textbox", { name: "From, east" });
    await user.clear(east);
    await user.type(east, "7.2");
    await user.tab();
    await user.clear(screen.getByRole("textbox", { name: "From, north" }));
    await user.keyboard("-17{Enter}");
    await waitFor(() => expect(sent).toHaveBeenCalledTimes(2));
    expect(bodyOf(sent)).toEqual({ p1: [7.2, -17.5] });
    expect(bodyOf(sent, 1)).toEqual({ p1: [7.2, -17] });
  });

  it("moves the lit thing by the arrow keys and saves once, when the key is let go", async () => {
    const sent = answerWith(saved((now) => now));
    const user = show();
    await user.click(within(group("Fences")).getByRole("button", { name: /^Fence, east line/ }));
    for (let press = 0; press < 3; press += 1) fireEvent.keyDown(plan(), { key: "ArrowLeft" });
    fireEvent.keyDown(plan(), { key: "ArrowUp", shiftKey: true });
    expect(sent).not.toHaveBeenCalled();
    fireEvent.keyUp(plan(), { key: "ArrowUp" });
    await waitFor(() => expect(sent).toHaveBeenCalledTimes(1));
    expect(bodyOf(sent)).toEqual({ p1: [6.7, -16.5], p2: [6.7, 8] });
  });

  it("says beside the button what still holds a building", async () => {
    answerWith({ status: 409, body: { error: { message: "Still in use: Live room, Lobby. Change that first." } } });
    const user = show();
    await user.click(within(group("Buildings")).getByRole("button", { name: /^Studio/ }));
    await user.click(screen.getByRole("button", { name: "Remove" }));
    expect(await screen.findByText("Still in use: Live room, Lobby. Change that first.")).toBeDefined();
    expect(screen.getByRole("heading", { level: 2, name: "Studio" })).toBeDefined();
  });

  it("removes a listener at once, says whose room is left now, and brings it back with its limit", async () => {
    const gone = (now: Plan): Plan => ({
      ...now,
      receivers: now.receivers.filter(({ id }) => id !== "no9-bedroom"),
      criteria: now.criteria.filter(({ receiverId }) => receiverId !== "no9-bedroom"),
    });
    const sent = answerWith(saved(gone), { status: 200, body: buildAnswer({ revision: 9 }) });
    const user = show();
    await user.click(within(group("Listeners")).getByRole("button", { name: /^No. 9/ }));
    await user.click(screen.getByRole("button", { name: "Remove" }));
    await screen.findByText("No. 9, bedroom is removed.");
    expect(within(group("Listeners")).queryByRole("button", { name: /^No. 9/ })).toBeNull();
    await user.click(screen.getByRole("button", { name: "Undo" }));
    await waitFor(() => expect(screen.queryByText("No. 9, bedroom is removed.")).toBeNull());
    expect(bodyOf(sent, 1)).toMatchObject({ changes: [{ act: "add", part: "receivers", as: "new:again" }, { act: "add", part: "criteria", values: { receiverId: "new:again" } }] });
  });

  it("lights what was added and puts the reader at its fields", async () => {
    const fence = { ...demoPlan.fences[0]!, id: "second", name: "Fence" };
    answerWith(saved((now) => ({ ...now, fences: [...now.fences, fence] })));
    const user = show();
    await user.click(screen.getByRole("button", { name: "Add a fence" }));
    const heading = await screen.findByRole("heading", { level: 2, name: "Fence" });
    expect(document.activeElement).toBe(heading);
  });

  it("shows the same to who may not change it, as text, and says why", async () => {
    const user = show({ may: locked });
    await user.click(within(group("Fences")).getByRole("button", { name: /^Fence, east line/ }));
    expect(screen.queryByRole("textbox")).toBeNull();
    expect(screen.queryByRole("button", { name: /^(Add|Remove|Duplicate)/ })).toBeNull();
    expect(screen.getByText("1.8 m")).toBeDefined();
    expect(screen.getByText(locked.reason)).toBeDefined();
  });

  it("begins with the fence where nothing is drawn yet", () => {
    const empty = planSchema.parse({
      ...demoPlan,
      lot: { ...demoPlan.lot, outline: null, trees: [] },
      buildings: [], spaces: [], surfaces: [], sources: [], outlets: [], incidences: [], paths: [], constructions: [], elements: [], fences: [], receivers: [], criteria: [], situations: [],
    });
    show({ answer: buildAnswer({ plan: empty }) });
    expect(screen.getByText(/^Start with the fence/)).toBeDefined();
    expect(screen.getByRole("button", { name: "Draw a rectangle" })).toBeDefined();
  });
});
