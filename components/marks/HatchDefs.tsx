import type { PathKind } from "../format";
import { capOf, drawTile, hatches, isSolid, STACK_ORDER } from "./hatches";

/** Address of a hatch for shapes that are no rectangles: fill={hatchFill("roof")}. Rectangles use HatchBox. */
export const hatchFill = (kind: PathKind, lit = false): string => `url(#${hatchId(kind, lit)})`;

const hatchId = (kind: PathKind, lit: boolean): string => `hatch-${kind.replaceAll(" ", "-")}${lit ? "-lit" : ""}`;

function Tile({ kind, lit }: { kind: PathKind; lit: boolean }) {
  const { width, height, strokeWidth } = hatches[kind];
  const solid = isSolid(kind, lit);
  return (
    <pattern id={hatchId(kind, lit)} width={width} height={height} patternUnits="userSpaceOnUse">
      <rect width={width} height={height} className={lit ? "fill-lamp" : solid ? "fill-ink" : "fill-sheet"} />
      {!solid && (
        <path
          d={drawTile(kind)}
          fill="none"
          strokeWidth={strokeWidth}
          strokeLinecap={capOf(kind)}
          className={lit ? "stroke-onlamp" : "stroke-ink"}
        />
      )}
    </pattern>
  );
}

/** All hatches, once per page. Not display:none, or the fills that point here would vanish. */
export function HatchDefs() {
  return (
    <svg width="0" height="0" aria-hidden="true" focusable="false" className="absolute">
      <defs>
        {STACK_ORDER.flatMap((kind) => [
          <Tile key={kind} kind={kind} lit={false} />,
          <Tile key={`${kind}-lit`} kind={kind} lit />,
        ])}
      </defs>
    </svg>
  );
}
