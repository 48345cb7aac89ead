import type { Plan, Space } from "@/lib/noise/plan";

export interface RoomTies {
  /** What goes with the room. */
  surfaces: string[];
  paths: string[];
  elements: string[];
  /** What holds it: these must go elsewhere first. */
  sources: string[];
  listeners: string[];
  mouths: string[];
}

/** What hangs on a room. */
export function tiesOf(plan: Plan, { id }: Space): RoomTies {
  const names = (parts: readonly { name: string }[]) => parts.map(({ name }) => name);
  const paths = plan.paths.filter(({ fromSpaceId, toSpaceId }) => fromSpaceId === id || toSpaceId === id);
  return {
    surfaces: names(plan.surfaces.filter(({ spaceId }) => spaceId === id)),
    paths: names(paths),
    elements: names(plan.elements.filter(({ pathId }) => paths.some((path) => path.id === pathId))),
    sources: names(plan.sources.filter(({ spaceId }) => spaceId === id)),
    listeners: names(plan.receivers.filter(({ spaceId }) => spaceId === id)),
    mouths: names(plan.outlets.filter(({ spaceId }) => spaceId === id)),
  };
}

export const isHeld = ({ sources, listeners, mouths }: RoomTies): boolean => sources.length + listeners.length + mouths.length > 0;
