"use client";

import Link from "next/link";
import type { KeyboardEvent } from "react";
import { outlinePoise } from "../marks/poise";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { useHydrated } from "../ui/useHydrated";
import { clockWords, DEFAULT_HOUR, FIRST_HOUR, holdsAt, LAST_HOUR, QUARTER } from "./hours";
import type { Night } from "./LandingBuild";

const promised = { 390: 318, 720: 360, 1024: 360, 1440: 360 } as const;
const HEIGHT = 82;
const LINE = 34;
/** Half of "24:00" and of the slider's own thumb. */
const EDGE = 24;

interface Props {
  night: Night;
  minutes: number;
  onChoose: (minutes: number) => void;
  /** Address of this page at another hour, for readers without scripts. */
  addressAt: (minutes: number) => string;
}

const limitWords = (night: Night, minutes: number) => (holdsAt(night, minutes) ? "night limit" : "no limit");

function drawNotches(place: (minutes: number) => number): string {
  const count = (LAST_HOUR - FIRST_HOUR) / QUARTER;
  return Array.from({ length: count + 1 }, (_, index) => FIRST_HOUR + index * QUARTER)
    .map((minutes) => `M${place(minutes)} ${LINE}v${minutes % 60 === 0 ? 9 : 4}`)
    .join("");
}

function BeamDrawing({ night, minutes, width }: { night: Night; minutes: number; width: number }) {
  const place = (at: number) => Math.round((EDGE + ((at - FIRST_HOUR) / (LAST_HOUR - FIRST_HOUR)) * (width - 2 * EDGE)) * 10) / 10;
  const whole = Array.from({ length: (LAST_HOUR - FIRST_HOUR) / 60 + 1 }, (_, index) => FIRST_HOUR + index * 60);
  const poise = place(minutes);
  return (
    <svg width={width} height={HEIGHT} viewBox={`0 0 ${width} ${HEIGHT}`} aria-hidden="true" className="block" fill="none">
      <rect x={place(night.from)} y={LINE - 13} width={place(LAST_HOUR) - place(night.from)} height="13" strokeWidth="1.2" className="fill-slabrule stroke-slabink2" />
      <path d={`M${place(FIRST_HOUR)} ${LINE}H${place(LAST_HOUR)}`} strokeWidth="2.2" className="stroke-slabink" />
      <path d={drawNotches(place)} strokeWidth="1.2" className="stroke-slabink" />
      {whole
        .filter((at) => Math.abs(place(at) - poise) > 30)
        .map((at) => (
          <text key={at} x={place(at)} y={LINE + 26} textAnchor="middle" fontSize="13" className="fill-slabink2">
            {at / 60}
          </text>
        ))}
      <text x={place(FIRST_HOUR)} y="14" fontSize="13" className="fill-slabink2">
        no limit here
      </text>
      <text x={width - 2} y="14" textAnchor="end" fontSize="13" className="fill-slabink2">
        {`night limit from ${clockWords(night.from)}`}
      </text>
      <path d={outlinePoise(poise, LINE + 1, 28, 22)} strokeWidth="1.6" strokeLinejoin="round" className="fill-slablamp stroke-onlamp" />
      <text x={poise} y={HEIGHT - 6} textAnchor="middle" fontSize="19" fontWeight="660" className="figure fill-slabink">
        {clockWords(minutes)}
      </text>
    </svg>
  );
}

/** Page keys go by the hour; the browser's own slider would take a tenth of the beam. */
const pages: Partial<Record<string, number>> = { PageUp: 60, PageDown: -60 };

const within = (minutes: number) => Math.max(FIRST_HOUR, Math.min(LAST_HOUR, minutes));

/** A notched rule whose poise is the chosen hour: the browser's own slider lies over the drawing. */
export function HourBeam({ night, minutes, onChoose, addressAt }: Props) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 360);
  const hydrated = useHydrated();
  const others = [DEFAULT_HOUR, night.from - 30].filter((at) => at !== minutes);

  function page(event: KeyboardEvent) {
    const step = pages[event.key];
    if (step === undefined) return;
    event.preventDefault();
    onChoose(within(minutes + step));
  }

  return (
    <div className="min-w-0">
      <p id="hour" className="mb-2 text-table font-semibold">
        Until when do you play?
      </p>
      <div ref={place} className="relative max-w-[360px] rounded-control has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-4 has-[:focus-visible]:outline-lamp">
        <BeamDrawing night={night} minutes={minutes} width={width} />
        {hydrated && (
          <input
            type="range"
            aria-labelledby="hour"
            min={FIRST_HOUR}
            max={LAST_HOUR}
            step={QUARTER}
            value={minutes}
            aria-valuetext={`${clockWords(minutes)}, ${limitWords(night, minutes)}`}
            onChange={(event) => onChoose(Number(event.target.value))}
            onKeyDown={page}
            className="absolute inset-y-0 left-4 m-0 h-full w-[calc(100%-32px)] cursor-pointer opacity-0"
          />
        )}
      </div>
      <p className="min-h-6 text-second text-slabink2">
        {hydrated
          ? "A notch is a quarter of an hour."
          : others.map((at) => (
              <Link key={at} href={addressAt(at)} className="mr-4 inline-block min-h-6 underline">
                {clockWords(at)}
              </Link>
            ))}
      </p>
    </div>
  );
}
