"use client";

import { OCTAVE_BANDS } from "../../lib/noise/bands";
import { bandWords, formatBand, percent } from "../format";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { MaterialBox } from "../walls/MaterialBox";
import { sharesAt, type Soaker } from "./soak";
import { hatchOf } from "./soakHatches";

interface Props {
  soakers: readonly Soaker[];
  litBand: number;
  onLight: (band: number) => void;
}

const PROMISED = { 390: 334, 720: 580, 1024: 420, 1440: 600 };
const HEIGHT = 200;
const TOP = 14;
const FOOT = HEIGHT - 30;
const LEFT = 38;

/** Of each band, which part goes into what: linear shares of the energy that the room takes, 100 % in all. */
export function SoakChart({ soakers, litBand, onLight }: Props) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(PROMISED, 680);
  const pitch = (width - LEFT - 24) / OCTAVE_BANDS.length;
  return (
    <div ref={place} className="min-w-0">
      <svg width={width} height={HEIGHT} viewBox={`0 0 ${width} ${HEIGHT}`} role="img" aria-label={describe(soakers, litBand)} className="block max-w-full">
        <g fontSize="12">
          {[0, 50, 100].map((tick) => (
            <text key={tick} x={LEFT - 8} y={FOOT - ((FOOT - TOP) * tick) / 100 + 4} textAnchor="end">
              {tick}
            </text>
          ))}
          <text x={LEFT - 8} y={TOP + 20} textAnchor="end">
            %
          </text>
          <text x={width - 22} y={HEIGHT - 8} className="fill-ink2!">
            Hz
          </text>
        </g>
        {OCTAVE_BANDS.map((band, index) => (
          <Column key={band} soakers={soakers} band={index} x={LEFT + pitch * index} pitch={pitch} lit={index === litBand} onLight={() => onLight(index)} />
        ))}
      </svg>
    </div>
  );
}

interface ColumnProps {
  soakers: readonly Soaker[];
  band: number;
  x: number;
  pitch: number;
  lit: boolean;
  onLight: () => void;
}

function Column({ soakers, band, x, pitch, lit, onLight }: ColumnProps) {
  const shares = sharesAt(soakers, band);
  const width = Math.round(pitch * 0.62);
  const left = Math.round(x + (pitch - width) / 2);
  return (
    <g onClick={onLight} className={lit ? undefined : "cursor-pointer"}>
      <rect x={x} y={TOP - 12} width={pitch} height={HEIGHT - TOP + 8} className={lit ? "fill-lampwash" : "fill-transparent"} />
      {shares ? (
        blocksOf(shares).map(({ foot, height }, index) => {
          const box = { x: left, y: foot - height, width, height };
          const hatch = hatchOf(soakers[index]!);
          return (
            <g key={soakers[index]!.id}>
              <rect {...box} className="fill-sheet" />
              {hatch && <MaterialBox hatch={hatch} {...box} />}
              <rect {...box} fill="none" strokeWidth="1.3" className="stroke-ink" />
            </g>
          );
        })
      ) : (
        <rect x={left} y={TOP} width={width} height={FOOT - TOP} fill="none" strokeDasharray="4 4" strokeWidth="1.3" className="stroke-edge" />
      )}
      <text x={x + pitch / 2} y={HEIGHT - 8} textAnchor="middle" fontSize="12" fontWeight={lit ? 700 : 400} letterSpacing={pitch < 29 ? "-0.4" : undefined}>
        {formatBand(OCTAVE_BANDS[band]!)}
      </text>
    </g>
  );
}

/** From the foot upward. */
function blocksOf(shares: readonly number[]): { foot: number; height: number }[] {
  let foot = FOOT;
  return shares.map((share) => {
    const block = { foot, height: share * (FOOT - TOP) };
    foot -= block.height;
    return block;
  });
}

function describe(soakers: readonly Soaker[], band: number): string {
  const shares = sharesAt(soakers, band);
  const where = bandWords(OCTAVE_BANDS[band]!);
  if (!shares) return `Who soaks it up at ${where} is not known`;
  return `Who soaks it up at ${where}: ${soakers.map(({ name }, index) => `${name} ${percent(shares[index]!)}`).join(", ")}`;
}
