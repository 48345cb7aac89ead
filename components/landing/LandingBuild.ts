import type { CrossCut, State } from "@/lib/noise/verdict";
import type { StationWords } from "../verdict/stations";

/** Which of the three; the words of the page's address. */
export const BUILD_KEYS = ["a", "b", "c"] as const;
export type BuildKey = (typeof BUILD_KEYS)[number];

/** A leaf or a ceiling as its layers make it. */
export interface Made {
  name: string;
  /** m */
  thickness: number | null;
  /** kg/m² */
  surfaceMass: number | null;
}

/** One way the path's share reads: "Roof", 48 %. */
export interface Share {
  kind: "wall" | "roof" | "floor" | "window" | "outdoor unit" | "duct" | "leak" | "door" | "flanking" | "in the room";
  name: string;
  share: number;
}

/** One build of the example with what was weighed for the bed next door. */
export interface LandingBuild {
  key: BuildKey;
  state: State;
  margin: number;
  doubt: number;
  /** "at 63 Hz" */
  where: string;
  /** Of the deciding band, in bed. */
  level: number;
  limit: number;
  door: Made;
  roof: Made;
  shares: Share[];
  cut: CrossCut;
  stations: StationWords[];
}

/** Hours of the example's limit, in minutes from midnight. */
export interface Night {
  from: number;
  to: number;
}
