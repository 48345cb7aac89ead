"use client";

import { useState, type FormEvent } from "react";
import type { Building, Plan } from "@/lib/noise/plan";
import type { Answer } from "../state/plan";
import type { PlanSave } from "../plan/usePlanSave";
import { Button, LinkButton } from "../ui/Button";
import { QuantityField } from "../ui/QuantityField";
import { Select } from "../ui/Select";
import { Sheet } from "../ui/Sheet";
import { TextField } from "../ui/TextField";
import type { Size } from "./room";
import { addRoom } from "./roomChanges";

interface Props {
  plan: Plan;
  save: PlanSave;
  yardHref: string;
  onAdded: (spaceId: string) => void;
  onClose: () => void;
}

const SPOT = "add room";
const USUAL: Size = [4, 3, 2.4];
const sides = ["Inside width", "Inside depth", "Height"] as const;

/** A room into one of the buildings. It comes bare, and says so. */
export function AddRoom({ plan, save, yardHref, onAdded, onClose }: Props) {
  const { buildings } = plan;
  const [name, setName] = useState("");
  const [buildingId, setBuilding] = useState((buildings.find(({ role }) => role === "studio") ?? buildings[0])?.id ?? "");
  const [size, setSize] = useState<Size>(USUAL);
  const building = buildings.find(({ id }) => id === buildingId);

  async function add(event: FormEvent) {
    event.preventDefault();
    if (!building) return;
    const before = new Set(plan.spaces.map(({ id }) => id));
    const saved = await save.save(addRoom({ name: name.trim() || "Room", buildingId, at: freeCorner(plan, building, size), size }), SPOT);
    if (saved.kind === "saved") onAdded(newestOf(saved.answer, before));
  }

  if (!building) {
    return (
      <Sheet heading="A room stands in a building" className="mb-5">
        <p className="mb-3 text-ink2">There is no building yet. Draw the studio and the house next door in the yard, then come back.</p>
        <LinkButton href={yardHref}>To the yard</LinkButton>
      </Sheet>
    );
  }
  return (
    <Sheet heading="Add a room" says="It comes bare: board on studs and a concrete floor. Change that when it is there." className="mb-5">
      <form onSubmit={(event) => void add(event)} className="grid gap-4">
        <div className="grid gap-4 mid:grid-cols-2">
          <TextField label="Name" value={name} maxLength={120} autoComplete="off" placeholder="Room" error={save.errorOf(SPOT)} onChange={(event) => setName(event.target.value)} />
          <Select label="Building" choices={buildings.map(({ id, name: label }) => ({ value: id, label }))} value={buildingId} onChange={(event) => setBuilding(event.target.value)} />
        </div>
        <div className="grid grid-cols-2 gap-4 mid:grid-cols-3">
          {sides.map((label, side) => (
            <QuantityField
              key={label}
              label={label}
              quantity="length"
              steps={{ metric: 0.1, us: 0.5 }}
              min={0.5}
              max={100}
              value={size[side]}
              onCommit={(value) => value !== null && setSize((old) => old.map((one, index) => (index === side ? value : one)) as Size)}
            />
          ))}
        </div>
        <div className="flex flex-wrap gap-2">
          <Button look="ink" type="submit">
            Add it
          </Button>
          <Button onClick={onClose}>Not now</Button>
        </div>
      </form>
    </Sheet>
  );
}

export const newestOf = ({ plan }: Answer, before: ReadonlySet<string>): string =>
  plan.spaces.find(({ id }) => !before.has(id))?.id ?? plan.spaces[0]!.id;

const GAP = 0.2;

/** East of the rooms that stand where there is room for it, else the south-west corner of the building. */
function freeCorner({ spaces }: Plan, building: Building, [width]: Size): Size {
  const outline = building.footprint ?? [[0, 0]];
  const [west, south] = [Math.min(...outline.map(([x]) => x!)), Math.min(...outline.map(([, y]) => y!))];
  const taken = spaces.flatMap(({ buildingId, box }) => (buildingId === building.id && box ? [box.at[0] + box.size[0]] : []));
  const beside = taken.length > 0 ? Math.max(...taken) + GAP : west;
  const east = Math.max(...outline.map(([x]) => x!));
  return [beside + width <= east ? Math.round(beside * 100) / 100 : west, south, building.floors[0] ?? 0];
}
