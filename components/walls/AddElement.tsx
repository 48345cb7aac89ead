"use client";

import { useState, type FormEvent } from "react";
import type { Plan } from "../../lib/noise/plan";
import { capitalise, formatQuantity, withUnit } from "../format";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { FieldError } from "../ui/FieldFrame";
import { QuantityField } from "../ui/QuantityField";
import { Select } from "../ui/Select";
import { TextField } from "../ui/TextField";
import { faceOf, FACES, faceWords, type Face } from "./faces";
import { areaOfDraft, boundaryName, isSurface, placeOfDraft, sizeOfDraft, type Draft, type ElementKindName } from "./newElement";

/** A kind of element and what of the catalogue it may be made of. */
export interface KindChoice {
  name: string;
  label: string;
  constructed: boolean;
  constructions: readonly { key: string; name: string }[];
}

interface Props {
  plan: Plan;
  kinds: readonly KindChoice[];
  error?: string;
  saving: boolean;
  /** The boundary it was put in; undefined where it was refused. */
  onAdd: (draft: Draft) => Promise<string | undefined>;
}

const NEW = "new";
const OUTDOORS = "outdoors";

function emptyDraft(plan: Plan): Draft {
  const studio = plan.buildings.find(({ role }) => role === "studio");
  const room = plan.spaces.find(({ buildingId }) => buildingId === studio?.id) ?? plan.spaces[0];
  return {
    pathId: null, fromSpaceId: room?.id ?? "", toSpaceId: null, pathName: "", kind: "wall", name: "", face: "east",
    width: null, height: null, along: null, up: null, area: null, catalogueKey: null,
  };
}

/** Figures that follow from face, kind and boundary are counted anew when one of these changes. */
const COUNTED = { width: null, height: null, along: null, up: null, area: null } as const;

/** Adds a wall, a roof or an opening: what it stands between, what it is, where, and what it is made of. */
export function AddElement({ plan, kinds, error, saving, onAdd }: Props) {
  const [draft, setDraft] = useState(() => emptyDraft(plan));
  /** Counted up to start the number fields afresh. */
  const [round, setRound] = useState(0);
  const [complaint, setComplaint] = useState<string>();
  const change = (patch: Partial<Draft>) => setDraft((before) => ({ ...before, ...patch }));
  const begin = (patch: Partial<Draft>) => {
    change({ ...COUNTED, ...patch });
    setRound((before) => before + 1);
  };
  const kind = kinds.find(({ name }) => name === draft.kind);
  const toOutdoors = draft.toSpaceId === null;
  const room = plan.spaces.find(({ id }) => id === draft.fromSpaceId);
  const area = areaOfDraft(plan, draft);

  async function submit(event: FormEvent) {
    event.preventDefault();
    const missing = draft.name.trim() === "" ? "Give it a name first." : area === null ? "Type its area first." : undefined;
    setComplaint(missing);
    if (missing || saving) return;
    const pathId = await onAdd(draft);
    // What stands beside it is in the same boundary, not in a second one of the same name.
    if (pathId) begin({ name: "", catalogueKey: null, pathId, pathName: "" });
  }

  if (plan.spaces.length === 0) return <p className="text-second text-ink2">A wall stands between a room and something else. Add a room first, on the page of the rooms.</p>;
  return (
    <form onSubmit={(event) => void submit(event)} noValidate>
      <div className="grid gap-x-5 gap-y-4 mid:grid-cols-2 desk:grid-cols-3">
        <Select
          label="It stands in"
          value={draft.pathId ?? NEW}
          choices={[{ value: NEW, label: "a new boundary" }, ...plan.paths.map(({ id, name }) => ({ value: id, label: name }))]}
          onChange={(event) => begin(chooseBoundary(plan, event.target.value, draft))}
        />
        {draft.pathId === null && (
          <>
            <Select label="From room" value={draft.fromSpaceId} choices={plan.spaces.map(({ id, name }) => ({ value: id, label: name }))} onChange={(event) => begin({ fromSpaceId: event.target.value, ...(draft.toSpaceId === event.target.value && { toSpaceId: null }) })} />
            <Select
              label="To"
              value={draft.toSpaceId ?? OUTDOORS}
              choices={[{ value: OUTDOORS, label: "outdoors" }, ...plan.spaces.filter(({ id }) => id !== draft.fromSpaceId).map(({ id, name }) => ({ value: id, label: name }))]}
              onChange={(event) => begin({ toSpaceId: event.target.value === OUTDOORS ? null : event.target.value })}
            />
            <TextField label="Name of the boundary" maxLength={120} value={draft.pathName} placeholder={boundaryName(plan, draft)} autoComplete="off" onChange={(event) => change({ pathName: event.target.value })} />
          </>
        )}
        <Select
          label="Kind"
          value={draft.kind}
          choices={kinds.map(({ name, label }) => ({ value: name, label }))}
          onChange={(event) => begin({ kind: event.target.value as ElementKindName, catalogueKey: null, ...(event.target.value === "roof" && { face: "roof" as const }), ...(draft.face === "roof" && event.target.value !== "roof" && { face: "east" as const }) })}
        />
        <TextField label="Name" maxLength={120} value={draft.name} autoComplete="off" placeholder={capitalise(nameFor(draft, kind))} onChange={(event) => change({ name: event.target.value })} />
        {toOutdoors && (
          <Select
            label="It faces"
            value={draft.face ?? ""}
            choices={[...FACES.map((face) => ({ value: face, label: faceWords[face] })), { value: "", label: "not known yet" }]}
            onChange={(event) => begin({ face: event.target.value === "" ? null : (event.target.value as Face) })}
          />
        )}
        <SizeFields key={round} plan={plan} draft={draft} placed={toOutdoors && draft.face !== null && room?.box != null} onChange={change} />
        {kind?.constructed && (
          <Select
            label="Made of"
            className="mid:col-span-2"
            value={draft.catalogueKey ?? ""}
            choices={[{ value: "", label: "not chosen yet: what it stops is not known" }, ...kind.constructions.map(({ key, name }) => ({ value: key, label: name }))]}
            onChange={(event) => change({ catalogueKey: event.target.value || null })}
          />
        )}
      </div>
      <p className="mt-3 text-second text-ink2" role="status">
        {placeWords(plan, draft, toOutdoors, room?.box != null)}
      </p>
      {draft.kind === "duct" && (
        <p className="mt-2 text-second text-ink2">It begins with a silencer of which no band is known, and an end flush with the wall; give their figures on its page. A room that is sealed needs fresh air: do not leave its duct out to gain decibels.</p>
      )}
      <div className="mt-4">
        <Button type="submit" look="ink" icon={<Icon name="plus" />}>
          {saving ? "Adding" : "Add it"}
        </Button>
        <FieldError id="add-element" error={complaint ?? error} />
      </div>
    </form>
  );
}

/** A boundary that stands says what is on both sides, and what stands in it where it faces. */
function chooseBoundary(plan: Plan, value: string, draft: Draft): Partial<Draft> {
  const path = plan.paths.find(({ id }) => id === value);
  if (!path) return { pathId: null, pathName: "" };
  const faces = plan.elements.filter(({ pathId }) => pathId === path.id).map(({ normal }) => faceOf(normal));
  const face = faces.find((one) => one !== null) ?? draft.face;
  return { pathId: path.id, fromSpaceId: path.fromSpaceId, toSpaceId: path.toSpaceId, face };
}

const nameFor = ({ face, kind }: Draft, choice?: KindChoice): string =>
  kind === "wall" && face && face !== "roof" ? `${face} wall` : (choice?.label ?? "name");

interface SizeProps {
  plan: Plan;
  draft: Draft;
  placed: boolean;
  onChange: (patch: Partial<Draft>) => void;
}

function SizeFields({ plan, draft, placed, onChange }: SizeProps) {
  const size = sizeOfDraft(plan, draft);
  const hole = draft.kind === "leak" || draft.kind === "duct";
  return (
    <>
      {!hole && (
        <>
          <QuantityField quantity="length" label="Width" value={size?.[0] ?? null} min={0.001} max={1000} optional steps={{ metric: 0.1, us: 0.5 }} onCommit={(width) => onChange({ width, ...(isSurface(draft.kind) ? {} : { area: null }) })} />
          <QuantityField quantity="length" label={draft.face === "roof" ? "Depth" : "Height"} value={size?.[1] ?? null} min={0.001} max={1000} optional steps={{ metric: 0.1, us: 0.5 }} onCommit={(height) => onChange({ height, ...(isSurface(draft.kind) ? {} : { area: null }) })} />
        </>
      )}
      <QuantityField quantity={hole ? "smallArea" : "area"} label={hole ? (draft.kind === "leak" ? "Open area" : "Cross-section of the mouth") : "Area"} value={areaOfDraft(plan, draft)} min={0.0001} max={10_000} optional hint={isSurface(draft.kind) && placed ? "Of a face without its openings." : undefined} onCommit={(area) => onChange({ area })} />
      {placed && (
        <>
          <QuantityField quantity="length" label={`Centre along the face, from the ${draft.face === "east" || draft.face === "west" ? "south" : "west"}`} value={draft.along} min={-100} max={1000} optional hint="Empty is the middle." onCommit={(along) => onChange({ along })} />
          <QuantityField quantity="length" label={draft.face === "roof" ? "Centre, from the south" : "Centre over the floor"} value={draft.up} min={-20} max={1000} optional hint={draft.face === "roof" ? "Empty is the middle." : "Empty is where such a thing usually is."} onCommit={(up) => onChange({ up })} />
        </>
      )}
    </>
  );
}

function placeWords(plan: Plan, draft: Draft, toOutdoors: boolean, drawn: boolean): string {
  if (!toOutdoors) return "Between two rooms no place is needed.";
  const place = placeOfDraft(plan, draft);
  if (place) return `Its centre is then at ${place.map((metre) => formatQuantity(metre, 2)).join(", ").concat(withUnit("", "m"))} (east, north, up), and it looks ${draft.face === "roof" ? "up" : (draft.face ?? "")}.`;
  return drawn ? "Without a face its sound has no way through the yard: it cannot be weighed for listeners outside." : "The room has not been drawn yet: give its place on the page of this element afterwards.";
}
