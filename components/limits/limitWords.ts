import type { Criterion } from "@/lib/noise/plan";
import { formatQuantity, withUnit } from "../format";

/** How a limit is written: nine levels, the number of a family of curves, one weighted figure, the night plus a figure. */
export const LIMIT_FORMS = ["bands", "number", "figure", "above"] as const;
export type LimitForm = (typeof LIMIT_FORMS)[number];

export const formWords: Record<LimitForm, string> = {
  bands: "Nine bands",
  number: "NC or NR",
  figure: "One figure",
  above: "Above the night",
};

export function formOf({ metric, above }: Pick<Criterion, "metric" | "above">): LimitForm {
  if (metric === "NC" || metric === "NR") return "number";
  if (metric === "dBA" || metric === "dBC") return "figure";
  return above === null ? "bands" : "above";
}

export const weightedWords = { dBA: "dB(A)", dBC: "dB(C)" } as const;

/** Name of a limit that was given none of its own: "NC-25", "30 dB(A)", "The night plus 5 dB". */
export function plainName({ metric, value, above }: Pick<Criterion, "metric" | "value" | "above">): string {
  const figure = value === null ? "?" : formatQuantity(value);
  if (metric === "NC") return `NC-${figure}`;
  if (metric === "NR") return `NR ${figure}`;
  if (metric === "dBA" || metric === "dBC") return `${figure} ${weightedWords[metric]}`;
  return above === null ? "Own figures" : `The night plus ${formatQuantity(above)} dB`;
}

/** What is weighed against, in a few words. */
export function figureWords(limit: Pick<Criterion, "metric" | "value" | "above" | "levels">): string {
  if (limit.metric !== "curve") return limit.value === null ? "no figure yet" : plainName(limit);
  const known = limit.levels?.filter((level) => level !== null).length ?? 0;
  if (known === 0) return "no figures yet";
  if (limit.above !== null) return `the night plus ${withUnit(formatQuantity(limit.above), "dB")}`;
  return known === 9 ? "nine bands" : `${known} of nine bands`;
}

export const hoursWords = (hours: Criterion["hours"]): string => (hours ? `${hours.from} to ${hours.to}` : "at all hours");

export const averagingWords: Record<Criterion["averaging"], string> = {
  loudest: "Loudest quarter hour",
  whole: "Whole time it holds",
};

export const windowWords = { shut: "Shut", ajar: "Ajar", open: "Open" } as const;

export const indoorsWords = (indoors: boolean | null): string => (indoors === null ? "not said" : indoors ? "indoors" : "outdoors");

/** "By-law 14, clause 3; from memory, not read". */
export function documentWords({ document, clause, memory }: Criterion["provenance"]): string {
  return [[document, clause].filter(Boolean).join(", "), memory && "from memory, not read"].filter(Boolean).join("; ");
}

/** A day as it is read aloud: "1 March 2024". The day itself, wherever the reader is. */
export const dayWords = (day: string): string =>
  new Intl.DateTimeFormat("en-GB", { timeZone: "UTC", dateStyle: "long" }).format(new Date(`${day}T12:00:00Z`));

/** Where and how it is taken, in one line under a heading. */
export function takenWords({ place, window, hours }: Pick<Criterion, "place" | "window" | "hours">): string {
  const ajar = window && !/\bwindow/i.test(place) ? `window ${window}` : "";
  return [place, ajar, hoursWords(hours)].filter(Boolean).join(", ");
}

