"use client";

import { createContext, useContext, useEffect, useState, type ReactNode } from "react";
import { WIDTH_CLASSES, WIDTH_COOKIE, widthClassOf, widthSteps, type WidthClass } from "./widthClass";

const CurrentWidth = createContext<WidthClass>(1440);

export const useWidthClass = (): WidthClass => useContext(CurrentWidth);

function remember(widthClass: WidthClass) {
  document.cookie = `${WIDTH_COOKIE}=${widthClass}; path=/; max-age=31536000; samesite=lax`;
}

/** Starts with the class the server drew, then follows the window; the cookie makes the next page right at once. */
export function WidthClassProvider({ initial, children }: { initial: WidthClass; children: ReactNode }) {
  const [widthClass, setWidthClass] = useState(initial);
  useEffect(() => {
    const follow = () => setWidthClass(widthClassOf(window.innerWidth));
    const steps = WIDTH_CLASSES.slice(1).map((step) => window.matchMedia(`(min-width: ${widthSteps[step]}px)`));
    follow();
    steps.forEach((step) => step.addEventListener("change", follow));
    return () => steps.forEach((step) => step.removeEventListener("change", follow));
  }, []);
  useEffect(() => remember(widthClass), [widthClass]);
  return <CurrentWidth value={widthClass}>{children}</CurrentWidth>;
}
