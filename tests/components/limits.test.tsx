import { cleanup, render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { limitLibrary } from "@/app/_server/limitLibrary";
import { LimitsDesk } from "@/components/limits/LimitsDesk";
import { readClock } from "@/components/ui/clock";
import { ledgesOf, nearRuns } from "@/components/limits/ledges";
import { levelsAbove, typeAbove, typeLevels, typeNumber } from "@/components/limits/limitPatches";
import { YardState } from "@/components/state/PlanProvider";
import type { Answer } from "@/components/state/plan";
import { criterionSchema, planSchema, type Plan } from "@/lib/noise/plan";
import { answerWith, stubCss } from "./fixtures/wallDesk";
import { buildAnswer, demoPlan } from "./fixtures/wallsAnswer";

const NIGHT = [44, 37, 33, 28, 22, 18, 15, 13, 11];
const library = limitLibrary();
const limitOf = (id: string) => demoPlan.criteria.find((limit) => limit.id === id)!;
const planOf = (part: Partial<Plan>): Plan => planSchema.parse({ ...demoPlan, ...part });

function show(answer: Answer = buildAnswer(), may = { edit: true, reason: "" }) {
  render(
    <YardState>
      <LimitsDesk projectId="p1" answer={answer} library={library} may={may} />
    </YardState>,
  );
  return userEvent.setup();
}
const bodyOf = (sent: ReturnType<typeof answerWith>, call = 0) => JSON.parse(sent.mock.calls[call]![1].body as string) as Record<string, unknown>;

beforeEach(stubCss);
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

describe("the patches of a limit", () => {
  it("nine own figures leave the number and its edition behind, and no longer bear the document's name", () => {
    const curve = criterionSchema.parse({ ...limitOf("no9-limit"), name: "NC-25", metric: "NC", value: 25, edition: "ANSI/ASA S12.2-2019", provenance: { document: "ANSI/ASA S12.2-2019", clause: "Table 1" } });
    expect(typeLevels(curve, NIGHT, library)).toMatchObject({ metric: "curve", value: null, edition: "", name: "Own figures", provenance: { document: "Own figures" } });
  });

  it("a document that somebody typed stays with new figures", () => {
    const typed = criterionSchema.parse({ ...limitOf("no9-limit"), provenance: { document: "By-law 14", clause: "3" } });
    expect(typeNumber(typed, 27, library.editions[0]!, library).provenance).toEqual({ document: "By-law 14", clause: "3", memory: false });
    expect(typeNumber(typed, 27, library.editions[0]!, library).name).toBeUndefined();
  });

  it("a limit above the night is the night plus the figure in every known band", () => {
    expect(levelsAbove([44, null, "silent", 28.4, 22, 18, 15, 13, 11], 5)).toEqual([49, null, null, 33.4, 27, 23, 20, 18, 16]);
    expect(typeAbove(limitOf("no9-limit"), NIGHT, 5, library)).toMatchObject({ levels: [49, 42, 38, 33, 27, 23, 20, 18, 16], above: 5, background: NIGHT });
  });

  it("a time of day is read as people write it", () => {
    expect(["22", "7.30", "0730", "24:00", "25:00", "7:75", "soon"].map(readClock)).toEqual(["22:00", "07:30", "07:30", "24:00", undefined, undefined, undefined]);
  });
});

describe("the bare ledges", () => {
  it("mark the bands where the limit lies less than 6 dB above the night, as one stretch", () => {
    const limit = { ...limitOf("no9-limit"), background: [30, 37, 33, 20, 22, 18, 15, 13, null] };
    expect(nearRuns(ledgesOf(limit, undefined))).toEqual([{ from: 1, to: 2 }, { from: 4, to: 7 }]);
  });

  it("of one figure have a ledge over all bands only", () => {
    const limit = criterionSchema.parse({ ...limitOf("no9-limit"), metric: "dBA", value: 30, levels: null });
    const ledges = ledgesOf(limit, buildAnswer().verdict.receivers[0]);
    expect(ledges.map(({ label, limit: allowed }) => [label, allowed]).filter(([, allowed]) => allowed !== null)).toEqual([["dB(A)", 30]]);
  });
});

describe("the page of limits", () => {
  it("lists every listener with its limit and its mark, and leads with the worst", () => {
    show();
    const options = screen.getAllByRole("option").filter((each) => each.closest("[role=listbox]"));
    expect(options[0]!.getAttribute("aria-label")).toMatch(/^No\. 9, bedroom, The night at No\. 9 plus 5 dB, 4\sdB over at 63/);
    expect(screen.getByRole("heading", { level: 1 }).textContent).toBe("What next door’s bedroom may hear");
  });

  it("offers no limit of the demo's story", () => {
    expect(library.records.some(({ key }) => key.startsWith("demo-"))).toBe(false);
    expect(library.records.length).toBeGreaterThan(4);
  });

  it("sends nine typed figures when a field is left", async () => {
    const sent = answerWith({ status: 200, body: buildAnswer({ revision: 8 }) });
    const user = show();
    await user.click(screen.getByRole("radio", { name: "Nine bands" }));
    const field = within(screen.getByRole("group", { name: /The nine figures/ })).getAllByRole("textbox")[1]!;
    await user.clear(field);
    await user.type(field, "47{Enter}");
    expect(sent.mock.calls[0]![0]).toBe("/api/projects/p1/criteria/no9-limit");
    expect(bodyOf(sent)).toMatchObject({ metric: "curve", levels: [49, 47, 38, 33, 27, 23, 20, 18, 16], above: null });
  });

  it("warns where the clause has the window shut and the drawing has it ajar, with the way to the window", () => {
    const criteria = demoPlan.criteria.map((limit) => (limit.id === "no9-limit" ? { ...limit, window: "shut" as const } : limit));
    show(buildAnswer({ plan: planOf({ criteria }) }));
    expect(screen.getByText("The drawing has their window otherwise")).toBeDefined();
    expect(screen.getByRole("link", { name: "Open the window" }).getAttribute("href")).toBe("/projects/p1/walls/no9-window");
  });

  it("a listener without a limit is not weighed, and copies one from the library at once", async () => {
    const sent = answerWith({ status: 200, body: buildAnswer({ revision: 8 }) });
    const user = show(buildAnswer({ plan: planOf({ criteria: [] }) }));
    expect(screen.getByRole("heading", { name: "No limit yet" })).toBeDefined();
    await user.selectOptions(screen.getByRole("combobox", { name: "A limit of the library" }), "nc-25");
    await user.click(screen.getByRole("button", { name: "Copy this limit" }));
    expect(sent.mock.calls[0]![0]).toBe("/api/projects/p1/criteria");
    expect(bodyOf(sent)).toMatchObject({ libraryKey: "nc-25" });
  });

  it("a yard where nobody listens has the form right there; listener and limit are one change", async () => {
    const sent = answerWith({ status: 200, body: buildAnswer({ revision: 8 }) });
    const user = show(buildAnswer({ plan: planOf({ receivers: [], criteria: [] }) }));
    await user.click(screen.getByRole("button", { name: "Add the listener" }));
    expect(screen.getByText("Give the listener a name.")).toBeDefined();
    await user.type(screen.getByRole("textbox", { name: "Who or where" }), "No. 9, bedroom");
    await user.selectOptions(screen.getByRole("combobox", { name: "Their limit" }), "bedroom-night-30");
    await user.click(screen.getByRole("button", { name: "Add the listener" }));
    await waitFor(() => expect(sent).toHaveBeenCalledTimes(1));
    const { changes } = bodyOf(sent) as { changes: { part: string; as?: string; values: Record<string, unknown> }[] };
    expect(changes.map(({ part, as }) => [part, as])).toEqual([["receivers", "new:listener"], ["criteria", undefined]]);
    expect(changes[1]!.values).toEqual({ libraryKey: "bedroom-night-30", receiverId: "new:listener" });
  });

  it("a removed limit comes back whole", async () => {
    const gone = buildAnswer({ revision: 8, plan: planOf({ criteria: demoPlan.criteria.filter(({ id }) => id !== "no9-limit") }) });
    const sent = answerWith({ status: 200, body: gone }, { status: 200, body: buildAnswer({ revision: 9 }) });
    const user = show();
    await user.click(screen.getByRole("button", { name: "Remove this limit" }));
    await user.click(await screen.findByRole("button", { name: "Bring it back" }));
    await waitFor(() => expect(sent).toHaveBeenCalledTimes(2));
    expect(bodyOf(sent, 1)).toMatchObject({ receiverId: "no9-bedroom", levels: limitOf("no9-limit").levels, name: "The night at No. 9 plus 5 dB" });
    expect(bodyOf(sent, 1)).not.toHaveProperty("id");
  });

  it("keeps a refused figure in its field with the reason beside it", async () => {
    answerWith({ status: 422, body: { error: { message: "Not saved.", fields: { name: "At most 120 characters." } } } });
    const user = show();
    const field = screen.getByRole("textbox", { name: "Name of this limit" });
    await user.clear(field);
    await user.type(field, "Other{Enter}");
    expect(await screen.findByText("At most 120 characters.")).toBeDefined();
    expect((field as HTMLInputElement).value).toBe("Other");
  });

  it("is text with a lock and the reason for who may only read", () => {
    show(buildAnswer(), { edit: false, reason: "Only Ines can change this." });
    expect(screen.queryAllByRole("textbox")).toEqual([]);
    expect(screen.queryByRole("button", { name: /Remove|Add|Copy/ })).toBeNull();
    expect(screen.getAllByText("Only Ines can change this.").length).toBeGreaterThan(0);
    expect(screen.getByRole("row", { name: /^Limit, dB 49 42 38/ })).toBeDefined();
  });
});
