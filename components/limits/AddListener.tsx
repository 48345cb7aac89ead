"use client";

import { useState, type FormEvent } from "react";
import type { CriterionRecord } from "@/lib/noise/library";
import type { Plan } from "@/lib/noise/plan";
import type { Saved } from "../plan/save";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { Select } from "../ui/Select";
import { TextField } from "../ui/TextField";
import { listenerValues, onTheFence, placeChoices, roomChoices, type NewListener } from "./listenerPatches";
import { PlaceFields } from "./PlaceFields";
import { Segments } from "./Segments";

const SPOT = "new listener";

interface Props {
  plan: Plan;
  save: PlanSave;
  records: readonly CriterionRecord[];
  onAdded: (id: string) => void;
}

/** The listener that was not there before. */
function addedIn(before: Plan, saved: Saved): string | undefined {
  if (saved.kind !== "saved") return undefined;
  return saved.answer.plan.receivers.find(({ id }) => !before.receivers.some((known) => known.id === id))?.id;
}

/** Where it is, with its first limit if one is chosen: both are one change. */
export function AddListener({ plan, save, records, onAdded }: Props) {
  const rooms = roomChoices(plan);
  const [listener, setListener] = useState<NewListener>(() => ({
    name: "",
    says: "",
    kind: rooms.length > 0 ? "room" : "outdoor",
    spaceId: rooms[0]?.value ?? null,
    position: onTheFence(plan),
    side: "far",
  }));
  const [libraryKey, setLibraryKey] = useState("");
  const [complaint, setComplaint] = useState<string>();
  const put = (part: Partial<NewListener>) => setListener((standing) => ({ ...standing, ...part }));
  const error = (field: string) => save.errorOf(SPOT, field);

  async function add(event: FormEvent) {
    event.preventDefault();
    const name = listener.name.trim();
    setComplaint(name ? undefined : "Give the listener a name.");
    if (!name) return;
    const values = listenerValues(plan, { ...listener, name, says: listener.says.trim() });
    const limit = { act: "add", part: "criteria", values: { libraryKey, receiverId: "new:listener" } } as const;
    const saved = await save.save([{ act: "add", part: "receivers", as: "new:listener", values }, ...(libraryKey ? [limit] : [])], SPOT);
    const id = addedIn(plan, saved);
    if (!id) return;
    put({ name: "", says: "" });
    onAdded(id);
  }

  return (
    <form onSubmit={add} className="grid gap-4" aria-label="A listener">
      <TextField label="Who or where" maxLength={120} value={listener.name} onChange={(event) => put({ name: event.target.value })} error={complaint ?? error("name")} hint="Such as: No. 9, bedroom." />
      <Segments
        label="Where they listen"
        value={listener.kind}
        choices={placeChoices(plan)}
        hint={rooms.length === 0 ? "No room is drawn yet. A room is drawn on the Rooms page; outdoors works at once." : undefined}
        onChoose={(kind) => put({ kind })}
      />
      {listener.kind === "room" ? (
        <Select label="Room" choices={rooms} value={listener.spaceId ?? ""} error={error("spaceId")} onChange={(event) => put({ spaceId: event.target.value })} />
      ) : (
        <PlaceFields position={listener.position} error={error("position")} onChange={(position) => put({ position })} />
      )}
      <Select
        label="Their limit"
        value={libraryKey}
        choices={[{ value: "", label: "Choose later" }, ...records.map(({ key, name }) => ({ value: key, label: name }))]}
        hint="Copied and frozen when chosen. Without one the listener is not weighed."
        onChange={(event) => setLibraryKey(event.target.value)}
      />
      <TextField label="In a sentence" maxLength={120} value={listener.says} onChange={(event) => put({ says: event.target.value })} error={error("says")} hint="May be left empty. Such as: next door’s bedroom." />
      <div>
        <Button look="ink" type="submit" disabled={save.saving}>
          Add the listener
        </Button>
        {save.errorOf(SPOT) && !error("name") && !error("spaceId") && !error("position") && !error("says") && (
          <p role="alert" className="mt-2 text-second font-semibold text-over">
            {save.errorOf(SPOT)}
          </p>
        )}
      </div>
    </form>
  );
}
