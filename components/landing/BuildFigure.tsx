import type { Made } from "./LandingBuild";

/** Pixels to a metre of the leaf's thickness; its width is cut short. */
const PER_METRE = 460;
const WIDTH = 104;
const HEIGHT = 62;
const MIDDLE = 38;

/** A leaf between its jambs from above, its thickness to one scale on every card; a ceiling of its own as the lines above it. */
export function BuildFigure({ door, ceiling }: { door: Made; ceiling: boolean }) {
  const thick = Math.round((door.thickness ?? 0) * PER_METRE * 10) / 10;
  const top = MIDDLE - thick / 2;
  const strokes = Array.from({ length: 7 }, (_, index) => `M${24 + index * 8.4} ${MIDDLE + 4}l8-8`).join("");
  return (
    <svg width={WIDTH} height={HEIGHT} viewBox={`0 0 ${WIDTH} ${HEIGHT}`} aria-hidden="true" className="block flex-none" fill="none">
      {ceiling && <path d={`M2 4H${WIDTH - 2}M2 9H${WIDTH - 2}`} strokeWidth="1.7" className="stroke-slablamp" />}
      <g className="stroke-slabink" strokeWidth="1.5">
        <path d={`M2 16h18v44H2zM${WIDTH - 20} 16h18v44h-18z`} />
        {thick > 0 && <rect x="22" y={top} width={WIDTH - 44} height={thick} />}
        <path d={strokes} strokeWidth="1" />
      </g>
    </svg>
  );
}
