"use client";

import { scaleLinear } from "d3-scale";
import { wholeDecibels } from "../format";
import { useWidthClass } from "../ui/useWidthClass";
import type { WidthClass } from "../ui/widthClass";
import { exampleStations, exampleYard, type ExampleStation } from "./exampleYard";

/** Pixels the drawing has at the narrow end of each width class; one scale for both directions, so it stays true. */
const drawnWidths: Record<WidthClass, number> = { 390: 290, 720: 530, 1024: 416, 1440: 640 };
/** It may grow a little, to fill its slab. */
const roomToGrow: Record<WidthClass, string> = { 390: "max-w-[360px]", 720: "max-w-[620px]", 1024: "max-w-[500px]", 1440: "max-w-[740px]" };
/** Large enough to stay readable where the narrowest phones shrink the drawing. */
const LABEL_SIZE = 13.5;
const FOOT = 34;
const LABELS = 52;

type Scale = (metres: number) => number;
interface Scales {
  x: Scale;
  y: Scale;
}

/** Walls and a gable roof with its eaves standing out, as one stroke. */
function drawHouse({ x, y }: Scales, house: { from: number; to: number; wall: number; ridge: number }): string {
  const middle = (house.from + house.to) / 2;
  const overhang = 0.35;
  const drop = (house.ridge - house.wall) * (overhang / (middle - house.from));
  const eaves = house.wall - drop;
  return [
    `M${x(house.from)} ${y(0)}V${y(house.wall)}M${x(house.to)} ${y(0)}V${y(house.wall)}`,
    `M${x(house.from - overhang)} ${y(eaves)}L${x(middle)} ${y(house.ridge)}L${x(house.to + overhang)} ${y(eaves)}`,
  ].join("");
}

function Buildings({ x, y }: Scales) {
  const { studio, house } = exampleYard;
  const inset = 0.25;
  const sill = house.floor + 0.6;
  const head = house.floor + 1.6;
  return (
    <>
      <g className="stroke-slabink" fill="none" strokeWidth="2.2" strokeLinejoin="round">
        <path d={drawHouse({ x, y }, studio)} />
        <path d={drawHouse({ x, y }, house)} />
        <path
          strokeWidth="1.2"
          d={`M${x(studio.from + inset)} ${y(0)}V${y(studio.wall - 0.05)}L${x((studio.from + studio.to) / 2)} ${y(studio.ridge - 0.35)}L${x(studio.to - inset)} ${y(studio.wall - 0.05)}V${y(0)}`}
        />
        <path strokeWidth="1.2" d={`M${x(house.from)} ${y(house.floor)}H${x(house.to)}`} />
      </g>
      <path
        className="fill-slablamp"
        fillOpacity="0.28"
        d={`M${x(house.from)} ${y(head)}L${x(house.from + 2.9)} ${y(head - 0.1)}V${y(house.floor + 0.05)}L${x(house.from)} ${y(sill)}Z`}
      />
      <path className="stroke-slablamp" strokeWidth="4.5" d={`M${x(house.from)} ${y(sill)}V${y(head)}`} />
      <path className="stroke-slabink" strokeWidth="1.4" fill="none" d={`M${x(17.2)} ${y(house.floor)}v-8M${x(18.9)} ${y(house.floor)}v-8M${x(17.2)} ${y(house.floor) - 8}H${x(18.9)}`} />
    </>
  );
}

/** A bass drum with a tom and two cymbals, from the front. Drawn for 25 pixels to a metre, a little large below that. */
function Kit({ x, y }: Scales) {
  const size = Math.max(0.6, Math.min(1, (x(1) - x(0)) / 25));
  return (
    <g className="stroke-slablamp" fill="none" strokeWidth="1.6" strokeLinecap="round" transform={`translate(${x(2.7)} ${y(0)}) scale(${size})`}>
      <circle cy="-7" r="6.5" />
      <path d="M-7-18h6M1-18h6M-16 0v-19m-6 1 11-2M16 0v-19m-5-2 11 2" />
    </g>
  );
}

function Garden({ x, y, width }: Scales & { width: number }) {
  const { fence, tree } = exampleYard;
  const perMetre = x(1) - x(0);
  const stones = Array.from({ length: Math.floor(width / 12) }, (_, index) => `M${index * 12 + 6} ${y(0) + 6}l5-5`).join("");
  return (
    <g fill="none">
      <path className="stroke-slabrule" strokeWidth="1" d={stones} />
      <path className="stroke-slabink" strokeWidth="2" d={`M0 ${y(0)}H${width}`} />
      <path className="stroke-slabink" strokeWidth="3" d={`M${x(fence.along)} ${y(0)}V${y(fence.height)}`} />
      <g className="stroke-slabink2" strokeWidth="1.3">
        <path d={`M${x(tree.along)} ${y(0)}V${y(tree.trunk)}`} />
        <circle cx={x(tree.along)} cy={y(tree.trunk + tree.crown * 0.6)} r={tree.crown * perMetre} strokeDasharray="4 3" />
      </g>
    </g>
  );
}

function StationMark({ station, level, at, scales: { x, y } }: { station: ExampleStation; level?: number; at: number; scales: Scales }) {
  const tone = station.tone === "source" ? "fill-slablamp" : station.tone === "listener" ? "fill-slabover" : "fill-slabink";
  return (
    <g>
      <path className="stroke-slabrule" strokeWidth="1" d={`M${at} ${LABELS - 6}L${x(station.along)} ${y(station.height)}`} />
      <circle className="fill-slablamp" cx={x(station.along)} cy={y(station.height)} r="3.2" />
      {level !== undefined && (
        <text x={at} y="20" textAnchor="middle" className={`figure ${tone}`} fontSize="21" fontWeight="640">
          {wholeDecibels(level)}
        </text>
      )}
      <text x={at} y={LABELS - 14} textAnchor="middle" className="fill-slabink2" fontSize={LABEL_SIZE}>
        {station.words}
      </text>
    </g>
  );
}

/** Keeps labels apart where their places come too close. */
function spreadLabels(places: readonly number[], gap: number): number[] {
  const spread = [...places];
  for (let index = 1; index < spread.length; index += 1) {
    spread[index] = Math.max(spread[index]!, spread[index - 1]! + gap);
  }
  return spread;
}

function ScaleBar({ x, y }: Scales) {
  const foot = y(0) + 20;
  return (
    <>
      <path className="stroke-slabink2" strokeWidth="1.2" fill="none" d={`M${x(6.5)} ${foot - 5}V${foot}H${x(11.5)}V${foot - 5}M${x(9)} ${foot - 3}v3`} />
      <text x={x(11.5) + 6} y={foot + 3} className="fill-slabink2" fontSize={LABEL_SIZE}>
        5 m
      </text>
    </>
  );
}

/** The cut through both yards, to scale. `levels` are those of the example at its five stations; without them no figure is shown. */
export function ExampleCut({ levels }: { levels?: readonly number[] }) {
  const widthClass = useWidthClass();
  const width = drawnWidths[widthClass];
  const { from, to, house } = exampleYard;
  const metre = width / (to - from);
  const ground = LABELS + 18 + house.ridge * metre;
  const scales: Scales = {
    x: scaleLinear([from, to], [0, width]),
    y: scaleLinear([0, house.ridge], [ground, ground - house.ridge * metre]),
  };
  const shown = exampleStations
    .map((station, index) => ({ station, level: levels?.[index] }))
    .filter(({ station }) => widthClass > 1024 || !station.minor);
  const places = spreadLabels(shown.map(({ station }) => scales.x(station.along)), 80);
  return (
    <svg
      viewBox={`0 0 ${width} ${ground + FOOT}`}
      role="img"
      aria-label="An example: a studio and a neighbour's house cut open to scale, from the kit past the fence to the bed"
      className={`block h-auto w-full ${roomToGrow[widthClass]}`}
    >
      <Garden {...scales} width={width} />
      <Buildings {...scales} />
      <Kit {...scales} />
      {shown.map(({ station, level }, index) => (
        <StationMark key={station.words} station={station} level={level} at={places[index]!} scales={scales} />
      ))}
      <ScaleBar {...scales} />
      <text x={scales.x(0.6)} y={ground + 23} className="fill-slabink2" fontSize={LABEL_SIZE}>
        Studio
      </text>
      <text x={scales.x(house.from)} y={ground + 23} className="fill-slabink2" fontSize={LABEL_SIZE}>
        Next door
      </text>
    </svg>
  );
}
