"use client";

import { useRef, useState, type KeyboardEvent } from "react";
import type { Plan } from "../../lib/noise/plan";
import type { PlannedSave } from "../plan/usePlannedSave";
import { moveOf, withChanges } from "./moves";
import { keyOf, type Thing } from "./things";

const STEP = 0.1;
const LEAP = 1;

const directions: Record<string, readonly [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

type Offset = readonly [number, number];
const NOWHERE: Offset = [0, 0];

/** Moves the lit thing by arrow keys: the drawing follows at once, the save goes out when the key is let go. */
export function useNudge({ plan, lit, planned, spotOf }: { plan: Plan; lit: Thing | null; planned: PlannedSave; spotOf: (thing: Thing) => string }) {
  const held = useRef<Offset>(NOWHERE);
  /** What is drawn moved: held by a key, or on its way. */
  const [drawn, setDrawn] = useState<{ thing: Thing; offset: Offset }>();

  function onKeyDown(event: KeyboardEvent) {
    const direction = directions[event.key];
    if (!direction || !lit || event.altKey || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    const step = event.shiftKey ? LEAP : STEP;
    const [dx, dy] = [direction[0] * step, direction[1] * step];
    held.current = [held.current[0] + dx, held.current[1] + dy];
    setDrawn((before) => ({ thing: lit, offset: before && keyOf(before.thing) === keyOf(lit) ? [before.offset[0] + dx, before.offset[1] + dy] : [dx, dy] }));
  }

  async function onKeyUp(event: KeyboardEvent) {
    const offset = held.current;
    if (!directions[event.key] || !lit || (offset[0] === 0 && offset[1] === 0)) return;
    held.current = NOWHERE;
    await planned((now) => moveOf(now, lit, ...offset), spotOf(lit));
    setDrawn((before) => {
      if (!before) return before;
      const left: Offset = [before.offset[0] - offset[0], before.offset[1] - offset[1]];
      return Math.hypot(...left) < 1e-6 ? undefined : { ...before, offset: left };
    });
  }

  const shown = drawn ? withChanges(plan, moveOf(plan, drawn.thing, ...drawn.offset)) : plan;
  return { shown, onKeyDown, onKeyUp: (event: KeyboardEvent) => void onKeyUp(event) };
}
