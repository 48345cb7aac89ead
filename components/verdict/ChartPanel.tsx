"use client";

import type { KeyboardEvent } from "react";
import { percent, wholeDecibels } from "../format";
import { useWidthClass } from "../ui/useWidthClass";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { promisedWidths } from "./axis";
import { columnSentence, inSentence } from "./chartWords";
import { countedWithout, isNumber, shareOf, weightedUnit, type Column } from "./columns";
import { FiguresAcross, FiguresDown } from "./FiguresTable";
import { HangingChart } from "./HangingChart";
import type { Reading } from "./reading";
import { Shares } from "./Shares";
import type { Lit } from "./useLit";

interface Props {
  lit: Lit;
  reading: Reading;
  column: Column;
}

/** What the charts show now, spoken after each key. */
function litSentence({ lit, column }: Props): string {
  const path = lit.path ? ` ${lit.path.name}: ${percent(shareOf(lit.path, column))} of it.` : "";
  return `${columnSentence(column)}.${path}`;
}

const countingUnit = ({ weighed }: Reading) => (weighed.weighted ? weightedUnit(weighed.metric) : "dB");

function GhostCaption({ lit, reading, column }: Props) {
  const silent = lit.path ? countedWithout(lit.path, column) : "unknown";
  if (!lit.path || !isNumber(silent)) return null;
  return <p className="px-4 text-least text-ink2">{`Dashed: ${wholeDecibels(silent)} ${countingUnit(reading)}, were ${inSentence(lit.path.name)} silent.`}</p>;
}

function headWords({ reading }: Props): { title: string; says: string } {
  const { weighed } = reading;
  if (weighed.metric === "none") return { title: "Level, band by band", says: "No limit yet: figures show the level, dB" };
  if (weighed.weighted) return { title: "Level by band, limit for the whole", says: `Bands count in ${countingUnit(reading)}; the whole shows the room left` };
  return { title: "Level and limit, band by band", says: "Figures show the room left, dB" };
}

/** Chart, shares and table under each other, one tab stop for the drawings: arrows choose band and path, Escape unlights. */
export function ChartPanel(props: Props) {
  const { lit, reading, column } = props;
  const narrow = useWidthClass() === 390;
  const [place, width] = useDrawnWidth<HTMLDivElement>(promisedWidths, 1060);
  const keys: Record<string, () => void> = {
    ArrowLeft: () => lit.stepColumn(-1),
    ArrowRight: () => lit.stepColumn(1),
    ArrowUp: () => lit.stepPath(-1),
    ArrowDown: () => lit.stepPath(1),
    Escape: lit.unlight,
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const act = keys[event.key];
    if (!act || event.altKey || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    act();
  };
  const { title, says } = headWords(props);
  return (
    <section aria-labelledby="bands" className="min-w-0 pb-5 pt-4 mid:px-6.5 mid:pb-6.5 mid:pt-6.5">
      <div className="mb-3 flex flex-wrap items-baseline justify-between gap-x-4 max-mid:px-4">
        <h2 id="bands" className="text-section">{title}</h2>
        <p className="text-second text-ink3">{says}</p>
      </div>
      {narrow && <GhostCaption {...props} />}
      <div ref={place} className="max-mid:mx-3">
        <div role="application" aria-roledescription="chart" aria-label="Bands and paths. Left and right choose the band, up and down the path, Escape unlights." tabIndex={0} onKeyDown={onKeyDown} className="overflow-hidden rounded-tag">
          <HangingChart columns={lit.columns} lit={column} path={lit.path} trial={lit.trial} limitName={reading.criterion?.name ?? null} unit={countingUnit(reading)} width={width} onBand={lit.lightColumn} />
          <Shares columns={lit.columns} paths={reading.weighed.paths} lit={column} litId={lit.path?.id ?? null} width={width} onBand={lit.lightColumn} onPath={lit.lightPath} />
        </div>
        {!narrow && <FiguresAcross columns={lit.columns} lit={column} counting={reading.weighed.weighted ? countingUnit(reading) : null} />}
      </div>
      {narrow && (
        <div className="mt-4">
          <FiguresDown columns={lit.columns} lit={column} counting={reading.weighed.weighted ? countingUnit(reading) : null} onBand={lit.lightColumn} />
        </div>
      )}
      <p className="sr-only" aria-live="polite">{litSentence(props)}</p>
      <p className="mt-4 max-w-[70ch] text-second text-ink2 max-mid:px-4 mid:ml-[84px] mid:mr-[52px]">
        The hatched columns divide the <b>energy</b> that arrives, so the parts add up to the whole. Levels do not: two equal paths make 3&nbsp;dB more, never double.
        {!narrow && " Read the foot of the lit part on the right-hand ruler to see what silencing it would bring."}
      </p>
    </section>
  );
}
