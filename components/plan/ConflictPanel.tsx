"use client";

import { useEffect, useRef } from "react";
import { Button } from "../ui/Button";

interface Props {
  /** Who changed it in the meantime, and how long ago in words. */
  name: string;
  when: string;
  label: string;
  mine: string;
  theirs: string;
  saving: boolean;
  onKeep: () => void;
  onTake: () => void;
}

/** Two people changed one thing: both values side by side, and the reader decides. Nothing is overwritten before. */
export function ConflictPanel({ name, when, label, mine, theirs, saving, onKeep, onTake }: Props) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  return (
    <section
      aria-labelledby="conflict"
      className="mb-5 rounded-control border border-ink bg-sheet p-4 mid:p-5"
    >
      <h2 id="conflict" ref={heading} tabIndex={-1} className="text-part">
        {name} changed this {when}. Keep yours or take theirs?
      </h2>
      <dl className="mt-3 grid gap-x-8 gap-y-3 mid:grid-cols-2">
        <Side heading={`${label}, yours`} value={mine} />
        <Side heading={`${label}, from ${name}`} value={theirs} />
      </dl>
      <div className="mt-4 flex flex-wrap gap-2">
        <Button look="ink" disabled={saving} onClick={onKeep}>
          Keep mine
        </Button>
        <Button disabled={saving} onClick={onTake}>
          Take theirs
        </Button>
      </div>
    </section>
  );
}

function Side({ heading, value }: { heading: string; value: string }) {
  return (
    <div className="border-t-2 border-ink pt-2">
      <dt className="text-second text-ink2">{heading}</dt>
      <dd className="text-lead font-semibold">{value}</dd>
    </div>
  );
}
