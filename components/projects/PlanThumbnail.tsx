import type { Point, ProjectLine } from "./ProjectLine";

const THUMBNAIL = { width: 140, height: 106 } as const;
const PADDING = 2;

/** The same frame for each yard, so that the common scale holds on the phone too. */
const frame = { viewBox: `0 0 ${THUMBNAIL.width} ${THUMBNAIL.height}`, className: "block h-auto w-full" };

interface Extent {
  west: number;
  north: number;
  width: number;
  height: number;
}

function extentOf(points: readonly Point[]): Extent {
  const eastings = points.map(([x]) => x);
  const northings = points.map(([, y]) => y);
  const west = Math.min(...eastings);
  const north = Math.max(...northings);
  return { west, north, width: Math.max(...eastings) - west, height: north - Math.min(...northings) };
}

const outlinesOf = (project: ProjectLine): readonly Point[] =>
  project.lot.length > 0 ? project.lot : project.buildings.flatMap((building) => building.outline);

/** Pixels to a metre at which the largest of these yards just fits: one scale for all of them. */
export function commonScale(projects: readonly ProjectLine[]): number {
  const fits = projects
    .map(outlinesOf)
    .filter((points) => points.length > 0)
    .map(extentOf)
    .flatMap(({ width, height }) => [
      (THUMBNAIL.width - 2 * PADDING) / Math.max(width, 1),
      (THUMBNAIL.height - 2 * PADDING) / Math.max(height, 1),
    ]);
  return fits.length > 0 ? Math.min(...fits) : 1;
}

function centreOf(outline: readonly Point[]): Point {
  const { west, north, width, height } = extentOf(outline);
  return [west + width / 2, north - height / 2];
}

type Place = (point: Point) => readonly [number, number];

const drawOutline = (outline: readonly Point[], place: Place): string => `M${outline.map((point) => place(point).join(" ")).join("L")}Z`;

function Listener({ at: [x, y] }: { at: readonly [number, number] }) {
  return <rect x={x - 2.5} y={y - 5} width="5" height="10" strokeWidth="1.2" className="fill-lamp stroke-ink" />;
}

/** The yard from above: the studio solid, houses hollow, a dashed line to the worst listener. */
export function PlanThumbnail({ project, scale }: { project: ProjectLine; scale: number }) {
  const points = outlinesOf(project);
  if (points.length === 0) return <EmptyPlan />;
  const { west, north } = extentOf(points);
  const place: Place = ([x, y]) => [Math.round((PADDING + (x - west) * scale) * 10) / 10, Math.round((PADDING + (north - y) * scale) * 10) / 10];
  const studio = project.buildings.find((building) => building.kind === "studio");
  const from = studio && place(centreOf(studio.outline));
  const to = project.listener && place(project.listener);
  return (
    <svg {...frame} role="img" aria-label={`Plan of ${project.name}`} fill="none">
      <g className="stroke-ink" strokeWidth="1.6">
        {project.lot.length > 0 && <path d={drawOutline(project.lot, place)} />}
        {project.buildings.map((building, index) => (
          <path key={index} d={drawOutline(building.outline, place)} className={building.kind === "studio" ? "fill-ink" : "fill-sheet"} />
        ))}
        {from && to && <path d={`M${from.join(" ")}L${to.join(" ")}`} strokeWidth="2" strokeDasharray="4 3" />}
      </g>
      {to && <Listener at={to} />}
    </svg>
  );
}

/** A yard that nothing is drawn on yet. */
function EmptyPlan() {
  return (
    <svg {...frame} role="img" aria-label="Nothing drawn yet" fill="none">
      <rect x="1" y="1" width={THUMBNAIL.width - 2} height={THUMBNAIL.height - 2} strokeDasharray="6 5" strokeWidth="1.6" className="stroke-edge" />
    </svg>
  );
}
