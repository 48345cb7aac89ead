"use client";

import type { ReactNode } from "react";
import { useWidthClass } from "../ui/useWidthClass";
import type { WidthClass } from "../ui/widthClass";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { columnsOf, litColumnOf, type Column } from "./columns";
import { CrossCutDrawing } from "./CrossCutDrawing";
import type { Reading } from "./reading";
import { noListenerWords, slabWordsOf, type SlabWords } from "./sentence";
import { stationsOf } from "./stations";

const promised: Record<WidthClass, number> = { 390: 334, 720: 620, 1024: 494, 1440: 680 };
const heights: Record<WidthClass, number> = { 390: 236, 720: 270, 1024: 290, 1440: 330 };

interface Props {
  /** Null where nobody listens yet. */
  reading: Reading | null;
  /** The band whose levels stand at the stations; without it the leading one. */
  column?: Column;
  actions?: ReactNode;
  /** Over the sentence, in place of the words for the place. */
  place?: string;
  headingLevel?: 1 | 2;
}

function Sentence({ words, level }: { words: SlabWords; level: 1 | 2 }) {
  const Heading = level === 1 ? "h1" : "h2";
  return (
    <Heading id="verdict" tabIndex={-1} className="text-verdictPhone font-[640] tracking-[-.012em] desk:text-verdictDesk wide:text-verdict">
      {words.before}
      {words.figure && <span className="text-slablamp">{words.figure}</span>}
      {words.after}
    </Heading>
  );
}

function Cut({ reading, column }: { reading: Reading; column: Column }) {
  const widthClass = useWidthClass();
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 900);
  const { weighed, plan, criterion } = reading;
  if (!weighed.crossCut) return null;
  const source = plan.sources.find(({ id }) => id === weighed.crossCut?.source?.id);
  return (
    <div ref={place} className="min-w-0 self-end overflow-hidden">
      <p className="mb-2 text-second text-slabink2">
        Levels in {column.unit} {column.where}
      </p>
      <CrossCutDrawing
        cut={weighed.crossCut}
        stations={stationsOf(reading, column, widthClass === 390)}
        where={column.where}
        unit={column.unit}
        state={column.limit === null ? "not weighed" : column.state}
        sourceIsKit={source?.kind === "drum kit"}
        inBed={/^in bed\b/i.test(criterion?.place ?? "")}
        width={width}
        height={heights[widthClass]}
      />
    </div>
  );
}

/** Verdict sentence and cross-cut; night-coloured in both themes, for the question is about the night. */
export function NightSlab({ reading, column, actions, place, headingLevel = 1 }: Props) {
  const words = reading ? slabWordsOf(reading) : noListenerWords;
  const shown = reading ? (column ?? litColumnOf(columnsOf(reading.weighed), null, reading.weighed.band)) : undefined;
  return (
    <section aria-label="Verdict" className="on-slab grid gap-x-8 gap-y-5 rounded-sheet px-4 py-5 mid:p-7 desk:grid-cols-[minmax(0,25rem)_minmax(0,1fr)] wide:grid-cols-[minmax(0,36rem)_minmax(0,1fr)] wide:gap-x-12 wide:px-9">
      <div className="min-w-0">
        <p className="mb-2 text-second text-slabink2">{place ?? words.place}</p>
        <Sentence words={words} level={headingLevel} />
        {words.lines.map((line) => (
          <p key={line} className="mt-2.5 max-w-[56ch] text-base text-slabink2 mid:text-lead">
            {line}
          </p>
        ))}
        {words.notes.map((note) => (
          <p key={note} className="mt-2 max-w-[60ch] text-second text-slabink2">
            {note}
          </p>
        ))}
        {actions && <div className="screen-only mt-5 flex flex-wrap gap-2.5">{actions}</div>}
      </div>
      {reading && shown && <Cut reading={reading} column={shown} />}
    </section>
  );
}
