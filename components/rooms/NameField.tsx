"use client";

import { useState, type ReactNode } from "react";
import { TextField } from "../ui/TextField";
import { useTyped } from "../ui/useTyped";

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
  const typed = useTyped(value, (name) => name);
  const [empty, setEmpty] = useState(false);
  function commit() {
    const name = typed.text.trim();
    setEmpty(name === "");
    if (name !== "" && typed.hand(name)) onCommit(name);
  }
  return (
    <TextField
      label={label}
      value={typed.text}
      maxLength={LONGEST}
      autoComplete="off"
      className={className}
      error={empty ? "A name is needed here." : error}
      onChange={(event) => typed.type(event.target.value)}
      onFocus={typed.visit}
      onBlur={commit}
      onKeyDown={(event) => event.key === "Enter" && commit()}
    />
  );
}
