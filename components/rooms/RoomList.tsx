import clsx from "clsx";
import type { Plan, Space } from "@/lib/noise/plan";
import { listWords } from "../format";
import { floorArea, groupRooms } from "./room";
import { useQuantityWords } from "./useQuantityWords";

interface Props {
  plan: Plan;
  litId: string | null;
  onLight: (spaceId: string) => void;
}

/** Every room, the studio's apart from those of others; the lit one is what the page shows. */
export function RoomList({ plan, litId, onLight }: Props) {
  return (
    <nav aria-label="Rooms" className="mb-3 grid gap-3 mid:mb-5 wide:flex wide:items-stretch">
      {groupRooms(plan).map(({ heading, rooms }) => (
        <div key={heading} className="min-w-0 wide:flex-auto">
          <h2 className="mb-1.5 font-body text-second font-semibold text-ink2">{heading}</h2>
          <ul className="grid grid-cols-2 gap-px overflow-hidden rounded-sheet bg-sheet mid:grid-cols-3 desk:grid-cols-[repeat(auto-fit,minmax(10.5rem,1fr))]">
            {rooms.map((room) => (
              <li key={room.id} className="min-w-0 bg-sheet outline outline-rule">
                <RoomLine plan={plan} room={room} lit={room.id === litId} onLight={() => onLight(room.id)} />
              </li>
            ))}
          </ul>
        </div>
      ))}
    </nav>
  );
}

function RoomLine({ plan, room, lit, onLight }: { plan: Plan; room: Space; lit: boolean; onLight: () => void }) {
  const say = useQuantityWords();
  const area = floorArea(room);
  const size = area === null ? say("volume", room.volume) : say("area", area, area < 10 ? 1 : 0);
  const inside = [
    ...plan.sources.filter(({ spaceId }) => spaceId === room.id).map(({ name }) => name.toLowerCase()),
    ...(plan.receivers.some(({ spaceId }) => spaceId === room.id) ? ["listener"] : []),
  ];
  const building = plan.buildings.find(({ id }) => id === room.buildingId);
  return (
    <button
      type="button"
      aria-current={lit || undefined}
      onClick={onLight}
      className={clsx(
        "flex h-full min-h-16 w-full flex-col justify-center border-t-4 px-3.5 py-2.5 text-left mid:px-5",
        lit ? "border-lamp bg-lampwash" : "border-transparent hover:bg-well",
      )}
    >
      <span className="line-clamp-2 max-w-full font-semibold [overflow-wrap:anywhere]">{room.name}</span>
      <span className="line-clamp-2 text-second text-ink2 [overflow-wrap:anywhere]">
        {building?.role === "studio" || !building ? "" : `${building.name}, `}
        {size}
        {inside.length > 0 && `, ${inside.length > 2 ? `${inside.length} things` : listWords(inside)}`}
      </span>
    </button>
  );
}
