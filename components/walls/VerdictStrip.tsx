"use client";

import Link from "next/link";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import { elementAddress, limitsAddress } from "../addresses";
import { bandWords, formatNumber, percent, withUnit } from "../format";
import { MarginWords } from "../marks/MarginWords";
import { SmallBeam } from "../marks/SmallBeam";
import type { Answer } from "../state/plan";
import { useWidthClass } from "../ui/useWidthClass";
import { leadOf, loudestPath, movedBy, type Lead } from "./answer";
import { movementWords } from "./movementWords";

interface Props {
  answer: Answer;
  /** The answer before the last change made here. */
  before?: Answer;
  /** A save is under way: the old figures stay, but pale. */
  weighing?: boolean;
  projectId: string;
  budgetHref: string;
  /** The element whose page this is: no link to itself. */
  elementId?: string;
}

/** The worst listener, always in view: what the last change did is read here. */
export function VerdictStrip({ answer, before, weighing = false, projectId, budgetHref, elementId }: Props) {
  const phone = useWidthClass() === 390;
  const lead = leadOf(answer);
  return (
    <div
      id="verdict"
      tabIndex={-1}
      className="sticky top-0 z-20 print:static mb-3 border-b border-edge bg-sheet mid:mb-5 mid:rounded-sheet mid:border max-mid:-mx-3"
    >
      <div className="flex flex-wrap items-center gap-x-5 gap-y-1 px-3 py-2 mid:px-4">
        <div role="status" aria-busy={weighing} className="min-w-0 flex-[1_1_16rem]">
          {lead ? (
            <LeadWords lead={lead} answer={answer} before={before} weighing={weighing} />
          ) : (
            <p>
              <Link href={limitsAddress(projectId)}>Add a listener</Link> to weigh it.
            </p>
          )}
        </div>
        {lead && !phone && (
          <SmallBeam
            state={lead.state}
            margin={lead.receiver.margin ?? undefined}
            doubt={lead.receiver.doubt ?? undefined}
            stale={weighing}
          />
        )}
        {lead && <Loudest lead={lead} answer={answer} projectId={projectId} elementId={elementId} />}
        <Link
          href={budgetHref}
          className="hidden min-h-10 items-center text-second font-semibold mid:inline-flex"
        >
          Budget
        </Link>
      </div>
    </div>
  );
}

function LeadWords({
  lead,
  answer,
  before,
  weighing,
}: {
  lead: Lead;
  answer: Answer;
  before?: Answer;
  weighing: boolean;
}) {
  const { margin, doubt, band, unproven, weighted } = lead.receiver;
  const moved = before ? movedBy(before, answer) : null;
  const tail = [
    band !== null && margin !== null && `${weighted ? "loudest at" : "at"} ${bandWords(band)}`,
    doubt !== null && margin !== null && `give or take ${withUnit(formatNumber(doubt), "dB")}`,
  ].filter(Boolean);
  return (
    <>
      <p className={weighing ? "opacity-60" : undefined}>
        <b>{lead.name}</b>{" "}
        <MarginWords state={lead.state} margin={margin ?? undefined} className="align-top text-lead" />{" "}
        <span className="text-second text-ink2">{tail.join(", ")}</span>
      </p>
      {moved !== null && !weighing && (
        <p className="text-second font-semibold">{capital(movementWords(moved))}.</p>
      )}
      {weighing && <p className="text-second text-ink2">Weighing.</p>}
      {unproven && <p className="text-least text-ink2">Rests on estimates; it cannot be signed.</p>}
    </>
  );
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

/** What carries most of it now, with the way to its page. */
function Loudest({
  lead,
  answer,
  projectId,
  elementId,
}: {
  lead: Lead;
  answer: Answer;
  projectId: string;
  elementId?: string;
}) {
  const loudest = loudestPath(lead);
  if (!loudest) return null;
  const { path, share } = loudest;
  const element = answer.plan.elements.find(({ id }) => id === path.partId);
  const where = lead.receiver.weighted ? "of the whole" : `at ${bandWords(OCTAVE_BANDS[lead.bandIndex]!)}`;
  return (
    <p className="text-second text-ink2">
      {share > 0.5 ? "Most of it" : "The largest part"} comes by{" "}
      {element && element.id !== elementId ? (
        <Link href={elementAddress(projectId, element.id)} className="font-semibold text-ink">
          {path.name}
        </Link>
      ) : (
        <b className="font-semibold text-ink">{path.name}</b>
      )}
      , {percent(share)} {where}
    </p>
  );
}
