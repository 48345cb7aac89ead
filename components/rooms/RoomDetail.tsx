"use client";

import { useState, type ReactNode } from "react";
import type { FinishRecord } from "@/lib/noise/library";
import type { Plan, Surface } from "@/lib/noise/plan";
import type { PlanChange } from "../plan/save";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { Sheet } from "../ui/Sheet";
import { FoldedSheet } from "../ui/FoldedSheet";
import { Strip } from "../ui/Strip";
import { Cautions } from "../walls/Cautions";
import { AirPanel } from "./AirPanel";
import { sealCautions } from "./beforeSeal";
import { FiguresPanel } from "./FiguresPanel";
import { FiguresRow } from "./FiguresRow";
import { FinishChoice } from "./FinishChoice";
import { finishSet, type FinishWord, type Shell } from "./finishSets";
import { InsideList } from "./InsideList";
import { thingsIn } from "./inside";
import { LockedRoom, LockedSurfaces } from "./LockedRoom";
import { NoBoundary } from "./NoBoundary";
import { ObjectsSheet } from "./ObjectsSheet";
import type { BySurfaces, Room } from "./room";
import { bySurfaces, changeRoom, finishWith, ownFigures, restoreRoom } from "./roomChanges";
import { RoomActs } from "./RoomActs";
import { RoomFields } from "./RoomFields";
import { RoomHead } from "./RoomHead";
import { RoomPlan } from "./RoomPlan";
import { RingPanel } from "./RingPanel";
import { SoakPanel } from "./SoakPanel";
import { SurfacesSheet } from "./SurfacesSheet";

interface Props {
  projectId: string;
  room: Room;
  save: PlanSave;
  finishes: readonly FinishRecord[];
  may: { edit: boolean; reason: string };
  litBand: number;
  onLightBand: (band: number) => void;
  onLightRoom: (spaceId: string) => void;
  /** The list of rooms stands between the head and what is inside. */
  list: ReactNode;
}

/** One room: plan, what is inside, size, finish, how long it rings and who soaks it up. */
export function RoomDetail({ projectId, room, save, finishes, may, litBand, onLightBand, onLightRoom, list }: Props) {
  const { answer, before, saving } = save;
  const { plan, verdict } = answer;
  const { space } = room;
  const judged = verdict.spaces[space.id];
  const [litThing, setLitThing] = useState<string | null>(null);
  const [undo, setUndo] = useState<{ words: string; plan: Plan }>();
  const { absorption } = space;
  /** People and things do not stay in the plan while own figures count; until the page is left they wait here. */
  const [waiting, setWaiting] = useState<BySurfaces["objects"]>([]);
  const objects = absorption.kind === "surfaces" ? absorption.objects : waiting;
  const things = thingsIn(plan, space, projectId);

  /** A change that takes something away; the strip brings it back. */
  async function saveWithUndo(changes: PlanChange[], field: string, words: string) {
    if (changes.length === 0) return;
    const from = plan;
    const saved = await save.save(changes, `${space.id} ${field}`);
    if (saved.kind === "saved") setUndo({ words, plan: from });
  }

  async function takeBack() {
    if (!undo) return;
    const changes = restoreRoom(undo.plan, plan, space.id);
    if (changes.length === 0) return setUndo(undefined);
    const saved = await save.save(changes, `${space.id} undo`);
    if (saved.kind === "saved") setUndo(undefined);
  }

  const finish = (word: FinishWord, shell: Shell) =>
    space.box && void saveWithUndo(finishWith(room, finishSet(word, shell, space.box.size), objects), "finish", `The finish is ${word} now.`);
  const countSurfaces = () => void saveWithUndo([changeRoom(space, { absorption: bySurfaces(objects) })], "finish", "The surfaces count again.");
  const countFigures = () => {
    setWaiting(objects);
    void saveWithUndo([changeRoom(space, { absorption: ownFigures("decay", judged) })], "finish", "Nine figures of your own count now.");
  };
  const removeSurface = (surface: Surface) =>
    void saveWithUndo([{ act: "remove", part: "surfaces", id: surface.id }], "surface", `Removed: ${surface.name}.`);

  return (
    <>
      <RoomHead plan={plan} room={space} judged={judged} litBand={litBand} />
      {list}
      {undo && (
        <Strip
          kind="undo"
          heading={undo.words}
          className="mb-3 mid:mb-5"
          action={
            <Button onClick={() => void takeBack()}>
              Undo
            </Button>
          }
        >
          {save.errorOf(`${space.id} undo`)}
        </Strip>
      )}
      <NoBoundary plan={plan} room={space} projectId={projectId} />
      <div className="mb-3 rounded-sheet bg-sheet mid:mb-5 desk:grid desk:grid-cols-[minmax(0,0.94fr)_minmax(0,1fr)]">
        <Sheet heading="What is inside">
          <RoomPlan plan={plan} room={space} things={things} litThing={litThing} onLightRoom={onLightRoom} />
          <div className="mt-4">
            <InsideList things={things} litThing={litThing} onLight={setLitThing} />
          </div>
        </Sheet>
        <Sheet heading="Size and finish" className="border-t border-rule desk:border-t-0 desk:border-l">
          <div className="grid gap-6">
            {may.edit ? (
              <>
                <RoomFields plan={plan} room={room} save={save} />
                <FinishChoice room={room} saving={saving} error={save.errorOf(`${space.id} finish`)} onFinish={finish} onSurfaces={countSurfaces} onFigures={countFigures} />
                <FiguresPanel room={room} judged={judged} save={save} litBand={litBand} onLightBand={onLightBand} onSurfaces={countSurfaces} />
              </>
            ) : (
              <>
                <LockedRoom room={room} reason={may.reason} />
                <FiguresRow judged={judged} litBand={litBand} />
              </>
            )}
          </div>
        </Sheet>
      </div>
      <div className="mb-3 rounded-sheet bg-sheet mid:mb-5 desk:grid desk:grid-cols-2">
        <RingPanel space={space} judged={judged} before={before?.verdict.spaces[space.id]} litBand={litBand} onLight={onLightBand} />
        <SoakPanel room={room} judged={judged} litBand={litBand} onLight={onLightBand} />
      </div>
      {may.edit ? (
        <SurfacesSheet room={room} finishes={finishes} save={save} onRemove={removeSurface} onSurfaces={countSurfaces} />
      ) : (
        <LockedSurfaces room={room} finishes={finishes} />
      )}
      {may.edit && absorption.kind === "surfaces" && (
        <ObjectsSheet
          room={room}
          absorption={absorption}
          save={save}
          onRemove={(at) => {
            const left = objects.filter((_, index) => index !== at);
            void saveWithUndo([changeRoom(space, { absorption: { ...absorption, objects: left } })], "objects", `Removed: ${objects[at]?.name}.`);
          }}
        />
      )}
      {room.building?.role === "studio" && <AirPanel space={space} />}
      {room.building?.role === "studio" && (
        <FoldedSheet heading="Before you seal it" className="mb-3 mid:mb-5">
          <div className="[&>ul]:mid:grid-cols-2 [&>ul]:wide:grid-cols-3">
            <Cautions cautions={sealCautions(plan, space)} />
          </div>
        </FoldedSheet>
      )}
      {may.edit && <RoomActs plan={plan} room={room} projectId={projectId} save={save} onOpen={onLightRoom} />}
    </>
  );
}
