"use client";

import { useState } from "react";
import { keepTyped } from "../plan/keepTyped";
import { QuantityField } from "../ui/QuantityField";

type Position = [number, number, number];
const AXES = [
  { label: "East, x", min: -1000, max: 1000 },
  { label: "North, y", min: -1000, max: 1000 },
  { label: "Height, z", min: -20, max: 100 },
] as const;

interface Props {
  position: Position | null;
  errorOf: (field: string) => string | undefined;
  onCommit: (position: Position) => void;
}

/** Where a thing stands on the lot. It has a place once all three figures are there; until then nothing is saved. */
export function PositionFields({ position, errorOf, onCommit }: Props) {
  const [stored, setStored] = useState(position);
  const [draft, setDraft] = useState<(number | null)[]>(position ?? [null, null, null]);
  if (JSON.stringify(stored) !== JSON.stringify(position)) {
    setStored(position);
    setDraft(position ? keepTyped(draft, position, stored) : draft);
  }
  function commit(axis: number, value: number | null) {
    const next = draft.map((one, i) => (i === axis ? value : one));
    setDraft(next);
    const [x, y, z] = next;
    if (typeof x === "number" && typeof y === "number" && typeof z === "number") onCommit([x, y, z]);
  }
  const missing = position === null && draft.some((one) => one !== null);
  return (
    <fieldset className="min-w-0">
      <legend className="sr-only">Place</legend>
      <div className="grid grid-cols-2 items-start gap-x-3 gap-y-3 mid:grid-cols-3 desk:grid-cols-2">
        {AXES.map(({ label, min, max }, axis) => (
          <QuantityField
            key={label}
            label={label}
            quantity="length"
            steps={{ metric: 0.1, us: 0.5 }}
            min={min}
            max={max}
            optional={position === null}
            value={draft[axis]}
            error={errorOf(`position.${axis}`) ?? (axis === 0 ? errorOf("position") : undefined)}
            onCommit={(value) => commit(axis, value)}
          />
        ))}
      </div>
      {missing && <p className="mt-1.5 text-second text-ink2">All three are needed for a place.</p>}
    </fieldset>
  );
}
