"use client";

import { useState } from "react";
import type { Incidence, Plan } from "@/lib/noise/plan";
import type { Source } from "@/lib/noise/sources";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { NineBandRow } from "../ui/NineBandRow";
import { NumberField } from "../ui/NumberField";
import { Select } from "../ui/Select";
import { spreadShape } from "./changes";
import type { SourceDesk } from "./desk";
import { BandTexts } from "./Levels";
import { provenanceWords } from "./sourceWords";

interface Props {
  desk: SourceDesk;
  source: Source;
}

/** Elements that face outdoors and have no level of this source yet, with the room behind each. */
function facesLeft({ elements, paths, spaces, incidences }: Plan, sourceId: string) {
  const given = new Set(incidences.filter((one) => one.sourceId === sourceId).map(({ elementId }) => elementId));
  return elements.flatMap((element) => {
    const path = paths.find(({ id }) => id === element.pathId);
    const room = spaces.find(({ id }) => id === path?.fromSpaceId);
    return path?.toSpaceId === null && room && !given.has(element.id) ? [{ element, room }] : [];
  });
}

/** A distant source as the levels that arrive at walls and openings, free of the wall's own reflection. */
export function ArrivingLevels({ desk, source }: Props) {
  const { plan } = desk.answer;
  const given = plan.incidences.filter(({ sourceId }) => sourceId === source.id);
  return (
    <>
      <h2 className="break-words text-section">{source.name}, as it arrives</h2>
      <p className="mt-1 max-w-[60ch] text-second text-ink2">
        Levels at each wall or opening, free of its own reflection: a reading two metres in front of a wall is 3 dB more than what belongs here (solver method, section 6).
      </p>
      {given.length === 0 && <p className="mt-3 font-semibold">Given at no wall yet, so what it adds is not known.</p>}
      <ul className="mt-3 grid gap-5">
        {given.map((incidence) => (
          <li key={incidence.id} className="border-t border-rule pt-3">
            <Arriving desk={desk} incidence={incidence} />
          </li>
        ))}
      </ul>
      {!desk.locked && <AddArriving desk={desk} source={source} />}
    </>
  );
}

function Arriving({ desk, incidence }: { desk: SourceDesk; incidence: Incidence }) {
  const { id, elementId, levels } = incidence;
  const name = desk.answer.plan.elements.find((element) => element.id === elementId)?.name ?? "An element";
  if (desk.locked)
    return (
      <>
        <p className="break-words font-semibold">{name}</p>
        <BandTexts levels={levels} />
      </>
    );
  const { id: _, ...values } = incidence;
  const undo = { words: `No level at ${name} any more.`, changes: () => [{ act: "add" as const, part: "incidences", values }] };
  return (
    <>
      <NineBandRow
        label={name}
        unit="dB"
        min={-100}
        max={160}
        silence
        values={levels}
        error={desk.save.errorOf(id, "levels") ?? desk.save.errorOf(id)}
        errorOf={(band) => desk.save.errorOf(id, `levels.${band}`)}
        onCommit={(next) => void desk.act(() => [{ act: "change", part: "incidences", id, patch: { levels: next } }], id)}
      />
      <Button className="mt-2" icon={<Icon name="remove" size={18} />} onClick={() => void desk.act(() => [{ act: "remove", part: "incidences", id }], id, undo)}>
        No level here
      </Button>
    </>
  );
}

/** One figure in dB(A), spread over the bands by the library's shape, at one wall or at all outer faces of a room. */
function AddArriving({ desk, source }: Props) {
  const left = facesLeft(desk.answer.plan, source.id);
  const rooms = [...new Map(left.map(({ room }) => [room.id, room])).values()];
  const shape = desk.library.find(({ kind, shape: bands }) => kind === source.kind && bands)?.shape;
  const record = desk.library.find(({ shape: bands }) => bands === shape);
  const [chosen, setChosen] = useState("");
  const [level, setLevel] = useState<number | null>(null);
  const at = left.filter(({ element, room }) => chosen === element.id || chosen === `room ${room.id}`);
  const spot = `arriving ${source.id}`;
  if (left.length === 0) return <p className="mt-4 text-second text-ink2">Every outer wall and opening has a level.</p>;
  async function add() {
    const levels = shape && level !== null ? spreadShape(shape, level, desk.aWeights) : new Array<null>(9).fill(null);
    const saved = await desk.act(() => at.map(({ element }) => ({ act: "add", part: "incidences", values: { sourceId: source.id, elementId: element.id, levels } })), spot);
    if (saved) setChosen("");
  }
  return (
    <div className="mt-5 border-t-2 border-ink pt-4">
      <h3 className="text-part">Add a level</h3>
      <div className="mt-2 grid items-start gap-4 mid:grid-cols-2">
        <Select
          label="Where it arrives"
          value={at.length > 0 ? chosen : ""}
          choices={[
            { value: "", label: "Choose a wall or opening" },
            ...rooms.map(({ id, name }) => ({ value: `room ${id}`, label: `${name}: all outer faces` })),
            ...left.map(({ element, room }) => ({ value: element.id, label: `${room.name}: ${element.name}` })),
          ]}
          onChange={(event) => setChosen(event.target.value)}
        />
        <NumberField label="Level there" unit="dB(A)" min={0} max={120} optional value={level} hint={shape ? "Spread over the bands by the shape below; empty leaves nine fields to fill." : undefined} onCommit={setLevel} />
      </div>
      {record && <p className="mt-2 text-second text-ink2">Shape: {provenanceWords(record)}.</p>}
      <Button look="ink" className="mt-3" reason={at.length === 0 ? "Choose where it arrives first." : undefined} onClick={() => void add()}>
        Add
      </Button>
      {desk.save.errorOf(spot) && <p className="mt-2 text-second font-semibold text-over">{desk.save.errorOf(spot)}</p>}
    </div>
  );
}
