import type { Figures } from "./figures";

interface Unit {
  name: string;
  /** How many SI units one of these is. */
  per: number;
  /** Shown where SI is 0: degrees only. */
  from?: number;
}

type Pair = Record<Figures["units"], Unit>;

const FOOT = 0.3048;
const INCH = 0.0254;
const POUND = 0.45359237;

/** What fields hold, kept in SI: m, m2, m3, kg/m2, degrees C, m3/s. Exact by definition of the foot and the pound. */
export const quantities = {
  length: { metric: { name: "m", per: 1 }, us: { name: "ft", per: FOOT } },
  thickness: { metric: { name: "mm", per: 0.001 }, us: { name: "in", per: INCH } },
  area: { metric: { name: "m²", per: 1 }, us: { name: "ft²", per: FOOT ** 2 } },
  smallArea: { metric: { name: "cm²", per: 0.0001 }, us: { name: "in²", per: INCH ** 2 } },
  volume: { metric: { name: "m³", per: 1 }, us: { name: "ft³", per: FOOT ** 3 } },
  surfaceMass: { metric: { name: "kg/m²", per: 1 }, us: { name: "lb/ft²", per: POUND / FOOT ** 2 } },
  temperature: { metric: { name: "°C", per: 1 }, us: { name: "°F", per: 5 / 9, from: 32 } },
} as const satisfies Record<string, Pair>;
export type Quantity = keyof typeof quantities;

const unitOf = (quantity: Quantity, units: Figures["units"]): Unit => quantities[quantity][units];

export const unitName = (quantity: Quantity, units: Figures["units"]): string => unitOf(quantity, units).name;

/** SI to the shown unit, freed of the last digits that only the change of unit brought. */
export function toShown(quantity: Quantity, units: Figures["units"], si: number): number {
  const { per, from = 0 } = unitOf(quantity, units);
  return Number((si / per + from).toPrecision(12));
}

export function toSi(quantity: Quantity, units: Figures["units"], shown: number): number {
  const { per, from = 0 } = unitOf(quantity, units);
  return Number(((shown - from) * per).toPrecision(12));
}
