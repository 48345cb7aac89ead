import clsx from "clsx";
import type { ReactNode } from "react";
import { Icon } from "../marks/Icon";

export const inputClasses =
  "min-h-10 w-full min-w-0 rounded-control border-[1.5px] bg-sheet px-3 text-base text-ink placeholder:text-ink3";

export const borderOf = (error?: string): string => (error ? "border-over" : "border-edge hover:border-ink");

interface Props {
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string;
  className?: string;
  children: ReactNode;
}

export const hintId = (id: string) => `${id}-hint`;
export const errorId = (id: string) => `${id}-error`;

/** Ids of what describes the field, error first. */
export function describe(id: string, hint: ReactNode, error: string | undefined): string | undefined {
  const ids = [error && errorId(id), hint && hintId(id)].filter(Boolean);
  return ids.length > 0 ? ids.join(" ") : undefined;
}

/** Label above, message under the field; the message is tied to the field by its id. */
export function FieldFrame({ id, label, hint, error, className, children }: Props) {
  return (
    <div className={clsx("min-w-0", className)}>
      <label htmlFor={id} className="mb-1.5 block text-second font-semibold text-ink2">
        {label}
      </label>
      {children}
      {hint && (
        <p id={hintId(id)} className="mt-1.5 text-second text-ink2">
          {hint}
        </p>
      )}
      <FieldError id={id} error={error} />
    </div>
  );
}

/** Stays in the page while empty, so that a message is spoken when it comes. */
export function FieldError({ id, error }: { id: string; error?: string }) {
  return (
    <div id={errorId(id)} aria-live="polite">
      {error && (
        <p className="mt-1.5 flex gap-1.5 text-second font-semibold text-over">
          <Icon name="note" size={18} />
          <span>{error}</span>
        </p>
      )}
    </div>
  );
}
