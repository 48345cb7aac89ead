import type { CrossCut } from "@/lib/noise/verdict";
import type { CutScale } from "./cutScale";

/** The kit: kick, snare, two cymbals on stands; never smaller than can be told apart. */
export function KitFigure({ x, floor, perMetre }: { x: number; floor: number; perMetre: number }) {
  const unit = Math.max(perMetre, 13);
  const at = (across: number, up: number) => `${x + across * unit} ${floor - up * unit}`;
  return (
    <g fill="none" strokeWidth="1.7" strokeLinejoin="round" className="stroke-slablamp">
      <circle cx={x} cy={floor - 0.34 * unit} r={0.33 * unit} />
      <path d={`M${at(-0.28, 0.7)}H${x + 0.28 * unit}V${floor - 0.93 * unit}H${x - 0.28 * unit}Z`} />
      <path d={`M${at(-0.8, 0)}L${at(-0.8, 1.02)}M${at(-1.12, 1.06)}L${at(-0.48, 0.98)}`} />
      <path d={`M${at(0.75, 0)}L${at(0.75, 1.16)}M${at(0.43, 1.12)}L${at(1.07, 1.2)}`} />
    </g>
  );
}

/** Any other source: a box with its loudspeaker. */
export function CabinetFigure({ x, floor, perMetre }: { x: number; floor: number; perMetre: number }) {
  const unit = Math.max(perMetre, 13);
  return (
    <g fill="none" strokeWidth="1.7" strokeLinejoin="round" className="stroke-slablamp">
      <path d={`M${x - 0.35 * unit} ${floor}v${-0.8 * unit}h${0.7 * unit}v${0.8 * unit}z`} />
      <circle cx={x} cy={floor - 0.36 * unit} r={0.22 * unit} />
    </g>
  );
}

type Room = CrossCut["buildings"][number]["rooms"][number];

/** The listener's window is lit, its light falls into the room. */
export function WindowLight({ along, foot, head, room, listener, scale }: { along: number; foot: number; head: number; room: Room | undefined; listener: number; scale: CutScale }) {
  const { x, y } = scale;
  const inward = Math.sign(listener - along) || 1;
  const reach = room ? (inward > 0 ? room.to - along : along - room.from) : 3;
  const far = along + inward * Math.min(3.4, Math.max(0.8, reach));
  const low = Math.max(room?.floor ?? 0, foot - 0.7);
  return <path d={`M${x(along)} ${y(head)}L${x(far)} ${y(head - 0.1)}V${y(low)}L${x(along)} ${y(foot)}Z`} fillOpacity="0.28" className="fill-slablamp" />;
}

export function BedFigure({ along, floor, scale: { x, y, perMetre } }: { along: number; floor: number; scale: CutScale }) {
  const half = 0.95 * perMetre;
  const high = 0.5 * perMetre;
  return (
    <g fill="none" strokeWidth="1.5" className="stroke-slabink">
      <path d={`M${x(along) - half} ${y(floor)}v${-high}h${2 * half}v${high}`} />
    </g>
  );
}

export function YardFigures({ cut, scale: { x, y, perMetre, ground } }: { cut: CrossCut; scale: CutScale }) {
  return (
    <g>
      {cut.trees.map(({ along, height, crown }) => (
        <g key={along} fill="none" className="stroke-slabink2" strokeWidth="1.4">
          <circle cx={x(along)} cy={y(height - crown / 2)} r={(crown / 2) * perMetre} strokeDasharray="4.5 3.5" />
          <path d={`M${x(along)} ${ground}V${y(Math.max(0, height - crown))}`} />
        </g>
      ))}
      {cut.fences.map(({ id, along, height }) => (
        <path key={id} d={`M${x(along)} ${ground}V${y(height)}`} strokeWidth="3" className="stroke-slabink" />
      ))}
    </g>
  );
}

export function Ground({ width, ground }: { width: number; ground: number }) {
  const strokes = Array.from({ length: Math.floor(width / 10) }, (_, index) => `M${index * 10 + 8} ${ground + 2}l-5 6`).join("");
  return (
    <g>
      <path d={strokes} strokeWidth="1" className="stroke-slabrule" />
      <path d={`M0 ${ground}H${width}`} strokeWidth="2" className="stroke-slabink" />
    </g>
  );
}
