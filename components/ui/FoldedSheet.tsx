"use client";

import clsx from "clsx";
import type { ReactNode } from "react";
import { Icon } from "../marks/Icon";
import { useWidthClass } from "./useWidthClass";

interface Props {
  heading: string;
  /** Second line under the heading. */
  says?: ReactNode;
  /** To the right of the heading; on the phone above what is folded. */
  beside?: ReactNode;
  /** Open on the phone as well. */
  open?: boolean;
  className?: string;
  children: ReactNode;
}

/** A sheet that starts folded on the phone, where long pages are hard to find one's way in. Nothing typed in it is lost by folding. */
export function FoldedSheet({ heading, says, beside, open = false, className, children }: Props) {
  const small = useWidthClass() === 390;
  return (
    <section className={clsx("min-w-0 rounded-sheet bg-sheet max-mid:px-4 max-mid:py-2 mid:p-6.5", className)}>
      <details open={!small || open} className="group">
        <summary className={clsx("min-h-11 list-none items-center gap-2 [&::-webkit-details-marker]:hidden", small ? "flex" : "hidden")}>
          {small && <h2 className="min-w-0 flex-1 text-section">{heading}</h2>}
          <span className="group-open:rotate-180">
            <Icon name="fold" size={18} />
          </span>
        </summary>
        <div className="mb-3 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
          <div>
            {!small && <h2 className="text-section">{heading}</h2>}
            {says && <p className="mt-0.5 text-second text-ink3">{says}</p>}
          </div>
          {beside}
        </div>
        <div className="max-mid:pb-2">{children}</div>
      </details>
    </section>
  );
}
