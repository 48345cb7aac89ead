import type { Plan, Space } from "@/lib/noise/plan";
import { wallsAddress } from "../addresses";
import { LinkButton } from "../ui/Button";
import { Strip } from "../ui/Strip";

/** A room that nothing leads into or out of is silent in the verdict: said before anybody trusts it. */
export function NoBoundary({ plan, room, projectId }: { plan: Plan; room: Space; projectId: string }) {
  const paths = new Set(plan.paths.filter(({ fromSpaceId, toSpaceId }) => fromSpaceId === room.id || toSpaceId === room.id).map(({ id }) => id));
  if (plan.elements.some(({ pathId }) => paths.has(pathId))) return null;
  return (
    <Strip
      kind="note"
      heading="No wall of this room is drawn yet"
      className="mb-3 mid:mb-5"
      action={<LinkButton href={wallsAddress(projectId)}>Walls &amp; openings</LinkButton>}
    >
      Sound neither enters nor leaves it until it has walls, a roof and openings.
    </Strip>
  );
}
