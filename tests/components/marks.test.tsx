import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, it } from "vitest";
import type { State } from "@/components/format";
import { HatchBox } from "@/components/marks/HatchBox";
import { HatchDefs, hatchFill } from "@/components/marks/HatchDefs";
import { drawHatch, STACK_ORDER } from "@/components/marks/hatches";
import { MarginWords } from "@/components/marks/MarginWords";
import { SmallBeam } from "@/components/marks/SmallBeam";
import { StatusMark } from "@/components/marks/StatusMark";
import { PATH_KINDS } from "@/lib/noise/elements/kind";
import { STATES } from "@/lib/noise/verdict";

afterEach(cleanup);

const drawn = (state: State) => render(<StatusMark state={state} />).container.querySelector("svg")!;

describe("status marks", () => {
  it("differ in shape, not only in colour", () => {
    const shapes = STATES.map((state) => drawn(state).innerHTML);
    expect(new Set(shapes).size).toBe(4);
    shapes.forEach((shape) => expect(shape).not.toMatch(/class=/));
  });

  it("leave the telling to the word beside them", () => {
    render(<MarginWords state="over" margin={-2.8} />);
    expect(screen.getByText("3 dB over")).toBeDefined();
    expect(drawn("over").getAttribute("aria-hidden")).toBe("true");
  });
});

/** Where the poise hangs: the middle of its top edge. */
function poiseAt(container: HTMLElement): number {
  const [, left, right] = /M([\d.]+) 18H([\d.]+)/.exec(container.innerHTML) ?? [];
  return (Number(left) + Number(right)) / 2;
}

describe("the small beam", () => {
  it("hangs the poise left of the pivot when over, right of it when under, a notch to a decibel", () => {
    const width = 258; // 9 px at both ends, 10 px to a decibel
    expect(poiseAt(render(<SmallBeam state="over" margin={-3} width={width} />).container)).toBeCloseTo(129 - 30, 1);
    cleanup();
    expect(poiseAt(render(<SmallBeam state="under" margin={6} width={width} />).container)).toBeCloseTo(129 + 60, 1);
  });

  it("draws the doubt as a band of its true width", () => {
    const { container } = render(<SmallBeam state="tight" margin={1} doubt={3} width={258} />);
    const band = container.querySelector("rect")!;
    expect(Number(band.getAttribute("x"))).toBeCloseTo(129 - 20, 1);
    expect(Number(band.getAttribute("width"))).toBeCloseTo(60, 1);
  });

  it("is dashed and bare when nothing is weighed", () => {
    const { container } = render(<SmallBeam state="not weighed" />);
    expect(screen.getByRole("img", { name: "Beam: not weighed" })).toBeDefined();
    expect(container.innerHTML).toContain("stroke-dasharray");
    expect(container.querySelector("rect")).toBeNull();
  });
});

describe("hatches", () => {
  it("exist for each kind of path and are all different", () => {
    expect([...STACK_ORDER].sort()).toEqual([...PATH_KINDS].sort());
    expect(new Set(STACK_ORDER.map((kind) => drawHatch(kind, 24, 24))).size).toBe(STACK_ORDER.length);
  });

  it("have ids that no other hatch has, and fills that point at them", () => {
    const { container } = render(<HatchDefs />);
    const ids = [...container.querySelectorAll("pattern")].map((pattern) => pattern.id);
    expect(new Set(ids).size).toBe(2 * STACK_ORDER.length);
    for (const kind of STACK_ORDER) {
      expect(ids.map((id) => `url(#${id})`)).toContain(hatchFill(kind));
      expect(ids.map((id) => `url(#${id})`)).toContain(hatchFill(kind, true));
    }
  });

  it("draw nothing for a share of nothing", () => {
    const { container } = render(
      <svg>
        <HatchBox kind="roof" x={0} y={0} width={40} height={0} />
      </svg>,
    );
    expect(container.querySelector("rect")).toBeNull();
  });
});
