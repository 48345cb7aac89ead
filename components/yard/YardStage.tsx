"use client";

import { useAtom, useAtomValue } from "jotai";
import { useMemo, useRef, useState } from "react";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import { budgetAddress, yardAddress } from "../addresses";
import { bandWords } from "../format";
import { Icon } from "../marks/Icon";
import { HatchDefs } from "../marks/HatchDefs";
import { SaveNotices } from "../plan/SaveNotices";
import { usePlannedSave } from "../plan/usePlannedSave";
import { usePlanSave } from "../plan/usePlanSave";
import { litBandAtom, litReceiverAtom, type Answer } from "../state/plan";
import { Button } from "../ui/Button";
import { useFigures } from "../ui/figures";
import { Strip } from "../ui/Strip";
import { useDrawnWidth } from "../ui/useDrawnWidth";
import { FieldError } from "../ui/FieldFrame";
import { leadOf } from "../walls/answer";
import { useLasting } from "../walls/useLasting";
import { VerdictStrip } from "../walls/VerdictStrip";
import { cornersIn, extentOf, type Spot } from "./geometry";
import { additionOf, duplicateOf } from "./newThings";
import { PlanDrawing, partOfWay } from "./PlanDrawing";
import { planWords } from "./planWords";
import { removalOf } from "./removals";
import { mouthOf, waysInto } from "./sheaf";
import { ThingFields } from "./ThingFields";
import { ThingList } from "./ThingList";
import { groupsOf, keyOf, nameOf, type Thing, type ThingGroup } from "./things";
import { useNudge } from "./useNudge";
import { WaysInto } from "./WaysInto";
import type { PlanChange } from "../plan/save";

export interface YardStageProps {
  projectId: string;
  may: { edit: boolean; reason: string };
  /** Key of the library's outdoor unit; undefined where it has none. */
  condenserKey?: string;
}

const PROMISED = { 390: 342, 720: 620, 1024: 560, 1440: 900 };

/** The listener and the band that the sheaf leads to: the lit ones, else those that decide. */
function useSheaf({ plan, verdict }: Answer) {
  const litReceiver = useAtomValue(litReceiverAtom);
  const litBand = useAtomValue(litBandAtom);
  const weighed = verdict.receivers.find(({ receiverId }) => receiverId === (litReceiver ?? verdict.leadingReceiverId));
  const band = litBand ?? weighed?.band ?? 63;
  const bandIndex = Math.max(0, OCTAVE_BANDS.findIndex((one) => one === band));
  return useMemo(() => {
    if (!weighed) return null;
    const receiver = plan.receivers.find(({ id }) => id === weighed.receiverId);
    const into = receiver?.name ?? "the listener";
    return {
      receiverId: weighed.receiverId,
      ways: waysInto(plan, weighed, bandIndex),
      mouth: mouthOf(plan, weighed),
      heading: weighed.weighted ? `Into ${into}, of the whole` : `Into ${into}, at ${bandWords(OCTAVE_BANDS[bandIndex]!)}`,
    };
  }, [plan, weighed, bandIndex]);
}

/** The yard from above with everything in it: what is lit has its fields beside the plan. */
export function YardStage({ projectId, may, condenserKey }: YardStageProps) {
  const save = usePlanSave(projectId);
  const planned = usePlannedSave(save);
  const { answer, before, saving } = save;
  const { plan, verdict } = answer;
  const weighing = useLasting(saving, 400);
  const figures = useFigures();
  const sheaf = useSheaf(answer);
  const [, lightReceiver] = useAtom(litReceiverAtom);
  const [lit, setLit] = useState<Thing | null>(() => firstLit(answer));
  /** Offered until anything else is saved. */
  const [undo, setUndo] = useState<{ words: string; changes: PlanChange[]; revision: number }>();
  const [place, width] = useDrawnWidth<HTMLDivElement>(PROMISED, 900);
  const heading = useRef<HTMLHeadingElement>(null);
  const spotOf = (thing: Thing) => `yard/${keyOf(thing)}`;
  const { shown, onKeyDown, onKeyUp } = useNudge({ plan, lit: may.edit ? lit : null, planned, spotOf });
  const litName = lit && nameOf(plan, lit);
  const start = useMemo(() => startOf(plan), [plan]);

  function light(thing: Thing) {
    setLit(thing);
    if (thing.part === "receivers") lightReceiver(thing.id);
  }

  /** Sends what adds one thing and lights it: the one that was not there before. */
  async function put(part: ThingGroup["part"] | Thing["part"], changes: (now: typeof plan) => PlanChange[]) {
    let old = new Set<string>();
    const saved = await planned((now) => {
      old = new Set(idsOf(now, part));
      return changes(now);
    }, `yard/add ${part}`);
    if (saved?.kind !== "saved") return;
    const id = idsOf(saved.answer.plan, part).find((one) => !old.has(one));
    setUndo(undefined);
    if (id !== undefined) light({ part, id });
    heading.current?.focus();
  }

  async function remove(thing: Thing, name: string) {
    let back: PlanChange[] = [];
    const saved = await planned((now) => {
      const removal = removalOf(now, thing);
      back = removal.undo;
      return removal.changes;
    }, spotOf(thing));
    if (saved?.kind !== "saved") return;
    setLit(null);
    setUndo({ words: `${name} is removed.`, changes: back, revision: saved.answer.revision });
  }

  async function bringBack(changes: PlanChange[]) {
    const saved = await planned(() => changes, "yard/undo");
    if (saved?.kind === "saved") setUndo(undefined);
  }

  const addError = groupsOf(plan).map(({ part }) => save.errorOf(`yard/add ${part}`)).find(Boolean) ?? save.errorOf("yard/undo");
  const litWay = sheaf?.ways.find(({ partId }) => lit && partId === lit.id)?.id ?? null;
  return (
    <div className="[&_:is(input,button,summary,a,select)]:scroll-mt-32">
      <HatchDefs />
      <VerdictStrip answer={answer} before={before} weighing={weighing} projectId={projectId} budgetHref={budgetAddress(projectId)} />
      <SaveNotices save={save} here={yardAddress(projectId)} words={planWords} />
      {undo?.revision === answer.revision && (
        <Strip
          kind="undo"
          heading={undo.words}
          className="mb-5"
          action={<Button onClick={() => void bringBack(undo.changes)}>Undo</Button>}
        />
      )}
      <h1 className="mb-4 text-verdictPhone leading-[1.12] mid:mb-5 desk:text-verdict">Yard</h1>
      <div className="rounded-sheet bg-sheet desk:grid desk:grid-cols-[minmax(0,1fr)_372px]">
        <div className="min-w-0 p-2.5 mid:p-5">
          <div ref={place}>
            <PlanDrawing
              plan={shown}
              verdict={verdict}
              ways={sheaf?.ways ?? NO_WAYS}
              mouth={sheaf?.mouth ?? null}
              lit={lit}
              litWay={litWay}
              listenerId={sheaf?.receiverId ?? null}
              width={width}
              says={`Plan of the yard to scale, north up. ${sheaf ? `${sheaf.heading}: ribbons as wide as their share.` : "Nobody listens yet."}`}
              onLight={light}
              onKeyDown={onKeyDown}
              onKeyUp={onKeyUp}
            />
          </div>
          <p className="mt-2 text-second text-ink2">
            {cornersIn(plan).length === 0
              ? "Start with the fence. Pace it out if you must: a metre either way changes little."
              : "East is counted to the right and north upwards from the point 0, 0 of the rules."}
            {may.edit && " On the plan, arrow keys move the lit thing by 0.1 m, with Shift by 1 m; Enter goes in, Tab walks, Esc leaves."}
          </p>
        </div>
        <div className="min-w-0 border-t border-rule p-4 mid:p-6.5 desk:border-l desk:border-t-0">
          <h2 ref={heading} tabIndex={-1} className="break-words text-section">
            {lit && litName !== undefined ? litName : "Nothing is lit"}
          </h2>
          {lit && litName !== undefined ? (
            <div className="mt-3" key={keyOf(lit)}>
              <ThingFields thing={lit} plan={plan} start={start} spot={spotOf(lit)} save={save} planned={planned} locked={!may.edit} />
              {may.edit && lit.part !== "lots" && lit.part !== "elements" && (
                <div className="mt-4 flex flex-wrap gap-2">
                  {lit.part !== "outlets" && <Button onClick={() => void put(lit.part, (now) => duplicateOf(now, lit))}>Duplicate</Button>}
                  <Button onClick={() => void remove(lit, litName ?? "It")}>Remove</Button>
                </div>
              )}
              <FieldError id={`${keyOf(lit)}-all`} error={save.errorOf(spotOf(lit))} />
            </div>
          ) : (
            <p className="mt-1 text-second text-ink2">Press something on the plan or in the list.</p>
          )}
          {!may.edit && (
            <p className="mt-4 flex items-center gap-2 text-second text-ink2">
              <Icon name="lock" size={18} />
              {may.reason}
            </p>
          )}
          {sheaf && (
            <WaysInto
              heading={sheaf.heading}
              ways={sheaf.ways}
              litId={litWay}
              figures={figures}
              onLight={(way) => {
                const part = partOfWay(plan, way);
                if (part) light(part);
              }}
            />
          )}
        </div>
      </div>
      <section aria-label="Everything in the yard" className="mt-5 rounded-sheet bg-sheet p-4 mid:p-6.5">
        <h2 className="mb-3 text-section">Everything in the yard</h2>
        <FieldError id="yard-add" error={addError} />
        <ThingList
          groups={groupsOf(plan)}
          lit={lit}
          mayAdd={may.edit}
          onLight={(thing) => {
            light(thing);
            heading.current?.focus();
          }}
          onAdd={(part) => void put(part, (now) => additionOf(now, part, part === "sources" ? condenserKey : undefined))}
        />
      </section>
    </div>
  );
}

const NO_WAYS: never[] = [];

const idsOf = (plan: Answer["plan"], part: Thing["part"]): string[] => {
  if (part === "trees") return plan.lot.trees.map((_, at) => `${at}`);
  return part === "lots" ? [] : plan[part].map(({ id }) => id);
};

/** The loudest way into the listener that leads; the lot where nothing is weighed yet. */
function firstLit({ plan, verdict }: Answer): Thing {
  const lead = leadOf({ plan, verdict, revision: 0 });
  const loudest = lead && waysInto(plan, lead.receiver, lead.bandIndex).find(({ partId }) => partId !== null);
  return (loudest && partOfWay(plan, loudest)) ?? { part: "lots", id: plan.lot.id };
}

function startOf(plan: Answer["plan"]): Spot {
  const corners = cornersIn(plan);
  if (corners.length === 0) return [0, 0, 1.5];
  const { west, east, south, north } = extentOf(corners);
  return [Math.round((west + east) / 2), Math.round((south + north) / 2), 1.5];
}
