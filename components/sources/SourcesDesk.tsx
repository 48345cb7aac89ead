"use client";

import type { Answer } from "../state/plan";
import { PlanProvider } from "../state/PlanProvider";
import { SourcesStage, type SourcesStageProps } from "./SourcesStage";

/** The stage of the sources with its own plan and verdict. */
export function SourcesDesk({ answer, ...props }: SourcesStageProps & { answer: Answer }) {
  return (
    <PlanProvider key={props.projectId} answer={answer}>
      <SourcesStage {...props} />
    </PlanProvider>
  );
}
