"use client";

import { useEffect, useState } from "react";

export interface Wait {
  /** Whole seconds until the next try; 0 when it is open. */
  left: number;
  /** Seconds that the wait was to last, or 0 where nobody waits. */
  total: number;
  message: string;
}

interface Begun {
  until: number;
  total: number;
  message: string;
}

const leftOf = (begun: Begun | undefined): number => (begun ? Math.max(0, Math.ceil((begun.until - Date.now()) / 1000)) : 0);

/** Counts a wait down by the clock, so that a page that slept is right when it wakes. */
export function useWait(): [Wait, (seconds: number, message: string) => void, () => void] {
  const [begun, setBegun] = useState<Begun>();
  const [left, setLeft] = useState(0);
  const running = left > 0;

  useEffect(() => {
    if (!begun || !running) return;
    const ticking = setInterval(() => setLeft(leftOf(begun)), 250);
    return () => clearInterval(ticking);
  }, [begun, running]);

  function begin(seconds: number, message: string) {
    setBegun({ until: Date.now() + seconds * 1000, total: seconds, message });
    setLeft(seconds);
  }
  const forget = () => {
    setBegun(undefined);
    setLeft(0);
  };
  return [{ left, total: begun?.total ?? 0, message: begun?.message ?? "" }, begin, forget];
}
