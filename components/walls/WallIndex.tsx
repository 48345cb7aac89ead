import Link from "next/link";
import type { ReactNode } from "react";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import { bandWords, formatNumber, formatQuantity, percent, withUnit, wholeDecibels } from "../format";
import { Icon } from "../marks/Icon";
import { Sheet } from "../ui/Sheet";
import { MiniSection } from "./MiniSection";
import type { WallFace, WallRow } from "./wallRows";
import { toMillimetres, toSquareCentimetres } from "./units";

interface Props {
  faces: readonly WallFace[];
  /** Index of the band the figures are taken at, and the listener whose shares they are. */
  litBand: number;
  listener?: string;
  /** What does not fit in a face, in sentences. */
  doubtsOf?: (faceId: string) => readonly string[];
  /** What may be changed of a face, under its rows. */
  panelOf?: (faceId: string) => ReactNode;
}

const columns =
  "grid grid-cols-[104px_minmax(0,1fr)] gap-x-4 mid:grid-cols-[104px_minmax(0,1fr)_repeat(3,68px)] desk:grid-cols-[104px_minmax(0,1fr)_repeat(5,84px)]";

/** Every wall, roof, door and opening, face by face; each section to one scale. */
export function WallIndex({ faces, litBand, listener, doubtsOf, panelOf }: Props) {
  if (faces.length === 0) return <EmptyIndex />;
  const band = bandWords(OCTAVE_BANDS[litBand]!);
  return (
    <Sheet bare>
      <ColumnHeads band={band} listener={listener} />
      {faces.map((face) => (
        <section
          key={face.id}
          aria-label={face.name}
          className="border-t border-rule first-of-type:border-t-0"
        >
          <h2 className="break-words px-4 pb-1 pt-5 text-part mid:px-6.5">{face.name}</h2>
          {doubtsOf?.(face.id).map((words) => (
            <p key={words} className="flex gap-2 px-4 pb-1 text-second text-ink mid:px-6.5">
              <Icon name="note" size={18} />
              <span className="min-w-0">{words}</span>
            </p>
          ))}
          <ul>
            {face.rows.map((row) => (
              <IndexRow key={row.id} row={row} band={band} listener={listener} />
            ))}
            {face.rows.length === 0 && <li className="px-4 py-2 text-second text-ink2 mid:px-6.5">Nothing stands in it yet: no sound passes here.</li>}
          </ul>
          {panelOf?.(face.id)}
        </section>
      ))}
    </Sheet>
  );
}

function ColumnHeads({ band, listener }: { band: string; listener?: string }) {
  const head = "self-end text-right text-second font-semibold text-ink2";
  return (
    <div aria-hidden="true" className={`${columns} mx-4 border-b-2 border-ink pb-2 pt-5 mid:mx-6.5`}>
      <span className="self-end text-second font-semibold text-ink2">Section</span>
      <span className="self-end text-second font-semibold text-ink2">Name</span>
      <span className={`${head} hidden mid:block`}>Area, m²</span>
      <span className={`${head} hidden desk:block`}>kg/m²</span>
      <span className={`${head} hidden desk:block`}>mm</span>
      <span className={`${head} hidden mid:block`}>Stops, dB at {band}</span>
      <span className={`${head} hidden mid:block`}>Share{listener ? `, ${listener}` : ""}</span>
    </div>
  );
}

function IndexRow({ row, band, listener }: { row: WallRow; band: string; listener?: string }) {
  const figure = "hidden text-right text-table font-semibold";
  return (
    <li className="border-t border-rule first:border-t-0">
      <Link
        href={row.href}
        className={`${columns} min-h-14 items-center px-4 py-2.5 no-underline hover:bg-well mid:px-6.5`}
      >
        <MiniSection layers={row.layers} name={row.name} />
        <span className="min-w-0">
          <span className="block font-semibold underline underline-offset-3 decoration-edge">{row.name}</span>
          <span className="block text-second text-ink2">{row.construction}</span>
          <span className="block text-second text-ink2 mid:sr-only">{spoken(row, band, listener)}</span>
        </span>
        <span aria-hidden="true" className={`${figure} mid:block`}>
          {areaOf(row)}
        </span>
        <span aria-hidden="true" className={`${figure} desk:block`}>
          {row.surfaceMass === null ? "–" : formatNumber(row.surfaceMass, row.surfaceMass < 10 ? 1 : 0)}
        </span>
        <span aria-hidden="true" className={`${figure} desk:block`}>
          {row.thickness === null ? "–" : formatQuantity(toMillimetres(row.thickness), 0)}
        </span>
        <span aria-hidden="true" className={`${figure} mid:block`}>
          {wholeDecibels(row.stops)}
        </span>
        <span aria-hidden="true" className={`${figure} mid:block`}>
          {row.share === undefined ? "–" : percent(row.share)}
        </span>
      </Link>
    </li>
  );
}

const areaOf = ({ area }: WallRow) =>
  area < 0.01
    ? withUnit(formatQuantity(toSquareCentimetres(area)), "cm²")
    : formatQuantity(area, area < 1 ? 2 : 1);

/** The figures of a row in one line, where there is no room for columns. */
function spoken(row: WallRow, band: string, listener?: string): string {
  const size = row.area < 0.01 ? areaOf(row) : withUnit(areaOf(row), "m²");
  const stops = `stops ${withUnit(wholeDecibels(row.stops), "dB")} at ${band}`;
  return [
    size,
    stops,
    ...(row.share === undefined ? [] : [`${percent(row.share)} of what ${listener ?? "the listener"} gets`]),
  ].join(", ");
}

function EmptyIndex() {
  return (
    <Sheet heading="No walls yet">
      <p className="text-ink2">
        This yard has been drawn, and no room in it has walls, a roof or openings so far.
      </p>
    </Sheet>
  );
}
