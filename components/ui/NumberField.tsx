"use client";

import clsx from "clsx";
import { useId, useState, type KeyboardEvent, type ReactNode } from "react";
import { formatQuantity, parseNumber, withUnit } from "../format";
import { useFigures, withMark } from "./figures";
import { borderOf, describe, FieldFrame, inputClasses } from "./FieldFrame";
import { useTyped } from "./useTyped";

interface Props {
  label: ReactNode;
  /** What is stored; undefined or null shows an empty field. */
  value: number | null | undefined;
  unit?: string;
  step?: number;
  min?: number;
  max?: number;
  hint?: ReactNode;
  /** A reason from the server; the typed value stays. */
  error?: string;
  /** An empty field is an answer: not known. */
  optional?: boolean;
  /** A doubt about a value inside the range, as "Ten times the usual gap. Did you mean 25 mm?" It does not hold the value back. */
  caution?: (value: number) => string | undefined;
  /** Called when the field is left, on Enter, and when an arrow key is let go. */
  onCommit: (value: number | null) => void;
  name?: string;
  className?: string;
}

/** 0.1 + 0.2 is 0.3 here: a step never adds decimals of its own. */
function addStep(value: number, change: number, step: number): number {
  const decimals = Math.max(decimalsOf(value), decimalsOf(step));
  return Number((value + change).toFixed(decimals));
}

const decimalsOf = (value: number): number => `${value}`.split(".")[1]?.length ?? 0;

function clamp(value: number, { min, max }: Pick<Props, "min" | "max">): number {
  return Math.min(max ?? Infinity, Math.max(min ?? -Infinity, value));
}

function refuse(text: string, { min, max, unit = "", optional }: Props): string | undefined {
  if (text.trim() === "") return optional ? undefined : "A figure is needed here.";
  const value = parseNumber(text);
  if (value === undefined) return "Type a number, such as 25 or 2.5.";
  if (value === clamp(value, { min, max })) return undefined;
  const say = (bound: number) => (unit ? withUnit(formatQuantity(bound), unit) : formatQuantity(bound));
  if (min === undefined) return `At most ${say(max!)}.`;
  if (max === undefined) return `At least ${say(min)}.`;
  return `Between ${formatQuantity(min)} and ${say(max)}.`;
}

/** A number with its unit outside the value. Comma or point; up and down move one step, with Shift ten. */
export function NumberField(props: Props) {
  const { label, value, unit, step = 1, hint, error, caution, onCommit, name, className } = props;
  const id = useId();
  const { mark } = useFigures();
  const show = (figure: number | null | undefined) =>
    figure === null || figure === undefined ? "" : withMark(formatQuantity(figure), mark);
  const typed = useTyped(value, show);
  const { text } = typed;
  const [complaint, setComplaint] = useState<string>();
  const [stepped, setStepped] = useState(false);
  if (typed.came) setComplaint(doubt(value ?? null));

  function doubt(figure: number | null): string | undefined {
    return figure === null ? undefined : caution?.(figure);
  }

  function commit() {
    setStepped(false);
    const refusal = refuse(text, props);
    const figure = parseNumber(text) ?? null;
    setComplaint(refusal ?? doubt(figure));
    if (refusal === undefined && typed.hand(figure)) onCommit(figure);
  }

  function press(event: KeyboardEvent<HTMLInputElement>) {
    if (event.key === "Enter") return commit();
    const direction = event.key === "ArrowUp" ? 1 : event.key === "ArrowDown" ? -1 : 0;
    if (direction === 0) return;
    event.preventDefault();
    const from = parseNumber(text) ?? value ?? 0;
    typed.type(show(clamp(addStep(from, direction * step * (event.shiftKey ? 10 : 1), step), props)));
    setStepped(true);
  }

  const message = complaint ?? error;
  return (
    <FieldFrame id={id} label={label} hint={hint} error={message} className={className}>
      <div className="relative">
        <input
          id={id}
          name={name}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          value={text}
          onChange={(event) => typed.type(event.target.value)}
          onFocus={typed.visit}
          onKeyDown={press}
          onKeyUp={() => stepped && commit()}
          onBlur={commit}
          aria-invalid={message ? true : undefined}
          aria-describedby={[unit && `${id}-unit`, describe(id, hint, message)].filter(Boolean).join(" ") || undefined}
          className={clsx(inputClasses, borderOf(message), unit && "pr-16")}
        />
        {unit && (
          <span id={`${id}-unit`} className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-table text-ink2">
            {unit}
          </span>
        )}
      </div>
    </FieldFrame>
  );
}
