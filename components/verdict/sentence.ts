import { FIRST_JUDGED, OCTAVE_BANDS, type Band } from "@/lib/noise/bands";
import type { ReceiverVerdict } from "@/lib/noise/verdict";
import { capitalise, formatNumber, marginWords, wholeDecibels, withUnit } from "../format";
import { causeWords, MOST, nearestWords, remedyWords, settleWords } from "./causeWords";
import { inSentence } from "./chartWords";
import { weightedUnit } from "./columns";
import { bandRangeWords, lowestWords, restsOnWords } from "./notesWords";
import type { Reading } from "./reading";

/** The sentence in three pieces, so that the figure can be lit, and the lines under it. */
export interface SlabWords {
  place: string;
  before: string;
  figure: string;
  after: string;
  lines: string[];
  notes: string[];
}

const typeset = (words: string) => words.replaceAll("'", "\u2019");

/** Where and how it is taken: "No. 9, bedroom. In bed, window ajar, 22:00 to 07:00, loudest quarter hour." */
function placeWords({ receiver, criterion }: Reading): string {
  if (!criterion) return `${receiver.name}.`;
  const hours = criterion.hours ? `${criterion.hours.from} to ${criterion.hours.to}` : "";
  const parts = [criterion.place, hours].filter(Boolean).join(", ");
  return typeset(`${receiver.name}.${parts ? ` ${capitalise(parts)}.` : ""}`);
}

function subjectOf({ plan, weighed: { facts } }: Reading): string {
  const source = plan.sources.find(({ id }) => id === facts.sourceId);
  if (!source || facts.sourceShare < MOST) return "your studio";
  return source.says || inSentence(source.name);
}

function mayHear({ receiver }: Reading): string {
  if (!receiver.says) return `what ${inSentence(receiver.name)} may hear`;
  return receiver.says.startsWith("what ") ? receiver.says : `what ${receiver.says} may hear`;
}

function wholeWords({ weighed: { weighted, metric } }: Reading): string {
  return weighted ? `The limit is ${withUnit(wholeDecibels(weighted.limit), weightedUnit(metric))} for the whole.` : "";
}

/** Judged bands whose level is not known in full: the known parts alone may be over already. */
function openBands({ bands }: ReceiverVerdict): Band[] {
  return bands.slice(FIRST_JUDGED).flatMap(({ band, level }) => (level === "unknown" ? [band] : []));
}

function figureWords(weighed: ReceiverVerdict, margin: number): string {
  const words = marginWords(weighed.state === "tight" ? "under" : weighed.state, margin);
  return weighed.state === "over" && openBands(weighed).length > 0 ? `at least ${words}` : words;
}

function openWords({ weighed }: Reading): string {
  const open = openBands(weighed);
  return open.length > 0 ? `Not known in full ${bandRangeWords(open)}: there it may be more.` : "";
}

function weighedWords(reading: Reading, margin: number): Pick<SlabWords, "before" | "figure" | "after"> {
  const { state, doubt } = reading.weighed;
  const head = reading.situation?.says || "As drawn";
  const wide = state === "over" && doubt !== null && doubt > Math.abs(margin);
  const tails = {
    over: wide ? `, give or take ${withUnit(formatNumber(doubt), "dB")}.` : ".",
    tight: ", which is inside the doubt of the estimate.",
    under: ".",
    "not weighed": ".",
  };
  return {
    before: typeset(`${head} ${subjectOf(reading)} will be `),
    figure: figureWords(reading.weighed, margin),
    after: typeset(` ${margin === 0 ? "of " : ""}${mayHear(reading)}${tails[state]}`),
  };
}

/** What keeps a listener from being weighed: the notes of the verdict, those of this listener first. */
function missingWords({ verdict, receiver, weighed }: Reading): string[] {
  const own = verdict.notes.filter(({ partId }) => partId === receiver.id);
  const notes = [...own, ...verdict.notes.filter((note) => !own.includes(note))].slice(0, 2).map(({ text }) => text);
  const missing = weighed.bands.filter(({ state }) => state === "not weighed").map(({ band }) => band);
  const bands = missing.length > 0 && missing.length < OCTAVE_BANDS.length ? `Without a full level ${bandRangeWords(missing)}; the other bands are drawn.` : "";
  return [...notes, bands].filter(Boolean);
}

function unweighedWords(reading: Reading): SlabWords {
  const { receiver, weighed } = reading;
  const shared = { place: placeWords(reading), figure: "", after: "", notes: [] };
  if (weighed.metric === "none") {
    return { ...shared, before: `No limit yet for ${receiver.name}.`, lines: ["Choose one for this listener, or type your own nine figures."] };
  }
  return { ...shared, before: `Not weighed yet: ${receiver.name}.`, lines: missingWords(reading) };
}

function linesOf(reading: Reading): string[] {
  const { state, doubt, margin } = reading.weighed;
  if (state === "over") {
    const wide = doubt !== null && margin !== null && doubt > Math.abs(margin);
    return [`${causeWords(reading)} ${remedyWords(reading)}`, wholeWords(reading), wide ? settleWords(reading) : ""];
  }
  if (state === "tight") return [`Treat it as a maybe. ${nearestWords(reading)}`, wholeWords(reading), settleWords(reading)];
  return [`Under the limit does not mean unheard. ${nearestWords(reading)}`, wholeWords(reading)];
}

/** The verdict in words a drummer can read aloud to the neighbour. */
export function slabWordsOf(reading: Reading): SlabWords {
  const { weighed } = reading;
  if (weighed.state === "not weighed" || weighed.margin === null) return unweighedWords(reading);
  const lines = linesOf(reading).map((words) => typeset(words.trim())).filter(Boolean);
  const notes = [openWords(reading), lowestWords(reading), restsOnWords(reading)].map(typeset).filter(Boolean);
  return { ...weighedWords(reading, weighed.margin), place: placeWords(reading), lines, notes };
}

export const noListenerWords: SlabWords = {
  place: "",
  before: "Nobody listens here yet.",
  figure: "",
  after: "",
  lines: ["Add a listener to weigh it."],
  notes: [],
};
