import type { PathKind } from "../format";
import { capOf, drawHatch, hatches, isSolid } from "./hatches";

interface Props {
  kind: PathKind;
  lit?: boolean;
  x: number;
  y: number;
  width: number;
  height: number;
  /** Width of the outline; 0 leaves it to the drawing. */
  outline?: number;
}

/**
 * A hatched rectangle drawn as strokes, crisp on screen and on paper. The inner svg clips by its own edge,
 * so no clip path and no id is needed.
 */
export function HatchBox({ kind, lit = false, x, y, width, height, outline = 1.5 }: Props) {
  if (width <= 0 || height <= 0) return null;
  const solid = isSolid(kind, lit);
  return (
    <>
      <svg x={x} y={y} width={width} height={height}>
        <rect width={width} height={height} className={lit ? "fill-lamp" : solid ? "fill-ink" : "fill-sheet"} />
        {!solid && (
          <path
            d={drawHatch(kind, width, height)}
            fill="none"
            strokeWidth={hatches[kind].strokeWidth}
            strokeLinecap={capOf(kind)}
            className={lit ? "stroke-onlamp" : "stroke-ink"}
          />
        )}
      </svg>
      {outline > 0 && (
        <rect x={x} y={y} width={width} height={height} fill="none" strokeWidth={outline} className="stroke-ink" />
      )}
    </>
  );
}
