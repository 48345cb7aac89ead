import { act, cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { SignInForm } from "@/components/signIn/SignInForm";
import { waitWords } from "@/components/signIn/waiting";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  vi.useRealTimers();
});

function answerWith(status: number, body: unknown = {}, headers: Record<string, string> = {}) {
  const asked = vi.fn<() => Promise<Response>>(async () => Response.json(body, { status, headers }));
  vi.stubGlobal("fetch", asked);
  return asked;
}

const type = (label: string, value: string) => fireEvent.change(screen.getByLabelText(label), { target: { value } });
const press = async (name: string) => {
  await act(async () => fireEvent.click(screen.getByRole("button", { name })));
};
const described = (element: HTMLElement) =>
  (element.getAttribute("aria-describedby") ?? "").split(" ").map((id) => document.getElementById(id)?.textContent ?? "").join(" ");

describe("waiting at the sign-in", () => {
  async function refusedFor(seconds: number) {
    vi.useFakeTimers({ now: 0 });
    const asked = answerWith(429, { error: { code: "too many", message: "Too many tries." } }, { "Retry-After": String(seconds) });
    render(<SignInForm onSignedIn={() => undefined} />);
    type("E-mail", "ines@yard.example");
    type("Password", "four words of mine");
    await press("Sign in");
    return asked;
  }

  it("keeps the button focusable with its reason, and counts down on a rule", async () => {
    const asked = await refusedFor(11);
    const button = screen.getByRole<HTMLButtonElement>("button", { name: "Sign in" });
    expect(button.disabled).toBe(false);
    expect(button.getAttribute("aria-disabled")).toBe("true");
    expect(described(button)).toBe("The next try opens in 11 seconds.");
    expect(screen.getByRole("img", { name: "11 seconds to go" })).toBeDefined();
    act(() => vi.advanceTimersByTime(4000));
    expect(screen.getByRole("img", { name: "7 seconds to go" })).toBeDefined();
    fireEvent.submit(button.form!);
    expect(asked).toHaveBeenCalledTimes(1);
  });

  it("speaks only when the wait begins and when it is over", async () => {
    await refusedFor(3);
    const spoken = screen.getByRole("status").textContent;
    act(() => vi.advanceTimersByTime(1500));
    expect(screen.getByRole("status").textContent).toBe(spoken);
    act(() => vi.advanceTimersByTime(2000));
    expect(screen.getByRole("status").textContent).toBe("You may try again");
    const asked = answerWith(200, { next: "/projects" });
    await press("Sign in");
    expect(asked).toHaveBeenCalledTimes(1);
  });

  it("keeps what was typed and leads to the link for a new password", async () => {
    await refusedFor(60);
    expect([screen.getByLabelText<HTMLInputElement>("E-mail").value, screen.getByLabelText<HTMLInputElement>("Password").value]).toEqual(["ines@yard.example", "four words of mine"]);
    expect(screen.getByRole("link", { name: /set a new password/ }).getAttribute("href")).toBe("/forgotten-password");
  });

  it.each([
    [1, "1 second"],
    [59, "59 seconds"],
    [60, "1\u00a0min"],
    [125, "2\u00a0min 5\u00a0s"],
    [10_800, "3\u00a0h"],
    [7_500, "2\u00a0h 5\u00a0min"],
  ])("says %d seconds as %s", (seconds, words) => expect(waitWords(seconds)).toBe(words));
});

it("an account whose e-mail is not checked is led to its mail, with everything kept", async () => {
  answerWith(403, { error: { code: "unchecked", message: "Look in your mail first: open the link there." } });
  render(<SignInForm onSignedIn={() => undefined} />);
  type("E-mail", "ines@yard.example");
  type("Password", "four words of mine");
  await press("Sign in");
  expect(screen.getByRole("status").textContent).toBe("Look in your mail firstOpen the link there.");
  expect(screen.getByLabelText<HTMLInputElement>("Password").value).toBe("four words of mine");
});
