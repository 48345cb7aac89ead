"use client";

import { useState } from "react";
import { Icon } from "../marks/Icon";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { NineBandRow } from "../ui/NineBandRow";
import { FoldedSheet } from "../ui/FoldedSheet";
import { TextField } from "../ui/TextField";
import { VisuallyHidden } from "../ui/VisuallyHidden";
import { NameField } from "./NameField";
import type { BySurfaces, Room } from "./room";
import { changeRoom } from "./roomChanges";

interface Props {
  room: Room;
  absorption: BySurfaces;
  save: PlanSave;
  /** A removal that can be undone. */
  onRemove: (index: number) => void;
}

/** People, a sofa, a mattress: what stands in the room and takes sound, as typed figures. */
export function ObjectsSheet({ room: { space }, absorption, save, onRemove }: Props) {
  const { objects } = absorption;
  const [name, setName] = useState("");
  const store = (next: BySurfaces["objects"], field: string) =>
    save.save(changeRoom(space, { absorption: { ...absorption, objects: next } }), `${space.id} ${field}`);
  const change = (at: number, patch: Partial<BySurfaces["objects"][number]>, field: string) =>
    void store(objects.map((one, index) => (index === at ? { ...one, ...patch } : one)), `${field} ${at}`);

  async function add() {
    const typed = name.trim();
    if (!typed) return;
    const saved = await store([...objects, { name: typed, area: new Array<number>(9).fill(0) }], "add object");
    if (saved.kind === "saved") setName("");
  }

  return (
    <FoldedSheet heading="People and things" says="Each takes an area of its own, in square metres that swallow everything." className="mb-3 mid:mb-5">
      <ul>
        {objects.map((object, index) => (
          <li key={index} className="border-t border-rule py-3 first:border-t-0 first:pt-0">
            <div className="mb-2 flex items-end gap-4">
              <NameField label="Name" value={object.name} className="flex-auto" error={save.errorOf(`${space.id} name ${index}`)} onCommit={(typed) => change(index, { name: typed }, "name")} />
              <Button look="square" onClick={() => onRemove(index)} icon={<Icon name="remove" size={18} />}>
                <VisuallyHidden>Remove {object.name}</VisuallyHidden>
              </Button>
            </div>
            <NineBandRow
              label={`Absorption area of ${object.name}`}
              unit="m²"
              min={0}
              max={10_000}
              step={0.1}
              values={object.area}
              error={save.errorOf(`${space.id} area ${index}`)}
              onCommit={(values) => change(index, { area: values.map((value) => (value === "silent" ? 0 : value)) }, "area")}
            />
          </li>
        ))}
      </ul>
      <p className="text-second text-ink2">
        We have read no source for people or a sofa, so none is filled in. Type what you have measured or read; nought takes nothing, empty is not known.
      </p>
      <form
        className="mt-4 grid items-end gap-4 border-t border-rule pt-4 mid:grid-cols-[minmax(0,1fr)_auto]"
        onSubmit={(event) => {
          event.preventDefault();
          void add();
        }}
      >
        <TextField label="Another, such as “two people”" value={name} maxLength={120} autoComplete="off" error={save.errorOf(`${space.id} add object`)} onChange={(event) => setName(event.target.value)} />
        <Button type="submit" icon={<Icon name="plus" size={18} />}>
          Add it
        </Button>
      </form>
    </FoldedSheet>
  );
}
