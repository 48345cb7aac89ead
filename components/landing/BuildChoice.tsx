"use client";

import clsx from "clsx";
import Link from "next/link";
import type { ReactNode } from "react";
import { MarginWords } from "../marks/MarginWords";
import { useHydrated } from "../ui/useHydrated";
import { BuildFigure } from "./BuildFigure";
import type { BuildKey, LandingBuild } from "./LandingBuild";
import { buildWords, madeWords } from "./landingWords";

interface Props {
  builds: readonly LandingBuild[];
  chosen: BuildKey;
  /** Whether a limit holds at the chosen hour. */
  holds: boolean;
  onChoose: (key: BuildKey) => void;
  addressOf: (key: BuildKey) => string;
}

/** What a card shows, be it a radio button's label or a link. */
function Card({ build, holds }: { build: LandingBuild; holds: boolean }) {
  return (
    <>
      <BuildFigure door={build.door} ceiling={build.key === "c"} />
      <span className="min-w-0">
        <span className="block font-[650]">{buildWords[build.key].label}</span>
        <span className="block text-second text-slabink2">{madeWords(build)}</span>
        <span className="mt-1 block">
          {holds ? <MarginWords state={build.state} margin={build.margin} /> : <MarginWords state="not weighed">no limit then</MarginWords>}
        </span>
      </span>
    </>
  );
}

const cardClasses = (lit: boolean) =>
  clsx(
    "relative flex min-w-0 cursor-pointer items-center gap-3.5 rounded-control p-3 text-slabink no-underline desk:max-wide:flex-col desk:max-wide:items-start",
    lit ? "border-3 border-slablamp p-[10.5px]" : "border-[1.5px] border-slabink2 hover:border-slabink",
  );

const Poise = () => <span aria-hidden="true" className="poise absolute left-1/2 top-[-2px] -ml-[11px] h-[11px] w-[22px] bg-slablamp" />;

function Choice({ lit, children, ...rest }: { lit: boolean; children: ReactNode; value: BuildKey; onChange: () => void }) {
  return (
    <label className={clsx(cardClasses(lit), "has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-4 has-[:focus-visible]:outline-lamp")}>
      <input type="radio" name="build" checked={lit} {...rest} className="absolute inset-0 m-0 size-full cursor-pointer opacity-0" />
      {lit && <Poise />}
      {children}
    </label>
  );
}

/** Three builds of one example: a radio group, and plain links where no scripts run. */
export function BuildChoice({ builds, chosen, holds, onChoose, addressOf }: Props) {
  const hydrated = useHydrated();
  return (
    <fieldset className="m-0 min-w-0 border-0 p-0">
      <legend className="mb-2 p-0 text-table font-semibold">What do you build?</legend>
      <div className="grid grid-cols-1 gap-3 desk:grid-cols-3">
        {builds.map((build) => {
          const lit = build.key === chosen;
          const card = <Card build={build} holds={holds} />;
          return hydrated ? (
            <Choice key={build.key} lit={lit} value={build.key} onChange={() => onChoose(build.key)}>
              {card}
            </Choice>
          ) : (
            <Link key={build.key} href={addressOf(build.key)} aria-current={lit ? "true" : undefined} className={cardClasses(lit)}>
              {lit && <Poise />}
              {card}
            </Link>
          );
        })}
      </div>
    </fieldset>
  );
}
