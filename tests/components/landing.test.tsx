import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { renderToString } from "react-dom/server";
import { afterEach, describe, expect, it } from "vitest";
import { landingAnswers } from "@/app/_server/landingAnswers";
import { clockWords, holdsAt, readHour } from "@/components/landing/hours";
import { landingBuildOf, nightOf } from "@/components/landing/landingBuildOf";
import { LandingPage } from "@/components/landing/LandingPage";

afterEach(cleanup);

const answers = landingAnswers();
const builds = answers.map(({ key, plan, verdict }) => landingBuildOf(key, plan, verdict));
const night = nightOf(answers[0]!.plan, answers[0]!.verdict);
const page = (build: "a" | "b" | "c" = "b", minutes = 23 * 60) => <LandingPage builds={builds} night={night} build={build} minutes={minutes} />;
const heading = () => screen.getByRole("heading", { level: 2, name: /^At/ }).textContent;
const slider = () => screen.getByRole<HTMLInputElement>("slider", { name: "Until when do you play?" });
const whole = (value: number) => `${Math.round(value)}`;

describe("the landing page", () => {
  it("says the verdict of the build and the hour, with the solved figures", () => {
    render(page());
    expect(heading()).toBe("At 23:00, with a heavier door: 1\u00a0dB over.");
    const status = screen.getAllByRole("status").find(({ textContent }) => textContent?.startsWith("At"))!.textContent;
    expect(status).toContain(`${whole(builds[1]!.level)}\u00a0dB in bed at 63\u00a0Hz, ${whole(builds[1]!.limit)} allowed, give or take ${whole(builds[1]!.doubt)}\u00a0dB.`);
    expect(status).toContain(`As drawn it was ${whole(builds[0]!.level)}.`);
  });

  it("follows the three builds, each with its own mark", () => {
    render(page());
    const marks = screen.getAllByRole("radio").map((radio) => radio.closest("label")!.textContent);
    expect(marks).toEqual([expect.stringContaining("4\u00a0dB over"), expect.stringContaining("1\u00a0dB over"), expect.stringContaining("6\u00a0dB under")]);
    fireEvent.click(screen.getByRole("radio", { name: /Door and ceiling/ }));
    expect(heading()).toMatch(/6\u00a0dB under\.$/);
    expect(screen.getByRole("img", { name: /^Both yards cut open/ }).getAttribute("aria-label")).toContain(`${whole(builds[2]!.level)} dB in bed`);
  });

  it("holds no limit against an hour that the example's limit does not speak of", () => {
    render(page());
    fireEvent.change(slider(), { target: { value: `${21 * 60 + 30}` } });
    expect(heading()).toBe("At 21:30, with a heavier door: no limit holds.");
    expect(screen.getAllByText("no limit then")).toHaveLength(3);
    expect(screen.queryByText(/1\u00a0dB over/, { selector: "label *" })).toBeNull();
  });

  it("moves the hour by quarters, and by hours with the page keys, within the beam", () => {
    render(page());
    expect([slider().step, slider().getAttribute("aria-valuetext")]).toEqual(["15", "23:00, night limit"]);
    fireEvent.keyDown(slider(), { key: "PageDown" });
    fireEvent.keyDown(slider(), { key: "PageDown" });
    expect(slider().getAttribute("aria-valuetext")).toBe("21:00, no limit");
    for (let press = 0; press < 5; press += 1) fireEvent.keyDown(slider(), { key: "PageUp" });
    expect(slider().getAttribute("aria-valuetext")).toBe("24:00, night limit");
  });

  it("works before scripts run: builds and hours are links, and no control stands there that does nothing", () => {
    const markup = document.createElement("div");
    markup.innerHTML = renderToString(page("c", 21 * 60));
    expect(markup.querySelectorAll("input, button")).toHaveLength(0);
    const links = [...markup.querySelectorAll("a")].map((link) => link.getAttribute("href"));
    expect(links).toEqual(expect.arrayContaining(["/?build=a&hour=21%3A00", "/?build=b&hour=21%3A00", "/?build=c&hour=23%3A00"]));
    expect(markup.querySelector("[aria-current]")?.getAttribute("href")).toBe("/?build=c&hour=21%3A00");
    expect(markup.textContent).toContain("no limit holds");
  });

  it("leads to sign-up with the trade chosen, and to the sign-in", () => {
    render(page());
    const links = screen.getAllByRole("link").map((link) => link.getAttribute("href"));
    expect(links).toEqual(expect.arrayContaining(["/sign-up", "/sign-in", "/sign-up?hat=play", "/sign-up?hat=advise", "/sign-up?hat=build"]));
  });

  it("draws the shares of the bed's band as they were solved", () => {
    render(page());
    expect(screen.getByRole("img", { name: /^One bar/ }).getAttribute("aria-label")).toBe(
      `One bar of all that arrives in bed at 63\u00a0Hz as drawn: ${builds[0]!.shares.map(({ name, share }) => `${name} ${whole(share * 100)}\u00a0%`).join(", ")}.`,
    );
  });
});

describe("hours", () => {
  it.each([
    [21 * 60 + 45, false],
    [22 * 60, true],
    [24 * 60, true],
    [6 * 60 + 59, true],
    [7 * 60, false],
  ])("at minute %d the night holds: %s", (minutes, holds) => expect(holdsAt(night, minutes)).toBe(holds));

  it.each([
    ["21:30", "21:30"],
    ["21:37", "21:30"],
    ["24:00", "24:00"],
    ["25:00", "23:00"],
    ["03:00", "23:00"],
    ["tomorrow", "23:00"],
    [undefined, "23:00"],
  ])("%s is read as %s", (text, words) => expect(clockWords(readHour(text))).toBe(words));
});
