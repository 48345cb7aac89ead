import { cleanup, render, screen, within } from "@testing-library/react";
import { userEvent } from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { elementAddress } from "@/components/addresses";
import { Desk } from "@/components/Desk";
import { YardState } from "@/components/state/PlanProvider";
import { WidthClassProvider } from "@/components/ui/useWidthClass";
import { plumtreeAnswer } from "./fixtures/answers";
import { buildVerdict } from "./fixtures/demoVerdict";

const push = vi.hoisted(() => vi.fn());
vi.mock("next/navigation", () => ({ useRouter: () => ({ push }) }));

beforeEach(() => {
  window.matchMedia = ((query: string) => ({ matches: /min-width/.test(query), media: query, addEventListener: () => undefined, removeEventListener: () => undefined })) as unknown as typeof window.matchMedia;
  window.innerWidth = 1440;
});
afterEach(() => {
  cleanup();
  push.mockClear();
});

function open(answer = plumtreeAnswer, mayEdit = true) {
  return render(
    <WidthClassProvider initial={1440}>
      <YardState>
        <Desk projectId="yard" answer={answer} mayEdit={mayEdit} />
      </YardState>
    </WidthClassProvider>,
  );
}

const listeners = () => within(screen.getByRole("listbox", { name: "Who is listening" })).getAllByRole("option");
const paths = () => within(screen.getByRole("listbox", { name: /^Paths/ })).getAllByRole("option");
const selected = (rows: HTMLElement[]) => rows.find((row) => row.getAttribute("aria-selected") === "true")?.getAttribute("aria-label")?.replaceAll("\u00a0", " ");
const chart = () => screen.getByRole("application");
const spoken = () => document.querySelector("[aria-live=polite]")!.textContent!.replaceAll("\u00a0", " ");

describe("the desk", () => {
  it("opens with the leading listener, the band that decides and the path one would try first", () => {
    open();
    expect(screen.getByRole("heading", { level: 1 }).textContent).toMatch(/your kit will be 4.dB over/);
    expect(selected(listeners())).toBe("No. 9, bedroom, 4 dB over, at 63 Hz");
    expect(selected(paths())).toMatch(/^Yard door, 42 dB alone, 45 %$/);
    expect(screen.getByRole("heading", { name: /Yard door silenced: 43.dB/ })).toBeTruthy();
  });

  it("leads from the slab to the page of the door", () => {
    open();
    expect(screen.getByRole("link", { name: "Try a heavier door" }).getAttribute("href")).toBe(elementAddress("yard", "yard-door"));
  });

  it("asks whoever may not change the walls to look, not to try", () => {
    open(plumtreeAnswer, false);
    expect(screen.queryByRole("link", { name: "Try a heavier door" })).toBeNull();
    expect(screen.getAllByRole("link", { name: "Open the yard door" })).toHaveLength(2);
  });

  it("keeps the listeners to one tab stop and lets arrows move the lit row", async () => {
    const user = userEvent.setup();
    open();
    expect(listeners().filter((row) => row.tabIndex === 0)).toHaveLength(1);
    listeners()[0]!.focus();
    await user.keyboard("{ArrowDown}");
    expect(document.activeElement).toBe(listeners()[1]);
    expect(selected(listeners())).toMatch(/^Fence, east line, 2 dB under, tight, at 125 Hz$/);
    expect(screen.getByRole("heading", { level: 1 }).textContent).toMatch(/2.dB under what the fence line allows/);
    expect(screen.getByRole("heading", { name: /125.Hz, weighed/ })).toBeTruthy();
    await user.keyboard("{Enter}");
    expect(document.activeElement?.id).toBe("verdict");
  });

  it("walks the bands and the paths with arrows on the chart, speaks them, and unlights with Escape", async () => {
    const user = userEvent.setup();
    open();
    chart().focus();
    await user.keyboard("{ArrowRight}");
    expect(screen.getByRole("heading", { name: /125.Hz, weighed/ })).toBeTruthy();
    expect(spoken()).toMatch(/^38 dB, limit 38, less than 1 dB under, tight, at 125 Hz\./);
    await user.keyboard("{ArrowLeft}{ArrowUp}");
    expect(selected(paths())).toMatch(/^Roof/);
    expect(spoken()).toContain("Roof: 48 % of it.");
    await user.keyboard("{Escape}");
    expect(selected(paths())).toBeUndefined();
    expect(screen.queryByText(/^dashed/)).toBeNull();
  });

  it("silences a path on trial with Space and opens its page with Enter", async () => {
    const user = userEvent.setup();
    const { container } = open();
    const dashes = () => [...container.querySelectorAll('path[stroke-dasharray="4.5 2.5"]')].map((path) => path.getAttribute("d")!).join("").split("M").length - 1;
    expect(dashes()).toBe(1);
    paths().find((row) => row.tabIndex === 0)!.focus();
    await user.keyboard(" ");
    expect(dashes()).toBe(9);
    expect(screen.getByRole("button", { name: "End the trial" }).getAttribute("aria-pressed")).toBe("true");
    await user.keyboard("{Enter}");
    expect(push).toHaveBeenCalledWith(elementAddress("yard", "yard-door"));
  });

  it("opens no page for a path that is no part of the building", async () => {
    const user = userEvent.setup();
    open();
    const condenser = plumtreeAnswer.verdict.receivers[0]!.paths.find(({ kind }) => kind === "outdoor unit")!;
    chart().focus();
    await user.keyboard("{ArrowRight>4/}");
    await user.click(paths().find((row) => row.getAttribute("aria-label")!.startsWith(condenser.name))!);
    await user.keyboard("{Enter}");
    expect(push).not.toHaveBeenCalled();
    expect(screen.queryByRole("link", { name: /^Open/ })).toBeNull();
  });

  it("opens the doubts below the verdict and moves there", async () => {
    const user = userEvent.setup();
    open();
    const button = screen.getByRole("button", { name: "How sure is this?" });
    await user.click(button);
    expect(button.getAttribute("aria-expanded")).toBe("true");
    expect(document.activeElement?.textContent).toBe("How sure is this?");
    const rows = within(screen.getByRole("region", { name: "How sure is this?" })).getAllByRole("row");
    const sizes = rows.slice(1).map((row) => Number(/([\d.]+).dB/.exec(row.textContent!)![1]));
    expect([...sizes].sort((one, other) => other - one)).toEqual(sizes);
  });

  it("moves on to a later answer and never back to an older one", () => {
    const { rerender } = open({ ...plumtreeAnswer, revision: 5 });
    const again = (revision: number, verdict = plumtreeAnswer.verdict) =>
      rerender(
        <WidthClassProvider initial={1440}>
          <YardState>
            <Desk projectId="yard" answer={{ ...plumtreeAnswer, revision, verdict }} mayEdit />
          </YardState>
        </WidthClassProvider>,
      );
    again(4, buildVerdict([]));
    expect(listeners()).toHaveLength(4);
    again(6, buildVerdict([]));
    expect(screen.getByRole("heading", { level: 1 }).textContent).toBe("Nobody listens here yet.");
  });
});
