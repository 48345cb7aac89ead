/** Seeded bodies that no route may take: each holds a field that nobody knows, or is no JSON object at all. */

export type Chance = () => number;

/** mulberry32, a small generator of numbers from 0 up to 1: the same seed gives the same bodies. */
export function chanceFrom(seed: number): Chance {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

const pick = <T>(chance: Chance, list: readonly T[]): T => list[Math.floor(chance() * list.length)]!;

const oddities: readonly unknown[] = [
  null, true, false, 0, -0, -1, 1e308, -1e308, 1e-320, 2 ** 53, 0.1 + 0.2, "", " ", "0", "1e999", "NaN", "null", "[object Object]", "constructor", "__proto__",
  "'; drop table parts; --", "\u0000", "\ud800", "\u202e", "x".repeat(5_000), "00000000-0000-0000-0000-000000000000", "new:a", [], {}, [[]], [null], { "": "" },
  { $ne: null }, { length: 1e9 }, { toString: 1 }, { then: "x" }, { id: null }, Array(300).fill(0), ["a", "b"], [{ id: 1 }], { low: -1, high: -2 },
];

/** The value with some of its fields replaced, left out or nested anew. */
function twisted(chance: Chance, value: unknown): unknown {
  const turn = chance();
  if (turn < 0.12) return pick(chance, oddities);
  if (turn < 0.15) return [value];
  if (Array.isArray(value)) return turn < 0.3 ? [...value, ...value] : value.map((one) => twisted(chance, one));
  if (typeof value !== "object" || value === null) return value;
  const kept = Object.entries(value).filter(() => chance() > 0.06);
  return Object.fromEntries(kept.map(([field, inner]) => [chance() < 0.04 ? `${field}s` : field, twisted(chance, inner)]));
}

const damages: readonly ((text: string, chance: Chance) => string)[] = [
  (text, chance) => text.slice(0, Math.floor(chance() * text.length)),
  (text, chance) => `${text}${pick(chance, ["}", ",", "\u0000", "x", text])}`,
  (text) => `[${text}]`,
  (text) => JSON.stringify(text),
  (text) => text.replaceAll('"', "'"),
  (text) => text.replaceAll(":", "="),
  (text) => `{"a":${"[".repeat(40)}${"]".repeat(40)},"b":${text}}`,
];

/** The text of a body grown from one that would be taken. */
export function malformedBody(chance: Chance, sound: object): string {
  const value = twisted(chance, sound);
  const object = typeof value === "object" && value !== null && !Array.isArray(value) ? value : { value };
  const text = JSON.stringify({ ...object, [`field${Math.floor(chance() * 1e6)}`]: pick(chance, oddities) });
  return chance() < 0.2 ? pick(chance, damages)(text, chance) : text;
}
