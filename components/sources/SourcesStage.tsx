"use client";

import { useAtomValue } from "jotai";
import { useRef, useState } from "react";
import { budgetAddress, sourcesAddress } from "../addresses";
import { Icon } from "../marks/Icon";
import { SaveNotices } from "../plan/SaveNotices";
import { usePlannedSave } from "../plan/usePlannedSave";
import { usePlanSave } from "../plan/usePlanSave";
import { savingAtom } from "../state/plan";
import { Button } from "../ui/Button";
import { Sheet } from "../ui/Sheet";
import { Strip } from "../ui/Strip";
import { leadOf } from "../walls/answer";
import { useLasting } from "../walls/useLasting";
import { VerdictStrip } from "../walls/VerdictStrip";
import { AddSource } from "./AddSource";
import { goingWith, removeSource, restoreSource } from "./changes";
import type { SourceDesk, SourceFigures, SourceKindChoice, Undo } from "./desk";
import { sourceFieldWords } from "./fieldWords";
import { Situations } from "./Situations";
import { SourceEditor } from "./SourceEditor";
import { SourceList } from "./SourceList";
import { decidingWords, goingWords, headingWords } from "./sourceWords";

export interface SourcesStageProps extends SourceFigures {
  projectId: string;
  library: SourceDesk["library"];
  kinds: readonly SourceKindChoice[];
  may: { edit: boolean; reason: string };
}

const UNDER_THE_STRIP = "[&_:is(input,button,summary,a,select,textarea,li)]:scroll-mt-32";

/** The stage of the sources: all of them, the lit one in full, and what plays at once. */
export function SourcesStage({ projectId, library, kinds, may, ...figures }: SourcesStageProps) {
  const save = usePlanSave(projectId);
  const planned = usePlannedSave(save);
  const weighing = useLasting(useAtomValue(savingAtom), 400);
  const [chosenId, setChosenId] = useState<string>();
  const [adding, setAdding] = useState(false);
  const [undo, setUndo] = useState<Undo>();
  const place = useRef<HTMLDivElement>(null);
  const { answer } = save;
  const { plan } = answer;

  async function act(...[changes, spot, back]: Parameters<SourceDesk["act"]>): Promise<boolean> {
    const saved = await planned((now) => [...changes(now)], spot);
    if (saved && saved.kind !== "saved") return false;
    setUndo(back);
    const added = saved?.answer.plan.sources.find(({ id }) => !plan.sources.some((source) => source.id === id));
    if (added) setChosenId(added.id);
    return true;
  }

  const desk: SourceDesk = { answer, save, act, library, kinds, locked: !may.edit, ...figures };
  const decidingId = leadOf(answer)?.receiver.facts.sourceId;
  const lit = plan.sources.find(({ id }) => id === chosenId) ?? plan.sources.find(({ id }) => id === decidingId) ?? plan.sources[0];

  function remove() {
    if (!lit) return;
    let before = plan; // as it stands when its turn comes: a save may still be on its way
    const words = [`${lit.name} removed.`, goingWords(goingWith(plan, lit.id))].filter(Boolean).join(" ");
    const taken = (standing: typeof plan) => {
      before = standing;
      return removeSource(lit.id);
    };
    void act(taken, `remove ${lit.id}`, { words, changes: (now) => restoreSource(before, now, lit.id) });
  }

  return (
    <div className={UNDER_THE_STRIP}>
      <VerdictStrip answer={answer} before={save.before} weighing={weighing} projectId={projectId} budgetHref={budgetAddress(projectId)} />
      <SaveNotices save={save} here={sourcesAddress(projectId)} words={sourceFieldWords(plan)} />
      {undo && (
        <Strip kind="undo" heading={undo.words} className="mb-5" action={<Button onClick={() => void act(undo.changes, "undo")}>Undo</Button>}>
          {save.errorOf("undo")}
        </Strip>
      )}
      <div className="mb-4 flex flex-wrap items-end justify-between gap-x-6 gap-y-3 mid:mb-5">
        <div className="min-w-0 flex-[1_1_20rem]">
          <h1 className="break-words text-verdictPhone leading-[1.12] desk:text-verdict">{headingWords(answer)}</h1>
          <p className="mt-1 max-w-[60ch] text-lead text-ink2">{decidingWords(answer)}</p>
          {!may.edit && (
            <p className="mt-2 flex items-center gap-2 text-second text-ink2">
              <Icon name="lock" size={18} /> {may.reason}
            </p>
          )}
        </div>
        {may.edit && (
          <Button icon={<Icon name="plus" size={18} />} aria-expanded={adding} onClick={() => setAdding(!adding)}>
            Add a source
          </Button>
        )}
      </div>
      {adding && may.edit && (
        <AddSource desk={desk} onDone={() => setAdding(false)} />
      )}
      {lit ? (
        <>
          <Sheet bare aria-label="Sources" className="mb-5 pb-1">
            <SourceList desk={desk} litId={lit.id} onLight={setChosenId} onOpen={() => place.current?.querySelector<HTMLElement>("#lit-source")?.focus()} />
          </Sheet>
          <div ref={place}>
            <SourceEditor key={lit.id} desk={desk} source={lit} onRemove={remove} />
          </div>
        </>
      ) : (
        <Sheet heading="Nothing plays here yet" className="mb-5">
          <p className="max-w-[60ch] text-ink2">
            {may.edit ? "Add what you play first: a kit, an amplifier, a voice. Then what runs beside it, such as the outdoor unit of the air conditioning or a fan." : "Who draws this yard has added no source so far."}
          </p>
        </Sheet>
      )}
      <Situations desk={desk} />
    </div>
  );
}
