import { BAND_COUNT } from "./bands";

/** What the balance needs of rooms and of the links between them; energies g = S tau in m2. */
export interface Link {
  /** Room indices; -1 is outdoors. */
  readonly from: number;
  readonly to: number;
  /** m2 over the nine bands, finite and not negative. */
  readonly passing: Float64Array;
}

export interface Balance {
  /** Number of rooms. */
  readonly count: number;
  /** Group of each room: rooms of one group hear each other through links. */
  readonly groups: Int32Array;
  /** Diagonal A_i + sum g per band and room, [band * count + i]; 0 where the absorption is not known. */
  readonly diagonal: Float64Array;
  /** Inverse of the balance, [(band * count + i) * count + j]: x_i per 4 W_j. Symmetric; 0 across groups. */
  readonly inverse: Float64Array;
}

/** Groups of rooms that links join, by repeated renaming to the smaller index. */
export function groupRooms(count: number, links: readonly Link[]): Int32Array {
  const groups = Int32Array.from({ length: count }, (_, i) => i);
  for (const { from, to } of links) {
    if (from < 0 || to < 0 || groups[from] === groups[to]) continue;
    const [kept, gone] = [Math.min(groups[from], groups[to]), Math.max(groups[from], groups[to])];
    groups.forEach((group, i) => group === gone && (groups[i] = kept));
  }
  return groups;
}

/** Factors a symmetric positive definite matrix in place, lower triangle, and leaves its inverse in `matrix`. */
function invertInPlace(matrix: Float64Array, size: number): void {
  for (let j = 0; j < size; j += 1) {
    let pivot = matrix[j * size + j];
    for (let k = 0; k < j; k += 1) pivot -= matrix[j * size + k] ** 2;
    const root = Math.sqrt(pivot);
    matrix[j * size + j] = root;
    for (let i = j + 1; i < size; i += 1) {
      let sum = matrix[i * size + j];
      for (let k = 0; k < j; k += 1) sum -= matrix[i * size + k] * matrix[j * size + k];
      matrix[i * size + j] = sum / root;
    }
  }
  invertTriangle(matrix, size);
  multiplyTransposed(matrix, size);
}

function invertTriangle(matrix: Float64Array, size: number): void {
  for (let j = 0; j < size; j += 1) {
    matrix[j * size + j] = 1 / matrix[j * size + j];
    for (let i = j + 1; i < size; i += 1) {
      let sum = 0;
      for (let k = j; k < i; k += 1) sum -= matrix[i * size + k] * matrix[k * size + j];
      matrix[i * size + j] = sum / matrix[i * size + i];
    }
  }
}

/** L^-T L^-1 into both triangles. Rows are finished from the top, so what is still needed lies below. */
function multiplyTransposed(matrix: Float64Array, size: number): void {
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j <= i; j += 1) {
      let sum = 0;
      for (let k = i; k < size; k += 1) sum += matrix[k * size + i] * matrix[k * size + j];
      matrix[i * size + j] = sum;
    }
  }
  for (let i = 0; i < size; i += 1)
    for (let j = 0; j < i; j += 1) matrix[j * size + i] = matrix[i * size + j];
}

function diagonalOf(absorption: readonly Float64Array[], links: readonly Link[]): Float64Array {
  const count = absorption.length;
  const diagonal = new Float64Array(BAND_COUNT * count);
  for (let band = 0; band < BAND_COUNT; band += 1) {
    absorption.forEach((area, i) => (diagonal[band * count + i] = area[band]));
    for (const { from, to, passing } of links) {
      if (from >= 0) diagonal[band * count + from] += passing[band];
      if (to >= 0) diagonal[band * count + to] += passing[band];
    }
  }
  return diagonal.map((value) => (Number.isNaN(value) ? 0 : value));
}

/**
 * The power balance of coupled rooms (solver method 4): A_i x_i + sum g_ij (x_i - x_j) + sum g_ie x_i = 4 W_i, inverted
 * group by group and band by band with Cholesky. A room whose absorption is not known takes all energy and gives none.
 */
export function balanceRooms(absorption: readonly Float64Array[], links: readonly Link[]): Balance {
  const count = absorption.length;
  const groups = groupRooms(count, links);
  const diagonal = diagonalOf(absorption, links);
  const inverse = new Float64Array(BAND_COUNT * count * count);
  for (const group of new Set(groups)) {
    const rooms = Array.from(groups.keys()).filter((i) => groups[i] === group);
    const inside = links.filter(({ from, to }) => from >= 0 && to >= 0 && groups[from] === group);
    for (let band = 0; band < BAND_COUNT; band += 1)
      invertGroup({ count, groups, diagonal, inverse }, band, rooms, inside);
  }
  return { count, groups, diagonal, inverse };
}

function invertGroup(
  { count, diagonal, inverse }: Balance,
  band: number,
  rooms: readonly number[],
  links: readonly Link[],
): void {
  const known = rooms.filter((i) => diagonal[band * count + i] > 0);
  const size = known.length;
  const place = new Map(known.map((room, i) => [room, i]));
  const matrix = new Float64Array(size * size);
  known.forEach((room, i) => (matrix[i * size + i] = diagonal[band * count + room]));
  for (const { from, to, passing } of links) {
    const [i, j] = [place.get(from), place.get(to)];
    if (i === undefined || j === undefined) continue;
    matrix[i * size + j] -= passing[band];
    matrix[j * size + i] -= passing[band];
  }
  invertInPlace(matrix, size);
  known.forEach((a, i) =>
    known.forEach((b, j) => (inverse[(band * count + a) * count + b] = matrix[i * size + j])),
  );
}
