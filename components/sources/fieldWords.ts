import type { Plan } from "@/lib/noise/plan";
import { formatQuantity, withUnit } from "../format";
import type { FieldWords } from "../plan/SaveNotices";

const labels: Record<string, string> = {
  name: "Name", says: "What the sentence calls it", kind: "Kind", spaceId: "Room", position: "Place", power: "Levels", deviation: "Doubt",
  hours: "Hours", params: "Directivity", playing: "What plays", levels: "Levels", directivity: "Directivity", measured: "Your measurement", libraryKey: "Library",
};

/** How the fields of this page are called and written where two people changed one. */
export function sourceFieldWords({ spaces, sources }: Plan): FieldWords {
  return (_, field, value) => ({ label: labels[field] ?? field, value: valueWords(field, value) });

  function valueWords(field: string, value: unknown): string {
    if (field === "spaceId") return spaces.find(({ id }) => id === value)?.name ?? "no room";
    if (field === "playing" && Array.isArray(value)) return value.map((one: { sourceId: string; share: number }) => `${sources.find(({ id }) => id === one.sourceId)?.name ?? "a source"} ${Math.round(one.share * 100)} %`).join(", ") || "nothing";
    if (Array.isArray(value)) return value.map((one) => (typeof one === "number" ? formatQuantity(one, 1) : (one ?? "unknown"))).join(" · ");
    if (field === "params" && typeof value === "object" && value) return Object.values(value).map((one) => formatQuantity(Number(one))).join(", ");
    if (field === "hours" && value) return `${(value as { from: string }).from} to ${(value as { to: string }).to}`;
    if (field === "measured") return "the levels you read";
    if (typeof value === "number") return withUnit(formatQuantity(value), "dB");
    return typeof value === "string" && value ? value : "not given";
  }
}
