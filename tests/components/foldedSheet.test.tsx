import { cleanup, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { FoldedSheet } from "@/components/ui/FoldedSheet";
import { WidthClassProvider } from "@/components/ui/useWidthClass";
import { readWidthClass, type WidthClass } from "@/components/ui/widthClass";

beforeEach(() => vi.stubGlobal("matchMedia", () => ({ addEventListener: () => undefined, removeEventListener: () => undefined })));
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function show(widthClass: WidthClass, viewport: number) {
  vi.stubGlobal("innerWidth", viewport);
  render(
    <WidthClassProvider initial={widthClass}>
      <FoldedSheet heading="Library">
        <label>
          Search <input />
        </label>
      </FoldedSheet>
    </WidthClassProvider>,
  );
  return screen.getByRole<HTMLElement>("heading", { name: "Library" }).closest("details")!;
}

describe("a folded sheet", () => {
  it("starts shut on the phone, under its heading, and keeps what was typed when it is shut again", async () => {
    const details = show(390, 390);
    expect(details.open).toBe(false);
    const user = userEvent.setup();
    await user.click(screen.getByRole("heading", { name: "Library" }));
    expect(details.open).toBe(true);
    await user.type(screen.getByLabelText("Search"), "kit");
    await user.click(screen.getByRole("heading", { name: "Library" }));
    expect(screen.getByLabelText<HTMLInputElement>("Search").value).toBe("kit");
  });

  it("is an ordinary open sheet anywhere else", () => {
    expect(show(1440, 1440).open).toBe(true);
  });
});

describe("the width a page is drawn for", () => {
  it.each([
    ["390", "", 390],
    ["1024", "Mozilla/5.0 (Linux; Android 10) Mobile Safari/537.36", 1024],
    [undefined, "Mozilla/5.0 (Linux; Android 10) Mobile Safari/537.36", 390],
    ["12", "Mozilla/5.0 (X11; Linux x86_64)", 1440],
  ])("cookie %s and browser %s: %i", (cookie, browser, width) => {
    expect(readWidthClass(cookie, browser)).toBe(width);
  });
});
