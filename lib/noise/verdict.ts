import type { Band } from "./bands";
import type { PathKind } from "./elements/kind";
import type { Basis } from "./spectrum";

/**
 * The answer of `solve`, as it leaves the core. Silence and unknown are words here, never null or 0.
 * `margin = allowed - level`; positive is good. A listener's margin is the least over 63-8000 Hz.
 */
export type Out = number | "silent" | "unknown";
/** Nine bands, 31.5 Hz to 8 kHz. */
export type OutSpectrum = Out[];

/** The one exit from arithmetic: what is not finite becomes a word. +Infinity is a loss or margin without sound. */
export function toOut(value: number): Out {
  if (Number.isNaN(value)) return "unknown";
  return Number.isFinite(value) ? value + 0 : "silent"; // -0 would not survive JSON
}

/** Levels, losses or margins over the bands on their way out, dB; areas in m2 and times in s as well. */
export function toOutSpectrum(values: ArrayLike<number>): OutSpectrum {
  const spectrum: OutSpectrum = [];
  for (let band = 0; band < values.length; band += 1) spectrum.push(toOut(values[band]));
  return spectrum;
}

/** Room left, dB: positive is good. */
export function marginOf(allowed: number, level: number): number {
  return allowed - level;
}

export const STATES = ["over", "not weighed", "tight", "under"] as const;
export type State = (typeof STATES)[number];

export interface BandVerdict {
  band: Band;
  /** Level with everything that reaches the listener; "unknown" where a part is not known. */
  level: Out;
  /** Sum of the parts that are known. */
  known: Out;
  limit: Out | null;
  /** limit - level; where a part is unknown and the known sum is over, limit - known (at most that); else "unknown". */
  margin: Out | null;
  /** Share of the allowance that is spent, 1 = the limit. Null without a limit. */
  spent: number | null;
  /** One standard deviation of the level, dB. */
  doubt: number;
  state: State;
}

/** All energy that leaves by one element (or one outdoor unit, or all leaks of a building), over sources and entries. */
export interface PathVerdict {
  /** Element id, source id of an outdoor source, outlet id of a fan, "leaks:BUILDING", or "in-room:SOURCE". */
  id: string;
  kind: PathKind;
  /** Element, source or outlet that the path page opens; null for a group. */
  partId: string | null;
  name: string;
  levels: OutSpectrum;
  /** Share of the known energy per band, 0 to 1 (of weighted energy for dBA and dBC limits: the same inside a band). */
  shares: number[];
  /** Level per band with this path silenced. */
  without: OutSpectrum;
  /** Level, share and level-without of the weighted total, where the limit is dBA or dBC. */
  weighted: { level: Out; share: number; without: Out } | null;
  /** True where the figures in that band rest on estimates. */
  estimated: boolean[];
}

export interface Contribution {
  sourceId: string;
  /** "in-room", entry element, "radiating > entry", "direct", or a duct outlet. */
  path: string;
  leavingId: string | null;
  enteringId: string | null;
  levels: OutSpectrum;
}

export interface Station {
  kind: "source" | "leaving" | "fence" | "window" | "listener";
  partId: string | null;
  /** Metres along the cut and over ground. */
  along: number;
  height: number;
  levels: OutSpectrum;
  dba: Out;
  dbc: Out;
}

/** The two yards cut open by the vertical plane through the loudest source's room and the listener. */
export interface CrossCut {
  from: number;
  to: number;
  buildings: {
    id: string;
    name: string;
    role: string;
    /** Outline of the cut shell, [along, height]. */
    outline: [number, number][];
    floors: { from: number; to: number; height: number }[];
    rooms: { id: string; from: number; to: number; floor: number; ceiling: number; lit: boolean }[];
    openings: { elementId: string; kind: PathKind; along: number; foot: number; head: number }[];
  }[];
  fences: { id: string; along: number; height: number }[];
  trees: { along: number; height: number; crown: number }[];
  source: { id: string; along: number; height: number } | null;
  listener: { along: number; height: number };
  stations: Station[];
}

/** What the sentence is built from; figures at the leading band (or of the weighted total). */
export interface SentenceFacts {
  sourceId: string | null;
  /** "the kick drum" */
  voice: string;
  /** Share of the leading source in the energy there. */
  sourceShare: number;
  /** Loudest paths first, up to three. */
  leading: { pathId: string; share: number }[];
  /** Drop in dB with the first, and with the first two, silenced. */
  dropFirst: number;
  dropFirstTwo: number;
}

export interface ReceiverVerdict {
  receiverId: string;
  situationId: string | null;
  criterionId: string | null;
  metric: "bands" | "dBA" | "dBC" | "none";
  state: State;
  /** Smallest margin over 63-8000 Hz, or of the weighted total. Null where not weighed without a known excess. */
  margin: number | null;
  /** Leading band: where the margin is smallest; for dBA and dBC where most weighted energy lies. */
  band: Band | null;
  doubt: number | null;
  /** A pass that rests on estimates; it cannot be signed. */
  unproven: boolean;
  restsOn: { partId: string; name: string; what: "source" | "element"; bands: Band[] }[];
  /** 31.5 Hz: its own mark and figure; never changes the listener's state. */
  lowest: { state: State; margin: number | null; doubt: number } | null;
  bands: BandVerdict[];
  dba: Out;
  dbc: Out;
  nc: { value: number | "below" | "above" | "unknown"; band: Band | null };
  /** For dBA and dBC limits. */
  weighted: { level: Out; known: Out; limit: number; margin: Out; spent: number; doubt: number } | null;
  paths: PathVerdict[];
  contributions: Contribution[];
  /** Power sum of the contributions left out of `contributions` on the wire; null when none is. */
  rest: OutSpectrum | null;
  /** Parts of the doubt at the leading band, dB, largest first; they add as squares. */
  doubts: {
    what: "source" | "leaving" | "entering" | "outdoors";
    partId: string | null;
    name: string;
    basis: string;
    decibels: number;
  }[];
  facts: SentenceFacts;
  crossCut: CrossCut | null;
}

export interface ElementVerdict {
  /** Of the element whole: construction, gap, open part, field limit. */
  loss: OutSpectrum;
  bases: Basis[];
  /** One standard deviation of the loss per band, dB. */
  doubts: number[];
}

export interface ConstructionVerdict {
  loss: OutSpectrum;
  bases: Basis[];
  /** kg/m2 and m; null where the layers do not say. */
  surfaceMass: number | null;
  thickness: number | null;
  /** Hz; reasons a builder understands are written from these. */
  massAirMass: number | null;
  coincidence: number[];
  laboratory: boolean;
}

export interface SpaceVerdict {
  absorption: OutSpectrum;
  decay: OutSpectrum;
  /** Frequency below which the room answers in single tones, Hz (Schroeder); null where the decay is not known. */
  statisticalFrom: number | null;
}

export interface SourceVerdict {
  /** One standard deviation of its power per band, dB. */
  doubts: number[];
  /** Alone at work and 1 m away in its own room; null outdoors, in a duct and without a room. */
  near: {
    /** m. */
    distance: number;
    levels: OutSpectrum;
    /** Of the bands that are known. */
    dba: Out;
    /** Minutes a day until the daily measure of bare ears is full at that level; null in silence. */
    minutes: number | null;
  } | null;
}

export interface Note {
  partId: string | null;
  /** A sentence for the reader: "The fan has no sound level at 8 kHz." */
  text: string;
}

export interface Verdict {
  solver: string;
  /** The listener whose verdict leads the page: over before not weighed before tight before under, then smallest margin. */
  leadingReceiverId: string | null;
  receivers: ReceiverVerdict[];
  elements: Record<string, ElementVerdict>;
  constructions: Record<string, ConstructionVerdict>;
  spaces: Record<string, SpaceVerdict>;
  /** Absent where nothing could be weighed. */
  sources?: Record<string, SourceVerdict>;
  notes: Note[];
}
