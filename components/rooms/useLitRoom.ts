import { useState } from "react";
import type { Plan, Space } from "@/lib/noise/plan";
import { groupRooms } from "./room";

/** The room on the page: the one of the address, else the first of the studio. A new choice is kept in the address. */
export function useLitRoom(plan: Plan, opened: string | undefined): [Space | undefined, (spaceId: string) => void] {
  const [litId, setLitId] = useState(opened);
  const rooms = groupRooms(plan).flatMap((group) => group.rooms);
  function light(spaceId: string) {
    setLitId(spaceId);
    window.history.replaceState(null, "", `?${new URLSearchParams({ room: spaceId })}`);
  }
  return [rooms.find(({ id }) => id === litId) ?? rooms[0], light];
}
