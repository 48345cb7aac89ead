import type { MaterialHatch } from "../walls/materialHatches";
import type { Soaker } from "./soak";

const hatches: readonly [RegExp, MaterialHatch][] = [
  [/^(plasterboard|plaster-lath)/, "board"],
  [/^(plaster-brick|block|concrete|brick|floor-concrete)/, "masonry"],
  [/^(wood|plywood|floor-timber|floor-parquet|chairs)/, "timber"],
  [/^glass/, "glass"],
  [/^(liner|ceiling)/, "wool"],
  [/^(curtain|carpet|floor-linoleum)/, "cladding"],
];

/** One hatch per material, as in the sections of walls; own figures and things in the room have flakes, air is empty. */
export function hatchOf({ kind, finishKey }: Soaker): MaterialHatch | undefined {
  if (kind === "air") return undefined;
  return hatches.find(([pattern]) => pattern.test(finishKey ?? ""))?.[1] ?? "sheathing";
}
