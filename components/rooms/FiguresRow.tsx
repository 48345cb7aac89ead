import clsx from "clsx";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { Out, SpaceVerdict } from "@/lib/noise/verdict";
import { formatBand, formatNumber, spokenFigure } from "../format";
import { withMark } from "../ui/figures";
import { toShown, unitName } from "../ui/quantities";
import { VisuallyHidden } from "../ui/VisuallyHidden";
import { useQuantityWords } from "./useQuantityWords";

/** What the room comes to in each band: as it is weighed, not to be typed. */
export function FiguresRow({ judged, litBand }: { judged: SpaceVerdict | undefined; litBand: number }) {
  const { units } = useQuantityWords();
  const unknown: Out[] = OCTAVE_BANDS.map(() => "unknown");
  const areas = (judged?.absorption ?? unknown).map((area) => (typeof area === "number" ? toShown("area", units, area) : area));
  return (
    <table className="w-full table-fixed border-collapse text-least text-ink mid:text-second">
      <caption className="mb-1 text-left text-second font-semibold text-ink2">As it is weighed, per band in Hz</caption>
      <thead>
        <tr>
          {OCTAVE_BANDS.map((band, index) => (
            <th key={band} scope="col" className={clsx("border-b border-rule py-1 text-center font-normal", index === litBand && "bg-lampwash font-bold!")}>
              {formatBand(band)}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        <Figures label="Decay time, s" values={judged?.decay ?? unknown} litBand={litBand} decimals={2} />
        <Figures label={`Absorption area, ${unitName("area", units)}`} values={areas} litBand={litBand} decimals={1} />
      </tbody>
    </table>
  );
}

interface FiguresProps {
  label: string;
  values: readonly Out[];
  litBand: number;
  decimals: number;
}

function Figures({ label, values, litBand, decimals }: FiguresProps) {
  const { mark } = useQuantityWords();
  return (
    <>
      <tr>
        <th scope="rowgroup" colSpan={OCTAVE_BANDS.length} className="pt-1.5 text-left font-normal text-ink2">
          {label}
        </th>
      </tr>
      <tr>
        {values.map((value, index) => (
          <td key={index} className={clsx("py-1 text-center", index === litBand && "bg-lampwash font-bold")}>
            {typeof value === "number" ? withMark(formatNumber(value, value >= 99.95 ? 0 : decimals), mark) : <Unknown value={value} />}
          </td>
        ))}
      </tr>
    </>
  );
}

function Unknown({ value }: { value: Out }) {
  return (
    <>
      <span aria-hidden="true">?</span>
      <VisuallyHidden>{spokenFigure(value)}</VisuallyHidden>
    </>
  );
}
