import { useId } from "react";
import type { Plan } from "../../lib/noise/plan";
import type { Box } from "../verdict/placeLabels";
import { cornersOf, extentOf, middleOf } from "./geometry";
import { Halo } from "./PlanGround";
import { drawOutline, fitted, textWidth, type PlanScale } from "./planScale";

type Building = Plan["buildings"][number];

interface Props {
  building: Building;
  rooms: readonly Plan["spaces"][number][];
  scale: PlanScale;
  lit: boolean;
}

const HATCH = 11;
/** Of a house's name, px. */
const SIZE = 16;

/** A house from above: the studio with thick walls, others hatched; its rooms are cut out of the hatch. */
export function House({ building, rooms, scale, lit }: Props) {
  const id = useId();
  const { role, footprint } = building;
  const named = nameOfHouse(building, rooms, scale);
  if (!footprint) return null;
  const studio = role === "studio";
  const outline = drawOutline(footprint, scale);
  return (
    <>
      <path d={outline} className={lit ? "fill-lampwash" : "fill-sheet"} />
      {!studio && !lit && (
        <g aria-hidden="true">
          <clipPath id={id}>
            <path d={outline} />
          </clipPath>
          <path d={diagonals(footprint, scale)} clipPath={`url(#${id})`} strokeWidth="1" className="stroke-rule" />
        </g>
      )}
      {rooms.map((room) => (
        <Room key={room.id} room={room} scale={scale} />
      ))}
      <path d={outline} fill="none" strokeLinejoin="miter" strokeWidth={studio ? 5 : lit ? 3 : 2} className="stroke-ink" />
      {named && <Halo x={named.x} y={named.y} anchor="middle" words={named.words} className="figure text-base font-[620]" />}
    </>
  );
}

function diagonals(footprint: NonNullable<Building["footprint"]>, scale: PlanScale): string {
  const { west, east, south, north } = extentOf(footprint);
  const [left, top] = scale.at([west, north]);
  const [right, bottom] = scale.at([east, south]);
  const height = bottom - top;
  const count = Math.ceil((right - left + height) / HATCH);
  return Array.from({ length: count }, (_, index) => `M${(left + index * HATCH).toFixed(1)} ${top.toFixed(1)}l${(-height).toFixed(1)} ${height.toFixed(1)}`).join("");
}

function boxOf({ box }: Plan["spaces"][number], scale: PlanScale) {
  if (!box) return null;
  const corners = cornersOf({ x: box.at[0], y: box.at[1], width: box.size[0], depth: box.size[1] });
  const [x, y] = scale.at(corners[3]!);
  return { x, y, width: box.size[0] * scale.scale, height: box.size[1] * scale.scale };
}

function Room({ room, scale }: { room: Plan["spaces"][number]; scale: PlanScale }) {
  const box = boxOf(room, scale);
  if (!box) return null;
  const words = fitted(room.name, 13, box.width - 10);
  const fits = box.height > 22 && words.length > 2 && (words === room.name || box.width > 60);
  return (
    <g aria-hidden="true">
      <rect {...box} strokeWidth="1.5" className="fill-sheet stroke-ink" />
      {fits && (
        <text x={box.x + 7} y={box.y + 18} className="text-least font-semibold">
          {words}
        </text>
      )}
    </g>
  );
}

interface HousesName {
  x: number;
  y: number;
  words: string;
  half: number;
}

/** Under the middle of the house, or where no room lies. */
function nameOfHouse({ name, footprint }: Building, rooms: Props["rooms"], scale: PlanScale): HousesName | null {
  if (!footprint) return null;
  const { west, east, south, north } = extentOf(footprint);
  const [x] = scale.at(middleOf(footprint));
  const words = fitted(name, SIZE, ((east - west) * scale.scale - 8) * 0.86);
  const boxes = rooms.map((one) => boxOf(one, scale)).filter((box) => box !== null);
  const [top, bottom] = [scale.at([0, north])[1], scale.at([0, south])[1]];
  const half = textWidth(words, SIZE) * 0.58; // the figures' face is wider
  const free = (y: number) => boxes.every((box) => y < box.y - 2 || y - SIZE > box.y + box.height || x + half < box.x || x - half > box.x + box.width);
  const middle = (top + bottom) / 2 + 6;
  const tries = [middle, bottom - 12, bottom - (bottom - middle) / 2, top + 22];
  return { x, y: tries.find(free) ?? bottom + 22, words, half };
}

/** Boxes of the names of houses and rooms, which other labels must not cover. */
export function nameBoxes(plan: Plan, scale: PlanScale): Box[] {
  const houses = plan.buildings.flatMap((building) => {
    const named = nameOfHouse(building, plan.spaces.filter(({ buildingId }) => buildingId === building.id), scale);
    return named ? [{ left: named.x - named.half, right: named.x + named.half, top: named.y - SIZE, bottom: named.y + 5 }] : [];
  });
  const rooms = plan.spaces.flatMap((space) => {
    const box = boxOf(space, scale);
    return box ? [{ left: box.x, right: box.x + Math.min(box.width, textWidth(space.name, 13) + 10), top: box.y, bottom: box.y + 24 }] : [];
  });
  return [...houses, ...rooms];
}
