import type { PathVerdict } from "@/lib/noise/verdict";
import { STACK_ORDER } from "../marks/hatches";
import { shareOf, type Column } from "./columns";

/** One block of a stack; `from` and `to` are parts of the whole, counted from the foot. */
export interface Block {
  path: PathVerdict;
  lit: boolean;
  from: number;
  to: number;
}

function orderIn(path: PathVerdict, litId: string | null): number {
  return path.id === litId ? STACK_ORDER.length : STACK_ORDER.indexOf(path.kind);
}

/** Shares of the energy, which add up and may be stacked: by kind from the foot, the lit path on top. */
export function stackOf(paths: readonly PathVerdict[], column: Column, litId: string | null): Block[] {
  const ordered = [...paths].sort((one, other) => orderIn(one, litId) - orderIn(other, litId));
  let foot = 0;
  return ordered
    .filter((path) => shareOf(path, column) > 0)
    .map((path) => {
      const from = foot;
      foot += shareOf(path, column);
      return { path, lit: path.id === litId, from, to: foot };
    });
}
