import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { ConstructionSheet } from "../../lib/noise/sheet";
import type { ElementVerdict, Out } from "../../lib/noise/verdict";
import { bandWords, wholeDecibels, withUnit } from "../format";
import type { PathElement } from "./elementWords";
import { Disclosure } from "../ui/Disclosure";
import { LossChart } from "./LossChart";
import { basisSentence, LossTable } from "./LossTable";

interface Props {
  name: string;
  kind: PathElement["kind"];
  judged?: ElementVerdict;
  sheet?: ConstructionSheet;
  other?: { name: string; loss: readonly Out[] };
  litBand: number;
}

/** The element whole: its construction with gap and open part, as it was weighed. */
export function WhatItStops({ name, kind, judged, sheet, other, litBand }: Props) {
  if (!judged) return <p className="text-ink2">Not weighed yet.</p>;
  const opening = openingSentence(judged, sheet, litBand);
  return (
    <>
      <LossChart
        name={name}
        loss={judged.loss}
        doubts={judged.doubts}
        other={other}
        massAirMass={opening ? null : (sheet?.massAirMass ?? null)}
        litBand={litBand}
      />
      <p className="mt-2 text-second text-ink2">
        {sheet ? basisSentence(judged, litBand) : reckonedFrom(kind)} {opening}
      </p>
      <p className="mt-2 text-second text-ink2">
        An estimate, not a promise: workmanship and ways nobody has drawn change it.
      </p>
      <Disclosure summary="All nine bands" className="mt-2">
        <LossTable loss={judged.loss} doubts={judged.doubts} bases={judged.bases} litBand={litBand} />
      </Disclosure>
    </>
  );
}

/** Says what the gap takes away, where it takes at least a decibel. */
function openingSentence(
  judged: ElementVerdict,
  sheet: ConstructionSheet | undefined,
  litBand: number,
): string {
  const whole = judged.loss[litBand];
  const alone = sheet?.loss[litBand];
  if (typeof whole !== "number" || typeof alone !== "number" || alone - whole < 1) return "";
  return `Shut tight it would stop ${withUnit(wholeDecibels(alone), "dB")} at ${bandWords(OCTAVE_BANDS[litBand]!)}.`;
}

const reckonedFrom = (kind: PathElement["kind"]) =>
  kind === "duct" ? "Reckoned from the pieces of its run." : "Reckoned from its open area as entered.";
