"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import { elementAddress, wallsAddress } from "../addresses";
import type { PlanChange } from "../plan/save";
import { SaveNotices } from "../plan/SaveNotices";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { FieldError } from "../ui/FieldFrame";
import { Sheet } from "../ui/Sheet";
import { Strip } from "../ui/Strip";
import { planWords } from "../yard/planWords";

/** An element that was taken out on this very page, and what brings it back. */
export interface Gone {
  name: string;
  undo: readonly PlanChange[];
  /** Of the plan without it: once anything else is saved, the way back is closed. */
  revision: number;
}

/** What is left of the page of an element that is no longer in the plan; whoever took it out may bring it back. */
export function RemovedElement({ projectId, save, removed }: { projectId: string; save: PlanSave; removed?: Gone }) {
  const router = useRouter();
  async function bringBack({ undo }: Gone) {
    const old = new Set(save.answer.plan.elements.map(({ id }) => id));
    const saved = await save.save(undo, "undo");
    if (saved.kind !== "saved") return;
    const back = saved.answer.plan.elements.find(({ id }) => !old.has(id));
    router.replace(back ? elementAddress(projectId, back.id) : wallsAddress(projectId));
  }
  return (
    <>
      <SaveNotices save={save} here={wallsAddress(projectId)} words={planWords} />
      {removed?.revision === save.answer.revision && (
        <Strip kind="undo" heading={`${removed.name} is taken out of the plan.`} className="mb-5" action={<Button onClick={() => void bringBack(removed)}>Undo</Button>} />
      )}
      <FieldError id="undo" error={save.errorOf("undo")} />
      <Sheet heading="This is no longer in the plan">
        <Link href={wallsAddress(projectId)}>To the walls &amp; openings</Link>
      </Sheet>
    </>
  );
}
