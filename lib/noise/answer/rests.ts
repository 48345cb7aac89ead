import { FIRST_JUDGED, OCTAVE_BANDS, type Band } from "../bands";
import { weightedSum } from "../levels";
import { hasBand } from "../model/masks";
import { MATTERS } from "../model/passing";
import type { Part } from "../sound/parts";
import type { ReceiverVerdict } from "../verdict";
import type { Weighing } from "./weighing";

function isEstimated({ element, source, what }: Part, band: number): boolean {
  if (what === "source") return source?.estimated ?? false;
  return element ? hasBand(element.estimated, band) : false;
}

/** Bands of a part that rest on estimates and matter there: a tenth of the energy of a judged band, or of the total. */
function estimatedBands({ bands, total, energy, metric }: Weighing, part: Part): Band[] {
  const whole = total ? weightedSum(energy, total.factors) : 0;
  return OCTAVE_BANDS.filter((_, band) => {
    if (metric === "none" || !isEstimated(part, band)) return false;
    if (total) return part.energy[band] * total.factors[band] >= MATTERS * whole && whole > 0;
    return (
      band >= FIRST_JUDGED &&
      !Number.isNaN(bands[band].limit) &&
      energy[band] > 0 &&
      part.energy[band] >= MATTERS * energy[band]
    );
  });
}

/** The parts whose estimates a listener's figure rests on. */
export function restsOn(weighing: Weighing): ReceiverVerdict["restsOn"] {
  const { sources, ways, entering } = weighing.parts;
  const found = new Map<string, ReceiverVerdict["restsOn"][number]>();
  for (const part of [...sources, ...ways.filter(({ element }) => element), ...entering]) {
    const bands = estimatedBands(weighing, part);
    if (bands.length === 0) continue;
    const known = found.get(part.id)?.bands ?? [];
    const all = OCTAVE_BANDS.filter((band) => bands.includes(band) || known.includes(band));
    found.set(part.id, {
      partId: part.id,
      name: part.name,
      what: part.what === "source" ? "source" : "element",
      bands: all,
    });
  }
  return [...found.values()];
}
