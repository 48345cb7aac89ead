"use client";

import { useRef, useState, type KeyboardEvent } from "react";
import { TextField } from "../ui/TextField";

interface Props {
  name: string;
  /** Gives the reason where the name was not taken; the typed one stays. */
  onRename: (name: string) => Promise<string | undefined>;
  onClose: () => void;
}

/** A name in place: Enter or leaving it saves, Esc leaves it as it was. */
export function RenameField({ name, onRename, onClose }: Props) {
  const [typed, setTyped] = useState(name);
  const [error, setError] = useState<string>();
  const [saving, setSaving] = useState(false);
  const left = useRef(false);

  async function save() {
    if (left.current || saving) return;
    const wanted = typed.trim();
    if (wanted === name) return onClose();
    if (wanted === "") return setError("A yard needs a name.");
    setSaving(true);
    const reason = await onRename(wanted);
    setSaving(false);
    setError(reason);
    if (reason !== undefined) return;
    left.current = true;
    onClose();
  }

  function press(event: KeyboardEvent) {
    if (event.key === "Enter") void save();
    if (event.key !== "Escape") return;
    left.current = true;
    onClose();
  }

  return (
    <TextField
      autoFocus
      label="Name of the yard"
      value={typed}
      maxLength={120}
      error={error}
      aria-busy={saving || undefined}
      hint="Enter saves, Esc leaves it as it was."
      onChange={(event) => setTyped(event.target.value)}
      onFocus={(event) => event.target.select()}
      onKeyDown={press}
      onBlur={() => void save()}
    />
  );
}
