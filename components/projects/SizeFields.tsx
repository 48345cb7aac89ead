"use client";

import { QuantityField } from "../ui/QuantityField";
import { TextField } from "../ui/TextField";
import type { NewYard } from "./newYard";

interface Props {
  yard: NewYard;
  onChange: (change: Partial<NewYard>) => void;
  errors: Record<string, string>;
}

const steps = { metric: 0.1, us: 0.5 };
const pair = "grid grid-cols-2 gap-x-4 gap-y-3 mid:grid-cols-3";

interface FieldProps {
  label: string;
  value: number | null;
  bounds: readonly [number, number];
  error?: string;
  onCommit: (value: number | null) => void;
}

function Length({ bounds: [min, max], ...rest }: FieldProps) {
  return <QuantityField quantity="length" optional steps={steps} min={min} max={max} {...rest} />;
}

/** Lot, building and first room by their sizes; each may wait. */
export function SizeFields({ yard, onChange, errors }: Props) {
  const { lot, building, room } = yard;
  return (
    <>
      <fieldset>
        <legend className="mb-2 text-part font-semibold">The lot</legend>
        <div className={pair}>
          <Length label="Width, west to east" value={lot.width} bounds={[1, 500]} error={errors["lot.width"]} onCommit={(width) => onChange({ lot: { ...lot, width } })} />
          <Length label="Depth, south to north" value={lot.depth} bounds={[1, 500]} error={errors["lot.depth"]} onCommit={(depth) => onChange({ lot: { ...lot, depth } })} />
          <TextField label="Street" value={yard.street} maxLength={120} error={errors.street} className="col-span-2 mid:col-span-1" onChange={(event) => onChange({ street: event.target.value })} />
        </div>
      </fieldset>
      <fieldset>
        <legend className="mb-2 text-part font-semibold">The studio building</legend>
        <div className={pair}>
          <TextField label="Name" placeholder="Studio" value={yard.buildingName} maxLength={120} error={errors["building.name"]} className="col-span-2 mid:col-span-3" onChange={(event) => onChange({ buildingName: event.target.value })} />
          <Length label="Width outside" value={building.width} bounds={[0.5, 200]} error={errors["building.width"]} onCommit={(width) => onChange({ building: { ...building, width } })} />
          <Length label="Depth outside" value={building.depth} bounds={[0.5, 200]} error={errors["building.depth"]} onCommit={(depth) => onChange({ building: { ...building, depth } })} />
          <Length label="Height of the eaves" value={building.eaves} bounds={[0.5, 60]} error={errors["building.eaves"]} onCommit={(eaves) => onChange({ building: { ...building, eaves } })} />
        </div>
      </fieldset>
      <fieldset>
        <legend className="mb-2 text-part font-semibold">The first room</legend>
        <div className={pair}>
          <TextField label="Name" placeholder="Live room" value={yard.roomName} maxLength={120} error={errors["room.name"]} className="col-span-2 mid:col-span-3" onChange={(event) => onChange({ roomName: event.target.value })} />
          <Length label="Width inside" value={room.width} bounds={[0.5, 100]} error={errors["room.width"]} onCommit={(width) => onChange({ room: { ...room, width } })} />
          <Length label="Depth inside" value={room.depth} bounds={[0.5, 100]} error={errors["room.depth"]} onCommit={(depth) => onChange({ room: { ...room, depth } })} />
          <Length label="Height inside" value={room.height} bounds={[0.5, 30]} error={errors["room.height"]} onCommit={(height) => onChange({ room: { ...room, height } })} />
        </div>
      </fieldset>
    </>
  );
}
