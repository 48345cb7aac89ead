"use client";

import { useEffect, useState } from "react";

/** True once a state has lasted so long: what is over sooner need not be announced. */
export function useLasting(state: boolean, milliseconds: number): boolean {
  const [lasting, setLasting] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLasting(state), state ? milliseconds : 0);
    return () => clearTimeout(timer);
  }, [state, milliseconds]);
  return lasting && state;
}
