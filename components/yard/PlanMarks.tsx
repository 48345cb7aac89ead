import type { ReactNode } from "react";
import type { Plan } from "../../lib/noise/plan";
import type { State } from "../format";
import { HatchBox } from "../marks/HatchBox";
import { stateColour } from "../marks/MarginWords";
import { StatusMark } from "../marks/StatusMark";
import { drawLine, type PlanScale } from "./planScale";

type PathElement = Plan["elements"][number];

/** Hatch of an element on the plan, by its kind. */
const hatchOf = (kind: PathElement["kind"]) => (kind === "ceiling" ? "floor" : kind);

const THICK = 9;
/** Nothing that can be pressed is smaller, px. */
export const LEAST_TARGET = 24;

/** An opening or a piece of wall, seen from above: as long as it is wide, on the line of its face. */
export function ElementMark({ element: { kind, position, normal, size }, scale, lit }: { element: PathElement; scale: PlanScale; lit: boolean }) {
  if (!position) return null;
  const [x, y] = scale.at(position);
  if (!normal || Math.abs(normal[2]) > 0.7) return <FlatMark x={x} y={y} size={size} scale={scale} lit={lit} />;
  const length = Math.max((size?.[0] ?? 0) * scale.scale, 8);
  const angle = (Math.atan2(-normal[1], normal[0]) * 180) / Math.PI;
  const solid = kind === "wall";
  return (
    <g transform={`translate(${x.toFixed(1)} ${y.toFixed(1)}) rotate(${angle.toFixed(1)})`}>
      <rect x={-LEAST_TARGET / 2} y={-Math.max(length, LEAST_TARGET) / 2} width={LEAST_TARGET} height={Math.max(length, LEAST_TARGET)} fill="transparent" />
      {(!solid || lit) && <HatchBox kind={hatchOf(kind)} lit={lit} x={-THICK / 2} y={-length / 2} width={THICK} height={length} />}
    </g>
  );
}

/** What lies flat over a room is only drawn while it is lit: it would cover what is under it. */
function FlatMark({ x, y, size, scale, lit }: { x: number; y: number; size: PathElement["size"]; scale: PlanScale; lit: boolean }) {
  if (!lit || !size) return null;
  const [width, height] = [size[0] * scale.scale, size[1] * scale.scale];
  return <rect x={x - width / 2} y={y - height / 2} width={width} height={height} strokeWidth="3" strokeDasharray="7 5" className="fill-none stroke-ink" />;
}

const POSTS = 3;

/** A fence with a post every three metres. */
export function FenceMark({ fence: { p1, p2 }, scale, lit }: { fence: Plan["fences"][number]; scale: PlanScale; lit: boolean }) {
  const [from, to] = [scale.at(p1), scale.at(p2)];
  const length = Math.hypot(p2[0] - p1[0], p2[1] - p1[1]);
  const posts = Math.max(1, Math.round(length / POSTS));
  const [dx, dy] = [(to[0] - from[0]) / posts, (to[1] - from[1]) / posts];
  const away = Math.hypot(dx, dy) || 1;
  const post = (index: number) => {
    const [x, y] = [from[0] + dx * index, from[1] + dy * index];
    const side = [(-dy / away) * 5, (dx / away) * 5] as const;
    return drawLine([[x - side[0], y - side[1]], [x + side[0], y + side[1]]]);
  };
  return (
    <>
      <path d={drawLine([from, to])} strokeWidth={LEAST_TARGET} className="stroke-transparent" />
      {lit && <path d={drawLine([from, to])} strokeWidth="8" className="stroke-lamp" />}
      <path d={drawLine([from, to])} strokeWidth={lit ? 3 : 2} className="stroke-ink" />
      <path d={Array.from({ length: posts + 1 }, (_, index) => post(index)).join("")} strokeWidth="1.5" className="stroke-ink" />
    </>
  );
}

export function TreeMark({ tree: { at, crown }, scale, lit }: { tree: Plan["lot"]["trees"][number]; scale: PlanScale; lit: boolean }) {
  const [x, y] = scale.at(at);
  return (
    <>
      <circle cx={x} cy={y} r={Math.max((crown / 2) * scale.scale, LEAST_TARGET / 2)} strokeWidth={lit ? 2.5 : 1} strokeDasharray="6 4" className={lit ? "fill-lampwash stroke-ink" : "fill-transparent stroke-edge"} />
      <circle cx={x} cy={y} r="2.5" className={lit ? "fill-ink" : "fill-edge"} />
    </>
  );
}

/** A source or a mouth outdoors. */
export function SourceMark({ position, scale, lit, mouth }: { position: readonly number[]; scale: PlanScale; lit: boolean; mouth: boolean }) {
  const [x, y] = scale.at(position);
  const half = mouth ? 7 : 10;
  return (
    <>
      <rect x={x - 12} y={y - 12} width={LEAST_TARGET} height={LEAST_TARGET} fill="transparent" />
      <HatchBox kind={mouth ? "duct" : "outdoor unit"} lit={lit} x={x - half} y={y - half} width={2 * half} height={2 * half} />
      {!mouth && <circle cx={x} cy={y} r="5.5" strokeWidth="1.5" className="fill-sheet stroke-ink" />}
    </>
  );
}

/** A source indoors: shown, and changed among the sources. */
export function IndoorSource({ position, scale }: { position: readonly number[]; scale: PlanScale }) {
  const [x, y] = scale.at(position);
  return (
    <>
      <circle cx={x} cy={y} r="6" strokeWidth="1.6" className="fill-sheet stroke-ink" />
      <circle cx={x} cy={y} r="2" className="fill-ink" />
    </>
  );
}

export const LISTENER = 26;
const STATUS = 18;

/** The mark of a listener's verdict where he listens. */
export function ListenerMark({ position, state, scale, lit, size }: { position: readonly number[]; state: State; scale: PlanScale; lit: boolean; size: number }) {
  const [x, y] = scale.at(position);
  const half = size / 2;
  const target = Math.max(size, LEAST_TARGET);
  return (
    <g transform={`translate(${(x - half).toFixed(1)} ${(y - half).toFixed(1)})`} className={stateColour[state]}>
      {lit && <rect x="-5" y="-5" width={size + 10} height={size + 10} rx="5" strokeWidth="1.5" className="fill-lamp stroke-ink" />}
      <rect x={half - target / 2} y={half - target / 2} width={target} height={target} fill="transparent" />
      <rect width={size} height={size} rx="3" strokeWidth="1.8" stroke="currentColor" className="fill-sheet" />
      <g transform={`translate(${half - (STATUS / 2) * (size / LISTENER)} ${half - (STATUS / 2) * (size / LISTENER)})`}>
        <StatusMark state={state} size={(STATUS * size) / LISTENER} />
      </g>
    </g>
  );
}

interface LightableProps {
  label: string;
  lit: boolean;
  /** Reached by Tab once the reader has gone into the plan. */
  inside: boolean;
  onLight: () => void;
  children: ReactNode;
}

/** Something on the plan that is lit by a press or when the focus comes to it. */
export function Lightable({ label, lit, inside, onLight, children }: LightableProps) {
  return (
    <g role="button" aria-label={label} aria-pressed={lit} tabIndex={inside ? 0 : -1} onClick={onLight} onFocus={onLight} className="cursor-pointer">
      {children}
    </g>
  );
}
