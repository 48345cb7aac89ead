import clsx from "clsx";
import type { ReactNode } from "react";
import { Icon } from "../marks/Icon";

interface Props {
  summary: ReactNode;
  children: ReactNode;
  open?: boolean;
  className?: string;
}

/** The browser's own folding part. */
export function Disclosure({ summary, children, open, className }: Props) {
  return (
    <details open={open} className={clsx("group", className)}>
      <summary className="flex min-h-10 list-none items-center gap-2 font-semibold text-ink [&::-webkit-details-marker]:hidden">
        <span className="group-open:rotate-180">
          <Icon name="fold" size={18} />
        </span>
        {summary}
      </summary>
      <div className="pb-2 pl-6.5 text-table text-ink2">{children}</div>
    </details>
  );
}
