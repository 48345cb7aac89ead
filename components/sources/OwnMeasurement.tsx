"use client";

import clsx from "clsx";
import { useId, useState } from "react";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { Source } from "@/lib/noise/sources";
import { bandWords, capitalise, countWords, listWords, numberWord } from "../format";
import { Button } from "../ui/Button";
import { errorId, FieldError, inputClasses, borderOf } from "../ui/FieldFrame";
import { NineBandRow } from "../ui/NineBandRow";
import type { BandFigure } from "../ui/nineValues";
import { QuantityField } from "../ui/QuantityField";
import { Select } from "../ui/Select";
import { TextField } from "../ui/TextField";
import { replaceFigures } from "./changes";
import { placementOf, type SourceDesk } from "./desk";
import { guessComma, readMeasurement, type Comma } from "./readMeasurement";
import { countKnown } from "./spectrum";

interface Props {
  desk: SourceDesk;
  source: Source;
}

const NOTHING: BandFigure[] = OCTAVE_BANDS.map(() => null);
const OUTDOORS = "";

/** Levels read at a distance become the source's power, reckoned with the room they were read in. Nothing is used until it is said. */
export function OwnMeasurement({ desk, source }: Props) {
  const outdoors = placementOf(desk, source.kind) === "outdoor";
  const textId = useId();
  const [text, setText] = useState("");
  const [comma, setComma] = useState<Comma>();
  const [levels, setLevels] = useState<BandFigure[]>(NOTHING);
  const [distance, setDistance] = useState<number | null>(1);
  const [spaceId, setSpaceId] = useState(outdoors ? OUTDOORS : (source.spaceId ?? OUTDOORS));
  const [note, setNote] = useState("");
  const [unread, setUnread] = useState<string>();
  const spot = `measured ${source.id}`;
  const error = (field: string) => desk.save.errorOf(spot, field);

  function read(typed: string, means = comma) {
    setText(typed);
    const found = readMeasurement(typed, means ?? guessComma(typed));
    if (found) setLevels(found);
    setUnread(found || typed.trim() === "" ? undefined : "No levels found in this. Nine figures, or each band beside its level, will do.");
  }

  function clear() {
    setText("");
    setLevels(NOTHING);
    setNote("");
    setUnread(undefined);
  }

  async function use() {
    const measured = { levels, distance, spaceId: spaceId || null, note };
    const { changes, undo } = replaceFigures(source, () => ({ measured }), `${source.name} takes your measurement.`);
    const saved = await desk.act(changes, spot, undo);
    if (saved) clear();
  }

  const known = countKnown(levels);
  const blocked = known === 0 ? "Paste or type levels first." : distance === null ? "Say how far away the meter stood." : undefined;
  return (
    <div className="grid gap-4">
      <div>
        <label htmlFor={textId} className="mb-1.5 block text-second font-semibold text-ink2">
          Paste from the meter’s file or a table
        </label>
        <textarea
          id={textId}
          rows={3}
          value={text}
          placeholder="63 104,0   125 101,0   250 99,0 …"
          onChange={(event) => read(event.target.value)}
          aria-invalid={unread ? true : undefined}
          aria-describedby={unread ? errorId(textId) : undefined}
          className={clsx(inputClasses, borderOf(unread), "resize-y py-2")}
        />
        <FieldError id={textId} error={unread} />
      </div>
      {text.includes(",") && (
        <Select
          label="A comma means"
          value={comma ?? guessComma(text)}
          choices={[
            { value: "decimal", label: "decimal: 104,5" },
            { value: "separator", label: "the next figure: 63,104.5" },
          ]}
          onChange={(event) => {
            const means = event.target.value as Comma; // one of the two choices above
            setComma(means);
            read(text, means);
          }}
        />
      )}
      <NineBandRow label="Levels read there" unit="dB" min={-100} max={160} silence values={levels} error={error("levels")} errorOf={(band) => error(`levels.${band}`)} onCommit={setLevels} />
      {known > 0 && known < OCTAVE_BANDS.length && <p className="text-second font-semibold text-ink2">{foundWords(levels)}</p>}
      <div className="grid gap-4 mid:grid-cols-2">
        <QuantityField label="How far from it" quantity="length" steps={{ metric: 0.1, us: 0.5 }} min={0.3} max={50} value={distance} error={error("distance")} onCommit={setDistance} />
        <Select
          label="Read in"
          value={spaceId}
          choices={[...desk.answer.plan.spaces.map(({ id, name }) => ({ value: id, label: name })), { value: OUTDOORS, label: "The open, over hard ground" }]}
          error={error("spaceId")}
          onChange={(event) => setSpaceId(event.target.value)}
        />
      </div>
      <TextField label="When and how" value={note} maxLength={120} hint="As in “9 October, four minutes of playing, Leq”." error={error("note")} onChange={(event) => setNote(event.target.value)} />
      <p className="text-second text-ink2">
        {spaceId
          ? "The room’s own echo is taken off with the absorption the room has here. If it was furnished otherwise that day, say so under Rooms first. In a small room the lowest bands are an average at best."
          : "Taken as half a sphere over hard ground: keep 2 m and more from walls."}
      </p>
      {error("kind") && <p className="text-second font-semibold text-over">{error("kind")}</p>}
      <div className="flex flex-wrap items-start gap-2">
        <div>
          <Button look="ink" reason={blocked} onClick={() => void use()}>
            Use for {source.name.length > 40 ? "this source" : source.name}
          </Button>
        </div>
        <Button onClick={clear}>Clear</Button>
      </div>
    </div>
  );
}

/** "Eight of nine found, nothing at 31.5 Hz." */
function foundWords(levels: readonly BandFigure[]): string {
  const missing = OCTAVE_BANDS.filter((_, i) => levels[i] === null).map(bandWords);
  const nothing = missing.length > 4 ? countWords(missing.length, "band is", "bands are") + " not known" : `nothing at ${listWords(missing)}`;
  return `${capitalise(numberWord(countKnown(levels)))} of nine, ${nothing}. Type it, or leave it unknown: an unknown band can be over, but never under.`;
}
