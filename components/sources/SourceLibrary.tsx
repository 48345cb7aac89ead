"use client";

import type { SourceRecord } from "@/lib/noise/library";
import type { Source } from "@/lib/noise/sources";
import { formatNumber, withUnit } from "../format";
import { BasisMark } from "../marks/BasisMark";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { Disclosure } from "../ui/Disclosure";
import { Tag } from "../ui/Tag";
import { takeRecord } from "./changes";
import { placementOf, spotOf, type SourceDesk } from "./desk";
import { howKnown, knownWords, provenanceWords } from "./sourceWords";
import { loudestBand } from "./spectrum";

interface Props {
  desk: SourceDesk;
  source: Source;
}

const sameFigures = (one: Source["power"], other: Source["power"]) => JSON.stringify(one) === JSON.stringify(other);

/** Records this source may take its figures from; what it has now stands first and stays until another is chosen. */
export function SourceLibrary({ desk, source }: Props) {
  const placement = placementOf(desk, source.kind);
  const records = desk.library.filter(({ kind, power }) => power && placementOf(desk, kind) === placement);
  const inUse = records.find(({ power, basis, provenance }) => sameFigures(power, source.power) && basis === source.basis && provenance.document === source.provenance.document);
  const doubts = desk.answer.verdict.sources?.[source.id]?.doubts;
  const spot = `library ${source.id}`;

  function use(record: SourceRecord) {
    const { changes, undo } = takeRecord(source, record);
    void desk.act(changes, spot, undo);
  }

  const others = records.filter(({ kind }) => kind !== source.kind);
  const lineOf = (record: SourceRecord) => (
    <Line
      key={record.key}
      name={record.name}
      figures={record}
      doubt={doubtOf(record.power, record.deviation)}
      lit={record === inUse}
      beside={
        record === inUse ? (
          <InUse />
        ) : (
          !desk.locked && (
            <Button onClick={() => use(record)} aria-label={`Use the figures of ${record.name}`}>
              Use
            </Button>
          )
        )
      }
    />
  );
  return (
    <>
      <ul className="border-t-2 border-ink">
        {!inUse && <Line name="As it stands here" figures={source} doubt={doubtOf(source.power, doubts)} beside={<InUse />} lit />}
        {records.filter(({ kind }) => kind === source.kind).map(lineOf)}
      </ul>
      {others.length > 0 && (
        <Disclosure summary="Records of other kinds" open={inUse && others.includes(inUse)} className="mt-2">
          <ul className="text-ink">{others.map(lineOf)}</ul>
        </Disclosure>
      )}
      {desk.save.errorOf(spot) && <p className="mt-2 text-second font-semibold text-over">{desk.save.errorOf(spot)}</p>}
      {desk.save.errorOf(spotOf(source), "libraryKey") && <p className="mt-2 text-second font-semibold text-over">{desk.save.errorOf(spotOf(source), "libraryKey")}</p>}
    </>
  );
}

const doubtOf = (power: Source["power"], doubts: readonly (number | null)[] | null | undefined): number | undefined => doubts?.[loudestBand(power) ?? 1] ?? undefined;

const InUse = () => <Tag icon={<Icon name="tick" size={14} />}>In use</Tag>;

interface LineProps {
  name: string;
  figures: Pick<Source, "power" | "basis" | "provenance">;
  doubt?: number;
  lit?: boolean;
  beside: React.ReactNode;
}

/** One set of figures: what it is, what it rests on, how many bands it knows, and its doubt. */
export function Line({ name, figures, doubt, lit = false, beside }: LineProps) {
  const known = howKnown(figures, undefined);
  return (
    <li className={`flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule px-2.5 py-2.5 ${lit ? "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)]" : ""}`}>
      <div className="min-w-0 flex-[1_1_14rem]">
        <p className="break-words font-semibold">{name}</p>
        <p className="break-words text-second text-ink2">{provenanceWords(figures)}</p>
      </div>
      <div className="flex flex-none flex-wrap items-center gap-x-4 text-second text-ink2">
        <BasisMark {...known} />
        <span className="whitespace-nowrap">{knownWords(figures.power)}</span>
        <span className="whitespace-nowrap">{doubt === undefined ? "doubt not said" : `± ${withUnit(formatNumber(doubt, doubt % 1 ? 1 : 0), "dB")}`}</span>
      </div>
      <div className="ml-auto flex-none">{beside}</div>
    </li>
  );
}
