import { memo } from "react";
import { drawMaterial, strokeOf, type MaterialHatch } from "./materialHatches";

interface Props {
  hatch: MaterialHatch;
  x: number;
  y: number;
  width: number;
  height: number;
}

/**
 * A box of one material as strokes, crisp on paper; the inner svg clips by its own edge, so no id is needed. Kept while
 * nothing about it changes: its strokes are many, and an arrow key in the list beside it must not draw them again.
 */
export const MaterialBox = memo(function MaterialBox({ hatch, x, y, width, height }: Props) {
  if (width <= 0 || height <= 0) return null;
  return (
    <svg x={x} y={y} width={width} height={height}>
      <path
        d={drawMaterial(hatch, width, height)}
        fill="none"
        strokeWidth={strokeOf(hatch)}
        strokeLinecap="round"
        className="stroke-ink"
      />
    </svg>
  );
});
