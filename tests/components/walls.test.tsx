import { cleanup, render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import type { Answer } from "@/components/state/plan";
import { YardState } from "@/components/state/PlanProvider";
import { WallDesk } from "@/components/walls/WallDesk";
import { buildAnswer, demoPlan, libraryFor, planWith } from "./fixtures/wallsAnswer";

// The arrow keys of a radio group need it here; jsdom has none.
beforeEach(() => void vi.stubGlobal("CSS", { escape: (text: string) => text.replace(/[^\w-]/g, "\\$&") }));
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const HEAVY = "door-mdf-3x18-damped";

function show(elementId: string, { answer = buildAnswer(), may = { edit: true, reason: "" } } = {}) {
  render(
    <YardState>
      <WallDesk
        projectId="p1"
        elementId={elementId}
        answer={answer}
        library={libraryFor(elementId)}
        may={may}
      />
    </YardState>,
  );
  return userEvent.setup();
}

/** The server's answers, one after the other; the requests are kept. */
function answerWith(...answers: { status: number; body: unknown }[]) {
  const sent = vi.fn<(address: string, request: RequestInit) => Promise<Response>>();
  for (const { status, body } of answers) sent.mockResolvedValueOnce(Response.json(body, { status }));
  vi.stubGlobal("fetch", sent);
  return sent;
}

const heavyAnswer = (revision = 8): Answer => buildAnswer({ revision, plan: planWith("yard-door", HEAVY) });

const strip = () => screen.getAllByRole("status")[0]!;

async function markHeavy(user: ReturnType<typeof userEvent.setup>) {
  const group = screen.getByRole("group", { name: "Choose from the library's doors" });
  const standing = within(group).getByRole("radio", { checked: true });
  standing.focus();
  while (!(document.activeElement as HTMLInputElement).value.startsWith(HEAVY))
    await user.keyboard("{ArrowDown}");
}

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
    expect(strip().textContent).toContain("2\u00a0dB better than before");
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
        /mm, .* kg\/m², stops .* dB at 63 Hz, .* dB at 125 Hz, (measured|laboratory|calculated|estimated|unknown)$/,
      ),
    );
    expect(document.body.textContent).not.toMatch(/\b(STC|Rw|OITC)\b/);
  });
});

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

  it("says so when the reader is signed out, with the way back to this door", async () => {
    answerWith({ status: 401, body: { error: { message: "You are signed out." } } });
    const user = show("yard-door");
    await markHeavy(user);
    await user.keyboard("{Enter}");
    const alert = await screen.findByRole("alert");
    const link = within(alert).getByRole("link", { name: "Sign in again" });
    expect(link.getAttribute("href")).toBe("/sign-in?next=%2Fprojects%2Fp1%2Fwalls%2Fyard-door");
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
