import type { FinishRecord } from "@/lib/noise/library";
import { Icon } from "../marks/Icon";
import { Sheet } from "../ui/Sheet";
import { provenanceWords } from "./SurfacesSheet";
import type { Room } from "./room";
import { wordOf } from "./finishSets";
import { useQuantityWords } from "./useQuantityWords";

/** Size and finish of a room for whoever may look but not change. */
export function LockedRoom({ room, reason }: { room: Room; reason: string }) {
  const say = useQuantityWords();
  const { space, surfaces, building } = room;
  const word = wordOf(surfaces, space.box?.size)?.word;
  const finish = space.absorption.kind !== "surfaces" ? "own figures" : (word ?? "own surfaces");
  const figures = [
    ["Building", building?.name ?? "not known"],
    ...(space.box ? [["Width, depth, height", space.box.size.map((side) => say("length", side, 2)).join(" × ")]] : []),
    ["Volume", say("volume", space.volume)],
    ["Finish", finish],
  ];
  return (
    <>
      <dl className="flex flex-wrap gap-x-10 gap-y-3">
        {figures.map(([label, figure]) => (
          <div key={label} className="min-w-0">
            <dt className="text-second text-ink2">{label}</dt>
            <dd className="text-lead font-semibold [overflow-wrap:anywhere]">{figure}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-4 flex items-center gap-2 text-second text-ink2">
        <Icon name="lock" size={18} />
        {reason}
      </p>
    </>
  );
}

/** What lines the room, as text. */
export function LockedSurfaces({ room: { surfaces }, finishes }: { room: Room; finishes: readonly FinishRecord[] }) {
  const say = useQuantityWords();
  if (surfaces.length === 0) return null;
  return (
    <Sheet heading="Surfaces" className="mb-5">
      <ul>
        {surfaces.map((surface) => (
          <li key={surface.id} className="border-t border-rule py-2 first:border-t-0 [overflow-wrap:anywhere]">
            <b>{surface.name}</b>, {say("area", surface.area)}: {finishes.find(({ key }) => key === surface.finishKey)?.name ?? "own coefficients"}
            <span className="block text-second text-ink2">{provenanceWords(surface.provenance)}</span>
          </li>
        ))}
      </ul>
    </Sheet>
  );
}
