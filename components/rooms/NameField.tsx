"use client";

import { useState, type ReactNode } from "react";
import { TextField } from "../ui/TextField";

interface Props {
  label: ReactNode;
  value: string;
  error?: string;
  className?: string;
  onCommit: (value: string) => void;
}

const LONGEST = 120;

/** A name that is saved when the field is left or on Enter; an empty one is asked for again and what stands stays. */
export function NameField({ label, value, error, className, onCommit }: Props) {
  const [stored, setStored] = useState(value);
  const [text, setText] = useState(value);
  /** Handed over and not yet come back: what stands then is no longer `value`. */
  const [sent, setSent] = useState<string>();
  const [empty, setEmpty] = useState(false);
  if (stored !== value) {
    setStored(value);
    if (text.trim() === stored || text.trim() === value) setText(value);
    setSent(undefined);
  }
  function commit() {
    const typed = text.trim();
    setEmpty(typed === "");
    if (typed === "" || typed === (sent ?? value)) return;
    setSent(typed);
    onCommit(typed);
  }
  return (
    <TextField
      label={label}
      value={text}
      maxLength={LONGEST}
      autoComplete="off"
      className={className}
      error={empty ? "A name is needed here." : error}
      onChange={(event) => setText(event.target.value)}
      onFocus={() => setSent(undefined)}
      onBlur={commit}
      onKeyDown={(event) => event.key === "Enter" && commit()}
    />
  );
}
