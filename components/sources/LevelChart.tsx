"use client";

import { OCTAVE_BANDS } from "@/lib/noise/bands";
import { bandWords, formatNumber, percent, withUnit, wholeDecibels } from "../format";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { Beads, DashedName, Grid, LitColumn, ShareBars } from "./LevelMarks";
import { drawThrough, frameOf, levelScales } from "./levelGeometry";
import { sharesOf, totalOf } from "./spectrum";

interface Props {
  name: string;
  levels: readonly (number | "silent" | null)[];
  /** One standard deviation per band, dB. */
  doubts: readonly number[];
  aWeights: readonly number[];
  lit: number;
}

const PROMISED = { 390: 334, 720: 640, 1024: 540, 1440: 986 };

/** Nine levels as beads with their doubt, dashed what dB(A) counts of them, and beneath each band's share of the energy. */
export function LevelChart({ name, levels, doubts, aWeights, lit }: Props) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(PROMISED, 1000);
  const frame = frameOf(width);
  const counted = levels.map((level, i) => (typeof level === "number" ? level + (aWeights[i] ?? 0) : null));
  const scales = levelScales(frame, levels, doubts, counted);
  const shares = sharesOf(levels);
  const inSum = totalOf(levels, aWeights);
  return (
    <div ref={place} className="min-w-0">
      {!frame.named && inSum !== null && (
        <p className="mb-1 text-second text-ink2">Dashed: what one figure in dB(A) counts, {withUnit(formatNumber(inSum), "dB(A)")} in sum.</p>
      )}
      <svg width={frame.width} height={frame.height} viewBox={`0 0 ${frame.width} ${frame.height}`} role="img" aria-label={describe(name, levels, shares)} className="block max-w-full">
        <LitColumn frame={frame} scales={scales} lit={lit} />
        <Grid frame={frame} scales={scales} lit={lit} />
        <path d={drawThrough(counted, scales)} fill="none" strokeWidth="1.5" strokeDasharray="5 4" className="stroke-ink2" />
        <path d={drawThrough(levels, scales)} fill="none" strokeWidth="1.6" className="stroke-ink" />
        <Beads frame={frame} scales={scales} levels={levels} doubts={doubts} lit={lit} />
        {frame.named && inSum !== null && <DashedName frame={frame} scales={scales} counted={counted} inSum={inSum} lit={lit} />}
        <ShareBars frame={frame} scales={scales} shares={shares} levels={levels} lit={lit} />
      </svg>
    </div>
  );
}

function describe(name: string, levels: Props["levels"], shares: readonly number[]): string {
  const known = OCTAVE_BANDS.map((band, i) => `${bandWords(band)} ${levels[i] === null ? "unknown" : wholeDecibels(levels[i]!)}`);
  const most = shares.indexOf(Math.max(...shares));
  const share = shares[most]! > 0 ? ` ${bandWords(OCTAVE_BANDS[most]!)} carries ${percent(shares[most]!)} of the energy.` : "";
  return `${name}, sound power per octave band in decibels: ${known.join(", ")}.${share}`;
}
