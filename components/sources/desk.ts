import type { SourceRecord } from "@/lib/noise/library";
import type { Plan } from "@/lib/noise/plan";
import type { Source } from "@/lib/noise/sources";
import type { SourcePlacement } from "@/lib/noise/sources/kind";
import type { PlanChange } from "../plan/save";
import type { PlanSave } from "../plan/usePlanSave";
import type { Answer } from "../state/plan";

export interface SourceKindChoice {
  name: Source["kind"];
  label: string;
  placement: SourcePlacement;
}

export interface SourceFigures {
  /** A-weighting over the nine bands, dB. */
  aWeights: readonly number[];
  /** Daily measure of bare ears: dB(A), minutes, and the dB that halve the time. */
  exposure: { level: number; minutes: number; halvedBy: number };
}

/** What takes an act back, and what it is called. */
export interface Undo {
  words: string;
  changes: (now: Plan) => readonly PlanChange[];
}

/** What every part of this page works with. */
export interface SourceDesk extends SourceFigures {
  answer: Answer;
  save: PlanSave;
  /** Saves what a change does to the plan that stands when its turn comes. */
  act: (changes: (plan: Plan) => readonly PlanChange[], spot: string, undo?: Undo) => Promise<boolean>;
  library: readonly SourceRecord[];
  kinds: readonly SourceKindChoice[];
  locked: boolean;
}

export const placementOf = ({ kinds }: Pick<SourceDesk, "kinds">, kind: string): SourcePlacement =>
  kinds.find(({ name }) => name === kind)?.placement ?? "room";

export const kindLabel = ({ kinds }: Pick<SourceDesk, "kinds">, kind: string): string => kinds.find(({ name }) => name === kind)?.label ?? kind;

export const spotOf = ({ id }: { id: string }): string => id;
