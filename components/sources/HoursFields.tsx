"use client";

import { useState } from "react";
import type { Source } from "@/lib/noise/sources";
import { SavedText } from "../ui/SavedText";
import { Button } from "../ui/Button";
import { readClock } from "../ui/clock";
import { leadOf } from "../walls/answer";
import { spotOf, type SourceDesk } from "./desk";
import { lastingWords, minutesShared, type Hours } from "./hours";

interface Props {
  desk: SourceDesk;
  source: Source;
}

/** From and until. Both make hours; one alone is kept here until the other is typed. */
export function HoursFields({ desk, source }: Props) {
  const stored = source.hours ?? null;
  const [half, setHalf] = useState<Partial<Hours>>(stored ?? {});
  const [seen, setSeen] = useState(stored);
  if (JSON.stringify(seen) !== JSON.stringify(stored)) {
    setSeen(stored);
    setHalf(stored ?? {});
  }
  const spot = spotOf(source);
  const change = (hours: Hours | null) => void desk.act(() => [{ act: "change", part: "sources", id: source.id, patch: { hours } }], spot);
  function type(part: Partial<Hours>) {
    const next = { ...half, ...part };
    setHalf(next);
    if (next.from && next.to) change({ from: next.from, to: next.to });
  }
  const error = (field: string) => desk.save.errorOf(spot, field);
  return (
    <section aria-labelledby="hours">
      <h3 id="hours" className="text-part">
        When is it at work?
      </h3>
      <div className="mt-2 grid grid-cols-2 gap-3">
        <SavedText label="From" value={half.from ?? ""} error={error("hours.from") ?? error("hours")} onCommit={(from) => type({ from: readClock(from) ?? from })} />
        <SavedText label="Until" value={half.to ?? ""} error={error("hours.to")} onCommit={(to) => type({ to: readClock(to) ?? to })} />
      </div>
      <p className="mt-2 text-second text-ink2">{hoursWords(stored, desk)}</p>
      {stored && (
        <Button className="mt-2" onClick={() => change(null)}>
          No hours said
        </Button>
      )}
    </section>
  );
}

/** How much of it lies in the hours of the leading limit. The weighing does not go by the clock, and this says so. */
export function hoursWords(hours: Hours | null, { answer }: Pick<SourceDesk, "answer">): string {
  const weighed = "Hours are shown here and laid beside the limit; they change no figure.";
  const lead = leadOf(answer);
  const limit = answer.plan.criteria.find(({ id }) => id === lead?.receiver.criterionId);
  if (!hours || !lead || !limit?.hours) return weighed;
  const shared = minutesShared(hours, limit.hours);
  const span = `the hours of the limit at ${lead.name}, ${limit.hours.from} to ${limit.hours.to}`;
  return shared > 0 ? `That is ${lastingWords(shared)} inside ${span}. ${weighed}` : `None of that is inside ${span}; it is weighed against that limit all the same. ${weighed}`;
}
