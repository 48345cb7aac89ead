"use client";

import type { Answer } from "../state/plan";
import { PlanProvider } from "../state/PlanProvider";
import { YardStage, type YardStageProps } from "./YardStage";

/** The yard's stage with its plan and verdict. */
export function YardDesk({ answer, ...props }: YardStageProps & { answer: Answer }) {
  return (
    <PlanProvider key={props.projectId} answer={answer}>
      <YardStage {...props} />
    </PlanProvider>
  );
}
