import clsx from "clsx";
import type { ComponentProps, ReactNode } from "react";

type Props = Omit<ComponentProps<"section">, "title"> & {
  heading?: ReactNode;
  /** Second line under the heading. */
  says?: ReactNode;
  /** To the right of the heading. */
  beside?: ReactNode;
  /** Leaves the padding to what is inside, for panels split by hairlines. */
  bare?: boolean;
};

/** A work surface: told from the ground by its tone, not by a shadow. */
export function Sheet({ heading, says, beside, bare, className, children, ...rest }: Props) {
  return (
    <section {...rest} className={clsx("min-w-0 rounded-sheet bg-sheet", !bare && "p-4 mid:p-6.5", className)}>
      {(heading || beside) && (
        <div className={clsx("mb-3 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1", bare && "px-4 pt-4 mid:px-6.5 mid:pt-6.5")}>
          <div>
            {heading && <h2 className="text-section">{heading}</h2>}
            {says && <p className="mt-0.5 text-second text-ink3">{says}</p>}
          </div>
          {beside}
        </div>
      )}
      {children}
    </section>
  );
}
