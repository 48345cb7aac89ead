"use client";

import clsx from "clsx";
import type { Plan, Space } from "@/lib/noise/plan";
import { HatchBox } from "../marks/HatchBox";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { useWidthClass } from "../ui/useWidthClass";
import type { Thing } from "./inside";
import { BALLOON, fitFragment, MARGIN, openingsIn, placeBalloons, storeyOf, type Balloon, type Fragment } from "./planFragment";
import { useQuantityWords } from "./useQuantityWords";

interface Props {
  plan: Plan;
  room: Space;
  things: readonly Thing[];
  litThing: string | null;
  onLightRoom: (spaceId: string) => void;
}

const PROMISED = { 390: 334, 720: 560, 1024: 420, 1440: 600 };

/** The storey the room is on, from above and to scale; the balloons are those of the list beside it. */
export function RoomPlan(props: Props) {
  const [place, width] = useDrawnWidth<HTMLDivElement>(PROMISED, 680);
  return (
    <div ref={place} className="min-w-0">
      {props.room.box ? <Drawing {...props} width={width} /> : <Undrawn name={props.room.name} width={width} />}
    </div>
  );
}

function Drawing({ plan, room, things, litThing, onLightRoom, width }: Props & { width: number }) {
  const phone = useWidthClass() === 390;
  const rooms = storeyOf(plan, room);
  const building = plan.buildings.find(({ id }) => id === room.buildingId) ?? null;
  const fragment = fitFragment(rooms, building, { width, most: phone ? 440 : 560 });
  const { x, y } = fragment;
  const outline = (building?.footprint ?? []).map(([east, north]) => `${x(east)} ${y(north)}`).join("L");
  return (
    <svg
      width={width}
      height={fragment.height}
      viewBox={`0 0 ${width} ${fragment.height}`}
      role="img"
      aria-label={`Plan of ${room.name} with ${rooms.length === 1 ? "no other room" : rooms.length === 2 ? "one room" : `${rooms.length - 1} rooms`} on the same floor, to scale`}
      className="block max-w-full"
    >
      {outline && <path d={`M${outline}Z`} strokeWidth="5" strokeLinejoin="miter" className="fill-well stroke-ink" />}
      {rooms.map((one) => (
        <RoomBox key={one.id} room={one} lit={one.id === room.id} fragment={fragment} onLight={() => onLightRoom(one.id)} />
      ))}
      {openingsIn(plan, rooms, fragment).map(({ id, kind, ...box }) => (
        <HatchBox key={id} kind={kind} lit={id === litThing} {...box} />
      ))}
      {room.box && <Chains box={room.box} fragment={fragment} />}
      <ScaleBar fragment={fragment} />
      {placeBalloons(things, fragment).map((balloon) => (
        <Numbered key={balloon.id} balloon={balloon} lit={balloon.id === litThing} />
      ))}
    </svg>
  );
}

interface BoxProps {
  room: Space;
  lit: boolean;
  fragment: Fragment;
  onLight: () => void;
}

const LETTER = 7.4;

/** A room with its name. A press lights it; the list above does the same for the keyboard. */
function RoomBox({ room, lit, fragment, onLight }: BoxProps) {
  const say = useQuantityWords();
  if (!room.box) return null;
  const { at, size } = room.box;
  const { x, y, scale } = fragment;
  const [left, top, width, height] = [x(at[0]), y(at[1] + size[1]), size[0] * scale, size[1] * scale];
  const most = Math.floor((width - 12) / LETTER);
  const name = room.name.length > most ? `${room.name.slice(0, Math.max(1, most - 1))}…` : room.name;
  const measures = `${say("area", size[0] * size[1])}, ${say("volume", room.volume)}`;
  const middle = left + width / 2;
  const foot = top + height - 26;
  return (
    <g onClick={onLight} className={lit ? undefined : "cursor-pointer"}>
      <rect x={left} y={top} width={width} height={height} strokeWidth={lit ? 5 : 3.5} className={clsx("stroke-ink", lit ? "fill-lampwash" : "fill-sheet")} />
      {most >= 4 && (
        <text x={middle} y={foot} textAnchor="middle" fontSize="13" fontWeight={lit ? 700 : 500}>
          {name}
        </text>
      )}
      {most >= measures.length && (
        <text x={middle} y={foot + 16} textAnchor="middle" fontSize="12" className="fill-ink2!">
          {measures}
        </text>
      )}
    </g>
  );
}

/** Width above and depth to the left of the building, in line with the lit room. */
function Chains({ box, fragment }: { box: NonNullable<Space["box"]>; fragment: Fragment }) {
  const say = useQuantityWords();
  const { x, y } = fragment;
  const [left, right] = [x(box.at[0]), x(box.at[0] + box.size[0])];
  const [top, foot] = [y(box.at[1] + box.size[1]), y(box.at[1])];
  const [above, beside] = [MARGIN.top - 26, 30];
  return (
    <g strokeWidth="1.3" className="stroke-ink">
      <path d={`M${left} ${above}H${right}M${left - 4} ${above + 4}l8 -8M${right - 4} ${above + 4}l8 -8M${left} ${above - 6}v12M${right} ${above - 6}v12`} />
      <path d={`M${beside} ${top}V${foot}M${beside - 4} ${top + 4}l8 -8M${beside - 4} ${foot + 4}l8 -8M${beside - 6} ${top}h12M${beside - 6} ${foot}h12`} />
      <Measure at={[(left + right) / 2, above]} words={say("length", box.size[0], 2)} />
      <Measure at={[beside, (top + foot) / 2]} words={say("length", box.size[1], 2)} upright />
    </g>
  );
}

function Measure({ at: [x, y], words, upright }: { at: readonly [number, number]; words: string; upright?: boolean }) {
  return (
    <text
      x={x}
      y={y + 4}
      textAnchor="middle"
      fontSize="13"
      fontWeight="650"
      strokeWidth="8"
      paintOrder="stroke"
      transform={upright ? `rotate(-90 ${x} ${y})` : undefined}
      className="stroke-sheet"
    >
      {words}
    </text>
  );
}

const BAR = { metric: { metres: 2, name: "2 m" }, us: { metres: 1.524, name: "5 ft" } };

function ScaleBar({ fragment: { height, scale } }: { fragment: Fragment }) {
  const { units } = useQuantityWords();
  const { metres, name } = BAR[units];
  const [left, right, at] = [MARGIN.left, MARGIN.left + metres * scale, height - 14];
  return (
    <g>
      <path d={`M${left} ${at}H${right}M${left} ${at - 4}v8M${(left + right) / 2} ${at - 3}v6M${right} ${at - 4}v8`} strokeWidth="1.5" className="stroke-ink" />
      <text x={right + 8} y={at + 4} fontSize="12">
        {name}
      </text>
    </g>
  );
}

function Numbered({ balloon: { x, y, number }, lit }: { balloon: Balloon; lit: boolean }) {
  return (
    <g className="pointer-events-none">
      <circle cx={x} cy={y} r={BALLOON} strokeWidth="1.6" className={clsx("stroke-ink", lit ? "fill-lamp" : "fill-sheet")} />
      <text x={x} y={y + 4.3} textAnchor="middle" fontSize="12" fontWeight="700" className={lit ? "fill-onlamp!" : undefined}>
        {number}
      </text>
    </g>
  );
}

/** The shape of what will stand here. */
function Undrawn({ name, width }: { name: string; width: number }) {
  return (
    <svg width={width} height="220" viewBox={`0 0 ${width} 220`} role="img" aria-label={`${name} is not drawn: its size is not known`} className="block max-w-full">
      <rect x="40" y="34" width={width - 80} height="150" fill="none" strokeWidth="2" strokeDasharray="8 6" className="stroke-edge" />
      <text x={width / 2} y="106" textAnchor="middle" fontSize="14">
        No size yet.
      </text>
      <text x={width / 2} y="126" textAnchor="middle" fontSize="13" className="fill-ink2!">
        Type width, depth and height.
      </text>
    </svg>
  );
}
