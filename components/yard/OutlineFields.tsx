"use client";

import { useState } from "react";
import { fieldGrid, SpecFields } from "../plan/SpecFields";
import type { PlannedSave } from "../plan/usePlannedSave";
import type { PlanSave } from "../plan/usePlanSave";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { FieldError } from "../ui/FieldFrame";
import { cornersOf, extentOf, rectangleOf, type Corner } from "./geometry";
import { changeOutline, cornerSpecs, rectangleSpecs, type OutlineOf } from "./lotSpecs";
import { withCorner } from "./newThings";

interface Props {
  of: OutlineOf;
  outline: readonly Corner[];
  spot: string;
  save: PlanSave;
  planned: PlannedSave;
  locked: boolean;
}

const LEAST_CORNERS = 3;
const MOST_CORNERS = 40;

/** An outline as a rectangle of four figures, or corner by corner. */
export function OutlineFields({ of, outline, spot, save, planned, locked }: Props) {
  const rectangle = rectangleOf(outline);
  const [byCorner, setByCorner] = useState(false);
  const shared = { spot, save, planned, locked };
  if (rectangle && !byCorner) {
    return (
      <>
        <SpecFields specs={rectangleSpecs(of, rectangle)} {...shared} />
        {!locked && (
          <Button className="mt-3" onClick={() => setByCorner(true)}>
            Corner by corner
          </Button>
        )}
      </>
    );
  }
  const place = `${spot}/corners`;
  const send = (corners: readonly Corner[]) => void planned(() => changeOutline(of, corners), place);
  const { west, east, south, north } = extentOf(outline);
  return (
    <>
      <p className="mb-2 text-second text-ink2">In order round the outline; the last joins the first.</p>
      <ol className="grid gap-3">
        {cornerSpecs(of, outline).map((specs, at) => (
          <li key={at} className="flex items-end gap-2">
            <SpecFields specs={specs} {...shared} className={`${fieldGrid} min-w-0 flex-1`} />
            {!locked && outline.length > LEAST_CORNERS && (
              <Button look="square" aria-label={`Remove corner ${at + 1}`} icon={<Icon name="remove" />} onClick={() => send(outline.filter((_, index) => index !== at))} />
            )}
          </li>
        ))}
      </ol>
      <FieldError id={place} error={save.errorOf(place)} />
      {!locked && (
        <div className="mt-3 flex flex-wrap gap-2">
          {outline.length < MOST_CORNERS && (
            <Button icon={<Icon name="plus" />} onClick={() => send(withCorner(outline))}>
              Add a corner
            </Button>
          )}
          <Button
            onClick={() => {
              setByCorner(false);
              if (!rectangle) send(cornersOf({ x: west, y: south, width: east - west, depth: north - south }));
            }}
          >
            {rectangle ? "As a rectangle" : "Make it a rectangle"}
          </Button>
        </div>
      )}
    </>
  );
}
