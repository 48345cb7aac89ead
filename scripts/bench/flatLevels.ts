import { BAND_COUNT, EXACT_BANDS } from "../../lib/noise/bands";
import type { Plan } from "../../lib/noise/plan";

/** What the flat function reads: only numbers in rows. Rooms of one house each, faces to outdoors, one fence line y = const. */
export interface FlatInput {
  readonly rooms: number;
  readonly faces: number;
  readonly sources: number;
  readonly receivers: number;
  readonly room: Int32Array;
  readonly at: Float64Array;
  readonly normal: Float64Array;
  readonly roof: Uint8Array;
  readonly area: Float64Array;
  readonly loss: Float64Array;
  readonly absorption: Float64Array;
  readonly power: Float64Array;
  readonly sourceRoom: Int32Array;
  readonly receiverRoom: Int32Array;
  readonly fence: { y: number; height: number };
  readonly ground: number;
  readonly temperature: number;
  readonly humidity: number;
}

export function flatInput(plan: Plan): FlatInput {
  const rooms = new Map(plan.spaces.map(({ id }, i) => [id, i]));
  const roomOfPath = new Map(plan.paths.map(({ id, fromSpaceId }) => [id, rooms.get(fromSpaceId) ?? -1]));
  const loss = new Map(plan.constructions.map(({ id, tl }) => [id, tl as number[]]));
  const rows = (values: readonly (readonly unknown[])[]) => Float64Array.from(values.flat() as number[]);
  return {
    rooms: rooms.size,
    faces: plan.elements.length,
    sources: plan.sources.length,
    receivers: plan.receivers.length,
    room: Int32Array.from(plan.elements, ({ pathId }) => roomOfPath.get(pathId) ?? -1),
    at: rows(plan.elements.map(({ position }) => position ?? [])),
    normal: rows(plan.elements.map(({ normal }) => normal ?? [])),
    roof: Uint8Array.from(plan.elements, ({ kind }) => Number(kind === "roof")),
    area: Float64Array.from(plan.elements, ({ area }) => area),
    loss: rows(plan.elements.map(({ constructionId }) => loss.get(constructionId ?? "") ?? [])),
    absorption: rows(
      plan.spaces.map(({ absorption }) => (absorption.kind === "area" ? absorption.area : [])),
    ),
    power: rows(plan.sources.map(({ power }) => power ?? [])),
    sourceRoom: Int32Array.from(plan.sources, ({ spaceId }) => rooms.get(spaceId ?? "") ?? -1),
    receiverRoom: Int32Array.from(plan.receivers, ({ spaceId }) => rooms.get(spaceId ?? "") ?? -1),
    fence: { y: plan.fences[0].p1[1], height: plan.fences[0].height },
    ground: plan.lot.ground[0],
    temperature: plan.lot.temperature,
    humidity: plan.lot.humidity,
  };
}

/**
 * The arithmetic of a whole solve in one flat function, written apart from the solver as its yardstick: levels of every
 * receiver, [receiver * bands + band], and levels of every way out, [(receiver * faces + face) * bands + band]. Long on
 * purpose: a yardstick that was split up would pay for the same calls as the solver.
 */
export function flatLevels(input: FlatInput): { levels: Float64Array; ways: Float64Array } {
  const { rooms, faces, sources, receivers, room, at, normal, roof, area, loss, absorption, power } = input;
  const B = BAND_COUNT;
  const g = new Float64Array(faces * B);
  const total = absorption.slice();
  for (let f = 0; f < faces; f += 1) {
    for (let b = 0; b < B; b += 1) {
      g[f * B + b] = area[f] * Math.pow(10, -loss[f * B + b] / 10);
      total[room[f] * B + b] += g[f * B + b];
    }
  }
  const inside = new Float64Array(rooms * B);
  for (let s = 0; s < sources; s += 1) {
    for (let b = 0; b < B; b += 1)
      inside[input.sourceRoom[s] * B + b] +=
        (4 * Math.pow(10, power[s * B + b] / 10)) / total[input.sourceRoom[s] * B + b];
  }
  const alpha = new Float64Array(B);
  const kelvin = input.temperature + 273.15;
  const water = input.humidity * Math.pow(10, -6.8346 * Math.pow(273.16 / kelvin, 1.261) + 4.6151);
  const oxygen = 24 + (4.04e4 * water * (0.02 + water)) / (0.391 + water);
  const nitrogen =
    Math.pow(kelvin / 293.15, -0.5) *
    (9 + 280 * water * Math.exp(-4.17 * (Math.pow(kelvin / 293.15, -1 / 3) - 1)));
  for (let b = 0; b < B; b += 1) {
    const f2 = EXACT_BANDS[b] ** 2;
    alpha[b] =
      8.686 *
      f2 *
      (1.84e-11 * Math.sqrt(kelvin / 293.15) +
        Math.pow(kelvin / 293.15, -2.5) *
          ((0.01275 * Math.exp(-2239.1 / kelvin)) / (oxygen + f2 / oxygen) +
            (0.1068 * Math.exp(-3352 / kelvin)) / (nitrogen + f2 / nitrogen)));
  }
  const sums = new Float64Array(receivers * B);
  const ways = new Float64Array(receivers * faces * B);
  const ground = new Float64Array(B);
  for (let f = 0; f < faces; f += 1) {
    const [fx, fy, fz] = [at[3 * f], at[3 * f + 1], at[3 * f + 2]];
    for (let e = 0; e < faces; e += 1) {
      if (room[f] === room[e]) continue;
      const [dx, dy, dz] = [at[3 * e] - fx, at[3 * e + 1] - fy, at[3 * e + 2] - fz];
      const across = Math.sqrt(dx * dx + dy * dy);
      const distance = Math.max(1, Math.sqrt(across * across + dz * dz));
      const q = across <= 30 * (fz + at[3 * e + 2]) ? 0 : 1 - (30 * (fz + at[3 * e + 2])) / across;
      const near = 1 - Math.exp(-across / 50);
      const far = 1 - Math.exp(-2.8e-6 * across * across);
      const G = input.ground;
      ground[0] = ground[1] = -3 - 3 * q;
      for (let b = 2; b < B; b += 1)
        ground[b] = b < 6 ? -3 - 3 * q * (1 - G) : -3 * (1 - G) - 3 * q * (1 - G);
      for (let end = 0; end < 2; end += 1) {
        const h = end === 0 ? fz : at[3 * e + 2];
        ground[2] +=
          G * (1.5 + 3 * Math.exp(-0.12 * (h - 5) * (h - 5)) * near + 5.7 * Math.exp(-0.09 * h * h) * far);
        ground[3] += G * (1.5 + 8.6 * Math.exp(-0.09 * h * h) * near);
        ground[4] += G * (1.5 + 14 * Math.exp(-0.46 * h * h) * near);
        ground[5] += G * (1.5 + 5 * Math.exp(-0.9 * h * h) * near);
      }
      let directivity = 0;
      if (!roof[f])
        directivity = dx * normal[3 * f] + dy * normal[3 * f + 1] + dz * normal[3 * f + 2] < 0 ? -7 : 3;
      const shade =
        !roof[e] && -dx * normal[3 * e] - dy * normal[3 * e + 1] - dz * normal[3 * e + 2] < 0 ? 10 : 0;
      const share = dy === 0 ? -1 : (input.fence.y - fy) / dy;
      let [z, weather] = [NaN, 1];
      if (share >= 0 && share <= 1) {
        const first = Math.sqrt((share * across) ** 2 + (input.fence.height - fz) ** 2);
        const last = Math.sqrt(((1 - share) * across) ** 2 + (input.fence.height - at[3 * e + 2]) ** 2);
        const direct = Math.sqrt(across * across + dz * dz);
        z = first + last - direct;
        if (input.fence.height <= fz + share * dz) z = -z;
        weather = z > 0 ? Math.exp(-Math.sqrt((first * last * direct) / (2 * z)) / 2000) : 1;
      }
      const spreading = 20 * Math.log10(distance) + 11;
      for (let b = 0; b < B; b += 1) {
        let bar = 0;
        if (z === z)
          bar = Math.max(
            0,
            Math.min(20, 10 * Math.log10(Math.max(1, 3 + ((20 * EXACT_BANDS[b]) / 340) * z * weather))) -
              Math.max(0, ground[b]),
          );
        // -9: C_d = -6 dB and 3 dB of the facade.
        const gain = Math.pow(
          10,
          (directivity - 9 - shade - spreading - alpha[b] * distance - ground[b] - bar) / 10,
        );
        const entering = inside[room[f] * B + b] * g[f * B + b] * gain * g[e * B + b];
        for (let r = 0; r < receivers; r += 1) {
          if (input.receiverRoom[r] !== room[e]) continue;
          const heard = (4 * entering) / total[room[e] * B + b];
          sums[r * B + b] += heard;
          ways[(r * faces + f) * B + b] += heard;
        }
      }
    }
  }
  for (let r = 0; r < receivers; r += 1)
    for (let b = 0; b < B; b += 1) sums[r * B + b] += inside[input.receiverRoom[r] * B + b];
  for (let i = 0; i < ways.length; i += 1) ways[i] = 10 * Math.log10(ways[i]);
  return { levels: sums.map((sum) => 10 * Math.log10(sum)), ways };
}
