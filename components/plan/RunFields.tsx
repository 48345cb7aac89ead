"use client";

import type { DuctPiece } from "../../lib/noise/ducts/run";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { Checkbox } from "../ui/Checkbox";
import { FieldError } from "../ui/FieldFrame";
import { NineBandRow } from "../ui/NineBandRow";
import { QuantityField } from "../ui/QuantityField";

interface Props {
  run: readonly DuctPiece[];
  /** Where the run begins: "the room", "the fan". */
  from: string;
  /** Free cross-section a new end has, m². */
  mouth: number;
  spot: string;
  error?: string;
  /** Says what becomes of the run that stands when the change is sent. */
  onChange: (change: (run: readonly DuctPiece[]) => DuctPiece[]) => void;
}

const MOST_PIECES = 24;

/** Pieces of a duct one after the other, from where it begins to its far mouth. */
export function RunFields({ run, from, mouth, spot, error, onChange }: Props) {
  return (
    <>
      {run.length > 0 && (
        <ol className="grid gap-5">
          {run.map((piece, at) => (
            <li key={at} className="border-t border-rule pt-4">
              <div className="mb-2 flex flex-wrap items-center justify-between gap-2">
                <h3 className="text-part">{pieceTitle(piece, at)}</h3>
                <div className="flex gap-2">
                  {at > 0 && <Button look="square" aria-label={`Move ${pieceTitle(piece, at)} towards ${from}`} icon={<Icon name="up" />} onClick={() => onChange((standing) => swapped(standing, at))} />}
                  <Button look="square" aria-label={`Remove ${pieceTitle(piece, at)}`} icon={<Icon name="remove" />} onClick={() => onChange((standing) => standing.filter((_, index) => index !== at))} />
                </div>
              </div>
              <PieceFields piece={piece} onChange={(changed) => onChange((standing) => standing.map((one, index) => (index === at ? changed : one)))} />
            </li>
          ))}
        </ol>
      )}
      <FieldError id={spot} error={error} />
      {run.length < MOST_PIECES && (
        <div className="flex flex-wrap gap-2">
          <Button icon={<Icon name="plus" />} onClick={() => onChange((standing) => [{ kind: "silencer", il: new Array<null>(9).fill(null) }, ...standing])}>
            Add a silencer
          </Button>
          <Button icon={<Icon name="plus" />} onClick={() => onChange((standing) => [...standing, { kind: "end", s: mouth, flush: true }])}>
            Add an end
          </Button>
        </div>
      )}
    </>
  );
}

export const pieceTitle = ({ kind }: DuctPiece, at: number) => `${at + 1}. ${kind === "silencer" ? "Silencer" : "End of the run"}`;

const swapped = (run: readonly DuctPiece[], at: number): DuctPiece[] => run.map((piece, index) => (index === at ? run[at - 1]! : index === at - 1 ? run[at]! : piece));

function PieceFields({ piece, onChange }: { piece: DuctPiece; onChange: (piece: DuctPiece) => void }) {
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
