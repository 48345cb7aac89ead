import { OCTAVE_BANDS } from "@/lib/noise/bands";
import { bandWords, formatBand, formatNumber, percent, wholeDecibels, withUnit } from "../format";
import type { LevelFrame, LevelScales } from "./levelGeometry";

type Level = number | "silent" | null;

interface Drawn {
  frame: LevelFrame;
  scales: LevelScales;
  lit: number;
}

export function LitColumn({ frame, scales, lit }: Drawn) {
  return <rect x={scales.x(lit) - scales.pitch / 2} y="8" width={scales.pitch} height={frame.height - 8} className="fill-lampwash" />;
}

export function Grid({ frame, scales, lit }: Drawn) {
  return (
    <g fontSize="12">
      <path d={scales.ticks.map((tick) => `M${frame.left} ${Math.round(scales.y(tick)) + 0.5}H${frame.right}`).join("")} className="stroke-rule" />
      {scales.ticks.map((tick) => (
        <text key={tick} x={frame.left - 8} y={scales.y(tick) + 4} textAnchor="end">
          {formatNumber(tick)}
        </text>
      ))}
      <text x={frame.left - 8} y="14" textAnchor="end" fontWeight="650">
        dB
      </text>
      {OCTAVE_BANDS.map((band, i) => (
        <text key={band} x={scales.x(i)} y={frame.foot + 20} textAnchor="middle" fontWeight={i === lit ? 700 : 500} letterSpacing={scales.pitch < 31 ? "-0.4" : undefined}>
          {formatBand(band)}
        </text>
      ))}
      <text x={frame.left - 8} y={frame.foot + 20} textAnchor="end" className="fill-ink3!">
        Hz
      </text>
    </g>
  );
}

interface BeadProps extends Drawn {
  levels: readonly Level[];
  doubts: readonly number[];
}

/** A bead per known band on a block as high as its doubt; a band nobody knows says so at the foot. */
export function Beads({ frame, scales, levels, doubts, lit }: BeadProps) {
  const half = Math.min(8, scales.pitch / 4);
  return levels.map((level, i) => {
    const x = scales.x(i);
    if (typeof level !== "number")
      return (
        <text key={OCTAVE_BANDS[i]} x={x} y={frame.foot - 8} textAnchor="middle" fontSize="12" className="fill-ink2!">
          {level === "silent" ? "none" : "?"}
        </text>
      );
    const [high, low] = [scales.y(level + (doubts[i] ?? 0)), Math.min(frame.foot, scales.y(level - (doubts[i] ?? 0)))];
    return (
      <g key={OCTAVE_BANDS[i]}>
        <rect x={x - half} y={high} width={2 * half} height={Math.max(0, low - high)} className="fill-ink" fillOpacity="0.16" />
        <path d={`M${x - half} ${high}h${2 * half}M${x - half} ${low}h${2 * half}`} strokeWidth="1.5" className="stroke-ink" />
        <circle cx={x} cy={scales.y(level)} r="5" strokeWidth="1.8" className={i === lit ? "fill-lamp stroke-ink" : "fill-ink stroke-ink"} />
        <text x={x} y={high - 7} textAnchor="middle" fontSize={i === lit ? 17 : 14} fontWeight={i === lit ? 650 : 550} paintOrder="stroke" strokeWidth="4" className={i === lit ? "figure stroke-lampwash" : "figure stroke-sheet"}>
          {wholeDecibels(level)}
        </text>
      </g>
    );
  });
}

interface DashedProps extends Drawn {
  counted: readonly (number | null)[];
  inSum: number;
}

/** Names the dashed line where it has left the solid one. */
export function DashedName({ frame, scales, counted, inSum, lit }: DashedProps) {
  const at = [2, 3, 1].find((i) => counted[i] !== null && counted[i]! > scales.low);
  if (at === undefined) return null;
  const x = scales.x(at) + 34;
  const y = Math.min(frame.foot - 26, scales.y(counted[at]!) + 44);
  const less = counted[lit] === null ? "" : `${bandWords(OCTAVE_BANDS[lit]!)} counts ${wholeDecibels(counted[lit]!)} there. `;
  return (
    <g fontSize="13" className="text-ink">
      <path d={`M${scales.x(at) + 4} ${scales.y(counted[at]!) + 6}L${x - 12} ${y - 4}H${x - 4}`} fill="none" className="stroke-ink" />
      <text x={x} y={y} fontWeight="650" paintOrder="stroke" strokeWidth="4" className="stroke-sheet">
        what one figure in dB(A) counts
      </text>
      <text x={x} y={y + 17} paintOrder="stroke" strokeWidth="4" className="fill-ink2! stroke-sheet">
        {less}In sum {withUnit(formatNumber(inSum), "dB(A)")}.
      </text>
    </g>
  );
}

interface ShareProps extends Drawn {
  shares: readonly number[];
  levels: readonly Level[];
}

/** Each band's share of the energy, linear: all bars add up to the whole. */
export function ShareBars({ frame, scales, shares, levels, lit }: ShareProps) {
  const most = Math.max(0.1, Math.ceil(Math.max(...shares) * 10) / 10);
  const y = (share: number) => frame.sharesFoot - (share / most) * (frame.sharesFoot - frame.sharesTop);
  const width = scales.pitch * 0.62;
  return (
    <g fontSize="12">
      <path d={`M${frame.left} ${Math.round(y(most)) + 0.5}H${frame.right}`} className="stroke-rule" />
      {[0, most].map((share) => (
        <text key={share} x={frame.left - 8} y={y(share) + 4} textAnchor="end">
          {formatNumber(share * 100)}
        </text>
      ))}
      <text x={frame.left - 8} y={(y(0) + y(most)) / 2 + 4} textAnchor="end" className="fill-ink3!">
        %
      </text>
      {shares.map((share, i) => (
        <g key={OCTAVE_BANDS[i]}>
          <rect x={scales.x(i) - width / 2} y={y(share)} width={width} height={Math.max(0, frame.sharesFoot - y(share))} className={i === lit ? "fill-lamp stroke-ink" : "fill-ink"} strokeWidth={i === lit ? 1.6 : undefined} />
          <text x={scales.x(i)} y={frame.sharesFoot + 18} textAnchor="middle" fontWeight={i === lit ? 700 : 400}>
            {levels[i] === null ? "?" : percent(share).replace(/\s%/, "")}
          </text>
        </g>
      ))}
      <path d={`M${frame.left} ${frame.sharesFoot}H${frame.right}`} strokeWidth="2" className="stroke-ink" />
      {frame.named ? (
        <>
          <text x={frame.right + 8} y={frame.sharesTop + 14} fontSize="13" fontWeight="650">
            share of
          </text>
          <text x={frame.right + 8} y={frame.sharesTop + 30} fontSize="13" fontWeight="650">
            the energy
          </text>
          <text x={frame.right + 8} y={frame.sharesTop + 46} fontSize="13" className="fill-ink2!">
            adds to 100
          </text>
        </>
      ) : (
        <text x={frame.right} y={frame.sharesTop - 8} textAnchor="end" fontWeight="650" paintOrder="stroke" strokeWidth="4" className="stroke-sheet">
          share of the energy, adds to 100
        </text>
      )}
    </g>
  );
}
