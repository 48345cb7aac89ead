import { BAND_COUNT } from "./bands";
import { energyOf, levelOf } from "./levels";
import {
  toOutSpectrum,
  type Out,
  type OutSpectrum,
  type PathVerdict,
  type ReceiverVerdict,
  type Verdict,
} from "./verdict";

/** Contributions and paths sent per listener; the others travel as one. */
const ON_THE_WIRE = 12;

function toEnergy(level: Out): number {
  if (level === "unknown") return NaN;
  return level === "silent" ? 0 : energyOf(level);
}

/** Power sum of spectra; unknown where one is unknown. */
function sumSpectra(spectra: readonly OutSpectrum[]): OutSpectrum {
  const sum = new Float64Array(BAND_COUNT).map((_, band) =>
    spectra.reduce((total, levels) => total + toEnergy(levels[band]), 0),
  );
  return toOutSpectrum(sum.map(levelOf));
}

function restOf({ contributions, rest }: ReceiverVerdict): OutSpectrum | null {
  const left = contributions.slice(ON_THE_WIRE).map(({ levels }) => levels);
  if (left.length === 0) return rest;
  return sumSpectra(rest ? [...left, rest] : left);
}

/** Paths beyond the loudest as one, so that shares still add up to 1. */
function gathered(paths: readonly PathVerdict[], { bands, weighted }: ReceiverVerdict): PathVerdict {
  const shares = Array.from({ length: BAND_COUNT }, (_, band) =>
    Math.min(
      1,
      paths.reduce((sum, { shares: each }) => sum + each[band], 0),
    ),
  );
  const share = Math.min(
    1,
    paths.reduce((sum, path) => sum + (path.weighted?.share ?? 0), 0),
  );
  const without = (level: Out, part: number): Out =>
    typeof level === "number" && part < 1
      ? level + levelOf(1 - part)
      : level === "unknown"
        ? level
        : "silent";
  return {
    id: "rest",
    kind: paths[0].kind,
    partId: null,
    name: `${paths.length} more`,
    levels: sumSpectra(paths.map(({ levels }) => levels)),
    shares,
    without: bands.map(({ level }, band) => without(level, shares[band])),
    weighted: weighted && {
      level: toOutSpectrum([
        levelOf(paths.reduce((sum, path) => sum + toEnergy(path.weighted?.level ?? "silent"), 0)),
      ])[0],
      share,
      without: without(weighted.level, share),
    },
    estimated: Array.from({ length: BAND_COUNT }, (_, band) =>
      paths.some(({ estimated }) => estimated[band]),
    ),
  };
}

function pathsForWire(verdict: ReceiverVerdict): PathVerdict[] {
  const { paths } = verdict;
  return paths.length <= ON_THE_WIRE
    ? paths
    : [...paths.slice(0, ON_THE_WIRE), gathered(paths.slice(ON_THE_WIRE), verdict)];
}

/** A verdict as it is sent: the 12 loudest contributions and paths of each listener, and the rest as one. */
export function forWire(verdict: Verdict): Verdict {
  const receivers = verdict.receivers.map((each) => ({
    ...each,
    paths: pathsForWire(each),
    contributions: each.contributions.slice(0, ON_THE_WIRE),
    rest: restOf(each),
  }));
  return { ...verdict, receivers };
}
