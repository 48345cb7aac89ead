import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { Criterion, Plan, Receiver } from "@/lib/noise/plan";
import type { Verdict } from "@/lib/noise/verdict";
import { bandWords, capitalise, formatNumber, listWords, wholeDecibels, withUnit } from "../format";
import type { LimitLibrary } from "./limitPatches";
import { weightedWords } from "./limitWords";

export interface LimitCaution {
  heading: string;
  words: string;
  /** The element that would have to be drawn otherwise. */
  elementId?: string;
}

interface Facts {
  plan: Plan;
  verdict: Verdict;
  listener: Receiver;
  limit: Criterion;
  library: LimitLibrary;
}

/** Windows of the listener's room with what they stop as they are drawn. */
export function windowsOf({ plan, verdict, listener }: Pick<Facts, "plan" | "verdict" | "listener">) {
  if (listener.kind !== "room" || !listener.spaceId) return [];
  const faces = new Set(plan.paths.filter(({ fromSpaceId, toSpaceId }) => [fromSpaceId, toSpaceId].includes(listener.spaceId)).map(({ id }) => id));
  return plan.elements.flatMap((element) => {
    if (element.kind !== "window" || !faces.has(element.pathId)) return [];
    const stops = verdict.elements[element.id]?.loss[OCTAVE_BANDS.indexOf(63)] ?? "unknown";
    return [{ id: element.id, name: element.name, open: element.params.openArea, area: element.area, stops }];
  });
}

/** "As drawn it stops 13 dB at 63 Hz, 0.25 m² of it open." */
export function windowAsDrawnWords({ name, open, stops }: ReturnType<typeof windowsOf>[number]): string {
  const state = open > 0 ? `${withUnit(formatNumber(open, 2), "m²")} of it open` : "shut";
  const figure = typeof stops === "number" ? `stops ${withUnit(wholeDecibels(stops), "dB")} at ${bandWords(63)}` : "has no figure";
  return `${capitalise(name)}, as drawn, ${figure}, ${state}.`;
}

function windowCaution(facts: Facts): LimitCaution[] {
  const { window } = facts.limit;
  const windows = windowsOf(facts);
  if (!window || windows.length === 0) return [];
  const drawnShut = windows.every(({ open }) => open === 0);
  if (drawnShut === (window === "shut")) return [];
  const [first] = windows;
  return [
    {
      heading: "The drawing has their window otherwise",
      words: `The clause speaks of a window ${window}. ${windowAsDrawnWords(first!)} The verdict goes by the drawing: change the window there, or the clause here.`,
      elementId: first!.id,
    },
  ];
}

function placeCaution({ limit, listener }: Facts): LimitCaution[] {
  if (limit.indoors === null || limit.indoors === (listener.kind === "room")) return [];
  const [checked, listens] = limit.indoors ? ["indoors", "outdoors"] : ["outdoors", "in a room"];
  return [{ heading: "Checked in another place", words: `The clause is checked ${checked}; this listener is ${listens}. The verdict is taken where the listener is.` }];
}

function bassCaution({ limit, library }: Facts): LimitCaution[] {
  if (limit.metric !== "dBA") return [];
  const less = withUnit(formatNumber(Math.abs(library.at63.dBA), 0), "dB");
  return [
    {
      heading: "One figure hides the bass",
      words: `${weightedWords.dBA} counts a kick drum’s 63\u00a0Hz ${less} less than it is (IEC 61672-1). A neighbour in bed may hear what this figure passes: agree on nine bands if you can.`,
    },
  ];
}

function gapCaution({ limit }: Facts): LimitCaution[] {
  if (limit.metric !== "curve") return [];
  const gaps = OCTAVE_BANDS.filter((_, band) => (limit.levels?.[band] ?? null) === null);
  if (gaps.length === 0) return [];
  if (gaps.length === OCTAVE_BANDS.length) return [{ heading: "No figure yet", words: "Type at least the bands the clause names. Until then this limit weighs nothing." }];
  return [{ heading: "Bands without a limit", words: `Nothing is allowed or forbidden at ${listWords(gaps.map(bandWords))}: there nothing is weighed.` }];
}

function memoryCaution({ limit }: Facts): LimitCaution[] {
  if (!limit.provenance.memory) return [];
  return [{ heading: "From memory", words: `Nobody has read ${limit.provenance.document} for this. Read it before anything is built on it.` }];
}

/** What is likely to be wrong with a limit, where the mistake is made. */
export const limitCautionsOf = (facts: Facts): LimitCaution[] => [
  ...gapCaution(facts),
  ...windowCaution(facts),
  ...placeCaution(facts),
  ...bassCaution(facts),
  ...memoryCaution(facts),
];
