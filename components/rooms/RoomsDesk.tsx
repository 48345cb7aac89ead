"use client";

import type { Answer } from "../state/plan";
import { PlanProvider } from "../state/PlanProvider";
import { RoomsStage, type RoomsStageProps } from "./RoomsStage";

/** The rooms of a yard with its plan and verdict. */
export function RoomsDesk({ answer, ...props }: RoomsStageProps & { answer: Answer }) {
  return (
    <PlanProvider key={props.projectId} answer={answer}>
      <RoomsStage {...props} />
    </PlanProvider>
  );
}
