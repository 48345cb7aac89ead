"use client";

import { useMemo, useState, type KeyboardEvent } from "react";
import type { Plan } from "../../lib/noise/plan";
import type { Verdict } from "../../lib/noise/verdict";
import { marginWords, stateWords } from "../format";
import { useFigures } from "../ui/figures";
import { stateColour } from "../marks/MarginWords";
import { cornersIn } from "./geometry";
import { PlanGround } from "./PlanGround";
import { House, nameBoxes } from "./PlanHouses";
import { placeLabels, takenBoxes, type PlacedLabel } from "./planLabels";
import { ElementMark, FenceMark, IndoorSource, Lightable, ListenerMark, SourceMark, TreeMark } from "./PlanMarks";
import { drawOutline, fitted, planScale, type PlanScale } from "./planScale";
import { PlanSheaf } from "./PlanSheaf";
import { ribbonsOf, type Mouth, type Way } from "./sheaf";
import { isSame, outdoorOutlets, outdoorSources, type Thing } from "./things";

interface Props {
  plan: Plan;
  verdict: Verdict;
  ways: readonly Way[];
  mouth: Mouth | null;
  lit: Thing | null;
  litWay: string | null;
  /** Whom the sheaf leads to. */
  listenerId: string | null;
  width: number;
  says: string;
  onLight: (thing: Thing) => void;
  onKeyDown: (event: KeyboardEvent) => void;
  onKeyUp: (event: KeyboardEvent) => void;
}

/** Below this width of the drawing, px, its marks are smaller and few things are named. */
const NARROW = 560;
/** A way under this share is left to the figures. */
const DRAWN_SHARE = 0.005;
/** Window of the sheaf, m, and its bounds on the screen, px: everything that arrives is as wide as that. */
const SHEAF = { metres: 1.6, least: 26, most: 54 };

/** The yard from above, to scale. One stop for the keyboard: Enter goes in, Tab walks, arrows move the lit thing, Esc leaves. */
export function PlanDrawing(props: Props) {
  const { plan, verdict, ways, mouth, lit, litWay, listenerId, width, says, onLight, onKeyDown, onKeyUp } = props;
  const { units } = useFigures();
  const [inside, setInside] = useState(false);
  const scale = useMemo(() => planScale(plan, width), [plan, width]);
  const ribbons = useMemo(() => {
    if (!mouth) return [];
    const full = Math.min(SHEAF.most, Math.max(SHEAF.least, SHEAF.metres * scale.scale));
    return ribbonsOf({ ways: ways.filter(({ share }) => share >= DRAWN_SHARE), mouth: { at: scale.at(mouth.at), out: mouth.out }, full, toPixels: scale.at });
  }, [ways, mouth, scale]);
  const labels = useMemo(
    () => placeLabels({ plan, verdict, scale, ribbons, few: width < NARROW, listenerId, taken: [...takenBoxes({ plan, scale, ribbons }), ...nameBoxes(plan, scale)] }),
    [plan, verdict, scale, ribbons, width, listenerId],
  );
  function press(event: KeyboardEvent) {
    if (event.key === "Enter" && event.target === event.currentTarget) setInside(true);
    if (event.key === "Escape") {
      setInside(false);
      (event.currentTarget as SVGSVGElement).focus();
    }
    onKeyDown(event);
  }
  const thing = (part: Thing["part"], id: string, label: string) => ({ label, inside, lit: isSame(lit, { part, id }), onLight: () => onLight({ part, id }) });
  const stateOf = (id: string) => verdict.receivers.find(({ receiverId }) => receiverId === id);
  return (
    <svg
      width={scale.width}
      height={scale.height}
      viewBox={`0 0 ${scale.width} ${scale.height}`}
      role="group"
      aria-label={says}
      tabIndex={0}
      onKeyDown={press}
      onKeyUp={onKeyUp}
      className="block max-w-full"
    >
      <PlanGround scale={scale} units={units} />
      {cornersIn(plan).length === 0 && <EmptyPlan scale={scale} />}
      <Lot plan={plan} scale={scale} lit={lit?.part === "lots"} />
      {plan.lot.trees.map((tree, at) => (
        <Lightable key={at} {...thing("trees", `${at}`, `Tree ${at + 1}`)}>
          <TreeMark tree={tree} scale={scale} lit={isSame(lit, { part: "trees", id: `${at}` })} />
        </Lightable>
      ))}
      {plan.buildings.map((building) => (
        <Lightable key={building.id} {...thing("buildings", building.id, building.name)}>
          <House building={building} rooms={plan.spaces.filter(({ buildingId }) => buildingId === building.id)} scale={scale} lit={isSame(lit, { part: "buildings", id: building.id })} />
        </Lightable>
      ))}
      {plan.fences.map((fence) => (
        <Lightable key={fence.id} {...thing("fences", fence.id, fence.name)}>
          <FenceMark fence={fence} scale={scale} lit={isSame(lit, { part: "fences", id: fence.id })} />
        </Lightable>
      ))}
      <PlanSheaf
        ribbons={ribbons}
        litId={litWay}
        onLight={({ way }) => {
          const part = partOfWay(plan, way);
          if (part) onLight(part);
        }}
      />
      {outdoorElements(plan).map((element) => (
        <Lightable key={element.id} {...thing("elements", element.id, element.name)}>
          <ElementMark element={element} scale={scale} lit={isSame(lit, { part: "elements", id: element.id }) || element.id === mouth?.elementId} />
        </Lightable>
      ))}
      {plan.sources.map(({ id, spaceId, position }) => spaceId && position && <IndoorSource key={id} position={position} scale={scale} />)}
      {placedSources(plan).map(({ part, id, name, position }) => (
        <Lightable key={id} {...thing(part, id, name)}>
          <SourceMark position={position} scale={scale} mouth={part === "outlets"} lit={isSame(lit, { part, id })} />
        </Lightable>
      ))}
      {plan.receivers.map(({ id, name, position }) => {
        const judged = stateOf(id);
        const state = judged?.state ?? "not weighed";
        return (
          position && (
            <Lightable key={id} {...thing("receivers", id, `${name}, ${judged ? marginWords(state, judged.margin ?? undefined) : stateWords[state]}`)}>
              <ListenerMark position={position} state={state} scale={scale} lit={id === listenerId} size={width < NARROW ? 20 : 26} />
            </Lightable>
          )
        );
      })}
      {labels.map((label) => (
        <PlanLabel key={label.key} label={label} />
      ))}
    </svg>
  );
}

/** Elements that have a place: those that look outdoors. */
const outdoorElements = ({ elements, paths }: Plan) => {
  const outdoors = new Set(paths.filter(({ toSpaceId }) => toSpaceId === null).map(({ id }) => id));
  return elements.filter(({ pathId, position }) => position !== null && outdoors.has(pathId));
};

/** Sources and mouths outdoors that have a place. */
const placedSources = (plan: Plan) => {
  const parts = [
    ...outdoorSources(plan).map((one) => ({ ...one, part: "sources" as const })),
    ...outdoorOutlets(plan).map((one) => ({ ...one, part: "outlets" as const })),
  ];
  return parts.flatMap(({ part, id, name, position }) => (position ? [{ part, id, name, position }] : []));
};

/** What a way opens: the element, the source or the mouth it leaves by. */
export function partOfWay(plan: Plan, { partId }: Way): Thing | null {
  if (partId === null) return null;
  const parts = ["elements", "sources", "outlets"] as const;
  const part = parts.find((list) => plan[list].some(({ id }) => id === partId));
  return part ? { part, id: partId } : null;
}

function Lot({ plan: { lot }, scale, lit }: { plan: Plan; scale: PlanScale; lit: boolean }) {
  if (!lot.outline) return null;
  const [, south] = scale.at([0, Math.min(...lot.outline.map(([, y]) => y))]);
  const [x] = scale.at(lot.outline[0]!);
  return (
    <g aria-hidden="true">
      <path d={drawOutline(lot.outline, scale)} strokeWidth={lit ? 3 : 1.6} strokeDasharray={lit ? undefined : "14 4 3 4"} className={lit ? "fill-lampwash stroke-ink" : "fill-none stroke-ink"} />
      {lot.street && (
        <text x={x + 8} y={south - 8} className="fill-ink2 text-least">
          {fitted(lot.street, 13, 220)}
        </text>
      )}
    </g>
  );
}

function EmptyPlan({ scale }: { scale: PlanScale }) {
  const [x, y] = scale.at([2, 22]);
  return <rect x={x} y={y} width={12 * scale.scale} height={20 * scale.scale} strokeWidth="2" strokeDasharray="9 7" className="fill-none stroke-edge" />;
}

function PlanLabel({ label: { x, y, words, under } }: { label: PlacedLabel }) {
  return (
    <g aria-hidden="true" className="pointer-events-none">
      <text x={x} y={y} paintOrder="stroke" strokeWidth="4" strokeLinejoin="round" className="stroke-sheet text-least font-semibold">
        {words}
      </text>
      {under && (
        <text x={x} y={y + 17} paintOrder="stroke" strokeWidth="4" strokeLinejoin="round" className={`fill-current stroke-sheet text-least font-[650] ${stateColour[under.state]}`}>
          {under.words}
        </text>
      )}
    </g>
  );
}
