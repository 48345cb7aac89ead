import { cleanup, fireEvent, render, screen, act } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { CheckMail } from "@/components/signIn/CheckMail";
import { EmailCheck } from "@/components/signIn/EmailCheck";
import { emailFault, newPasswordFault } from "@/components/signIn/fieldChecks";
import { ForgottenForm } from "@/components/signIn/ForgottenForm";
import { NewPasswordForm } from "@/components/signIn/NewPasswordForm";
import { SignUpForm } from "@/components/signIn/SignUpForm";

beforeEach(() => sessionStorage.clear());
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function answerWith(status: number, body: unknown = {}, headers: Record<string, string> = {}) {
  const asked = vi.fn<(address: string, request: RequestInit) => Promise<Response>>(async () => Response.json(body, { status, headers }));
  vi.stubGlobal("fetch", asked);
  return asked;
}

const sentBy = (asked: ReturnType<typeof answerWith>, call = 0) => {
  const [address, request] = asked.mock.calls[call]!;
  return { address, method: request.method, body: JSON.parse(String(request.body)) as unknown };
};

const type = (label: string, value: string) => fireEvent.change(screen.getByLabelText(label), { target: { value } });
const press = async (name: string | RegExp) => {
  await act(async () => fireEvent.click(screen.getByRole("button", { name })));
};
const described = (element: HTMLElement) =>
  (element.getAttribute("aria-describedby") ?? "").split(" ").map((id) => document.getElementById(id)?.textContent ?? "").join(" ");

describe("signing up", () => {
  function open(hat: "play" | "advise" | "build" = "play") {
    const sent = vi.fn<() => void>();
    render(<SignUpForm hat={hat} onSent={sent} />);
    return sent;
  }
  function fill() {
    type("Name", " Ines ");
    type("E-mail", "ines@yard.example ");
    type("Password", "four words of mine");
  }

  it("sends name, e-mail, password and hat, and goes on to the mail", async () => {
    const asked = answerWith(202);
    const sent = open("play");
    fill();
    fireEvent.click(screen.getByRole("radio", { name: /I build/ }));
    await press("Sign up");
    expect(sentBy(asked)).toEqual({
      address: "/api/sign-up",
      method: "POST",
      body: { name: "Ines", email: "ines@yard.example", password: "four words of mine", hat: "build" },
    });
    expect(sent).toHaveBeenCalledTimes(1);
    render(<CheckMail />);
    expect(screen.getByRole("status").textContent).toContain("A mail went to ines@yard.example");
    expect(window.location.href).not.toContain("ines");
  });

  it("says what is missing beside each field before it asks, and stands in the first", async () => {
    const asked = answerWith(202);
    open();
    type("Password", "plumtree");
    await press("Sign up");
    expect(asked).not.toHaveBeenCalled();
    expect(document.activeElement).toBe(screen.getByLabelText("Name"));
    expect(described(screen.getByLabelText("Password"))).toContain("Eight characters. 15 are needed.");
    expect(described(screen.getByLabelText("E-mail"))).toContain("Type your e-mail.");
    expect(screen.getByLabelText<HTMLInputElement>("Password").value).toBe("plumtree");
  });

  it("shows the server's reason beside the password and keeps it", async () => {
    answerWith(422, { error: { code: "invalid", message: "No.", fields: { password: "This is among the first that anybody would try." } } });
    const sent = open();
    fill();
    await press("Sign up");
    const field = screen.getByLabelText<HTMLInputElement>("Password");
    expect(described(field)).toContain("among the first");
    expect(document.activeElement).toBe(field);
    expect(field.value).toBe("four words of mine");
    expect(sent).not.toHaveBeenCalled();
  });

  it("waits where too many signed up from here", async () => {
    answerWith(429, { error: { message: "Too many tries. Wait 3 hours, then try again." } }, { "Retry-After": "10800" });
    open();
    fill();
    await press("Sign up");
    expect(described(screen.getByRole("button", { name: "Sign up" }))).toContain("3\u00a0h");
  });

  it("keeps everything when the server cannot be reached", async () => {
    vi.stubGlobal("fetch", () => Promise.reject(new TypeError("no connection")));
    open();
    fill();
    await press("Sign up");
    expect(screen.getByRole("alert").textContent).toContain("still in the fields");
    expect(screen.getByLabelText<HTMLInputElement>("Name").value).toBe(" Ines ");
  });

  it("lets password managers make a password and shows it on demand", async () => {
    open();
    const field = screen.getByLabelText<HTMLInputElement>("Password");
    expect(field.autocomplete).toBe("new-password");
    await press("Show the password");
    expect(field.type).toBe("text");
  });
});

describe("the link in the mail", () => {
  it("does nothing until the button is pressed, then sends its token once", async () => {
    const asked = answerWith(200, { next: "/sign-in" });
    render(<EmailCheck token="abc" />);
    expect(asked).not.toHaveBeenCalled();
    await press("This e-mail is mine");
    expect(sentBy(asked)).toEqual({ address: "/api/email-check", method: "POST", body: { token: "abc" } });
    expect(screen.getByRole("link", { name: "Sign in" }).getAttribute("href")).toBe("/sign-in");
    expect(document.activeElement?.textContent).toContain("Your e-mail is checked");
  });

  it("looks the same whether it was used, replaced or invented", async () => {
    answerWith(404, { error: { code: "missing", message: "There is nothing here." } });
    render(<EmailCheck token="abc" />);
    await press("This e-mail is mine");
    const used = screen.getByRole("alert").textContent;
    cleanup();
    render(<EmailCheck token="" />);
    expect(screen.getByRole("alert").textContent).toBe(used);
    expect(used).toContain("This link does not open anything");
  });

  it("can be pressed again after a fault of ours", async () => {
    answerWith(503);
    render(<EmailCheck token="abc" />);
    await press("This e-mail is mine");
    expect(screen.getByRole("alert")).toBeDefined();
    answerWith(200, { next: "/sign-in" });
    await press("This e-mail is mine");
    expect(screen.getByRole("link", { name: "Sign in" })).toBeDefined();
  });
});

describe("a forgotten password", () => {
  it("gets one answer for every e-mail", async () => {
    const asked = answerWith(202);
    render(<ForgottenForm />);
    type("E-mail", "anybody@yard.example");
    await press("Send a link");
    expect(sentBy(asked)).toEqual({ address: "/api/forgotten-password", method: "POST", body: { email: "anybody@yard.example" } });
    expect(screen.getByRole("status").textContent).toContain("If we know this e-mail");
  });

  it("is replaced over a link, and signs nobody in", async () => {
    const asked = answerWith(200, { next: "/sign-in" });
    render(<NewPasswordForm token="abc" />);
    type("New password", "other words of mine");
    await press("Save the password");
    expect(sentBy(asked).body).toEqual({ token: "abc", password: "other words of mine" });
    expect(screen.getByRole("link", { name: "Sign in" }).getAttribute("href")).toBe("/sign-in");
  });

  it("keeps a new one that does not fit beside its reason", async () => {
    const asked = answerWith(200);
    render(<NewPasswordForm token="abc" />);
    type("New password", "plumtree");
    await press("Save the password");
    expect(asked).not.toHaveBeenCalled();
    expect(described(screen.getByLabelText("New password"))).toContain("Eight characters. 15 are needed.");
    answerWith(422, { error: { fields: { password: "This is made of names." } } });
    type("New password", "stillyardstillyard");
    await press("Save the password");
    expect(described(screen.getByLabelText("New password"))).toContain("This is made of names.");
  });

  it("with a dead link leads to a new one", async () => {
    answerWith(404);
    render(<NewPasswordForm token="abc" />);
    type("New password", "other words of mine");
    await press("Save the password");
    expect(screen.getByRole("link", { name: "Send a new link" }).getAttribute("href")).toBe("/forgotten-password");
  });
});

describe("what is checked before it is sent", () => {
  it.each([
    ["", "Choose a password."],
    ["1", "One character. 15 are needed."],
    ["fourteen signs", "14 characters. 15 are needed."],
    ["fifteen letters", undefined],
    ["\u{1F941}".repeat(15), undefined],
    ["x".repeat(129), "129 characters. 128 is the most."],
  ])("%j as a new password", (password, words) => expect(newPasswordFault(password)).toBe(words));

  it.each(["ines", "ines@", "@yard.example", "ines @yard.example"])("%j is no e-mail", (email) => expect(emailFault(email)).toContain("one @"));
});
