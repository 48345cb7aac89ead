/** What happened to one part of a plan. */
export interface TouchedPart {
  kind: string;
  id: string;
  act: "add" | "change" | "remove";
  before: Record<string, unknown> | null;
  after: Record<string, unknown> | null;
}

/** One change of a plan. `as` names a part that is added, "new:room", so that later changes of the list point at it. */
export type PlanChange =
  | { act: "add"; part: string; values: Record<string, unknown>; as?: `new:${string}` }
  | { act: "change"; part: string; id: string; patch: Record<string, unknown> }
  | { act: "remove"; part: string; id: string };
