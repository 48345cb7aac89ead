"use client";

import type { DuctPiece } from "../../lib/noise/ducts/run";
import type { Plan } from "../../lib/noise/plan";
import { changeOf } from "../plan/fieldSpec";
import { pieceTitle, RunFields } from "../plan/RunFields";
import type { PlannedSave } from "../plan/usePlannedSave";
import type { PlanSave } from "../plan/usePlanSave";
import { QuantityField } from "../ui/QuantityField";
import type { PathElement } from "./elementWords";
import { LockedReason } from "./ElementFields";

type Duct = Extract<PathElement, { kind: "duct" }>;

interface Props {
  element: Duct;
  save: PlanSave;
  planned: PlannedSave;
  /** Undefined for who may change. */
  lockedBecause?: string;
}

const runIn = (plan: Plan, id: string): DuctPiece[] => {
  const element = plan.elements.find((one) => one.id === id);
  return element?.kind === "duct" ? element.params.run : [];
};

/** The run of a duct piece by piece, from the room to its far mouth. */
export function DuctFields({ element, save, planned, lockedBecause }: Props) {
  const { id, params } = element;
  const spot = `duct/${id}`;
  if (lockedBecause !== undefined) return <LockedRun element={element} reason={lockedBecause} />;
  return (
    <div className="mt-5 grid gap-5">
      <QuantityField
        quantity="smallArea"
        label="Mouth in the room"
        value={params.opening}
        min={0.0001}
        max={10}
        error={save.errorOf(`${spot}/opening`)}
        onCommit={(opening) => opening !== null && void planned(() => changeOf("elements", id, { params: { opening } }), `${spot}/opening`)}
        className="mid:max-w-64"
      />
      <RunFields
        run={params.run}
        from="the room"
        mouth={params.opening}
        spot={spot}
        error={save.errorOf(spot)}
        onChange={(change) => void planned((plan) => changeOf("elements", id, { params: { run: change(runIn(plan, id)) } }), spot)}
      />
    </div>
  );
}

function LockedRun({ element: { params }, reason }: { element: Duct; reason: string }) {
  return (
    <>
      <ol className="mt-4 grid gap-1">
        {params.run.map((piece, at) => (
          <li key={at}>
            {pieceTitle(piece, at)}
            {piece.kind === "silencer" && `, holds back ${piece.il.map((figure) => figure ?? "?").join(", ")} dB`}
          </li>
        ))}
      </ol>
      <LockedReason reason={reason} />
    </>
  );
}
