import type { SheetLayer } from "../../lib/noise/sheet";
import { placeLayers, wholeThickness } from "./sectionGeometry";
import { SectionLayer } from "./SectionLayers";

/** One scale for every row of the list: pixels to a metre. Thicker things are cut off with a break. */
const SCALE = 240;
const MOST = 100;
const HEIGHT = 44;

/** The section of a row, small but to the scale of all others; without layers the outline alone is dashed. */
export function MiniSection({ layers, name }: { layers: readonly SheetLayer[]; name: string }) {
  const thickness = wholeThickness(layers);
  const width = Math.min(MOST, Math.max(3, thickness * SCALE));
  const drawn = thickness > 0;
  return (
    <svg
      width={MOST + 4}
      height={HEIGHT}
      viewBox={`0 0 ${MOST + 4} ${HEIGHT}`}
      role="img"
      aria-label={drawn ? `Section of ${name}, to scale` : `${name}: no layers to draw`}
      className="block flex-none"
    >
      {drawn ? (
        <svg x="1" y="1" width={width + 1} height={HEIGHT - 2}>
          {placeLayers(layers, 0.5, SCALE).map((strip) => (
            <SectionLayer key={strip.number} strip={strip} top={0} height={HEIGHT - 2} scale={SCALE} />
          ))}
        </svg>
      ) : (
        <rect
          x="1.5"
          y="1.5"
          width="40"
          height={HEIGHT - 3}
          strokeDasharray="4 3"
          strokeWidth="1.3"
          className="fill-none stroke-edge"
        />
      )}
      {drawn && (
        <path d={`M0 1H${width + 3}M0 ${HEIGHT - 1}H${width + 3}`} strokeWidth="1.3" className="stroke-ink" />
      )}
    </svg>
  );
}
