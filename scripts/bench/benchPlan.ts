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
const levels = (at: number, step: number) =>
  Array.from({ length: BAND_COUNT }, (_, band) => at + step * band);

/** Houses on a grid 14 m apart, one room each, faces on all four sides and roofs; a fence between two rows. */
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
    tl: levels(18 + 2 * i, 3),
    bases,
    description: null,
    provenance: PROVENANCE,
  };
}

/** A plan of any size for timing: all figures made up, all parts present. */
export function buildBenchPlan({ rooms, perRoom, sources, receivers }: BenchSize): Plan {
  const list = <T>(count: number, of: (i: number) => T) => Array.from({ length: count }, (_, i) => of(i));
  return planSchema.parse({
    lot: {
      id: "lot",
      outline: null,
      ground: [0.5, 0.5, 0.5],
      temperature: 10,
      humidity: 70,
      indoorTemperature: 20,
      indoorHumidity: 50,
    },
    buildings: [],
    spaces: list(rooms, (r) => ({
      id: `r${r}`,
      buildingId: `b${r}`,
      name: `room ${r}`,
      volume: 45,
      box: null,
      absorption: { kind: "area", area: list(BAND_COUNT, (band) => 8 + band) },
    })),
    surfaces: [],
    sources: list(sources, (s) => ({
      id: `s${s}`,
      name: `source ${s}`,
      kind: "instrument",
      params: {},
      spaceId: `r${s % rooms}`,
      position: null,
      power: levels(100 - s, -1),
      deviation: null,
      basis: "measured",
      provenance: PROVENANCE,
    })),
    outlets: [],
    incidences: [],
    paths: list(rooms, (r) => ({ id: `p${r}`, fromSpaceId: `r${r}`, toSpaceId: null, name: `shell ${r}` })),
    constructions: list(10, constructionOf),
    elements: list(rooms * perRoom, (i) => elementOf(Math.floor(i / perRoom), i % perRoom)),
    fences: [{ id: "f", name: "fence", p1: [-50, 7], p2: [80, 7], height: 1.8 }],
    receivers: list(receivers, (l) => ({
      id: `l${l}`,
      name: `listener ${l}`,
      kind: "room",
      spaceId: `r${(rooms - 1 - l) % rooms}`,
      position: null,
    })),
    criteria: list(receivers, (l) => ({
      id: `k${l}`,
      receiverId: `l${l}`,
      name: "curve",
      metric: "curve",
      value: null,
      levels: levels(50, -4),
      hours: null,
      provenance: PROVENANCE,
    })),
    situations: [],
  });
}
