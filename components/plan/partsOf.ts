import type { Plan } from "../../lib/noise/plan";

type AnyPart = { id: string } & Record<string, unknown>;

/** The parts of a plan that an address segment speaks of: "elements", "lots". */
export function partsOf(plan: Plan, part: string): readonly AnyPart[] {
  const parts = part === "lots" ? [plan.lot] : plan[part as keyof Plan];
  return Array.isArray(parts) ? (parts as AnyPart[]) : []; // every part of a plan has an id
}
