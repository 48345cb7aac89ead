"use client";

import clsx from "clsx";
import { useId, type ReactNode } from "react";
import { FieldError } from "../ui/FieldFrame";
import { Icon } from "../marks/Icon";
import { useChosen } from "./useChosen";

interface Props<T extends string> {
  label: ReactNode;
  choices: readonly { value: T; label: ReactNode }[];
  value: T | null;
  hint?: ReactNode;
  error?: string;
  onChoose: (value: T) => void;
  className?: string;
}

/** A few choices side by side: the browser's own radio buttons, each with its words as the target. */
export function Segments<T extends string>({ label, choices, value, hint, error, onChoose, className }: Props<T>) {
  const id = useId();
  const [chosen, setChosen] = useChosen(value, error);
  function choose(next: T) {
    setChosen(next);
    onChoose(next);
  }
  return (
    <fieldset className={clsx("min-w-0", className)} aria-describedby={hint ? `${id}-hint` : undefined}>
      <legend className="mb-1.5 text-second font-semibold text-ink2">{label}</legend>
      <div className="grid auto-cols-fr rounded-control border-[1.5px] border-edge mid:grid-flow-col">
        {choices.map((choice) => (
          <label
            key={choice.value}
            className="flex min-h-10 cursor-pointer items-center justify-center gap-1.5 border-edge px-2 py-1 text-center text-table font-semibold leading-tight not-first:border-t-[1.5px] hover:bg-well has-checked:bg-ink has-checked:text-sheet has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-lamp mid:not-first:border-l-[1.5px] mid:not-first:border-t-0"
          >
            <input type="radio" name={id} value={choice.value} checked={choice.value === chosen} onChange={() => choose(choice.value)} className="sr-only" />
            {choice.value === chosen && <Icon name="tick" size={18} />}
            <span>{choice.label}</span>
          </label>
        ))}
      </div>
      {hint && (
        <p id={`${id}-hint`} className="mt-1.5 text-second text-ink2">
          {hint}
        </p>
      )}
      <FieldError id={id} error={error} />
    </fieldset>
  );
}
