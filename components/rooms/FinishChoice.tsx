"use client";

import clsx from "clsx";
import { useState } from "react";
import { Icon } from "../marks/Icon";
import { Select } from "../ui/Select";
import { FINISH_WORDS, finishSays, shellOf, wordOf, type FinishWord, type Shell } from "./finishSets";
import type { Room } from "./room";

interface Props {
  room: Room;
  saving: boolean;
  error?: string;
  onFinish: (word: FinishWord, shell: Shell) => void;
  /** Back to the surfaces that stand. */
  onSurfaces: () => void;
  onFigures: () => void;
}

const labels: Record<FinishWord, string> = { bare: "Bare", furnished: "Furnished", treated: "Treated" };

const walls = [
  { value: "light", label: "Board on studs" },
  { value: "masonry", label: "Plastered masonry" },
];
const floors = [
  { value: "concrete", label: "Concrete slab" },
  { value: "timber", label: "Timber on joists" },
];

/** How the room is finished, in a word: each fills the surfaces. Own surfaces and own figures stand beside. */
export function FinishChoice({ room, saving, error, onFinish, onSurfaces, onFigures }: Props) {
  const { space, surfaces } = room;
  const [shell, setShell] = useState<Shell>(() => shellOf(surfaces));
  const counted = space.absorption.kind === "surfaces";
  const word = counted ? (wordOf(surfaces, space.box?.size)?.word ?? null) : null;
  const own = counted && word === null;
  const blocked = !space.box;

  function choose(next: Shell) {
    setShell(next);
    if (word) onFinish(word, next);
  }

  return (
    <fieldset className="min-w-0" aria-busy={saving}>
      <legend className="mb-1.5 text-second font-semibold text-ink2">Finish</legend>
      <div className="grid grid-cols-2 overflow-hidden rounded-control border-[1.5px] border-edge mid:flex">
        {FINISH_WORDS.map((one) => (
          <Segment key={one} pressed={one === word} blocked={blocked} onPress={() => onFinish(one, shell)}>
            {labels[one]}
          </Segment>
        ))}
        {(own || (!counted && surfaces.length > 0)) && (
          <Segment pressed={own} onPress={() => !own && onSurfaces()}>
            Own surfaces
          </Segment>
        )}
        <Segment pressed={!counted} onPress={() => counted && onFigures()}>
          Own figures
        </Segment>
      </div>
      {error && <p className="mt-1.5 text-second font-semibold text-over">{error}</p>}
      <p className="mt-2 text-second text-ink2">
        {blocked ? "Type width, depth and height first: the words fill surfaces whose areas follow from them." : saysOf(word, counted)}
      </p>
      <div className="mt-4 grid gap-4 mid:grid-cols-2">
        <Select label="Walls of" choices={walls} value={shell.walls} onChange={(event) => choose({ ...shell, walls: event.target.value as Shell["walls"] })} />
        <Select label="Floor of" choices={floors} value={shell.floor} onChange={(event) => choose({ ...shell, floor: event.target.value as Shell["floor"] })} />
      </div>
      <p className="mt-2 text-second text-ink2">
        {word ? "Behind the finish." : "Taken when you choose one of the three words."} Light boards swallow bass, masonry throws it back.
      </p>
      <details className="mt-2 text-second text-ink2">
        <summary className="inline-flex min-h-6 items-center underline underline-offset-3">What the words stand for</summary>
        <dl className="mt-2 grid gap-1.5">
          {FINISH_WORDS.map((one) => (
            <div key={one}>
              <dt className="inline font-semibold text-ink">{labels[one]}: </dt>
              <dd className="inline">{finishSays[one]}</dd>
            </div>
          ))}
        </dl>
        <p className="mt-2">These shares are common practice, no source. What each finish takes is the library’s, with its source beside the surface.</p>
      </details>
    </fieldset>
  );
}

const saysOf = (word: FinishWord | null, counted: boolean): string => {
  if (word) return `${finishSays[word]} Change any surface below and this says “own”.`;
  return counted ? "The surfaces below are yours. A word fills them anew; you can undo that." : "Nine figures of yours count; the surfaces below wait.";
};

interface SegmentProps {
  pressed: boolean;
  blocked?: boolean;
  onPress: () => void;
  children: string;
}

function Segment({ pressed, blocked, onPress, children }: SegmentProps) {
  return (
    <button
      type="button"
      aria-pressed={pressed}
      aria-disabled={blocked || undefined}
      onClick={blocked ? undefined : onPress}
      className={clsx(
        "inline-flex min-h-11 flex-auto items-center justify-center gap-2 border-edge px-3 text-table font-semibold outline-edge -outline-offset-1 not-first:border-l-[1.5px] max-mid:border-[0.75px]!",
        pressed ? "bg-ink text-sheet" : blocked ? "cursor-not-allowed bg-well text-ink2" : "bg-sheet text-ink hover:bg-well",
      )}
    >
      {pressed && <Icon name="tick" size={18} />}
      {children}
    </button>
  );
}
