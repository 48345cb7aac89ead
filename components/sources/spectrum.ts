import { BAND_COUNT, FIRST_JUDGED } from "@/lib/noise/bands";
import type { Source } from "@/lib/noise/sources";

type Level = number | "silent" | null;

const energyOf = (level: Level): number => (typeof level === "number" ? 10 ** (level / 10) : 0);

/** Level of the bands that are known together, dB; null where none is. `weights` are added band by band. */
export function totalOf(levels: readonly Level[], weights?: readonly number[]): number | null {
  const energy = levels.reduce<number>((sum, level, i) => sum + energyOf(level) * 10 ** ((weights?.[i] ?? 0) / 10), 0);
  return energy > 0 ? 10 * Math.log10(energy) : null;
}

/** Share of each band in all the energy that is known, 0 to 1. */
export function sharesOf(levels: readonly Level[]): number[] {
  const energies = levels.map(energyOf);
  const whole = energies.reduce((sum, energy) => sum + energy, 0);
  return energies.map((energy) => (whole > 0 ? energy / whole : 0));
}

/** Index of the band with most energy; null where no level is known. Of equals the lower. */
export function loudestBand(levels: readonly Level[] | null): number | null {
  if (!levels) return null;
  const energies = levels.map(energyOf);
  const most = Math.max(...energies);
  return most > 0 ? energies.indexOf(most) : null;
}

export const litBandOf = ({ power }: Source): number => loudestBand(power) ?? FIRST_JUDGED;

export const countKnown = (levels: readonly Level[] | null): number => (levels ?? []).filter((level) => level !== null).length;

export const bandsOf = (levels: readonly Level[] | null): Level[] => (levels ? [...levels] : new Array<Level>(BAND_COUNT).fill(null));
