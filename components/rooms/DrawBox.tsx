"use client";

import { useState } from "react";
import { Button } from "../ui/Button";
import { QuantityField } from "../ui/QuantityField";
import type { Size } from "./room";

interface Props {
  error?: string;
  onDraw: (size: Size) => void;
}

const labels = ["Inside width", "Inside depth", "Height"] as const;

/** Three figures that make a room without a size drawable; it is drawn when all three are there. */
export function DrawBox({ error, onDraw }: Props) {
  const [typed, setTyped] = useState<(number | null)[]>([null, null, null]);
  const size = typed.every((figure) => figure !== null) ? (typed as Size) : undefined; // each is a figure now
  return (
    <div>
      <div className="grid grid-cols-2 gap-4 mid:grid-cols-3">
        {labels.map((label, side) => (
          <QuantityField
            key={label}
            label={label}
            quantity="length"
            optional
            min={0.1}
            max={100}
            value={typed[side]}
            onCommit={(value) => setTyped(typed.map((one, index) => (index === side ? value : one)))}
          />
        ))}
      </div>
      <Button className="mt-3" look="ink" reason={size ? undefined : "Type all three first."} onClick={() => size && onDraw(size)}>
        Draw it
      </Button>
      {error && <p className="mt-2 text-second font-semibold text-over">{error}</p>}
    </div>
  );
}
