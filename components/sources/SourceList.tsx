"use client";

import clsx from "clsx";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { Source } from "@/lib/noise/sources";
import { bandWords, wholeDecibels, withUnit } from "../format";
import { BasisMark } from "../marks/BasisMark";
import { useRoving } from "../verdict/useRoving";
import type { SourceDesk } from "./desk";
import { HourAxis, HourStrip } from "./HourStrip";
import { limitHours, type Hours } from "./hours";
import { howKnown, whereWords } from "./sourceWords";
import { loudestBand } from "./spectrum";

interface Props {
  desk: SourceDesk;
  litId: string | undefined;
  onLight: (id: string) => void;
  /** Enter: on to the fields of the lit source. */
  onOpen: () => void;
}

const columns =
  "grid grid-cols-[minmax(0,1fr)_auto_auto] gap-x-4 desk:grid-cols-[minmax(0,1.1fr)_minmax(0,1.9fr)_64px_64px_minmax(0,1.4fr)] desk:gap-x-6";

/** Every source with its hours under one axis: one tab stop, arrows move the lit row, Enter opens it. */
export function SourceList({ desk, litId, onLight, onOpen }: Props) {
  const { plan, verdict } = desk.answer;
  const lit = plan.sources.findIndex(({ id }) => id === litId);
  const limits = limitHours(plan);
  const { list, onKeyDown } = useRoving({ items: plan.sources, lit, onLight: ({ id }) => onLight(id), onEnter: onOpen });
  return (
    <>
      <ColumnHeads />
      <ul ref={list} role="listbox" aria-label="Sources" onKeyDown={onKeyDown}>
        {plan.sources.map((source, index) => (
          <Row
            key={source.id}
            source={source}
            where={whereWords(source, plan, desk)}
            limits={limits}
            doubts={verdict.sources?.[source.id]?.doubts}
            lit={index === lit}
            tabbable={index === Math.max(0, lit)}
            onLight={() => onLight(source.id)}
          />
        ))}
      </ul>
      <p className="border-t border-rule px-4 py-4 text-second text-ink2 mid:px-6.5">
        Solid: at work. Dashed: no hours said.{limits.length > 0 && ` Grey ground: hours of the limits, ${limits.map(({ from, to }) => `${from} to ${to}`).join(", ")}.`} Hours are
        shown, not weighed: what is weighed at once stands in the situations below.
      </p>
    </>
  );
}

function ColumnHeads() {
  const head = "hidden self-end text-second font-semibold text-ink2 desk:block";
  return (
    <div aria-hidden="true" className={clsx(columns, "mx-4 border-b-2 border-ink pt-5 mid:mx-6.5 max-desk:pb-0 desk:pb-2")}>
      <span className={head}>Source</span>
      <span className="max-desk:col-span-full">
        <HourAxis />
      </span>
      <span className={clsx(head, "text-right")}>Loudest</span>
      <span className={clsx(head, "text-right")}>Power</span>
      <span className={head}>How well known</span>
    </div>
  );
}

interface RowProps {
  source: Source;
  where: string;
  limits: readonly Hours[];
  doubts?: readonly number[];
  lit: boolean;
  tabbable: boolean;
  onLight: () => void;
}

function Row({ source, where, limits, doubts, lit, tabbable, onLight }: RowProps) {
  const band = loudestBand(source.power);
  const loudest = band === null ? "–" : bandWords(OCTAVE_BANDS[band]!);
  const level = band === null ? "–" : withUnit(wholeDecibels(source.power![band]!), "dB");
  const known = howKnown(source, doubts);
  return (
    <li
      role="option"
      aria-selected={lit}
      aria-label={spoken(source, where, band === null ? undefined : `loudest at ${loudest} with ${level}`)}
      tabIndex={tabbable ? 0 : -1}
      onClick={onLight}
      className={clsx(
        columns,
        "cursor-pointer items-center gap-y-1 border-t border-rule px-4 py-2.5 -outline-offset-2 first:border-t-0 focus-visible:outline-2 focus-visible:outline-ink mid:px-6.5",
        lit ? "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)]" : "hover:bg-well",
      )}
    >
      <span className="min-w-0">
        <span className="block break-words font-semibold">{source.name}</span>
        <span className="block break-words text-second text-ink2">{where}</span>
      </span>
      <span className="order-1 col-span-full min-w-0 desk:order-none desk:col-auto">
        <HourStrip hours={source.hours ?? null} limits={limits} />
      </span>
      <span className="whitespace-nowrap text-right">{loudest}</span>
      <span className="whitespace-nowrap text-right">{level}</span>
      <span className="order-2 col-span-full min-w-0 desk:order-none desk:col-auto">
        <BasisMark {...known} />
      </span>
    </li>
  );
}

function spoken({ name, hours }: Source, where: string, loudest?: string): string {
  const at = hours ? `at work from ${hours.from} to ${hours.to}` : "no hours said";
  return [name, where, loudest ?? "no figures yet", at].join(", ");
}
