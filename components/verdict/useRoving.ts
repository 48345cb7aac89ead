"use client";

import { useRef, type KeyboardEvent, type RefObject } from "react";

interface Options<T> {
  items: readonly T[];
  lit: number;
  onLight: (item: T) => void;
  onEnter?: (item: T) => void;
  onSpace?: (item: T) => void;
}

const steps: Record<string, (at: number, last: number) => number> = {
  ArrowDown: (at, last) => Math.min(last, at + 1),
  ArrowUp: (at) => Math.max(0, at - 1),
  Home: () => 0,
  End: (_, last) => last,
};

/** A list that is one tab stop: arrows move the lit row and the focus with it. */
export function useRoving<T>({ items, lit, onLight, onEnter, onSpace }: Options<T>): {
  list: RefObject<HTMLUListElement | null>;
  onKeyDown: (event: KeyboardEvent) => void;
} {
  const list = useRef<HTMLUListElement>(null);
  const onKeyDown = (event: KeyboardEvent) => {
    const at = Math.max(0, lit);
    const item = items[at];
    if (event.altKey || event.ctrlKey || event.metaKey || item === undefined) return;
    const step = steps[event.key];
    if (!step && event.key !== "Enter" && event.key !== " ") return;
    event.preventDefault();
    if (event.key === "Enter") return onEnter?.(item);
    if (event.key === " ") return onSpace?.(item);
    const next = lit < 0 ? 0 : step!(at, items.length - 1);
    onLight(items[next]!);
    list.current?.querySelectorAll<HTMLElement>("[role=option]")[next]?.focus();
  };
  return { list, onKeyDown };
}
