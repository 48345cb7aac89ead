"use client";

import { LandingCut } from "../landing/LandingCut";
import type { LandingBuild } from "../landing/LandingBuild";
import type { WidthClass } from "../ui/widthClass";

const promised: Record<WidthClass, number> = { 390: 334, 720: 584, 1024: 430, 1440: 700 };

/** The example as it is drawn, at the hour its limit holds. */
export function ExampleCut({ build }: { build: LandingBuild }) {
  return <LandingCut build={build} holds promised={promised} />;
}
