import { describe, expect, it } from "vitest";
import { addFromLibrary, freeName, goingWith, placeIn, restoreSource, setShare, spreadShape } from "@/components/sources/changes";
import { lastingWords, minutesIn, minutesShared, spansOf } from "@/components/sources/hours";
import { guessComma, readMeasurement } from "@/components/sources/readMeasurement";
import { loudestBand, sharesOf, totalOf } from "@/components/sources/spectrum";
import { sourceRecords } from "@/lib/noise/library";
import { aWeighted, WEIGHTS } from "@/lib/noise/weighting";
import { plumtreePlan } from "./fixtures/answers";

const NINE = [92, 104, 101, 99, 98, 97, 96, 94, 90];

describe("a pasted measurement", () => {
  it("is read where each band stands beside its level, with a title above and a comma in the figures", () => {
    const text = "Leq 4 min 10 s, 1 m, 9 Oct\n63 104,0   125 101,0   250 99,0   500 98,0\n1000 97,0   2000 96,0   4000 94,0   8000 90,0";
    expect(readMeasurement(text)).toEqual([null, ...NINE.slice(1)]);
  });

  it("is read where a row of bands stands over a row of levels", () => {
    expect(readMeasurement("Hz;31.5;63;125;250;500;1000;2000;4000;8000\ndB;92;104;101;99;98;97;96;94;90")).toEqual(NINE);
    expect(readMeasurement("63 125 250 500 1k 2k 4k 8k\n104.5 101 99 98 97 96 94 90")).toEqual([null, 104.5, ...NINE.slice(2)]);
  });

  it("is read with bands in kHz, a level that is also a band's name, and commas between figures", () => {
    expect(readMeasurement("31.5 Hz 92.5, 63 Hz 125.0, 125 Hz 63.0, 1 kHz 31.5")).toEqual([92.5, 125, 63, null, null, 31.5, null, null, null]);
    expect(readMeasurement("63,104.0\n125,101.0\n250,99.0")).toEqual([null, 104, 101, 99, null, null, null, null, null]);
  });

  it("is read as nine levels alone, or eight from 63 Hz", () => {
    expect(readMeasurement(NINE.join("\t"))).toEqual(NINE);
    expect(readMeasurement("kick, close to the door\n104 101 99 98 97 96 94 90")).toEqual([null, ...NINE.slice(1)]);
  });

  it("is nothing where there are no levels", () => {
    for (const text of ["", "the kit was loud", "3 4", "63 125 250"]) expect(readMeasurement(text), text).toBeUndefined();
  });

  it("takes a comma as decimal unless points mark decimals already", () => {
    expect(guessComma("31.5 92,0")).toBe("decimal");
    expect(guessComma("63,104.0")).toBe("separator");
  });
});

describe("hours of a day", () => {
  it("that pass midnight are two spans of it", () => {
    expect(spansOf({ from: "22:00", to: "07:00" })).toEqual([[1320, 1440], [0, 420]]);
    expect(minutesIn({ from: "22:00", to: "07:00" })).toBe(540);
    expect(spansOf({ from: "22:00", to: "00:00" })).toEqual([[1320, 1440]]);
  });

  it("overlap by the minutes that lie in both", () => {
    expect(minutesShared({ from: "18:00", to: "23:00" }, { from: "22:00", to: "07:00" })).toBe(60);
    expect(minutesShared({ from: "10:00", to: "12:00" }, { from: "22:00", to: "07:00" })).toBe(0);
    expect(lastingWords(150)).toBe("2\u00a0h 30\u00a0min");
    expect(lastingWords(1)).toBe("1 minute");
  });
});

describe("energy of a spectrum", () => {
  it("adds up to a whole, in which an unknown band has no part", () => {
    const shares = sharesOf([null, 100, 100, null, null, null, null, null, null]);
    expect(shares.slice(0, 4)).toEqual([0, 0.5, 0.5, 0]);
    expect(totalOf([100, 100])).toBeCloseTo(103.01, 2);
    expect(loudestBand([null, 90, 95, 95, null, null, null, null, null])).toBe(2);
    expect(loudestBand(null)).toBeNull();
  });
});

describe("what is done to the sources", () => {
  const [kit] = plumtreePlan.sources;

  it("a source of the library is at work in every situation, under a name that is free", () => {
    const record = sourceRecords[0]!;
    const [added, ...situations] = addFromLibrary(plumtreePlan, record, placeIn(plumtreePlan, "live-room"));
    expect(added).toMatchObject({ act: "add", part: "sources", values: { libraryKey: record.key, spaceId: "live-room", position: [-2.15, 0, 0.8] } });
    expect(situations).toHaveLength(plumtreePlan.situations.length);
    expect(situations[0]).toMatchObject({ patch: { playing: [...plumtreePlan.situations[0]!.playing, { sourceId: "new:source", share: 1 }] } });
    expect(freeName(plumtreePlan, kit!.name)).toBe(`${kit!.name} 2`);
  });

  it("a removed fan comes back with its mouths and its shares", () => {
    expect(goingWith(plumtreePlan, "fan")).toEqual({ mouths: 2, incidences: 0, situations: 1 });
    const without = {
      ...plumtreePlan,
      sources: plumtreePlan.sources.filter(({ id }) => id !== "fan"),
      outlets: [],
      situations: plumtreePlan.situations.map((one) => ({ ...one, playing: one.playing.filter(({ sourceId }) => sourceId !== "fan") })),
    };
    const back = restoreSource(plumtreePlan, without, "fan");
    expect(back.map((change) => `${change.act} ${change.part}`)).toEqual(["add sources", "add outlets", "add outlets", "change situations"]);
    expect(back[1]).toMatchObject({ values: { sourceId: "new:back", name: plumtreePlan.outlets[0]!.name } });
    expect(JSON.stringify(back)).not.toContain('"fan"}');
  });

  it("a distance that was given to a removed source comes back with it", () => {
    const given = { ...plumtreePlan, receivers: plumtreePlan.receivers.map((one, i) => (i === 0 ? { ...one, distances: { kit: 3 } } : one)) };
    const now = { ...given, receivers: plumtreePlan.receivers };
    expect(restoreSource(given, now, "kit")).toContainEqual({ act: "change", part: "receivers", id: "no9-bedroom", patch: { distances: { "new:back": 3 } } });
  });

  it("a share is set in its place, and switching off takes only that source", () => {
    const situation = plumtreePlan.situations[0]!;
    const half = setShare(situation, "bass-amp", 0.5)[0]! as unknown as { patch: { playing: unknown[] } };
    expect(half.patch.playing[1]).toEqual({ sourceId: "bass-amp", share: 0.5 });
    const off = setShare(situation, "kit", null)[0]! as unknown as { patch: { playing: { sourceId: string }[] } };
    expect(off.patch.playing.map(({ sourceId }) => sourceId)).toEqual(["bass-amp", "condenser", "fan"]);
  });

  it("one figure in dB(A) spread over the street's shape is that figure again", () => {
    const { shape } = sourceRecords.find(({ key }) => key === "traffic-road")!;
    expect(Math.abs(aWeighted(spreadShape(shape!, 55, Array.from(WEIGHTS.A)).map(Number)) - 55)).toBeLessThan(0.05);
  });
});
