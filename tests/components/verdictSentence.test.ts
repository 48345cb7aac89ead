import { describe, expect, it } from "vitest";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import { inSentence } from "@/components/verdict/chartWords";
import { bandRangeWords, lowestIsWorse } from "@/components/verdict/notesWords";
import { readingOf } from "@/components/verdict/reading";
import { slabWordsOf, type SlabWords } from "@/components/verdict/sentence";
import { dellEndAnswer, plumtreeAnswer, readPlumtree } from "./fixtures/answers";
import { buildAnswer, planWith } from "./fixtures/wallsAnswer";
import { buildNo9, buildReceiver, buildVerdict, no9Lowered, no9Wanted } from "./fixtures/demoVerdict";

const plain = (text: string) => text.replaceAll("\u00a0", " ");
const sentence = ({ before, figure, after }: SlabWords) => plain(before + figure + after);
const wordsOf = (receiver: ReturnType<typeof buildNo9>) => slabWordsOf(readPlumtree(buildVerdict([receiver])));
const all = ({ lines, notes }: SlabWords) => plain([...lines, ...notes].join(" "));

describe("the sentence of a verdict", () => {
  it("says of the worked example how much it is over, and that the doubt reaches across the limit", () => {
    const words = slabWordsOf(readPlumtree(plumtreeAnswer.verdict));
    expect(sentence(words)).toBe("On a still night at 23:00 your kit will be 4 dB over what next door’s bedroom may hear, give or take 5 dB.");
    expect(words.figure).toBe("4\u00a0dB over");
    expect(all(words)).toContain("The kick drum does it, at 63 Hz, and it leaves by the roof and the yard door in nearly equal parts. Treat only one of them and you are still over.");
  });

  it("calls a margin inside the doubt a maybe", () => {
    const words = wordsOf(no9Lowered(6));
    expect(sentence(words)).toBe("On a still night at 23:00 your kit will be 2 dB under what next door’s bedroom may hear, which is inside the doubt of the estimate.");
    expect(all(words)).toContain("Treat it as a maybe.");
  });

  it("never promises silence where there is room left", () => {
    const words = wordsOf(no9Lowered(14));
    expect(sentence(words)).toBe("On a still night at 23:00 your kit will be 10 dB under what next door’s bedroom may hear.");
    expect(all(words)).toContain("Under the limit does not mean unheard.");
  });

  it("says at least, and where, when a part that nobody has measured could add to it", () => {
    const hollow = buildAnswer({ plan: planWith("yard-door", "door-hollow-44") });
    const words = slabWordsOf(readPlumtree(hollow.verdict));
    expect(plain(words.figure)).toMatch(/^at least \d+ dB over$/);
    expect(all(words)).toContain("Not known in full at 63 Hz and 8 kHz: there it may be more.");
  });

  it("leaves out give or take where the excess is beyond the doubt", () => {
    const words = wordsOf(no9Lowered(-9));
    expect(sentence(words)).not.toContain("give or take");
    expect(all(words)).toContain("Even with both of them silent you would be over.");
  });

  it("names one way out where one carries nearly everything, and says that its silence would do", () => {
    const [roof, door] = no9Wanted.paths;
    const quietRoof = { ...roof!, levels: roof!.levels.map((level) => level! - 25) };
    const words = wordsOf(buildNo9({ paths: [quietRoof, { ...door!, levels: door!.levels.map((level) => level! + 3) }] }));
    expect(all(words)).toContain("it leaves by the yard door. With the yard door silent you would be under.");
  });

  it("promises nothing of one path's silence while another band stays over", () => {
    const [roof, door] = no9Wanted.paths;
    const shrill = { ...door!, levels: door!.levels.map((level, index) => level! + (index === 6 ? 30 : 0)) };
    const words = all(wordsOf(buildNo9({ paths: [roof!, shrill] })));
    expect(words).toContain("at 2 kHz");
    expect(words).toContain("Silence the yard door alone and you are still over, at 63 Hz.");
    expect(words).not.toContain("you would be under");
  });

  it("speaks of a limit in dB(A) as of the whole", () => {
    const reading = readingOf(dellEndAnswer.plan, dellEndAnswer.verdict, null)!;
    const words = slabWordsOf(reading);
    expect(all(words)).toContain("The limit is 30 dB(A) for the whole.");
    expect(all(words)).toContain("The largest part of the sound lies at 500 Hz");
    expect(all(words)).not.toContain("nearest to the limit");
  });

  it("asks for a limit where there is none", () => {
    const words = wordsOf(buildNo9({ limits: null, criterionId: null }));
    expect(sentence(words)).toBe("No limit yet for No. 9, bedroom.");
    expect(all(words)).toBe("Choose one for this listener, or type your own nine figures.");
  });

  it("names the bands that lack a level, and gives no figure", () => {
    const paths = no9Wanted.paths.map((path) => ({ ...path, levels: path.levels.map((level, index) => (index === 8 ? null : level! - 14)) }));
    const words = wordsOf(buildReceiver({ ...no9Wanted, paths }));
    expect(words.figure).toBe("");
    expect(sentence(words)).toBe("Not weighed yet: No. 9, bedroom.");
    expect(all(words)).toContain("Without a full level above 4 kHz");
  });

  it("adds a line for 31.5 Hz only where it is worse, and for what rests on estimates", () => {
    const loudLow = buildNo9({ paths: no9Wanted.paths.map((path) => ({ ...path, levels: path.levels.map((level, index) => (index === 0 ? level! + 8 : level! - 14)) })) });
    expect(lowestIsWorse(loudLow)).toBe(true);
    expect(all(wordsOf(loudLow))).toContain("At 31.5 Hz it is 7 dB over; that band is shown but does not decide.");
    expect(all(wordsOf(no9Lowered(14)))).not.toContain("31.5");
    expect(all(wordsOf(no9Lowered(14)))).toContain("Rests on estimates: the roof below 125 Hz.");
  });
});

describe("words for bands and names", () => {
  it.each([
    [[31.5, 63], "below 125 Hz"],
    [[4000, 8000], "above 2 kHz"],
    [[125, 250, 500], "from 125 Hz to 500 Hz"],
    [[63, 1000], "at 63 Hz and 1 kHz"],
    [[...OCTAVE_BANDS], "in every band"],
  ] as const)("%j is %s", (bands, words) => {
    expect(plain(bandRangeWords(bands))).toBe(words);
  });

  it("puts a name into a sentence without losing a house number", () => {
    expect(inSentence("Yard door")).toBe("the yard door");
    expect(inSentence("No. 9, bedroom window")).toBe("the No. 9, bedroom window");
    expect(inSentence("Our small bedroom")).toBe("our small bedroom");
  });
});
