import type { Plan } from "../../lib/noise/plan";
import type { Choice } from "../ui/Select";
import type { Quantity } from "../ui/quantities";
import type { PlanChange } from "./save";

/**
 * What a change of a value does to the plan that stands when it is sent: two fields that belong to one list, left one
 * after the other, must not undo each other.
 */
export type Planned<V> = (value: V, plan: Plan) => PlanChange[];

interface Common {
  label: string;
  hint?: string;
  /** Takes the whole row. */
  wide?: boolean;
}

/** One value of a part, as plain data: drawn as a field for who may change it, as text for everybody else. */
export type FieldSpec = Common &
  (
    | { kind: "words"; value: string; most: number; optional?: boolean; changes: Planned<string> }
    | {
        kind: "quantity";
        quantity: Quantity;
        value: number | null;
        min: number;
        max: number;
        optional?: boolean;
        changes: Planned<number | null>;
      }
    | {
        kind: "number";
        unit: string;
        step?: number;
        value: number | null;
        min: number;
        max: number;
        optional?: boolean;
        changes: Planned<number | null>;
      }
    | { kind: "choice"; value: string; choices: readonly Choice[]; changes: Planned<string> }
    | { kind: "tick"; value: boolean; changes: Planned<boolean> }
  );

type Values = Record<string, unknown>;

/** One change of one part. */
export const changeOf = (part: string, id: string, patch: Values): PlanChange[] => [{ act: "change", part, id, patch }];
