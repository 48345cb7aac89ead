import type { Plan, Space } from "@/lib/noise/plan";
import type { SpaceVerdict } from "@/lib/noise/verdict";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import { bandWords, formatNumber } from "../format";
import { withMark } from "../ui/figures";
import { toShown, unitName, type Quantity } from "../ui/quantities";
import { floorArea, groupRooms } from "./room";
import { useQuantityWords } from "./useQuantityWords";

interface Props {
  plan: Plan;
  room: Space;
  judged: SpaceVerdict | undefined;
  litBand: number;
}

const MIDDLE = OCTAVE_BANDS.indexOf(500);

/** Name of the room with the figures one asks for first. */
export function RoomHead({ plan, room, judged, litBand }: Props) {
  const { units, mark } = useQuantityWords();
  const order = groupRooms(plan).flatMap(({ rooms }) => rooms);
  const write = (quantity: Quantity, si: number) => {
    const shown = toShown(quantity, units, si);
    return withMark(formatNumber(shown, shown < 20 ? 1 : 0), mark);
  };
  const seconds = (band: number) => {
    const decay = judged?.decay[band];
    return typeof decay === "number" ? withMark(formatNumber(decay, 2), mark) : null;
  };
  const floor = floorArea(room);
  return (
    <div className="mb-4 flex flex-wrap items-end justify-between gap-x-12 gap-y-4 mid:mb-5">
      <div className="min-w-0">
        <p className="text-second text-ink2">
          Rooms, {order.findIndex(({ id }) => id === room.id) + 1} of {order.length}
        </p>
        <h1 className="text-verdictPhone leading-[1.12] [overflow-wrap:anywhere] desk:text-verdict">{room.name}</h1>
      </div>
      <dl className="flex flex-wrap gap-x-8 gap-y-3">
        {floor !== null && <Figure label="Floor" value={write("area", floor)} unit={unitName("area", units)} />}
        <Figure label="Volume" value={write("volume", room.volume)} unit={unitName("volume", units)} />
        {litBand !== MIDDLE && <Figure label={`Decay at ${bandWords(OCTAVE_BANDS[litBand]!)}`} value={seconds(litBand)} unit="s" />}
        <Figure label={`Decay at ${bandWords(OCTAVE_BANDS[MIDDLE]!)}`} value={seconds(MIDDLE)} unit="s" />
      </dl>
    </div>
  );
}

function Figure({ label, value, unit }: { label: string; value: string | null; unit: string }) {
  return (
    <div>
      <dt className="text-second text-ink2">{label}</dt>
      <dd className="flex items-baseline gap-2 text-table text-ink2">
        {value === null ? (
          <span className="text-lead">not known</span>
        ) : (
          <>
            <span className="figure text-[24px] font-[640] leading-tight text-ink">{value}</span>
            {unit}
          </>
        )}
      </dd>
    </div>
  );
}
