"use client";

import clsx from "clsx";
import { useId, useState, type KeyboardEvent, type ReactNode } from "react";
import { borderOf, describe, FieldFrame, inputClasses } from "./FieldFrame";
import { useTyped } from "./useTyped";

interface Props {
  label: ReactNode;
  value: string;
  type?: "text" | "date";
  /** More than one: Enter writes a new line, and leaving the field saves. */
  lines?: number;
  most?: number;
  needed?: boolean;
  hint?: ReactNode;
  /** A reason from the server; the typed words stay. */
  error?: string;
  onCommit: (value: string) => void;
  className?: string;
}

/** Words that are saved when the field is left or on Enter. What the server refused stays as it was typed. */
export function SavedText({ label, value, type = "text", lines = 1, most, needed, hint, error, onCommit, className }: Props) {
  const id = useId();
  const typed = useTyped(value, (words) => words);
  const { text } = typed;
  const [complaint, setComplaint] = useState<string>();
  if (typed.came) setComplaint(undefined);

  function commit() {
    const words = text.trim();
    const empty = needed && words === "";
    setComplaint(empty ? "This cannot be empty." : undefined);
    if (!empty && typed.hand(words)) onCommit(words);
  }

  function press(event: KeyboardEvent) {
    if (event.key === "Enter" && lines === 1) commit();
  }

  const message = complaint ?? error;
  const shared = {
    id,
    value: text,
    maxLength: most,
    onFocus: typed.visit,
    onBlur: commit,
    onKeyDown: press,
    "aria-invalid": message ? true : undefined,
    "aria-describedby": describe(id, hint, message),
  };
  return (
    <FieldFrame id={id} label={label} hint={hint} error={message} className={className}>
      {lines > 1 ? (
        <textarea {...shared} rows={lines} onChange={(event) => typed.type(event.target.value)} className={clsx(inputClasses, borderOf(message), "resize-y py-2")} />
      ) : (
        <input {...shared} type={type} autoComplete="off" onChange={(event) => typed.type(event.target.value)} className={clsx(inputClasses, borderOf(message))} />
      )}
    </FieldFrame>
  );
}
