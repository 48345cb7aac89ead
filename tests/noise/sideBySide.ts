import { elementKinds } from "../../lib/noise/elements";
import { levelOf } from "../../lib/noise/levels";

/** A part of a surface: area m², loss dB per band; without a loss it stands open. */
export interface SidePart {
  readonly area: number;
  readonly tl?: readonly number[];
}

/** Loss of parts side by side, dB per band, from what the kinds say that each lets pass. */
export function lossSideBySide(parts: readonly SidePart[], bands: number): number[] {
  const passing = parts.map(({ area, tl }) =>
    tl
      ? elementKinds.wall.passing({ area, loss: Float64Array.from(tl), params: {} })
      : elementKinds.leak.passing({ area, loss: new Float64Array(bands), params: {} }),
  );
  const whole = parts.reduce((sum, { area }) => sum + area, 0);
  return Array.from(
    { length: bands },
    (_, band) => -levelOf(passing.reduce((sum, each) => sum + each[band], 0) / whole),
  );
}
