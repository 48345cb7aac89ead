import type { CrossCut, State } from "@/lib/noise/verdict";
import { wholeDecibels } from "../format";
import { spreadApart } from "../walls/spreadApart";
import { CutBuilding, wallAt } from "./CutBuilding";
import { BedFigure, CabinetFigure, Ground, KitFigure, WindowLight, YardFigures } from "./CutFigures";
import { cutScaleOf, scaleBarOf, type CutScale } from "./cutScale";
import type { StationWords } from "./stations";

const FIGURES = 22;
const WORDS = 41;
const LEADER = 52;
const BELOW = 38;
const LETTER = 6.7;

interface Props {
  cut: CrossCut;
  stations: readonly StationWords[];
  /** "at 63 Hz" */
  where: string;
  unit: string;
  state: State;
  sourceIsKit: boolean;
  inBed: boolean;
  width: number;
  height: number;
}

const figureColour: Record<State, string> = { over: "fill-slabover", tight: "fill-tight", under: "fill-under", "not weighed": "fill-slabink2" };

function colourOf({ station }: StationWords, state: State): string {
  if (station.kind === "source") return "fill-slablamp";
  return station.kind === "listener" ? figureColour[state] : "fill-slabink";
}

/** Figures in one row above the drawing, spread so that none touches its neighbour, each tied to its place. */
function Stations({ stations, state, scale, width }: Pick<Props, "stations" | "state" | "width"> & { scale: CutScale }) {
  const sorted = [...stations].sort((one, other) => one.station.along - other.station.along);
  const gap = Math.max(0, ...sorted.map(({ words }) => words.length)) * LETTER + 8;
  const half = gap / 2;
  const places = spreadApart(sorted.map(({ station }) => scale.x(station.along)), gap, half, width - half);
  return sorted.map((one, index) => {
    const x = places[index]!;
    const at = { x: scale.x(one.station.along), y: scale.y(one.station.height) };
    return (
      <g key={one.station.kind}>
        <path d={`M${x} ${LEADER}L${at.x} ${at.y}`} strokeWidth="1" strokeOpacity="0.55" className="stroke-slabink2" />
        <circle cx={at.x} cy={at.y} r="3.4" className="fill-slablamp" />
        <text x={x} y={FIGURES} textAnchor="middle" fontSize="25" className={`figure font-[640] ${colourOf(one, state)}`}>
          {wholeDecibels(one.level)}
        </text>
        <text x={x} y={WORDS} textAnchor="middle" fontSize="13" className="fill-slabink2">
          {one.words}
        </text>
      </g>
    );
  });
}

function nameBoxes(cut: CrossCut, scale: CutScale, width: number) {
  const sorted = [...cut.buildings].map((building) => ({ building, left: Math.min(...building.outline.map(([along]) => along)) })).sort((one, other) => one.left - other.left);
  let free = 2;
  return sorted.map(({ building, left }) => {
    const length = building.name.length * LETTER;
    const x = Math.min(Math.max(free, scale.x(left)), width - length);
    free = x + length + 10;
    return { id: building.id, name: building.name, x, length };
  });
}

/** Names of the buildings and the scale bar on one line under the ground. */
function Foot({ cut, scale, width }: { cut: CrossCut; scale: CutScale; width: number }) {
  const names = nameBoxes(cut, scale, width);
  const taken = names.map(({ x, length: long }) => [x - 8, x + long + 8] as const);
  const bar = scaleBarOf(scale.perMetre, taken, width);
  const y = scale.ground + 25;
  return (
    <g>
      {names.map(({ id, name, x }) => (
        <text key={id} x={x} y={y + 1} fontSize="13" className="fill-slabink2">
          {name}
        </text>
      ))}
      {bar && (
        <g>
          <path d={`M${bar.x} ${y - 6}v6h${bar.length}v-6M${bar.x + bar.length / 2} ${y}v-3`} fill="none" strokeWidth="1.4" className="stroke-slabink2" />
          <text x={bar.x + bar.length + 7} y={y + 1} fontSize="13" className="fill-slabink2">
            {`${bar.metres}\u00a0m`}
          </text>
        </g>
      )}
    </g>
  );
}

function litPlaces(cut: CrossCut) {
  const house = cut.buildings.find(({ rooms }) => rooms.some(({ lit }) => lit));
  const room = house?.rooms.find(({ lit }) => lit);
  const incident = cut.stations.find(({ kind }) => kind === "window");
  const windows = house?.openings.filter(({ kind }) => kind === "window") ?? [];
  const aim = incident?.along ?? cut.listener.along;
  const window = windows.sort((one, other) => Math.abs(one.along - aim) - Math.abs(other.along - aim))[0];
  const along = house && window && (wallAt(house, window.along) ?? window.along);
  return { room, window: window && along !== undefined ? { ...window, along } : undefined };
}

function sentenceOf({ stations, where, unit }: Props): string {
  const figures = stations.map(({ level, words }) => `${wholeDecibels(level)} ${unit} ${words}`).join(", ");
  return `Both yards cut open to scale: ${figures}, ${where}.`;
}

/** Both yards cut open to scale, with the level at each station of the lit band. */
export function CrossCutDrawing(props: Props) {
  const { cut, stations, state, sourceIsKit, inBed, width, height } = props;
  const scale = cutScaleOf(cut, width, { top: LEADER + 14, ground: height - BELOW });
  const { room, window } = litPlaces(cut);
  const Source = sourceIsKit ? KitFigure : CabinetFigure;
  const sourceRoom = cut.buildings.flatMap(({ rooms }) => rooms).find(({ from, to }) => cut.source && cut.source.along >= from && cut.source.along <= to);
  return (
    <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} role="img" aria-label={sentenceOf(props)} className="block">
      <Ground width={width} ground={scale.ground} />
      <YardFigures cut={cut} scale={scale} />
      {window && <WindowLight {...window} room={room} listener={cut.listener.along} scale={scale} />}
      {cut.buildings.map((building) => (
        <CutBuilding key={building.id} building={building} litId={window?.elementId ?? null} scale={scale} />
      ))}
      {inBed && room && <BedFigure along={cut.listener.along} floor={room.floor} scale={scale} />}
      {cut.source && <Source x={scale.x(cut.source.along)} floor={scale.y(sourceRoom?.floor ?? 0)} perMetre={scale.perMetre} />}
      <Stations stations={stations} state={state} scale={scale} width={width} />
      <Foot cut={cut} scale={scale} width={width} />
    </svg>
  );
}
