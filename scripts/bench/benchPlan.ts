import { BAND_COUNT } from "../../lib/noise/bands";
import { planSchema, type Plan } from "../../lib/noise/plan";

export interface BenchSize {
  readonly rooms: number;
  readonly perRoom: number;
  readonly sources: number;
  readonly receivers: number;
}

const PROVENANCE = { document: "generated for the bench", clause: "", memory: false };
const bases = Array.from({ length: BAND_COUNT }, () => "laboratory");
/** Nine figures, each a step above the one before. */
const rising = (at: number, step: number) =>
  Array.from({ length: BAND_COUNT }, (_, band) => at + step * band);

/** Houses stand on a grid 14 m apart. */
function centreOf(room: number): [number, number] {
  return [14 * (room % 4), 14 * Math.floor(room / 4)];
}

function elementOf(room: number, i: number) {
  const [x, y] = centreOf(room);
  const side = i % 5;
  const normal = [
    [1, 0, 0],
    [0, 1, 0],
    [-1, 0, 0],
    [0, -1, 0],
    [0, 0, 1],
  ][side];
  const along = 0.7 * (Math.floor(i / 5) - 0.5);
  const position = [
    x + 2.5 * normal[0] + along * Math.abs(normal[1]),
    y + 2.5 * normal[1] + along * Math.abs(normal[0]),
    side === 4 ? 3 : 1.3,
  ];
  return {
    id: `e${room}-${i}`,
    kind: side === 4 ? "roof" : "wall",
    params: {},
    pathId: `p${room}`,
    name: `face ${room}-${i}`,
    area: 3 + 0.1 * i,
    constructionId: `c${i % 10}`,
    limit: null,
    position,
    normal,
    size: [1.5, 2],
    directivity: null,
    diffuseness: null,
  };
}

function constructionOf(i: number) {
  return {
    id: `c${i}`,
    name: `construction ${i}`,
    fits: ["wall"],
    catalogueKey: null,
    layers: [],
    size: null,
    use: null,
    tl: rising(18 + 2 * i, 3),
    bases,
    description: null,
    provenance: PROVENANCE,
  };
}

const LOT = {
  id: "lot",
  outline: null,
  ground: [0.5, 0.5, 0.5],
  temperature: 10,
  humidity: 70,
  indoorTemperature: 20,
  indoorHumidity: 50,
};

function spaceOf(r: number) {
  const area = rising(8, 1);
  return {
    id: `r${r}`,
    buildingId: `b${r}`,
    name: `room ${r}`,
    volume: 45,
    box: null,
    absorption: { kind: "area", area },
  };
}

function sourceOf(s: number, rooms: number) {
  return {
    id: `s${s}`,
    name: `source ${s}`,
    kind: "instrument",
    params: {},
    spaceId: `r${s % rooms}`,
    position: null,
    power: rising(100 - s, -1),
    deviation: null,
    basis: "measured",
    provenance: PROVENANCE,
  };
}

function receiverOf(l: number, rooms: number) {
  return {
    id: `l${l}`,
    name: `listener ${l}`,
    kind: "room",
    spaceId: `r${(rooms - 1 - l) % rooms}`,
    position: null,
  };
}

function criterionOf(l: number) {
  return {
    id: `k${l}`,
    receiverId: `l${l}`,
    name: "curve",
    metric: "curve",
    value: null,
    levels: rising(50, -4),
    hours: null,
    provenance: PROVENANCE,
  };
}

/**
 * A plan of any size for timing, all figures made up: houses of one room each with faces on four sides and roofs, and a
 * fence between two rows.
 */
export function buildBenchPlan({ rooms, perRoom, sources, receivers }: BenchSize): Plan {
  const list = <T>(count: number, of: (i: number) => T) => Array.from({ length: count }, (_, i) => of(i));
  return planSchema.parse({
    lot: LOT,
    buildings: [],
    spaces: list(rooms, spaceOf),
    surfaces: [],
    sources: list(sources, (s) => sourceOf(s, rooms)),
    outlets: [],
    incidences: [],
    paths: list(rooms, (r) => ({ id: `p${r}`, fromSpaceId: `r${r}`, toSpaceId: null, name: `shell ${r}` })),
    constructions: list(10, constructionOf),
    elements: list(rooms * perRoom, (i) => elementOf(Math.floor(i / perRoom), i % perRoom)),
    fences: [{ id: "f", name: "fence", p1: [-50, 7], p2: [80, 7], height: 1.8 }],
    receivers: list(receivers, (l) => receiverOf(l, rooms)),
    criteria: list(receivers, criterionOf),
    situations: [],
  });
}
