"use client";

import { useAtom } from "jotai";
import { useEffect, useRef, useState } from "react";
import type { Criterion, Plan, Receiver } from "@/lib/noise/plan";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import { budgetAddress, limitsAddress } from "../addresses";
import { capitalise } from "../format";
import { Icon } from "../marks/Icon";
import type { Saved } from "../plan/save";
import { SaveNotices } from "../plan/SaveNotices";
import { usePlanSave, type PlanSave } from "../plan/usePlanSave";
import { litReceiverAtom } from "../state/plan";
import { Button } from "../ui/Button";
import { FoldedSheet } from "../ui/FoldedSheet";
import { Strip } from "../ui/Strip";
import { inSentence } from "../verdict/chartWords";
import { useLasting } from "../walls/useLasting";
import { VerdictStrip } from "../walls/VerdictStrip";
import { AddListener } from "./AddListener";
import { Deference } from "./Deference";
import { LimitView } from "./LimitView";
import { ListenerFields } from "./ListenerFields";
import { ListenersPanel } from "./ListenersPanel";
import { valuesOf, type LimitLibrary } from "./limitPatches";
import { LockedLine, ReadListener } from "./ReadLimit";
import { fieldWords } from "./noticeWords";
import { useLimitEdits } from "./useLimitEdits";

export interface LimitsStageProps {
  projectId: string;
  library: LimitLibrary;
  may: { edit: boolean; reason: string };
}

const UNDER_THE_STRIP = "[&_:is(input,textarea,select,button,summary,a,li)]:scroll-mt-32";
const ADD = "add-listener";

function headOf(listener: Receiver | undefined): string {
  if (!listener) return "What your neighbours may hear";
  const says = listener.says || inSentence(listener.name);
  return capitalise(says.startsWith("what ") ? says : `what ${says} may hear`);
}

const idAddedIn = (before: Plan, saved: Saved | undefined): string | undefined =>
  saved?.kind === "saved" ? saved.answer.plan.criteria.find(({ id }) => !before.criteria.some((known) => known.id === id))?.id : undefined;

/** Which listener, which of its limits and which band one is looking at. */
function useLooking({ answer: { plan, verdict } }: PlanSave) {
  const [litId, light] = useAtom(litReceiverAtom);
  const [limitId, setLimitId] = useState<string>();
  const [band, setBand] = useState<number>();
  const listener = plan.receivers.find(({ id }) => id === litId) ?? plan.receivers.find(({ id }) => id === verdict.leadingReceiverId) ?? plan.receivers[0];
  const limits = plan.criteria.filter(({ receiverId }) => receiverId === listener?.id);
  const weighed = verdict.receivers.find(({ receiverId }) => receiverId === listener?.id);
  const limit = limits.find(({ id }) => id === limitId) ?? limits.find(({ id }) => id === weighed?.criterionId) ?? limits[0];
  const leading = weighed?.band && !weighed.weighted ? OCTAVE_BANDS.indexOf(weighed.band) : null;
  return {
    listener,
    limits,
    limit,
    weighed,
    band: band ?? leading,
    setBand,
    setLimitId,
    light: (id: string) => {
      light(id);
      setLimitId(undefined);
      setBand(undefined);
    },
  };
}

/** Who listens, and what each may hear: words, hours, window and nine figures. */
export function LimitsStage({ projectId, library, may }: LimitsStageProps) {
  const save = usePlanSave(projectId);
  const edits = useLimitEdits(save);
  const looking = useLooking(save);
  const weighing = useLasting(save.saving, 400);
  const [adding, setAdding] = useState(false);
  const [removed, setRemoved] = useState<Criterion>();
  const form = useRef<HTMLDivElement>(null);
  const { plan, verdict } = save.answer;
  const { listener, limits, limit } = looking;
  const empty = plan.receivers.length === 0;
  const formOpen = may.edit && (adding || empty);
  useEffect(() => {
    if (adding) form.current?.querySelector("input")?.focus();
  }, [adding]);

  async function copy(libraryKey: string) {
    if (!listener) return;
    const saved = await save.save({ act: "add", part: "criteria", values: { libraryKey, receiverId: listener.id } }, `${listener.id} limit`);
    looking.setLimitId(idAddedIn(plan, saved));
  }
  async function removeLimit(gone: Criterion) {
    const saved = await save.save({ act: "remove", part: "criteria", id: gone.id }, `${gone.id} remove`);
    if (saved.kind === "saved") setRemoved(gone);
  }
  async function bringBack(gone: Criterion) {
    const saved = await save.save({ act: "add", part: "criteria", values: valuesOf(gone) }, "undo");
    if (saved.kind !== "saved") return;
    setRemoved(undefined);
    looking.light(gone.receiverId);
    looking.setLimitId(idAddedIn(plan, saved));
  }
  return (
    <div className={UNDER_THE_STRIP}>
      <VerdictStrip answer={save.answer} before={save.before} weighing={weighing} projectId={projectId} budgetHref={budgetAddress(projectId)} />
      <SaveNotices save={save} here={limitsAddress(projectId)} words={fieldWords} />
      {removed && plan.receivers.some(({ id }) => id === removed.receiverId) && (
        <Strip kind="undo" heading={`${removed.name} is removed.`} action={<Button onClick={() => void bringBack(removed)}>Bring it back</Button>} className="mb-5 wrap-anywhere" />
      )}
      <div className="mb-4 mid:mb-5">
        <h1 className="max-w-[44ch] text-verdictPhone leading-[1.12] wrap-anywhere desk:text-verdict">{headOf(listener)}</h1>
        <p className="mt-1 max-w-[64ch] text-ink2">A limit is a clause, read by somebody on a date. Write down which words you weigh against. Every change weighs at once.</p>
      </div>
      <div className="grid rounded-sheet bg-sheet wide:grid-cols-[minmax(236px,288px)_minmax(0,1fr)]">
        <section aria-labelledby="who" className="min-w-0 border-rule pt-4 mid:pt-6.5 max-wide:border-b wide:sticky wide:top-20 wide:self-start">
          <h2 id="who" className="mb-3 px-4 text-section mid:px-6.5">
            Who listens
          </h2>
          {empty && <p className="px-4 pb-3 text-ink2 mid:px-6.5">Nobody yet, so nothing can be over. Add whoever sleeps, works or lives within earshot, and yourself.</p>}
          {!empty && <ListenersPanel plan={plan} verdict={verdict} lit={listener} onLight={looking.light} />}
          <div id={ADD} ref={form} className="border-t border-rule p-4 mid:px-6.5">
            {may.edit && !empty && (
              <Button icon={<Icon name={formOpen ? "remove" : "plus"} size={18} />} aria-expanded={formOpen} onClick={() => setAdding(!adding)}>
                {formOpen ? "Not now" : "Add a listener"}
              </Button>
            )}
            {formOpen && (
              <div className={empty ? "max-w-xl" : "mt-4 max-w-xl"}>
                <AddListener
                  plan={plan}
                  save={save}
                  records={library.records}
                  onAdded={(id) => {
                    setAdding(false);
                    looking.light(id);
                  }}
                />
              </div>
            )}
            {!may.edit && <LockedLine reason={may.reason} />}
            {!empty && <p className="mt-3 text-second text-ink2">A listener may carry several limits. The one with the least room left is weighed, and named.</p>}
          </div>
        </section>
        {listener ? (
          <LimitView
            key={listener.id}
            {...{ projectId, library, may, save, edits, listener, limits, limit }}
            weighed={looking.weighed}
            band={looking.band}
            onBand={looking.setBand}
            onLimit={looking.setLimitId}
            onCopy={(key) => void copy(key)}
            onRemove={(gone) => void removeLimit(gone)}
          />
        ) : (
          <div className="p-4 mid:p-6.5">
            <Deference />
          </div>
        )}
      </div>
      {listener && (
        <FoldedSheet heading="The listener" className="mt-3 mid:mt-5">
          <div className="max-w-3xl">
            {may.edit ? (
              <ListenerFields
                plan={plan}
                listener={listener}
                edits={edits}
                onRemove={() => void save.save({ act: "remove", part: "receivers", id: listener.id }, `${listener.id} remove`)}
              />
            ) : (
              <ReadListener listener={listener} plan={plan} />
            )}
          </div>
        </FoldedSheet>
      )}
    </div>
  );
}
