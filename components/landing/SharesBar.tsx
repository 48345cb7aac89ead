"use client";

import { percent } from "../format";
import { HatchBox } from "../marks/HatchBox";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import type { Share } from "./LandingBuild";

const promised = { 390: 326, 720: 560, 1024: 270, 1440: 338 } as const;
const TOP = 30;
const THICK = 54;
const LETTER = 7;

const labelOf = ({ name, share }: Share): string => `${name} ${percent(share)}`;

/** All energy that arrives in the deciding band as one bar, hatched by the way it took; what is least stays blank. */
export function SharesBar({ shares, where }: { shares: readonly Share[]; where: string }) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 420);
  const inner = width - 2;
  const starts = shares.map((_, index) => 1 + inner * shares.slice(0, index).reduce((sum, { share }) => sum + share, 0));
  const fits = (one: Share) => labelOf(one).length * LETTER < one.share * inner;
  const below = shares.filter((one) => !fits(one)).map(labelOf);
  return (
    <div ref={place}>
      <svg
        width={width}
        height="112"
        viewBox={`0 0 ${width} 112`}
        role="img"
        aria-label={`One bar of all that arrives in bed ${where} as drawn: ${shares.map(labelOf).join(", ")}.`}
        className="block"
      >
        {shares.map((one, index) => (
          <g key={one.name}>
            <HatchBox kind={one.kind} lit={one.kind === "door"} x={starts[index]!} y={TOP} width={one.share * inner} height={THICK} />
            {fits(one) && (
              <text x={starts[index]! + (one.share * inner) / 2} y={TOP - 8} textAnchor="middle" fontSize="13" fontWeight="600">
                {labelOf(one)}
              </text>
            )}
          </g>
        ))}
        <rect x="1" y={TOP} width={inner} height={THICK} fill="none" strokeWidth="1.5" className="stroke-ink" />
        <text x={width} y={TOP + THICK + 20} textAnchor="end" fontSize="13" fontWeight="600">
          {below.join(", ")}
        </text>
        <text x="1" y={TOP + THICK + 20} fontSize="13" className="fill-ink2">
          {`all ${where}: 100\u00a0%`}
        </text>
      </svg>
    </div>
  );
}
