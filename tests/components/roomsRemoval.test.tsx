import { cleanup, screen, waitFor, within } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { plumtreePlan } from "./fixtures/answers";
import { serveRooms, showRooms } from "./fixtures/roomsDesk";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const surfacesOf = (plan: typeof plumtreePlan, room: string) => plan.surfaces.filter(({ spaceId }) => spaceId === room);

describe("removing a room", () => {
  it("names what holds it and offers no way to remove it", async () => {
    const user = showRooms({ room: "live-room" });
    HTMLDialogElement.prototype.showModal ??= function (this: HTMLDialogElement) { this.open = true; };
    HTMLDialogElement.prototype.close ??= function (this: HTMLDialogElement) { this.open = false; };
    await user.click(screen.getByRole("button", { name: "Remove this room" }));
    const dialog = await screen.findByRole("dialog");
    expect(dialog.textContent).toContain("Drum kit and Bass amp");
    expect(within(dialog).queryByRole("button", { name: "Remove it" })).toBeNull();
  });

  it("says what goes with a free room and takes its boundaries along", async () => {
    const server = serveRooms();
    HTMLDialogElement.prototype.showModal ??= function (this: HTMLDialogElement) { this.open = true; };
    HTMLDialogElement.prototype.close ??= function (this: HTMLDialogElement) { this.open = false; };
    const user = showRooms({ room: "lobby" });
    await user.click(screen.getByRole("button", { name: "Remove this room" }));
    const dialog = await screen.findByRole("dialog");
    expect(dialog.textContent).toContain("four surfaces");
    expect(dialog.textContent).toContain("five boundaries");
    await user.click(within(dialog).getByRole("button", { name: "Remove it" }));
    await waitFor(() => expect(screen.getByRole("heading", { level: 1 }).textContent).toBe("Live room"));
    const { spaces, paths, surfaces } = server.plan();
    expect(spaces.some(({ id }) => id === "lobby")).toBe(false);
    expect(paths.some(({ fromSpaceId, toSpaceId }) => fromSpaceId === "lobby" || toSpaceId === "lobby")).toBe(false);
    expect(surfaces.some(({ spaceId }) => spaceId === "lobby")).toBe(false);
  });

  it("copies a room with its surfaces and opens the copy", async () => {
    const server = serveRooms();
    const user = showRooms({ room: "control-room" });
    await user.click(screen.getByRole("button", { name: "Copy this room" }));
    await waitFor(() => expect(screen.getByRole("heading", { level: 1 }).textContent).toBe("Control room, copy"));
    const copy = server.plan().spaces.find(({ name }) => name === "Control room, copy")!;
    expect(surfacesOf(server.plan(), copy.id).map(({ name }) => name)).toEqual(surfacesOf(plumtreePlan, "control-room").map(({ name }) => name));
  });
});

describe("whoever may not change", () => {
  it("reads the same room as text, with the reason", () => {
    showRooms({ room: "control-room", may: { edit: false, reason: "Only Ines can change the plan." } });
    expect(screen.getByText("Only Ines can change the plan.")).toBeDefined();
    // Only the fields for trying out the air are there: nothing of them is kept.
    expect(screen.getAllByRole("textbox").map((field) => (field as HTMLInputElement).labels?.[0]?.textContent)).toEqual(["Drumming", "Sitting", "Fresh air", "Your aim"]);
    expect(screen.queryByRole("button", { name: /Remove|Add|Copy|Treated/ })).toBeNull();
    expect(screen.getByText(/own surfaces/)).toBeDefined();
  });
});

describe("cautions before a room is sealed", () => {
  it("stand in the studio's rooms and count the ways out, not in the neighbour's", async () => {
    const user = showRooms({ room: "live-room" });
    expect(screen.getByText(/One door leads straight outdoors: Yard door\./)).toBeDefined();
    await user.click(screen.getByRole("button", { name: /^Bedroom/ }));
    expect(screen.queryByText("Before you seal it")).toBeNull();
  });
});
