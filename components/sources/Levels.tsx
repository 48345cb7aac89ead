"use client";

import { useState } from "react";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { Source } from "@/lib/noise/sources";
import { bandWords, formatNumber, listWords, withUnit, wholeDecibels } from "../format";
import { BasisMark } from "../marks/BasisMark";
import { Disclosure } from "../ui/Disclosure";
import { NineBandRow } from "../ui/NineBandRow";
import { spotOf, type SourceDesk } from "./desk";
import { LevelChart } from "./LevelChart";
import { howKnown, provenanceWords } from "./sourceWords";
import { bandsOf, litBandOf, totalOf } from "./spectrum";

interface Props {
  desk: SourceDesk;
  source: Source;
}

const DOUBT_TYPED = "; doubt as typed here";

/** The nine levels of a source, drawn and as fields, with what they rest on. */
export function Levels({ desk, source }: Props) {
  const { act, save, locked, aWeights } = desk;
  const [entered, setEntered] = useState<number>();
  const doubts = desk.answer.verdict.sources?.[source.id]?.doubts ?? [];
  const levels = bandsOf(source.power);
  const lit = entered ?? litBandOf(source);
  const spot = spotOf(source);
  const change = (patch: Record<string, unknown>) => void act(() => [{ act: "change", part: "sources", id: source.id, patch }], spot);
  const total = totalOf(levels);
  const unknown = OCTAVE_BANDS.filter((_, i) => levels[i] === null).map(bandWords);

  /** Levels stay whose they are; only the doubt is one's own, and the provenance says so. */
  function setDeviation(values: readonly (number | "silent" | null)[]) {
    const { basis, provenance } = source;
    const clause = provenance.clause.endsWith(DOUBT_TYPED) ? provenance.clause : `${provenance.clause.slice(0, 400 - DOUBT_TYPED.length)}${DOUBT_TYPED}`;
    const deviation = values.every((value) => value === null) ? null : values;
    change({ deviation, basis, provenance: { ...provenance, clause: deviation ? clause : provenance.clause.replace(DOUBT_TYPED, "") } });
  }

  return (
    <>
      <div className="mb-3 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
        <h2 className="min-w-0 break-words text-section">{source.name}, sound power</h2>
        <span className="text-second text-ink2">{total === null ? "no level yet" : `${withUnit(formatNumber(total), "dB")} in all; the grey block is the doubt`}</span>
      </div>
      <LevelChart name={source.name} levels={levels} doubts={doubts} aWeights={aWeights} lit={lit} />
      {locked ? (
        <BandTexts levels={levels} />
      ) : (
        <NineBandRow
          key={source.id}
          className="mt-4"
          label="Sound power, re 1 pW"
          unit="dB"
          min={-100}
          max={160}
          silence
          values={levels}
          lit={lit}
          onLight={setEntered}
          hint="Arrow keys go from band to band. Nine values pasted into any field fill the row. Leave a band empty where it is not known. What you type here stands as your own figure, and no longer as the library’s or the meter’s."
          error={save.errorOf(spot, "power")}
          errorOf={(band) => save.errorOf(spot, `power.${band}`)}
          onCommit={(power) => change({ power: power.every((level) => level === null) ? null : power })}
        />
      )}
      <p className="mt-3 flex flex-wrap items-center gap-x-3 text-second text-ink2">
        <BasisMark {...howKnown(source, doubts)} />
        <span className="min-w-0 break-words">{provenanceWords(source)}</span>
      </p>
      {unknown.length > 0 && (
        <p className="mt-2 text-second font-semibold text-ink2">
          Not known: {listWords(unknown)}. An unknown band can be over, but never under.
        </p>
      )}
      {!locked && source.power && (
        <Disclosure summary="Doubt of each band" className="mt-2">
          <NineBandRow
            key={source.id}
            label="Standard deviation, plus or minus"
            unit="dB"
            min={0}
            max={30}
            step={0.5}
            values={source.deviation ?? levels.map(() => null)}
            hint={`Empty follows what the figures rest on. Counted now: ${doubts.map((doubt) => formatNumber(doubt, doubt % 1 ? 1 : 0)).join(", ")}.`}
            error={save.errorOf(spot, "deviation")}
            errorOf={(band) => save.errorOf(spot, `deviation.${band}`)}
            onCommit={setDeviation}
          />
        </Disclosure>
      )}
    </>
  );
}

/** The same figures for who may not change them. */
export function BandTexts({ levels }: { levels: readonly (number | "silent" | null)[] }) {
  return (
    <dl className="mt-4 grid grid-cols-5 gap-x-2 gap-y-3 text-center mid:grid-cols-9">
      {OCTAVE_BANDS.map((band, i) => (
        <div key={band}>
          <dt className="text-second text-ink2">{bandWords(band)}</dt>
          <dd className="font-semibold">{levels[i] === null ? "not known" : wholeDecibels(levels[i]!)}</dd>
        </div>
      ))}
    </dl>
  );
}
