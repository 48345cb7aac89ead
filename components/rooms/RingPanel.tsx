import type { Space } from "@/lib/noise/plan";
import type { SpaceVerdict } from "@/lib/noise/verdict";
import { bandWords, formatNumber, withUnit } from "../format";
import { BasisMark } from "../marks/BasisMark";
import { Sheet } from "../ui/Sheet";
import { DecayChart } from "./DecayChart";
import { useQuantityWords } from "./useQuantityWords";

interface Props {
  space: Space;
  judged: SpaceVerdict | undefined;
  before: SpaceVerdict | undefined;
  litBand: number;
  onLight: (band: number) => void;
}

/** The decay per band, with what can be said of it. */
export function RingPanel({ space, judged, before, litBand, onLight }: Props) {
  const say = useQuantityWords();
  const unknown = !judged || judged.decay.every((seconds) => typeof seconds !== "number");
  const moved = before && judged && before.decay.some((seconds, band) => seconds !== judged.decay[band]);
  const from = judged?.statisticalFrom ?? null;
  return (
    <Sheet heading="How long it rings" beside={space.absorption.kind === "surfaces" ? <BasisMark basis={unknown ? "unknown" : "calculated"} /> : <span className="text-second text-ink2">your figures</span>}>
      {unknown ? (
        <p className="text-ink2">Not known: no band has a figure, so this room is not weighed. Choose a finish, or type nine figures.</p>
      ) : (
        <DecayChart decay={judged.decay} before={moved ? before.decay : undefined} statisticalFrom={from} litBand={litBand} onLight={onLight} />
      )}
      {from !== null && (
        <p className="mt-3 text-second text-ink2">
          Below about {from >= 1000 ? bandWords(Math.round(from / 100) * 100) : withUnit(formatNumber(Math.round(from / 10) * 10), "Hz")} a room of {say("volume", space.volume, 0)} answers in single tones. There one decay time is an
          average over the room: loud and dead places lie side by side, and at one spot it can be quite different.
        </p>
      )}
    </Sheet>
  );
}
