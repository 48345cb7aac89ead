"use client";

import { useEffect, useRef } from "react";
import { Button, LinkButton } from "../ui/Button";
import { Strip } from "../ui/Strip";
import type { ProjectLine } from "./ProjectLine";
import type { Outcome } from "./useYardActs";

interface Props {
  outcome: Outcome;
  onUndo: (line: ProjectLine, archived: boolean) => void;
}

/** What an act came to, and the one thing to do next: that takes the focus, for the line acted on may be gone. */
export function OutcomeStrip({ outcome, onUndo }: Props) {
  const strip = useRef<HTMLDivElement>(null);
  useEffect(() => {
    strip.current?.querySelector<HTMLElement>("a, button")?.focus();
  }, [outcome]);
  return <div ref={strip}>{stripOf(outcome, onUndo)}</div>;
}

function stripOf(outcome: Outcome, onUndo: Props["onUndo"]) {
  switch (outcome.kind) {
    case "copied":
      return (
        <Strip kind="note" heading={`“${outcome.name}” is copied`} action={<LinkButton href={outcome.href}>Open the copy</LinkButton>}>
          The copy has everything drawn in it and goes its own way. Nobody who was invited here is invited there.
        </Strip>
      );
    case "archived":
      return (
        <Strip kind="undo" heading={`“${outcome.line.name}” is archived`} action={<Button onClick={() => onUndo(outcome.line, false)}>Restore it</Button>}>
          It can be read but not changed, and stands under Archived.
        </Strip>
      );
    case "restored":
      return (
        <Strip kind="undo" heading={`“${outcome.line.name}” is back among your yards`} action={<Button onClick={() => onUndo(outcome.line, true)}>Archive it again</Button>} />
      );
    case "trouble":
      return (
        <Strip kind="error" heading={outcome.heading}>
          {outcome.message}
        </Strip>
      );
  }
}
