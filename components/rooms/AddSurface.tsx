"use client";

import { useState } from "react";
import type { FinishRecord } from "@/lib/noise/library";
import { Icon } from "../marks/Icon";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { QuantityField } from "../ui/QuantityField";
import { Select } from "../ui/Select";
import { boxAreas } from "./finishSets";
import type { Room } from "./room";

interface Props {
  room: Room;
  finishes: readonly FinishRecord[];
  save: PlanSave;
}

/** Another surface out of the library; it takes the area that is still open. */
export function AddSurface({ room: { space, surfaces }, finishes, save }: Props) {
  const [key, setKey] = useState(finishes[0]?.key ?? "");
  const [area, setArea] = useState<number | null>(null);
  const open = openArea({ space, surfaces });
  const spot = `${space.id} add surface`;
  const finish = finishes.find((one) => one.key === key);

  async function add() {
    if (!finish) return;
    const values = { spaceId: space.id, name: finish.name, libraryKey: key, area: area ?? open };
    const saved = await save.save({ act: "add", part: "surfaces", values }, spot);
    if (saved.kind === "saved") setArea(null);
  }

  return (
    <div className="mt-4 grid grid-cols-2 items-end gap-4 border-t border-rule pt-4 mid:grid-cols-[minmax(0,1fr)_8.5rem_auto]">
      <Select
        label="Another surface"
        className="max-mid:col-span-2"
        choices={finishes.map(({ key: value, name }) => ({ value, label: name }))}
        value={key}
        onChange={(event) => setKey(event.target.value)}
      />
      <QuantityField
        label="Its area"
        quantity="area"
        steps={{ metric: 0.5, us: 5 }}
        min={0.01}
        max={10_000}
        value={area ?? open}
        error={save.errorOf(spot)}
        onCommit={setArea}
      />
      <Button onClick={() => void add()} icon={<Icon name="plus" size={18} />}>
        Add it
      </Button>
    </div>
  );
}

/** What the box has beyond the list, m2; a square metre where that is nothing. */
function openArea({ space, surfaces }: Pick<Room, "space" | "surfaces">): number {
  if (!space.box) return 1;
  const { walls, ceiling, floor } = boxAreas(space.box.size);
  const open = walls + ceiling + floor - surfaces.reduce((sum, one) => sum + one.area, 0);
  return open >= 0.1 ? Math.round(open * 10) / 10 : 1;
}
