"use client";

import type { Plan } from "@/lib/noise/plan";
import type { Source } from "@/lib/noise/sources";
import { bandWords, formatNumber, withUnit } from "../format";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import { Icon } from "../marks/Icon";
import { Disclosure } from "../ui/Disclosure";
import type { SourceDesk } from "./desk";
import { lastingWords, minutesIn } from "./hours";

interface Props {
  desk: SourceDesk;
  source: Source;
}

/** Minutes a day it is at work: its hours, times the largest share of the time a situation gives it; null where no hours are said. */
export function minutesPlayed({ id, hours }: Source, { situations }: Plan): number | null {
  if (!hours) return null;
  const shares = situations.flatMap(({ playing }) => playing.filter(({ sourceId }) => sourceId === id).map(({ share }) => share));
  const share = situations.length === 0 ? 1 : Math.max(0, ...shares);
  return minutesIn(hours) * share;
}

/** Stands where the level is entered: how long bare ears may be beside it, by whose measure. Silent below that measure. */
export function BareEars({ desk, source }: Props) {
  const near = desk.answer.verdict.sources?.[source.id]?.near;
  if (!near || near.minutes === null || typeof near.dba !== "number" || near.minutes >= desk.exposure.minutes) return null;
  const played = minutesPlayed(source, desk.answer.plan);
  const unknown = OCTAVE_BANDS.filter((_, i) => near.levels[i] === "unknown").map(bandWords);
  const { level, minutes, halvedBy } = desk.exposure;
  return (
    <section aria-labelledby="ears" className="mt-5 max-w-[46rem] rounded-control border border-ink p-4">
      <div className="flex gap-3">
        <Icon name="ear" size={26} />
        <div className="min-w-0">
          <h3 id="ears" className="text-part">
            Bare ears: {allowedWords(near.minutes)} a day
          </h3>
          <p className="mt-1 text-second text-ink2">
            {unknown.length > 0 && "At least "}
            {withUnit(formatNumber(near.dba), "dB(A)")} {withUnit("1", "m")} away in its room: the usual daily measure is full after {allowedWords(near.minutes)}
            {played !== null && played > 0 ? `, and its hours here hold ${lastingWords(played)} of playing.` : "."} Wear protectors made for music, and ask a hearing
            professional how much they must take. Local rules come first.
          </p>
          {unknown.length > 0 && <p className="mt-1 text-second text-ink2">Not counted, because not known: {unknown.join(", ")}.</p>}
        </div>
      </div>
      {played !== null && played > near.minutes && <DayBar allowed={near.minutes} played={played} />}
      <Disclosure summary="Where this is from" className="mt-1 text-second">
        NIOSH 98-126, recommended exposure limit: {withUnit(`${level}`, "dB(A)")} for {minutes / 60} hours, halved for every {withUnit(`${halvedBy}`, "dB")} more. It speaks
        of adults at work. Reckoned for this source alone, at work without a pause, one metre away; several at once are louder.
      </Disclosure>
    </section>
  );
}

const allowedWords = (minutes: number): string => (minutes < 1 ? "less than a minute" : lastingWords(Math.floor(minutes)));

const WIDTH = 300;

/** A day's worth beside what is played, on one scale of minutes. */
function DayBar({ allowed, played }: { allowed: number; played: number }) {
  const x = (minutes: number) => (minutes / played) * WIDTH;
  const worth = Math.max(2, x(allowed));
  return (
    <svg width={WIDTH} height="52" viewBox={`0 0 ${WIDTH} 52`} role="img" aria-label={`A day’s worth is ${allowedWords(allowed)} of ${lastingWords(played)} played.`} className="mt-3 block max-w-full">
      <rect x="0.75" y="2" width={WIDTH - 1.5} height="20" strokeWidth="1.5" className="fill-none stroke-ink" />
      <rect x="0" y="2" width={worth} height="20" className="fill-ink" />
      <path d={`M${worth} 22v8`} className="stroke-ink" />
      <text x={Math.min(worth, WIDTH - 140)} y="46" fontSize="12.5" fontWeight="650">
        a day’s worth
      </text>
      <text x={WIDTH} y="46" textAnchor="end" fontSize="12.5" className="fill-ink2!">
        {lastingWords(played)} played
      </text>
    </svg>
  );
}
