"use client";

import type { ComponentProps } from "react";
import { useFigures } from "./figures";
import { NumberField } from "./NumberField";
import { toShown, toSi, unitName, type Quantity } from "./quantities";

type NumberProps = ComponentProps<typeof NumberField>;

type Props = Omit<NumberProps, "unit" | "step"> & {
  quantity: Quantity;
  /** Steps of the arrow keys in metric and in US units. */
  steps?: Record<"metric" | "us", number>;
};

/** A number in the reader's units. Value, bounds and what is handed over are SI. */
export function QuantityField({ quantity, steps, value, min, max, caution, onCommit, ...rest }: Props) {
  const { units } = useFigures();
  const shown = (si: number | undefined) => (si === undefined ? undefined : toShown(quantity, units, si));
  return (
    <NumberField
      {...rest}
      unit={unitName(quantity, units)}
      step={steps?.[units]}
      value={typeof value === "number" ? toShown(quantity, units, value) : value}
      min={shown(min)}
      max={shown(max)}
      caution={caution && ((figure) => caution(toSi(quantity, units, figure)))}
      onCommit={(figure) => onCommit(figure === null ? null : toSi(quantity, units, figure))}
    />
  );
}
