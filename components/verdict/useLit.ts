"use client";

import { useAtom, useAtomValue } from "jotai";
import { useState } from "react";
import { answerAtom, litBandAtom, litPathAtom, litReceiverAtom } from "../state/plan";
import { byShare, columnsOf, litColumnOf, type Column } from "./columns";
import { leverOf } from "./lever";
import { readingOf, type Reading } from "./reading";
import type { PathVerdict } from "@/lib/noise/verdict";

/** No choice yet lights the path one would try first; this is the choice of none. */
const NONE = "";

export interface Lit {
  reading: Reading | null;
  columns: Column[];
  column: Column | null;
  path: PathVerdict | null;
  /** The lit path is silenced on trial, in every band. */
  trial: boolean;
  lightListener: (receiverId: string) => void;
  lightColumn: (column: Column) => void;
  lightPath: (pathId: string) => void;
  stepColumn: (by: number) => void;
  stepPath: (by: number) => void;
  unlight: () => void;
  toggleTrial: () => void;
}

const clamp = (at: number, last: number) => Math.max(0, Math.min(last, at));

function litPathOf(reading: Reading | null, column: Column | null, litId: string | null): PathVerdict | null {
  if (!reading || !column || litId === NONE) return null;
  const chosen = reading.weighed.paths.find(({ id }) => id === litId);
  return chosen ?? leverOf(reading.plan, reading.weighed, column);
}

/** What the reader is looking at: one listener, one band, one path. */
export function useLit(): Lit {
  const { plan, verdict } = useAtomValue(answerAtom);
  const [litReceiver, setReceiver] = useAtom(litReceiverAtom);
  const [litBand, setBand] = useAtom(litBandAtom);
  const [litPath, setPath] = useAtom(litPathAtom);
  const [trial, setTrial] = useState(false);
  const reading = readingOf(plan, verdict, litReceiver ?? verdict.leadingReceiverId);
  const columns = reading ? columnsOf(reading.weighed) : [];
  const column = reading ? litColumnOf(columns, litBand, reading.weighed.band) : null;
  const path = litPathOf(reading, column, litPath);
  const choosePath = (id: string | null) => {
    setPath(id);
    setTrial(false);
  };
  return {
    reading,
    columns,
    column,
    path,
    trial: trial && path !== null,
    lightListener: (receiverId) => {
      setReceiver(receiverId);
      setBand(null);
      choosePath(null);
    },
    lightColumn: ({ band }) => setBand(band),
    lightPath: choosePath,
    stepColumn: (by) => column && setBand(columns[clamp(columns.indexOf(column) + by, columns.length - 1)]!.band),
    stepPath: (by) => {
      if (!reading || !column) return;
      const sorted = byShare(reading.weighed.paths, column);
      const at = path ? sorted.findIndex(({ id }) => id === path.id) + by : 0;
      const next = sorted[clamp(at, sorted.length - 1)];
      if (next) choosePath(next.id);
    },
    unlight: () => {
      setBand(null);
      choosePath(NONE);
    },
    toggleTrial: () => setTrial((on) => !on && path !== null),
  };
}
