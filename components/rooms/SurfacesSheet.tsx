"use client";

import type { FinishRecord } from "@/lib/noise/library";
import type { Surface } from "@/lib/noise/plan";
import type { Provenance } from "@/lib/noise/spectrum";
import { Icon } from "../marks/Icon";
import type { PlanChange } from "../plan/save";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { NineBandRow } from "../ui/NineBandRow";
import { QuantityField } from "../ui/QuantityField";
import { Select } from "../ui/Select";
import { FoldedSheet } from "../ui/FoldedSheet";
import { VisuallyHidden } from "../ui/VisuallyHidden";
import { AddSurface } from "./AddSurface";
import { boxAreas } from "./finishSets";
import { NameField } from "./NameField";
import type { Room } from "./room";
import { useQuantityWords } from "./useQuantityWords";

interface Props {
  room: Room;
  finishes: readonly FinishRecord[];
  save: PlanSave;
  /** A removal that can be undone. */
  onRemove: (surface: Surface) => void;
  onSurfaces: () => void;
}

const OWN = "";

/** What lines the room: finish and area of each surface, out of the library or with own coefficients. */
export function SurfacesSheet({ room, finishes, save, onRemove, onSurfaces }: Props) {
  const { space, surfaces } = room;
  const counted = space.absorption.kind === "surfaces";
  return (
    <FoldedSheet heading="Surfaces" says={counted ? "A change of any of them weighs at once." : undefined} className="mb-3 mid:mb-5">
      {!counted && (
        <div className="mb-4 flex flex-wrap items-center gap-x-4 gap-y-2 rounded-control border border-dashed border-edge p-3">
          <p className="min-w-0 flex-[1_1_14rem] text-ink2">
            {surfaces.length > 0 ? "Your nine figures count, so these are kept but not used." : "Your nine figures count. No surface is listed."}
          </p>
          {surfaces.length > 0 && <Button onClick={onSurfaces}>Use them again</Button>}
        </div>
      )}
      {surfaces.length === 0 && counted && (
        <p className="mb-4 text-ink2">Nothing lines this room, so nothing is known of it and it is not weighed. Choose a finish above, or add what is there.</p>
      )}
      <ul className={counted ? undefined : "opacity-75"}>
        {surfaces.map((surface, index) => (
          <SurfaceLine key={surface.id} surface={surface} first={index === 0} finishes={finishes} save={save} onRemove={() => onRemove(surface)} />
        ))}
      </ul>
      <Coverage room={room} />
      <AddSurface room={room} finishes={finishes} save={save} />
    </FoldedSheet>
  );
}

interface LineProps {
  surface: Surface;
  first: boolean;
  finishes: readonly FinishRecord[];
  save: PlanSave;
  onRemove: () => void;
}

/** Labels stand over the first line on wide screens; read aloud, every field has its own. */
const labelOf = (words: string, first: boolean) => <span className={first ? undefined : "mid:sr-only"}>{words}</span>;

function SurfaceLine({ surface, first, finishes, save, onRemove }: LineProps) {
  const spot = (field: string) => `${surface.id} ${field}`;
  const change = (field: string, patch: object) => void save.save({ act: "change", part: "surfaces", id: surface.id, patch: { ...patch } } as PlanChange, spot(field));
  const known = finishes.some(({ key }) => key === surface.finishKey);
  const choices = [...(known ? [] : [{ value: OWN, label: "Own coefficients" }]), ...finishes.map(({ key, name }) => ({ value: key, label: name }))];
  return (
    <li className="border-t border-rule py-3 first:border-t-0 first:pt-0">
      <div className="grid grid-cols-2 items-start gap-x-4 gap-y-2 mid:grid-cols-[minmax(0,1fr)_minmax(0,1.6fr)_8.5rem_2.5rem]">
        <NameField label={labelOf("Name", first)} value={surface.name} error={save.errorOf(spot("name"))} className="max-mid:col-span-2" onCommit={(name) => change("name", { name })} />
        <Select
          label={labelOf("Finish", first)}
          className="max-mid:col-span-2"
          choices={choices}
          value={known ? (surface.finishKey ?? OWN) : OWN}
          error={save.errorOf(spot("finish"))}
          onChange={(event) => event.target.value !== OWN && change("finish", { libraryKey: event.target.value })}
        />
        <QuantityField
          label={labelOf("Area", first)}
          quantity="area"
          steps={{ metric: 0.5, us: 5 }}
          min={0.01}
          max={10_000}
          value={surface.area}
          error={save.errorOf(spot("area"))}
          onCommit={(area) => area !== null && change("area", { area })}
        />
        <Button look="square" className={first ? "mt-6.5 max-mid:justify-self-end" : "mt-1.5 max-mid:mt-6.5 max-mid:justify-self-end"} onClick={onRemove} icon={<Icon name="remove" size={18} />}>
          <VisuallyHidden>Remove {surface.name}</VisuallyHidden>
        </Button>
      </div>
      {save.errorOf(spot("remove")) && <p className="mt-1 text-second font-semibold text-over">{save.errorOf(spot("remove"))}</p>}
      <details className="mt-1 text-second text-ink2">
        <summary className="inline-flex min-h-6 items-center underline underline-offset-3">
          Coefficients<VisuallyHidden> of {surface.name}</VisuallyHidden>
        </summary>
        <NineBandRow
          label="Absorption coefficient"
          className="mt-2"
          unit=""
          min={0}
          max={1.5}
          step={0.05}
          values={surface.alpha}
          hint={`${provenanceWords(surface.provenance)} Type over one and they are your figures.`}
          error={save.errorOf(spot("alpha"))}
          onCommit={(values) => change("alpha", { alpha: values.map((value) => (value === "silent" ? 0 : value)) })}
        />
      </details>
    </li>
  );
}

/** Where the figures are from, in one sentence. */
export function provenanceWords({ document, clause, memory }: Provenance): string {
  const said = clause ? `${document}, ${clause}` : document;
  return `${memory && !/from memory/i.test(said) ? "From memory: " : ""}${said}.`;
}

const NOTICEABLE = 0.05;

/** What the box has and the list does not: it would take nothing. */
function Coverage({ room: { space, surfaces } }: { room: Room }) {
  const say = useQuantityWords();
  if (!space.box || surfaces.length === 0) return null;
  const { walls, ceiling, floor } = boxAreas(space.box.size);
  const whole = walls + ceiling + floor;
  const listed = surfaces.reduce((sum, { area }) => sum + area, 0);
  const short = whole - listed;
  return (
    <p className="mt-2 text-second text-ink2">
      Walls, ceiling and floor of the box: {say("area", walls)}, {say("area", ceiling)} and {say("area", floor)}. Listed: {say("area", listed)}.
      {short > NOTICEABLE * whole && ` The other ${say("area", short)} take nothing until they are listed.`}
    </p>
  );
}
