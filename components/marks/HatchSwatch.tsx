import type { PathKind } from "../format";
import { HatchBox } from "./HatchBox";

interface Props {
  kind: PathKind;
  lit?: boolean;
  width?: number;
  height?: number;
}

/** A sample of a hatch beside the name of its path. */
export function HatchSwatch({ kind, lit, width = 20, height = 20 }: Props) {
  return (
    <svg width={width} height={height} aria-hidden="true" className="block flex-none">
      <HatchBox kind={kind} lit={lit} x={0.75} y={0.75} width={width - 1.5} height={height - 1.5} />
    </svg>
  );
}
