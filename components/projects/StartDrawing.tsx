"use client";

import { formatQuantity, withUnit } from "../format";
import { useFigures, withMark } from "../ui/figures";
import { toShown, unitName } from "../ui/quantities";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import type { NewYard } from "./newYard";

const promised = { 390: 334, 720: 560, 1024: 340, 1440: 420 } as const;
const HEIGHT = 300;
const EDGE = 34;

interface Box {
  width: number;
  depth: number;
}

const boxOf = ({ width, depth }: { width: number | null; depth: number | null }): Box | undefined => (width && depth ? { width, depth } : undefined);

/** What has been typed so far, from above and to scale; all of it in the middle, as it will be drawn. */
export function StartDrawing({ yard }: { yard: NewYard }) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 460);
  const [lot, building, room] = [boxOf(yard.lot), boxOf(yard.building), boxOf(yard.room)];
  const boxes = [lot, building, room].filter((box) => box !== undefined);
  const scale = Math.min(...boxes.map((box) => Math.min((width - 2 * EDGE) / box.width, (HEIGHT - 2 * EDGE) / box.depth)));
  const draw = (box: Box) => ({ x: (width - box.width * scale) / 2, y: (HEIGHT - box.depth * scale) / 2, width: box.width * scale, height: box.depth * scale });
  const outer = boxes[0];
  return (
    <div ref={place} className="overflow-hidden">
      <svg width={width} height={HEIGHT} viewBox={`0 0 ${width} ${HEIGHT}`} role="img" aria-label={labelOf(lot, building, room)} fill="none" className="block">
        {lot ? <rect {...draw(lot)} strokeWidth="1.6" className="stroke-ink" /> : <rect x={EDGE} y={EDGE} width={width - 2 * EDGE} height={HEIGHT - 2 * EDGE} strokeDasharray="8 6" strokeWidth="1.6" className="stroke-edge" />}
        {building && <rect {...draw(building)} strokeWidth="1.6" className="fill-ink stroke-ink" />}
        {room && <rect {...draw(room)} strokeWidth="1.6" className="fill-sheet stroke-ink" />}
        {outer && <Measures box={outer} drawn={draw(outer)} />}
      </svg>
    </div>
  );
}

function labelOf(lot: Box | undefined, building: Box | undefined, room: Box | undefined): string {
  const drawn = [lot && "the lot", building && "the studio building", room && "the first room"].filter((words) => words !== undefined);
  return drawn.length > 0 ? `Drawn to scale so far: ${drawn.join(", ")}.` : "Nothing is drawn yet.";
}

/** The outermost rectangle's width and depth, on its upper and left edge. */
function Measures({ box, drawn: { x, y, width, height } }: { box: Box; drawn: { x: number; y: number; width: number; height: number } }) {
  const { units, mark } = useFigures();
  const words = (metres: number) => withUnit(withMark(formatQuantity(toShown("length", units, metres), 2), mark), unitName("length", units));
  const middle = y + height / 2;
  return (
    <g className="text-chart">
      <path d={`M${x} ${y - 10}h${width}M${x} ${y - 14}v8M${x + width} ${y - 14}v8M${x - 10} ${y}v${height}M${x - 14} ${y}h8M${x - 14} ${y + height}h8`} className="stroke-ink2" />
      <text x={x + width / 2} y={y - 17} textAnchor="middle">
        {words(box.width)}
      </text>
      <text x={x - 17} y={middle} textAnchor="middle" transform={`rotate(-90 ${x - 17} ${middle})`}>
        {words(box.depth)}
      </text>
    </g>
  );
}
