import clsx from "clsx";
import Link from "next/link";
import { VisuallyHidden } from "../ui/VisuallyHidden";
import type { Stage } from "./stages";

/** The poise that hangs from the notched rule under the stage you are at. */
function HangingPoise() {
  return (
    <svg
      width="30"
      height="22"
      viewBox="0 0 30 22"
      aria-hidden="true"
      className="absolute left-1/2 top-[calc(100%-1px)] z-10 -ml-[15px]"
    >
      <path d="M7 1h16l5.5 19.5h-27z" className="fill-lamp stroke-ink" strokeWidth="2" strokeLinejoin="round" />
    </svg>
  );
}

function MissingNotch() {
  return (
    <svg width="10" height="10" viewBox="0 0 10 10" aria-hidden="true" className="block flex-none text-ink2">
      <circle cx="5" cy="5" r="3.6" fill="none" stroke="currentColor" strokeWidth="1.5" />
    </svg>
  );
}

function StageLink({ stage }: { stage: Stage }) {
  return (
    <li className="relative">
      <Link
        href={stage.href}
        aria-current={stage.current ? "page" : undefined}
        className={clsx(
          "flex min-h-11 items-center gap-2 px-3 text-table no-underline wide:px-[18px]",
          stage.current ? "font-bold text-ink" : "font-medium text-ink2 hover:text-ink",
        )}
      >
        {stage.label}
        {stage.missing && (
          <>
            <MissingNotch />
            <VisuallyHidden>, something is missing</VisuallyHidden>
          </>
        )}
      </Link>
      {stage.current && <HangingPoise />}
    </li>
  );
}

/** The stages of a yard along the notched beam; on the phone the bar at the foot takes its place. */
export function Beam({ stages }: { stages: readonly Stage[] }) {
  return (
    <nav aria-label="Stages" className="hidden bg-sheet px-6 mid:block wide:px-8">
      <ol className="-ml-3 flex flex-wrap wide:-ml-[18px]">
        {stages.map((stage) => (
          <StageLink key={stage.href} stage={stage} />
        ))}
      </ol>
    </nav>
  );
}
