"use client";

import { formatQuantity, withUnit } from "../format";
import type { Source } from "@/lib/noise/sources";
import { SavedText } from "../ui/SavedText";
import { NumberField } from "../ui/NumberField";
import { Select } from "../ui/Select";
import { placeIn } from "./changes";
import { kindLabel, placementOf, spotOf, type SourceDesk } from "./desk";
import { PositionFields } from "./PositionFields";
import { whereWords } from "./sourceWords";

interface Props {
  desk: SourceDesk;
  source: Source;
}

const NOWHERE = "";

/** What a source is called, what it is, and where it stands. Each field saves when it is left. */
export function SourceFields({ desk, source }: Props) {
  const { save, act, kinds } = desk;
  const { plan } = desk.answer;
  const spot = spotOf(source);
  const placement = placementOf(desk, source.kind);
  const change = (patch: Record<string, unknown>) => void act(() => [{ act: "change", part: "sources", id: source.id, patch }], spot);
  const error = (field: string) => save.errorOf(spot, field);
  if (desk.locked) return <LockedFields {...{ desk, source }} />;
  return (
    <div className="grid gap-4">
      <SavedText label="Name" value={source.name} most={120} needed error={error("name")} onCommit={(name) => change({ name })} />
      <SavedText
        label="What the sentence calls it"
        value={source.says}
        most={120}
        hint={source.says ? undefined : "As in “your kit will be 6 dB under”."}
        error={error("says")}
        onCommit={(says) => change({ says })}
      />
      <Select
        label="Kind"
        value={source.kind}
        choices={kinds.filter((kind) => kind.placement === placement).map(({ name, label }) => ({ value: name, label }))}
        error={error("kind")}
        onChange={(event) => change({ kind: event.target.value })}
      />
      {placement === "room" && (
        <Select
          label="Stands in"
          value={source.spaceId ?? NOWHERE}
          choices={[
            ...(source.spaceId === null ? [{ value: NOWHERE, label: "No room yet" }] : []),
            ...plan.spaces.map(({ id, name }) => ({ value: id, label: name })),
          ]}
          error={error("spaceId")}
          onChange={(event) => change(placeIn(plan, event.target.value || null))}
        />
      )}
      {(placement === "room" || placement === "outdoor") && (
        <PositionFields position={source.position} errorOf={error} onCommit={(position) => change({ position })} />
      )}
      {placement === "outdoor" && source.position === null && (
        <p className="text-second text-ink2">Until it has a place on the lot, what it adds is not known.</p>
      )}
      {"q" in source.params && (
        <NumberField
          label="Directivity factor Q"
          value={source.params.q}
          min={0.1}
          max={20}
          step={0.5}
          hint="1 in the middle of the room, 2 on a hard floor or wall: direct sound only, within the room."
          error={error("params.q")}
          onCommit={(q) => q !== null && change({ params: { q } })}
        />
      )}
      {"directivity" in source.params && (
        <NumberField
          label="Louder towards the listener than on average"
          unit="dB"
          value={source.params.directivity}
          min={-30}
          max={20}
          error={error("params.directivity")}
          onCommit={(directivity) => directivity !== null && change({ params: { directivity } })}
        />
      )}
      {error("params") && <p className="text-second text-over">{error("params")}</p>}
    </div>
  );
}

function LockedFields({ desk, source }: Props) {
  const rows = [
    ["Name", source.name],
    ["What the sentence calls it", source.says || "not given"],
    ["Kind", kindLabel(desk, source.kind)],
    ["Stands", whereWords(source, desk.answer.plan, desk)],
    ...(source.position ? [["Place", source.position.map((at) => withUnit(formatQuantity(at), "m")).join(", ")]] : []),
    ...(source.hours ? [["At work", `${source.hours.from} to ${source.hours.to}`]] : []),
  ];
  return (
    <dl className="grid gap-3">
      {rows.map(([label, value]) => (
        <div key={label}>
          <dt className="text-second text-ink2">{label}</dt>
          <dd className="break-words font-semibold">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
