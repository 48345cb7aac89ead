import { cleanup, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { ThemeSwitch } from "@/components/frame/ThemeSwitch";

const asked = vi.fn<(address: string, request: RequestInit) => Promise<Response>>();

beforeEach(() => {
  asked.mockReset().mockResolvedValue(new Response(null, { status: 204 }));
  vi.stubGlobal("fetch", asked);
  vi.stubGlobal("matchMedia", () => ({ matches: false, addEventListener: () => undefined, removeEventListener: () => undefined }));
});

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  delete document.documentElement.dataset.theme;
  document.cookie = "stillyard-theme=; max-age=0; path=/";
});

const theSwitch = () => screen.getByRole("button", { name: "Use night colours" });

describe("the theme switch", () => {
  it("changes the page at once, remembers it here and in the account", async () => {
    render(<ThemeSwitch signedIn />);
    expect(theSwitch().getAttribute("aria-pressed")).toBe("false");
    await userEvent.click(theSwitch());
    expect(document.documentElement.dataset.theme).toBe("dark");
    expect(document.cookie).toContain("stillyard-theme=dark");
    expect(theSwitch().getAttribute("aria-pressed")).toBe("true");
    const [address, request] = asked.mock.calls[0]!;
    expect([address, request.method, request.body]).toEqual(["/api/me", "PATCH", JSON.stringify({ theme: "dark" })]);
  });

  it("works when the account cannot be reached, and asks nobody when nobody is signed in", async () => {
    asked.mockRejectedValue(new TypeError("no connection"));
    render(<ThemeSwitch signedIn />);
    await userEvent.click(theSwitch());
    expect(document.documentElement.dataset.theme).toBe("dark");
    cleanup();
    asked.mockClear();
    render(<ThemeSwitch />);
    await userEvent.click(theSwitch());
    expect(document.documentElement.dataset.theme).toBe("light");
    expect(asked).not.toHaveBeenCalled();
  });

  it("takes the account's theme on a new device, and keeps the device's own choice after that", () => {
    render(<ThemeSwitch theme="dark" signedIn />);
    expect(document.documentElement.dataset.theme).toBe("dark");
    cleanup();
    document.documentElement.dataset.theme = "light";
    document.cookie = "stillyard-theme=light; path=/";
    render(<ThemeSwitch theme="dark" signedIn />);
    expect(document.documentElement.dataset.theme).toBe("light");
  });
});
