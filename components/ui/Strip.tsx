import clsx from "clsx";
import type { ReactNode } from "react";
import { Icon, type IconName } from "../marks/Icon";

export type StripKind = "stale" | "error" | "offline" | "undo" | "note" | "wait" | "stop" | "mail";

const forms: Record<StripKind, { icon: IconName; border: string; iconColour: string }> = {
  stale: { icon: "note", border: "border-dashed border-edge", iconColour: "text-ink" },
  error: { icon: "brokenBeam", border: "border-over", iconColour: "text-over" },
  offline: { icon: "noSignal", border: "border-edge", iconColour: "text-ink2" },
  undo: { icon: "undo", border: "border-edge", iconColour: "text-ink2" },
  note: { icon: "note", border: "border-ink", iconColour: "text-ink" },
  wait: { icon: "clock", border: "border-ink", iconColour: "text-ink" },
  mail: { icon: "mail", border: "border-ink", iconColour: "text-ink" },
  stop: { icon: "hand", border: "border-ink", iconColour: "text-ink" },
};

interface Props {
  kind: StripKind;
  heading: ReactNode;
  children?: ReactNode;
  action?: ReactNode;
  className?: string;
}

/** What happened, where, and the one thing to do; stands in the page, never floats over it. */
export function Strip({ kind, heading, children, action, className }: Props) {
  const form = forms[kind];
  return (
    <div
      role={kind === "error" ? "alert" : "status"}
      className={clsx("flex flex-wrap items-center gap-x-4 gap-y-3 rounded-control border bg-sheet px-4 py-3.5", form.border, className)}
    >
      <span className={form.iconColour}>
        <Icon name={form.icon} />
      </span>
      <div className="min-w-0 flex-[1_1_12rem]">
        <p className="font-semibold">{heading}</p>
        {children && <div className="text-second text-ink2">{children}</div>}
      </div>
      {action}
    </div>
  );
}
