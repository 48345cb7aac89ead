import type { ReactNode } from "react";

/** The shape of the answer, before there is one. */
export function EmptyYards({ actions, mayMake = true }: { actions?: ReactNode; mayMake?: boolean }) {
  return (
    <div className="flex flex-wrap items-center gap-7 rounded-sheet bg-sheet p-4 mid:p-7">
      <svg width="180" height="146" viewBox="0 0 180 146" aria-hidden="true" fill="none" className="block stroke-edge" strokeWidth="1.8">
        <rect x="2" y="2" width="176" height="142" strokeDasharray="8 6" />
        <rect x="18" y="18" width="56" height="56" strokeDasharray="4 4" />
        <path d="M76 56 122 84" strokeDasharray="3 5" />
        <circle cx="137" cy="95" r="17" strokeDasharray="4 4" />
      </svg>
      <div className="min-w-0 flex-[1_1_16rem]">
        <h2 className="text-section">No yard yet</h2>
        <p className="mb-4 mt-1 max-w-prose text-ink2">
          {mayMake
            ? "Start with the fence. Pace it out if you must: a metre either way changes little. Then the studio, then whoever might hear it."
            : "You are in no team, so yards come to you by invitation. When somebody invites you, theirs stands here."}
        </p>
        {actions && <div className="flex flex-wrap gap-2.5">{actions}</div>}
      </div>
    </div>
  );
}
