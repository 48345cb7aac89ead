import { cleanup, render, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { currencyOf } from "@/components/projects/browserPlace";
import { NewYardForm } from "@/components/projects/NewYardForm";
import { FiguresProvider, type Figures } from "@/components/ui/figures";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const teams = [{ id: "11111111-1111-4111-8111-111111111111", name: "Our own" }];
const choices = [{ value: "UTC", label: "UTC" }, { value: "CET", label: "CET" }];
const currencies = [{ value: "EUR", label: "EUR, Euro" }, { value: "USD", label: "USD, US Dollar" }];

function show({ figures = { units: "metric", mark: "point" } as Figures, start = "empty" as "empty" | "example", more = [] as typeof teams } = {}) {
  const onMade = vi.fn();
  render(
    <FiguresProvider value={figures}>
      <NewYardForm teams={[...teams, ...more]} clocks={choices} currencies={currencies} start={start} onMade={onMade} />
    </FiguresProvider>,
  );
  return onMade;
}

function answerWith(status: number, answer: object) {
  const asked: Record<string, unknown>[] = [];
  vi.stubGlobal("fetch", vi.fn(async (_: string, { body }: { body: string }) => {
    asked.push(JSON.parse(body) as Record<string, unknown>);
    return new Response(JSON.stringify(answer), { status });
  }));
  return asked;
}

const made = { id: "7", next: "/projects/7/yard" };
const press = () => userEvent.click(screen.getByRole("button", { name: "Make the yard" }));
const group = (name: string) => within(screen.getByRole("group", { name }));

describe("a new yard", () => {
  it("needs a name alone: nothing else is sent that was not said", async () => {
    const asked = answerWith(201, made);
    const onMade = show();
    await userEvent.type(screen.getByRole("textbox", { name: "Name", description: /Yours to choose/ }), "Behind the shed");
    await press();
    await waitFor(() => expect(onMade).toHaveBeenCalledWith("/projects/7/yard"));
    expect(asked).toEqual([{ name: "Behind the shed", says: "", start: "empty", teamId: teams[0]!.id, timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone, currency: "USD", street: "" }]);
  });

  it("without a name asks for one and goes there", async () => {
    const asked = answerWith(201, made);
    show();
    await press();
    expect(screen.getByText("A yard needs a name.")).toBeDefined();
    expect(document.activeElement).toBe(screen.getByRole("textbox", { name: "Name", description: /A yard needs a name/ }));
    expect(asked).toEqual([]);
  });

  it("sends sizes in metres, whatever the reader's units", async () => {
    const asked = answerWith(201, made);
    show({ figures: { units: "us", mark: "comma" } });
    await userEvent.type(screen.getByRole("textbox", { name: "Name", description: /Yours to choose/ }), "Yard");
    await userEvent.type(group("The lot").getByRole("textbox", { name: "Width, west to east" }), "100");
    await userEvent.type(group("The lot").getByRole("textbox", { name: "Depth, south to north" }), "50,5{Enter}");
    await waitFor(() => expect(asked).toHaveLength(1));
    expect(asked[0]!.lot).toEqual({ width: 30.48, depth: 15.3924 });
    expect(asked[0]!.building).toBeUndefined();
  });

  it("draws what is known to scale, with the measures of the outermost", async () => {
    show();
    await userEvent.type(group("The lot").getByRole("textbox", { name: "Width, west to east" }), "20");
    expect(screen.getByRole("img", { name: "Nothing is drawn yet." })).toBeDefined();
    await userEvent.type(group("The lot").getByRole("textbox", { name: "Depth, south to north" }), "10");
    await userEvent.type(group("The studio building").getByRole("textbox", { name: "Width outside" }), "5");
    await userEvent.type(group("The studio building").getByRole("textbox", { name: "Depth outside" }), "4");
    await userEvent.tab();
    const drawing = screen.getByRole("img", { name: "Drawn to scale so far: the lot, the studio building." });
    const [lot, building] = [...drawing.querySelectorAll("rect")].map((rect) => ["width", "height"].map((side) => Number(rect.getAttribute(side))));
    expect(lot![0]! / lot![1]!).toBeCloseTo(2);
    expect([lot![0]! / building![0]!, lot![1]! / building![1]!]).toEqual([expect.closeTo(4), expect.closeTo(2.5)]);
    expect([...drawing.querySelectorAll("text")].map(({ textContent }) => textContent)).toEqual(["20\u00a0m", "10\u00a0m"]);
  });

  it("a size that is no size holds the yard back, and stays in its field", async () => {
    const asked = answerWith(201, made);
    show();
    await userEvent.type(screen.getByRole("textbox", { name: "Name", description: /Yours to choose/ }), "Yard");
    const field = group("The lot").getByRole<HTMLInputElement>("textbox", { name: "Width, west to east" });
    await userEvent.type(field, "900");
    await press();
    expect([field.value, document.activeElement, asked.length]).toEqual(["900", field, 0]);
  });

  it("puts the server's reasons beside their fields and keeps all that was typed; a change takes them away", async () => {
    const asked = answerWith(422, { error: { message: "This value does not fit.", fields: { "lot.depth": "A number is needed." } } });
    show();
    const name = screen.getByRole<HTMLInputElement>("textbox", { name: "Name", description: /Yours to choose/ });
    await userEvent.type(name, "Yard");
    await userEvent.type(group("The lot").getByRole("textbox", { name: "Width, west to east" }), "20");
    await press();
    const depth = group("The lot").getByRole("textbox", { name: "Depth, south to north", description: /A number is needed/ });
    expect([asked[0]!.lot, name.value, document.activeElement]).toEqual([{ width: 20 }, "Yard", depth]);
    await userEvent.type(depth, "30");
    await press();
    expect(asked[1]!.lot).toEqual({ width: 20, depth: 30 });
  });

  it("from the worked example asks for no sizes and opens on its budget", async () => {
    const asked = answerWith(201, made);
    const onMade = show();
    await userEvent.click(screen.getByRole("radio", { name: /The worked example/ }));
    expect(screen.queryByRole("group", { name: "The lot" })).toBeNull();
    await userEvent.type(screen.getByRole("textbox", { name: "Name" }), "Mine");
    await press();
    await waitFor(() => expect(onMade).toHaveBeenCalledWith("/projects/7"));
    expect(asked[0]).toMatchObject({ start: "example" });
    expect(asked[0]).not.toHaveProperty("street");
  });

  it("asks for the team only where there are several", async () => {
    show();
    expect(screen.queryByRole("combobox", { name: "Team" })).toBeNull();
    cleanup();
    show({ more: [{ id: "22222222-2222-4222-8222-222222222222", name: "The practice" }] });
    expect(screen.getByRole<HTMLSelectElement>("combobox", { name: "Team" }).value).toBe(teams[0]!.id);
  });

  it("says so where it could not be made", async () => {
    answerWith(503, { error: { message: "We cannot reach the yard's records just now." } });
    show();
    await userEvent.type(screen.getByRole("textbox", { name: "Name", description: /Yours to choose/ }), "Yard");
    await press();
    expect((await screen.findByRole("alert")).textContent).toContain("We cannot reach");
  });

  it.each([["en-GB", "GBP"], ["de-CH", "CHF"], ["fr", "EUR"], ["zh-Hant-AU", "AUD"], ["", "EUR"]])("a browser in %j begins with %s", (language, currency) => {
    expect(currencyOf(language)).toBe(currency);
  });
});
