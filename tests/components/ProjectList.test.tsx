import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, it } from "vitest";
import { ProjectList, type ProjectLine } from "@/components/projects/ProjectList";

afterEach(cleanup);

const yard = (line: Partial<ProjectLine>): ProjectLine => ({
  id: "1", href: "/projects/1", name: "Lot 7", says: "Drums in a shed", stage: "As drawn", state: "under", margin: 6.2, doubt: 3,
  band: 63, listenerName: "No. 9, bedroom", weighedAt: "2027-01-14T20:04:00Z", people: [{ name: "Ines", says: "yours" }],
  lot: [[0, 0], [20, 0], [20, 10], [0, 10]], buildings: [], ...line,
});

const show = (projects: ProjectLine[]) =>
  render(<ProjectList projects={projects} now="2027-01-14T21:30:00Z" timeZone="UTC" newYard={<button>New yard</button>} />);

describe("the list of yards", () => {
  it("says of each yard its verdict, where it is worst, and who is in it", () => {
    show([yard({ state: "over", margin: -2.8 })]);
    const row = screen.getByRole("listitem");
    for (const words of ["3 dB over", "63 Hz at No. 9, bedroom", "Weighed today 20:04", "Ines (yours)", "Drums in a shed"]) {
      expect(within(row).getByText(words)).toBeDefined();
    }
    expect(within(row).getByRole("link", { name: "Lot 7" }).getAttribute("href")).toBe("/projects/1");
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

  it("draws all plans to one scale", () => {
    const { container } = show([yard({ id: "1", name: "Long" }), yard({ id: "2", name: "Short", lot: [[5, 5], [15, 5], [15, 15], [5, 15]] })]);
    const widths = [...container.querySelectorAll("svg[aria-label^='Plan of']")].map((plan) => {
      const eastings = [...plan.querySelector("path")!.getAttribute("d")!.matchAll(/[ML]([\d.]+) /g)].map(([, x]) => Number(x));
      return Math.max(...eastings) - Math.min(...eastings);
    });
    expect(widths[0]! / widths[1]!).toBeCloseTo(2, 1);
  });

  it("shows the shape of the answer while there is no yard", () => {
    show([]);
    expect(screen.getByRole("heading", { name: "No yard yet" })).toBeDefined();
    expect(screen.getAllByRole("button", { name: "New yard" })).toHaveLength(1);
    expect(screen.queryByRole("listitem")).toBeNull();
  });
});
