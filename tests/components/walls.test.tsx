import { cleanup, screen, waitFor } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { answerWith, HEAVY, heavyAnswer, markHeavy, show, stubCss } from "./fixtures/wallDesk";
import { demoPlan, libraryFor } from "./fixtures/wallsAnswer";

beforeEach(stubCss);
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const strip = () => screen.getAllByRole("status")[0]!;

describe("another door by the keyboard", () => {
  it("marks with the arrows, saves with Enter and says how far the margin moved", async () => {
    const sent = answerWith({ status: 200, body: heavyAnswer() });
    const user = show("yard-door");
    expect(strip().textContent).toContain("4\u00a0dB over");
    await markHeavy(user);
    expect(sent).not.toHaveBeenCalled();
    await user.keyboard("{Enter}");
    await waitFor(() => expect(strip().textContent).toContain("better than before"));
    const [address, request] = sent.mock.calls[0]!;
    expect(address).toBe("/api/projects/p1/elements/yard-door");
    expect(JSON.parse(request.body as string)).toEqual({ construction: { catalogueKey: HEAVY } });
    expect(new Headers(request.headers).get("If-Match")).toBe('"7"');
    expect(strip().textContent).toContain("2.5\u00a0dB better than before");
  });

  it("sends one request, and none when the one that stands is chosen", async () => {
    const sent = answerWith({ status: 200, body: heavyAnswer() });
    const user = show("yard-door");
    screen.getByRole("radio", { checked: true }).focus();
    await user.keyboard("{Enter}");
    expect(sent).not.toHaveBeenCalled();
    await markHeavy(user);
    await user.click(screen.getByRole("button", { name: "Choose" }));
    await waitFor(() =>
      expect(screen.getByRole("radio", { checked: true }).getAttribute("value")).toBe(HEAVY),
    );
    expect(sent).toHaveBeenCalledTimes(1);
  });

  it("draws the chosen door and its layers at once", async () => {
    answerWith({ status: 200, body: heavyAnswer() });
    const user = show("yard-door");
    expect(screen.getByRole("img", { name: /^Section of Hardwood door/ })).toBeDefined();
    await markHeavy(user);
    await user.keyboard("{Enter}");
    await screen.findByRole("img", { name: /^Section of Heavy door, .*54.mm/ });
    expect(screen.getAllByRole("rowheader", { name: "Damping compound" })).toHaveLength(2);
  });

  it("shows mass, thickness and the loss at 63 and 125 Hz of every choice, never one single number", () => {
    show("yard-door");
    const names = screen.getAllByRole("radio").map((radio) => radio.getAttribute("aria-label")!);
    expect(names).toHaveLength(6);
    names.forEach((name) =>
      expect(name).toMatch(
        /(\d mm|thickness unknown), (.* kg\/m²|weight unknown), stops (\d+ dB|unknown) at 63 Hz, (\d+ dB|unknown) at 125 Hz, (measured|laboratory|calculated|estimated|unknown)$/,
      ),
    );
    expect(document.body.textContent).not.toMatch(/\b(STC|Rw|OITC)\b/);
  });
});

describe("who may not change the walls", () => {
  it("reads the figures as text, with the reason", () => {
    show("yard-door", { may: { edit: false, reason: "Only Ines and Tobi can change the walls." } });
    expect(screen.queryByRole("textbox")).toBeNull();
    expect(screen.queryByRole("radio")).toBeNull();
    expect(screen.getAllByText("Only Ines and Tobi can change the walls.").length).toBeGreaterThan(0);
    expect(screen.getByText("1.89 m²")).toBeDefined();
  });
});

describe("cautions", () => {
  const headings = () => screen.getAllByRole("heading", { level: 3 }).map((heading) => heading.textContent);

  it("name the layer of the wall that has to stay empty, and the engineer", () => {
    show("east-wall");
    expect(headings()).toEqual(["Keep layer 4 empty", "Ask a structural engineer"]);
  });

  it("weigh the leaf of a door and keep the way out free", () => {
    show("yard-door");
    expect(headings()).toContain("Keep the way out");
  });

  it("say of a roof that it has to dry", () => {
    show("studio-roof");
    expect(headings()).toContain("Let the roof dry");
  });

  it("add up what the boards weigh", () => {
    const roof = demoPlan.elements.find(({ id }) => id === "studio-roof")!;
    show("studio-roof");
    const mass = libraryFor("studio-roof").own.find(({ key }) => key === roof.constructionId)!.surfaceMass!;
    expect(screen.getByText(new RegExp(`weigh ${Math.round(mass * roof.area)} kg;`))).toBeDefined();
  });
});
