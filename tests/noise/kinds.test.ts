import { describe, expect, test } from "vitest";
import type { z } from "zod";
import { BAND_COUNT, OCTAVE_BANDS } from "../../lib/noise/bands";
import { elementKinds, elementSchema, type ElementKindName } from "../../lib/noise/elements";
import { PATH_KINDS, type Passing } from "../../lib/noise/elements/kind";
import { sourceKinds, sourceSchema, type SourceKindName } from "../../lib/noise/sources";

const elementNames = Object.keys(elementKinds) as ElementKindName[];
const sourceNames = Object.keys(sourceKinds) as SourceKindName[];
const provenance = { document: "a test", clause: "", memory: false };

/** Every number that a kind asks for bears a label and a unit for its form. */
function unlabelled(params: z.ZodObject): string[] {
  return Object.entries(params.shape).flatMap(([name, field]) => {
    const meta = (field as z.ZodType).meta();
    return name === "run" || (meta?.label && meta.unit !== undefined) ? [] : [name];
  });
}

describe.each(elementNames)("the kind of element %s", (name) => {
  const kind = elementKinds[name];
  const params = kind.params.parse(
    name === "duct"
      ? {
          opening: 0.02,
          run: [
            { kind: "silencer", il: [...new Array(8).fill(10), null] },
            { kind: "end", s: 0.02 },
          ],
        }
      : {},
  );
  const passing = kind.passing as (of: Passing<typeof params>) => Float64Array;

  test("is listed under its name, drawn as a known path, and labelled", () => {
    expect(kind.name).toBe(name);
    expect(PATH_KINDS).toContain(kind.path);
    expect(kind.label.length).toBeGreaterThan(2);
    expect(unlabelled(kind.params)).toEqual([]);
  });
  test("lets a finite or unknown energy pass in every band, never less than none", () => {
    const loss = Float64Array.from([20, 25, 30, 35, 40, Infinity, 45, 50, NaN]);
    const found = passing({ area: 2, loss, params });
    expect(found).toHaveLength(BAND_COUNT);
    found.forEach((area) => expect(Number.isNaN(area) || (Number.isFinite(area) && area >= 0)).toBe(true));
  });
  test("keeps its schema through JSON", () => {
    const element = elementSchema.parse({
      kind: name,
      id: "e",
      pathId: "p",
      name: "one",
      area: 2,
      constructionId: null,
      position: null,
      normal: null,
      size: null,
      params,
    });
    expect(elementSchema.parse(JSON.parse(JSON.stringify(element)))).toEqual(element);
  });
});

// A duct passes what its mouth takes in; its area is drawn only.
test.each(elementNames.filter((name) => name !== "duct"))(
  "%s: twice the area lets twice as much pass",
  (name) => {
    const { params, passing } = elementKinds[name];
    const pass = passing as (of: Passing<unknown>) => Float64Array;
    const at = (area: number) =>
      pass({ area, loss: new Float64Array(BAND_COUNT).fill(30), params: params.parse({}) })[4];
    expect(at(2)).toBeGreaterThan(0);
    expect(at(4)).toBeCloseTo(2 * at(2), 12);
  },
);

describe.each(sourceNames)("the kind of source %s", (name) => {
  const kind = sourceKinds[name];
  test("is listed under its name and labelled", () => {
    expect(kind.name).toBe(name);
    expect(kind.label.length).toBeGreaterThan(2);
    expect(unlabelled(kind.params)).toEqual([]);
  });
  test("has a voice in every band", () =>
    OCTAVE_BANDS.forEach((band) => expect(kind.voice(band)).toMatch(/^the \w/)));
  test("keeps its schema through JSON, silence and unknown bands included", () => {
    const power = [60, "silent", null, 60, 60, 60, 60, 60, 60];
    const source = sourceSchema.parse({
      kind: name,
      id: "s",
      name: "one",
      spaceId: null,
      position: null,
      power,
      deviation: null,
      basis: "typed",
      provenance,
      params: {},
    });
    expect(sourceSchema.parse(JSON.parse(JSON.stringify(source)))).toEqual(source);
  });
});

test("a kit is the kick at the bottom, the cymbals at the top", () => {
  const { voice } = sourceKinds["drum kit"];
  expect([63, 500, 8000].map((band) => voice(band as (typeof OCTAVE_BANDS)[number]))).toEqual([
    "the kick drum",
    "the snare and toms",
    "the cymbals",
  ]);
});
