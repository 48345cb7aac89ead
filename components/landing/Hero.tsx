"use client";

import { useState } from "react";
import { landingAddress, signInAddress, signUpAddress } from "../addresses";
import { LinkButton } from "../ui/Button";
import { BuildChoice } from "./BuildChoice";
import { HourBeam } from "./HourBeam";
import { clockWords, holdsAt } from "./hours";
import type { BuildKey, LandingBuild, Night } from "./LandingBuild";
import { LandingCut } from "./LandingCut";
import { verdictWords } from "./landingWords";

export interface HeroProps {
  builds: readonly LandingBuild[];
  night: Night;
  /** What the address asks for. */
  build: BuildKey;
  minutes: number;
}

const addressOf = (build: BuildKey, minutes: number) =>
  `${landingAddress}?${new URLSearchParams({ build, hour: clockWords(minutes) })}`;

function Invitation() {
  return (
    <div>
      <h1 id="job" tabIndex={-1} className="text-[31px] leading-[1.08] tracking-[-.012em] mid:text-verdict wide:text-[46px]">
        Know what next door will hear before you build.
      </h1>
      <p className="mt-4 max-w-[34em] text-lead text-slabink2 mid:text-[18px]">
        Stillyard weighs a backyard studio against what each neighbour may hear, band by band and path by path, and says which
        wall, roof or door is worth the money.
      </p>
      <div className="mt-6 flex flex-wrap gap-2.5">
        <LinkButton look="lamp" href={signUpAddress} className="min-h-12 max-mid:w-full">
          Sign up
        </LinkButton>
        <LinkButton href={signInAddress()} className="min-h-12 max-mid:w-full">
          Sign in
        </LinkButton>
      </div>
    </div>
  );
}

/** The job in a sentence, and one example that answers to the hour and to the build. */
export function Hero({ builds, night, ...asked }: HeroProps) {
  const [key, setKey] = useState(asked.build);
  const [minutes, setMinutes] = useState(asked.minutes);
  const build = builds.find((one) => one.key === key)!;
  const holds = holdsAt(night, minutes);
  const words = verdictWords(build, builds[0]!, night, minutes);
  return (
    <section aria-labelledby="job" className="on-slab rounded-sheet px-4 py-5 mid:p-7 wide:px-9">
      <div className="grid grid-cols-1 gap-x-10 gap-y-6 wide:grid-cols-[minmax(0,30rem)_minmax(0,1fr)] wide:items-end">
        <Invitation />
        <LandingCut build={build} holds={holds} />
      </div>
      <div className="mt-6 grid grid-cols-1 gap-x-9 gap-y-5 border-t border-slabrule pt-5 wide:grid-cols-[minmax(0,360px)_minmax(0,1fr)]">
        <div role="status" className="flex min-w-0 flex-col gap-1 wide:col-span-2">
          <h2 className="text-section mid:text-[26px]">
            {words.before}
            <span className="text-slablamp">{words.figure}</span>
            {words.after}
          </h2>
          <p className="text-slabink2">{words.line}</p>
        </div>
        <HourBeam night={night} minutes={minutes} onChoose={setMinutes} addressAt={(at) => addressOf(key, at)} />
        <BuildChoice builds={builds} chosen={key} holds={holds} onChoose={setKey} addressOf={(other) => addressOf(other, minutes)} />
      </div>
    </section>
  );
}
