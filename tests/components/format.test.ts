import { OCTAVE_BANDS } from "@/lib/noise/bands";
import { describe, expect, it } from "vitest";
import {
  bandWords, countWords, formatBand, formatNumber, formatQuantity, listWords, marginWords, oneDecimal, parseNumber,
  percent, percentSpent, poiseLabel, spentOf, spokenFigure, timesWords, wholeDecibels,
} from "@/components/format";
import { momentWords } from "@/components/moments";

/** The no-break space as a plain one, so that expectations can be read. */
const plain = (text: string) => text.replaceAll("\u00a0", " ");

describe("numbers", () => {
  it("group thousands with a no-break space and write a real minus", () => {
    expect(formatNumber(9200)).toBe("9\u00a0200");
    expect(formatNumber(1234567)).toBe("1\u00a0234\u00a0567");
    expect(formatNumber(-2.84, 1)).toBe("\u22122.8");
  });

  it("never show a minus before nothing", () => {
    expect(wholeDecibels(-0.4)).toBe("0");
    expect(oneDecimal(-0.04)).toBe("0.0");
  });

  it("show as many decimals as a quantity has", () => {
    expect(formatQuantity(277)).toBe("277");
    expect(formatQuantity(15.6)).toBe("15.6");
    expect(formatQuantity(100)).toBe("100");
    expect(formatQuantity(0.05)).toBe("0.05");
  });

  it("say silence and what is not known in words", () => {
    expect(wholeDecibels("silent")).toBe("silent");
    expect(oneDecimal("unknown")).toBe("\u2013");
    expect(oneDecimal(null)).toBe("\u2013");
    expect(spokenFigure("unknown")).toBe("unknown");
    expect(spokenFigure(-2.8, 1)).toBe("minus 2.8");
  });
});

describe("what a person types", () => {
  it.each([
    ["25", 25], ["2,5", 2.5], ["2.5", 2.5], [" 9\u00a0200 ", 9200], ["\u22123", -3], ["-3,25", -3.25], [".5", 0.5],
  ])("%j is %d", (text, value) => expect(parseNumber(text)).toBe(value));

  it.each(["", "a", "1,2,3", "1.234,5", "12mm", "1e5", "Infinity"])("%j is no number", (text) =>
    expect(parseNumber(text)).toBeUndefined(),
  );
});

describe("bands", () => {
  it("have the names of the axis", () => {
    expect(OCTAVE_BANDS.map(formatBand)).toEqual(["31.5", "63", "125", "250", "500", "1k", "2k", "4k", "8k"]);
  });

  it("have a unit in a sentence", () => {
    expect(plain(bandWords(63))).toBe("63 Hz");
    expect(plain(bandWords(4000))).toBe("4 kHz");
  });
});

describe("margins", () => {
  it.each([
    ["over", -2.8, "3 dB over"], ["over", -0.2, "less than 1 dB over"], ["tight", 1.4, "1 dB under, tight"],
    ["tight", 0.3, "less than 1 dB under, tight"], ["tight", 0, "at the limit, tight"], ["under", 6.2, "6 dB under"],
    ["not weighed", undefined, "not weighed"], ["not weighed", 4, "not weighed"], ["over", "unknown", "over"],
  ] as const)("%s by %s reads as %j", (state, margin, text) => expect(plain(marginWords(state, margin))).toBe(text));

  it("are short beside a poise", () => {
    expect(poiseLabel("over", -2.8)).toBe("3 over");
    expect(poiseLabel("tight", 0.3)).toBe("<1");
    expect(poiseLabel("under", 13)).toBe("13");
    expect(poiseLabel("not weighed")).toBe("\u2013");
  });

  it("become parts of the allowance", () => {
    expect(spentOf(0)).toBe(1);
    expect(plain(percentSpent(-2.8))).toBe("191 %");
    expect(plain(percentSpent(13))).toBe("5 %");
    expect(plain(percent(0.002))).toBe("<1 %");
    expect(plain(percent(0))).toBe("0 %");
    expect(plain(timesWords(spentOf(-2.8)))).toBe("1.9 times");
    expect(plain(timesWords(7.02))).toBe("7 times");
    expect(plain(timesWords(12.6))).toBe("13 times");
  });
});

describe("words", () => {
  it("count", () => {
    expect(countWords(1, "yard")).toBe("one yard");
    expect(countWords(4, "yard")).toBe("four yards");
    expect(countWords(40, "yard")).toBe("40 yards");
    expect(listWords(["Ines", "Tobi", "Maro"])).toBe("Ines, Tobi and Maro");
  });

  it("tell the day by the clock of the yard", () => {
    const now = "2027-01-14T23:30:00Z";
    expect(momentWords("2027-01-14T23:10:00Z", now, "Europe/Berlin")).toBe("today 00:10");
    expect(momentWords("2027-01-14T20:04:00Z", now, "Europe/Berlin")).toBe("yesterday 21:04");
    expect(momentWords("2027-01-14T20:04:00Z", now, "UTC")).toBe("today 20:04");
    expect(momentWords("2026-05-12T09:00:00Z", now, "UTC")).toBe("12 May 2026");
  });
});
