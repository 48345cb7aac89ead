"use client";

import type { Plan } from "@/lib/noise/plan";
import type { PlanChange } from "../plan/save";
import { usePlannedSave } from "../plan/usePlannedSave";
import type { PlanSave } from "../plan/usePlanSave";
import { Disclosure } from "../ui/Disclosure";
import { Button } from "../ui/Button";
import { QuantityField } from "../ui/QuantityField";
import { Select } from "../ui/Select";
import { DrawBox } from "./DrawBox";
import { NameField } from "./NameField";
import { boxVolume, roomOf, volumeFollows, type Room, type Size } from "./room";
import { changeRoom, resize } from "./roomChanges";
import { useQuantityWords } from "./useQuantityWords";

interface Props {
  plan: Plan;
  room: Room;
  save: PlanSave;
}

const STEPS = { metric: 0.1, us: 0.5 };
const sides = ["Inside width", "Inside depth", "Height"] as const;

/** Name, size and volume of a room, and where it stands. */
export function RoomFields({ plan, room, save }: Props) {
  const { space } = room;
  const planned = usePlannedSave(save);
  /** Of the room that stands when its turn comes: width and depth, typed one after the other, are of one box. */
  const change = (field: string, changes: (now: Room, plan: Plan) => PlanChange[]) =>
    void planned((now) => {
      const standing = roomOf(now, space.id);
      return standing ? changes(standing, now) : [];
    }, `${space.id} ${field}`);
  const error = (field: string) => save.errorOf(`${space.id} ${field}`);
  const { box } = space;
  return (
    <div className="grid gap-5">
      <NameField label="Name" value={space.name} error={error("name")} onCommit={(name) => change("name", (now) => [changeRoom(now.space, { name })])} />
      {box ? (
        <div className="grid grid-cols-2 gap-4 mid:grid-cols-4">
          {sides.map((label, side) => (
            <QuantityField
              key={label}
              label={label}
              quantity="length"
              steps={STEPS}
              min={0.1}
              max={side === 2 ? 100 : 1000}
              value={box.size[side]}
              error={error(label)}
              onCommit={(value) => value !== null && change(label, (now) => resize(now, withSide((now.space.box ?? box).size, side, value)))}
            />
          ))}
          <VolumeField room={room} error={error("volume")} onChange={(volume) => change("volume", (now) => [changeRoom(now.space, { volume })])} />
        </div>
      ) : (
        <>
          <DrawBox onDraw={(size) => change("box", (now, standing) => resize(now, size, cornerOf(standing, now)))} error={error("box")} />
          <VolumeField room={room} error={error("volume")} onChange={(volume) => change("volume", (now) => [changeRoom(now.space, { volume })])} />
        </>
      )}
      <Disclosure summary="Where it stands">
        <div className="grid grid-cols-2 gap-4 pt-1 mid:grid-cols-4">
          <Select
            label="Building"
            className="col-span-2 mid:col-span-4"
            value={space.buildingId}
            choices={plan.buildings.map(({ id, name }) => ({ value: id, label: name }))}
            error={error("building")}
            onChange={({ target: { value } }) => change("building", (now) => [changeRoom(now.space, { buildingId: value })])}
          />
          {box &&
            (["West wall, east of nought", "South wall, north of nought", "Floor over ground"] as const).map((label, axis) => (
              <QuantityField
                key={label}
                label={label}
                quantity="length"
                steps={STEPS}
                min={axis === 2 ? -20 : -1000}
                max={axis === 2 ? 100 : 1000}
                value={box.at[axis]}
                error={error(label)}
                onCommit={(value) => value !== null && change(label, (now) => moveTo(now, axis, value))}
              />
            ))}
        </div>
      </Disclosure>
    </div>
  );
}

const withSide = (all: readonly number[], at: number, value: number) => all.map((one, index) => (index === at ? value : one)) as Size; // three stay three

function moveTo({ space }: Room, axis: number, value: number): PlanChange[] {
  const { box } = space;
  return box ? [changeRoom(space, { box: { ...box, at: withSide(box.at, axis, value) } })] : [];
}

/** South-west corner of the building and its lowest floor; nought where it is not drawn. */
function cornerOf({ buildings }: Plan, { building }: Room): Size {
  const drawn = buildings.find(({ id }) => id === building?.id);
  const outline = drawn?.footprint ?? [[0, 0]];
  return [Math.min(...outline.map(([x]) => x!)), Math.min(...outline.map(([, y]) => y!)), drawn?.floors[0] ?? 0];
}

function VolumeField({ room: { space }, error, onChange }: { room: Room; error?: string; onChange: (volume: number) => void }) {
  const say = useQuantityWords();
  const follows = volumeFollows(space);
  const own = space.box && boxVolume(space.box.size);
  return (
    <div>
      <QuantityField
        label="Volume"
        quantity="volume"
        steps={{ metric: 1, us: 10 }}
        min={0.5}
        max={100_000}
        value={space.volume}
        error={error}
        hint={own === null ? undefined : follows ? "Follows the size." : `Your figure; the box holds ${say("volume", own)}.`}
        onCommit={(volume) => volume !== null && onChange(volume)}
      />
      {own !== null && !follows && (
        <Button className="mt-2" onClick={() => onChange(own)}>
          Take the box’s
        </Button>
      )}
    </div>
  );
}
