"use client";

import { useState } from "react";
import type { Plan } from "@/lib/noise/plan";
import { Icon } from "../marks/Icon";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { newestOf } from "./AddRoom";
import { RemoveRoom } from "./RemoveRoom";
import type { Room } from "./room";
import { duplicateRoom, removeRoom } from "./roomChanges";

interface Props {
  plan: Plan;
  room: Room;
  projectId: string;
  save: PlanSave;
  onOpen: (spaceId: string) => void;
}

/** Copy the room, or take it away. */
export function RoomActs({ plan, room, projectId, save, onOpen }: Props) {
  const { space } = room;
  const [asking, setAsking] = useState(false);
  const spot = (act: string) => `${space.id} ${act}`;

  async function copy() {
    const before = new Set(plan.spaces.map(({ id }) => id));
    const saved = await save.save(duplicateRoom(room), spot("copy"));
    if (saved.kind === "saved") onOpen(newestOf(saved.answer, before));
  }

  async function remove() {
    const saved = await save.save(removeRoom(plan, space), spot("remove"));
    if (saved.kind !== "refused") setAsking(false);
  }

  return (
    <div className="flex flex-wrap items-center gap-2">
      <Button icon={<Icon name="plus" size={18} />} onClick={() => void copy()}>
        Copy this room
      </Button>
      <Button icon={<Icon name="remove" size={18} />} onClick={() => setAsking(true)}>
        Remove this room
      </Button>
      {save.errorOf(spot("copy")) && <p className="text-second font-semibold text-over">{save.errorOf(spot("copy"))}</p>}
      <RemoveRoom plan={plan} room={space} projectId={projectId} open={asking} error={save.errorOf(spot("remove"))} onRemove={() => void remove()} onClose={() => setAsking(false)} />
    </div>
  );
}
