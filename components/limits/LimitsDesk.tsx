"use client";

import type { Answer } from "../state/plan";
import { PlanProvider } from "../state/PlanProvider";
import { LimitsStage, type LimitsStageProps } from "./LimitsStage";

/** The limits of one yard with its plan and verdict. */
export function LimitsDesk({ answer, ...props }: LimitsStageProps & { answer: Answer }) {
  return (
    <PlanProvider key={props.projectId} answer={answer}>
      <LimitsStage {...props} />
    </PlanProvider>
  );
}
