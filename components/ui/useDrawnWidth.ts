"use client";

import { useEffect, useRef, useState, type RefObject } from "react";
import { useWidthClass } from "../ui/useWidthClass";
import type { WidthClass } from "../ui/widthClass";

/**
 * Pixels a drawing may use: what the width class promises when the server draws, then the true width of its place.
 * Drawings are never scaled, so their text keeps its size.
 */
export function useDrawnWidth<T extends HTMLElement>(
  promised: Record<WidthClass, number>,
  most: number,
): [RefObject<T | null>, number] {
  const place = useRef<T>(null);
  const [measured, setMeasured] = useState<number>();
  const widthClass = useWidthClass();
  useEffect(() => {
    const element = place.current;
    if (!element || typeof ResizeObserver === "undefined") return;
    const observer = new ResizeObserver(([entry]) => setMeasured(Math.floor(entry.contentRect.width)));
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [place, Math.max(240, Math.min(most, measured || promised[widthClass]))];
}
