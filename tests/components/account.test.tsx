import { act, cleanup, fireEvent, render, screen, within } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import type { AccountFacts, Device } from "@/components/account/Account";
import { AccountPage } from "@/components/account/AccountPage";

const facts: AccountFacts = { name: "Ines", email: "ines@yard.example", theme: "system", units: "metric", decimalMark: "point" };
const device = (key: string, name: string, current = false): Device => ({
  key, device: name, current, beganAt: "2026-11-30T08:00:00Z", seenAt: "2026-12-01T20:00:00Z",
});
const devices = [device("one", "A computer", true), device("two", "A phone"), device("three", "A tablet")];

type Asked = ReturnType<typeof vi.fn<(address: string, request: RequestInit) => Promise<Response>>>;

function answerWith(...answers: [status: number, body?: unknown][]): Asked {
  const asked: Asked = vi.fn(async () => {
    const [status, body] = answers.length > 1 ? answers.shift()! : answers[0]!;
    return status === 204 ? new Response(null, { status }) : Response.json(body ?? {}, { status });
  });
  vi.stubGlobal("fetch", asked);
  return asked;
}

const linesOf = (asked: Asked) => asked.mock.calls.map(([address, { method, body }]) => [method, address, body ? (JSON.parse(String(body)) as unknown) : undefined]);
const click = async (element: HTMLElement) => {
  await act(async () => fireEvent.click(element));
};

beforeEach(() => {
  // jsdom knows the element but not how to open it.
  HTMLDialogElement.prototype.showModal = function () {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function () {
    this.open = false;
    this.dispatchEvent(new Event("close"));
  };
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  delete document.documentElement.dataset.theme;
});

function open(onChanged = () => undefined) {
  render(<AccountPage facts={facts} devices={devices} now="2026-12-01T21:00:00Z" onChanged={onChanged} />);
}

describe("the account", () => {
  it("shows name and e-mail", () => {
    open();
    expect([screen.getByText("Ines").tagName, screen.getByText("ines@yard.example").tagName]).toEqual(["DD", "DD"]);
  });

  it("saves units and decimal mark as soon as they are chosen", async () => {
    const asked = answerWith([204]);
    open();
    await click(screen.getByLabelText(/^US/));
    await click(screen.getByLabelText("2,5"));
    expect(linesOf(asked)).toEqual([
      ["PATCH", "/api/me", { units: "us" }],
      ["PATCH", "/api/me", { decimalMark: "comma" }],
    ]);
    expect(screen.getAllByRole("status").map(({ textContent }) => textContent)).toContain("Saved.");
  });

  it("keeps a choice that could not be saved, with the reason", async () => {
    answerWith([503, { error: { message: "We cannot reach the records." } }]);
    open();
    const chosen = screen.getByLabelText<HTMLInputElement>(/^US/);
    await click(chosen);
    expect(chosen.checked).toBe(true);
    expect(screen.getByText("Not saved: We cannot reach the records.")).toBeDefined();
  });

  it("shows a theme at once and gives it back to the device", async () => {
    const asked = answerWith([204]);
    open();
    await click(screen.getByLabelText("Night"));
    expect(document.documentElement.dataset.theme).toBe("dark");
    expect(document.cookie).toContain("stillyard-theme=dark");
    await click(screen.getByLabelText("As this device has it"));
    expect(document.documentElement.dataset.theme).toBeUndefined();
    expect(document.cookie).not.toContain("stillyard-theme");
    expect(linesOf(asked).map(([, , body]) => body)).toEqual([{ theme: "dark" }, { theme: "system" }]);
  });
});

describe("where one is signed in", () => {
  it("ends one device, takes its line away and says so", async () => {
    const asked = answerWith([204]);
    open();
    await click(screen.getByRole("button", { name: /^End a phone/ }));
    expect(linesOf(asked)).toEqual([["DELETE", "/api/sessions/two", undefined]]);
    expect(screen.queryByText("A phone")).toBeNull();
    expect(document.activeElement?.textContent).toBe("Ended: a phone.");
  });

  it("ends all others and keeps this one, which has no button", async () => {
    const asked = answerWith([204]);
    open();
    expect(screen.queryByRole("button", { name: /^End a computer/ })).toBeNull();
    await click(screen.getByRole("button", { name: "End all others" }));
    expect(linesOf(asked)).toEqual([["DELETE", "/api/sessions", undefined]]);
    expect(screen.getAllByRole("listitem").map(({ textContent }) => textContent)).toEqual([expect.stringContaining("A computer")]);
  });

  it("takes a device that is gone already for ended", async () => {
    answerWith([404]);
    open();
    await click(screen.getByRole("button", { name: /^End a phone/ }));
    expect(screen.queryByText("A phone")).toBeNull();
  });

  it("keeps the line where it could not be ended", async () => {
    answerWith([500]);
    open();
    await click(screen.getByRole("button", { name: /^End a phone/ }));
    expect(screen.getByText("A phone")).toBeDefined();
    expect(screen.getByRole("alert").textContent).toContain("Not ended yet");
  });

  it("asks for the password again where the server wants it, then does what was asked", async () => {
    const asked = answerWith([403, { error: { code: "reauthenticate", message: "Again." } }], [204], [204]);
    open();
    await click(screen.getByRole("button", { name: /^End a phone/ }));
    const dialog = within(screen.getByRole("dialog", { name: "Your password again" }));
    expect(dialog.getByText(/about to end a phone/)).toBeDefined();
    fireEvent.change(dialog.getByLabelText("Password"), { target: { value: "four words of mine" } });
    await act(async () => fireEvent.submit(dialog.getByLabelText<HTMLInputElement>("Password").form!));
    expect(linesOf(asked)).toEqual([
      ["DELETE", "/api/sessions/two", undefined],
      ["POST", "/api/proof", { password: "four words of mine" }],
      ["DELETE", "/api/sessions/two", undefined],
    ]);
    expect(screen.queryByText("A phone")).toBeNull();
  });

  it("does nothing where the reader would rather not", async () => {
    const asked = answerWith([403, { error: { code: "reauthenticate", message: "Again." } }]);
    open();
    await click(screen.getByRole("button", { name: /^End a phone/ }));
    await click(screen.getByRole("button", { name: "Not now" }));
    expect(asked).toHaveBeenCalledTimes(1);
    expect(screen.getByText("A phone")).toBeDefined();
  });
});

describe("changing the password", () => {
  const fill = (current: string, password: string) => {
    fireEvent.change(screen.getByLabelText("Password you have now"), { target: { value: current } });
    fireEvent.change(screen.getByLabelText("New password"), { target: { value: password } });
  };
  const submit = () => click(screen.getByRole("button", { name: "Change the password" }));

  it("sends both, empties the fields and has the devices read again", async () => {
    const asked = answerWith([204]);
    const changed = vi.fn<() => undefined>();
    open(changed);
    fill("four words of mine", "other words of mine");
    await submit();
    expect(linesOf(asked)).toEqual([["POST", "/api/password", { current: "four words of mine", password: "other words of mine" }]]);
    expect(screen.getByText("Your password is changed")).toBeDefined();
    expect(screen.getByLabelText<HTMLInputElement>("New password").value).toBe("");
    expect(changed).toHaveBeenCalledTimes(1);
  });

  it("says beside the old one that it is not the password, and keeps both", async () => {
    answerWith([422, { error: { message: "No.", fields: { current: "This is not your password." } } }]);
    open();
    fill("four words of hers", "other words of mine");
    await submit();
    expect(document.activeElement).toBe(screen.getByLabelText("Password you have now"));
    expect(screen.getByText("This is not your password.")).toBeDefined();
    expect(screen.getByLabelText<HTMLInputElement>("New password").value).toBe("other words of mine");
  });
});

describe("moving to another e-mail", () => {
  it("asks for the password first, then has the link sent and says what both mails do", async () => {
    const asked = answerWith([403, { error: { code: "reauthenticate", message: "Again." } }], [204], [202]);
    open();
    const field = screen.getByLabelText<HTMLInputElement>("E-mail");
    fireEvent.change(field, { target: { value: "new@yard.example " } });
    await act(async () => fireEvent.submit(field.form!));
    const dialog = within(screen.getByRole("dialog", { name: "Your password again" }));
    fireEvent.change(dialog.getByLabelText("Password"), { target: { value: "four words of mine" } });
    await act(async () => fireEvent.submit(dialog.getByLabelText<HTMLInputElement>("Password").form!));
    expect(linesOf(asked)).toEqual([
      ["POST", "/api/email", { email: "new@yard.example" }],
      ["POST", "/api/proof", { password: "four words of mine" }],
      ["POST", "/api/email", { email: "new@yard.example" }],
    ]);
    expect(screen.getByText(/works for an hour/).textContent).toContain("7 days");
  });

  it("keeps an e-mail that does not fit, with the reason", async () => {
    answerWith([422, { error: { message: "No.", fields: { email: "This is your address already." } } }]);
    open();
    const field = screen.getByLabelText<HTMLInputElement>("E-mail");
    fireEvent.change(field, { target: { value: "ines@yard.example" } });
    await act(async () => fireEvent.submit(field.form!));
    expect(screen.getByText("This is your address already.")).toBeDefined();
    expect(field.value).toBe("ines@yard.example");
  });
});
