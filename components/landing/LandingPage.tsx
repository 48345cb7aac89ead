import type { ReactNode } from "react";
import { signInAddress, signUpAddress } from "../addresses";
import { Icon, type IconName } from "../marks/Icon";
import { MarginWords } from "../marks/MarginWords";
import { SmallBeam } from "../marks/SmallBeam";
import { LinkButton } from "../ui/Button";
import { Hero, type HeroProps } from "./Hero";
import { LeavesFigure } from "./LeavesFigure";
import { SharesBar } from "./SharesBar";

const signUpAs = (hat: "play" | "advise" | "build") => `${signUpAddress}?${new URLSearchParams({ hat })}`;

function Trade({ heading, says, href, link, children }: { heading: string; says: string; href: string; link: string; children: ReactNode }) {
  return (
    <section className="flex min-w-0 flex-col border-rule p-4 not-first:border-t mid:p-6.5 desk:not-first:border-l desk:not-first:border-t-0">
      <h2 className="text-section mid:text-[24px]">{heading}</h2>
      <p className="mt-1.5 max-w-[30em] text-ink2">{says}</p>
      <div className="my-4 grid min-h-[112px] grid-cols-1 content-end">{children}</div>
      <a href={href} className="mt-auto inline-flex min-h-10 items-center self-start font-semibold underline">
        {link}
      </a>
    </section>
  );
}

function Promises({ heading, icon, lines }: { heading: string; icon: IconName; lines: readonly string[] }) {
  return (
    <section className="min-w-0 border-rule p-4 not-first:border-t mid:p-6.5 desk:not-first:border-l desk:not-first:border-t-0">
      <h2 className="text-section">{heading}</h2>
      <ul className="mt-2.5">
        {lines.map((line) => (
          <li key={line} className="flex gap-2.5 border-rule py-2.5 not-first:border-t">
            <Icon name={icon} />
            <span>{line}</span>
          </li>
        ))}
      </ul>
    </section>
  );
}

const CARRIED = [
  "A verdict for every listener, with its doubt drawn beside it.",
  "The limit in its own words: where it holds, at what hours, and the clause it comes from.",
  "The path that lets the most through, and how far it falls once that path is silenced.",
  "Every figure with where it is from: measured, from a laboratory, calculated or estimated.",
];

const NOT_DONE = [
  "Promise silence. Under the limit does not mean unheard.",
  "Stand in for a structural engineer, an electrician, a licence or the council.",
  "Hide a guess. What rests on estimates says so.",
  "Record sound. It keeps levels, never audio.",
];

/** For visitors: what Stillyard does, tried on one example, and the ways in. */
export function LandingPage(hero: HeroProps) {
  const [asDrawn, heavier] = hero.builds;
  if (!asDrawn || !heavier) return null;
  return (
    <div className="flex flex-col gap-3 mid:gap-5">
      <Hero {...hero} />
      <div className="grid grid-cols-1 rounded-sheet bg-sheet desk:grid-cols-3">
        <Trade heading="I play" says="One sentence to read aloud to the neighbour, and the next thing worth paying for." href={signUpAs("play")} link="Sign up as a musician">
          <SmallBeam state={asDrawn.state} margin={asDrawn.margin} doubt={asDrawn.doubt} width={264} />
          <p className="mt-1 flex flex-wrap items-baseline gap-x-4">
            <MarginWords state={asDrawn.state} margin={asDrawn.margin} />
            <span className="text-second text-ink2">as drawn; the pale band is the doubt</span>
          </p>
        </Trade>
        <Trade heading="I advise" says="Nine bands, every path, every figure with its source. Change one beside your client and watch the rest move." href={signUpAs("advise")} link="Sign up as an adviser">
          <SharesBar shares={asDrawn.shares} where={asDrawn.where} />
        </Trade>
        <Trade heading="I build" says="Why the door is heavier: its layers, its weight, and what they are worth next door." href={signUpAs("build")} link="Sign up as a builder">
          <LeavesFigure builds={[asDrawn, heavier]} />
        </Trade>
      </div>
      <div className="grid grid-cols-1 rounded-sheet bg-sheet desk:grid-cols-2">
        <Promises heading="What you carry away" icon="tick" lines={CARRIED} />
        <Promises heading="What it will not do" icon="hand" lines={NOT_DONE} />
      </div>
      <section className="flex flex-wrap items-center justify-between gap-x-8 gap-y-4 rounded-sheet bg-sheet p-4 mid:p-6.5" aria-labelledby="way-in">
        <div className="min-w-0 flex-[1_1_20rem]">
          <h2 id="way-in" className="text-section">
            Weigh your own yard
          </h2>
          <p className="mt-1.5 text-ink2">An e-mail address and a password of your own. Nobody sees your yard but the people you ask in.</p>
        </div>
        <div className="flex flex-wrap gap-2.5 max-mid:w-full max-mid:flex-col">
          <LinkButton look="ink" href={signUpAddress} icon={<Icon name="arrow" />} className="flex-row-reverse">
            Sign up
          </LinkButton>
          <LinkButton href={signInAddress()}>Sign in</LinkButton>
        </div>
      </section>
      <p className="text-least text-ink3">The yard on this page, its people and its figures are invented; what they come to is worked out as for yours.</p>
    </div>
  );
}
