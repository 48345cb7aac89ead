"use client";

import { useState } from "react";
import type { Plan, Receiver } from "@/lib/noise/plan";
import { countWords } from "../format";
import { Button } from "../ui/Button";
import { Checkbox } from "../ui/Checkbox";
import { Dialog } from "../ui/Dialog";
import { Select } from "../ui/Select";
import { moveInto, moveOut, placeChoices, roomChoices } from "./listenerPatches";
import { PlaceFields } from "./PlaceFields";
import { SavedText } from "../ui/SavedText";
import { Segments } from "./Segments";
import type { Edits } from "./useLimitEdits";

interface Props {
  plan: Plan;
  listener: Receiver;
  edits: Edits;
  onRemove: () => void;
}

/** Name, words and place of one listener. */
export function ListenerFields({ plan, listener, edits, onRemove }: Props) {
  const { id, kind } = listener;
  const rooms = roomChoices(plan);
  const error = (field: string) => edits.errorOf(id, field);
  return (
    <div className="grid gap-4">
      <div className="grid gap-4 mid:grid-cols-2">
        <SavedText label="Name" value={listener.name} most={120} needed error={error("name")} onCommit={(name) => void edits.listener(id, "name", () => ({ name }))} />
        <SavedText label="In a sentence" value={listener.says} most={120} error={error("says")} hint="Such as: what next door’s bedroom may hear." onCommit={(says) => void edits.listener(id, "says", () => ({ says }))} />
      </div>
      <div className="grid gap-4 mid:grid-cols-2">
        <Segments
          label="Where they listen"
          value={kind}
          choices={placeChoices(plan)}
          error={error("kind")}
          hint={rooms.length === 0 ? "No room is drawn yet." : undefined}
          onChoose={(next) => {
            if (next === "outdoor") void edits.listener(id, "kind", (_, now) => moveOut(now));
            else if (rooms[0]) void edits.listener(id, "kind", (_, now) => moveInto(now, rooms[0]!.value));
          }}
        />
        {kind === "room" && (
          <Select
            label="Room"
            value={listener.spaceId ?? ""}
            choices={listener.spaceId ? rooms : [{ value: "", label: "Choose a room" }, ...rooms]}
            error={error("spaceId")}
            onChange={({ target }) => target.value && void edits.listener(id, "spaceId", (_, now) => moveInto(now, target.value))}
          />
        )}
      </div>
      <PlaceFields key={id} position={listener.position} error={error("position")} onChange={(position) => void edits.listener(id, "position", () => ({ position }))} />
      {kind === "outdoor" && (
        <div className="grid gap-4 mid:grid-cols-2">
          <Segments
            label="On a fence’s line, which side"
            value={listener.side}
            choices={[
              { value: "studio", label: "The studio’s" },
              { value: "far", label: "The far side" },
            ]}
            error={error("side")}
            onChoose={(side) => void edits.listener(id, "side", () => ({ side }))}
          />
          <Checkbox label="On the face of a house" hint="Adds what the wall throws back, 3 dB." checked={listener.facade} onChange={({ target }) => void edits.listener(id, "facade", () => ({ facade: target.checked }))} className="self-end" />
        </div>
      )}
      <RemoveListener plan={plan} listener={listener} onRemove={onRemove} error={edits.errorOf(id, "remove")} />
    </div>
  );
}

function RemoveListener({ plan, listener, onRemove, error }: Pick<Props, "plan" | "listener" | "onRemove"> & { error?: string }) {
  const [asked, setAsked] = useState(false);
  const limits = plan.criteria.filter(({ receiverId }) => receiverId === listener.id).length;
  return (
    <div>
      <Button onClick={() => setAsked(true)}>Remove this listener</Button>
      {error && <p role="alert" className="mt-2 text-second font-semibold text-over">{error}</p>}
      <Dialog
        open={asked}
        heading="Remove this listener?"
        onClose={() => setAsked(false)}
        actions={
          <>
            <Button
              look="ink"
              onClick={() => {
                setAsked(false);
                onRemove();
              }}
            >
              Remove
            </Button>
            <Button onClick={() => setAsked(false)}>Keep</Button>
          </>
        }
      >
        <p className="wrap-anywhere">
          {listener.name} goes{limits > 0 ? `, and ${countWords(limits, "limit")} with it: words, figures and the night itself` : ""}. Nobody is weighed there any more.
        </p>
      </Dialog>
    </div>
  );
}
