import type { State } from "@/lib/noise/verdict";
import { wholeDecibels } from "../format";
import { HatchBox } from "../marks/HatchBox";
import { outlinePoise } from "../marks/poise";
import { Settle } from "./Settle";
import type { Block } from "./stack";

export const CRATE = { left: 4, width: 88, height: 76 } as const;
export const PIVOT = { x: 100, y: 48 } as const;
export const FOOT = 282;

/** Length of the long arm, and where on it the weight of the limit hangs. */
export const armOf = (width: number) => Math.min(190, width - PIVOT.x - 14);
export const WEIGHT_AT = 0.68;

export function BeamArm({ end, dashed }: { end: number; dashed: boolean }) {
  const notches = Array.from({ length: 13 }, (_, index) => `M${16 + (index * (end - 24)) / 12} -2.5v${index % 4 === 0 ? -9 : -6}`).join("");
  return (
    <g className="stroke-ink">
      <path d={`M-60 0H${end}`} strokeWidth="6" strokeDasharray={dashed ? "9 6" : undefined} />
      <path d={notches} strokeWidth="1.3" />
    </g>
  );
}

/** The limit as a weight on the long arm; it hangs straight however the beam tilts. */
export function Weight({ x, y, allowed, unit }: { x: number; y: number; allowed: number; unit: string }) {
  return (
    <Settle y={y}>
      <path d={`M${x} ${y}v10`} strokeWidth="2" className="stroke-ink" />
      <path d={outlinePoise(x, y + 10, 54, 44)} strokeWidth="2" strokeLinejoin="round" className="fill-sheet stroke-ink" />
      <text x={x} y={y + 40} textAnchor="middle" fontSize="20" className="figure font-[660]">
        {wholeDecibels(allowed)}
      </text>
      <text x={x} y={y + 72} textAnchor="middle" fontSize="13" className="fill-ink2">
        {`${unit} allowed`}
      </text>
    </Settle>
  );
}

/** Blocks of energy: each as high as its part of the allowance times the crate. */
export function Blocks({ blocks, height, width }: { blocks: readonly Block[]; height: number; width: number }) {
  const left = CRATE.left + 6;
  return blocks.map(({ path, lit, from, to }) => (
    <g key={path.id}>
      <title>{path.name}</title>
      <HatchBox kind={path.kind} lit={lit} x={left} y={FOOT - to * height} width={width} height={(to - from) * height} outline={(to - from) * height > 3 ? 1.2 : 0.6} />
    </g>
  ));
}

export function Crate({ top }: { top: number }) {
  const right = CRATE.left + CRATE.width;
  return (
    <g fill="none" className="stroke-ink">
      <path d={`M${CRATE.left} ${top}V${FOOT}H${right}V${top}`} strokeWidth="3" />
      <path d={`M${CRATE.left} ${top}H${right + 34}`} strokeWidth="1.6" strokeDasharray="4.5 3" />
    </g>
  );
}

const bracketColour: Record<State, string> = { over: "text-over", under: "text-under", tight: "text-tight", "not weighed": "text-ink3" };

/** Between stack and crate: what is too much, or what is left. */
export function Bracket({ top, crate, state }: { top: number; crate: number; state: State }) {
  const x = CRATE.left + CRATE.width + 6;
  const [high, low] = state === "over" ? [top, crate - 3] : [crate + 3, top];
  const words = state === "over" ? "too much" : "room left";
  const clear = state === "over" ? 0 : 8;
  return (
    <g className={bracketColour[state]}>
      {low - high > 3 && <path d={`M${x} ${high}h7V${low}h-7`} fill="none" stroke="currentColor" strokeWidth="1.8" />}
      <text x={x + 16} y={Math.max((high + low) / 2 + 4, high + 8 + clear)} fontSize="14" className="fill-current font-[650]">
        {words}
      </text>
    </g>
  );
}

export function BreakLine({ y }: { y: number }) {
  const left = CRATE.left - 2;
  const zigzag = Array.from({ length: 8 }, (_, index) => `l6 ${index % 2 === 0 ? -7 : 7}l6 0`).join("");
  return (
    <g>
      <path d={`M${left} ${y}${zigzag}`} strokeWidth="7" fill="none" className="stroke-sheet" />
      <path d={`M${left} ${y - 4}${zigzag}M${left} ${y + 4}${zigzag}`} strokeWidth="1.3" fill="none" className="stroke-ink" />
    </g>
  );
}

/** Where the basket hangs: a cord from the short arm to a yoke over the load. */
export function Hanger({ from, to }: { from: { x: number; y: number }; to: number }) {
  const middle = CRATE.left + CRATE.width / 2;
  const wide = CRATE.width / 2 + 2;
  return <path d={`M${from.x} ${from.y}L${middle} ${to - 14}M${middle - wide} ${to}L${middle} ${to - 14}L${middle + wide} ${to}`} fill="none" strokeWidth="1.7" strokeLinejoin="round" className="stroke-ink" />;
}
