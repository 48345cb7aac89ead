"use client";

import { useRef, useState } from "react";
import { meRoute } from "../addresses";
import { ask } from "../signIn/ask";

export interface Setting<T extends string> {
  chosen: T;
  choose: (value: T) => void;
  /** Spoken and shown beside the choice. */
  says: string;
  error: string | undefined;
}

/** One choice of the account, saved as soon as it is made; what could not be saved stays chosen, with the reason. */
export function useSetting<T extends string>(field: "theme" | "units" | "decimalMark", initial: T): Setting<T> {
  const [chosen, setChosen] = useState(initial);
  const [says, setSays] = useState("");
  const [error, setError] = useState<string>();
  const latest = useRef(0);

  async function choose(value: T) {
    const turn = (latest.current += 1);
    setChosen(value);
    setSays("");
    setError(undefined);
    const answered = await ask("PATCH", meRoute, { [field]: value });
    // Only the answer to the last choice speaks of what is shown.
    if (turn !== latest.current) return;
    if (answered.kind === "done") return setSays("Saved.");
    setError(`Not saved: ${answered.message || "try again in a few seconds."}`);
  }
  return { chosen, choose, says, error };
}
