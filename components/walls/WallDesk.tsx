"use client";

import type { Answer } from "../state/plan";
import { PlanProvider } from "../state/PlanProvider";
import { WallDetail, type WallDetailProps } from "./WallDetail";

/** The page of one element with its own plan and verdict. */
export function WallDesk({ answer, ...props }: WallDetailProps & { answer: Answer }) {
  return (
    <PlanProvider key={`${props.projectId} ${props.elementId}`} answer={answer}>
      <WallDetail {...props} />
    </PlanProvider>
  );
}
