import { cleanup, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { EmailMove } from "../../components/signIn/EmailMove";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function stubAnswers(...answers: [status: number, body: object][]) {
  const fetched = vi.fn((_route: string, _asked: RequestInit) => {
    const [status, body] = answers[Math.min(fetched.mock.calls.length - 1, answers.length - 1)]!;
    return Promise.resolve(Response.json(body, { status }));
  });
  vi.stubGlobal("fetch", fetched);
  return fetched;
}
const sentBy = (fetched: ReturnType<typeof stubAnswers>) => fetched.mock.calls.map(([route, { body }]) => [route, JSON.parse(String(body))]);

describe("the links in the mails", () => {
  it.each([
    ["move", "/api/email-move", "Move my account here", "Your account has moved"],
    ["undo", "/api/email-undo", "Keep my account here", "Your account stays here"],
  ] as const)("%s: nothing is asked before the press, then the token goes out once", async (way, route, act, heading) => {
    const fetched = stubAnswers([200, { next: "/sign-in" }]);
    render(<EmailMove way={way} token="tok" />);
    expect(fetched).not.toHaveBeenCalled();
    await userEvent.click(screen.getByRole("button", { name: act }));
    expect(sentBy(fetched)).toEqual([[route, { token: "tok" }]]);
    expect(screen.getByText(heading)).toBeDefined();
  });

  it("a dead one says so", async () => {
    stubAnswers([404, { error: { code: "missing", message: "There is nothing here." } }]);
    render(<EmailMove way="move" token="tok" />);
    await userEvent.click(screen.getByRole("button", { name: "Move my account here" }));
    expect(screen.getByText("This link does not open anything")).toBeDefined();
  });
});
