import { cleanup, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { NumberField } from "@/components/ui/NumberField";

afterEach(cleanup);

function show(props: Partial<React.ComponentProps<typeof NumberField>> = {}) {
  const commit = vi.fn<(value: number | null) => void>();
  function Held() {
    const [value, setValue] = useState<number | null>(props.value ?? null);
    return (
      <NumberField
        label="Gap"
        unit="mm"
        min={1}
        max={300}
        {...props}
        value={value}
        onCommit={(next) => {
          commit(next);
          setValue(next);
        }}
      />
    );
  }
  const view = render(<Held />);
  return { ...view, commit, field: screen.getByRole<HTMLInputElement>("textbox", { name: "Gap" }), user: userEvent.setup() };
}

const descriptionOf = (field: HTMLElement) =>
  (field.getAttribute("aria-describedby") ?? "").split(" ").map((id) => document.getElementById(id)?.textContent ?? "").join(" ").trim();

describe("a number field", () => {
  it("takes comma or point and stores the number on leaving it", async () => {
    const { commit, field, user } = show({ value: 25 });
    await user.clear(field);
    await user.type(field, "12,5");
    expect(commit).not.toHaveBeenCalled();
    await user.tab();
    expect(commit.mock.calls).toEqual([[12.5]]);
    expect(field.value).toBe("12,5");
  });

  it("stores nothing when nothing changed", async () => {
    const { commit, field, user } = show({ value: 25 });
    await user.click(field);
    await user.tab();
    expect(commit).not.toHaveBeenCalled();
  });

  it("moves one step with an arrow, ten with Shift, and stays in its range", async () => {
    const { commit, field, user } = show({ value: 25 });
    await user.click(field);
    await user.keyboard("{ArrowUp}");
    await user.keyboard("{Shift>}{ArrowDown}{/Shift}");
    expect(commit.mock.calls).toEqual([[26], [16]]);
    await user.keyboard("{Shift>}{ArrowDown}{/Shift}{Shift>}{ArrowDown}{/Shift}");
    expect(field.value).toBe("1");
  });

  it("adds no decimals of its own", async () => {
    const { commit, field, user } = show({ value: 0.7, min: 0, step: 0.1 });
    await user.click(field);
    await user.keyboard("{ArrowUp}");
    expect(commit.mock.calls).toEqual([[0.8]]);
  });

  it("says what is wrong beside the field, keeps what was typed, and stores nothing", async () => {
    const { commit, field, user } = show({ value: 25 });
    await user.clear(field);
    await user.type(field, "2500");
    await user.tab();
    expect(commit).not.toHaveBeenCalled();
    expect(field.value).toBe("2500");
    expect(field.getAttribute("aria-invalid")).toBe("true");
    expect(descriptionOf(field)).toContain("Between 1 and 300\u00a0mm.");
  });

  it("cautions about a strange value and stores it all the same", async () => {
    const { commit, field, user } = show({ value: 25, caution: (value) => (value >= 250 ? "Did you mean 25 mm?" : undefined) });
    await user.clear(field);
    await user.type(field, "250{Enter}");
    expect(commit.mock.calls).toEqual([[250]]);
    expect(descriptionOf(field)).toContain("Did you mean 25 mm?");
    expect(field.value).toBe("250");
  });

  it("hands a value over once, however the field is left, and again when one comes back to it", async () => {
    const commit = vi.fn();
    render(<NumberField label="Gap" value={25} onCommit={commit} />);
    const user = userEvent.setup();
    const field = screen.getByRole<HTMLInputElement>("textbox", { name: "Gap" });
    await user.clear(field);
    await user.type(field, "40{Enter}");
    await user.tab();
    expect(commit.mock.calls).toEqual([[40]]);
    expect(field.value).toBe("40");
    await user.click(field);
    await user.tab();
    expect(commit.mock.calls).toEqual([[40], [40]]);
  });

  it("sends the old value typed back while the new one is on its way, and no answer overwrites what is being typed", async () => {
    const commit = vi.fn();
    const field = () => screen.getByRole<HTMLInputElement>("textbox", { name: "Gap" });
    const { rerender } = render(<NumberField label="Gap" value={25} onCommit={commit} />);
    const user = userEvent.setup();
    await user.clear(field());
    await user.type(field(), "40{Enter}");
    await user.clear(field());
    await user.type(field(), "25");
    rerender(<NumberField label="Gap" value={40} onCommit={commit} />);
    expect(field().value).toBe("25");
    await user.tab();
    expect(commit.mock.calls).toEqual([[40], [25]]);
    rerender(<NumberField label="Gap" value={25} onCommit={commit} />);
    expect(field().value).toBe("25");
    rerender(<NumberField label="Gap" value={30} onCommit={commit} />);
    expect(field().value).toBe("30");
  });

  it("takes both back and forth before the first answer", async () => {
    const commit = vi.fn();
    const field = () => screen.getByRole<HTMLInputElement>("textbox", { name: "Gap" });
    const { rerender } = render(<NumberField label="Gap" value={25} onCommit={commit} />);
    const user = userEvent.setup();
    for (const figure of ["40", "25"]) {
      await user.clear(field());
      await user.type(field(), `${figure}{Enter}`);
    }
    expect(commit.mock.calls).toEqual([[40], [25]]);
    rerender(<NumberField label="Gap" value={40} onCommit={commit} />);
    expect(field().value).toBe("25");
  });

  it("follows a value that another hand has changed", () => {
    const { rerender } = render(<NumberField label="Gap" value={25} onCommit={() => undefined} />);
    rerender(<NumberField label="Gap" value={1.8} onCommit={() => undefined} />);
    expect(screen.getByRole<HTMLInputElement>("textbox", { name: "Gap" }).value).toBe("1.8");
  });

  it("takes an empty field as not known only where that is an answer", async () => {
    const needed = show({ value: 25 });
    await needed.user.clear(needed.field);
    await needed.user.tab();
    expect(needed.commit).not.toHaveBeenCalled();
    expect(screen.getByText("A figure is needed here.")).toBeDefined();
    needed.unmount();
    const optional = show({ value: 25, optional: true });
    await optional.user.clear(optional.field);
    await optional.user.tab();
    expect(optional.commit.mock.calls).toEqual([[null]]);
  });

  it("ties the unit and a refusal of the server to the field", () => {
    const { field } = show({ value: 131, error: "Louder than anything we have read of." });
    expect(descriptionOf(field)).toContain("mm");
    expect(descriptionOf(field)).toContain("Louder than anything we have read of.");
  });
});
