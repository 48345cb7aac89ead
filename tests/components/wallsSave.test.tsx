import { cleanup, screen, waitFor, within } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import type { Answer } from "@/components/state/plan";
import { answerWith, HEAVY, heavyAnswer, markHeavy, show, stubCss } from "./fixtures/wallDesk";
import { buildAnswer, planWith } from "./fixtures/wallsAnswer";

beforeEach(stubCss);
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function staleWith(current: Answer) {
  return {
    error: { message: "Changed meanwhile." },
    current,
    changedBy: {
      name: "Tobi",
      at: new Date().toISOString(),
      parts: [{ kind: "element", id: "yard-door", act: "change", before: {}, after: {} }],
    },
  };
}

describe("a save that does not go through", () => {
  it("sets both values side by side when somebody was quicker, and keeps mine onto their revision", async () => {
    const theirs = buildAnswer({ revision: 9, plan: planWith("yard-door", "door-solid-44", "tobis") });
    const sent = answerWith({ status: 409, body: staleWith(theirs) }, { status: 200, body: heavyAnswer(10) });
    const user = show("yard-door");
    await markHeavy(user);
    await user.keyboard("{Enter}");
    const panel = await screen.findByRole("region", { name: /^Tobi changed this/ });
    expect(panel.textContent).toContain("Heavy door, three 18 mm boards");
    expect(panel.textContent).toContain("Solid wood door, 44 mm");
    expect(sent).toHaveBeenCalledTimes(1);
    await user.click(within(panel).getByRole("button", { name: "Keep mine" }));
    await waitFor(() => expect(screen.queryByRole("region", { name: /changed this/ })).toBeNull());
    expect(new Headers(sent.mock.calls[1]![1].headers).get("If-Match")).toBe('"9"');
    expect(screen.getByRole("radio", { checked: true }).getAttribute("value")).toBe(HEAVY);
  });

  it("takes theirs without saving anything", async () => {
    const theirs = buildAnswer({ revision: 9, plan: planWith("yard-door", "door-solid-44", "tobis") });
    const sent = answerWith({ status: 409, body: staleWith(theirs) });
    const user = show("yard-door");
    await markHeavy(user);
    await user.keyboard("{Enter}");
    await user.click(await screen.findByRole("button", { name: "Take theirs" }));
    expect(screen.getByRole("radio", { checked: true }).getAttribute("value")).toBe("door-solid-44");
    expect(sent).toHaveBeenCalledTimes(1);
  });

  it("keeps a refused figure in its field with the reason beside it", async () => {
    answerWith({
      status: 422,
      body: { error: { message: "Not saved.", fields: { area: "A door of 900 m² is a wall." } } },
    });
    const user = show("yard-door");
    const field = screen.getByRole("textbox", { name: "Area" });
    await user.clear(field);
    await user.type(field, "900{Enter}");
    expect(await screen.findByText("A door of 900 m² is a wall.")).toBeDefined();
    expect((field as HTMLInputElement).value).toBe("900");
    expect(field.getAttribute("aria-invalid")).toBe("true");
  });

  it("keeps the change when the reader is signed out: sign in beside the page, then save again", async () => {
    const sent = answerWith(
      { status: 401, body: { error: { message: "You are signed out." } } },
      { status: 200, body: heavyAnswer() },
    );
    const user = show("yard-door");
    await markHeavy(user);
    await user.keyboard("{Enter}");
    const alert = await screen.findByRole("alert");
    const link = within(alert).getByRole("link", { name: "Sign in again" });
    expect(link.getAttribute("href")).toBe("/sign-in?next=%2Fprojects%2Fp1%2Fwalls%2Fyard-door");
    expect(link.getAttribute("target")).toBe("_blank");
    await user.click(within(alert).getByRole("button", { name: "Save again" }));
    await waitFor(() => expect(screen.queryByRole("alert")).toBeNull());
    expect(sent.mock.calls[1]![1].body).toBe(sent.mock.calls[0]![1].body);
  });

  it("offers the same change again when the server did not answer", async () => {
    const sent = answerWith(
      { status: 503, body: { error: { message: "Busy." } } },
      { status: 200, body: heavyAnswer() },
    );
    const user = show("yard-door");
    await markHeavy(user);
    await user.keyboard("{Enter}");
    await user.click(await screen.findByRole("button", { name: "Save again" }));
    await waitFor(() => expect(screen.queryByRole("alert")).toBeNull());
    expect(sent.mock.calls[1]![1].body).toBe(sent.mock.calls[0]![1].body);
  });
});

describe("fields of an opening", () => {
  it("shows a gap in cm² and sends it in m²", async () => {
    const sent = answerWith({ status: 200, body: buildAnswer({ revision: 8 }) });
    const user = show("yard-door");
    const field = screen.getByRole("textbox", { name: "Gap at the seals" });
    expect((field as HTMLInputElement).value).toBe("0");
    await user.clear(field);
    await user.type(field, "2,5{Enter}");
    expect(JSON.parse(sent.mock.calls[0]![1].body as string)).toEqual({ params: { gapArea: 0.00025 } });
  });

  it("sends quick changes one after the other, each from the revision before", async () => {
    const sent = answerWith(
      { status: 200, body: buildAnswer({ revision: 8 }) },
      { status: 200, body: buildAnswer({ revision: 9 }) },
    );
    const user = show("yard-door");
    const field = screen.getByRole("textbox", { name: "Gap at the seals" });
    field.focus();
    await user.keyboard("{ArrowUp}{ArrowUp}");
    await waitFor(() => expect(sent).toHaveBeenCalledTimes(2));
    expect(sent.mock.calls.map(([, request]) => new Headers(request.headers).get("If-Match"))).toEqual([
      '"7"',
      '"8"',
    ]);
  });

  it("shows the open part of a window in m²", () => {
    show("no9-window");
    expect((screen.getByRole("textbox", { name: "Open part" }) as HTMLInputElement).value).toBe("0.25");
  });
});
