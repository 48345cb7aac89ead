import Link from "next/link";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { ConstructionSheet } from "../../lib/noise/sheet";
import type { ElementVerdict } from "../../lib/noise/verdict";
import { bandWords, formatNumber, formatQuantity, wholeDecibels } from "../format";
import type { PathElement } from "./elementWords";
import { toMillimetres, toSquareCentimetres } from "./units";

interface Props {
  element: PathElement;
  sheet?: ConstructionSheet;
  judged?: ElementVerdict;
  litBand: number;
  place: { number: number; of: number };
  indexHref: string;
}

/** Name of the element with the four figures one asks for first. */
export function WallHead({ element, sheet, judged, litBand, place, indexHref }: Props) {
  const loss = judged?.loss[litBand] ?? "unknown";
  const doubt = judged?.doubts[litBand];
  const give =
    typeof loss === "number" && doubt !== undefined
      ? `dB, give or take ${formatNumber(doubt, doubt < 2 ? 1 : 0)}`
      : "dB";
  const size =
    element.kind === "leak"
      ? [formatQuantity(toSquareCentimetres(element.area)), "cm²"]
      : [formatNumber(element.area, element.area < 1 ? 2 : 1), "m²"];
  return (
    <div className="mb-4 flex flex-wrap items-end justify-between gap-x-12 gap-y-4 mid:mb-5">
      <div className="min-w-0">
        <p className="text-second text-ink2">
          <Link href={indexHref} className="relative inline-flex min-h-6 items-center">
            Walls &amp; openings
          </Link>
          , {place.number} of {place.of}
        </p>
        <h1 className="text-verdictPhone leading-[1.12] desk:text-verdict">{element.name}</h1>
      </div>
      <dl className="flex flex-wrap gap-x-8 gap-y-3">
        {sheet?.thickness != null && (
          <Figure label="Thickness" value={formatQuantity(toMillimetres(sheet.thickness), 0)} unit="mm" />
        )}
        {sheet?.surfaceMass != null && (
          <Figure
            label="Weight"
            value={formatNumber(sheet.surfaceMass, sheet.surfaceMass < 10 ? 1 : 0)}
            unit="kg/m²"
          />
        )}
        <Figure label="Area" value={size[0]!} unit={size[1]!} />
        <Figure
          label={`Stops at ${bandWords(OCTAVE_BANDS[litBand]!)}`}
          value={wholeDecibels(loss)}
          unit={give}
        />
      </dl>
    </div>
  );
}

function Figure({ label, value, unit }: { label: string; value: string; unit: string }) {
  return (
    <div>
      <dt className="text-second text-ink2">{label}</dt>
      <dd className="flex items-baseline gap-2 text-table text-ink2">
        <span className="figure text-[24px] font-[640] leading-tight text-ink">{value}</span>
        {unit}
      </dd>
    </div>
  );
}
