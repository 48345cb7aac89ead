"use client";

import { useDrawnWidth } from "../ui/useDrawnWidth";
import { useWidthClass } from "../ui/useWidthClass";
import type { WidthClass } from "../ui/widthClass";
import { CrossCutDrawing } from "../verdict/CrossCutDrawing";
import type { LandingBuild } from "./LandingBuild";

const ownPlace: Record<WidthClass, number> = { 390: 334, 720: 620, 1024: 860, 1440: 780 };
const heights: Record<WidthClass, number> = { 390: 230, 720: 300, 1024: 340, 1440: 348 };
const few = ["source", "fence", "listener"];

interface Props {
  build: LandingBuild;
  /** Whether the limit holds at the hour; where none does, the bed's figure takes no side. */
  holds: boolean;
  promised?: Record<WidthClass, number>;
}

/** Narrower than this there is room for three stations, px. */
const NARROW = 480;

/** Both yards cut open, with the levels of a build. */
export function LandingCut({ build, holds, promised = ownPlace }: Props) {
  const widthClass = useWidthClass();
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 900);
  const stations = build.stations.filter(({ station }) => width >= NARROW || few.includes(station.kind));
  return (
    <div ref={place} className="w-full min-w-0 overflow-hidden">
      <p className="mb-2 text-second text-slabink2">{`An invented yard: levels in dB ${build.where}`}</p>
      <CrossCutDrawing
        cut={build.cut}
        stations={stations}
        where={build.where}
        unit="dB"
        state={holds ? build.state : "not weighed"}
        sourceIsKit
        inBed
        width={width}
        height={heights[width < NARROW ? 390 : widthClass]}
      />
    </div>
  );
}
