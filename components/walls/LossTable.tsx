import { BAND_COUNT, OCTAVE_BANDS } from "../../lib/noise/bands";
import type { Basis } from "../../lib/noise/spectrum";
import type { Out } from "../../lib/noise/verdict";
import { bandWords, formatNumber, oneDecimal, withUnit, type BasisWord } from "../format";
import { BasisMark } from "../marks/BasisMark";
import { Cell, HeadCell, Row, RowHead, Table } from "../ui/Table";

interface Props {
  loss: readonly Out[];
  doubts: readonly number[];
  bases: readonly Basis[];
  litBand: number;
}

/** The nine figures of the chart with what each rests on. */
export function LossTable({ loss, doubts, bases, litBand }: Props) {
  return (
    <Table>
      <thead>
        <tr>
          <HeadCell>Band</HeadCell>
          <HeadCell figures>Stops, dB</HeadCell>
          <HeadCell>Rests on</HeadCell>
        </tr>
      </thead>
      <tbody>
        {OCTAVE_BANDS.map((band, index) => (
          <Row key={band} lit={index === litBand}>
            <RowHead>{bandWords(band)}</RowHead>
            <Cell figures>{oneDecimal(loss[index] ?? "unknown")}</Cell>
            <Cell>
              <BasisMark
                basis={loss[index] === "unknown" ? "unknown" : (bases[index] ?? "unknown")}
                doubt={loss[index] === "unknown" ? undefined : doubts[index]}
              />
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

/** "Estimated at 31.5 Hz, calculated from 63 Hz up, give or take 5 dB at 63 Hz." */
export function basisSentence(
  { loss, bases, doubts }: Pick<Props, "loss" | "bases" | "doubts">,
  litBand: number,
): string {
  const runs: { basis: BasisWord; from: number; to: number }[] = [];
  bases.forEach((figure, index) => {
    const basis = loss[index] === "unknown" ? "unknown" : figure;
    const run = runs.at(-1);
    if (run?.basis === basis) run.to = index;
    else runs.push({ basis, from: index, to: index });
  });
  const words = runs.map(({ basis, from, to }) => `${basis} ${rangeWords(from, to)}`.trim()).join(", ");
  const doubt = doubts[litBand];
  const give =
    doubt === undefined || loss[litBand] === "unknown"
      ? ""
      : `; give or take ${withUnit(formatNumber(doubt, doubt < 2 ? 1 : 0), "dB")} at ${bandWords(OCTAVE_BANDS[litBand]!)}`;
  return `${words.charAt(0).toUpperCase()}${words.slice(1)}${give}.`;
}

function rangeWords(from: number, to: number): string {
  if (from === 0 && to === BAND_COUNT - 1) return "in every band";
  if (from === to) return `at ${bandWords(OCTAVE_BANDS[from]!)}`;
  if (to === BAND_COUNT - 1) return `from ${bandWords(OCTAVE_BANDS[from]!)} up`;
  return `from ${bandWords(OCTAVE_BANDS[from]!)} to ${bandWords(OCTAVE_BANDS[to]!)}`;
}
