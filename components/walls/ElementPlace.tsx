"use client";

import type { Plan } from "../../lib/noise/plan";
import { Icon } from "../marks/Icon";
import { fieldGrid, SpecFields } from "../plan/SpecFields";
import type { PlannedSave } from "../plan/usePlannedSave";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { Disclosure } from "../ui/Disclosure";
import { FieldError } from "../ui/FieldFrame";
import type { PathElement } from "./elementWords";
import { faceDoubts } from "./faces";
import { extentSpecs, identitySpecs, methodSpecs, whereSpecs } from "./placeSpecs";

interface Props {
  element: PathElement;
  plan: Plan;
  save: PlanSave;
  planned: PlannedSave;
  locked: boolean;
  onRemove: () => void;
}

const wide = `${fieldGrid} mid:grid-cols-4`;

/** Name, boundary, place and size of one element, and the way to take it out. */
export function ElementPlace({ element, plan, save, planned, locked, onRemove }: Props) {
  const spot = `place/${element.id}`;
  const shared = { spot, save, planned, locked };
  const outdoors = plan.paths.find(({ id }) => id === element.pathId)?.toSpaceId == null;
  const doubts = faceDoubts(plan, element.pathId);
  return (
    <Disclosure summary="Where it stands" open={outdoors && element.position === null && element.kind !== "flanking"}>
      <div className="grid gap-4 pt-2 text-ink">
        <SpecFields specs={identitySpecs(plan, element)} {...shared} className={`${fieldGrid} max-mid:grid-cols-1`} />
        {outdoors && <SpecFields specs={whereSpecs(element)} {...shared} className={wide} />}
        {extentSpecs(element).length > 0 && <SpecFields specs={extentSpecs(element)} {...shared} />}
        {doubts.map((words) => (
          <p key={words} className="flex gap-2 text-second">
            <Icon name="note" size={18} />
            <span className="min-w-0">{words}</span>
          </p>
        ))}
        <Disclosure summary={<span className="text-second">Figures of the method</span>}>
          <SpecFields specs={methodSpecs(element)} {...shared} className={`${fieldGrid} pt-2 mid:grid-cols-3`} />
        </Disclosure>
        {!locked && (
          <div>
            <Button icon={<Icon name="remove" />} onClick={onRemove}>
              Take it out of the plan
            </Button>
            <FieldError id={spot} error={save.errorOf(spot)} />
          </div>
        )}
      </div>
    </Disclosure>
  );
}
