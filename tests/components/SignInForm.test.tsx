import { cleanup, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { SignInForm } from "@/components/signIn/SignInForm";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function answerWith(status: number, body: unknown) {
  const asked = vi.fn<(address: string, request: RequestInit) => Promise<Response>>(async () => Response.json(body, { status }));
  vi.stubGlobal("fetch", asked);
  return asked;
}

async function fill(next?: string) {
  const leave = vi.fn<(path: string) => void>();
  render(<SignInForm next={next} onSignedIn={leave} />);
  const user = userEvent.setup();
  const email = screen.getByRole<HTMLInputElement>("textbox", { name: "E-mail" });
  const password = screen.getByLabelText<HTMLInputElement>("Password");
  await user.type(email, "ines@yard.example");
  await user.type(password, "four words of mine");
  const press = () => user.click(screen.getByRole("button", { name: "Sign in" }));
  return { leave, user, email, password, press };
}

describe("signing in", () => {
  it("sends what was typed and goes where the answer says", async () => {
    const asked = answerWith(200, { next: "/projects/7" });
    const { leave, user, press } = await fill("/projects/7");
    await user.click(screen.getByRole("checkbox", { name: /Keep me signed in/ }));
    await press();
    const [address, request] = asked.mock.calls[0]!;
    expect(address).toBe("/api/session");
    expect(request.method).toBe("POST");
    expect(JSON.parse(String(request.body))).toEqual({
      email: "ines@yard.example", password: "four words of mine", keep: true, next: "/projects/7",
    });
    expect(leave.mock.calls).toEqual([["/projects/7"]]);
  });

  it.each(["https://elsewhere.example/", "//elsewhere.example", "/\\elsewhere.example", 7, undefined])(
    "never follows %j",
    async (next) => {
      answerWith(200, { next });
      const { leave, press } = await fill();
      await press();
      expect(leave.mock.calls).toEqual([["/projects"]]);
    },
  );

  it("keeps the e-mail, empties the password and says why beside it", async () => {
    answerWith(401, { error: { message: "E-mail and password do not fit together." } });
    const { leave, email, password, press } = await fill();
    await press();
    expect(email.value).toBe("ines@yard.example");
    expect(password.value).toBe("");
    expect(document.activeElement).toBe(password);
    expect(password.getAttribute("aria-invalid")).toBe("true");
    const described = password.getAttribute("aria-describedby")!.split(" ");
    expect(described.map((id) => document.getElementById(id)?.textContent)).toContain("E-mail and password do not fit together.");
    expect(leave).not.toHaveBeenCalled();
  });

  it("says how long to wait and keeps both fields", async () => {
    answerWith(429, { error: { message: "The next try in 11 seconds." } });
    const { password, press } = await fill();
    await press();
    expect(screen.getByRole("status").textContent).toContain("The next try in 11 seconds.");
    expect(password.value).toBe("four words of mine");
  });

  it.each([503, 0])("keeps everything typed when the server fails (%d)", async (status) => {
    if (status > 0) answerWith(status, {});
    else vi.stubGlobal("fetch", () => Promise.reject(new TypeError("no connection")));
    const { email, password, press } = await fill();
    await press();
    expect(screen.getByRole("alert").textContent).toContain("still in the fields");
    expect([email.value, password.value]).toEqual(["ines@yard.example", "four words of mine"]);
  });

  it("asks for what is missing before it asks the server", async () => {
    const asked = answerWith(200, { next: "/projects" });
    render(<SignInForm onSignedIn={() => undefined} />);
    const user = userEvent.setup();
    await user.click(screen.getByRole("button", { name: "Sign in" }));
    expect(asked).not.toHaveBeenCalled();
    expect(document.activeElement).toBe(screen.getByRole("textbox", { name: "E-mail" }));
    expect(screen.getByText("Type the e-mail you are known by.")).toBeDefined();
  });

  it("lets password managers and paste do their work", async () => {
    const { user, email, password } = await fill();
    expect([email.autocomplete, password.autocomplete]).toEqual(["username", "current-password"]);
    await user.clear(password);
    await user.click(password);
    await user.paste("pasted words of mine");
    expect(password.value).toBe("pasted words of mine");
    await user.click(screen.getByRole("button", { name: "Show the password" }));
    expect(password.type).toBe("text");
  });
});
