import type { FieldWords } from "../plan/SaveNotices";
import { averagingWords, documentWords, hoursWords, indoorsWords } from "./limitWords";

const labels: Record<string, string> = {
  name: "Name", says: "In a sentence", kind: "Where they listen", spaceId: "Room", position: "Place", side: "Side of the fence", facade: "On the face of a house",
  metric: "Measured how", value: "Figure", levels: "Nine figures", edition: "Edition", above: "Above the night", averaging: "Averaged over", hours: "Hours", place: "In words",
  clauseText: "Clause", inForce: "In force since", readOn: "Read on", indoors: "Where it is checked", window: "Their window", background: "The night itself",
  backgroundSays: "How the night was come by", provenance: "Where it stands", libraryKey: "Library",
};

const writers: Record<string, (value: never) => string> = {
  hours: hoursWords,
  provenance: documentWords,
  indoors: indoorsWords,
  averaging: (value) => averagingWords[value],
};

/** A field and its value as both sides of a conflict name them. */
export const fieldWords: FieldWords = (_, field, value) => ({ label: labels[field] ?? field, value: valueWords(field, value) });

function valueWords(field: string, value: unknown): string {
  const write = writers[field];
  if (write && value !== undefined && (value !== null || field === "hours" || field === "indoors")) return write(value as never); // each writer stands beside the field whose values it knows
  if (value === null || value === undefined || value === "") return "not said";
  if (typeof value === "boolean") return value ? "yes" : "no";
  return Array.isArray(value) ? value.map((each) => each ?? "?").join(" · ") : String(value);
}
