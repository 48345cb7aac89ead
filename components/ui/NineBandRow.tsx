"use client";

import clsx from "clsx";
import { useId, useRef, type ClipboardEvent, type KeyboardEvent, type ReactNode } from "react";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import { bandWords, formatBand, formatQuantity, parseNumber } from "../format";
import { FieldError, hintId, borderOf, errorId } from "./FieldFrame";
import { useFigures, withMark } from "./figures";
import type { BandFigure } from "./nineValues";
import { useNineBands } from "./useNineBands";
import { VisuallyHidden } from "./VisuallyHidden";

interface Props {
  /** What the nine figures are: "Levels of the drum kit". */
  label: ReactNode;
  /** Nine figures in the order of the bands; null is not known and shows an empty field. */
  values: readonly BandFigure[];
  unit: string;
  min: number;
  max: number;
  /** What an arrow key adds; with Shift ten times as much. */
  step?: number;
  /** "silent" may be typed. */
  silence?: boolean;
  hint?: ReactNode;
  /** A refusal of the server for the whole row. */
  error?: string;
  /** A refusal of the server for one band, by its place in the row. */
  errorOf?: (band: number) => string | undefined;
  /** The band you are looking at, washed with the lamp. */
  lit?: number;
  /** A field was entered. */
  onLight?: (band: number) => void;
  /** All nine, when a field is left with something new, on Enter, and when several were pasted. */
  onCommit: (values: BandFigure[]) => void;
  className?: string;
}

/**
 * Nine figures over the octave bands: left and right go from band to band at the ends of the text, up and down change a
 * figure, and nine values pasted into any field fill the row. What is no figure stays where it was typed, with a reason.
 */
export function NineBandRow(props: Props) {
  const { label, values, unit, min, max, step = 1, silence = false, hint, error, errorOf, lit, onLight, onCommit, className } = props;
  const id = useId();
  const { mark } = useFigures();
  const row = useRef<HTMLDivElement>(null);
  const stepped = useRef(false);
  const bands = useNineBands({ values, unit, min, max, silence, mark, onCommit });
  const messages = OCTAVE_BANDS.map((_, i) => bands.complaints[i] ?? errorOf?.(i));
  const rowError = [error, ...messages.map((message, i) => message && `${bandWords(OCTAVE_BANDS[i]!)}: ${message}`)].filter(Boolean);

  function go(to: number) {
    const field = row.current?.querySelectorAll("input")[to];
    field?.focus();
    field?.select();
  }

  function stepBy(at: number, change: number) {
    const from = parseNumber(bands.texts[at]!);
    const held = values[at];
    const start = from ?? (typeof held === "number" ? held : 0);
    const figure = Math.min(max, Math.max(min, Number((start + change).toFixed(6))));
    bands.type(at, withMark(formatQuantity(figure), mark));
    stepped.current = true;
  }

  function press(at: number, event: KeyboardEvent<HTMLInputElement>) {
    const { key, shiftKey, currentTarget: field } = event;
    if (key === "Enter") bands.enter();
    if (key === "ArrowUp" || key === "ArrowDown") {
      event.preventDefault();
      stepBy(at, (key === "ArrowUp" ? step : -step) * (shiftKey ? 10 : 1));
    }
    const whole = field.selectionStart === 0 && field.selectionEnd === field.value.length;
    const atStart = field.selectionEnd === 0 || whole;
    const atEnd = field.selectionStart === field.value.length || whole;
    const to = key === "ArrowLeft" && atStart ? at - 1 : key === "ArrowRight" && atEnd ? at + 1 : undefined;
    if (to === undefined || shiftKey || !(to in OCTAVE_BANDS)) return;
    event.preventDefault();
    go(to);
  }

  function release() {
    if (stepped.current) bands.leave();
    stepped.current = false;
  }

  function paste(at: number, event: ClipboardEvent<HTMLInputElement>) {
    if (bands.paste(at, event.clipboardData.getData("text"))) event.preventDefault();
  }

  return (
    <fieldset className={clsx("@container min-w-0", className)} aria-describedby={hint ? hintId(id) : undefined}>
      <legend className="mb-1.5 text-second font-semibold text-ink2">
        {label}
        {unit && `, ${unit}`}
      </legend>
      <div ref={row} className="grid grid-cols-5 gap-x-1.5 gap-y-3 @xl:grid-cols-9 @xl:gap-x-2">
        {OCTAVE_BANDS.map((band, i) => (
          <div key={band} className="min-w-0 text-center">
            <label htmlFor={`${id}-${i}`} className={clsx("mb-1 block text-second", i === lit ? "font-semibold text-ink" : "text-ink2")}>
              {formatBand(band)} <VisuallyHidden>Hz</VisuallyHidden>
            </label>
            <input
              id={`${id}-${i}`}
              type="text"
              inputMode={silence || min < 0 ? "text" : "decimal"}
              autoComplete="off"
              placeholder="?"
              value={bands.texts[i]}
              onChange={(event) => bands.type(i, event.target.value)}
              onFocus={() => onLight?.(i)}
              onKeyDown={(event) => press(i, event)}
              onKeyUp={release}
              onBlur={bands.leave}
              onPaste={(event) => paste(i, event)}
              aria-invalid={messages[i] ? true : undefined}
              aria-describedby={messages[i] ? errorId(id) : undefined}
              className={clsx(
                "min-h-10 w-full min-w-0 rounded-control border-[1.5px] px-0.5 text-center text-table text-ink placeholder:text-ink2",
                borderOf(messages[i]),
                i === lit ? "bg-lampwash" : "bg-sheet",
              )}
            />
          </div>
        ))}
      </div>
      {hint && (
        <p id={hintId(id)} className="mt-1.5 text-second text-ink2">
          {hint}
        </p>
      )}
      <p role="status" className={clsx("text-second text-ink2", bands.note && "mt-1.5")}>
        {bands.note}
      </p>
      <FieldError id={id} error={rowError.join(" ") || undefined} />
    </fieldset>
  );
}
