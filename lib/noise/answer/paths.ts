import { BAND_COUNT } from "../bands";
import { addEnergy, levelOf, weightedSum } from "../levels";
import { hasBand, maskWhere, NO_BANDS, type BandMask } from "../model/masks";
import type { Part } from "../sound/parts";
import { toOut, type PathVerdict } from "../verdict";
import type { Weighing } from "./weighing";

/** Ways that a reader sees as one: an element, a source, a mouth, or all leaks of a building. */
export interface Way {
  readonly id: string;
  readonly parts: readonly Part[];
  readonly energy: Float64Array;
}

const LEAST = 1e-12;

function groupIdOf({ id, kind, element }: Part): string {
  return kind === "leak" && element ? `leaks:${element.building}` : id;
}

/** Ways by the thing sound leaves by, loudest at the leading band (or in the weighted total) first. */
export function waysOf(weighing: Weighing): Way[] {
  const groups = new Map<string, Part[]>();
  for (const part of weighing.parts.ways) {
    const id = groupIdOf(part);
    const known = groups.get(id);
    if (known) known.push(part);
    else groups.set(id, [part]);
  }
  const ways = [...groups].map(([id, parts]): Way => {
    const energy = new Float64Array(BAND_COUNT);
    parts.forEach((part) => addEnergy(energy, part.energy));
    return { id, parts, energy };
  });
  return ways
    .filter((way) => unknownOf(weighing, way) !== NO_BANDS || way.energy.some((each) => each > 0))
    .sort((a, b) => rankOf(weighing, b.energy) - rankOf(weighing, a.energy));
}

/** What of an energy counts where the listener is weighed: the leading band, or the weighted total. */
export function rankOf(
  { total, leading }: Pick<Weighing, "total" | "leading">,
  energy: Float64Array,
): number {
  if (total) return weightedSum(energy, total.factors);
  return leading < 0 ? 0 : energy[leading];
}

/** Bands in which a way's own figure is not known. */
function unknownOf({ unknown }: Weighing, { parts, energy }: Way): BandMask {
  if (unknown === NO_BANDS) return NO_BANDS;
  const own = parts.reduce((mask, { element }) => mask | (element?.unknown ?? 0), 0);
  return unknown & (own | maskWhere((band) => energy[band] === 0));
}

function estimatedOf({ parts }: Way): BandMask {
  return parts.reduce(
    (mask, { element, source }) => mask | (element?.estimated ?? 0) | (source?.estimated ? ~0 : 0),
    0,
  );
}

/** What is left of `whole` without `part`; what only rounding leaves is silence. */
function remainder(whole: number, part: number): number {
  const left = whole - part;
  return left > LEAST * whole ? left : 0;
}

const shareOf = (part: number, whole: number): number => (whole > 0 ? Math.min(1, part / whole) : 0);

function weightedPath({ total, energy }: Weighing, way: Way): PathVerdict["weighted"] {
  if (!total) return null;
  const [part, whole] = [weightedSum(way.energy, total.factors), weightedSum(energy, total.factors)];
  const without = total.unknown ? NaN : levelOf(remainder(whole, part));
  return { level: toOut(levelOf(part)), share: shareOf(part, whole), without: toOut(without) };
}

/** Four rows of nine bands: level, share and level without, and whether estimates stand behind them. */
function bandsOf(
  { energy, unknown }: Weighing,
  way: Way,
  ownUnknown: BandMask,
): Pick<PathVerdict, "levels" | "shares" | "without" | "estimated"> {
  const rows: Pick<PathVerdict, "levels" | "shares" | "without" | "estimated"> = {
    levels: [],
    shares: [],
    without: [],
    estimated: [],
  };
  const estimates = estimatedOf(way);
  for (let band = 0; band < BAND_COUNT; band += 1) {
    const [part, whole] = [way.energy[band], energy[band]];
    rows.levels.push(toOut(hasBand(ownUnknown, band) ? NaN : levelOf(part)));
    rows.shares.push(shareOf(part, whole));
    rows.without.push(toOut(hasBand(unknown, band) ? NaN : levelOf(remainder(whole, part))));
    rows.estimated.push(hasBand(estimates, band));
  }
  return rows;
}

/** A way as the reader sees it: level in dB, share, and level without it, band by band and of the weighted total. */
export function pathVerdict(weighing: Weighing, way: Way): PathVerdict {
  const [first] = way.parts;
  const isGroup = way.id !== first.id;
  return {
    id: way.id,
    kind: first.kind,
    partId: isGroup ? null : first.kind === "in the room" ? (first.source?.source.id ?? null) : first.id,
    name: isGroup ? "Leaks" : first.name,
    ...bandsOf(weighing, way, unknownOf(weighing, way)),
    weighted: weightedPath(weighing, way),
  };
}
