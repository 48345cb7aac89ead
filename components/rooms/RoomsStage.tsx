"use client";

import { useAtom } from "jotai";
import { useState } from "react";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { FinishRecord } from "@/lib/noise/library";
import { budgetAddress, roomsAddress, yardAddress } from "../addresses";
import { Icon } from "../marks/Icon";
import { SaveNotices } from "../plan/SaveNotices";
import { usePlanSave } from "../plan/usePlanSave";
import { litBandAtom } from "../state/plan";
import { Button } from "../ui/Button";
import { leadOf } from "../walls/answer";
import { useLasting } from "../walls/useLasting";
import { VerdictStrip } from "../walls/VerdictStrip";
import { AddRoom } from "./AddRoom";
import { EmptyRooms } from "./EmptyRooms";
import { RoomDetail } from "./RoomDetail";
import { RoomList } from "./RoomList";
import { roomOf } from "./room";
import { roomWords } from "./roomWords";
import { useLitRoom } from "./useLitRoom";

export interface RoomsStageProps {
  projectId: string;
  /** The room of the address. */
  opened?: string;
  finishes: readonly FinishRecord[];
  may: { edit: boolean; reason: string };
}

const UNDER_THE_STRIP = "[&_:is(input,button,summary,a,select)]:scroll-mt-32";

/** All rooms of the yard, one of them open. */
export function RoomsStage({ projectId, opened, finishes, may }: RoomsStageProps) {
  const save = usePlanSave(projectId);
  const { answer, before, saving } = save;
  const { plan } = answer;
  const weighing = useLasting(saving, 400);
  const [litBandHz, setLitBand] = useAtom(litBandAtom);
  const [space, light] = useLitRoom(plan, opened);
  const [adding, setAdding] = useState(false);
  const chosen = OCTAVE_BANDS.findIndex((band) => band === litBandHz);
  const litBand = chosen >= 0 ? chosen : (leadOf(answer)?.bandIndex ?? 1);
  const room = space && roomOf(plan, space.id);
  const form = (
    <AddRoom
      plan={plan}
      save={save}
      yardHref={yardAddress(projectId)}
      onAdded={(spaceId) => {
        setAdding(false);
        light(spaceId);
      }}
      onClose={() => setAdding(false)}
    />
  );
  return (
    // What is focused must not hide under the strip.
    <div className={UNDER_THE_STRIP}>
      <VerdictStrip answer={answer} before={before} weighing={weighing} projectId={projectId} budgetHref={budgetAddress(projectId)} />
      <SaveNotices save={save} here={roomsAddress(projectId)} words={roomWords} />
      {room ? (
        <RoomDetail
          key={room.space.id}
          projectId={projectId}
          room={room}
          save={save}
          finishes={finishes}
          may={may}
          litBand={litBand}
          onLightBand={(band) => setLitBand(OCTAVE_BANDS[band]!)}
          onLightRoom={light}
          list={
            <>
              <RoomList plan={plan} litId={room.space.id} onLight={light} />
              {may.edit && !adding && (
                <Button className="mb-3 mid:mb-5" icon={<Icon name="plus" size={18} />} onClick={() => setAdding(true)}>
                  Add a room
                </Button>
              )}
              {adding && form}
            </>
          }
        />
      ) : (
        <EmptyRooms mayEdit={may.edit} reason={may.reason} adding={adding} onAdd={() => setAdding(true)} />
      )}
      {!room && adding && form}
    </div>
  );
}
