import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, it } from "vitest";
import { Beam } from "@/components/frame/Beam";
import { PhoneBar } from "@/components/frame/PhoneBar";

afterEach(cleanup);

const stages = [
  { href: "/projects/1/walls", label: "Walls & openings", short: "Walls" },
  { href: "/projects/1/budget", label: "Budget", current: true },
];

describe("the beam", () => {
  it("is a list of links in reading order, the current one marked", () => {
    render(<Beam stages={stages} />);
    const links = within(screen.getByRole("navigation", { name: "Stages" })).getAllByRole("link");
    expect(links.map((link) => link.getAttribute("href"))).toEqual(stages.map((stage) => stage.href));
    expect(links.map((link) => link.getAttribute("aria-current"))).toEqual([null, "page"]);
  });

  it("hangs one poise, under the current stage", () => {
    const { container } = render(<Beam stages={stages} />);
    const poises = container.querySelectorAll("svg");
    expect(poises).toHaveLength(1);
    expect(poises[0]!.closest("li")!.textContent).toBe("Budget");
  });

  it("says where something is missing", () => {
    render(<Beam stages={[{ ...stages[0]!, missing: true }]} />);
    expect(screen.getByRole("link", { name: /^Walls & openings ?, something is missing$/ })).toBeDefined();
  });

  it("uses the short names on the phone", () => {
    render(<PhoneBar stages={stages} />);
    expect(screen.getAllByRole("link").map((link) => link.textContent)).toEqual(["Walls", "Budget"]);
  });
});
