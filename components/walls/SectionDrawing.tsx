"use client";

import { formatQuantity, withUnit } from "../format";
import type { ConstructionSheet } from "../../lib/noise/sheet";
import { Balloons, DimensionChain, ScaleBar, WholeDimension } from "./SectionMeasures";
import { barLength, placeBalloons, placeLayers, wholeThickness, breakOver } from "./sectionGeometry";
import { BreakLine, SectionLayer } from "./SectionLayers";
import { toMillimetres } from "./units";
import { useDrawnWidth } from "../ui/useDrawnWidth";

interface Props {
  sheet: ConstructionSheet;
  /** What lies to the left and to the right. */
  sides: readonly [string, string];
  /** Number of the layer that is lit. */
  lit?: number;
}

const PROMISED = { 390: 334, 720: 540, 1024: 820, 1440: 1120 };
/** A thin leaf is drawn at most this large: pixels to a metre. */
const MOST_SCALE = 3200;
/** A thin leaf needs less height to be read, m. */
const THICK = 0.12;
const BALLOON_Y = 16;
/** Beside the cut there is room for the words of the two sides from this width on. */
const WIDE = 700;

/** The construction cut through to scale, from the yard to the room, with balloons and a dimension chain. */
export function SectionDrawing({ sheet, sides, lit }: Props) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(PROMISED, 1120);
  const thickness = wholeThickness(sheet.layers);
  if (thickness <= 0) return null;
  return (
    <div ref={place} className="min-w-0">
      <Drawing sheet={sheet} sides={sides} lit={lit} width={width} thickness={thickness} />
    </div>
  );
}

function Drawing({ sheet, sides, lit, width, thickness }: Props & { width: number; thickness: number }) {
  const wide = width >= WIDE;
  const margin = wide ? 128 : 14;
  const scale = Math.min(MOST_SCALE, (width - 2 * margin) / thickness);
  const left = (width - thickness * scale) / 2;
  const right = left + thickness * scale;
  const top = 62;
  const height = !wide ? 216 : thickness > THICK ? 308 : 200;
  const foot = top + height;
  const strips = placeLayers(sheet.layers, left, scale);
  const kink = breakOver(strips);
  const centre = kink.x + kink.width / 2;
  return (
    <svg
      width={width}
      height={foot + 108}
      viewBox={`0 0 ${width} ${foot + 108}`}
      role="img"
      aria-label={describeSection(sheet, sides, thickness)}
      className="mx-auto block max-w-full"
    >
      {strips
        .filter(({ layer }) => layer.look !== "compound" || layer.thickness !== null)
        .map((strip) => (
          <SectionLayer
            key={strip.number}
            strip={strip}
            top={top}
            height={height}
            scale={scale}
            lit={strip.number === lit}
          />
        ))}
      {strips
        .filter(({ layer }) => layer.look === "compound" && layer.thickness === null)
        .map(({ number, x }) => (
          <path key={number} d={`M${x} ${top}v${height}`} strokeWidth="4" className="stroke-ink" />
        ))}
      <BreakLine y={top} from={Math.max(2, left - 26)} to={Math.min(width - 2, right + 26)} kink={centre} />
      <BreakLine y={foot} from={Math.max(2, left - 26)} to={Math.min(width - 2, right + 26)} kink={centre} />
      <Balloons
        strips={strips}
        centres={placeBalloons(strips, 2, width - 2)}
        y={BALLOON_Y}
        foot={top + 7}
        lit={lit}
      />
      <DimensionChain strips={strips} y={foot + 36} lit={lit} />
      <WholeDimension from={left} to={right} y={foot + 72} thickness={thickness} />
      <SideNames
        sides={sides}
        wide={wide}
        left={left}
        right={right}
        middle={top + height / 2}
        foot={foot + 100}
        width={width}
      />
      {wide && <ScaleBar x={8} y={foot + 72} scale={scale} length={barLength(scale, 110)} />}
    </svg>
  );
}

interface SideNamesProps {
  sides: readonly [string, string];
  wide: boolean;
  left: number;
  right: number;
  middle: number;
  foot: number;
  width: number;
}

/** Beside the cut each word of the name has its own line; on a narrow drawing the names stand under the ends. */
function SideNames({ sides, wide, left, right, middle, foot, width }: SideNamesProps) {
  const places = [
    { x: wide ? left - 38 : 2, anchor: wide ? "end" : "start" },
    { x: wide ? right + 38 : width - 2, anchor: wide ? "start" : "end" },
  ] as const;
  return places.map(({ x, anchor }, side) => {
    const lines = wide ? sides[side]!.split(" ") : [sides[side]!];
    return (
      <text key={anchor} textAnchor={anchor} fontSize="14" fontWeight="600">
        {lines.map((line, index) => (
          <tspan key={index} x={x} y={wide ? middle + index * 19 : foot}>
            {line}
          </tspan>
        ))}
      </text>
    );
  });
}

function describeSection(
  sheet: ConstructionSheet,
  sides: readonly [string, string],
  thickness: number,
): string {
  const names = sheet.layers.map(({ name }) => name).join("; ");
  const whole = withUnit(formatQuantity(toMillimetres(thickness), 1), "mm");
  return `Section of ${sheet.name}, ${whole}, from ${sides[0]} to ${sides[1]}: ${names}.`;
}
