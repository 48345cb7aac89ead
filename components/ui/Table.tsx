import clsx from "clsx";
import type { ComponentProps } from "react";

/** Hairlines between rows, a 2 px line under the head, figures to the right. */
export function Table({ className, ...rest }: ComponentProps<"table">) {
  return <table {...rest} className={clsx("w-full border-collapse text-table", className)} />;
}

export function HeadCell({ className, figures, ...rest }: ComponentProps<"th"> & { figures?: boolean }) {
  return (
    <th
      scope="col"
      {...rest}
      className={clsx("border-b-2 border-ink px-2.5 pb-2 align-bottom text-second font-semibold text-ink2", figures ? "text-right" : "text-left", className)}
    />
  );
}

/** `lit` = what you are looking at: washed with the lamp, a bar at its left edge. */
export function Row({ lit, className, ...rest }: ComponentProps<"tr"> & { lit?: boolean }) {
  return (
    <tr
      {...rest}
      className={clsx("border-t border-rule first:border-t-0", lit && "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)]", className)}
    />
  );
}

export function RowHead({ className, ...rest }: ComponentProps<"th">) {
  return <th scope="row" {...rest} className={clsx("px-2.5 py-2 text-left align-middle font-semibold", className)} />;
}

export function Cell({ className, figures, ...rest }: ComponentProps<"td"> & { figures?: boolean }) {
  return <td {...rest} className={clsx("px-2.5 py-2 align-middle", figures && "whitespace-nowrap text-right", className)} />;
}
