"use client";

import { useLayoutEffect, useRef, type ReactNode } from "react";

const SETTLE = { duration: 320, easing: "cubic-bezier(.2,.9,.25,1)" } as const;

export function isStill(): boolean {
  return typeof window === "undefined" || !window.matchMedia || window.matchMedia("(prefers-reduced-motion: reduce)").matches;
}

interface Props {
  /** Where the drawing stands now, in its own pixels; a change of it is seen as a movement. */
  y: number;
  children: ReactNode;
  className?: string;
}

/** The balance settling: what it holds glides from where it was to where it is. */
export function Settle({ y, children, className }: Props) {
  const group = useRef<SVGGElement>(null);
  const before = useRef(y);
  useLayoutEffect(() => {
    const distance = before.current - y;
    before.current = y;
    if (Math.abs(distance) < 0.5 || !group.current?.animate || isStill()) return;
    const frames = [
      { transform: `translateY(${distance}px)` },
      { transform: `translateY(${-distance * 0.04}px)`, offset: 0.7 },
      { transform: "translateY(0)" },
    ];
    group.current.animate(frames, SETTLE);
  }, [y]);
  return (
    <g ref={group} className={className}>
      {children}
    </g>
  );
}

/** The beam tilts about its pivot and swings 1.5 degrees past before it rests. */
export function Tilt({ degrees, x, y, children }: { degrees: number; x: number; y: number; children: ReactNode }) {
  const group = useRef<SVGGElement>(null);
  const before = useRef(degrees);
  useLayoutEffect(() => {
    const turn = before.current - degrees;
    before.current = degrees;
    if (Math.abs(turn) < 0.1 || !group.current?.animate || isStill()) return;
    const frames = [`rotate(${turn}deg)`, `rotate(${-Math.sign(turn) * 1.5}deg)`, "rotate(0deg)"];
    group.current.animate(frames.map((transform) => ({ transform, transformOrigin: "0 0" })), SETTLE);
  }, [degrees]);
  return (
    <g transform={`translate(${x} ${y}) rotate(${degrees})`}>
      <g ref={group}>{children}</g>
    </g>
  );
}
