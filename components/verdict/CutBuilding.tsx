import type { CrossCut } from "@/lib/noise/verdict";
import type { CutScale } from "./cutScale";

type Building = CrossCut["buildings"][number];

function drawOutline({ outline }: Building, { x, y }: CutScale): string {
  const points = outline.map(([along, height]) => `${x(along).toFixed(1)} ${y(height).toFixed(1)}`);
  const standing = outline.length > 0 && outline[0]![1] < 0.3 && outline[outline.length - 1]![1] < 0.3;
  return points.length === 0 ? "" : `M${points.join("L")}${standing ? "" : "Z"}`;
}

/** Metres that a pitched roof is drawn beyond its walls. */
const OVERHANG = 0.35;

/** The feet of a pitched roof, carried past the walls on its own slope. */
function Eaves({ outline, scale: { x, y } }: { outline: Building["outline"]; scale: CutScale }) {
  return outline.map(([along, height], index) =>
    [outline[index - 1], outline[index + 1]].map((next) => {
      if (!next || next[1] <= height || Math.abs(next[0] - along) < 0.3 || height < 0.3) return null;
      const beyond = along + Math.sign(along - next[0]) * OVERHANG;
      const foot = height - ((next[1] - height) / Math.abs(next[0] - along)) * OVERHANG;
      return <path key={`${index} ${next[0]}`} d={`M${x(along)} ${y(height)}L${x(beyond)} ${y(foot)}`} strokeWidth="2.6" strokeLinecap="round" className="stroke-slabink" />;
    }),
  );
}

function Rooms({ rooms, scale: { x, y } }: { rooms: Building["rooms"]; scale: CutScale }) {
  return rooms.map(({ id, from, to, floor, ceiling }) => (
    <rect key={id} x={x(from)} y={y(ceiling)} width={x(to) - x(from)} height={y(floor) - y(ceiling)} fill="none" strokeWidth="1" className="stroke-slabink2" />
  ));
}

/** How far an opening's own place may lie from the cut wall that it is drawn in, m: the cut may pass beside it. */
const NEAR_WALL = 0.7;

/** Where the upright walls of the cut shell stand. */
function wallsOf({ outline }: Building): number[] {
  return outline.flatMap(([along, height], index) => {
    const next = outline[index + 1];
    return next && Math.abs(next[0] - along) < 0.05 && Math.abs(next[1] - height) > 0.5 ? [along] : [];
  });
}

/** The wall that an opening is drawn in; null where the cut meets no wall near it. */
export function wallAt(building: Building, along: number): number | null {
  const nearest = wallsOf(building).sort((one, other) => Math.abs(one - along) - Math.abs(other - along))[0];
  return nearest !== undefined && Math.abs(nearest - along) <= NEAR_WALL ? nearest : null;
}

/** Doors stand solid in the wall, windows paler; the listener's is lit. */
function Openings({ building, litId, scale: { x, y } }: { building: Building; litId: string | null; scale: CutScale }) {
  return building.openings.map(({ elementId, kind, along, foot, head }) => {
    const wall = wallAt(building, along);
    if (wall === null || (kind !== "door" && kind !== "window")) return null;
    const colour = elementId === litId ? "fill-slablamp" : kind === "window" ? "fill-slabink2" : "fill-slabink";
    return <rect key={elementId} x={x(wall) - 3} y={y(head)} width="6" height={Math.max(3, y(foot) - y(head))} className={colour} />;
  });
}

/** One building cut open: shell, floors, the rooms inside it, its openings. */
export function CutBuilding({ building, litId, scale }: { building: Building; litId: string | null; scale: CutScale }) {
  const { x, y } = scale;
  return (
    <g>
      <path d={drawOutline(building, scale)} fill="none" strokeWidth="2.6" strokeLinejoin="round" className="stroke-slabink" />
      <Eaves outline={building.outline} scale={scale} />
      {building.floors
        .filter(({ height }) => height > 0.3)
        .map(({ from, to, height }) => (
          <path key={height} d={`M${x(from)} ${y(height)}H${x(to)}`} strokeWidth="1.2" className="stroke-slabink2" />
        ))}
      {building.role === "studio" && <Rooms rooms={building.rooms} scale={scale} />}
      <Openings building={building} litId={litId} scale={scale} />
    </g>
  );
}
