import type { SpaceVerdict } from "@/lib/noise/verdict";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import { bandWords, formatNumber, percent } from "../format";
import { FoldedSheet } from "../ui/FoldedSheet";
import { Select } from "../ui/Select";
import { Cell, HeadCell, Row, RowHead, Table } from "../ui/Table";
import { withMark } from "../ui/figures";
import { toShown, unitName } from "../ui/quantities";
import { MaterialBox } from "../walls/MaterialBox";
import type { Room } from "./room";
import { sharesAt, soakersOf, sumAt, type Soaker } from "./soak";
import { SoakChart } from "./SoakChart";
import { hatchOf } from "./soakHatches";
import { useQuantityWords } from "./useQuantityWords";

interface Props {
  room: Room;
  judged: SpaceVerdict | undefined;
  litBand: number;
  onLight: (band: number) => void;
}

/** Which surface takes which part of each band. */
export function SoakPanel({ room, judged, litBand, onLight }: Props) {
  const soakers = soakersOf(room, judged);
  return (
    <FoldedSheet
      heading="Who soaks it up"
      says={soakers && soakers.length > 0 ? "Shares of each band; they add to 100 %." : undefined}
      beside={<BandChoice litBand={litBand} onLight={onLight} />}
      className="border-t border-rule desk:border-t-0 desk:border-l"
    >
      {soakers === null ? (
        <p className="text-ink2">Your nine figures speak for the room as a whole: who takes which part cannot be told from them.</p>
      ) : soakers.length === 0 ? (
        <p className="text-ink2">Nothing lines this room yet.</p>
      ) : (
        <>
          <SoakChart soakers={soakers} litBand={litBand} onLight={onLight} />
          <Shares soakers={soakers} litBand={litBand} />
        </>
      )}
    </FoldedSheet>
  );
}

function BandChoice({ litBand, onLight }: Pick<Props, "litBand" | "onLight">) {
  const choices = OCTAVE_BANDS.map((band, index) => ({ value: `${index}`, label: bandWords(band) }));
  return <Select label="Band" className="w-32" choices={choices} value={`${litBand}`} onChange={(event) => onLight(Number(event.target.value))} />;
}

function Shares({ soakers, litBand }: { soakers: readonly Soaker[]; litBand: number }) {
  const { units, mark } = useQuantityWords();
  const shares = sharesAt(soakers, litBand);
  const whole = sumAt(soakers, litBand);
  const unit = unitName("area", units);
  const write = (area: number | null) => (area === null ? "?" : withMark(formatNumber(toShown("area", units, area), 1), mark));
  return (
    <Table className="mt-4">
      <thead>
        <tr>
          <HeadCell>Surface</HeadCell>
          <HeadCell figures className="max-mid:hidden">
            Area, {unit}
          </HeadCell>
          <HeadCell figures>
            takes at {bandWords(OCTAVE_BANDS[litBand]!)}, {unit}
          </HeadCell>
          <HeadCell figures>share</HeadCell>
        </tr>
      </thead>
      <tbody>
        {soakers.map((soaker, index) => (
          <Row key={soaker.id}>
            <RowHead className="flex items-center gap-2.5 [overflow-wrap:anywhere]">
              <Swatch soaker={soaker} />
              {soaker.name}
            </RowHead>
            <Cell figures className="max-mid:hidden">
              {soaker.size === null ? "" : write(soaker.size)}
            </Cell>
            <Cell figures>{write(soaker.areas[litBand] ?? null)}</Cell>
            <Cell figures>{shares ? percent(shares[index]!) : "?"}</Cell>
          </Row>
        ))}
        <Row className="font-semibold">
          <RowHead>Together</RowHead>
          <Cell className="max-mid:hidden" />
          <Cell figures>{whole === null ? "not known" : write(whole)}</Cell>
          <Cell figures>{shares ? percent(1) : "?"}</Cell>
        </Row>
      </tbody>
    </Table>
  );
}

const SIDE = 20;

function Swatch({ soaker }: { soaker: Soaker }) {
  const hatch = hatchOf(soaker);
  return (
    <svg width={SIDE} height={SIDE} viewBox={`0 0 ${SIDE} ${SIDE}`} aria-hidden="true" className="block flex-none">
      {hatch && <MaterialBox hatch={hatch} x={1} y={1} width={SIDE - 2} height={SIDE - 2} />}
      <rect x="1" y="1" width={SIDE - 2} height={SIDE - 2} fill="none" strokeWidth="1.4" className="stroke-ink" />
    </svg>
  );
}
