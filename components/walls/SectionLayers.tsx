import clsx from "clsx";
import type { SheetLayer } from "../../lib/noise/sheet";
import { hatchFor, isSolidLook } from "./materialHatches";
import { MaterialBox } from "./MaterialBox";
import type { Strip } from "./sectionGeometry";

interface Props {
  strip: Strip;
  top: number;
  height: number;
  /** Pixels to a metre. */
  scale: number;
  lit?: boolean;
}

/** One layer of a section, drawn from its yard side to its room side. */
export function SectionLayer({ strip, top, height, scale, lit = false }: Props) {
  const { layer, x, width } = strip;
  if (isSolidLook(layer.look))
    return <rect x={x} y={top} width={Math.max(2.5, width)} height={height} className="fill-ink" />;
  const hatch = hatchFor(layer.look);
  return (
    <>
      <rect x={x} y={top} width={width} height={height} className={lit ? "fill-lampwash" : "fill-sheet"} />
      {hatch && <MaterialBox hatch={hatch} x={x} y={top} width={width} height={height} />}
      {layer.fill > 0 && (
        <MaterialBox hatch="wool" x={x} y={top} width={Math.min(width, layer.fill * scale)} height={height} />
      )}
      <Studs strip={strip} top={top} height={height} scale={scale} />
      {layer.look === "vented" && <Draught x={x + width / 2} top={top} height={height} />}
      <SideLines layer={layer} x={x} width={width} top={top} height={height} />
    </>
  );
}

/** Boards have firm edges; frames and gaps share the edge of the board beside them. */
function SideLines({
  layer,
  x,
  width,
  top,
  height,
}: {
  layer: SheetLayer;
  x: number;
  width: number;
  top: number;
  height: number;
}) {
  const firm = layer.look !== "frame" && layer.look !== "gap" && layer.look !== "vented";
  return (
    <path
      d={`M${x} ${top}v${height}M${x + width} ${top}v${height}`}
      strokeWidth={firm ? 2 : 1.2}
      className="stroke-ink"
      fill="none"
    />
  );
}

/** Where along the wall a stud is cut: one row stands high, the row behind it low, so that the gap is seen to pass. */
const standsAt = { yard: 0.12, room: 0.6, both: 0.36 };

function Studs({ strip: { layer, x, width }, top, height, scale }: Props) {
  return layer.studs.map((stud) => {
    const depth = Math.min(width, stud.depth * scale);
    const wide = Math.min(stud.width * scale, height * 0.36);
    const left = stud.against === "room" ? x + width - depth : x;
    const y = top + standsAt[stud.against] * height;
    return (
      <g key={stud.against}>
        <rect x={left} y={y} width={depth} height={wide} className="fill-sheet" />
        <MaterialBox hatch="timber" x={left} y={y} width={depth} height={wide} />
        <path
          d={`M${left} ${y}h${depth}v${wide}h${-depth}zL${left + depth} ${y + wide}M${left + depth} ${y}L${left} ${y + wide}`}
          fill="none"
          strokeWidth="1.6"
          className="stroke-ink"
        />
      </g>
    );
  });
}

function Draught({ x, top, height }: { x: number; top: number; height: number }) {
  const foot = top + height * 0.62;
  const head = top + height * 0.38;
  return (
    <path
      d={`M${x} ${foot}V${head}M${x - 5} ${head + 7}L${x} ${head}l5 7`}
      fill="none"
      strokeWidth="1.6"
      className="stroke-ink"
    />
  );
}

/** The cut edges of the wall: a line with a kink over the widest layer says that it goes on. */
export function BreakLine({
  y,
  from,
  to,
  kink,
  look,
}: {
  y: number;
  from: number;
  to: number;
  kink: number;
  look?: string;
}) {
  return (
    <path
      d={`M${from} ${y}H${kink - 13}l7 -9l11 18l7 -9H${to}`}
      fill="none"
      strokeWidth="1.5"
      strokeLinejoin="round"
      className={clsx("stroke-ink", look)}
    />
  );
}
