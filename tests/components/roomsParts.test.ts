import { describe, expect, it } from "vitest";
import { breathOf, carbonDioxide, flowFor, OUTDOORS, standardFlow } from "@/components/rooms/air";
import { FINISH_WORDS, finishSet, shellOf, wordOf } from "@/components/rooms/finishSets";
import { fitFragment, placeBalloons, storeyOf } from "@/components/rooms/planFragment";
import { thingsIn } from "@/components/rooms/inside";
import { roomOf, type Size } from "@/components/rooms/room";
import { ownFigures, restoreRoom } from "@/components/rooms/roomChanges";
import { keepTyped } from "@/components/plan/keepTyped";
import { sharesAt, soakersOf, sumAt } from "@/components/rooms/soak";
import { finishRecords } from "@/lib/noise/library";
import type { Surface } from "@/lib/noise/plan";
import { plumtreeAnswer, plumtreePlan } from "./fixtures/answers";
import { answerOf, planWithParts } from "./fixtures/roomsDesk";

const SIZE: Size = [4.3, 4.5, 2.35];

function lined(pieces: ReturnType<typeof finishSet>): Surface[] {
  return pieces.map(({ name, libraryKey, area }, index) => {
    const { alpha, bases, provenance } = finishRecords.find(({ key }) => key === libraryKey)!;
    return { id: `${index}`, spaceId: "room", name, area, finishKey: libraryKey, alpha, bases, provenance };
  });
}

describe("the words for a finish", () => {
  it("name finishes that the library has", () => {
    const keys = FINISH_WORDS.flatMap((word) => finishSet(word, { walls: "masonry", floor: "timber" }, SIZE)).map(({ libraryKey }) => libraryKey);
    for (const key of keys) expect(finishRecords.map((record) => record.key)).toContain(key);
  });

  it("cover the whole box, whatever the word", () => {
    const box = 2 * (4.3 + 4.5) * 2.35 + 2 * 4.3 * 4.5;
    for (const word of FINISH_WORDS) {
      const area = finishSet(word, { walls: "light", floor: "concrete" }, SIZE).reduce((sum, piece) => sum + piece.area, 0);
      expect(Math.abs(area - box)).toBeLessThan(0.4);
    }
  });

  it("are told from the surfaces again, with the shell behind them", () => {
    for (const word of FINISH_WORDS) {
      const shell = { walls: "masonry", floor: "timber" } as const;
      const surfaces = lined(finishSet(word, shell, SIZE));
      expect(wordOf(surfaces, SIZE)).toEqual({ word, shell });
      expect(shellOf(surfaces)).toEqual(shell);
    }
  });

  it("are no longer told once an area is another", () => {
    const surfaces = lined(finishSet("treated", { walls: "light", floor: "concrete" }, SIZE));
    surfaces[0]!.area += 1;
    expect(wordOf(surfaces, SIZE)).toBeNull();
  });
});

describe("who soaks it up", () => {
  it("adds up to what the solver says of the room, by both formulas, in every band", () => {
    for (const model of ["sabine", "eyring"] as const) {
      const plan = planWithParts(({ spaces }) => {
        const { absorption } = spaces.find(({ id }) => id === "control-room")!;
        if (absorption.kind === "surfaces") Object.assign(absorption, { model, objects: [{ name: "Sofa", area: [0.5, 0.5, 0.6, 0.7, 0.8, 0.9, 1, 1, 1] }] });
      });
      const { verdict } = answerOf(plan);
      const soakers = soakersOf(roomOf(plan, "control-room")!, verdict.spaces["control-room"])!;
      verdict.spaces["control-room"]!.absorption.forEach((area, band) => {
        expect(sumAt(soakers, band)).toBeCloseTo(area as number, 6);
        expect(sharesAt(soakers, band)!.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 9);
      });
      // The air takes little at 125 Hz and more at 8 kHz; were the surfaces' part wrong, it would be far off.
      const air = soakers.at(-1)!;
      expect(air.areas[2]!).toBeLessThan(0.02);
      expect(air.areas[8]!).toBeGreaterThan(0.5);
    }
  });

  it("cannot be told from own figures", () => {
    expect(soakersOf(roomOf(plumtreePlan, "live-room")!, plumtreeAnswer.verdict.spaces["live-room"])).toBeNull();
  });

  it("is unknown in a band where one surface is", () => {
    const plan = planWithParts(({ surfaces }) => {
      surfaces.find(({ spaceId }) => spaceId === "control-room")!.alpha[4] = null;
    });
    const soakers = soakersOf(roomOf(plan, "control-room")!, answerOf(plan).verdict.spaces["control-room"])!;
    expect(sharesAt(soakers, 4)).toBeNull();
    expect(sharesAt(soakers, 5)).not.toBeNull();
  });
});

describe("the plan of a room", () => {
  const live = plumtreePlan.spaces.find(({ id }) => id === "live-room")!;
  const studio = plumtreePlan.buildings.find(({ id }) => id === live.buildingId)!;

  it("is to one scale in both directions and holds every room of the storey", () => {
    const rooms = storeyOf(plumtreePlan, live);
    expect(rooms.map(({ id }) => id)).toEqual(["live-room", "control-room", "lobby"]);
    const { x, y, scale, width, height } = fitFragment(rooms, studio, { width: 600, most: 560 });
    expect(x(1) - x(0)).toBeCloseTo(scale, 0);
    expect(y(0) - y(1)).toBeCloseTo(scale, 0);
    for (const { box } of rooms) {
      expect(x(box.at[0])).toBeGreaterThanOrEqual(0);
      expect(x(box.at[0] + box.size[0])).toBeLessThanOrEqual(width);
      expect(y(box.at[1])).toBeLessThanOrEqual(height);
    }
  });

  it("sets no balloon on another, even where many things share a place", () => {
    const plan = planWithParts(({ sources }) => {
      const kit = sources[0]!;
      for (let count = 0; count < 8; count += 1) sources.push({ ...structuredClone(kit), id: `kit-${count}`, name: `Kit ${count}` });
    });
    const fragment = fitFragment(storeyOf(plan, live), studio, { width: 334, most: 440 });
    const balloons = placeBalloons(thingsIn(plan, live, "p1"), fragment);
    expect(balloons.length).toBeGreaterThan(10);
    balloons.forEach((one, index) =>
      balloons.slice(index + 1).forEach((other) => expect(Math.hypot(one.x - other.x, one.y - other.y)).toBeGreaterThanOrEqual(22)),
    );
  });
});

describe("taking a change back", () => {
  it("asks for nothing where nothing changed", () => {
    expect(restoreRoom(plumtreePlan, structuredClone(plumtreePlan), "control-room")).toEqual([]);
  });

  it("adds what went, removes what came and changes what differs", () => {
    const now = planWithParts((plan) => {
      const own = plan.surfaces.filter(({ spaceId }) => spaceId === "control-room");
      own[0]!.area = 1;
      plan.surfaces = [...plan.surfaces.filter(({ id }) => id !== own[1]!.id), { ...own[2]!, id: "new" }];
    });
    const acts = restoreRoom(plumtreePlan, now, "control-room").map(({ act }) => act);
    expect(acts.toSorted()).toEqual(["add", "change", "remove"]);
  });
});

describe("the air of a shut room", () => {
  it("rises by a textbook problem's figures: 0.3 l/min and 1 000 ppm ask for 8.33 l/s", () => {
    const breath = breathOf({ drumming: 0, sitting: 1 });
    expect(flowFor(1000, breath)! / 3.6).toBeCloseTo(8.33, 2);
    expect(flowFor(400, breath)).toBeNull();
  });

  it("asks for 29 l/s with four people in 30 m², as the standard's check does", () => {
    expect(standardFlow(4, 30) / 3.6).toBeCloseTo(29, 9);
  });

  it("nears what the flow leaves for good, and without flow rises by the breath over the volume", () => {
    const breath = breathOf({ drumming: 1, sitting: 1 });
    expect(carbonDioxide(60, { breath, flow: 0, volume: 45 })).toBeCloseTo(OUTDOORS + (1e6 * breath) / 45, 6);
    expect(carbonDioxide(100_000, { breath, flow: flowFor(1400, breath)!, volume: 45 })).toBeCloseTo(1400, 6);
    expect(carbonDioxide(30, { breath, flow: 140, volume: 45 })).toBeLessThan(carbonDioxide(30, { breath, flow: 0, volume: 45 }));
  });
});

describe("figures of one's own", () => {
  it("leave open what an empty room rings for, so that the change is not refused", () => {
    const judged = { ...plumtreeAnswer.verdict.spaces["live-room"]!, decay: [5527, 392.5, 30, 2.5, 1.20004, 1, 0.5, 0.01, "unknown" as const] };
    expect(ownFigures("decay", judged)).toEqual({ kind: "decay", seconds: [null, null, 30, 2.5, 1.2, 1, 0.5, null, null] });
  });

  it("of a place are kept where another one came back first", () => {
    expect(keepTyped([1, 2, null], [1, 0, 5], [0, 0, 5])).toEqual([1, 2, 5]);
    expect(keepTyped([null, null, 3], [1, 2, 3], null)).toEqual([1, 2, 3]);
  });
});
