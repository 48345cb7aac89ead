import { formatNumber, marginWords, wholeDecibels, withUnit } from "../format";
import { clockWords, holdsAt } from "./hours";
import type { BuildKey, LandingBuild, Night } from "./LandingBuild";

interface BuildWords {
  /** On its card. */
  label: string;
  /** "At 23:00, with a heavier door: ..." */
  inSentence: string;
}

export const buildWords: Record<BuildKey, BuildWords> = {
  a: { label: "As drawn", inSentence: "as drawn" },
  b: { label: "Heavier door", inSentence: "with a heavier door" },
  c: { label: "Door and ceiling", inSentence: "with that door and a ceiling of its own" },
};

/** The lines of a card: what is new in this build, in the words of the catalogue. */
export function madeWords({ key, door, roof }: LandingBuild): string {
  if (key === "c") return `The heavier door, and above: ${roof.name.charAt(0).toLowerCase()}${roof.name.slice(1)}`;
  return door.name;
}

export interface VerdictWords {
  before: string;
  figure: string;
  after: string;
  line: string;
}

const hoursWords = ({ from, to }: Night): string => `${clockWords(from)} to ${clockWords(to)}`;

function nightWords(build: LandingBuild, asDrawn: LandingBuild): string {
  const allowed = `${withUnit(wholeDecibels(build.level), "dB")} in bed ${build.where}, ${wholeDecibels(build.limit)} allowed, give or take ${withUnit(formatNumber(build.doubt), "dB")}.`;
  const before = build.key === asDrawn.key ? "" : ` As drawn it was ${wholeDecibels(asDrawn.level)}.`;
  return `${allowed}${before}`;
}

function dayWords(build: LandingBuild, night: Night): string {
  const arrives = `${withUnit(wholeDecibels(build.level), "dB")} still arrive in bed ${build.where}, but the limit of this example speaks of ${hoursWords(night)} only.`;
  return `${arrives} What holds earlier is yours to find out and to add.`;
}

/** The verdict of a build at an hour of the evening; outside the hours of the limit nothing is over or under. */
export function verdictWords(build: LandingBuild, asDrawn: LandingBuild, night: Night, minutes: number): VerdictWords {
  const before = `At ${clockWords(minutes)}, ${buildWords[build.key].inSentence}: `;
  if (!holdsAt(night, minutes)) return { before, figure: "no limit holds", after: ".", line: dayWords(build, night) };
  return { before, figure: marginWords(build.state, build.margin), after: ".", line: nightWords(build, asDrawn) };
}
