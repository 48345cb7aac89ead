import clsx from "clsx";
import type { ReactNode } from "react";

interface Props {
  icon?: ReactNode;
  /** Dashed: changed since, not settled. */
  dashed?: boolean;
  children: ReactNode;
}

export function Tag({ icon, dashed, children }: Props) {
  return (
    <span
      className={clsx(
        "inline-flex max-w-full items-center gap-1.5 rounded-tag border-[1.5px] border-edge px-2 py-0.5 text-least font-semibold text-ink2",
        dashed && "border-dashed",
      )}
    >
      {icon}
      <span className="min-w-0 wrap-anywhere">{children}</span>
    </span>
  );
}
