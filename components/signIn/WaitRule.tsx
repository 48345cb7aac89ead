"use client";

import type { ReactNode } from "react";
import { outlinePoise } from "../marks/poise";
import { Strip } from "../ui/Strip";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import type { Wait } from "./useWait";
import { waitWords } from "./waiting";

const promised = { 390: 330, 720: 380, 1024: 380, 1440: 380 } as const;
const EDGE = 16;
const LINE = 6;
const HEIGHT = 50;

/** Steps between the figures of the rule, in seconds: the first that gives at most five of them. */
const STEPS = [1, 2, 4, 10, 20, 30, 60, 120, 300, 600, 900, 1800, 3600];

function Rule({ left, total }: { left: number; total: number }) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(promised, 380);
  const step = STEPS.find((one) => total / one <= 4) ?? total;
  const end = Math.ceil(total / step) * step;
  const minutes = step >= 60;
  const at = (seconds: number) => EDGE + (seconds / end) * (width - 2 * EDGE);
  const figures = Array.from({ length: Math.round(end / step) + 1 }, (_, index) => index * step);
  const notches = Array.from({ length: 4 * Math.round(end / step) + 1 }, (_, index) => (index * step) / 4);
  return (
    <div ref={place}>
      <svg width={width} height={HEIGHT} viewBox={`0 0 ${width} ${HEIGHT}`} role="img" aria-label={`${waitWords(left)} to go`} className="block" fill="none">
        <path d={`M${at(0)} ${LINE}H${at(end)}`} strokeWidth="2.2" className="stroke-ink" />
        <path d={notches.map((one) => `M${at(one)} ${LINE}v${one % step === 0 ? 9 : 4.5}`).join("")} strokeWidth="1.2" className="stroke-ink" />
        <path d={outlinePoise(at(left), LINE + 1, 24, 18)} strokeWidth="1.6" strokeLinejoin="round" className="fill-lamp stroke-onlamp" />
        {figures.map((one) => (
          <text key={one} x={at(one)} y={HEIGHT - 6} textAnchor="middle" fontSize="13" className="fill-ink2">
            {minutes ? one / 60 : one}
          </text>
        ))}
        <text x={width} y={HEIGHT - 6} textAnchor="end" fontSize="13" className="fill-ink2">
          {minutes ? "min" : "s"}
        </text>
      </svg>
    </div>
  );
}

/** Why one waits and how long: the poise runs down a notched rule. What is spoken does not change each second. */
export function WaitRule({ wait, children }: { wait: Wait; children?: ReactNode }) {
  if (wait.message === "") return null;
  const waiting = wait.left > 0;
  const over = wait.total > 0 && !waiting;
  return (
    <div className="flex flex-col gap-3">
      <Strip kind="wait" heading={over ? "You may try again" : "Wait a little"}>
        {over ? "" : wait.message}
      </Strip>
      {waiting && <Rule left={wait.left} total={wait.total} />}
      {waiting && children && <div className="text-second text-ink2">{children}</div>}
    </div>
  );
}

/** The reason that a button gives while one waits. */
export const waitReason = ({ left }: Wait): string | undefined => (left > 0 ? `The next try opens in ${waitWords(left)}.` : undefined);
