import type { Plan } from "@/lib/noise/plan";
import type { Out, Station } from "@/lib/noise/verdict";
import type { PathKind } from "../format";
import type { Column } from "./columns";
import type { Reading } from "./reading";

/** One figure of the cross-cut: what the level is, and where. */
export interface StationWords {
  station: Station;
  level: Out;
  words: string;
}

const byElement: Partial<Record<string, string>> = {
  door: "by the door",
  window: "by the window",
  roof: "over the roof",
  ceiling: "over the roof",
  duct: "by the duct",
} satisfies Partial<Record<PathKind | "ceiling", string>>;

function sourceNoun(plan: Plan, id: string | null): string {
  const source = plan.sources.find((one) => one.id === id);
  const says = source?.says.replace(/^(your|our|the|my) /i, "");
  return says || source?.name.toLowerCase() || "source";
}

/** Less than this from the fence's line a listener stands on the other side of it, m. */
const AT_FENCE = 0.5;

function standsBehindFence({ receiver, weighed }: Reading): boolean {
  const stations = weighed.crossCut?.stations ?? [];
  const [fence, listener] = (["fence", "listener"] as const).map((wanted) => stations.find(({ kind }) => kind === wanted));
  return receiver.side === "far" && fence !== undefined && listener !== undefined && Math.abs(fence.along - listener.along) < AT_FENCE;
}

function listenerWords(reading: Reading): string {
  const { criterion, receiver } = reading;
  if (/^in bed\b/i.test(criterion?.place ?? "")) return "in bed";
  if (receiver.kind === "room") return "in the room";
  return standsBehindFence(reading) ? "behind it" : "at the listener";
}

function stationWords(reading: Reading, { kind, partId }: Station): string {
  if (kind === "source") return `at the ${sourceNoun(reading.plan, partId)}`;
  if (kind === "fence") return "at the fence";
  if (kind === "window") return "at the wall";
  if (kind === "listener") return listenerWords(reading);
  const element = reading.plan.elements.find(({ id }) => id === partId);
  return byElement[element?.kind ?? ""] ?? "by our wall";
}

function levelAt({ levels, dba, dbc }: Station, column: Column): Out {
  if (column.index !== null) return levels[column.index] ?? "unknown";
  return column.unit === "dB(C)" ? dbc : dba;
}

/** The stations with their figures in the lit column; a phone has room for three: source, fence, listener. */
export function stationsOf(reading: Reading, column: Column, few: boolean): StationWords[] {
  const all = reading.weighed.crossCut?.stations ?? [];
  const hasFence = all.some(({ kind }) => kind === "fence");
  const kept: Station["kind"][] = ["source", hasFence ? "fence" : "leaving", "listener"];
  return all
    .filter(({ kind }) => !few || kept.includes(kind))
    .map((station) => ({ station, level: levelAt(station, column), words: stationWords(reading, station) }));
}
