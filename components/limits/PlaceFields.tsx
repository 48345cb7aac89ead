"use client";

import { useState } from "react";
import { keepTyped } from "../plan/keepTyped";
import { QuantityField } from "../ui/QuantityField";

type Place = [number, number, number];
type Half = [number | null, number | null, number | null];

interface Props {
  position: Place | null;
  error?: string;
  onChange: (position: Place) => void;
}

const isPlace = (half: Half): half is Place => half.every((at) => at !== null);
const labels = ["East", "North", "Height over ground"] as const;

/** Where a listener is on the lot: east, north and up. Saved once all three are known. */
export function PlaceFields({ position, error, onChange }: Props) {
  const [stored, setStored] = useState(position);
  const [half, setHalf] = useState<Half>(position ?? [null, null, null]);
  if (JSON.stringify(stored) !== JSON.stringify(position)) {
    setStored(position);
    setHalf(position ? (keepTyped(half, position, stored) as Half) : [null, null, null]); // three stay three
  }
  function type(axis: number, value: number | null) {
    const next = half.map((at, i) => (i === axis ? value : at)) as Half;
    setHalf(next);
    if (isPlace(next)) onChange(next);
  }
  return (
    <div className="grid grid-cols-2 gap-3 mid:grid-cols-3">
      {labels.map((label, axis) => (
        <QuantityField
          key={label}
          label={label}
          quantity="length"
          steps={{ metric: 0.1, us: 0.5 }}
          min={axis === 2 ? -20 : -1000}
          max={axis === 2 ? 100 : 1000}
          optional={position === null}
          value={half[axis]}
          error={axis === 0 ? error : undefined}
          onCommit={(value) => type(axis, value)}
        />
      ))}
    </div>
  );
}
