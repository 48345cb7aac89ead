"use client";

import type { DuctPiece } from "@/lib/noise/ducts/run";
import type { Outlet, Plan } from "@/lib/noise/plan";
import type { Source } from "@/lib/noise/sources";
import { formatNumber, formatQuantity, listWords, withUnit } from "../format";
import { RunFields } from "../plan/RunFields";
import { SavedText } from "../ui/SavedText";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { NumberField } from "../ui/NumberField";
import { Select } from "../ui/Select";
import { placeIn } from "./changes";
import type { SourceDesk } from "./desk";
import { PositionFields } from "./PositionFields";

interface Props {
  desk: SourceDesk;
  source: Source;
}

const OUTDOORS = "";

/** Free cross-section of a duct 200 mm across, m²: what a new end has. Common practice, no source. */
const USUAL_MOUTH = 0.0314;

const runIn = ({ outlets }: Plan, id: string): DuctPiece[] => outlets.find((outlet) => outlet.id === id)?.run ?? [];

/** Where a fan's sound comes out of its duct: a room, or the yard. */
export function FanMouths({ desk, source }: Props) {
  const mouths = desk.answer.plan.outlets.filter(({ sourceId }) => sourceId === source.id);
  const spot = `mouths ${source.id}`;
  const number = mouths.length + 1;
  const add = () =>
    void desk.act(
      () => [{ act: "add", part: "outlets", values: { sourceId: source.id, name: `Mouth ${number}`, spaceId: null, position: null, run: [] } }],
      spot,
    );
  return (
    <>
      {mouths.length === 0 && <p className="mt-1 text-second text-ink2">None yet: nobody has said where its sound comes out, so what it adds is not known.</p>}
      <ul className="mt-2 grid gap-5">
        {mouths.map((mouth) => (
          <li key={mouth.id} className="border-t border-rule pt-3">
            <Mouth desk={desk} mouth={mouth} />
          </li>
        ))}
      </ul>
      {!desk.locked && (
        <Button className="mt-4" icon={<Icon name="plus" size={18} />} onClick={add}>
          Add a mouth
        </Button>
      )}
      {desk.save.errorOf(spot) && <p className="mt-2 text-second font-semibold text-over">{desk.save.errorOf(spot)}</p>}
    </>
  );
}

function Mouth({ desk, mouth }: { desk: SourceDesk; mouth: Outlet }) {
  const { plan } = desk.answer;
  const change = (patch: Record<string, unknown>) => void desk.act(() => [{ act: "change", part: "outlets", id: mouth.id, patch }], mouth.id);
  const error = (field: string) => desk.save.errorOf(mouth.id, field);
  const room = plan.spaces.find(({ id }) => id === mouth.spaceId);
  const undo = { words: `${mouth.name} removed.`, changes: () => [{ act: "add" as const, part: "outlets", values: bare(mouth) }] };
  if (desk.locked)
    return (
      <p className="break-words">
        <b>{mouth.name}</b>, {room?.name ?? "outdoors"}. <span className="text-second text-ink2">{runWords(mouth.run)}</span>
      </p>
    );
  return (
    <div className="grid gap-3">
      <SavedText label="Name of the mouth" value={mouth.name} most={120} needed error={error("name")} onCommit={(name) => change({ name })} />
      <Select
        label="It opens into"
        value={mouth.spaceId ?? OUTDOORS}
        choices={[{ value: OUTDOORS, label: "The yard" }, ...plan.spaces.map(({ id, name }) => ({ value: id, label: name }))]}
        error={error("spaceId")}
        onChange={(event) => change(event.target.value ? placeIn(plan, event.target.value) : { spaceId: null, position: null })}
      />
      <PositionFields position={mouth.position} errorOf={error} onCommit={(position) => change({ position })} />
      {!room && mouth.position === null && <p className="text-second text-ink2">Until it has a place on the lot, what it adds outdoors is not known.</p>}
      {!room && (
        <NumberField label="Louder towards the listener than on average" unit="dB" min={-30} max={20} value={mouth.directivity} error={error("directivity")} onCommit={(directivity) => directivity !== null && change({ directivity })} />
      )}
      <p className="text-second text-ink2">{runWords(mouth.run)}</p>
      <RunFields
        run={mouth.run}
        from="the fan"
        mouth={USUAL_MOUTH}
        spot={`run/${mouth.id}`}
        error={desk.save.errorOf(`run/${mouth.id}`)}
        onChange={(change) => void desk.act((now) => [{ act: "change", part: "outlets", id: mouth.id, patch: { run: change(runIn(now, mouth.id)) } }], `run/${mouth.id}`)}
      />
      <div>
        <Button icon={<Icon name="remove" size={18} />} onClick={() => void desk.act(() => [{ act: "remove", part: "outlets", id: mouth.id }], mouth.id, undo)}>
          Remove this mouth
        </Button>
        {desk.save.errorOf(mouth.id) && <p className="mt-2 text-second font-semibold text-over">{desk.save.errorOf(mouth.id)}</p>}
      </div>
    </div>
  );
}

const bare = ({ id: _, ...values }: Outlet): Record<string, unknown> => values;

/** The pieces between fan and mouth, as they are reckoned with. */
function runWords(run: readonly DuctPiece[]): string {
  if (run.length === 0) return "No duct pieces given: all of the fan’s sound comes out here.";
  return `On its way: ${listWords(run.map(pieceWords))}.`;
}

function pieceWords(piece: DuctPiece): string {
  if (piece.kind === "end") return `${piece.flush ? "a flush end" : "a free end"} of ${withUnit(formatQuantity(piece.s * 10_000, 0), "cm²")}`;
  const taken = piece.il.filter((loss): loss is number => loss !== null);
  if (taken.length === 0) return "a silencer without figures";
  return `a silencer that takes ${formatNumber(Math.min(...taken))} to ${withUnit(formatNumber(Math.max(...taken)), "dB")}`;
}
