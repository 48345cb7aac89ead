import { cleanup, render, screen, within } from "@testing-library/react";
import fc from "fast-check";
import { afterEach, describe, expect, it } from "vitest";
import { agoWords } from "@/components/plan/agoWords";
import { choicesFor } from "@/components/walls/choices";
import { LossChart } from "@/components/walls/LossChart";
import { basisSentence } from "@/components/walls/LossTable";
import { movementWords } from "@/components/walls/movementWords";
import { SectionDrawing } from "@/components/walls/SectionDrawing";
import { spreadApart } from "@/components/walls/spreadApart";
import { toSquareCentimetres, toSquareMetres } from "@/components/walls/units";
import { WallIndex } from "@/components/walls/WallIndex";
import { wallFaces } from "@/components/walls/wallRows";
import type { Basis } from "@/lib/noise/spectrum";
import { buildAnswer, demoPlan, libraryFor } from "./fixtures/wallsAnswer";

afterEach(cleanup);

const answer = buildAnswer();
const own = libraryFor("east-wall").own;

describe("labels that avoid each other", () => {
  it("stay where they want to be when there is room", () => {
    expect(spreadApart([10, 50, 90], 20, 0, 100)).toEqual([10, 50, 90]);
  });

  it("move aside around the middle of what they wanted", () => {
    expect(spreadApart([50, 50], 20, 0, 100)).toEqual([40, 60]);
  });

  it("never touch, keep their order and stay inside whenever they fit", () => {
    const wanted = fc
      .array(fc.integer({ min: 0, max: 400 }), { minLength: 1, maxLength: 12 })
      .map((places) => places.toSorted((a, b) => a - b));
    fc.assert(
      fc.property(wanted, (places) => {
        const placed = spreadApart(places, 25, 0, 400);
        placed.forEach((place, index) => {
          expect(place).toBeGreaterThanOrEqual(0);
          expect(place).toBeLessThanOrEqual(400);
          if (index > 0) expect(place - placed[index - 1]!).toBeGreaterThanOrEqual(25 - 1e-9);
        });
      }),
    );
  });
});

describe("words and units", () => {
  it("tell how far a margin moved to a tenth of a decibel", () => {
    expect(movementWords(2.4)).toBe("2.4\u00a0dB better than before");
    expect(movementWords(-0.3)).toBe("0.3\u00a0dB worse than before");
    expect(movementWords(0)).toBe("as before");
  });

  it("tell how long ago somebody changed it", () => {
    const now = Date.parse("2027-03-01T21:04:30Z");
    expect(agoWords("2027-03-01T21:04:00Z", now)).toBe("a moment ago");
    expect(agoWords("2027-03-01T21:02:10Z", now)).toBe("two minutes ago");
    expect(agoWords("2027-03-01T18:00:00Z", now)).toBe("more than an hour ago");
    expect(agoWords(undefined, now)).toBe("a moment ago");
  });

  it("bring every area back from cm² as it was", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 1_000_000 }),
        (tenths) => toSquareCentimetres(toSquareMetres(tenths / 10)) === tenths / 10,
      ),
    );
  });

  it("say what the bands rest on", () => {
    const bases: Basis[] = ["estimated", ...Array<Basis>(8).fill("calculated")];
    const doubts = [7, 5, 5, 4, 4, 4, 4, 4, 6];
    expect(basisSentence({ loss: Array(9).fill(20), bases, doubts }, 1)).toBe(
      "Estimated at 31.5\u00a0Hz, calculated from 63\u00a0Hz up; give or take 5\u00a0dB at 63\u00a0Hz.",
    );
    expect(basisSentence({ loss: ["unknown", "unknown", ...Array(7).fill(20)], bases, doubts }, 1)).toBe(
      "Unknown from 31.5\u00a0Hz to 63\u00a0Hz, calculated from 125\u00a0Hz up.",
    );
  });
});

describe("the section", () => {
  const wall = own.find(({ key }) => key === "shell-wall")!;
  const draw = () => render(<SectionDrawing sheet={wall} sides={["Yard", "Live room"]} lit={4} />).container;

  it("says what is drawn, from the yard to the room", () => {
    draw();
    const name = screen.getByRole("img").getAttribute("aria-label")!;
    expect(name).toMatch(
      /^Section of Outer wall.*256.mm, from Yard to Live room: Fibre cement cladding; .*; Plasterboard, dense\.$/,
    );
  });

  it("numbers every layer and measures every one that has room for its figure", () => {
    const texts = Array.from(draw().querySelectorAll("text"), (text) => text.textContent);
    expect(texts.filter((text) => /^[1-7]$/.test(text!))).toHaveLength(7);
    expect(texts.filter((text) => text === "90")).toHaveLength(2);
    expect(texts).toContain("25");
    expect(texts).toContain("256\u00a0mm");
  });

  it("is to scale: the two rows of studs are as wide as each other and 90 to the 25 of the gap", () => {
    const boxes = Array.from(draw().querySelectorAll("svg > rect"), (rect) =>
      Number(rect.getAttribute("width")),
    );
    const [gap] = boxes.filter((_, index) => index === 3);
    const rows = boxes.filter((width) => Math.abs(width / gap! - 90 / 25) < 1e-6);
    expect(rows.length).toBeGreaterThanOrEqual(2);
  });

  it("carries no style attribute, which the content policy would drop", () => {
    expect(draw().innerHTML).not.toContain("style=");
  });
});

describe("what it stops", () => {
  const judged = answer.verdict.elements["east-wall"]!;

  it("names the line, the figure at the lit band and the resonance of the leaves", () => {
    const { container } = render(
      <LossChart name="this wall" loss={judged.loss} doubts={judged.doubts} massAirMass={37} litBand={1} />,
    );
    const texts = Array.from(container.querySelectorAll("text"), (text) => text.textContent);
    expect(texts).toEqual(
      expect.arrayContaining([
        "this wall",
        "29\u00a0dB",
        "the leaves swing",
        "together at 37\u00a0Hz",
        "Hz",
        "dB",
      ]),
    );
    ["31.5", "63", "125", "250", "500", "1k", "2k", "4k", "8k"].forEach((band) =>
      expect(texts).toContain(band),
    );
  });

  it("leaves a band without a figure out of the line and says so in its label when none is known", () => {
    const unknown = judged.loss.map(() => "unknown" as const);
    render(
      <LossChart name="this door" loss={unknown} doubts={judged.doubts} massAirMass={null} litBand={1} />,
    );
    expect(screen.getByRole("img", { name: "What this door stops is not known in any band." })).toBeDefined();
  });
});

describe("choices", () => {
  it("are those that fit, by what they stop at 63 Hz, the unknown last", () => {
    const { list, current } = choicesFor(demoPlan, libraryFor("yard-door"), "yard-door");
    const at63 = list.map(({ loss }) => loss[1]);
    const known = at63.filter((loss) => typeof loss === "number");
    expect(known).toEqual(known.toSorted((a, b) => a - b));
    expect(at63.slice(known.length).every((loss) => loss === "unknown")).toBe(true);
    expect(current).toBe("door-hardwood-43");
  });

  it("hold a construction of the project's own beside the library's", () => {
    const plan = {
      ...demoPlan,
      constructions: demoPlan.constructions.map((each) =>
        each.id === "yard-leaf" ? { ...each, catalogueKey: null } : each,
      ),
    };
    const { list, current } = choicesFor(plan, libraryFor("yard-door", plan), "yard-door");
    expect(current).toBe("yard-leaf");
    expect(list.map(({ key }) => key)).toContain("yard-leaf");
  });
});

describe("the list of walls and openings", () => {
  const show = () =>
    render(
      <WallIndex
        faces={wallFaces(answer, own, (id) => `/walls/${id}`)}
        litBand={1}
        listener="No. 9, bedroom"
      />,
    );

  it("groups what stands in one face and links each to its page", () => {
    show();
    const face = screen.getByRole("region", { name: "Live room, east face" });
    const links = within(face).getAllByRole("link");
    expect(links.map((link) => link.getAttribute("href"))).toEqual(["/walls/east-wall", "/walls/yard-door"]);
    expect(screen.getAllByRole("link")).toHaveLength(demoPlan.elements.length);
  });

  it("says of each what it stops and its share of what the worst listener gets", () => {
    show();
    const row = screen.getByText("Yard door").closest("a")!;
    expect(row.textContent).toMatch(/1\.9.m², stops 13.dB at 63.Hz, \d+.% of what No\. 9, bedroom gets/);
  });

  it("says so when a yard has no walls yet", () => {
    render(<WallIndex faces={[]} litBand={1} />);
    expect(screen.getByRole("heading", { name: "No walls yet" })).toBeDefined();
  });
});
