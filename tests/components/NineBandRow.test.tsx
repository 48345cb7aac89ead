import { cleanup, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { NineBandRow } from "@/components/ui/NineBandRow";
import { cellsOf, type BandFigure } from "@/components/ui/nineValues";

afterEach(cleanup);

const LEVELS: BandFigure[] = [92, 104, 101, 99, 98, 97, 96, 94, 90];

function show(start: BandFigure[] = LEVELS, more: Partial<React.ComponentProps<typeof NineBandRow>> = {}) {
  const commit = vi.fn<(values: BandFigure[]) => void>();
  function Held() {
    const [values, setValues] = useState(start);
    return (
      <NineBandRow
        label="Levels"
        unit="dB"
        min={-100}
        max={160}
        {...more}
        values={values}
        onCommit={(next) => {
          commit(next);
          setValues(next);
        }}
      />
    );
  }
  render(<Held />);
  const field = (name: string) => screen.getByRole<HTMLInputElement>("textbox", { name });
  return { commit, field, user: userEvent.setup() };
}

const shown = () => screen.getAllByRole<HTMLInputElement>("textbox").map(({ value }) => value);

describe("a row of nine bands", () => {
  it("has one named field per band and shows what is not known as an empty one", () => {
    const { field } = show([null, ...LEVELS.slice(1)]);
    expect(screen.getByRole("group", { name: "Levels, dB" })).toBeDefined();
    expect(field("31.5 Hz").value).toBe("");
    expect(shown().slice(1)).toEqual(["104", "101", "99", "98", "97", "96", "94", "90"]);
  });

  it("hands over all nine when a field is left, with a comma as well as with a point", async () => {
    const { commit, field, user } = show();
    await user.clear(field("63 Hz"));
    await user.type(field("63 Hz"), "103,5");
    await user.tab();
    expect(commit.mock.calls).toEqual([[[92, 103.5, ...LEVELS.slice(2)]]]);
  });

  it("goes from band to band at the ends of the text, and through the text within it", async () => {
    const { field, user } = show();
    await user.click(field("63 Hz"));
    field("63 Hz").setSelectionRange(1, 1);
    await user.keyboard("{ArrowRight}");
    expect(document.activeElement).toBe(field("63 Hz"));
    field("63 Hz").setSelectionRange(3, 3);
    await user.keyboard("{ArrowRight}");
    expect(document.activeElement).toBe(field("125 Hz"));
    field("125 Hz").setSelectionRange(0, 0);
    await user.keyboard("{ArrowLeft}{ArrowLeft}{ArrowLeft}");
    expect(document.activeElement).toBe(field("31.5 Hz"));
  });

  it("moves a figure one step with an arrow, ten with Shift", async () => {
    const { commit, field, user } = show();
    await user.click(field("8k Hz"));
    await user.keyboard("{ArrowUp}");
    await user.keyboard("{Shift>}{ArrowDown}{/Shift}");
    expect(commit.mock.calls.map(([values]) => values[8])).toEqual([91, 81]);
  });

  it("fills the row with nine pasted values, whatever parts them", async () => {
    const { commit, field, user } = show();
    for (const text of ["1\t2\t3\t4\t5\t6\t7\t8\t9,5", "1 2 3 4 5 6 7 8 9,5", "1;2;3;4;5;6;7;8;9.5", "1,2,3,4,5,6,7,8,9.5", "1, 2, 3, 4, 5, 6, 7, 8, 9.5"]) {
      commit.mockClear();
      await user.click(field("1k Hz"));
      await user.paste(text);
      expect(shown().map((value) => value.replace(",", "."))).toEqual(["1", "2", "3", "4", "5", "6", "7", "8", "9.5"]);
      expect(screen.getByRole("status").textContent).toBe("Nine values pasted.");
      await user.clear(field("31.5 Hz"));
      await user.type(field("31.5 Hz"), "40{Enter}");
    }
  });

  it("says which eight of nine were pasted and keeps the ninth", async () => {
    const { commit, field, user } = show();
    await user.click(field("63 Hz"));
    await user.paste("61 62 63 64 65 66 67 68");
    expect(commit.mock.calls).toEqual([[[92, 61, 62, 63, 64, 65, 66, 67, 68]]]);
    expect(screen.getByRole("status").textContent).toContain("Eight of nine pasted, 63\u00a0Hz to 8\u00a0kHz. Left as before: 31.5\u00a0Hz.");
  });

  it("takes an empty cell of a table as not known and says so", async () => {
    const { commit, field, user } = show();
    await user.click(field("31.5 Hz"));
    await user.paste("90\t\t92\t93\t94\t95\t96\t97\t98");
    expect(commit.mock.calls[0]?.[0]).toEqual([90, null, 92, 93, 94, 95, 96, 97, 98]);
    expect(screen.getByRole("status").textContent).toContain("Not known: 63\u00a0Hz.");
  });

  it("changes nothing when more than nine are pasted, and says so", async () => {
    const { commit, field, user } = show();
    await user.click(field("31.5 Hz"));
    await user.paste("1 2 3 4 5 6 7 8 9 10");
    expect(commit).not.toHaveBeenCalled();
    expect(screen.getByRole("status").textContent).toContain("Ten values pasted, but there are nine bands.");
    expect(shown()[0]).toBe("92");
  });

  it("keeps what is no figure where it was typed, with the reason, and hands over the rest", async () => {
    const { commit, field, user } = show();
    await user.clear(field("250 Hz"));
    await user.type(field("250 Hz"), "990");
    await user.tab();
    expect(commit).not.toHaveBeenCalled();
    expect(field("250 Hz").getAttribute("aria-invalid")).toBe("true");
    expect(screen.getByText("250 Hz: Between \u2212100 and 160 dB.")).toBeDefined();
    await user.clear(field("8k Hz"));
    await user.type(field("8k Hz"), "80");
    await user.tab();
    expect(commit.mock.calls).toEqual([[[...LEVELS.slice(0, 8), 80]]]);
    expect(field("250 Hz").value).toBe("990");
  });

  it("takes silence only where it is an answer", async () => {
    const strict = show();
    await strict.user.clear(strict.field("63 Hz"));
    await strict.user.type(strict.field("63 Hz"), "silent{Enter}");
    expect(strict.commit).not.toHaveBeenCalled();
    cleanup();
    const open = show(LEVELS, { silence: true });
    await open.user.clear(open.field("63 Hz"));
    await open.user.type(open.field("63 Hz"), "silent{Enter}");
    expect(open.commit.mock.calls[0]?.[0][1]).toBe("silent");
  });

  it("does not take back a figure that is still on its way when the next field is left", async () => {
    const commit = vi.fn<(values: BandFigure[]) => void>();
    render(<NineBandRow label="Levels" unit="dB" min={0} max={160} values={LEVELS} onCommit={commit} />);
    const user = userEvent.setup();
    const [first, second] = screen.getAllByRole("textbox");
    await user.clear(first!);
    await user.type(first!, "80");
    await user.tab();
    await user.clear(second!);
    await user.type(second!, "81");
    await user.tab();
    expect(commit.mock.calls.map(([values]) => values.slice(0, 2))).toEqual([[80, 104], [80, 81]]);
  });

  it("follows a figure that another hand has changed and leaves what is being typed", async () => {
    const { rerender } = render(<NineBandRow label="Levels" unit="dB" min={0} max={160} values={LEVELS} onCommit={() => undefined} />);
    const user = userEvent.setup();
    const [first] = screen.getAllByRole<HTMLInputElement>("textbox");
    await user.clear(first!);
    await user.type(first!, "77");
    rerender(<NineBandRow label="Levels" unit="dB" min={0} max={160} values={[92, 50, ...LEVELS.slice(2)]} onCommit={() => undefined} />);
    expect(shown().slice(0, 2)).toEqual(["77", "50"]);
  });
});

describe("pasted text", () => {
  it("is parted where it means to be parted", () => {
    expect(cellsOf("92,5")).toEqual(["92,5"]);
    expect(cellsOf("92,5 104,0")).toEqual(["92,5", "104,0"]);
    expect(cellsOf("92.5,104.0")).toEqual(["92.5", "104.0"]);
    expect(cellsOf("92,5;104,0\n")).toEqual(["92,5", "104,0"]);
    expect(cellsOf("92\n104\r\n101")).toEqual(["92", "104", "101"]);
  });
});
