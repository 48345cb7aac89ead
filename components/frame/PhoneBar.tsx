import clsx from "clsx";
import Link from "next/link";
import type { Stage } from "./stages";

/** The poise seen from the front: it hangs from the line above the stage you are at. */
function BarPoise() {
  return (
    <svg width="32" height="12" viewBox="0 0 32 12" aria-hidden="true" className="absolute left-1/2 -top-[2px] -ml-4">
      <path d="M4 1h24l3 10H1z" className="fill-lamp stroke-ink" strokeWidth="2" strokeLinejoin="round" />
    </svg>
  );
}

/** The stages at the foot of the phone, in reach of the thumb. */
export function PhoneBar({ stages }: { stages: readonly Stage[] }) {
  return (
    <nav
      aria-label="Stages"
      className="screen-only fixed inset-x-0 bottom-0 z-20 border-t-2 border-ink bg-sheet px-1 pb-[env(safe-area-inset-bottom)] mid:hidden"
    >
      <ol className="flex">
        {stages.map((stage) => (
          <li key={stage.href} className="relative flex-1">
            <Link
              href={stage.href}
              aria-current={stage.current ? "page" : undefined}
              className={clsx(
                "flex min-h-15 items-end justify-center px-1 pb-3 text-second no-underline",
                stage.current ? "font-bold text-ink" : "font-medium text-ink2",
              )}
            >
              {stage.short ?? stage.label}
            </Link>
            {stage.current && <BarPoise />}
          </li>
        ))}
      </ol>
    </nav>
  );
}
