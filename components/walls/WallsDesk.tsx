"use client";

import type { Answer } from "../state/plan";
import { PlanProvider } from "../state/PlanProvider";
import { WallsStage, type WallsStageProps } from "./WallsStage";

/** The index of all walls and openings with its plan and verdict. */
export function WallsDesk({ answer, ...props }: WallsStageProps & { answer: Answer }) {
  return (
    <PlanProvider key={props.projectId} answer={answer}>
      <WallsStage {...props} />
    </PlanProvider>
  );
}
