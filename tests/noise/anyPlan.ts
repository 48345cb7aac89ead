// Longer than most: one generator for one schema, and its parts are of no use alone.
import fc from "fast-check";
import { BAND_COUNT } from "../../lib/noise/bands";
import { planSchema, type Plan } from "../../lib/noise/plan";

/** Any plan within the bounds of its schema: few parts, pointing anywhere, with gaps, silence and unknown bands. */
const id = (kind: string, most: number) => fc.integer({ min: 0, max: most }).map((i) => `${kind}${i}`);
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const nine = <T>(value: fc.Arbitrary<T>) => fc.array(value, { minLength: BAND_COUNT, maxLength: BAND_COUNT });
const levels = nine(
  fc.oneof(
    { weight: 6, arbitrary: number(-100, 160) },
    { weight: 1, arbitrary: fc.constant("silent" as const) },
    { weight: 1, arbitrary: fc.constant(null) },
  ),
);
const losses = nine(
  fc.oneof(
    { weight: 6, arbitrary: number(-20, 150) },
    { weight: 1, arbitrary: fc.constant("silent" as const) },
    { weight: 1, arbitrary: fc.constant(null) },
  ),
);
const some = (min: number, max: number) =>
  nine(fc.oneof({ weight: 8, arbitrary: number(min, max) }, { weight: 1, arbitrary: fc.constant(null) }));
const place = fc.oneof(
  fc.tuple(number(-40, 40), number(-40, 40), number(-3, 12)),
  fc.constant([0, 0, 1] as [number, number, number]),
);
const point = fc.tuple(number(-40, 40), number(-40, 40));
const maybe = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: null, freq: 4 });
const normal = fc.constantFrom([1, 0, 0], [0, -1, 0], [-0.6, 0.8, 0], [0, 0, 1], [0, 0, 0], [0.5, 0, 0.5]);
const provenance = { document: "any", clause: "", memory: false };
const run = fc.array(
  fc.oneof(
    fc.record({ kind: fc.constant("silencer"), il: some(0, 100) }),
    fc.record({ kind: fc.constant("end"), s: number(0.0001, 10), flush: fc.boolean() }),
  ),
  { maxLength: 3 },
);

const absorption = fc.oneof(
  fc.record({ kind: fc.constant("area"), area: some(0.01, 100) }),
  fc.record({ kind: fc.constant("decay"), seconds: some(0.02, 30) }),
  fc.record({
    kind: fc.constant("surfaces"),
    model: fc.constantFrom("sabine", "eyring"),
    air: fc.boolean(),
    objects: fc.array(fc.record({ name: fc.constant("chair"), area: some(0.01, 5) }), { maxLength: 1 }),
  }),
);
const box = maybe(fc.record({ at: place, size: fc.tuple(number(0.1, 9), number(0.1, 9), number(0.1, 4)) }));
const space = (i: number) =>
  fc.record({
    id: fc.constant(`space${i}`),
    buildingId: id("building", 2),
    name: fc.constant(`room ${i}`),
    volume: number(0.5, 500),
    box,
    absorption,
  });
const surface = (i: number) =>
  fc.record({
    id: fc.constant(`surface${i}`),
    spaceId: id("space", 5),
    name: fc.constant("wall"),
    area: number(0.01, 60),
    finishKey: fc.constant(null),
    alpha: some(0, 1.5),
    bases: fc.constant(new Array(9).fill("estimated")),
    provenance: fc.constant(provenance),
  });

const sourceKind = fc.oneof(
  fc.record({
    kind: fc.constantFrom("drum kit", "amplifier", "instrument"),
    params: fc.record({ q: number(0.1, 20) }),
  }),
  fc.record({ kind: fc.constant("condenser"), params: fc.record({ directivity: number(-30, 20) }) }),
  fc.record({ kind: fc.constantFrom("fan", "traffic"), params: fc.constant({}) }),
);
const source = (i: number) =>
  fc
    .tuple(
      sourceKind,
      fc.record({
        id: fc.constant(`source${i}`),
        name: fc.constant(`source ${i}`),
        spaceId: maybe(id("space", 5)),
        position: maybe(place),
        power: maybe(levels),
        deviation: maybe(some(0, 30)),
        basis: fc.constantFrom("measured", "typed", "estimated"),
        provenance: fc.constant(provenance),
      }),
    )
    .map(([kind, rest]) => ({ ...rest, ...kind }));

const elementKind = fc.oneof(
  fc.record({
    kind: fc.constantFrom("wall", "roof", "floor", "ceiling", "leak", "flanking"),
    params: fc.constant({}),
  }),
  fc.record({ kind: fc.constant("door"), params: fc.record({ gapArea: number(0, 1) }) }),
  fc.record({ kind: fc.constant("window"), params: fc.record({ openArea: number(0, 2) }) }),
  fc.record({ kind: fc.constant("duct"), params: fc.record({ opening: number(0.0001, 1), run }) }),
);
/** An opening is never larger than what it is in; up to the whole is allowed. */
function openWithin<P extends object>(params: P, area: number): P {
  const within = Object.entries(params).map(([field, value]) =>
    typeof value === "number" && field.endsWith("Area") ? [field, Math.min(value, area)] : [field, value],
  );
  return Object.fromEntries(within) as P; // the same fields with the same types
}

const element = (i: number) =>
  fc
    .tuple(
      elementKind,
      fc.record({
        id: fc.constant(`element${i}`),
        name: fc.constant(`element ${i}`),
        pathId: id("path", 8),
        area: number(0.0001, 50),
        constructionId: maybe(id("construction", 3)),
        limit: maybe(number(0, 120)),
        position: maybe(place),
        normal: maybe(normal),
        size: maybe(fc.tuple(number(0.001, 30), number(0.001, 30))),
        directivity: fc.option(number(-30, 20), { nil: null, freq: 1 }),
        diffuseness: fc.option(number(-20, 0), { nil: null, freq: 1 }),
      }),
    )
    .map(([kind, rest]) => ({ ...rest, ...kind, params: openWithin(kind.params, rest.area) }));

const board = fc.record({
  kind: fc.constant("board"),
  name: fc.constant("board"),
  material: fc.constantFrom("gypsum", "osb", "glass", "moon rock"),
  thickness: number(0.001, 0.1),
  bond: fc.constantFrom("screwed", "glued", "damped"),
});
const gap = fc.record({
  kind: fc.constant("ventilated gap"),
  name: fc.constant("gap"),
  thickness: number(0.01, 0.1),
});
const cavity = fc.record({
  kind: fc.constant("cavity"),
  name: fc.constant("cavity"),
  thickness: number(0.001, 0.4),
  fill: number(0, 0.5),
  connection: fc.constantFrom(
    "wood_stud",
    "steel_stud",
    "resilient_channel",
    "staggered",
    "double_stud",
    "clips",
    "none",
  ),
});
const construction = (i: number) =>
  fc.record({
    id: fc.constant(`construction${i}`),
    name: fc.constant(`construction ${i}`),
    fits: fc.constant([]),
    catalogueKey: fc.constant(null),
    layers: fc.array(fc.oneof(board, gap, cavity), { maxLength: 4 }),
    size: fc.constant(null),
    use: fc.constantFrom(null, "window"),
    tl: maybe(losses),
    bases: fc.constant(null),
    description: fc.constant(null),
    provenance: fc.constant(provenance),
  });

const receiver = (i: number) =>
  fc.record({
    id: fc.constant(`receiver${i}`),
    name: fc.constant(`receiver ${i}`),
    kind: fc.constantFrom("room", "outdoor"),
    spaceId: maybe(id("space", 5)),
    position: maybe(place),
    facade: fc.boolean(),
    side: fc.constantFrom("studio", "far"),
    distances: fc.dictionary(id("source", 3), number(0.05, 20), { maxKeys: 1 }),
  });
const criterion = (i: number) =>
  fc.record({
    id: fc.constant(`criterion${i}`),
    receiverId: id("receiver", 3),
    name: fc.constant("limit"),
    metric: fc.constantFrom("NC", "NR", "dBA", "dBC", "curve"),
    value: maybe(number(-20, 160)),
    levels: maybe(levels),
    edition: fc.constantFrom("", "classic", "ANSI/ASA S12.2-2019"),
    averaging: fc.constantFrom("loudest", "whole"),
    hours: fc.constant(null),
    provenance: fc.constant(provenance),
  });
const situation = (i: number) =>
  fc.record({
    id: fc.constant(`situation${i}`),
    name: fc.constant("night"),
    playing: fc.array(
      fc.record({ sourceId: id("source", 4), share: fc.double({ min: 0.001, max: 1, noNaN: true }) }),
      { maxLength: 4 },
    ),
  });

const several = <T>(most: number, of: (i: number) => fc.Arbitrary<T>) =>
  fc
    .integer({ min: 0, max: most })
    .chain((count) => fc.tuple(...Array.from({ length: count }, (_, i) => of(i))));

export const anyPlan: fc.Arbitrary<Plan> = fc
  .record({
    lot: fc.record({
      id: fc.constant("lot"),
      outline: fc.constant(null),
      ground: fc.tuple(number(0, 1), number(0, 1), number(0, 1)),
      temperature: number(-30, 50),
      humidity: number(1, 100),
      indoorTemperature: number(-10, 50),
      indoorHumidity: number(1, 100),
    }),
    buildings: several(2, (i) =>
      fc.record({
        id: fc.constant(`building${i}`),
        name: fc.constant("house"),
        role: fc.constantFrom("studio", "neighbour"),
        footprint: maybe(fc.array(point, { minLength: 3, maxLength: 5 })),
        floors: fc.constant([0]),
        eaves: maybe(number(0, 6)),
        ridge: maybe(number(0, 9)),
        ridgeAxis: fc.constantFrom(null, "x", "y"),
      }),
    ),
    spaces: several(5, space),
    surfaces: several(6, surface),
    sources: several(4, source),
    outlets: several(3, (i) =>
      fc.record({
        id: fc.constant(`outlet${i}`),
        sourceId: id("source", 4),
        name: fc.constant("grille"),
        spaceId: maybe(id("space", 5)),
        position: maybe(place),
        directivity: number(-30, 20),
        run,
      }),
    ),
    incidences: several(3, (i) =>
      fc.record({
        id: fc.constant(`incidence${i}`),
        sourceId: id("source", 4),
        elementId: id("element", 8),
        levels,
      }),
    ),
    paths: several(8, (i) =>
      fc.record({
        id: fc.constant(`path${i}`),
        fromSpaceId: id("space", 5),
        toSpaceId: fc.oneof(fc.constant(null), id("space", 5)),
        name: fc.constant("path"),
      }),
    ),
    constructions: several(3, construction),
    elements: several(9, element),
    fences: several(2, (i) =>
      fc.record({
        id: fc.constant(`fence${i}`),
        name: fc.constant("fence"),
        p1: point,
        p2: point,
        height: number(0.1, 6),
        thickness: fc.constantFrom(0, 0.2, 3),
      }),
    ),
    receivers: several(3, receiver),
    criteria: several(4, criterion),
    situations: several(2, situation),
  })
  .map((plan) => planSchema.parse(plan));
