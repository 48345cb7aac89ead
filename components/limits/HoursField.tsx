"use client";

import { useState } from "react";
import type { Criterion } from "@/lib/noise/plan";
import { hoursWords } from "./limitWords";
import { readClock } from "../ui/clock";
import { SavedText } from "../ui/SavedText";
import { Segments } from "./Segments";

type Hours = Criterion["hours"];

const WIDTH = 240;
const hourOf = (clock: string): number => {
  const [hours = 0, minutes = 0] = clock.split(":").map(Number);
  return hours + minutes / 60;
};

/** Where the block lies on a day's line; over midnight it is in two. */
function stretches(hours: Hours): [number, number][] {
  if (!hours) return [[0, 24]];
  const [from, to] = [hourOf(hours.from), hourOf(hours.to)];
  return from < to ? [[from, to]] : [[0, to], [from, 24]];
}

/** The day from midnight to midnight, solid where the limit holds. */
export function HoursStrip({ hours }: { hours: Hours }) {
  const place = (hour: number) => 4 + ((WIDTH - 8) * hour) / 24;
  return (
    <svg width="100%" height="52" viewBox={`0 0 ${WIDTH} 52`} preserveAspectRatio="xMinYMin meet" role="img" aria-label={`Holds ${hours ? `from ${hoursWords(hours)}` : "at all hours"}`} className="block max-w-[240px]">
      {stretches(hours).map(([from, to]) => (
        <rect key={from} x={place(from)} y="4" width={Math.max(0, place(to) - place(from))} height="20" className="fill-ink" />
      ))}
      <path d={`M${place(0)} 25H${place(24)}`} strokeWidth="2" className="stroke-ink" />
      <path d={Array.from({ length: 25 }, (_, hour) => `M${place(hour)} 25v${hour % 6 ? 4 : 8}`).join("")} className="stroke-ink" />
      {[0, 6, 12, 18, 24].map((hour) => (
        <text key={hour} x={place(hour)} y="47" fontSize="12" textAnchor={hour === 0 ? "start" : hour === 24 ? "end" : "middle"} className="fill-ink2">
          {hour}
        </text>
      ))}
    </svg>
  );
}

interface Props {
  hours: Hours;
  error?: string;
  onChange: (hours: Hours) => void;
}

/** Hours a limit holds. Two times, or all day. */
export function HoursField({ hours, error, onChange }: Props) {
  const [set, setSet] = useState(hours !== null);
  const [half, setHalf] = useState<{ from: string; to: string }>({ from: hours?.from ?? "", to: hours?.to ?? "" });
  const [complaint, setComplaint] = useState<string>();
  const [stored, setStored] = useState(hours);
  if (JSON.stringify(stored) !== JSON.stringify(hours)) {
    setStored(hours);
    setSet(hours !== null);
    if (hours) setHalf(hours);
  }
  function type(end: "from" | "to", words: string) {
    const clock = readClock(words);
    setComplaint(clock === undefined ? "Type a time such as 22:00." : undefined);
    const next = { ...half, [end]: clock ?? words };
    setHalf(next);
    if (readClock(next.from) && readClock(next.to)) onChange(next);
  }
  return (
    <div>
      <HoursStrip hours={hours} />
      <Segments
        label="Hours it holds"
        className="mt-3"
        value={set ? "set" : "all"}
        choices={[
          { value: "all", label: "All hours" },
          { value: "set", label: "From and to" },
        ]}
        error={error}
        onChoose={(choice) => {
          setSet(choice === "set");
          if (choice === "all") onChange(null);
          else if (readClock(half.from) && readClock(half.to)) onChange(half);
        }}
      />
      {set && (
        <div className="mt-3 grid grid-cols-2 gap-3">
          <SavedText label="From" value={half.from} error={half.from && !readClock(half.from) ? complaint : undefined} onCommit={(words) => type("from", words)} />
          <SavedText label="To" value={half.to} error={half.to && !readClock(half.to) ? complaint : undefined} onCommit={(words) => type("to", words)} hint={hours && hours.from >= hours.to ? "Over midnight." : undefined} />
        </div>
      )}
    </div>
  );
}
