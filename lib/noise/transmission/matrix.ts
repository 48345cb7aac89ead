// Plain real and imaginary parts: these run some 40 000 times for one wall.
import type { FluidLayer } from "./fluid";
import type { StudSpring } from "./studs";

/**
 * Complex 2 x 2 matrix [a b; c d] in a row, each real then imaginary, on pressure and normal velocity. Allard and
 * Atalla, Propagation of Sound in Porous Media, chapter 11, from memory; solver method, section 2.3.
 */
export type Matrix = Float64Array;

// Where the four entries stand in the row. Not exported: an imported index doubles the time of a wall.
const A = 0;
const B = 2;
const C = 4;
const D = 6;

const LEAST_PHASE = -30; // Im(k_z d): beyond it the exponentials overflow and nothing audible is left

/**
 * The layer at `kx2`, the squared wavenumber along it in 1/m²: [cos k_z d, j Z sin k_z d; (j/Z) sin k_z d, cos k_z d]
 * with k_z = sqrt(k_f² - k_x²), Im k_z <= 0, and Z = Z_f k_f/k_z.
 */
export function setLayer(
  m: Matrix,
  { thickness, wavenumber: [kr, ki], impedance: [zr, zi] }: FluidLayer,
  kx2: number,
): void {
  const u = kr * kr - ki * ki - kx2;
  const v = 2 * kr * ki;
  const size = Math.sqrt(u * u + v * v);
  const nr = u > 0 ? Math.sqrt((size + u) / 2) : v / (-2 * Math.sqrt((size - u) / 2));
  const ni = u > 0 ? v / (2 * nr) : -Math.sqrt((size - u) / 2);
  const fr = zr * kr - zi * ki;
  const fi = zr * ki + zi * kr;
  const impedanceR = (fr * nr + fi * ni) / size;
  const impedanceI = (fi * nr - fr * ni) / size;
  const phase = nr * thickness;
  const growth = Math.exp(Math.max(LEAST_PHASE, ni * thickness));
  const cosh = (growth + 1 / growth) / 2;
  const sinh = (growth - 1 / growth) / 2;
  const cosine = Math.cos(phase);
  const sine = Math.sin(phase);
  m[A] = m[D] = cosine * cosh;
  m[A + 1] = m[D + 1] = -sine * sinh;
  const jr = -cosine * sinh; // j sin k_z d
  const ji = sine * cosh;
  m[B] = impedanceR * jr - impedanceI * ji;
  m[B + 1] = impedanceR * ji + impedanceI * jr;
  const square = impedanceR * impedanceR + impedanceI * impedanceI;
  m[C] = (jr * impedanceR + ji * impedanceI) / square;
  m[C + 1] = (ji * impedanceR - jr * impedanceI) / square;
}

/** left := left right */
export function multiplyInto(left: Matrix, right: Matrix): void {
  for (let row = 0; row < 8; row += 4) {
    const pr = left[row];
    const pi = left[row + 1];
    const qr = left[row + 2];
    const qi = left[row + 3];
    left[row] = pr * right[A] - pi * right[A + 1] + qr * right[C] - qi * right[C + 1];
    left[row + 1] = pr * right[A + 1] + pi * right[A] + qr * right[C + 1] + qi * right[C];
    left[row + 2] = pr * right[B] - pi * right[B + 1] + qr * right[D] - qi * right[D + 1];
    left[row + 3] = pr * right[B + 1] + pi * right[B] + qr * right[D + 1] + qi * right[D];
  }
}

/**
 * A spring z beside the cavity: a' = (a + z c)/u, d' = (d + z c)/u, c' = c/u, u = 1 + z c (solver method, 2.6).
 * b' = (a'd' - 1)/c' is written as (b + z (a + d - 2))/u, the same by ad - bc = 1, without dividing by a small c.
 */
export function addSpring(m: Matrix, { real: zr, imaginary: zi }: StudSpring): void {
  const zcr = zr * m[C] - zi * m[C + 1];
  const zci = zr * m[C + 1] + zi * m[C];
  const tr = m[A] + m[D] - 2;
  const ti = m[A + 1] + m[D + 1];
  divide(m, B, [m[B] + zr * tr - zi * ti, m[B + 1] + zr * ti + zi * tr], [1 + zcr, zci]);
  divide(m, A, [m[A] + zcr, m[A + 1] + zci], [1 + zcr, zci]);
  divide(m, D, [m[D] + zcr, m[D + 1] + zci], [1 + zcr, zci]);
  divide(m, C, [m[C], m[C + 1]], [1 + zcr, zci]);
}

function divide(
  m: Matrix,
  at: number,
  [nr, ni]: readonly [number, number],
  [ur, ui]: readonly [number, number],
): void {
  const square = ur * ur + ui * ui;
  m[at] = (nr * ur + ni * ui) / square;
  m[at + 1] = (ni * ur - nr * ui) / square;
}

/** An impedance, N s/m³. */
export type Impedance = { readonly real: number; readonly imaginary: number };

/**
 * Transmission coefficient of leaf, block, leaf between two half spaces of air whose impedance at that angle is `z0`:
 * 4/|A + B/z0 + C z0 + D|² of the product.
 */
export function transmissionThrough(m: Matrix, first: Impedance, second: Impedance, z0: number): number {
  const { real: r1, imaginary: i1 } = first;
  const { real: r2, imaginary: i2 } = second;
  const ar = m[A] + r1 * m[C] - i1 * m[C + 1];
  const ai = m[A + 1] + r1 * m[C + 1] + i1 * m[C];
  const br = ar * r2 - ai * i2 + m[B] + r1 * m[D] - i1 * m[D + 1];
  const bi = ar * i2 + ai * r2 + m[B + 1] + r1 * m[D + 1] + i1 * m[D];
  const dr = m[C] * r2 - m[C + 1] * i2 + m[D];
  const di = m[C] * i2 + m[C + 1] * r2 + m[D + 1];
  const real = ar + br / z0 + m[C] * z0 + dr;
  const imaginary = ai + bi / z0 + m[C + 1] * z0 + di;
  return 4 / (real * real + imaginary * imaginary);
}
