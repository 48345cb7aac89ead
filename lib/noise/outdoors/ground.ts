import { BAND_COUNT } from "../bands";

export type Ground = readonly [source: number, middle: number, receiver: number];

/** The height-dependent factors of a', b', c', d' (ISO 9613-2 Table 3); height in m over local ground. */
export interface GroundShape {
  readonly height: number;
  readonly raised: number;
  readonly low: number;
  readonly b: number;
  readonly c: number;
  readonly d: number;
}

/** The factors at a height in m; below ground counts as on it. */
export function groundShape(z: number): GroundShape {
  const height = Math.max(0, z);
  const square = height * height;
  const flat = Math.exp(-0.09 * square);
  return {
    height,
    raised: 3 * Math.exp(-0.12 * (height - 5) ** 2),
    low: 5.7 * flat,
    b: 8.6 * flat,
    c: 14 * Math.exp(-0.46 * square),
    d: 5 * Math.exp(-0.9 * square),
  };
}

/**
 * Ground attenuation A_gr in dB over the nine bands, written to `out`: ISO 9613-2 7.3.1, general method, Table 3.
 * `across` is the distance on plan, m; 31.5 Hz takes the row of 63 Hz (solver method 0).
 */
export function groundAttenuation(
  from: GroundShape,
  to: GroundShape,
  across: number,
  ground: Ground,
  out: Float64Array,
): void {
  const reach = 30 * (from.height + to.height);
  const q = across <= reach ? 0 : 1 - reach / across;
  const near = 1 - Math.exp(-across / 50);
  const far = 1 - Math.exp(-2.8e-6 * across * across);
  const [gs, gm, gr] = ground;
  const middle = -3 * q * (1 - gm);
  out[0] = out[1] = -3 - 3 * q;
  out[2] =
    -3 +
    middle +
    gs * (1.5 + from.raised * near + from.low * far) +
    gr * (1.5 + to.raised * near + to.low * far);
  out[3] = -3 + middle + gs * (1.5 + from.b * near) + gr * (1.5 + to.b * near);
  out[4] = -3 + middle + gs * (1.5 + from.c * near) + gr * (1.5 + to.c * near);
  out[5] = -3 + middle + gs * (1.5 + from.d * near) + gr * (1.5 + to.d * near);
  for (let band = 6; band < BAND_COUNT; band += 1) out[band] = -1.5 * (1 - gs) - 1.5 * (1 - gr) + middle;
}
