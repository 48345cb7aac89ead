import clsx from "clsx";
import type { ComponentProps, ReactNode } from "react";

type Props = Omit<ComponentProps<"input">, "type"> & { label: ReactNode; hint?: ReactNode };

/** The browser's own box; the whole line answers to a press. */
export function Checkbox({ label, hint, className, ...rest }: Props) {
  return (
    <label className={clsx("flex min-h-10 items-center gap-3 text-second", className)}>
      <input {...rest} type="checkbox" className="size-5 flex-none accent-ink" />
      <span>
        <span className="block font-medium text-ink">{label}</span>
        {hint && <span className="block text-ink2">{hint}</span>}
      </span>
    </label>
  );
}
