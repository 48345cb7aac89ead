"use client";

import { useState } from "react";

/** What was chosen shows at once; it goes back to what stands when the server refuses it. */
export function useChosen<T>(value: T, error: string | undefined): [T, (next: T) => void] {
  const [chosen, setChosen] = useState(value);
  const [stored, setStored] = useState({ value, error });
  if (stored.value !== value || stored.error !== error) {
    setStored({ value, error });
    setChosen(value);
  }
  return [chosen, setChosen];
}
