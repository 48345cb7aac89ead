import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, it } from "vitest";
import { chartForms, levelAxisOf, placeColumns } from "@/components/verdict/axis";
import { Basket, tiltOf } from "@/components/verdict/Basket";
import { columnsOf, countedWithout, litColumnOf, shareOf } from "@/components/verdict/columns";
import { CrossCutDrawing } from "@/components/verdict/CrossCutDrawing";
import { wallAt } from "@/components/verdict/CutBuilding";
import { FiguresAcross, FiguresDown } from "@/components/verdict/FiguresTable";
import { HangingChart } from "@/components/verdict/HangingChart";
import { leverOf, tryWords } from "@/components/verdict/lever";
import { overlaps, placeLabel } from "@/components/verdict/placeLabels";
import { Shares } from "@/components/verdict/Shares";
import { stackOf } from "@/components/verdict/stack";
import { stationsOf } from "@/components/verdict/stations";
import { dellEndAnswer, plumtreeAnswer, plumtreePlan, readPlumtree } from "./fixtures/answers";
import { buildNo9, buildReceiver, no9Lowered, no9Wanted } from "./fixtures/demoVerdict";

afterEach(cleanup);

const no9 = plumtreeAnswer.verdict.receivers.find(({ receiverId }) => receiverId === "no9-bedroom")!;
const nothing = () => undefined;
const litOf = (weighed: typeof no9) => litColumnOf(columnsOf(weighed), null, weighed.band);

describe("columns", () => {
  it("light the band that decides, or the whole of a weighted limit", () => {
    expect(litOf(no9).band).toBe(63);
    const weighted = dellEndAnswer.verdict.receivers[0]!;
    expect(litOf(weighted)).toMatchObject({ band: null, label: "dB(A)", limit: 30 });
    expect(columnsOf(weighted)).toHaveLength(10);
  });

  it("count the bands of a weighted limit so that they add up to the whole", () => {
    const columns = columnsOf(dellEndAnswer.verdict.receivers[0]!);
    const energy = columns.slice(0, 9).reduce((sum, { counted }) => sum + 10 ** ((counted as number) / 10), 0);
    expect(10 * Math.log10(energy)).toBeCloseTo(columns[9]!.level as number, 6);
  });

  it("stand in equal pitch, and inside the drawing", () => {
    const slots = placeColumns(columnsOf(no9), chartForms[1440], 710);
    const pitches = slots.slice(1).map(({ x }, index) => x - slots[index]!.x);
    pitches.forEach((pitch) => expect(Math.abs(pitch - slots[0]!.width)).toBeLessThan(1.5));
    expect(slots[8]!.x + slots[8]!.width / 2).toBeLessThanOrEqual(710 - chartForms[1440].ruler + 1);
  });
});

describe("the level axis", () => {
  it("runs from 0 to 70 dB and grows in tens where a mark needs it", () => {
    expect(levelAxisOf([20, 40], chartForms[1440], 0)).toMatchObject({ low: 0, high: 70 });
    expect(levelAxisOf([-3, 68], chartForms[1440], 0)).toMatchObject({ low: -10, high: 80 });
  });
});

describe("the shares", () => {
  it("stack to the whole in the order of kinds, the lit path on top", () => {
    const blocks = stackOf(no9.paths, litOf(no9), "studio-roof");
    expect(blocks.at(-1)!.path.id).toBe("studio-roof");
    expect(blocks.at(-1)!.to).toBeCloseTo(1, 6);
    blocks.slice(1).forEach((block, index) => expect(block.from).toBe(blocks[index]!.to));
  });

  it("put the foot of the lit part where the ruler reads its drop", () => {
    const column = litOf(no9);
    const door = no9.paths.find(({ id }) => id === "yard-door")!;
    const foot = stackOf(no9.paths, column, door.id).at(-1)!.from;
    expect(-10 * Math.log10(foot)).toBeCloseTo((column.level as number) - (countedWithout(door, column) as number), 3);
  });

  it("name the loudest path in the label of the drawing", () => {
    render(<Shares columns={columnsOf(no9)} paths={no9.paths} lit={litOf(no9)} litId="yard-door" width={710} onBand={nothing} onPath={nothing} />);
    expect(screen.getByRole("img").getAttribute("aria-label")).toMatch(/at 63.Hz the roof has the most, 48.%/);
  });
});

describe("the hanging chart", () => {
  const draw = (weighed: typeof no9, trial = false) => {
    const columns = columnsOf(weighed);
    return render(
      <HangingChart columns={columns} lit={litColumnOf(columns, null, weighed.band)} path={weighed.paths[0]!} trial={trial} limitName="bedroom at night" unit="dB" width={710} onBand={nothing} />,
    );
  };

  it("says in one sentence how many bands are over", () => {
    draw(no9);
    expect(screen.getByRole("img").getAttribute("aria-label")).toMatch(/1 of 9 over; lit: 46.dB, limit 42, 4.dB over, at 63.Hz/);
  });

  it("writes the room left under each poise and the excess above the block", () => {
    draw(no9);
    expect(screen.getByText("4 over")).toBeTruthy();
    expect(screen.getByText("<1")).toBeTruthy();
    expect(screen.getByText("The limit: bedroom at night")).toBeTruthy();
  });

  it("leaves the ledges out without a limit and shows levels instead", () => {
    const { container } = draw(buildNo9({ limits: null, criterionId: null }));
    expect(container.querySelectorAll('path[stroke-width="4.5"]')).toHaveLength(0);
    expect(screen.getByText("46")).toBeTruthy();
  });

  it("hangs a dashed bead where a band is not weighed", () => {
    const paths = no9Wanted.paths.map((path) => ({ ...path, levels: path.levels.map((level, index) => (index === 8 ? null : level! - 14)) }));
    const { container } = draw(buildReceiver({ ...no9Wanted, paths }));
    expect(container.querySelectorAll("circle[stroke-dasharray]")).toHaveLength(1);
  });

  it("draws nothing with a style attribute and no text below 12 px", () => {
    const { container } = draw(no9, true);
    expect(container.querySelectorAll("[style]")).toHaveLength(0);
    container.querySelectorAll("text").forEach((text) => expect(Number(text.getAttribute("font-size"))).toBeGreaterThanOrEqual(12));
  });
});

describe("direct labels", () => {
  it("keep clear of every mark, or are left out", () => {
    const taken = [{ left: 100, right: 200, top: 0, bottom: 120 }, { left: 0, right: 300, top: 180, bottom: 240 }];
    const room = { left: 0, top: 0, right: 300, bottom: 240 };
    const box = placeLabel({ width: 90, height: 20, anchor: { x: 150, y: 130 } }, taken, room)!;
    taken.forEach((other) => expect(overlaps(box, other)).toBe(false));
    expect(placeLabel({ width: 290, height: 90, anchor: { x: 0, y: 0 } }, taken, room)).toBeNull();
  });
});

describe("the basket", () => {
  const heightOf = (container: HTMLElement) => [...container.querySelectorAll("svg svg")].reduce((sum, box) => sum + Number(box.getAttribute("height")), 0);

  it("fills the crate by what is spent, and no further than where it is cut", () => {
    const under = no9Lowered(14);
    const { container } = render(<Basket column={litOf(under)} paths={under.paths} litId={null} width={286} />);
    expect(heightOf(container)).toBeCloseTo(76 * litOf(under).spent!, 4);
    cleanup();
    const loud = no9Lowered(-9);
    const cut = render(<Basket column={litOf(loud)} paths={loud.paths} litId={null} width={286} />);
    expect(heightOf(cut.container)).toBeCloseTo(76 * 2.2, 4);
    expect(screen.getByText(/^19.times$/)).toBeTruthy();
  });

  it("tilts by the margin, at most five degrees", () => {
    expect([tiltOf(2), tiltOf(-2), tiltOf(30), tiltOf(-30)]).toEqual([2.5, -2.5, 5, -5]);
  });
});

describe("the tables", () => {
  it("hold the numbers of the chart, with one decimal of room left", () => {
    render(<FiguresAcross columns={columnsOf(no9)} lit={litOf(no9)} counting={null} />);
    const row = within(screen.getByRole("row", { name: /Room left/ })).getAllByRole("cell");
    expect(row[1]!.textContent).toContain("−3.7");
    expect(within(screen.getByRole("row", { name: /Spent/ })).getAllByRole("cell")[1]!.textContent).toContain("236");
  });

  it("has a row per band on the phone, each with its state in words", () => {
    render(<FiguresDown columns={columnsOf(no9)} lit={litOf(no9)} counting={null} onBand={nothing} />);
    expect(screen.getAllByRole("row")).toHaveLength(10);
    expect(screen.getByRole("row", { name: /^63 46 42/ }).textContent).toContain("over");
  });
});

describe("the lever", () => {
  it("prefers what is easiest to change among nearly equal paths", () => {
    const lever = leverOf(plumtreePlan, no9, litOf(no9))!;
    expect(shareOf(no9.paths.find(({ id }) => id === "studio-roof")!, litOf(no9))).toBeGreaterThan(shareOf(lever, litOf(no9)));
    expect(tryWords(lever)).toBe("Try a heavier door");
  });

  it("is the roof where the door carries far less", () => {
    const paths = no9Wanted.paths.map((path) => (path.id === "yard-door" ? { ...path, levels: path.levels.map((level) => level! - 10) } : path));
    const weighed = buildNo9({ paths });
    expect(tryWords(leverOf(plumtreePlan, weighed, litOf(weighed))!)).toBe("Try another roof");
  });

  it("offers nothing where only an outdoor unit is heard", () => {
    const paths = no9Wanted.paths.filter(({ id }) => id === "condenser");
    const weighed = buildNo9({ paths });
    expect(leverOf(plumtreePlan, weighed, litOf(weighed))).toBeNull();
  });
});

describe("the cross-cut", () => {
  const draw = (few: boolean, width: number) => {
    const reading = readPlumtree(plumtreeAnswer.verdict);
    const column = litOf(reading.weighed);
    const stations = stationsOf(reading, column, few);
    render(
      <CrossCutDrawing cut={reading.weighed.crossCut!} stations={stations} where={column.where} unit="dB" state="over" sourceIsKit inBed width={width} height={few ? 236 : 330} />,
    );
    return stations;
  };

  it("has five stations from the kit to the bed, each quieter than the one before it", () => {
    const stations = draw(false, 680);
    expect(stations.map(({ words }) => words)).toEqual(["at the kit", "over the roof", "at the fence", "at the wall", "in bed"]);
    const levels = stations.map(({ level }) => level as number);
    expect([...levels].sort((one, other) => other - one)).toEqual(levels);
  });

  it("has room for three on the phone", () => {
    expect(draw(true, 334).map(({ words }) => words)).toEqual(["at the kit", "at the fence", "in bed"]);
  });

  it("keeps its labels apart and inside the drawing", () => {
    draw(false, 494);
    const labels = screen.getAllByText(/^(at the|over the|in bed)/).map((text) => ({ x: Number(text.getAttribute("x")), half: (text.textContent!.length * 6.7) / 2 }));
    labels.slice(1).forEach(({ x, half }, index) => expect(x - half).toBeGreaterThan(labels[index]!.x + labels[index]!.half - 1));
    labels.forEach(({ x, half }) => expect(x - half >= 0 && x + half <= 494).toBe(true));
  });

  it("draws an opening in the wall of the cut, and none where the cut meets no wall", () => {
    const studio = plumtreeAnswer.verdict.receivers[0]!.crossCut!.buildings.find(({ role }) => role === "studio")!;
    const wall = Math.max(...studio.outline.map(([along]) => along));
    expect(wallAt(studio, wall + 0.4)).toBe(wall);
    expect(wallAt(studio, wall - 2)).toBeNull();
  });

  it("names the far side of the fence for who listens there", () => {
    const reading = readPlumtree(plumtreeAnswer.verdict, "east-fence");
    const words = stationsOf(reading, litOf(reading.weighed), false).map((station) => station.words);
    expect(words.slice(-2)).toEqual(["at the fence", "behind it"]);
  });

  it("carries a scale bar and the names of both buildings", () => {
    draw(false, 680);
    expect(screen.getByText(/^5.m$/)).toBeTruthy();
    expect(screen.getByText("Studio")).toBeTruthy();
    expect(screen.getByText("No. 9")).toBeTruthy();
  });
});
