"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import type { ConstructionSheet } from "../../lib/noise/sheet";
import { budgetAddress, elementAddress, roomsAddress, wallsAddress } from "../addresses";
import { Icon } from "../marks/Icon";
import { SaveNotices } from "../plan/SaveNotices";
import { usePlannedSave } from "../plan/usePlannedSave";
import { usePlanSave } from "../plan/usePlanSave";
import { LinkButton } from "../ui/Button";
import { Disclosure } from "../ui/Disclosure";
import { Sheet } from "../ui/Sheet";
import { planWords } from "../yard/planWords";
import { AddElement, type KindChoice } from "./AddElement";
import { leadOf } from "./answer";
import { BoundaryPanel } from "./BoundaryPanel";
import { LockedReason } from "./ElementFields";
import { faceDoubts } from "./faces";
import { additionOf, type Draft } from "./newElement";
import { useLasting } from "./useLasting";
import { VerdictStrip } from "./VerdictStrip";
import { WallIndex } from "./WallIndex";
import { wallFaces } from "./wallRows";

export interface WallsStageProps {
  projectId: string;
  may: { edit: boolean; reason: string };
  /** Of the constructions of the plan as it was when the page was made. */
  sheets: readonly ConstructionSheet[];
  kinds: readonly KindChoice[];
}

/** Every wall, roof, door and opening, and the form that adds one. */
export function WallsStage({ projectId, may, sheets, kinds }: WallsStageProps) {
  const save = usePlanSave(projectId);
  const planned = usePlannedSave(save);
  const router = useRouter();
  const { answer, before, saving } = save;
  const { plan } = answer;
  const weighing = useLasting(saving, 400);
  const lead = leadOf(answer);
  const adding = useRef<HTMLDivElement>(null);
  /** Unfolded in a yard without walls, and left as it is when the first one is there. */
  const [unfolded] = useState(plan.elements.length === 0);
  const pathOf = (id: string) => plan.paths.find((path) => path.id === id);

  async function add(draft: Draft): Promise<string | undefined> {
    let known = new Set<string>();
    const saved = await planned((now) => {
      known = new Set(now.elements.map(({ id }) => id));
      return additionOf(now, draft);
    }, "walls/add");
    if (saved?.kind !== "saved") return undefined;
    router.refresh(); // a construction that was copied needs its sheet
    return saved.answer.plan.elements.find(({ id }) => !known.has(id))?.pathId;
  }

  return (
    <div className="[&_:is(input,button,summary,a,select)]:scroll-mt-32">
      <VerdictStrip answer={answer} before={before} weighing={weighing} projectId={projectId} budgetHref={budgetAddress(projectId)} />
      <SaveNotices save={save} here={wallsAddress(projectId)} words={planWords} />
      <h1 className="mb-4 text-verdictPhone leading-[1.12] mid:mb-5 desk:text-verdict">Walls &amp; openings</h1>
      {may.edit ? (
        <div ref={adding} className="mb-5 rounded-sheet bg-sheet px-4 py-3 mid:px-6.5">
          {plan.spaces.length === 0 ? (
            <Sheet bare heading="Rooms come first">
              <p className="text-ink2">A wall stands between a room and something else, and no room has been added yet.</p>
              <LinkButton href={roomsAddress(projectId)} look="ink" className="mb-3 mt-3">
                To the rooms
              </LinkButton>
            </Sheet>
          ) : (
            <Disclosure open={unfolded} summary={<span className="flex items-center gap-2"><Icon name="plus" size={18} />Add a wall or an opening</span>}>
              <div className="pt-2 text-ink">
                <AddElement plan={plan} kinds={kinds} saving={saving} error={save.errorOf("walls/add")} onAdd={add} />
              </div>
            </Disclosure>
          )}
        </div>
      ) : (
        <div className="mb-5 rounded-sheet bg-sheet px-4 pb-4 mid:px-6.5">
          <LockedReason reason={may.reason} />
        </div>
      )}
      <WallIndex
        faces={wallFaces(answer, sheets, (elementId) => elementAddress(projectId, elementId), may.edit)}
        litBand={lead?.bandIndex ?? 1}
        listener={lead?.name}
        doubtsOf={(faceId) => faceDoubts(plan, faceId)}
        panelOf={(faceId) => {
          const path = may.edit ? pathOf(faceId) : undefined;
          return path && <BoundaryPanel path={path} plan={plan} save={save} planned={planned} />;
        }}
      />
    </div>
  );
}
