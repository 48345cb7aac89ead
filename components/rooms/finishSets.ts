import type { Surface } from "@/lib/noise/plan";
import type { Size } from "./room";

/**
 * What "bare", "furnished" and "treated" stand for: which of the library's finishes, and on how much of the room. The
 * coefficients are the library's; the shares are common practice, no source, and the page says so.
 */
export const FINISH_WORDS = ["bare", "furnished", "treated"] as const;
export type FinishWord = (typeof FINISH_WORDS)[number];

/** What lies behind the finish: it decides what is left of the bass. */
export interface Shell {
  walls: "light" | "masonry";
  floor: "concrete" | "timber";
}

export interface Piece {
  name: string;
  libraryKey: string;
  /** m2 */
  area: number;
}

const wallKeys = { light: "plasterboard-13-studs", masonry: "plaster-brick" } as const;
const floorKeys = { concrete: "floor-concrete", timber: "floor-timber-joists" } as const;
const CEILING = "plasterboard-13-studs";

/** Shares of walls, ceiling and floor that each word covers. */
const shares: Record<FinishWord, { curtain: number; panels: number; ceilingPanels: number; rug: number }> = {
  bare: { curtain: 0, panels: 0, ceilingPanels: 0, rug: 0 },
  furnished: { curtain: 0.1, panels: 0, ceilingPanels: 0, rug: 0.5 },
  treated: { curtain: 0, panels: 0.25, ceilingPanels: 0.5, rug: 0.5 },
};

/** In words what each covers; the same figures as `shares`. */
export const finishSays: Record<FinishWord, string> = {
  bare: "The shell alone.",
  furnished: "A heavy curtain on a tenth of the walls, a rug on half of the floor.",
  treated: "50 mm of fibre on a quarter of the walls and on half of the ceiling, a rug on half of the floor.",
};

const LEAST = 0.1;
/** 19.35 is 19.4, though its binary form lies a little below. */
const tenths = (area: number) => Math.max(LEAST, Math.round(area * 10 + 1e-6) / 10);

/** Areas of a box's faces, m2. */
export function boxAreas([width, depth, height]: Size) {
  return { walls: tenths(2 * (width + depth) * height), ceiling: tenths(width * depth), floor: tenths(width * depth) };
}

/** The surfaces a word stands for in a room of this size. */
export function finishSet(word: FinishWord, shell: Shell, size: Size): Piece[] {
  const { walls, ceiling, floor } = boxAreas(size);
  const { curtain, panels, ceilingPanels, rug } = shares[word];
  const pieces = [
    { name: "Walls", libraryKey: wallKeys[shell.walls], share: 1 - curtain - panels, of: walls },
    { name: "Curtain", libraryKey: "curtain-475-draped", share: curtain, of: walls },
    { name: "Wall panels", libraryKey: "liner-50", share: panels, of: walls },
    { name: "Ceiling", libraryKey: CEILING, share: 1 - ceilingPanels, of: ceiling },
    { name: "Ceiling panels", libraryKey: "liner-50", share: ceilingPanels, of: ceiling },
    { name: "Floor", libraryKey: floorKeys[shell.floor], share: 1 - rug, of: floor },
    { name: "Rug", libraryKey: "carpet-heavy-concrete", share: rug, of: floor },
  ];
  return pieces
    .filter(({ share }) => share > 0)
    .map(({ name, libraryKey, share, of }) => ({ name, libraryKey, area: tenths(share * of) }));
}

const MASONRY = /^(plaster-brick|block-|brick-|concrete-bare)/;
const TIMBER = /^(floor-timber|floor-parquet)/;

/** What the surfaces say about the shell; light walls and a slab where they say nothing. */
export function shellOf(surfaces: readonly Surface[]): Shell {
  const some = (pattern: RegExp) => surfaces.some(({ finishKey }) => finishKey !== null && pattern.test(finishKey));
  return { walls: some(MASONRY) ? "masonry" : "light", floor: some(TIMBER) ? "timber" : "concrete" };
}

const SHELLS: readonly Shell[] = (["light", "masonry"] as const).flatMap((walls) =>
  (["concrete", "timber"] as const).map((floor) => ({ walls, floor })),
);

/** The word whose set these surfaces are, area by area; null where something of it was changed. */
export function wordOf(surfaces: readonly Surface[], size: Size | undefined): { word: FinishWord; shell: Shell } | null {
  if (!size) return null;
  for (const word of FINISH_WORDS) {
    for (const shell of SHELLS) if (isSet(surfaces, finishSet(word, shell, size))) return { word, shell };
  }
  return null;
}

function isSet(surfaces: readonly Surface[], pieces: readonly Piece[]): boolean {
  if (surfaces.length !== pieces.length) return false;
  const left = [...surfaces];
  return pieces.every(({ libraryKey, area }) => {
    const at = left.findIndex((one) => one.finishKey === libraryKey && Math.abs(one.area - area) < LEAST / 2);
    if (at >= 0) left.splice(at, 1);
    return at >= 0;
  });
}
