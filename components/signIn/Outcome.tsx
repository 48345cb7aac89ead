"use client";

import { useEffect, useRef, type ReactNode } from "react";
import { Strip, type StripKind } from "../ui/Strip";

interface Props {
  kind: StripKind;
  heading: ReactNode;
  children?: ReactNode;
  action?: ReactNode;
}

/** What became of a form that gave way to its answer: the reader is taken there, for the pressed button is gone. */
export function Outcome({ action, ...strip }: Props) {
  const place = useRef<HTMLDivElement>(null);
  useEffect(() => place.current?.focus(), []);
  return (
    <div ref={place} tabIndex={-1} className="flex flex-col gap-4">
      <Strip {...strip} />
      {action}
    </div>
  );
}
