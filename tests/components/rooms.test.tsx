import { cleanup, screen, waitFor, within } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { plumtreePlan } from "./fixtures/answers";
import { planWithParts, serveRooms, showRooms } from "./fixtures/roomsDesk";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const surfacesOf = (plan: typeof plumtreePlan, room: string) => plan.surfaces.filter(({ spaceId }) => spaceId === room);
const spaceOf = (plan: typeof plumtreePlan, room: string) => plan.spaces.find(({ id }) => id === room)!;

describe("the rooms of a yard", () => {
  it("lists the studio's rooms apart from those of others and opens the first", () => {
    showRooms();
    expect(screen.getByRole("heading", { level: 1 }).textContent).toBe("Live room");
    const list = screen.getByRole("navigation", { name: "Rooms" });
    const [studio, others] = within(list).getAllByRole("list");
    expect(within(studio!).getAllByRole("button")).toHaveLength(3);
    expect(within(others!).getAllByRole("button")).toHaveLength(2);
  });

  it("numbers what is in a room the same in the list and in the plan", () => {
    showRooms({ room: "live-room" });
    const plan = screen.getByRole("img", { name: /^Plan of Live room/ });
    const balloons = [...plan.querySelectorAll("circle + text")].map((text) => text.textContent);
    const listed = [...document.querySelectorAll("span[aria-hidden]")].map((span) => span.textContent).filter((text) => /^\d+$/.test(text ?? ""));
    expect(balloons.length).toBeGreaterThan(3);
    expect(listed).toEqual(balloons);
    expect(screen.getByRole("link", { name: "Drum kit" })).toBeDefined();
    expect(screen.getByRole("link", { name: "Yard door" })).toBeDefined();
  });

  it("shows another room when it is chosen and keeps it in the address", async () => {
    const user = showRooms();
    await user.click(screen.getByRole("button", { name: /^Control room/ }));
    expect(screen.getByRole("heading", { level: 1 }).textContent).toBe("Control room");
    expect(window.location.search).toBe("?room=control-room");
  });

  it("says what to do where there is no room", async () => {
    const empty = planWithParts((plan) => {
      Object.assign(plan, { spaces: [], surfaces: [], sources: [], outlets: [], paths: [], elements: [], incidences: [], receivers: [], criteria: [], situations: [] });
    });
    const server = serveRooms(empty);
    const user = showRooms({ plan: empty });
    await user.click(screen.getByRole("button", { name: "Add the first room" }));
    await user.type(screen.getByRole("textbox", { name: "Name" }), "Den");
    await user.click(screen.getByRole("button", { name: "Add it" }));
    expect((await screen.findByRole("heading", { level: 1 })).textContent).toBe("Den");
    const { spaces, surfaces } = server.plan();
    expect(spaces).toHaveLength(1);
    expect(surfaces.map(({ name }) => name)).toEqual(["Walls", "Ceiling", "Floor"]);
    expect(screen.getByRole("button", { name: "Bare" }).getAttribute("aria-pressed")).toBe("true");
    expect(screen.getByText("No wall of this room is drawn yet")).toBeDefined();
  });
});

describe("the finish of a room", () => {
  it("fills the surfaces in one change and takes the room off its own figures", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "live-room" });
    expect(screen.getByRole("button", { name: "Own figures" }).getAttribute("aria-pressed")).toBe("true");
    await user.click(screen.getByRole("button", { name: "Treated" }));
    await waitFor(() => expect(screen.getByRole("button", { name: "Treated" }).getAttribute("aria-pressed")).toBe("true"));
    expect(server.sent).toHaveLength(1);
    expect(spaceOf(server.plan(), "live-room").absorption.kind).toBe("surfaces");
    const lined = surfacesOf(server.plan(), "live-room");
    expect(lined.map(({ finishKey }) => finishKey)).toContain("liner-50");
    // 4.3 x 4.5 x 2.35 m: walls 41.4, ceiling and floor 19.4 (19.35) each.
    expect(lined.reduce((sum, { area }) => sum + area, 0)).toBeCloseTo(80.2, 0);
  });

  it("can be undone, and the figures that stood before count again", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "live-room" });
    await user.click(screen.getByRole("button", { name: "Bare" }));
    await user.click(await screen.findByRole("button", { name: "Undo" }));
    await waitFor(() => expect(screen.getByRole("button", { name: "Own figures" }).getAttribute("aria-pressed")).toBe("true"));
    expect(spaceOf(server.plan(), "live-room")).toEqual(spaceOf(plumtreePlan, "live-room"));
    expect(surfacesOf(server.plan(), "live-room")).toEqual([]);
  });

  it("follows the size while it is a word: areas and volume go along in the same change", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "live-room" });
    await user.click(screen.getByRole("button", { name: "Bare" }));
    await waitFor(() => expect(surfacesOf(server.plan(), "live-room")).toHaveLength(3));
    const width = screen.getByRole("textbox", { name: "Inside width" });
    await user.clear(width);
    await user.type(width, "5{Enter}");
    await waitFor(() => expect(server.sent).toHaveLength(2));
    const space = spaceOf(server.plan(), "live-room");
    expect(space.volume).toBeCloseTo(5 * 4.5 * 2.35, 6);
    expect(surfacesOf(server.plan(), "live-room").find(({ name }) => name === "Floor")?.area).toBe(22.5);
    await waitFor(() => expect(screen.getByRole("button", { name: "Bare" }).getAttribute("aria-pressed")).toBe("true"));
  });

  it("says own once a surface is changed, and the size then leaves the surfaces alone", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "live-room" });
    await user.click(screen.getByRole("button", { name: "Bare" }));
    const area = (await screen.findAllByRole("textbox", { name: "Area" }))[0]!;
    await user.clear(area);
    await user.type(area, "30{Enter}");
    await screen.findByRole("button", { name: "Own surfaces", pressed: true });
    const before = surfacesOf(server.plan(), "live-room");
    const height = screen.getByRole("textbox", { name: "Height" });
    await user.clear(height);
    await user.type(height, "2,6{Enter}");
    await waitFor(() => expect(spaceOf(server.plan(), "live-room").box?.size[2]).toBe(2.6));
    expect(surfacesOf(server.plan(), "live-room")).toEqual(before);
  });

  it("keeps the surfaces when own figures are taken, and the level next door does not move by that", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "control-room" });
    const decay = document.querySelector("dl")!.textContent;
    await user.click(screen.getByRole("button", { name: "Own figures" }));
    const again = await screen.findByRole("button", { name: "Use them again" });
    expect(spaceOf(server.plan(), "control-room").absorption.kind).toBe("decay");
    expect(surfacesOf(server.plan(), "control-room")).toEqual(surfacesOf(plumtreePlan, "control-room"));
    expect(document.querySelector("dl")!.textContent).toBe(decay);
    await user.click(again);
    await waitFor(() => expect(spaceOf(server.plan(), "control-room").absorption).toEqual(spaceOf(plumtreePlan, "control-room").absorption));
  });

  it("keeps a volume that was typed when the size changes", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "control-room" });
    const volume = screen.getByRole("textbox", { name: "Volume" });
    await user.clear(volume);
    await user.type(volume, "21{Enter}");
    await screen.findByText(/^Your figure; the box holds/);
    const depth = screen.getByRole("textbox", { name: "Inside depth" });
    await user.clear(depth);
    await user.type(depth, "3{Enter}");
    await waitFor(() => expect(spaceOf(server.plan(), "control-room").box?.size[1]).toBe(3));
    expect(spaceOf(server.plan(), "control-room").volume).toBe(21);
  });
});

describe("a name", () => {
  it("may be put back while the first change of it is still on its way", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "control-room" });
    const name = screen.getAllByRole("textbox", { name: "Name" })[0]!;
    for (const words of ["Booth", "Control room"]) {
      await user.clear(name);
      await user.paste(words);
      await user.keyboard("{Enter}");
    }
    await waitFor(() => expect(server.sent.map(({ body }) => body.name)).toEqual(["Booth", "Control room"]));
    await waitFor(() => expect(spaceOf(server.plan(), "control-room").name).toBe("Control room"));
  });
});

describe("surfaces", () => {
  it("takes a finish of the library by its key and shows where it is from", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "control-room" });
    await user.selectOptions(screen.getAllByRole("combobox", { name: "Finish" })[0]!, "block-bare");
    await waitFor(() => expect(server.sent).toHaveLength(1));
    expect(server.sent[0]!.body).toEqual({ libraryKey: "block-bare" });
    await waitFor(() => expect((screen.getAllByRole("combobox", { name: "Finish" })[0] as HTMLSelectElement).value).toBe("block-bare"));
  });

  it("removes one at once and brings it back with its own coefficients", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "control-room" });
    await user.click(screen.getByRole("button", { name: "Remove Wall panels" }));
    await screen.findByText("Removed: Wall panels.");
    expect(surfacesOf(server.plan(), "control-room")).toHaveLength(3);
    await user.click(screen.getByRole("button", { name: "Undo" }));
    await waitFor(() => expect(surfacesOf(server.plan(), "control-room")).toHaveLength(4));
    const back = surfacesOf(server.plan(), "control-room").find(({ name }) => name === "Wall panels")!;
    const old = surfacesOf(plumtreePlan, "control-room").find(({ name }) => name === "Wall panels")!;
    expect({ ...back, id: "" }).toEqual({ ...old, id: "" });
  });

  it("keeps a refused area in its field with the reason beside it", async () => {
    const user = showRooms({ room: "control-room" });
    vi.stubGlobal("fetch", async () => Response.json({ error: { message: "Not saved.", fields: { area: "At most 10000." } } }, { status: 422 }));
    const area = screen.getAllByRole("textbox", { name: "Area" })[0] as HTMLInputElement;
    await user.clear(area);
    await user.type(area, "9999{Enter}");
    expect(await screen.findByText("At most 10000.")).toBeDefined();
    expect(area.value).toBe("9999");
  });

  it("adds a thing with nought in every band, so that nothing moves until figures are typed", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "control-room" });
    await user.type(screen.getByRole("textbox", { name: /^Another, such as/ }), "Sofa{Enter}");
    await screen.findByRole("group", { name: /^Absorption area of Sofa/ });
    const { absorption } = spaceOf(server.plan(), "control-room");
    expect(absorption.kind === "surfaces" && absorption.objects).toEqual([{ name: "Sofa", area: new Array(9).fill(0) }]);
  });
});
