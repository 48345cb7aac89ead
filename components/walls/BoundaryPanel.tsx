"use client";

import { useState } from "react";
import type { Plan } from "../../lib/noise/plan";
import { listWords } from "../format";
import { SpecFields } from "../plan/SpecFields";
import type { PlannedSave } from "../plan/usePlannedSave";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { Dialog } from "../ui/Dialog";
import { Disclosure } from "../ui/Disclosure";
import { FieldError } from "../ui/FieldFrame";
import { boundarySpecs } from "./boundarySpecs";

interface Props {
  path: Plan["paths"][number];
  plan: Plan;
  save: PlanSave;
  planned: PlannedSave;
}

/** Name and sides of one boundary, and the way to take it out with everything that stands in it. */
export function BoundaryPanel({ path, plan, save, planned }: Props) {
  const [asked, setAsked] = useState(false);
  const spot = `boundary/${path.id}`;
  const standing = plan.elements.filter(({ pathId }) => pathId === path.id);
  function remove() {
    setAsked(false);
    void planned(() => [{ act: "remove", part: "paths", id: path.id }], spot);
  }
  return (
    <Disclosure summary={<span className="text-second">Change this boundary</span>} className="px-4 mid:px-6.5">
      <SpecFields specs={boundarySpecs(plan, path)} spot={spot} save={save} planned={planned} />
      <Button className="mt-3" onClick={() => (standing.length > 0 ? setAsked(true) : remove())}>
        Remove the boundary
      </Button>
      <FieldError id={`remove-${path.id}`} error={save.errorOf(spot)} />
      <Dialog
        open={asked}
        heading={`Remove ${path.name}?`}
        onClose={() => setAsked(false)}
        actions={
          <>
            <Button look="ink" onClick={remove}>
              Remove all of it
            </Button>
            <Button onClick={() => setAsked(false)}>Keep it</Button>
          </>
        }
      >
        <p className="break-words">With it goes what stands in it: {listWords(standing.map(({ name }) => name))}.</p>
      </Dialog>
    </Disclosure>
  );
}
