"use client";

import { useAtomValue } from "jotai";
import { useMemo, useState } from "react";
import type { ConstructionSheet } from "../../lib/noise/sheet";
import { elementAddress, budgetAddress, wallsAddress } from "../addresses";
import { savingAtom } from "../state/plan";
import { Sheet } from "../ui/Sheet";
import { leadOf } from "./answer";
import { Cautions } from "./Cautions";
import { cautionsOf } from "./cautions";
import { ConstructionChoice } from "./ConstructionChoice";
import { choicesFor, findSheet, type Library } from "./choices";
import { ElementFields, LockedReason } from "./ElementFields";
import { sidesOf, wordsOf } from "./elementWords";
import { LayersSheet } from "./LayersSheet";
import { elementComparison } from "./comparison";
import { DuctFields } from "./DuctFields";
import { ElementPlace } from "./ElementPlace";
import type { ElementPatch } from "./patches";
import { removalOf } from "../yard/removals";
import { RemovedElement, type Gone } from "./RemovedElement";
import { SaveNotices } from "../plan/SaveNotices";
import { SectionDrawing } from "./SectionDrawing";
import { useElementSave } from "./useElementSave";
import { useLasting } from "./useLasting";
import { VerdictStrip } from "./VerdictStrip";
import { WallHead } from "./WallHead";
import { WhatItStops } from "./WhatItStops";

export interface WallDetailProps {
  projectId: string;
  elementId: string;
  library: Library;
  may: { edit: boolean; reason: string };
}

const UNDER_THE_STRIP = "[&_:is(input,button,summary,a)]:scroll-mt-32";

/** One wall, roof, door or opening: what it is made of, what it stops, and what another one would do. */
export function WallDetail({ projectId, elementId, library, may }: WallDetailProps) {
  const { save, planned, errors, patch } = useElementSave(projectId, elementId);
  const { answer, before } = save;
  const [removed, setRemoved] = useState<Gone>();
  const saving = useAtomValue(savingAtom);
  const weighing = useLasting(saving, 400);
  const [markedKey, setMarkedKey] = useState<string>();
  const [litLayer, setLitLayer] = useState<number>();
  const { plan, verdict } = answer;
  const element = plan.elements.find(({ id }) => id === elementId);
  const sheet = findSheet(plan, library, element?.constructionId ?? null);
  const [opened] = useState({
    constructionId: element?.constructionId,
    sheet,
    judged: verdict.elements[elementId],
    area: element?.area ?? 0,
  });
  const choices = useMemo(() => choicesFor(plan, library, elementId), [plan, library, elementId]);
  if (!element) return <RemovedElement projectId={projectId} save={save} removed={removed} />;
  async function remove(gone: NonNullable<typeof element>) {
    const { changes, undo } = removalOf(answer.plan, { part: "elements", id: gone.id });
    const saved = await planned(() => changes, `place/${gone.id}`);
    if (saved?.kind === "saved") setRemoved({ name: gone.name, undo, revision: saved.answer.revision });
  }
  const words = wordsOf(element);
  const litBand = leadOf(answer)?.bandIndex ?? 1;
  const marked = choices.list.find(({ key }) => key === markedKey);
  const formerly =
    opened.judged && opened.constructionId !== element.constructionId
      ? { name: "before", loss: opened.judged.loss }
      : undefined;
  return (
    // What is focused must not hide under the strip.
    <div className={UNDER_THE_STRIP}>
      <VerdictStrip
        answer={answer}
        before={before}
        weighing={weighing}
        projectId={projectId}
        budgetHref={budgetAddress(projectId)}
        elementId={elementId}
      />
      <SaveNotices
        save={save}
        here={elementAddress(projectId, elementId)}
        words={elementComparison(save.conflict?.current.plan ?? plan, library, elementId)}
      />
      <WallHead
        element={element}
        sheet={sheet}
        judged={verdict.elements[elementId]}
        litBand={litBand}
        place={{ number: plan.elements.indexOf(element) + 1, of: plan.elements.length }}
        indexHref={wallsAddress(projectId)}
      />
      {sheet && sheet.layers.length > 0 && (
        <Sheet
          heading={words.section}
          beside={<span className="text-second text-ink3">to scale</span>}
          className="mb-5"
        >
          <SectionDrawing sheet={sheet} sides={sidesOf(element, plan)} lit={litLayer} />
        </Sheet>
      )}
      <div className="mb-5 rounded-sheet bg-sheet desk:grid desk:grid-cols-[minmax(0,1.75fr)_minmax(0,1fr)]">
        <div className="min-w-0 desk:border-r desk:border-rule">
          <LayersSheet element={element} plan={plan} sheet={sheet} lit={litLayer} onLight={setLitLayer} />
          {choices.list.length > 0 && (
            <Sheet
              className="border-t border-rule"
              heading={`Another ${words.one}`}
              says={
                may.edit
                  ? `The library’s ${words.many}, by what they stop at 63 Hz. Mark one, then choose it: that weighs at once.`
                  : undefined
              }
            >
              {may.edit ? (
                <ConstructionChoice
                  many={words.many}
                  kind={element.kind}
                  choices={choices.list}
                  current={choices.current}
                  saving={saving}
                  error={errors.construction}
                  onMark={setMarkedKey}
                  onChoose={(key) => {
                    setMarkedKey(undefined);
                    patch(patchFor(library, key));
                  }}
                />
              ) : (
                <LockedReason reason={may.reason} />
              )}
            </Sheet>
          )}
          <Sheet
            heading={element.kind === "door" || element.kind === "window" ? "Size and opening" : "Size"}
            className="border-t border-rule"
          >
            <ElementFields
              element={element}
              lockedBecause={may.edit ? undefined : may.reason}
              errors={errors}
              onChange={patch}
            />
            {element.kind === "duct" && (
              <DuctFields element={element} save={save} planned={planned} lockedBecause={may.edit ? undefined : may.reason} />
            )}
          </Sheet>
          <Sheet className="border-t border-rule">
            <ElementPlace
              element={element}
              plan={plan}
              save={save}
              planned={planned}
              locked={!may.edit}
              onRemove={() => void remove(element)}
            />
          </Sheet>
        </div>
        <Sheet
          heading="What it stops"
          className="border-t border-rule desk:sticky desk:top-20 desk:self-start desk:border-t-0"
        >
          <WhatItStops
            name={`this ${words.one}`}
            kind={element.kind}
            judged={verdict.elements[elementId]}
            sheet={sheet}
            other={marked ? { name: "your mark", loss: marked.hung ?? marked.loss } : formerly}
            litBand={litBand}
          />
          <div className="mt-5">
            <Cautions
              cautions={cautionsOf({
                element,
                sheet,
                weight: weightOf(sheet, element.area),
                weightBefore: weightOf(opened.sheet, opened.area),
              })}
            />
          </div>
        </Sheet>
      </div>
    </div>
  );
}

const patchFor = (library: Library, key: string): ElementPatch =>
  library.catalogue.some((known) => known.key === key)
    ? { construction: { catalogueKey: key } }
    : { constructionId: key };

const weightOf = (sheet: ConstructionSheet | undefined, area: number) =>
  sheet?.surfaceMass == null ? null : sheet.surfaceMass * area;
