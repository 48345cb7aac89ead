/** Gaps and leaks are stored in m² and shown in cm². The rounding only takes off the last binary digits. */
export const toSquareCentimetres = (squareMetres: number): number =>
  Number((squareMetres * 1e4).toPrecision(12));
export const toSquareMetres = (squareCentimetres: number): number =>
  Number((squareCentimetres / 1e4).toPrecision(12));

/** Lengths are stored in m and shown in mm. */
export const toMillimetres = (metres: number): number => Number((metres * 1000).toPrecision(12));
