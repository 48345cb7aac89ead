"use client";

import { useState } from "react";
import { Button } from "../ui/Button";
import { Select } from "../ui/Select";
import { Sheet } from "../ui/Sheet";
import { addFromLibrary, addWithoutFigures, firstRoomOf, placeIn } from "./changes";
import { placementOf, type SourceDesk } from "./desk";
import { Line } from "./SourceLibrary";
import { loudestBand } from "./spectrum";

interface Props {
  desk: SourceDesk;
  onDone: () => void;
}

/** One press puts a record of the library in a room or in the yard; it plays in every situation until told otherwise. */
export function AddSource({ desk, onDone }: Props) {
  const { plan } = desk.answer;
  const [spaceId, setSpaceId] = useState(firstRoomOf(plan) ?? "");
  const [kind, setKind] = useState<string>(desk.kinds[0]?.name ?? "");
  const placeOf = (name: string) => (placementOf(desk, name) === "room" ? placeIn(plan, spaceId || null) : { spaceId: null, position: null });

  async function add(changes: Parameters<SourceDesk["act"]>[0]) {
    if (await desk.act(changes, "add")) onDone();
  }

  const bare = desk.kinds.find(({ name }) => name === kind);
  const refusal = desk.save.errorOf("add");
  const records = desk.library.filter((record) => record.kind === kind);
  const indoors = placementOf(desk, kind) === "room" && plan.spaces.length > 0;
  return (
    <Sheet id="add-source" heading="Add a source" says="It plays in every situation until you say otherwise. Figures of the library are estimates: measure your own." className="mb-5">
      <div className="mb-4 grid max-w-[44rem] gap-4 mid:grid-cols-2">
        <Select label="What it is" value={kind} choices={desk.kinds.map(({ name, label }) => ({ value: name, label }))} onChange={(event) => setKind(event.target.value)} />
        {indoors && (
          <Select label="It stands in" value={spaceId} choices={plan.spaces.map(({ id, name }) => ({ value: id, label: name }))} onChange={(event) => setSpaceId(event.target.value)} />
        )}
      </div>
      <ul className="border-t-2 border-ink">
        {records.map((record) => (
          <Line
            key={record.key}
            name={record.name}
            figures={record}
            doubt={record.deviation?.[loudestBand(record.power) ?? 1] ?? undefined}
            beside={
              <Button aria-label={`Add ${record.name}`} onClick={() => void add((now) => addFromLibrary(now, record, placeOf(record.kind)))}>
                Add
              </Button>
            }
          />
        ))}
      </ul>
      <div className="mt-4 flex flex-wrap gap-2">
        {bare && <Button onClick={() => void add((now) => addWithoutFigures(now, bare, placeOf(bare.name)))}>Add one without figures, to measure or type</Button>}
        <Button onClick={onDone}>Close</Button>
      </div>
      {refusal && <p className="mt-3 text-second font-semibold text-over">{refusal}</p>}
    </Sheet>
  );
}
