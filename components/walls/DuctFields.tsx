"use client";

import type { Plan } from "../../lib/noise/plan";
import { Icon } from "../marks/Icon";
import { changeOf } from "../plan/fieldSpec";
import type { PlannedSave } from "../plan/usePlannedSave";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { Checkbox } from "../ui/Checkbox";
import { FieldError } from "../ui/FieldFrame";
import { NineBandRow } from "../ui/NineBandRow";
import { QuantityField } from "../ui/QuantityField";
import type { PathElement } from "./elementWords";
import { LockedReason } from "./ElementFields";

type Duct = Extract<PathElement, { kind: "duct" }>;
type Piece = Duct["params"]["run"][number];

interface Props {
  element: Duct;
  save: PlanSave;
  planned: PlannedSave;
  /** Undefined for who may change. */
  lockedBecause?: string;
}

const MOST_PIECES = 24;

const runIn = (plan: Plan, id: string): Piece[] => {
  const element = plan.elements.find((one) => one.id === id);
  return element?.kind === "duct" ? element.params.run : [];
};

/** The run of a duct piece by piece, from the room to its far mouth. */
export function DuctFields({ element, save, planned, lockedBecause }: Props) {
  const { id, params } = element;
  const spot = `duct/${id}`;
  const setRun = (change: (run: Piece[]) => Piece[]) => void planned((plan) => changeOf("elements", id, { params: { run: change(runIn(plan, id)) } }), spot);
  const replace = (at: number, piece: Piece) => setRun((run) => run.map((one, index) => (index === at ? piece : one)));
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
      <ol className="grid gap-5">
        {params.run.map((piece, at) => (
          <li key={at} className="border-t border-rule pt-4">
            <div className="mb-2 flex flex-wrap items-center justify-between gap-2">
              <h3 className="text-part">{titleOf(piece, at)}</h3>
              <div className="flex gap-2">
                {at > 0 && <Button look="square" aria-label={`Move ${titleOf(piece, at)} towards the room`} icon={<Icon name="up" />} onClick={() => setRun((run) => swapped(run, at))} />}
                <Button look="square" aria-label={`Remove ${titleOf(piece, at)}`} icon={<Icon name="remove" />} onClick={() => setRun((run) => run.filter((_, index) => index !== at))} />
              </div>
            </div>
            <PieceFields piece={piece} onChange={(changed) => replace(at, changed)} />
          </li>
        ))}
      </ol>
      <FieldError id={spot} error={save.errorOf(spot)} />
      {params.run.length < MOST_PIECES && (
        <div className="flex flex-wrap gap-2">
          <Button icon={<Icon name="plus" />} onClick={() => setRun((run) => [{ kind: "silencer", il: new Array<null>(9).fill(null) }, ...run])}>
            Add a silencer
          </Button>
          <Button icon={<Icon name="plus" />} onClick={() => setRun((run) => [...run, { kind: "end", s: params.opening, flush: true }])}>
            Add an end
          </Button>
        </div>
      )}
    </div>
  );
}

const titleOf = ({ kind }: Piece, at: number) => `${at + 1}. ${kind === "silencer" ? "Silencer" : "End of the run"}`;

const swapped = (run: Piece[], at: number): Piece[] => run.map((piece, index) => (index === at ? run[at - 1]! : index === at - 1 ? run[at]! : piece));

function PieceFields({ piece, onChange }: { piece: Piece; onChange: (piece: Piece) => void }) {
  if (piece.kind === "silencer") {
    return (
      <NineBandRow
        label="What it holds back"
        unit="dB"
        min={0}
        max={100}
        values={piece.il}
        hint="From its data sheet. An empty band is not known, and what comes through it is then not weighed."
        onCommit={(il) => onChange({ ...piece, il: il.map((figure) => (typeof figure === "number" ? figure : null)) })}
      />
    );
  }
  return (
    <div className="grid items-end gap-x-5 gap-y-3 mid:grid-cols-2">
      <QuantityField quantity="smallArea" label="Free cross-section" value={piece.s} min={0.0001} max={10} onCommit={(s) => s !== null && onChange({ ...piece, s })} />
      <Checkbox label="Flush with a wall or ceiling" checked={piece.flush} onChange={(event) => onChange({ ...piece, flush: event.target.checked })} />
    </div>
  );
}

function LockedRun({ element: { params }, reason }: { element: Duct; reason: string }) {
  return (
    <>
      <ol className="mt-4 grid gap-1">
        {params.run.map((piece, at) => (
          <li key={at}>
            {titleOf(piece, at)}
            {piece.kind === "silencer" && `, holds back ${piece.il.map((figure) => figure ?? "?").join(", ")} dB`}
          </li>
        ))}
      </ol>
      <LockedReason reason={reason} />
    </>
  );
}
