"use client";

import { formatNumber, marginWords, withUnit } from "../format";
import { HatchBox } from "../marks/HatchBox";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import type { LandingBuild } from "./LandingBuild";
import { buildWords } from "./landingWords";

const promised = { 390: 326, 720: 560, 1024: 270, 1440: 338 } as const;
/** Pixels to a millimetre of thickness. */
const SCALE = 0.42;
const LEFT = 102;
const RIGHT = 92;
const ROW = 56;

const thickWords = (metres: number | null) => (metres === null ? "" : withUnit(formatNumber(metres * 1000), "mm"));
const massWords = (mass: number | null) => (mass === null ? "" : withUnit(formatNumber(mass), "kg/m²"));

function Leaf({ build, y, width, lit }: { build: LandingBuild; y: number; width: number; lit: boolean }) {
  const { thickness, surfaceMass } = build.door;
  const thick = (thickness ?? 0) * 1000 * SCALE;
  return (
    <g>
      <HatchBox kind="door" lit={lit} x={LEFT} y={y + (ROW - thick) / 2 - 8} width={width - LEFT - RIGHT} height={thick} outline={1.8} />
      <text x="0" y={y + 18} fontSize="14" fontWeight="650">
        {buildWords[build.key].label}
      </text>
      <text x="0" y={y + 36} fontSize="13" className="fill-ink2">
        {thickWords(thickness)}
      </text>
      <text x={width - RIGHT + 12} y={y + 18} fontSize="14" fontWeight="650">
        {massWords(surfaceMass)}
      </text>
      <text x={width - RIGHT + 12} y={y + 36} fontSize="13" fontWeight="650" className={build.state === "over" ? "fill-over" : "fill-under"}>
        {marginWords(build.state, build.margin)}
      </text>
    </g>
  );
}

const wordsOf = ({ key, door, state, margin }: LandingBuild) =>
  `${buildWords[key].label.toLowerCase()}: ${[thickWords(door.thickness), massWords(door.surfaceMass), marginWords(state, margin)].filter(Boolean).join(", ")}`;

/** Two leaves looked down on, their thickness to one scale. */
export function LeavesFigure({ builds }: { builds: readonly LandingBuild[] }) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 420);
  return (
    <div ref={place}>
      <svg
        width={width}
        height={ROW * builds.length}
        viewBox={`0 0 ${width} ${ROW * builds.length}`}
        role="img"
        aria-label={`Door leaves looked down on, their thickness to one scale. ${builds.map(wordsOf).join("; ")}.`}
        className="block"
      >
        {builds.map((build, index) => (
          <Leaf key={build.key} build={build} y={index * ROW} width={width} lit={index > 0} />
        ))}
      </svg>
    </div>
  );
}
